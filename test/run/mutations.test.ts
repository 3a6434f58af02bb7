/**
 * A sound study and its data, spoilt at random: whatever is left of them, a run ends with results or with a word, a
 * problem points to something that is there, and a record is one (see `wholeRun`).
 */
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { data, study } from './small-study.ts';
import { wholeRun } from './whole-run.ts';

/** Uses much of what a study can say, so that a change hits something. */
const STUDY = study(
  {
    'file: data.csv':
      'file: data.csv\n  row_id: id\n  time: t\n  missing: ["", n/a]\n  on_bad_value: leave_out_row',
    '    k: { type: category }':
      '    k: { type: category, levels: [a, b, c], baseline: b }\n    t: { type: date }\n    id: { type: identifier }',
    '[x]\n': '[x, k, { interaction: [x, k] }]\n',
    '[x, z]': '[{ polynomial: x, degree: 2 }, root, { bend: z, at: 2 }]\n    scale: log',
  },
  `derive: { root: { expression: sqrt(z + 1) } }
leave_out: [{ where: x > 22 and k == "a", because: Trials }]
weights: w
selection: { rank_by: bic, prefer_smaller_within: 1, admit: { vif: { at_most: 1000 } } }
predict: { rows: [{ label: One, x: 4, z: 2, k: c, w: 1 }], total: true }
acceptance: { adjusted_r_squared: { at_least: 0.5 } }
`,
);

const DATA = data((row, i) => {
  row.k = 'abc'[i % 3]!;
}, 24)
  .trim()
  .split('\n')
  .map((line, i) => `${line},${i === 0 ? 't,id' : `2026-01-${String(i).padStart(2, '0')},r${i}`}`)
  .join('\n');

/** Cells, keys and characters with a meaning of their own. */
const PIECES = [
  ...[
    '',
    ' ',
    '\n',
    '\r\n',
    '\t',
    ',',
    ';',
    '"',
    "'",
    '#',
    ':',
    '- ',
    '{',
    '}',
    '[',
    ']',
    '&a ',
    '*a',
    '|',
    '\0',
  ],
  ...[
    '0',
    '-1',
    '1e400',
    '1e300',
    '1e-300',
    'NaN',
    'Infinity',
    'n/a',
    '1,5',
    '0x1F',
    '9007199254740993',
    '-0',
  ],
  ...[
    'a',
    'b',
    'x',
    'y',
    'z',
    'k',
    'w',
    'root',
    '__proto__',
    'constructor',
    'log',
    'reciprocal',
    'press',
    'partial_f',
  ],
  ...[
    'null',
    '~',
    'true',
    '2026-02-30',
    '\ufeff',
    '\u{1f6a2}',
    'é',
    '<b>',
    '=1+1',
    '{{x}}',
    'mallows_cp',
    'false',
  ],
];

type Change = (text: string) => string;

const share = fc.double({ min: 0, max: 1, noNaN: true });

/** A stretch of the text replaced. */
const replaced = fc
  .tuple(share, fc.nat(12), fc.oneof(fc.constantFrom(...PIECES), fc.string({ maxLength: 4, unit: 'binary' })))
  .map(
    ([at, length, piece]): Change =>
      (text) => {
        const from = Math.floor(at * text.length);
        return text.slice(0, from) + piece + text.slice(from + length);
      },
  );

/** One word or number, so that what is left can often still be read, replaced by another. */
const reworded = fc.tuple(share, fc.constantFrom(...PIECES)).map(
  ([at, piece]): Change =>
    (text) => {
      const words = [...text.matchAll(/[\w.-]+/g)];
      const word = words[Math.floor(at * words.length)];
      return word === undefined
        ? text
        : text.slice(0, word.index) + piece + text.slice(word.index + word[0].length);
    },
);

function ofLines(change: (lines: string[], a: number, b: number) => void): fc.Arbitrary<Change> {
  return fc.tuple(share, share).map(
    ([a, b]): Change =>
      (text) => {
        const lines = text.split('\n');
        const last = lines.length - 1;
        change(lines, Math.round(a * last), Math.round(b * last));
        return lines.join('\n');
      },
  );
}

const anyChange = fc.oneof(
  { weight: 3, arbitrary: reworded },
  { weight: 2, arbitrary: replaced },
  // A line taken away, repeated elsewhere, two exchanged, and all from one on turned round.
  ofLines((lines, a) => lines.splice(a, 1)),
  ofLines((lines, a, b) => lines.splice(b, 0, lines[a]!)),
  ofLines((lines, a, b) => {
    [lines[a], lines[b]] = [lines[b]!, lines[a]!];
  }),
  ofLines((lines, a) => lines.push(...lines.splice(Math.max(1, a)).reverse())),
);

/** Two cells of the data exchanged, of one row or of two. */
const exchanged = fc.tuple(share, share, share, share).map(
  ([r1, c1, r2, c2]): Change =>
    (text) => {
      const rows = text.split('\n').map((line) => line.split(','));
      const row = (at: number) => rows[Math.round(at * (rows.length - 1))]!;
      const column = (of: string[], at: number) => Math.round(at * (of.length - 1));
      const [one, two] = [row(r1), row(r2)];
      const [i, j] = [column(one, c1), column(two, c2)];
      [one[i], two[j]] = [two[j]!, one[i]!];
      return rows.map((cells) => cells.join(',')).join('\n');
    },
);

/** Bytes of a text set to others, which may not be UTF-8. */
const bytes = fc.array(fc.tuple(share, fc.nat(255)), { maxLength: 3 });

function withBytes(text: string, changes: readonly (readonly [number, number])[]): Uint8Array {
  const buffer = Buffer.from(text);
  for (const [at, value] of changes)
    if (buffer.length > 0) buffer[Math.floor(at * (buffer.length - 1))] = value;
  return buffer;
}

const apply = (text: string, changes: readonly Change[]) =>
  changes.reduce((soFar, change) => change(soFar), text);

describe('whatever is done to a study and its data', () => {
  test('the sound study has results', async () => {
    const outcome = await wholeRun({ study: STUDY, data: DATA });
    expect(outcome.faults).toEqual([]);
    expect([outcome.status, outcome.marks]).toEqual([0, []]);
  });

  test.each([
    [
      'to the data',
      fc.constant([]),
      fc.array(fc.oneof(anyChange, exchanged), { minLength: 1, maxLength: 4 }),
    ],
    ['to the study', fc.array(anyChange, { minLength: 1, maxLength: 3 }), fc.constant([])],
    [
      'to both',
      fc.array(anyChange, { maxLength: 2 }),
      fc.array(fc.oneof(anyChange, exchanged), { maxLength: 2 }),
    ],
  ])(
    '%s, a run ends with results or with a word',
    async (_, ofStudy, ofData) => {
      await fc.assert(
        fc.asyncProperty(ofStudy, ofData, async (studyChanges, dataChanges) => {
          const { faults } = await wholeRun({
            study: apply(STUDY, studyChanges),
            data: apply(DATA, dataChanges),
          });
          expect(faults).toEqual([]);
        }),
        { numRuns: 80 },
      );
    },
    120_000,
  );

  test('to their bytes, likewise', async () => {
    await fc.assert(
      fc.asyncProperty(bytes, bytes, async (ofStudy, ofData) => {
        const { faults } = await wholeRun({
          study: withBytes(STUDY, ofStudy),
          data: withBytes(DATA, ofData),
        });
        expect(faults).toEqual([]);
      }),
      { numRuns: 60 },
    );
  }, 120_000);
});
