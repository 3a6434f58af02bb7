/**
 * Makes repairs.csv, and repairs-later.csv. The workshops, the machines and every figure are invented.
 *
 *     npx tsx pipelines/workshop-repairs/make-data.ts
 *     npx tsx pipelines/workshop-repairs/make-data.ts --later
 *
 * The file is as an office program in much of Europe writes it: semicolons between cells, decimal commas,
 * dates as day.month.year.
 */
import { dayOf, isoDate, later, type Random, seeded, writeCsv } from '../invented.ts';

const random = seeded(11);

/** Kind of job, how often it comes, median hours of a plain one, mean number of parts. */
const JOBS: readonly (readonly [string, number, number, number])[] = [
  ['service', 88, 1.5, 2.2],
  ['brakes', 62, 2.4, 3],
  ['hydraulics', 66, 3.6, 3.4],
  ['electrics', 58, 2.9, 1.6],
  ['engine', 38, 7.6, 5.2],
  ['gearbox', 27, 9.4, 4.6],
  ['bodywork', 41, 4.4, 2.4],
  ['steering', 29, 3.1, 2.1],
  ['cab', 11, 1.9, 1.2],
];

const TECHNICIANS = ['A', 'B', 'C', 'D', 'E', 'F', 'G'].map((name, index) => ({
  name,
  years: [0.5, 2, 4, 7, 11, 18, 26][index]!,
}));

const comma = (value: number, digits: number) => value.toFixed(digits).replace('.', ',');

const first = dayOf('2023-01-09');
const last = dayOf('2024-12-13');
const count = 424;

/** The grade that years of work bring; `specialist` is one that the workshops took on later. */
const gradeAfter = (years: number) => (years < 3 ? 'apprentice' : years < 10 ? 'mechanic' : 'master');

interface Technician {
  readonly name: string;
  readonly years: number;
  readonly grade?: string;
}

const repair = (index: number, day: number, random: Random, technicians: readonly Technician[]) => {
  const job = random.pick(JOBS.map((each) => [each, each[1]] as const));
  const [kind, , median, meanParts] = job;
  const technician = random.pick(technicians.map((each) => [each, 1] as const));
  const years = technician.years + (day - first) / 365.25;
  const age = Math.min(24, Math.max(0, Math.round(random.normal(8.5, 5))));
  const parts = random.poisson(meanParts);
  const urgent = random.uniform() < 0.22;
  const hours =
    median *
    (1 + parts) ** 0.42 *
    1.021 ** age *
    (1 + years) ** -0.17 *
    (urgent ? 0.9 : 1) *
    Math.exp(random.normal(0, 0.33));
  return {
    job: `R-${String(4100 + index)}`,
    closed: isoDate(day).split('-').reverse().join('.'),
    kind,
    technician: technician.name,
    grade: technician.grade ?? gradeAfter(years),
    years: comma(years, 1),
    age: String(age),
    parts: String(parts),
    urgency: urgent ? 'urgent' : 'planned',
    // Time is booked in quarters of an hour.
    hours: comma(Math.max(0.25, Math.round(hours * 4) / 4), 2),
    remark: '',
  };
};

const rows = Array.from({ length: count }, (_, index) =>
  repair(index, Math.floor(first + ((last - first) * index) / count), random, TECHNICIANS),
);

const spoil = (index: number, change: (row: (typeof rows)[number]) => void) => change(rows[index]!);
// Minutes written where hours belong: beyond the contract, so listed and left out.
spoil(57, (row) => Object.assign(row, { hours: '165', remark: 'minutes?' }));
spoil(311, (row) => Object.assign(row, { hours: '210' }));
// A spelling that no contract knows.
spoil(140, (row) => Object.assign(row, { kind: 'gear box' }));
// Waiting for a part was booked as work: within range, so only the examination shows it.
spoil(203, (row) =>
  Object.assign(row, { hours: '38,50', remark: 'waited for seal kit; clock left running' }),
);
spoil(268, (row) => Object.assign(row, { hours: '0,25', remark: 'found nothing; sent back' }));
for (const index of [22, 23, 24, 171, 390]) spoil(index, (row) => Object.assign(row, { age: '' }));
for (const index of [88, 352]) spoil(index, (row) => Object.assign(row, { parts: '?' }));

if (later) {
  // Specialists for transmissions were taken on in 2025, and then gearboxes were called transmissions throughout.
  const nextYear = seeded(25);
  const staff = [...TECHNICIANS, { name: 'H', years: 14, grade: 'specialist' }];
  const start = dayOf('2025-01-06');
  const end = dayOf('2025-06-27');
  for (let k = 0; k < 110; k++) {
    rows.push(repair(count + k, Math.floor(start + ((end - start) * k) / 110), nextYear, staff));
  }
  for (const row of rows) if (/^gear ?box$/.test(row.kind)) row.kind = 'transmission';
}

writeCsv(
  new URL(later ? 'repairs-later.csv' : 'repairs.csv', import.meta.url),
  [
    'job',
    'closed',
    'kind',
    'technician',
    'grade',
    'technician_years',
    'machine_age',
    'parts',
    'urgency',
    'hours',
    'remark',
  ],
  rows.map((row) => Object.values(row)),
  ';',
);
