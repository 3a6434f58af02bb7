import type { VariablePlan } from '../study/study.ts';
import type { Column, VariableSummary } from './table.ts';

/** What a column holds. `bad` cells were left empty because of a fault and are not counted as missing. */
export function summarise(variable: VariablePlan, column: Column, bad: number): VariableSummary {
  const base = { name: variable.name, type: variable.type };
  if (column.kind === 'text') {
    let missing = 0;
    for (const value of column.values) if (value === null) missing++;
    return { ...base, missing: missing - bad, smallest: null, largest: null, levels: null };
  }
  if (column.kind === 'category') {
    const { rows, missing } = countCodes(column.codes, column.levels.length);
    const levels = column.levels.map((level, code) => ({ level, rows: rows[code]! }));
    return { ...base, missing: missing - bad, smallest: null, largest: null, levels };
  }
  const { values } = column;
  const { present, ones, smallest, largest } = countNumbers(values);
  const missing = values.length - present - bad;
  if (column.kind === 'flag') {
    const [no, yes] = column.flagTexts ?? ['no', 'yes'];
    const levels = [
      { level: no, rows: present - ones },
      { level: yes, rows: ones },
    ];
    return { ...base, missing, smallest: null, largest: null, levels };
  }
  return {
    ...base,
    missing,
    smallest: present > 0 ? smallest : null,
    largest: present > 0 ? largest : null,
    levels: null,
  };
}

/** Loops of their own, each over one kind of values, which is what makes them quick. */
function countCodes(
  codes: Int32Array,
  levels: number,
): { readonly rows: Int32Array; readonly missing: number } {
  const rows = new Int32Array(levels);
  let missing = 0;
  for (let i = 0; i < codes.length; i++) {
    const code = codes[i]!;
    if (code < 0) missing++;
    else rows[code]!++;
  }
  return { rows, missing };
}

function countNumbers(values: Float64Array): {
  readonly present: number;
  readonly ones: number;
  readonly smallest: number;
  readonly largest: number;
} {
  let present = 0;
  let ones = 0;
  let smallest = Number.POSITIVE_INFINITY;
  let largest = Number.NEGATIVE_INFINITY;
  for (let i = 0; i < values.length; i++) {
    const value = values[i]!;
    if (Number.isNaN(value)) continue;
    present++;
    if (value === 1) ones++;
    if (value < smallest) smallest = value;
    if (value > largest) largest = value;
  }
  return { present, ones, smallest, largest };
}
