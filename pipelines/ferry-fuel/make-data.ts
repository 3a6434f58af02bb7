/**
 * Makes crossings.csv, and crossings-later.csv. The vessels, the places and every figure are invented.
 *
 *     npx tsx pipelines/ferry-fuel/make-data.ts
 *     npx tsx pipelines/ferry-fuel/make-data.ts --later
 */
import { dayOf, isoDate, later, type Random, seeded, writeCsv } from '../invented.ts';

const random = seeded(20250313);

const VESSELS = {
  Skerry: { extra: 0, cars: 34, cruising: 11.6 },
  Tern: { extra: 58, cars: 42, cruising: 12.4 },
  Holm: { extra: 171, cars: 55, cruising: 11.9 },
} as const;

type Vessel = keyof typeof VESSELS;

/** The last time each hull was cleaned before the first crossing, and the cleaning in between. */
const CLEANED: Record<Vessel, readonly string[]> = {
  Skerry: ['2024-05-12', '2024-11-20'],
  Tern: ['2024-08-02', '2025-03-01'],
  Holm: ['2024-03-30', '2025-01-08'],
};

const HEADER = [
  'crossing',
  'departed',
  'vessel',
  'status',
  'fuel_l',
  'booked_cargo_t',
  'deck_weight_t',
  'cars',
  'passengers',
  'speed_kn',
  'headwind_m_s',
  'hull_days',
  'remarks',
];

const first = dayOf('2024-09-02');
const last = dayOf('2025-02-27');
const count = 264;

/** One voyage; `saved` is what a vessel burns less since its refit. */
const voyage = (index: number, day: number, random: Random, saved: Partial<Record<Vessel, number>>) => {
  const vessel = random.pick<Vessel>([
    ['Skerry', 5],
    ['Tern', 4],
    ['Holm', 3],
  ]);
  const { extra, cars: room, cruising } = VESSELS[vessel];
  const trial = random.uniform() < 0.055;
  const minutes = random.pick([
    [400, 3],
    [580, 2],
    [760, 2],
    [990, 3],
    [1165, 1],
  ]);
  const cleaned = CLEANED[vessel].filter((date) => dayOf(date) <= day).pop()!;
  const hullDays = day - dayOf(cleaned);

  // Freight and cars compete for the deck only loosely; passengers come with the cars.
  const cargo = trial ? 0 : Math.max(0, random.normal(62 + room * 0.55, 27));
  const cars = trial ? 0 : Math.min(room, Math.round(random.between(0.15, 1.05) * room));
  const passengers = trial ? 0 : Math.round(cars * 2.1 + random.between(0, 26));
  const deck = trial ? 0 : Math.max(0, cargo + 1.46 * cars + 0.085 * passengers + random.normal(0, 2.2));
  const booked = trial ? 0 : Math.max(0, cargo + random.normal(0, 4.2));
  const speed = trial
    ? random.between(13.6, 15)
    : Math.min(15.1, Math.max(8.2, random.normal(cruising, 1.15)));
  const season = Math.sin((Math.PI * (day - first)) / (last - first));
  const headwind = random.normal(1.5, 4.6 + 1.6 * season);

  // A trial runs the measured mile, a third of a crossing.
  const distance = trial ? 0.33 : 1;
  const fuel =
    distance *
      (172 +
        extra +
        0.252 * speed ** 3 +
        1.72 * deck +
        5.4 * headwind +
        0.62 * headwind * headwind +
        0.33 * hullDays -
        (saved[vessel] ?? 0)) +
    random.normal(0, 33);

  return {
    crossing: `X${String(index + 1).padStart(4, '0')}`,
    departed: isoDate(day, minutes),
    vessel: vessel as string,
    status: trial ? 'trial' : 'revenue',
    fuel: Math.round(fuel).toString(),
    booked: booked.toFixed(0),
    deck: deck.toFixed(1),
    cars: cars.toString(),
    passengers: passengers.toString(),
    speed: speed.toFixed(1),
    headwind: headwind.toFixed(1),
    hullDays: hullDays.toString(),
    remarks: trial ? 'measured mile' : '',
  };
};

const rows = Array.from({ length: count }, (_, index) =>
  voyage(index, Math.floor(first + ((last - first) * index) / count), random, {}),
);

const burned = new Map(rows.map((row) => [row.crossing, row.fuel]));

// What goes wrong on board.
const revenue = rows.filter((row) => row.status === 'revenue');
const spoil = (from: number, change: (row: (typeof rows)[number]) => void) => change(revenue[from]!);
spoil(31, (row) => Object.assign(row, { headwind: '', remarks: 'anemometer iced up' }));
spoil(32, (row) => Object.assign(row, { headwind: '' }));
spoil(33, (row) => Object.assign(row, { headwind: '' }));
spoil(58, (row) => Object.assign(row, { deck: 'n/a', remarks: 'ramp scale out of order' }));
spoil(59, (row) => Object.assign(row, { deck: 'n/a' }));
spoil(97, (row) => Object.assign(row, { fuel: 'n/a' }));
// The meter's running total was written down in place of the difference: out of range, so the contract sees it.
spoil(120, (row) => Object.assign(row, { fuel: '48213', remarks: 'new hand in the engine room' }));
// Two crossings' fuel booked on one: within range, so only the examination can see it.
spoil(163, (row) =>
  Object.assign(row, {
    fuel: String(Math.round(Number(row.fuel) * 1.48)),
    remarks: 'meter read late, "about right"',
  }),
);
spoil(201, (row) => Object.assign(row, { passengers: '' }));

if (later) {
  // The office went through the log: readings put right, one crossing that had been entered twice taken out.
  const correct = (crossing: string, by: number, remarks: string) =>
    Object.assign(rows.find((row) => row.crossing === crossing)!, {
      fuel: String(Number(burned.get(crossing)) + by),
      remarks,
    });
  correct('X0126', 0, 'meter difference, not the total');
  correct('X0171', 0, 'the other crossing is X0172');
  correct('X0052', -45, 'meter read again from the photograph');
  correct('X0209', 30, 'meter read again from the photograph');
  const twice = rows.findIndex((row) => row.crossing === 'X0088');
  rows.splice(twice, 1);
  // Tern came back from the yard on 3 March with new engines.
  const spring = seeded(20250303);
  const start = dayOf('2025-03-03');
  const end = dayOf('2025-05-11');
  for (let k = 0; k < 96; k++) {
    const day = Math.floor(start + ((end - start) * k) / 96);
    rows.push(voyage(count + k, day, spring, { Tern: 105 }));
  }
}

writeCsv(
  new URL(later ? 'crossings-later.csv' : 'crossings.csv', import.meta.url),
  HEADER,
  rows.map((row) => Object.values(row)),
);
