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
    const rows = new Array<number>(column.levels.length).fill(0);
    let missing = 0;
    for (const code of column.codes) {
      if (code < 0) missing++;
      else rows[code]!++;
    }
    const levels = column.levels.map((level, code) => ({ level, rows: rows[code]! }));
    return { ...base, missing: missing - bad, smallest: null, largest: null, levels };
  }
  const { values } = column;
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
