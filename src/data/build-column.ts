import type { DataPlan, VariablePlan } from '../study/study.ts';
import type { ColumnFaults } from './faults.ts';
import { type DateReader, readIsoDate } from './read-date.ts';
import { flagTexts, readUsualFlag } from './read-flag.ts';
import { readNumber, readPlainNumber } from './read-number.ts';
import type { CategoryColumn, Column, TextColumn } from './table.ts';

/** Rows of cells, and the line on which each starts. */
export interface Rows {
  readonly cells: readonly (readonly string[])[];
  readonly lines: readonly number[];
}

/** Turns the cells of one column into values, batch by batch. */
export interface ColumnBuilder {
  readonly variable: VariablePlan;
  /**
   * Reads cell `faults.position` of every row; the first becomes row `base` of the table, which is expected to have
   * `expected` rows in all, or as many as there are.
   */
  readonly fill: (rows: Rows, base: number, expected: number) => void;
  /** The column, cut to the rows read. */
  readonly finish: (rowCount: number) => Column;
}

/** The builder for a variable's type. `readDate` is used by dates alone. */
export function buildColumn(
  plan: DataPlan,
  variable: VariablePlan,
  faults: ColumnFaults,
  readDate: DateReader | null,
): ColumnBuilder {
  const missing = new Set([...plan.missing, ...variable.missing].map((text) => text.trim()));
  switch (variable.type) {
    case 'number':
    case 'integer':
      return buildNumbers(variable, faults, missing, plan.format.decimalMark);
    case 'flag':
      return buildFlags(variable, faults, missing);
    case 'date':
      return buildDates(variable, faults, missing, readDate ?? readIsoDate);
    case 'category':
      return buildCategory(variable, faults, missing);
    case 'text':
    case 'identifier':
      return buildTexts(variable, faults, missing);
  }
}

function buildNumbers(
  variable: VariablePlan,
  faults: ColumnFaults,
  missing: ReadonlySet<string>,
  decimalMark: '.' | ',',
): ColumnBuilder {
  const at = faults.position;
  const mark = decimalMark.charCodeAt(0);
  const whole = variable.type === 'integer';
  const least = variable.atLeast ?? Number.NEGATIVE_INFINITY;
  const most = variable.atMost ?? Number.POSITIVE_INFINITY;
  // A code such as -999 reads as a number, so its value is what tells cheaply that the text may be a code.
  const missingNumbers = new Set(
    [...missing].map((text) => readNumber(text, decimalMark)).filter((value) => Number.isFinite(value)),
  );
  const mayBeMissing = missingNumbers.size > 0;
  let values: Float64Array = new Float64Array(0);

  const readOther = (cell: string, row: number, line: number): number => {
    const text = cell.trim();
    if (missing.has(text)) return Number.NaN;
    const value = readNumber(text, decimalMark);
    if (Number.isNaN(value)) faults.add('cell_not_number', row, line, text);
    return value;
  };

  return {
    variable,
    fill: ({ cells, lines }, base, expected) => {
      const count = cells.length;
      values = withRoom(values, base + count, expected);
      for (let i = 0; i < count; i++) {
        const cell = cells[i]![at]!;
        let value = readPlainNumber(cell, mark);
        if (Number.isNaN(value) || (mayBeMissing && missingNumbers.has(value))) {
          value = readOther(cell, base + i, lines[i]!);
        }
        if (whole && !Number.isSafeInteger(value) && !Number.isNaN(value)) {
          faults.add('cell_not_integer', base + i, lines[i]!, cell.trim());
          value = Number.NaN;
        } else if (value < least || value > most) {
          faults.add('cell_out_of_range', base + i, lines[i]!, cell.trim());
          value = Number.NaN;
        }
        values[base + i] = value;
      }
    },
    finish: (rowCount) => ({
      kind: 'number',
      name: variable.name,
      values: values.subarray(0, rowCount),
    }),
  };
}

function buildFlags(
  variable: VariablePlan,
  faults: ColumnFaults,
  missing: ReadonlySet<string>,
): ColumnBuilder {
  const at = faults.position;
  const declared = variable.flagValues;
  const spelt: readonly [Set<string>, Set<string>] = [new Set(), new Set()];
  let values: Float64Array = new Float64Array(0);
  const read =
    declared === null
      ? readUsualFlag
      : (text: string): number => (text === declared[0] ? 0 : text === declared[1] ? 1 : Number.NaN);
  return {
    variable,
    fill: ({ cells, lines }, base, expected) => {
      const count = cells.length;
      values = withRoom(values, base + count, expected);
      for (let i = 0; i < count; i++) {
        const text = cells[i]![at]!.trim();
        const value = missing.has(text) ? Number.NaN : read(text);
        if (value === 0) spelt[0].add(text);
        else if (value === 1) spelt[1].add(text);
        else if (!missing.has(text)) faults.add('cell_not_flag', base + i, lines[i]!, text);
        values[base + i] = value;
      }
    },
    finish: (rowCount) => ({
      kind: 'flag',
      name: variable.name,
      values: values.subarray(0, rowCount),
      flagTexts: declared ?? flagTexts(spelt[0], spelt[1]),
    }),
  };
}

function buildDates(
  variable: VariablePlan,
  faults: ColumnFaults,
  missing: ReadonlySet<string>,
  readDate: DateReader,
): ColumnBuilder {
  const at = faults.position;
  const least = variable.atLeast ?? Number.NEGATIVE_INFINITY;
  const most = variable.atMost ?? Number.POSITIVE_INFINITY;
  let values: Float64Array = new Float64Array(0);
  return {
    variable,
    fill: ({ cells, lines }, base, expected) => {
      const count = cells.length;
      values = withRoom(values, base + count, expected);
      for (let i = 0; i < count; i++) {
        const text = cells[i]![at]!.trim();
        let value = Number.NaN;
        if (!missing.has(text)) {
          value = readDate(text);
          if (Number.isNaN(value)) {
            faults.add('cell_not_date', base + i, lines[i]!, text);
          } else if (value < least || value > most) {
            faults.add('cell_out_of_range', base + i, lines[i]!, text);
            value = Number.NaN;
          }
        }
        values[base + i] = value;
      }
    },
    finish: (rowCount) => ({
      kind: 'date',
      name: variable.name,
      values: values.subarray(0, rowCount),
    }),
  };
}

function buildCategory(
  variable: VariablePlan,
  faults: ColumnFaults,
  missing: ReadonlySet<string>,
): ColumnBuilder {
  const at = faults.position;
  const declared = variable.levels;
  const codeOf = new Map<string, number>(declared?.map((level, code) => [level, code]));
  let codes: Int32Array = new Int32Array(0);
  return {
    variable,
    fill: ({ cells, lines }, base, expected) => {
      const count = cells.length;
      codes = withRoom(codes, base + count, expected);
      for (let i = 0; i < count; i++) {
        const text = cells[i]![at]!.trim();
        let code = -1;
        if (!missing.has(text)) {
          const known = codeOf.get(text);
          if (known !== undefined) {
            code = known;
          } else if (declared === null && text !== '') {
            code = codeOf.size;
            codeOf.set(keep(text), code);
          } else {
            faults.add('cell_level_undeclared', base + i, lines[i]!, text);
          }
        }
        codes[base + i] = code;
      }
    },
    finish: (rowCount): CategoryColumn => {
      const kept = codes.subarray(0, rowCount);
      const levels = declared ?? [...codeOf.keys()].sort();
      if (declared === null) {
        // Found in the order of rows; the sorted order does not depend on it.
        const sorted = new Int32Array(levels.length);
        levels.forEach((level, code) => {
          sorted[codeOf.get(level)!] = code;
        });
        for (let i = 0; i < rowCount; i++) if (kept[i]! >= 0) kept[i] = sorted[kept[i]!]!;
      }
      const baseline = variable.baseline ?? levels[0] ?? '';
      return { kind: 'category', name: variable.name, codes: kept, levels, baseline };
    },
  };
}

function buildTexts(
  variable: VariablePlan,
  faults: ColumnFaults,
  missing: ReadonlySet<string>,
): ColumnBuilder {
  const at = faults.position;
  const identifier = variable.type === 'identifier';
  const values: (string | null)[] = [];
  return {
    variable,
    fill: ({ cells }) => {
      for (const row of cells) {
        const cell = row[at]!;
        const text = cell.trim();
        const absent = missing.has(text) || (identifier && text === '');
        values.push(absent ? null : keep(identifier ? text : cell));
      }
    },
    finish: (): TextColumn => ({ kind: 'text', name: variable.name, values }),
  };
}

/** V8 lets a substring of 13 characters or more keep its whole parent alive; a copy lets the parent go. */
function keep(text: string): string {
  return text.length < 13 ? text : ` ${text}`.slice(1);
}

/**
 * Values with room for as many as are needed, and then for as many as are expected. What is never written takes no memory, so
 * the finished column is not copied but cut.
 */
function withRoom<V extends Float64Array | Int32Array>(values: V, needed: number, expected: number): V {
  if (needed <= values.length) return values;
  const length = Math.max(1024, expected, needed > 1024 ? needed * 2 : 0);
  const larger = new (values.constructor as new (length: number) => V)(length);
  larger.set(values);
  return larger;
}
