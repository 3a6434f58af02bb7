/**
 * Studies and data that can be read, of any shape: few rows, constant, repeated, dependent, extreme and exact columns,
 * every kind of term, scale and criterion. What comes out is a record without a number that is none, or a word (see
 * `wholeRun`).
 */
import fc from 'fast-check';
import { expect, test } from 'vitest';
import { wholeRun } from './whole-run.ts';

const NAMES = ['y', 'x', 'z', 'w'] as const;
const COUNT = 24;

/** Everyday and awkward numbers. */
const number = fc.oneof(
  { weight: 60, arbitrary: fc.integer({ min: -20, max: 20 }) },
  { weight: 60, arbitrary: fc.double({ min: -1000, max: 1000, noNaN: true }) },
  {
    weight: 1,
    arbitrary: fc.constantFrom(0, -0, 1e-300, 5e-324, 1e300, -1e300, 1e75, 1e-75, 1e16, 0.1, 1 / 3),
  },
);

interface Column {
  readonly kind: 'free' | 'constant' | 'two' | 'positive' | 'line' | 'copy' | 'near' | 'growing';
  readonly numbers: readonly number[];
  readonly unit: number;
}

const column = fc.record<Column>({
  kind: fc.constantFrom(
    'free',
    'free',
    'constant',
    'two',
    'positive',
    'positive',
    'line',
    'copy',
    'near',
    'growing',
  ),
  numbers: fc.array(number, { minLength: COUNT, maxLength: COUNT }),
  unit: fc.oneof(
    { weight: 8, arbitrary: fc.constant(1) },
    { weight: 2, arbitrary: fc.constantFrom(1e-12, 1e9, 1e60, 1e-60, 1e100, 2 ** -40) },
  ),
});

/** Values of a column; `before` is the one declared before it. */
function valuesOf({ kind, numbers, unit }: Column, before: readonly number[]): number[] {
  const at = (i: number): number => {
    const own = numbers[i]!;
    const other = before[i] ?? i;
    switch (kind) {
      case 'constant':
        return numbers[0]!;
      case 'two':
        return numbers[own > 0 ? 1 : 0]!;
      case 'positive':
        return Math.abs(own) + 0.5;
      case 'line':
        return 3 + 2 * other;
      case 'copy':
        return other;
      case 'near':
        return other * (1 + own * 1e-9);
      case 'growing':
        return 1e6 + i;
      default:
        return own;
    }
  };
  return numbers.map((_, i) => at(i) * unit).map((value) => (Number.isFinite(value) ? value : 0));
}

const TERMS = [
  'x',
  'z',
  'k',
  'd',
  '{ interaction: [x, z] }',
  '{ interaction: [k, x] }',
  '{ interaction: [k, d] }',
  '{ polynomial: x, degree: 4 }',
  '{ power: z, to: 3 }',
  '{ bend: x, at: 1 }',
  '{ bend: z, at: 0, side: below }',
  '{ spline: x, knots: [-5, 0, 1, 10] }',
] as const;
const SCALES = [
  'natural',
  'natural',
  'natural',
  'log',
  'sqrt',
  'reciprocal',
  '{ box_cox: -2 }',
  '{ box_cox: 0.3 }',
];
const CRITERIA = ['adjusted_r_squared', 'aic', 'aicc', 'bic', 'mallows_cp', 'press', 'partial_f'];

const study = fc
  .record({
    candidates: fc.uniqueArray(fc.subarray([...TERMS], { maxLength: 4 }), {
      minLength: 1,
      maxLength: 3,
      selector: (terms) => terms.join(),
    }),
    scale: fc.constantFrom(...SCALES),
    intercept: fc.boolean(),
    rankBy: fc.constantFrom(...CRITERIA),
    weights: fc.boolean(),
    timed: fc.boolean(),
    at: fc.record({ x: number, z: number, k: fc.constantFrom('a', 'b', 'c') }),
  })
  .map(({ candidates, scale, intercept, rankBy, weights, timed, at }) => {
    const used = (name: string) =>
      candidates.some((terms) => terms.some((term) => new RegExp(`\\b${name}\\b`).test(term)));
    const given = [
      ...(used('x') || used('d') ? [`x: ${at.x}`] : []),
      ...(used('z') ? [`z: ${at.z}`] : []),
      ...(used('k') ? [`k: ${at.k}`] : []),
    ];
    return `plumbrule: 1
title: Any
data:
  file: data.csv
${timed ? '  time: t\n' : ''}  variables:
    y: { type: number, unit: L }
    x: { type: number, unit: t }
    z: { type: number }
    w: { type: number }
    k: { type: category }
    t: { type: integer }
${used('d') ? 'derive: { d: { expression: log(abs(x)) } }\n' : ''}response: { variable: y, scale: ${scale} }
${weights ? 'weights: w\n' : ''}candidates:
${candidates
  .map(
    (terms, i) =>
      `  - { name: C${i}, terms: [${terms.join(', ')}], intercept: ${intercept || terms.length === 0} }`,
  )
  .join('\n')}
selection: { rank_by: ${rankBy} }
predict: { rows: [{ label: One${given.map((value) => `, ${value}`).join('')} }], total: true }
`;
  });

const table = fc
  .record({
    columns: fc.tuple(column, column, column, column),
    rows: fc.oneof(fc.integer({ min: 1, max: 6 }), fc.integer({ min: 7, max: COUNT })),
    levels: fc.array(fc.constantFrom('a', 'b', 'c'), { minLength: COUNT, maxLength: COUNT }),
    times: fc.array(fc.integer({ min: 0, max: 9 }), { minLength: COUNT, maxLength: COUNT }),
    gaps: fc.array(fc.tuple(fc.nat(COUNT - 1), fc.constantFrom(...NAMES)), { maxLength: 3 }),
    signless: fc.boolean(),
  })
  .map(({ columns, rows, levels, times, gaps, signless }) => {
    // The response comes last, so that it can be worked out from the columns before it.
    const w = valuesOf(columns[3], []).map(Math.abs);
    const z = valuesOf(columns[2], w);
    const x = valuesOf(columns[1], z);
    const y = valuesOf(columns[0], x).map((value) => (signless ? Math.abs(value) + 0.1 : value));
    const values = { y, x, z, w };
    const lines = Array.from({ length: rows }, (_, i) => {
      const cells = NAMES.map((name) =>
        gaps.some(([row, of]) => row === i && of === name) ? '' : String(values[name][i]),
      );
      return [...cells, levels[i], times[i]].join(',');
    });
    return `y,x,z,w,k,t\n${lines.join('\n')}\n`;
  });

test('a study of any numbers ends with a record of numbers or with a word', async () => {
  const ends = { results: 0, words: 0 };
  await fc.assert(
    fc.asyncProperty(study, table, async (studyText, dataText) => {
      const { faults, record } = await wholeRun({ study: studyText, data: dataText });
      ends[record === null ? 'words' : 'results']++;
      expect(faults).toEqual([]);
    }),
    { numRuns: 200 },
  );
  // The cases are to reach the end as well as the refusals.
  expect(Math.min(ends.results, ends.words)).toBeGreaterThan(40);
}, 120_000);
