import { changesChart } from '../chart/changes.ts';
import type { CoefficientChange, ComparedModel, Comparison } from '../comparison-type.ts';
import type {
  CoefficientChangeView,
  ComparedModelView,
  ComparisonView,
  SideView,
} from '../comparison-view.ts';
import { count, fixed, longDate, NONE, rounded, roundingFor, value, withUnit } from '../numbers.ts';
import type { StudyRecord } from '../record-type.ts';
import { comparedCriterionSentence, verdictWord } from '../words/acceptance.ts';
import {
  attentionLines,
  choiceSentences,
  contractChangeSentence,
  declarationChangeSentence,
  earlierUnitOf,
  largestChangeSentence,
  newRowsSentences,
  revisedSentence,
  rowsSentences,
  studySentence,
} from '../words/comparison.ts';
import { counted, type Lexicon, lexiconOf, raised, stopped, unitOf } from '../words/lexicon.ts';
import { fittedQuantity, fittedUnit } from '../words/scale.ts';

/** A comparison as people read it; `record` is the later of the two, whose names and units it takes. */
export function comparisonView(comparison: Comparison, record: StudyRecord): ComparisonView {
  const lexicon = lexiconOf(record);
  const { selection } = record;
  const choice = choiceSentences(comparison, selection);
  const newRows =
    comparison.new_rows === null ? [] : newRowsSentences(lexicon, comparison.new_rows, record.model);
  const [model] = comparison.models;
  const largest = model === undefined ? null : largestChangeSentence(model);
  return {
    title: comparison.later.title,
    question: record.study.question,
    tool: `${comparison.tool.name} ${comparison.tool.version}`,
    answer: [
      rowsSentences(comparison).join(' '),
      choice.slice(0, 2).join(' '),
      ...(largest === null ? [] : [largest]),
      ...newRows.slice(0, 2),
    ],
    attention: attentionLines(lexicon, comparison, selection),
    accepted: comparison.acceptance.map((criterion) => ({
      word: verdictWord(criterion.passed),
      sentence: comparedCriterionSentence(criterion),
    })),
    dated: comparison.earlier.first !== null || comparison.later.first !== null,
    sides: [sideView('before', comparison.earlier), sideView('now', comparison.later)],
    rows: rowsView(lexicon, comparison),
    contract: comparison.contract.map((change) =>
      raised(contractChangeSentence(lexicon, change, comparison.contract)),
    ),
    study: studySentence(comparison),
    declaration: comparison.declaration.changes.map((change) => raised(declarationChangeSentence(change))),
    choice,
    models: comparison.models.map((each, index) => modelView(lexicon, each, index)),
    newRows,
    cannotTell: comparison.cannot_tell,
  };
}

function sideView(when: string, side: Comparison['earlier']): SideView {
  const { first, last } = side;
  return {
    when,
    study: `${side.study_file} (${side.study_sha256.slice(0, 12)})`,
    data: `${side.data_file} (${side.data_sha256.slice(0, 12)})`,
    rows: `${count(side.rows_used)} of ${count(side.rows_read)}`,
    dates: first === null || last === null ? NONE : `${longDate(first)} to ${longDate(last)}`,
    chosen: side.chosen ?? 'none',
  };
}

/** Revised cells shown: enough to see what they are like, and what follows is not pushed away. */
const SHOWN_CELLS = 12;

function rowsView(lexicon: Lexicon, comparison: Comparison): ComparisonView['rows'] {
  const { rows } = comparison;
  const sentences = rowsSentences(comparison);
  if (rows === null) {
    return {
      sentences,
      revised: null,
      revisions: [],
      revisionsMore: null,
      addedList: null,
      removedList: null,
    };
  }
  const shown = (cell: number | string | null, unit: string | null) =>
    cell === null ? 'missing' : typeof cell === 'number' ? withUnit(value(cell, 10), unit) : cell;
  const revisions = rows.revisions.slice(0, SHOWN_CELLS);
  const more = rows.revision_count - revisions.length;
  const listedAll = rows.revisions.length === rows.revision_count;
  const where = listedAll ? 'all of them' : `the first ${count(rows.revisions.length)}`;
  return {
    sentences,
    revised: revisedSentence(comparison),
    revisions: revisions.map(({ id, variable, earlier, later }) => ({
      row: id,
      variable,
      earlier: shown(earlier, earlierUnitOf(lexicon, variable, comparison.contract)),
      later: shown(later, unitOf(lexicon, variable)),
    })),
    revisionsMore:
      more > 0
        ? `${counted(more, 'more cell was', 'more cells were', count)} revised; comparison.json lists ${where}.`
        : null,
    addedList: listOf('New', rows.added_rows, rows.added),
    removedList: listOf('Gone', rows.removed_rows, rows.removed),
  };
}

function listOf(word: string, names: readonly string[], all: number): string | null {
  if (all === 0) return null;
  const more = all - names.length;
  return `${word}: ${names.join(', ')}${more > 0 ? ` and ${count(more)}\u00a0more` : ''}.`;
}

const CHOSEN_WORDS = {
  both: 'chosen before and now',
  later: 'chosen now',
  earlier: 'chosen before',
} as const;

function modelView(lexicon: Lexicon, model: ComparedModel, index: number): ComparedModelView {
  const unit = fittedUnit(lexicon.response);
  const { before, after } = model.residual_standard_error;
  const rounding = roundingFor(before ?? 0, before === null ? null : before / 10);
  const quantity = fittedQuantity(lexicon.response);
  return {
    heading: `${model.candidate}, ${CHOSEN_WORDS[model.chosen]}`,
    finding: largestChangeSentence(model),
    note: model.note === null ? null : stopped(model.note),
    quantity: unit === null ? quantity : `${quantity} in ${unit}`,
    scatter:
      before === null || after === null
        ? null
        : `The residual standard error goes from ${withUnit(rounded(before, rounding), unit)} to ${withUnit(rounded(after, rounding), unit)}.`,
    chart: changesChart(model, `changes-${index + 1}`),
    coefficients: model.coefficients.map(coefficientView),
  };
}

function coefficientView(c: CoefficientChange): CoefficientChangeView {
  const rounding = roundingFor(c.before ?? c.after ?? 0, c.before_standard_error ?? c.after_standard_error);
  const part = (x: number | undefined) => (x === undefined ? NONE : x === 0 ? '0' : rounded(x, rounding));
  const number = (x: number | null) => rounded(x, rounding);
  return {
    name: c.name,
    unit: c.unit === null ? '' : `per ${c.unit}`,
    before: number(c.before),
    after: number(c.after),
    difference: number(c.difference),
    removed: part(c.parts?.removed),
    revised: part(c.parts?.revised),
    added: part(c.parts?.added),
    declaration: part(c.parts?.declaration),
    inErrors: fixed(c.in_standard_errors, 2),
  };
}
