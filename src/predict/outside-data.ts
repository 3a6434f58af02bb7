import type { Column } from '../data/table.ts';
import type { Chosen } from '../examine/chosen.ts';
import { presentLevels } from '../model/build-design.ts';
import { baseVariables } from '../prepare/derive.ts';
import type { Spread } from '../prepare/spread.ts';

/** The variables of numbers whose range a prediction must keep to, in the order in which they are looked at. */
export interface RangedVariables {
  /** Declared variables that the chosen model uses or rests on. */
  readonly declared: readonly string[];
  /** Derived variables that it uses. */
  readonly derived: readonly string[];
}

/**
 * A date is not among them: a model uses what is derived from it (a month, a count of days), and that is looked at.
 */
export function rangedVariables(chosen: Chosen): RangedVariables {
  const { derive } = chosen.study;
  const model = modelVariables(chosen);
  const isDerived = (name: string) => derive.some((plan) => plan.name === name);
  const isNumber = (name: string) => chosen.sample.columns.get(name)?.kind === 'number';
  const declared = new Set(model.flatMap((name) => [...baseVariables(name, derive)]));
  return {
    declared: [...declared].filter(isNumber),
    derived: model.filter((name) => isDerived(name) && isNumber(name)),
  };
}

/**
 * Each way in which a row lies outside the sample, as a sentence: a value beyond the range of its variable, or
 * a combination more remote than any row fitted. A derived variable is named only where no declared one is.
 * Levels are checked before (`unknownLevels`).
 */
export function outsideData(
  columns: ReadonlyMap<string, Column>,
  row: number,
  variables: RangedVariables,
  spreads: ReadonlyMap<string, Spread>,
  remote: boolean,
): string[] {
  const beyond = (name: string): string[] => {
    const range = spreads.get(name);
    const column = columns.get(name);
    if (range === undefined || column?.kind !== 'number') return [];
    const value = column.values[row]!;
    if (value < range.smallest)
      return [`${name} ${value} is below ${range.smallest}, the smallest in the data`];
    return value > range.largest
      ? [`${name} ${value} is above ${range.largest}, the largest in the data`]
      : [];
  };
  const declared = variables.declared.flatMap(beyond);
  if (declared.length > 0) return declared;
  const derived = variables.derived.flatMap(beyond);
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
