import type { Column } from '../data/table.ts';
import { presentLevels } from '../model/build-design.ts';
import type { Chosen } from '../examine/chosen.ts';

/**
 * Each way in which a row lies outside the sample, as a sentence: a variable of the chosen model beyond its
 * range, or a combination more remote than any row fitted. Levels are checked before (`unknownLevels`).
 */
export function outsideData(
  chosen: Chosen,
  columns: ReadonlyMap<string, Column>,
  row: number,
  leverage: number,
  largestLeverage: number,
): string[] {
  const sentences: string[] = [];
  for (const name of modelVariables(chosen)) {
    const here = columns.get(name);
    const range = rangeOf(chosen, name);
    if (here === undefined || range === null || here.kind === 'category' || here.kind === 'text') continue;
    const value = here.values[row]!;
    if (value < range.smallest) sentences.push(`${name} ${value} is below ${range.smallest}, the smallest in the data`);
    if (value > range.largest) sentences.push(`${name} ${value} is above ${range.largest}, the largest in the data`);
  }
  if (leverage > largestLeverage * (1 + 1e-9) && sentences.length === 0) {
    sentences.push('its combination of values is more remote than any row in the data');
  }
  return sentences;
}

/** Levels of the model's categories at a row that no row of the sample has: such a row cannot be predicted. */
export function unknownLevels(chosen: Chosen, columns: ReadonlyMap<string, Column>, row: number): { variable: string; level: string; known: string[] }[] {
  const unknown: { variable: string; level: string; known: string[] }[] = [];
  for (const name of modelVariables(chosen)) {
    const here = columns.get(name);
    const sample = chosen.sample.columns.get(name);
    if (here?.kind !== 'category' || sample?.kind !== 'category') continue;
    const level = here.levels[here.codes[row]!];
    const known = presentLevels(sample);
    if (level !== undefined && !known.includes(level)) unknown.push({ variable: name, level, known });
  }
  return unknown;
}

/** The variables of the chosen model's terms, each once, in order of first use. */
export function modelVariables(chosen: Chosen): string[] {
  return [...new Set(chosen.fit.candidate.columns.flatMap((column) => chosen.columns[column]!.pieces.map((piece) => piece.variable)))];
}

const ranges = new WeakMap<Column, { smallest: number; largest: number }>();

function rangeOf(chosen: Chosen, name: string): { smallest: number; largest: number } | null {
  const column = chosen.sample.columns.get(name);
  if (column === undefined || column.kind === 'category' || column.kind === 'text') return null;
  let range = ranges.get(column);
  if (range === undefined) {
    let smallest = Number.POSITIVE_INFINITY;
    let largest = Number.NEGATIVE_INFINITY;
    for (const value of column.values) {
      if (value < smallest) smallest = value;
      if (value > largest) largest = value;
    }
    range = { smallest, largest };
    ranges.set(column, range);
  }
  return range;
}
