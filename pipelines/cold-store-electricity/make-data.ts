/**
 * Makes months.csv, and months-later.csv. The cold store and every figure are invented.
 *
 *     npx tsx pipelines/cold-store-electricity/make-data.ts
 *     npx tsx pipelines/cold-store-electricity/make-data.ts --later
 */
import { later, type Random, seeded, writeCsv } from '../invented.ts';

const random = seeded(15);

/** Mean outdoor temperature by calendar month, °C. */
const CLIMATE = [0.6, 1.1, 3.6, 7.4, 12.1, 15.8, 18.2, 17.6, 13.7, 9.3, 4.9, 1.9];
/** Tonnes taken in by calendar month: fruit in late summer, frozen goods before Christmas. */
const INTAKE = [610, 560, 600, 640, 700, 790, 960, 1240, 1380, 1050, 820, 900];

const rows: string[][] = [];
let carried = 0;
const addMonth = (index: number, random: Random) => {
  const year = 2022 + Math.floor(index / 12);
  const month = index % 12;
  const days = new Date(Date.UTC(year, month + 1, 0)).getUTCDate();
  const outdoor = CLIMATE[month]! + random.normal(0, 1.3);
  const intake = INTAKE[month]! * random.between(0.86, 1.14);
  const openings = Math.round(intake * 1.85 + random.normal(0, 90));
  const overhauled = index >= 19;

  // What a month leaves behind (frost on the coils, a door seal) is still there the next month.
  carried = 0.45 * carried + random.normal(0, 52);
  const perDay =
    2310 + 61 * Math.max(0, outdoor - 12) + 12.5 * (intake / days) - (overhauled ? 176 : 0) + carried;
  rows.push([
    `${year}-${String(month + 1).padStart(2, '0')}`,
    days.toString(),
    Math.round(perDay * days).toString(),
    outdoor.toFixed(1),
    intake.toFixed(0),
    openings.toString(),
    overhauled ? 'yes' : 'no',
    '',
  ]);
};
for (let index = 0; index < 36; index++) addMonth(index, random);

const measured = rows[14]![2]!;
// The meter was out for most of a month; the supplier's estimate is no measurement.
rows[14]![2] = 'est.';
rows[14]![7] = 'meter exchanged';
rows[19]![7] = 'compressor 2 overhauled';

if (later) {
  // The supplier read the old meter on its bench, and put a reading right that two digits had changed places in.
  rows[14]![2] = measured;
  rows[14]![7] = 'old meter read on the bench';
  rows[25]![2] = String(Number(rows[25]![2]) + 5400);
  rows[25]![7] = 'reading revised by the supplier';
  const nextYear = seeded(2026);
  for (let index = 36; index < 48; index++) addMonth(index, nextYear);
}

writeCsv(
  new URL(later ? 'months-later.csv' : 'months.csv', import.meta.url),
  ['month', 'days', 'kwh', 'outdoor_c', 'intake_t', 'door_openings', 'overhauled', 'notes'],
  rows,
);
