import type { Column } from '../data/table.ts';
import type { Chosen } from '../examine/chosen.ts';
import { presentLevels } from '../model/build-design.ts';
import type { Spread } from '../prepare/spread.ts';

/**
 * Each way in which a row lies outside the sample, as a sentence: a value beyond the range of its variable, or
 * a combination more remote than any row fitted. A derived variable is named only where no given one is.
 * Levels are checked before (`unknownLevels`).
 */
export function outsideData(
  given: readonly { variable: string; value: number | string | boolean }[],
  columns: ReadonlyMap<string, Column>,
  row: number,
  spreads: ReadonlyMap<string, Spread>,
  remote: boolean,
): string[] {
  const beyond = (name: string, value: number): string[] => {
    const range = spreads.get(name);
    if (range === undefined || !Number.isFinite(value)) return [];
    if (value < range.smallest)
      return [`${name} ${value} is below ${range.smallest}, the smallest in the data`];
    return value > range.largest
      ? [`${name} ${value} is above ${range.largest}, the largest in the data`]
      : [];
  };
  const named = given.flatMap(({ variable, value }) =>
    typeof value === 'number' ? beyond(variable, value) : [],
  );
  if (named.length > 0) return named;
  const derived = [...spreads.keys()].flatMap((name) => {
    const column = columns.get(name);
    return column === undefined || column.kind === 'category' || column.kind === 'text'
      ? []
      : beyond(name, column.values[row]!);
  });
  if (derived.length > 0) return derived;
  return remote ? ['its combination of values is more remote than any row in the data'] : [];
}

/** Levels of the model's categories at a row that no row of the sample has: such a row cannot be predicted. */
export function unknownLevels(
  chosen: Chosen,
  columns: ReadonlyMap<string, Column>,
  row: number,
): { variable: string; level: string; known: string[] }[] {
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
  return [
    ...new Set(
      chosen.fit.candidate.columns.flatMap((column) =>
        chosen.columns[column]!.pieces.map((piece) => piece.variable),
      ),
    ),
  ];
}
