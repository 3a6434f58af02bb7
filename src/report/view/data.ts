import { count, isoDate, NONE, value, withUnit } from '../numbers.ts';
import type { RecordVariable, StudyRecord } from '../record-type.ts';
import type { SourceView, VariableView } from '../view.ts';
import { contractSentence, dateRange, ignoredSentence, lossReason, rowsSentence } from '../words/data.ts';
import { listed, stopped } from '../words/lexicon.ts';

const BAD_VALUES = 20;
const LEVELS = 8;

export function dataView(record: StudyRecord): SourceView {
  const { data } = record;
  const idle = data.variables.filter((v) => v.used_as.length === 1 && v.used_as[0] === 'declared only');
  return {
    sentence: rowsSentence(data),
    file: data.file,
    dates: dateRange(data),
    rowsRead: count(data.rows_read),
    rowsUsed: count(data.rows_used),
    losses: data.left_out
      .filter((loss) => loss.rows > 0 || loss.kind === 'left_out')
      .map((loss) => ({ rows: count(loss.rows), because: stopped(lossReason(loss)) })),
    variables: data.variables.filter((v) => !idle.includes(v)).map(variableView),
    unused: idle.length === 0 ? null : `Declared but not used: ${listed(idle.map((v) => v.name))}.`,
    contract: contractSentence(data),
    badValues: data.bad_values.slice(0, BAD_VALUES).map((bad) => ({
      row: count(bad.row),
      variable: bad.variable,
      text: bad.text,
      because: stopped(bad.because),
    })),
    ignored: ignoredSentence(data),
  };
}

function variableView(v: RecordVariable): VariableView {
  const shown = (x: number | null): string => (v.type === 'date' && x !== null ? isoDate(x) : value(x));
  const span = (low: number | null, high: number | null): string =>
    low === null || high === null ? NONE : withUnit(`${shown(low)} to ${shown(high)}`, v.unit);
  return {
    name: v.name,
    label: v.label,
    labelled: plainWords(v.label) !== plainWords(v.name) && v.label !== '',
    unit: v.unit ?? NONE,
    usedAs: v.used_as.join(', ') || NONE,
    range: v.levels === null ? span(v.smallest, v.largest) : levelList(v.levels),
    middle: v.levels === null ? span(v.lower_quartile, v.upper_quartile) : NONE,
    mean: v.levels === null && v.mean !== null ? withUnit(shown(v.mean), v.unit) : NONE,
    missing: count(v.missing),
    derivedFrom: v.derived_from,
  };
}

/** A label that only spells the name differently says nothing new. */
function plainWords(text: string): string {
  return text
    .toLowerCase()
    .replace(/[\s_-]+/g, ' ')
    .trim();
}

function levelList(levels: NonNullable<RecordVariable['levels']>): string {
  const shown = levels.slice(0, LEVELS).map(({ level, rows }) => `${level}\u00a0(${count(rows)})`);
  const more = levels.length - shown.length;
  return more > 0 ? `${shown.join(', ')} and ${more}\u00a0more` : shown.join(', ');
}
