// biome-ignore-all lint/suspicious/noTemplateCurlyInString: a study uses its parameters in this form.
import { type ColumnSeen, USUAL_MISSING } from './describe-column.ts';
import type { Proposed } from './propose-candidates.ts';

export interface DraftVariable {
  readonly name: string;
  /** Header of its column. */
  readonly column: string;
  readonly seen: ColumnSeen;
}

export interface Draft {
  /** The data file as seen from the study. */
  readonly file: string;
  readonly title: string;
  readonly delimiter: string;
  readonly encoding: 'utf-8' | 'latin-1';
  readonly decimalMark: '.' | ',';
  readonly rowCount: number;
  /** Rows with a value for everything that a candidate uses. */
  readonly rows: number;
  readonly variables: readonly DraftVariable[];
  /** Columns that cannot be declared, with the reason. */
  readonly leftOut: readonly string[];
  readonly response: string;
  readonly rowId: string | null;
  /** Where there is no `rowId`: a date that no two rows share. */
  readonly unique: string | null;
  readonly time: string | null;
  readonly candidates: readonly Proposed[];
}

/** The text of the study, with comments on what it takes from the data and what only the analyst can know. */
export function writeDraft(draft: Draft): string {
  const { file, delimiter, encoding, decimalMark, variables } = draft;
  const lines = [
    '# yaml-language-server: $schema=node_modules/plumbrule/schemas/study.schema.json',
    '# A first draft, made from the data alone. It runs as it is; the marks TODO ask for what only you can know.',
    'plumbrule: 1',
    `title: ${quoted(draft.title === '' ? 'A study' : draft.title)}  # TODO`,
    '# question: TODO Which decision is this to serve?',
    '',
    'data:',
    `  file: ${quoted(file)}`,
    `  format: { delimiter: ${quoted(delimiter)}, decimal_mark: ${quoted(decimalMark)}, encoding: ${encoding} }`,
    `  missing: [${USUAL_MISSING.map(quoted).join(', ')}]`,
    ...(draft.rowId === null
      ? [
          draft.unique === null
            ? '  # row_id: TODO No column tells every row apart; with one, a later run can be compared row by row.'
            : `  # row_id: TODO The dates in ${draft.unique} tell every row apart. Declare that column a second time, as an identifier, and name it here: a later run is then compared row by row.`,
        ]
      : [`  row_id: ${quoted(draft.rowId)}`]),
    ...(draft.time === null
      ? ['  # time: TODO A date or number that orders the rows, if they have an order.']
      : [`  time: ${quoted(draft.time)}`]),
    ...draft.leftOut.map((what) => comment(`  # Not declared: ${what}.`)),
    '  # Numbers take a unit ("unit: kg") and limits that no sound value passes (at_least, at_most); all take a label.',
    '  variables:',
    ...variables.flatMap(variableLines),
    '  on_bad_value: stop',
    '',
    '# leave_out:  # TODO Rows that do not belong to the question, each rule with its reason.',
    '#   - where: ...',
    '#     because: ...',
    '',
    `response: ${quoted(draft.response)}`,
    '',
    `# ${draft.rows} of ${draft.rowCount} rows have a value for everything below; no candidate has fewer than ten rows for`,
    '# each coefficient. TODO Put what you know of the matter in their place.',
    'candidates:',
    ...draft.candidates.flatMap(({ name, terms }) => [
      `  - name: ${quoted(name)}`,
      `    terms: [${terms.map(quoted).join(', ')}]`,
    ]),
    '',
    'selection:',
    '  rank_by: aicc',
    '  prefer_smaller_within: 2',
    '  # admit:  # TODO Signs that you would not believe otherwise, and other limits.',
    '  #   signs: { ... }',
    '',
    '# predict:  # TODO The rows that the decision is about.',
    '#   rows:',
    '#     - { label: ..., ... }',
    '',
    '# acceptance:  # TODO What must hold, run after run.',
    '#   adjusted_r_squared: { at_least: ... }',
  ];
  return `${lines.join('\n')}\n`;
}

/** Levels listed on a line of their own where there are many. */
const LONG = 100;

function variableLines({ name, column, seen }: DraftVariable): string[] {
  const { type, levels, pattern, missingCodes } = seen;
  const parts = [
    `type: ${type}`,
    ...(column === name ? [] : [`column: ${quoted(column)}`]),
    ...(levels.length === 0 ? [] : [`levels: [${levels.map(({ text }) => quoted(text)).join(', ')}]`]),
    ...(pattern === null ? [] : [`pattern: ${quoted(pattern)}`]),
    ...(missingCodes.length === 0 ? [] : [`missing: [${missingCodes.map(quoted).join(', ')}]`]),
  ];
  const notes = notesOf(seen);
  const line = `    ${quotedKey(name)}: { ${parts.join(', ')} }`;
  if (notes.length === 0) return [line];
  const note = comment(`# ${notes.join('; ')}`);
  return line.length + note.length > LONG ? [`    ${note}`, line] : [`${line}  ${note}`];
}

function notesOf({ type, range, missing, levels, otherPatterns }: ColumnSeen): string[] {
  const numeric = type === 'number' || type === 'integer';
  return [
    ...(numeric ? ['TODO unit'] : []),
    ...(range !== null && (numeric || type === 'date') ? [`seen ${range[0]} to ${range[1]}`] : []),
    ...(levels.length === 0 ? [] : [`rows: ${levels.map(({ rows }) => rows).join(', ')}`]),
    ...(missing === 0 ? [] : [`${missing} missing`]),
    ...(otherPatterns.length === 0 ? [] : [`TODO or is it ${otherPatterns.join(' or ')}?`]),
  ];
}

/** A comment on one line, whatever the data put into it. */
function comment(text: string): string {
  return text.replaceAll(/[\p{Cc}\u2028\u2029]/gu, ' ');
}

/** A value: "${" would stand for a parameter there. */
function quoted(text: string): string {
  return quotedKey(text).replaceAll('${', () => '$${');
}

/** A plain word as it is, all else in double quotes: JSON's form is YAML's as well. */
function quotedKey(text: string): string {
  const isPlain = /^[A-Za-z][A-Za-z0-9_]*(?: [A-Za-z0-9_]+)*$/.test(text);
  const hasMeaning = /^(?:true|false|null|yes|no|on|off|y|n|nan|inf)$/i.test(text);
  return isPlain && !hasMeaning ? text : JSON.stringify(text);
}
