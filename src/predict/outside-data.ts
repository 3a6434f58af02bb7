import type { Column } from '../data/table.ts';
import { baseVariables } from '../prepare/derive.ts';
import type { Predictor, RowNeeds } from './predictor.ts';

export { modelVariables } from './predictor.ts';

/** For each row of rows to be predicted, the ways in which it lies outside the sample. */
export type OutsideData = (row: number, remote: boolean) => readonly string[];

/**
 * Each way in which a row lies outside the sample, as a sentence: a value beyond the range of its variable, or
 * a combination more remote than any row fitted. A derived variable is named only where no declared one is. A date is
 * not looked at: a model uses what is derived from it (a month, a count of days). Levels are checked before
 * (`unknownLevels`).
 */
export function outsideData(
  predictor: Predictor,
  columns: ReadonlyMap<string, Column>,
  rowCount: number,
): OutsideData {
  const { model, derive, ranges } = predictor;
  const isDerived = (name: string) => derive.some((plan) => plan.name === name);
  const declared = [...new Set(model.flatMap((name) => [...baseVariables(name, derive)]))];
  const groups = [declared, model.filter(isDerived)].map((names) =>
    names.flatMap((name) => {
      const range = ranges.get(name);
      const column = columns.get(name);
      return range === undefined || column?.kind !== 'number' ? [] : [{ name, range, values: column.values }];
    }),
  );
  // Nearly every row of a long list lies inside: variable by variable that is soon seen.
  const beyond = new Uint8Array(rowCount);
  for (const { range, values } of groups.flat()) {
    for (let row = 0; row < rowCount; row++) {
      if (values[row]! < range.smallest || values[row]! > range.largest) beyond[row] = 1;
    }
  }
  return (row, remote) => {
    if (beyond[row] === 1) {
      for (const group of groups) {
        const said = group.flatMap(({ name, range, values }) => {
          const value = values[row]!;
          if (value < range.smallest) {
            const [it, end] = apart(value, range.smallest);
            return [`${name} ${it} is below ${end}, the smallest in the data`];
          }
          if (value > range.largest) {
            const [it, end] = apart(value, range.largest);
            return [`${name} ${it} is above ${end}, the largest in the data`];
          }
          return [];
        });
        if (said.length > 0) return said;
      }
    }
    return remote ? REMOTE : INSIDE;
  };
}

const INSIDE: readonly string[] = [];
const REMOTE: readonly string[] = ['its combination of values is more remote than any row in the data'];

/** Two numbers with as many digits, six at least, as tell them apart: what is derived has digits beyond use. */
function apart(a: number, b: number): readonly [number, number] {
  for (let digits = 6; digits < 17; digits++) {
    const short = [Number(a.toPrecision(digits)), Number(b.toPrecision(digits))] as const;
    if (short[0] !== short[1]) return short;
  }
  return [a, b];
}

export interface UnknownLevel {
  readonly variable: string;
  readonly level: string;
  readonly known: readonly string[];
}

/** Per row, the levels that it has and may not have: such a row cannot be predicted. Null where no row has any. */
export function unknownLevels(
  needs: RowNeeds,
  columns: ReadonlyMap<string, Column>,
): ((row: number) => UnknownLevel[]) | null {
  const checks = [...needs.levels].flatMap(([variable, known]) => {
    const column = columns.get(variable);
    if (column?.kind !== 'category') return [];
    const strange = column.levels.map((level) => !known.includes(level));
    return strange.includes(true) ? [{ variable, known, column, strange }] : [];
  });
  if (checks.length === 0) return null;
  return (row) =>
    checks.flatMap(({ variable, known, column, strange }) => {
      const code = column.codes[row]!;
      return strange[code] === true ? [{ variable, level: column.levels[code]!, known }] : [];
    });
}
