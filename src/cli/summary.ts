import type { RecordCandidate, StudyRecord } from '../record/record.ts';
import { count, fixed, percent, rangeWithUnit, rounded, withUnit } from '../report/numbers.ts';
import { acceptanceSentence, acceptanceValue, criterionLabel } from '../report/words/acceptance.ts';
import { answerSentences, fitSentence } from '../report/words/answer.ts';
import { bewareLines } from '../report/words/beware.ts';
import { contractSentence, dateRange, lossReason, rowsSentence } from '../report/words/data.ts';
import { concernWord } from '../report/words/finding.ts';
import { type Lexicon, lexiconOf } from '../report/words/lexicon.ts';
import { predictionRounding, totalSentence } from '../report/words/prediction.ts';
import { criterionName, criterionRounding, ruleSentences } from '../report/words/selection.ts';
import { termSentences } from '../report/words/term.ts';
import { type Paragraph, plumbLine, type Section, tableLines } from './plumb-line.ts';
import type { Terminal } from './terminal.ts';

/** Longest lists of candidates, terms and predictions; the report and the tables have all. */
const MOST = 8;

/** What a run found, in the order in which a reader asks. `places` says where results lie, for the last section. */
export function summary(record: StudyRecord, places: readonly string[], terminal: Terminal): string {
  const lexicon = lexiconOf(record);
  const sections: Section[] = [
    { label: 'asked', paragraphs: [record.study.title, ...present(record.study.question)] },
    { label: 'data', paragraphs: data(record) },
    { label: 'tried', paragraphs: tried(record) },
    { label: 'says', paragraphs: says(record, lexicon) },
    { label: 'trust', paragraphs: trust(record) },
    { label: 'predicts', paragraphs: predicts(record, lexicon) },
    { label: 'careful', paragraphs: bewareLines(record).map((text) => ({ mark: '·', text })) },
    { label: 'accepted', paragraphs: accepted(record) },
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
    ...losses.map((loss) => ({ mark: count(loss.rows).padStart(6), text: lossReason(loss) })),
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
    ruleSentences(selection, candidates.length).join(' '),
    ...tableLines(
      [
        { heading: 'rank', align: 'right' },
        { heading: 'candidate', align: 'left', widest: 32 },
        { heading: `${criterionName(selection.rank_by)}, from the best`, align: 'right' },
        { heading: 'coefficients', align: 'right' },
        { heading: '', align: 'left' },
      ],
      rows,
    ),
    ...(more > 0 ? [`${count(more)} more are in tables/candidates.csv.`] : []),
    selection.because,
  ];
}

function says(record: StudyRecord, lexicon: Lexicon): Paragraph[] {
  const { model } = record;
  const candidate = chosenCandidate(record);
  if (model === null || candidate === undefined) return answerSentences(record, lexicon);
  const more = model.terms.length - MOST;
  return [
    fitSentence(lexicon, candidate, record.candidates.length),
    ...model.terms
      .slice(0, MOST)
      .map((term) => termSentences(lexicon, term, model, candidate.coefficients).join(' '))
      .filter((text) => text !== '')
      .map((text) => ({ mark: '·', text })),
    ...(more > 0 ? [`${count(more)} more terms are in the report.`] : []),
  ];
}

function chosenCandidate(record: StudyRecord): RecordCandidate | undefined {
  return record.candidates.find((candidate) => candidate.name === record.selection.chosen);
}

/** One line per question; what to do about them stands under "careful". */
function trust(record: StudyRecord): Paragraph[] {
  const findings = record.examination?.findings ?? [];
  if (findings.length === 0) return [];
  return tableLines(
    [
      { heading: 'question', align: 'left', widest: 62 },
      { heading: 'finding', align: 'left' },
    ],
    findings.map((finding) => [finding.question, concernWord(finding.concern).toLowerCase()]),
  );
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
    ...tableLines(
      [
        { heading: 'row', align: 'left', widest: 28 },
        { heading: 'estimate', align: 'right' },
        { heading: `${percent(record.study.prediction_interval)} interval, new row`, align: 'right' },
        { heading: '', align: 'left' },
      ],
      rows,
    ),
    ...(more > 0 ? [`${count(more)} more are in tables/predictions.csv.`] : []),
    ...(total === null ? [] : [totalSentence(lexicon, total)]),
  ];
}

function accepted(record: StudyRecord): Paragraph[] {
  const sentence = acceptanceSentence(record.acceptance);
  if (sentence === null) return [];
  return [
    sentence,
    ...record.acceptance.map((criterion) => ({
      mark: criterion.passed ? 'met   ' : 'missed',
      text: `${criterionLabel(criterion.criterion)} ${acceptanceValue(criterion)}, asked for ${criterion.limit}`,
    })),
  ];
}
