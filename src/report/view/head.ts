import type { ComparedCriterion } from '../comparison-type.ts';
import { count, percent, rangeWithUnit, rounded, withUnit } from '../numbers.ts';
import type { StudyRecord } from '../record-type.ts';
import type { CriterionView, HeadPrediction, HeadView } from '../view.ts';
import {
  acceptanceSentence,
  acceptanceValue,
  againstEarlierSentence,
  criterionLabel,
  needsEarlierSentence,
  verdictWord,
} from '../words/acceptance.ts';
import { answerSentences, fitSentence } from '../words/answer.ts';
import { bewareLines } from '../words/beware.ts';
import { studyLine } from '../words/data.ts';
import { estimatedCandidate } from '../words/estimated.ts';
import { counted, type Lexicon } from '../words/lexicon.ts';
import { modelsLookedAt } from '../words/models.ts';
import { predictionRounding } from '../words/prediction.ts';
import { fittedUnit } from '../words/scale.ts';

const ROWS = 8;

/** @param verdicts what came of the criteria that need an earlier record; null where they are not judged */
export function headView(
  record: StudyRecord,
  lexicon: Lexicon,
  verdicts: readonly ComparedCriterion[] | null,
): HeadView {
  const chosen = estimatedCandidate(record);
  return {
    answer: answerSentences(record, lexicon),
    fit: chosen === undefined ? null : fitSentence(lexicon, chosen, modelsLookedAt(record)),
    predictions: headPredictions(record, lexicon),
    predictionConfidence: percent(record.study.prediction_interval),
    predictionsMore: furtherRows(record.predictions.length - ROWS),
    beware: bewareLines(record, lexicon),
    acceptance: accepted(record, verdicts),
    criteria: [
      ...record.acceptance.map((c) => ({
        name: criterionLabel(c),
        value: acceptanceValue(c, fittedUnit(lexicon.response)),
        limit: c.limit,
        passed: c.passed,
        word: verdictWord(c.passed),
      })),
      ...(verdicts?.map(verdictView) ??
        (record.acceptance_against_earlier ?? []).map((c) => ({
          name: criterionLabel(c),
          value: 'needs an earlier record',
          limit: c.limit,
          passed: null,
          word: verdictWord(null),
        }))),
    ],
    line: studyLine(record),
  };
}

function accepted(record: StudyRecord, verdicts: readonly ComparedCriterion[] | null): string | null {
  const own = acceptanceSentence(record.acceptance);
  const against =
    verdicts === null
      ? needsEarlierSentence(record.acceptance_against_earlier)
      : againstEarlierSentence(verdicts);
  return [own, against].filter((text) => text !== null).join(' ') || null;
}

function verdictView(c: ComparedCriterion): CriterionView {
  const { passed } = c;
  return {
    name: criterionLabel(c),
    value: passed === null ? 'no row is new' : c.value === null ? 'cannot be told' : acceptanceValue(c, null),
    limit: c.limit,
    passed,
    word: verdictWord(passed),
  };
}

function furtherRows(more: number): string | null {
  if (more <= 0) return null;
  return `${counted(more, 'further row is', 'further rows are', count)} under “What does it predict?”.`;
}

function headPredictions(record: StudyRecord, { response }: Lexicon): HeadPrediction[] {
  const said = (p: {
    estimate: number;
    lower: number | null;
    upper: number | null;
  }): { estimate: string; interval: string } => {
    const rounding = predictionRounding(p);
    return {
      estimate: withUnit(rounded(p.estimate, rounding), response.unit),
      interval: rangeWithUnit(p.lower, p.upper, rounding, response.unit),
    };
  };
  const rows = record.predictions
    .slice(0, ROWS)
    .map((p) => ({ label: p.label, ...said(p), outside: p.outside.length > 0, total: false }));
  const total = record.prediction_total;
  return total === null ? rows : [...rows, { label: 'Total', ...said(total), outside: false, total: true }];
}
