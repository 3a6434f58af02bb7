import { basename, dirname, relative, resolve } from 'node:path';
import { nearest } from '../expression/nearest.ts';
import type { Problem, Report } from '../problem.ts';
import { type ColumnSeen, describeColumn, findDecimalMark } from './describe-column.ts';
import { proposeCandidates } from './propose-candidates.ts';
import { readCells } from './read-cells.ts';
import { type DraftVariable, writeDraft } from './write-draft.ts';

export interface DraftOptions {
  /** Header of the column to be explained. */
  readonly response: string;
  /** Where the study is going to lie; left out: the current folder. */
  readonly out?: string;
}

export interface Drafted {
  /** The study's text; null where none can be drafted. */
  readonly text: string | null;
  readonly problems: readonly Problem[];
}

/**
 * A first study from a data file: cells ─ columns and what they seem to hold ─ candidates ─ text. It runs as it is, and
 * says in comments what only the analyst can know.
 */
export async function draftStudy(dataPath: string, options: DraftOptions): Promise<Drafted> {
  const problems: Problem[] = [];
  const report: Report = (problem) => problems.push(problem);
  const cells = await readCells(dataPath, report);
  if (cells === null) return { text: null, problems };
  const decimalMark = findDecimalMark(cells.columns, cells.delimiter);
  const seen = cells.columns.map((column) => describeColumn(column, decimalMark));
  const { variables, leftOut } = nameColumns(cells.header, seen);
  const response = responseAmong(variables, options.response, dataPath, report);
  if (response === null) return { text: null, problems };

  const rowId = findRowId(variables, response);
  const time = variables.find((one) => one.seen.type === 'date' && one.seen.missing === 0) ?? null;
  const declared = variables.map((one) =>
    one === rowId ? { ...one, seen: { ...one.seen, type: 'identifier' as const } } : one,
  );
  const { candidates, rows } = proposeCandidates(
    response.seen.values,
    declared.filter(
      ({ name, seen: { type } }) =>
        name !== response.name && ['number', 'integer', 'flag', 'category'].includes(type),
    ),
  );
  const folder = options.out === undefined ? '.' : dirname(options.out);
  const text = writeDraft({
    file: relative(resolve(folder), resolve(dataPath)).replaceAll('\\', '/'),
    title: basename(dataPath).replace(/\.[^.]*(?:\.gz)?$/, ''),
    delimiter: cells.delimiter,
    encoding: cells.encoding,
    decimalMark,
    rowCount: cells.rowCount,
    rows,
    variables: declared,
    leftOut,
    response: response.name,
    rowId: rowId?.name ?? null,
    unique: variables.find(({ seen }) => seen.type === 'date' && seen.unique)?.name ?? null,
    time: time?.name ?? null,
    candidates,
  });
  return { text, problems };
}

const RESERVED = ['label', 'intercept', '__proto__'];

/** A name for each column that can be declared; headers that are empty or stand twice cannot be told apart. */
function nameColumns(
  header: readonly string[],
  seen: readonly ColumnSeen[],
): { readonly variables: DraftVariable[]; readonly leftOut: readonly string[] } {
  const variables: DraftVariable[] = [];
  const leftOut: string[] = [];
  const taken = new Set<string>();
  header.forEach((column, position) => {
    const isNamed = /^[^\s\p{Cc}`](?:[^\p{Cc}`]*[^\s\p{Cc}`])?$/u.test(column) && column.length <= 100;
    if (column === '' || header.indexOf(column) !== header.lastIndexOf(column)) {
      leftOut.push(
        column === '' ? `column ${position + 1}, which has no header` : `${column}, which stands twice`,
      );
      return;
    }
    const plain = isNamed && !RESERVED.includes(column) ? column : `column_${position + 1}`;
    const name = taken.has(plain) ? `column_${position + 1}_` : plain;
    taken.add(name);
    variables.push({ name, column, seen: seen[position]! });
  });
  return { variables, leftOut };
}

function responseAmong(
  variables: readonly DraftVariable[],
  wanted: string,
  file: string,
  report: Report,
): DraftVariable | null {
  const refuse = (message: string, hint?: string) => {
    report({
      code: 'draft_impossible',
      severity: 'error',
      place: { kind: 'file', file },
      message,
      ...(hint === undefined ? {} : { hint }),
    });
    return null;
  };
  const found = variables.find(({ name, column }) => column === wanted || name === wanted);
  if (found === undefined) {
    const columns = variables.map(({ column }) => column);
    const near = nearest(wanted, columns);
    const hint = near === null ? `It has ${columns.slice(0, 20).join(', ')}.` : `Did you mean ${near}?`;
    return refuse(`The data file has no column "${wanted}" to be explained.`, hint);
  }
  const { seen } = found;
  const numeric = seen.type === 'number' || seen.type === 'integer' ? found : asNumber(found);
  if (numeric === null)
    return refuse(`The column "${wanted}" does not hold numbers, and a response is a number.`);
  const values = numeric.seen.values.filter((value) => !Number.isNaN(value));
  if (values.length < 3) return refuse(`The column "${wanted}" has fewer than three numbers.`);
  if (values.every((value) => value === values[0]))
    return refuse(`The column "${wanted}" has the same value in every row; there is nothing to explain.`);
  variables.forEach((one, at) => {
    if (one === found) (variables as DraftVariable[])[at] = numeric;
  });
  return numeric;
}

/** A flag written as 0 and 1 is a number as well. */
function asNumber(variable: DraftVariable): DraftVariable | null {
  const { seen } = variable;
  if (seen.type !== 'flag' || !seen.isDigits) return null;
  return { ...variable, seen: { ...seen, type: 'integer', range: ['0', '1'] } };
}

/** The first column that tells rows apart and looks as if it were made to. */
function findRowId(variables: readonly DraftVariable[], response: DraftVariable): DraftVariable | null {
  const suits = ({ name, column, seen }: DraftVariable): boolean => {
    if (name === response.name || !seen.unique) return false;
    if (seen.type === 'identifier') return true;
    if (seen.type !== 'integer') return false;
    const called = /(?:^|[\s_.-])(?:id|no|nr|number|key|index|row)$|Id$|ID$/i.test(column);
    return called || seen.values.every((value, row) => row === 0 || value === seen.values[row - 1]! + 1);
  };
  return variables.find(suits) ?? null;
}
