import { fittedObservedChart } from '../chart/fitted-observed.ts';
import { influenceChart } from '../chart/influence.ts';
import { residualsFittedChart, residualsPredictorChart, residualsTimeChart } from '../chart/residuals.ts';
import type { Figure } from '../chart/svg.ts';
import { count, fixed, NONE, rounded, roundingFor, significant, value } from '../numbers.ts';
import type { RecordExamination, StudyRecord } from '../record-type.ts';
import type { FindingView, TrustView } from '../view.ts';
import { estimatedCandidate } from '../words/estimated.ts';
import { concernWord, evidence } from '../words/finding.ts';
import { counted, type Lexicon, stopped } from '../words/lexicon.ts';

export function trustView(record: StudyRecord, lexicon: Lexicon): TrustView | null {
  const { examination, model } = record;
  if (examination === null || model === null) return null;
  const candidate = estimatedCandidate(record);
  return {
    summary: summarySentence(examination),
    findings: withCharts(lexicon, examination),
    fitted: fittedObservedChart(lexicon, examination.points, model),
    counts: countSentences(examination),
    rows: rowViews(examination, model.residual_standard_error),
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

/** Each drawing stands beside the question that it answers; one whose question is absent goes to the last. */
function withCharts(lexicon: Lexicon, examination: RecordExamination): FindingView[] {
  const { points, findings } = examination;
  const drawings: { answers: string; figure: Figure | null }[] = [
    { answers: 'equal_spread', figure: residualsFittedChart(lexicon, points) },
    { answers: 'equal_spread', figure: residualsPredictorChart(lexicon, points) },
    { answers: 'independence', figure: residualsTimeChart(lexicon, points) },
    { answers: 'influence', figure: influenceChart(examination) },
  ];
  const used = new Set<Figure>();
  const views = findings.map((finding) => {
    const charts = drawings.flatMap(({ answers, figure }) =>
      answers === finding.name && figure !== null ? [figure] : [],
    );
    for (const chart of charts) used.add(chart);
    return {
      question: finding.question,
      word: concernWord(finding.concern),
      concern: finding.concern,
      verdict: stopped(finding.verdict),
      evidence: evidence(finding),
      advice: finding.advice === null ? null : stopped(finding.advice),
      charts,
    };
  });
  const left = drawings.flatMap(({ figure }) => (figure !== null && !used.has(figure) ? [figure] : []));
  if (left.length === 0) return views;
  return [
    ...views,
    {
      question: 'What is left when the model has spoken?',
      word: '',
      concern: 0,
      verdict: 'The residuals, for inspection.',
      evidence: null,
      advice: null,
      charts: left,
    },
  ];
}

function countSentences({ counts }: RecordExamination): string[] {
  const n = counts.rows;
  return [
    `Of ${counted(n, 'row', 'rows', count)}, ${count(counts.beyond_2)} lie more than 2 standardised residuals from the model (about ${count(Math.round(n * 0.0455))} would be expected of normal errors) and ${count(counts.beyond_3)} more than 3 (about ${value(n * 0.0027, 2)}).`,
    `Leverage exceeds twice its mean in ${counted(counts.leverage_beyond_2p_over_n, 'row', 'rows', count)}, three times in ${count(counts.leverage_beyond_3p_over_n)} (customary marks).`,
  ];
}

function rowViews({ influential_rows: rows }: RecordExamination, s: number | null): TrustView['rows'] {
  return rows.slice(0, 5).map((row) => {
    const rounding = roundingFor(row.observed, s);
    return {
      row: count(row.row),
      id: row.id ?? NONE,
      observed: rounded(row.observed, rounding),
      fitted: rounded(row.fitted, rounding),
      residual: fixed(row.standardised_residual, 2),
      leverage: significant(row.leverage, 2),
      distance: significant(row.cooks_distance, 2),
    };
  });
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
