import type { CategoryColumn, Column, TextColumn } from '../data/table.ts';
import type { Expression } from '../expression/expression.ts';
import type { Block } from './loops.ts';

/** Writes 1 or 0 (NaN where missing) for rows `start` … `start + n − 1` to `out`. */
export type WordLoop = (out: Block, start: number, n: number) => void;

/** Equality of categories and texts with one another or with a written text; null where it is of numbers. */
export function compareWords(
  left: Expression,
  right: Expression,
  equal: boolean,
  columns: ReadonlyMap<string, Column>,
): WordLoop | null {
  const a = wordsOf(left, columns);
  const b = wordsOf(right, columns);
  if (a === null || b === null) return null;
  const [same, different] = equal ? [1, 0] : [0, 1];
  if (a.kind === 'category' && b.kind === 'written') return compareLevel(a, b.text, same, different);
  if (b.kind === 'category' && a.kind === 'written') return compareLevel(b, a.text, same, different);
  return (out, start, n) => {
    for (let i = 0; i < n; i++) {
      const x = wordAt(a, start + i);
      const y = wordAt(b, start + i);
      out[i] = x === null || y === null ? Number.NaN : x === y ? same : different;
    }
  };
}

function compareLevel(column: CategoryColumn, text: string, same: number, different: number): WordLoop {
  const { codes } = column;
  const wanted = column.levels.indexOf(text);
  return (out, start, n) => {
    for (let i = 0; i < n; i++) {
      const code = codes[start + i]!;
      out[i] = code < 0 ? Number.NaN : code === wanted ? same : different;
    }
  };
}

type Words = CategoryColumn | TextColumn | { readonly kind: 'written'; readonly text: string };

function wordsOf(node: Expression, columns: ReadonlyMap<string, Column>): Words | null {
  if (node.kind === 'text') return { kind: 'written', text: node.value };
  if (node.kind !== 'name') return null;
  const column = columns.get(node.name);
  return column?.kind === 'category' || column?.kind === 'text' ? column : null;
}

function wordAt(words: Words, row: number): string | null {
  if (words.kind === 'written') return words.text;
  if (words.kind === 'text') return words.values[row] ?? null;
  return words.levels[words.codes[row]!] ?? null;
}
