import { bootstrapChart, twoIntervals } from '../chart/bootstrap.ts';
import { fittedObservedChart } from '../chart/fitted-observed.ts';
import { count, value } from '../numbers.ts';
import type { RecordCoefficient, RecordExamination, StudyRecord } from '../record-type.ts';
import type { AgainstRowsView, TrustView } from '../view.ts';
import { bootstrapFinding, bootstrapMethod } from '../words/bootstrap.ts';
import { estimatedCandidate } from '../words/estimated.ts';
import { counted, type Lexicon } from '../words/lexicon.ts';
import { dependenciesView } from './dependencies.ts';
import { findingViews } from './findings.ts';
import { influenceView } from './influence.ts';
import { unseenView } from './unseen.ts';

export function trustView(record: StudyRecord, lexicon: Lexicon): TrustView | null {
  const { examination, model } = record;
  if (examination === null || model === null) return null;
  const candidate = estimatedCandidate(record);
  const coefficients = candidate?.coefficients ?? [];
  return {
    summary: summarySentence(examination),
    unseen: unseenView(record, lexicon),
    ...findingViews(lexicon, examination),
    dependencies: dependenciesView(examination),
    drawnAgain: drawnAgain(examination, coefficients),
    fitted: fittedObservedChart(lexicon, examination.points, model),
    counts: countSentences(examination),
    ...influenceView(record, lexicon, coefficients),
    arithmetic: arithmeticSentence(candidate?.arithmetic ?? 'plain'),
  };
}

function summarySentence({ findings }: RecordExamination): string {
  const care = findings.filter((f) => f.concern === 2).length;
  const look = findings.filter((f) => f.concern === 1).length;
  const asked = `${counted(findings.length, 'question')} put to the model`;
  if (care === 0 && look === 0) return `${asked}; none calls for care.`;
  const parts = [
    ...(care > 0 ? [`${care} to take care over`] : []),
    ...(look > 0 ? [`${look} worth a look`] : []),
  ];
  return `${asked}: ${parts.join(', ')}.`;
}

function drawnAgain(
  { bootstrap }: RecordExamination,
  coefficients: readonly RecordCoefficient[],
): AgainstRowsView | null {
  if (bootstrap === null || bootstrap === undefined) return null;
  const intervals = twoIntervals(bootstrap, coefficients);
  const finding = bootstrapFinding(intervals);
  return { finding, method: bootstrapMethod(bootstrap), chart: bootstrapChart(intervals, finding) };
}

function countSentences({ counts }: RecordExamination): string[] {
  const n = counts.rows;
  return [
    `Of ${counted(n, 'row', 'rows', count)}, ${count(counts.beyond_2)} lie more than 2 standardised residuals from the model (about ${count(Math.round(n * 0.0455))} would be expected of normal errors) and ${count(counts.beyond_3)} more than 3 (about ${value(n * 0.0027, 2)}).`,
    `Leverage exceeds twice its mean in ${counted(counts.leverage_beyond_2p_over_n, 'row', 'rows', count)}, three times in ${count(counts.leverage_beyond_3p_over_n)} (customary marks).`,
  ];
}

function arithmeticSentence(arithmetic: 'extended' | 'refined' | 'plain'): string {
  switch (arithmetic) {
    case 'extended':
      return 'The chosen model was worked out in about twice the usual precision.';
    case 'refined':
      return 'The chosen model’s coefficients were refined until the correction was below the last digit.';
    case 'plain':
      return 'The chosen model was worked out in ordinary double precision.';
  }
}
