import { nearest } from '../expression/nearest.ts';
import type { DataPlan, VariablePlan } from '../study/study.ts';
import { formatDate } from './format-date.ts';
import { overflows, readNumber } from './read-number.ts';

/** What can be wrong with one cell. */
export type CellFault =
  | 'cell_not_number'
  | 'cell_not_integer'
  | 'cell_not_date'
  | 'cell_not_flag'
  | 'cell_out_of_range'
  | 'cell_level_undeclared'
  | 'row_id_missing'
  | 'row_id_twice';

export interface FaultSentence {
  readonly message: string;
  readonly hint: string | null;
}

const STAND_INS = /^(?:|[-–—.?*]+|#?n\/?a\.?|n\.a\.|nan|null|none|nil|missing|unknown|#[\w/!?]+)$/i;

/** The sentence for one faulty cell, by its trimmed text, and what to do about it. */
export function faultSentence(
  plan: DataPlan,
  variable: VariablePlan,
  code: CellFault,
  text: string,
  earlierLine: number | null,
): FaultSentence {
  const cell = showText(text);
  switch (code) {
    case 'cell_not_number':
      return numberSentence(plan, text);
    case 'cell_not_integer':
      return Math.abs(readNumber(text, plan.format.decimalMark)) > Number.MAX_SAFE_INTEGER
        ? { message: `${cell} is too large to be held exactly as a whole number.`, hint: null }
        : {
            message: `${cell} is not a whole number.`,
            hint: `Declare ${variable.name} as type number if it may have decimals.`,
          };
    case 'cell_not_date': {
      const form =
        variable.pattern === null ? 'YYYY-MM-DD, with or without hh:mm' : `pattern "${variable.pattern}"`;
      const hint = variable.pattern === null ? 'Declare a pattern if dates are written another way.' : null;
      return { message: `${cell} is not a date (${form}).`, hint: missingHint(text) ?? hint };
    }
    case 'cell_not_flag': {
      const [no, yes] = variable.flagValues ?? [];
      const message =
        no === undefined
          ? `${cell} is not one of no/yes, false/true, 0/1 or n/y.`
          : `${cell} is neither "${no}" nor "${yes}".`;
      return { message, hint: missingHint(text) };
    }
    case 'cell_out_of_range':
      return rangeSentence(plan, variable, text);
    case 'cell_level_undeclared': {
      if (variable.levels === null) {
        return { message: `An empty cell is not a level of ${variable.name}.`, hint: missingHint('') };
      }
      const near = nearest(text, variable.levels);
      return {
        message: `${cell} is not a declared level of ${variable.name}.`,
        hint: near === null ? missingHint(text) : `Did you mean ${near}?`,
      };
    }
    case 'row_id_missing':
      return { message: 'The row has no identity.', hint: null };
    case 'row_id_twice':
      return { message: `${cell} already identifies the row in line ${earlierLine}.`, hint: null };
  }
}

/** What is wrong with one cell of a kind, and with several: "2 cells of fuel [are not numbers]". */
export const FAULT_KINDS: Readonly<Record<CellFault, readonly [one: string, several: string]>> = {
  cell_not_number: ['is not a number', 'are not numbers'],
  cell_not_integer: ['is not a whole number', 'are not whole numbers'],
  cell_not_date: ['is not a date', 'are not dates'],
  cell_not_flag: ['is not a flag', 'are not flags'],
  cell_out_of_range: ['is out of range', 'are out of range'],
  cell_level_undeclared: ['is not a declared level', 'are not declared levels'],
  row_id_missing: [
    'is missing, though it identifies its row,',
    'are missing, though they identify their rows,',
  ],
  row_id_twice: ['identifies an earlier row too', 'identify earlier rows too'],
};

/** A cell's text for a sentence: quoted, on one line, cut where it is long. */
export function showText(text: string): string {
  const line = text
    .slice(0, 61)
    // biome-ignore lint/suspicious/noControlCharactersInRegex: control characters are what must not reach a terminal
    .replace(/[\u0000-\u001f\u007f-\u009f\u2028\u2029]/g, (character) =>
      character === '\n'
        ? '\\n'
        : character === '\r'
          ? '\\r'
          : character === '\t'
            ? '\\t'
            : `\\u${character.charCodeAt(0).toString(16).padStart(4, '0')}`,
    );
  return text.length > 60 ? `"${line.slice(0, 60)}…"` : `"${line}"`;
}

function numberSentence(plan: DataPlan, text: string): FaultSentence {
  const mark = plan.format.decimalMark;
  const cell = showText(text);
  if (overflows(text, mark)) {
    return { message: `${cell} is beyond the largest number that can be held.`, hint: null };
  }
  const message = `${cell} is not a number with decimal mark "${mark}".`;
  const missing = missingHint(text);
  if (missing !== null) return { message, hint: missing };
  const other = mark === '.' ? ',' : '.';
  if (
    /^[+-]?\d{1,3}(?:[ \u00a0\u202f',.]\d{3})+(?:[.,]\d+)?$/.test(text) &&
    !/^[+-]?\d+[.,]\d+$/.test(text)
  ) {
    return { message, hint: 'Write numbers without a separator of thousands.' };
  }
  if (Number.isFinite(readNumber(text, other))) {
    return { message, hint: `Declare decimal_mark: "${other}" if the file writes numbers with it.` };
  }
  return { message, hint: null };
}

function rangeSentence(plan: DataPlan, variable: VariablePlan, text: string): FaultSentence {
  const show = (limit: number): string =>
    variable.type === 'date'
      ? formatDate(limit)
      : `${limit}${variable.unit === null ? '' : ` ${variable.unit}`}`;
  const { atLeast, atMost } = variable;
  const value = readNumber(text, plan.format.decimalMark);
  const cell = showText(text);
  const below = atLeast !== null && (atMost === null || value < atLeast);
  if (variable.type === 'date' && atLeast !== null && atMost !== null) {
    return { message: `${cell} is not between ${show(atLeast)} and ${show(atMost)}.`, hint: null };
  }
  return {
    message: below
      ? `${cell} is below ${show(atLeast)}, the least that ${variable.name} may be.`
      : `${cell} is above ${show(atMost ?? Number.NaN)}, the most that ${variable.name} may be.`,
    hint: null,
  };
}

function missingHint(text: string): string | null {
  if (text === '') return 'Add "" to data.missing if an empty cell means a missing value.';
  return STAND_INS.test(text) ? `Add ${showText(text)} to data.missing if it means a missing value.` : null;
}
