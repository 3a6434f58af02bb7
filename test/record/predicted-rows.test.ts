/** Predictions are written in blocks of bytes; cell by cell, and object by object, they are the same. */
import fc from 'fast-check';
import { expect, test } from 'vitest';
import { emptyFigures, PREDICTED_FIGURES } from '../../src/predict/predicted-columns.ts';
import { predictedRowsJson, predictedRowsTable } from '../../src/record/predicted-rows.ts';

interface Row {
  /** Null for a row without a prediction. */
  readonly figures: readonly number[] | null;
  readonly outside: readonly string[];
}

function columnsOf(rows: readonly Row[]) {
  const count = rows.filter(({ figures }) => figures !== null).length;
  const figures = emptyFigures(count);
  const outside = new Map<number, readonly string[]>();
  const at = new Int32Array(rows.length).fill(-1);
  let next = 0;
  rows.forEach((row, i) => {
    if (row.figures === null) return;
    PREDICTED_FIGURES.forEach((name, j) => {
      figures[name][next] = row.figures![j]!;
    });
    if (row.outside.length > 0) outside.set(next, row.outside);
    at[i] = next++;
  });
  const predicted = { count, figures, outside, source: new Int32Array(count), row: new Int32Array(count) };
  const because = rows.map((row) => (row.figures === null ? 'x, "y" is missing' : null));
  const lines = Uint32Array.from(rows, (_, i) => i + 2);
  return { labelOf, lines, at, because, predicted };
}

// Long, so that rows fill several blocks; some have characters of more bytes than one.
const labelOf = (row: number) => `r${row}${row % 3 === 0 ? ' "Ärö\u{1f33f}"' : ''}`;

function table(rows: readonly Row[]): string {
  return [...predictedRowsTable(columnsOf(rows))].join('');
}

/** As it is written by hand. */
function byCell(rows: readonly Row[]): string {
  const lines = rows.map(({ figures, outside }, i) => {
    const label = i % 3 === 0 ? `"r${i} ""Ärö\u{1f33f}"""` : `r${i}`;
    if (figures === null) return `${label},,,,,,,,,"x, ""y"" is missing"`;
    return [label, ...figures.map((x) => (Number.isNaN(x) ? '' : String(x))), outside.join('; '), ''].join(
      ',',
    );
  });
  return `${['label,estimate,lower,upper,mean_lower,mean_upper,mean,leverage,outside,not_predicted', ...lines].join('\n')}\n`;
}

/** As the language writes objects; a NaN as null. */
function byObject(rows: readonly Row[]): string {
  const lines = rows.map(({ figures, outside }, i) => {
    const [label, line] = [labelOf(i), i + 2];
    if (figures === null) return JSON.stringify({ label, line, not_predicted: 'x, "y" is missing' });
    const named = Object.fromEntries(PREDICTED_FIGURES.map((name, j) => [name, figures[j]]));
    return JSON.stringify({ label, ...named, outside, line });
  });
  return lines.join(',\n');
}

function both(rows: readonly Row[]): void {
  expect(table(rows)).toBe(byCell(rows));
  expect([...predictedRowsJson(columnsOf(rows))].join('')).toBe(byObject(rows));
}

const figure = fc.oneof(fc.double({ noNaN: true, noDefaultInfinity: true }), fc.constant(Number.NaN));
const row = fc.record({
  figures: fc.option(fc.array(figure, { minLength: 7, maxLength: 7 }), { freq: 9 }),
  outside: fc.subarray(['a is below 1', 'b is above 2']),
});

test('any figures, absent in any place', () => {
  fc.assert(
    fc.property(fc.array(row, { maxLength: 30 }), (rows) => {
      both(rows);
    }),
  );
});

test('what the scales leave absent, over several blocks', () => {
  const shapes = {
    natural: [5],
    exact: [1, 2, 3, 4, 5],
    'no upper end': [2, 5],
    none: [],
  };
  for (const absent of Object.values(shapes) as number[][]) {
    const rows = Array.from({ length: 9000 }, (_, i) => ({
      figures:
        i % 1000 === 7
          ? null
          : Array.from({ length: 7 }, (_, j) => (absent.includes(j) ? Number.NaN : (i - 4500) / (j + 3))),
      outside: i % 700 === 0 ? ['a is below 1'] : [],
    }));
    both(rows);
  }
});

test('no row at all, and none with a prediction', () => {
  both([]);
  const none = [{ figures: null, outside: [] }];
  both(none);
});
