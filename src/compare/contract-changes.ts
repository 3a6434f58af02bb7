import { nearest } from '../expression/nearest.ts';
import type { KeptRows } from '../record/read-sample.ts';
import type { RecordVariable, StudyRecord } from '../record/record.ts';
import type { ContractChange } from './comparison.ts';
import { cellOf, type MatchedRows } from './match-rows.ts';
import { rescaled } from './rescaled.ts';

/** A share that grows by less is no change worth a line. */
const SHARE = 0.005;

/** The rows of both records where they were kept. */
export interface RowPairs {
  readonly earlier: KeptRows;
  readonly later: KeptRows;
  readonly matched: MatchedRows;
}

type Change = ContractChange;

/** What changed in the data as the contract describes it, variable by variable, then the file as a whole. */
export function contractChanges(
  before: StudyRecord,
  now: StudyRecord,
  pairs: RowPairs | null,
): ContractChange[] {
  const declared = (record: StudyRecord) =>
    record.data.variables.filter((variable) => variable.derived_from === null);
  const later = new Map(declared(now).map((variable) => [variable.name, variable]));
  return [
    ...variablesThatChanged(declared(before), declared(now)),
    ...declared(before).flatMap((was) => {
      const is = later.get(was.name);
      return is === undefined ? [] : variableChanges(was, is, before, now, pairs);
    }),
    ...columnsThatChanged(before.data.columns_ignored, now.data.columns_ignored),
    ...wholeFile(before, now),
  ];
}

function change(kind: Change['kind'], variable: string | null, rest: Partial<Change> = {}): Change {
  return { kind, variable, name: null, likely: null, because: null, earlier: null, later: null, ...rest };
}

function variablesThatChanged(before: readonly RecordVariable[], now: readonly RecordVariable[]): Change[] {
  const names = (variables: readonly RecordVariable[]) => variables.map(({ name }) => name);
  const fresh = names(now).filter((name) => !names(before).includes(name));
  const gone = names(before).filter((name) => !names(now).includes(name));
  return [
    ...gone.map((name) => {
      const likely = nearest(name, fresh);
      return change('variable_gone', name, { likely, because: likely === null ? null : 'spelling' });
    }),
    ...fresh.map((name) => change('variable_new', name)),
  ];
}

function columnsThatChanged(before: readonly string[], now: readonly string[]): Change[] {
  const fresh = now.filter((name) => !before.includes(name));
  return [
    ...before
      .filter((name) => !now.includes(name))
      .map((name) => {
        const likely = nearest(name, fresh);
        return change('column_gone', null, { name, likely, because: likely === null ? null : 'spelling' });
      }),
    ...fresh.map((name) => change('column_new', null, { name })),
  ];
}

function variableChanges(
  was: RecordVariable,
  is: RecordVariable,
  before: StudyRecord,
  now: StudyRecord,
  pairs: RowPairs | null,
): Change[] {
  const { name } = was;
  const missing = (variable: RecordVariable, { data }: StudyRecord) =>
    variable.missing / Math.max(1, data.rows_read);
  const [a, b] = [missing(was, before), missing(is, now)];
  return [
    ...(was.type === is.type ? [] : [change('type', name, { earlier: was.type, later: is.type })]),
    ...(was.unit === is.unit
      ? []
      : [change('unit', name, { earlier: was.unit ?? 'none', later: is.unit ?? 'none' })]),
    ...(was.type === 'category' && is.type === 'category' ? levelChanges(was, is, before, now, pairs) : []),
    ...(pairs === null ? [] : rescaledChange(name, pairs)),
    ...rangeChanges(was, is),
    ...(b > a + SHARE ? [change('missing', name, { earlier: [a], later: [b] })] : []),
  ];
}

function levelChanges(
  was: RecordVariable,
  is: RecordVariable,
  before: StudyRecord,
  now: StudyRecord,
  pairs: RowPairs | null,
): Change[] {
  const inUse = (variable: RecordVariable) =>
    new Map((variable.levels ?? []).filter(({ rows }) => rows > 0).map(({ level, rows }) => [level, rows]));
  const [had, after] = [inUse(was), inUse(is)];
  const fresh = [...after.keys()].filter((level) => !had.has(level));
  // Texts that broke the contract may be a level under a new name.
  const broken = textsAgainst(was.name, now);
  const gone = [...had].filter(([level]) => !after.has(level));
  const renamed = gone.map(([level, rows]) =>
    change('level_gone', was.name, {
      name: level,
      earlier: [rows],
      ...likelyName(was.name, level, fresh, broken, pairs),
    }),
  );
  // Those that broke it before are no news.
  const known = new Set(textsAgainst(was.name, before));
  const news = [...new Set(broken)].filter((text) => !known.has(text));
  return [
    ...renamed,
    ...fresh.map((level) => change('level_new', was.name, { name: level, later: [after.get(level)!] })),
    ...undeclaredLevels(was.name, news, renamed),
  ];
}

/** Texts that break the contract of a category and are not taken for the new name of a level that is gone. */
function undeclaredLevels(variable: string, broken: readonly string[], renamed: readonly Change[]): Change[] {
  const explained = new Set(renamed.map(({ likely }) => likely));
  return broken
    .filter((text) => !explained.has(text))
    .map((text) => change('level_undeclared', variable, { name: text }));
}

function rescaledChange(variable: string, { earlier, later, matched }: RowPairs): Change[] {
  const line = rescaled(variable, earlier, later, matched);
  if (line === null) return [];
  return [change('rescaled', variable, { later: [line.following, line.revised, line.offset, line.factor] })];
}

/** The listed texts that break the contract of a variable. */
function textsAgainst(variable: string, { data }: StudyRecord): string[] {
  return data.bad_values.filter((bad) => bad.variable === variable).map((bad) => bad.text);
}

/** The new name of a level: what every kept row that had it has now, what breaks the contract in its place, or the nearest in spelling. */
function likelyName(
  variable: string,
  level: string,
  fresh: readonly string[],
  broken: readonly string[],
  pairs: RowPairs | null,
): Pick<Change, 'likely' | 'because'> {
  const moved = pairs === null ? null : movedTo(variable, level, pairs);
  if (moved !== null && fresh.includes(moved)) return { likely: moved, because: 'rows' };
  const inPlace = mostOf(broken);
  if (inPlace !== null) return { likely: inPlace, because: 'contract' };
  const near = nearest(level, [...new Set([...fresh, ...broken])]);
  return { likely: near, because: near === null ? null : 'spelling' };
}

/** Cells that say the same against the contract this often are no slips. */
const NO_SLIP = 3;

/** The text that more than half of the cells have, where they are no mere slips. */
function mostOf(texts: readonly string[]): string | null {
  const counts = new Map<string, number>();
  for (const text of texts) counts.set(text, (counts.get(text) ?? 0) + 1);
  const [most] = [...counts].sort((a, b) => b[1] - a[1]);
  return most !== undefined && most[1] >= NO_SLIP && most[1] > texts.length / 2 ? most[0] : null;
}

function movedTo(variable: string, level: string, { earlier, later, matched }: RowPairs): string | null {
  const before = earlier.columns.get(variable);
  const now = later.columns.get(variable);
  if (matched.by !== 'row_id' || before?.kind !== 'category' || now?.kind !== 'category') return null;
  const code = before.levels.indexOf(level);
  let found: string | null = null;
  for (let k = 0; k < matched.keptEarlier.length; k++) {
    if (before.codes[matched.keptEarlier[k]!] !== code) continue;
    const value = cellOf(now, matched.keptLater[k]!);
    if (typeof value !== 'string' || (found !== null && found !== value)) return null;
    found = value;
  }
  return found;
}

/** Of numbers; dates go on by themselves. */
function rangeChanges(was: RecordVariable, is: RecordVariable): Change[] {
  if (was.type === 'date' || is.type === 'date') return [];
  const range = (variable: RecordVariable) =>
    variable.smallest === null || variable.largest === null ? null : [variable.smallest, variable.largest];
  const [a, b] = [range(was), range(is)];
  if (a === null || b === null) return [];
  const wider = b[0]! < a[0]! || b[1]! > a[1]!;
  const { median } = is;
  const outside =
    median !== null &&
    was.lower_quartile !== null &&
    was.upper_quartile !== null &&
    (median < was.lower_quartile || median > was.upper_quartile);
  return [
    ...(wider ? [change('range', was.name, { earlier: a, later: b })] : []),
    ...(outside
      ? [
          change('middle', was.name, {
            earlier: [was.lower_quartile!, was.upper_quartile!],
            later: [median],
          }),
        ]
      : []),
  ];
}

function wholeFile({ data: before }: StudyRecord, { data: now }: StudyRecord): Change[] {
  const lost = (data: StudyRecord['data']) => (data.rows_read - data.rows_used) / Math.max(1, data.rows_read);
  return [
    ...(now.bad_value_count > before.bad_value_count
      ? [change('bad_values', null, { earlier: [before.bad_value_count], later: [now.bad_value_count] })]
      : []),
    ...(lost(now) > lost(before) + SHARE
      ? [change('rows_lost', null, { earlier: [lost(before)], later: [lost(now)] })]
      : []),
  ];
}
