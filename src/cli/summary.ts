import type { RecordCandidate, RecordModel, RecordTerm, StudyRecord } from '../record/record.ts';
import { count, fixed, percent, rangeWithUnit, rounded, withUnit } from '../report/numbers.ts';
import {
  acceptanceSentence,
  heldBelowSentence,
  missedSentences,
  needsEarlierSentence,
} from '../report/words/acceptance.ts';
import { answerSentences, fitSentence } from '../report/words/answer.ts';
import { bewareLines } from '../report/words/beware.ts';
import { contractSentence, dateRange, lossReason, rowsSentence } from '../report/words/data.ts';
import { estimatedCandidate } from '../report/words/estimated.ts';
import { concernWord } from '../report/words/finding.ts';
import { counted, type Lexicon, lexiconOf } from '../report/words/lexicon.ts';
import { modelsLookedAt } from '../report/words/models.ts';
import { predictionRounding, totalSentence } from '../report/words/prediction.ts';
import { fittedUnit } from '../report/words/scale.ts';
import { criterionName, criterionRounding, ruleSentences } from '../report/words/selection.ts';
import { stabilitySentences } from '../report/words/stability.ts';
import { termSentences } from '../report/words/term.ts';
import { unseenSentences } from '../report/words/unseen.ts';
import { type Paragraph, plumbLine, type Section } from './plumb-line.ts';
import type { Terminal } from './terminal.ts';

/** Longest lists of candidates, terms and predictions; the report and the tables have all. */
const MOST = 8;

/**
 * What a run found, in the order in which a reader asks. `places` says where results lie, for the last section;
 * `compared`, whether a comparison follows, which holds the criteria that need an earlier record.
 */
export function summary(
  record: StudyRecord,
  places: readonly string[],
  terminal: Terminal,
  compared = false,
): string {
  const lexicon = lexiconOf(record);
  const sections: Section[] = [
    { label: 'asked', paragraphs: [record.study.title, ...present(record.study.question)] },
    { label: 'data', paragraphs: data(record) },
    { label: 'tried', paragraphs: tried(record) },
    { label: 'says', paragraphs: says(record, lexicon) },
    { label: 'trust', paragraphs: trust(record, lexicon) },
    { label: 'predicts', paragraphs: predicts(record, lexicon) },
    { label: 'careful', paragraphs: bewareLines(record, lexicon).map((text) => ({ mark: '·', text })) },
    { label: 'accepted', paragraphs: accepted(record, lexicon, compared) },
    { label: 'written', paragraphs: places.map((line) => ({ line })) },
  ];
  return plumbLine(
    sections.filter((section) => section.paragraphs.length > 0),
    terminal,
  );
}

function present(text: string | null): string[] {
  return text === null ? [] : [text];
}

function data(record: StudyRecord): Paragraph[] {
  const { left_out: losses, bad_value_count: bad } = record.data;
  const dates = dateRange(record.data);
  return [
    `${record.data.file}${dates === null ? '' : `, ${dates}`}. ${rowsSentence(record.data)}`,
    ...losses
      .filter((loss) => loss.rows > 0)
      .map((loss) => ({ mark: count(loss.rows).padStart(6), text: lossReason(loss) })),
    ...(bad > 0 ? [contractSentence(record.data)] : []),
  ];
}

function tried(record: StudyRecord): Paragraph[] {
  const { selection, candidates } = record;
  const byName = new Map(candidates.map((candidate) => [candidate.name, candidate]));
  const rounding = criterionRounding(selection);
  const rows = selection.ranking.slice(0, MOST).map((entry) => {
    const candidate = byName.get(entry.candidate);
    return [
      String(entry.rank),
      entry.candidate,
      fixed(entry.difference, rounding.decimals),
      candidate === undefined ? '' : count(candidate.coefficient_count),
      entry.candidate === selection.chosen ? 'chosen' : candidate?.admitted ? '' : 'refused',
    ];
  });
  const more = candidates.length - rows.length;
  return [
    ruleSentences(record).join(' '),
    {
      columns: [
        { heading: 'rank', align: 'right' },
        { heading: 'candidate', align: 'left', shrinks: true },
        { heading: `${criterionName(selection.rank_by)}, from the best`, align: 'right' },
        { heading: 'coefficients', align: 'right' },
        { heading: '', align: 'left' },
      ],
      rows,
    },
    ...(more > 0 ? [`${count(more)} more are in tables/candidates.csv.`] : []),
    selection.because,
    ...refusals(record),
  ];
}

/** Each refused candidate of the table with its first reason, those apart that the choice itself has told. */
function refusals({ selection, candidates }: StudyRecord): Paragraph[] {
  return selection.ranking.slice(0, MOST).flatMap(({ candidate: name }) => {
    const reasons = candidates.find((candidate) => candidate.name === name)?.refused_because ?? [];
    const [first] = reasons;
    if (first === undefined || selection.because.includes(first)) return [];
    const more = reasons.length - 1;
    const further =
      more === 0 ? '' : ` ${counted(more, 'more reason stands', 'more reasons stand', count)} in the report.`;
    return [{ mark: '·', text: `${name} was refused. ${first}${further}` }];
  });
}

function says(record: StudyRecord, lexicon: Lexicon): Paragraph[] {
  const { model } = record;
  const candidate = estimatedCandidate(record);
  if (model === null || candidate === undefined) return answerSentences(record, lexicon);
  const more = model.terms.length - MOST;
  return [
    fitSentence(lexicon, candidate, modelsLookedAt(record)),
    ...model.terms
      .slice(0, MOST)
      .map((term) => termInBrief(lexicon, term, model, candidate))
      .filter((text) => text !== '')
      .map((text) => ({ mark: '·', text })),
    ...(more > 0 ? [`${count(more)} more terms are in the report.`] : []),
  ];
}

/** Sentences of one term that a terminal shows. */
const MOST_OF_A_TERM = 4;

/** A category's levels and an interaction's places each have a sentence; of the rest the first says most. */
function termInBrief(
  lexicon: Lexicon,
  term: RecordTerm,
  model: RecordModel,
  candidate: RecordCandidate,
): string {
  const sentences = termSentences(lexicon, term, model, candidate.coefficients);
  if (term.kind !== 'category' && term.kind !== 'interaction') return sentences[0] ?? '';
  const more = sentences.length - MOST_OF_A_TERM;
  const rest =
    more > 0 ? [`${counted(more, 'more of these is', 'more of these are', count)} in the report.`] : [];
  return [...sentences.slice(0, MOST_OF_A_TERM), ...rest].join(' ');
}

/** The questions that found something; what to do about them stands under "careful". */
function trust(record: StudyRecord, lexicon: Lexicon): Paragraph[] {
  const findings = record.examination?.findings ?? [];
  const found = findings.filter((finding) => finding.concern > 0);
  // Of what rows not seen and rows drawn anew say, the finding; how it was found stands in the report.
  const [unseen] = unseenSentences(record, lexicon);
  const { stability, chosen } = record.selection;
  const tested = [
    ...(unseen === undefined ? [] : [unseen]),
    ...(stability === undefined ? [] : stabilitySentences(stability, chosen).slice(0, 1)),
  ];
  if (findings.length === 0) return tested;
  const quiet = findings.length - found.length;
  return [
    ...tested,
    ...(found.length === 0
      ? []
      : [
          {
            columns: [
              { heading: 'question', align: 'left' as const, shrinks: true },
              { heading: 'finding', align: 'left' as const },
            ],
            rows: found.map((finding) => [finding.question, concernWord(finding.concern).toLowerCase()]),
          },
        ]),
    found.length === 0
      ? `${counted(quiet, 'question was', 'questions were')} put to it, with nothing to see.`
      : `${counted(quiet, 'more question was', 'more questions were')} put to it, with nothing to see.`,
  ];
}

function accepted(record: StudyRecord, { response }: Lexicon, compared: boolean): Paragraph[] {
  const { acceptance, acceptance_against_earlier: later } = record;
  return [
    ...present(acceptanceSentence(acceptance)),
    ...missedSentences(acceptance, fittedUnit(response)).map((text) => ({ mark: '·', text })),
    ...present(compared ? heldBelowSentence(later) : needsEarlierSentence(later)),
  ];
}

function predicts(record: StudyRecord, lexicon: Lexicon): Paragraph[] {
  const { predictions, prediction_total: total } = record;
  if (predictions.length === 0) return [];
  const { unit } = lexicon.response;
  const rows = predictions.slice(0, MOST).map((prediction) => {
    const rounding = predictionRounding(prediction);
    return [
      prediction.label,
      withUnit(rounded(prediction.estimate, rounding), unit),
      rangeWithUnit(prediction.lower, prediction.upper, rounding, unit),
      prediction.outside.length > 0 ? 'outside the data' : '',
    ];
  });
  const more = predictions.length - rows.length;
  return [
    {
      columns: [
        { heading: 'row', align: 'left', shrinks: true },
        { heading: 'estimate', align: 'right' },
        { heading: `${percent(record.study.prediction_interval)} interval, new row`, align: 'right' },
        { heading: '', align: 'left' },
      ],
      rows,
    },
    ...(more > 0 ? [`${count(more)} more are in tables/predictions.csv.`] : []),
    ...(total === null ? [] : [totalSentence(lexicon, total)]),
  ];
}
