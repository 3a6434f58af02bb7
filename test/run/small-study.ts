import { changed, marked } from '../study/sample.ts';

/** A small sound study of invented numbers, to be spoilt one place at a time. */
export const STUDY = `plumbrule: 1
title: A small study
data:
  file: data.csv
  variables:
    y: { type: number }
    x: { type: number }
    z: { type: number }
    k: { type: category }
    w: { type: number }
response: y
candidates:
  - name: Straight
    terms: [x]
  - name: Both
    terms: [x, z]
`;

/** The study with texts replaced, each of which must be there exactly once; more keys at its end. */
export function study(changes: Readonly<Record<string, string>> = {}, more = ''): string {
  return Object.entries(changes).reduce((text, [from, to]) => changed(text, from, to), STUDY) + more;
}

export interface SmallRow {
  y: number | string;
  x: number | string;
  z: number | string;
  k: string;
  w: number | string;
}

/** Rows of y = 3 + 2x and a little, each changed as told; row i is on line i + 2. */
export function data(change: (row: SmallRow, i: number) => void = () => {}, count = 16): string {
  const lines = Array.from({ length: count }, (_, i) => {
    const row: SmallRow = {
      y: 3 + 2 * i + ((i * i * 5) % 7) / 10,
      x: i,
      z: (i * 7) % 5,
      k: ['a', 'b', 'c'][(i * i) % 3]!,
      w: 1 + (i % 4),
    };
    change(row, i);
    return `${row.y},${row.x},${row.z},${row.k},${row.w}`;
  });
  return `y,x,z,k,w\n${lines.join('\n')}\n`;
}

/** One cell of the data changed: in row i, counted from 0. */
export function dataWith(at: number, change: Partial<SmallRow>): string {
  return data((row, i) => {
    if (i === at) Object.assign(row, change);
  });
}

/**
 * A study in which «marks» stand around what problems point to, and the places of the marks, so that a test says by
 * itself where a problem belongs: "@1" in the expected marks of problems is the place of the first mark.
 */
export function pointed(text: string, expected: readonly string[]): { study: string; marks: string[] } {
  const { text: clean, places } = marked(text);
  const marks = expected.map((mark) => mark.replace(/@(\d)/, (_, n: string) => places[Number(n) - 1] ?? '?'));
  return { study: clean, marks };
}
