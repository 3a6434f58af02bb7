import {
  lopsided,
  percent,
  type Rounding,
  range,
  rangeWithUnit,
  rounded,
  roundingFor,
  spreadOf,
  withUnit,
} from '../numbers.ts';
import type { RecordPrediction, StudyRecord } from '../record-type.ts';
import { counted, type Lexicon, listed } from './lexicon.ts';
import { scaleKind } from './scale.ts';

type Total = NonNullable<StudyRecord['prediction_total']>;

type Interval = Pick<RecordPrediction, 'estimate' | 'lower' | 'upper'>;

/**
 * Rounding for a prediction: the new-row interval spans about three to four of its standard errors. A lower end that
 * another scale keeps above 0 has two digits of its own, lest it read as 0.
 */
export function predictionRounding({ estimate, lower, upper }: Interval): Rounding {
  if (lower === null) return roundingFor(estimate, null);
  const end = upper ?? 2 * estimate - lower;
  const spread = spreadOf(estimate, lower, end);
  const kept = lower > 0 && lopsided(estimate, lower, end);
  return roundingFor(estimate, kept ? Math.max(Math.min(spread, lower), spread / 25) : spread);
}

/** Infinite where the interval has no upper end, 0 where there is none. */
function widthOf(p: Interval): number {
  return p.lower === null ? 0 : (p.upper ?? Number.POSITIVE_INFINITY) - p.lower;
}

/** "519 L (90 % interval 475 to 563 L)"; the estimate alone where the model fits exactly. */
export function predictionPhrase(lexicon: Lexicon, p: Interval): string {
  const rounding = predictionRounding(p);
  const { unit } = lexicon.response;
  const estimate = withUnit(rounded(p.estimate, rounding), unit);
  if (p.lower === null) return estimate;
  return `${estimate} (${percent(lexicon.predictionInterval)} interval ${rangeWithUnit(p.lower, p.upper, rounding, unit)})`;
}

/** "The 3 rows asked for come to 1 874 L in total (90 % interval 1 795 to 1 953 L)." */
export function totalSentence(lexicon: Lexicon, total: Total): string {
  return `The ${counted(total.rows, 'row')} asked for ${total.rows === 1 ? 'comes' : 'come'} to ${predictionPhrase(lexicon, total)} of ${lexicon.response.label} in total.`;
}

/** The prediction in one sentence: the total where there is one, else each of up to three rows. */
export function predictionSentence(
  lexicon: Lexicon,
  predictions: readonly RecordPrediction[],
  total: Total | null,
): string | null {
  if (total !== null) return totalSentence(lexicon, total);
  if (predictions.length === 0) return null;
  if (predictions.length > 3) {
    const sorted = [...predictions].sort((a, b) => a.estimate - b.estimate);
    const low = sorted[0]!;
    const high = sorted.at(-1)!;
    return `The ${predictions.length}\u00a0predictions of ${lexicon.response.label} lie between ${predictionPhrase(lexicon, low)} for ${low.label} and ${predictionPhrase(lexicon, high)} for ${high.label}.`;
  }
  return `Predicted ${lexicon.response.label}: ${listed(predictions.map((p) => `${predictionPhrase(lexicon, p)} for ${p.label}`))}.`;
}

/** How to read the two intervals, and what the estimate is where the scale is not natural. */
export function predictionNotes(lexicon: Lexicon): string[] {
  const notes = [
    `The interval for a new row is where one further row would lie with ${percent(lexicon.predictionInterval)} confidence; the interval for the mean is where the average of many such rows would lie.`,
  ];
  if (scaleKind(lexicon.response.scale) !== 'natural') {
    notes.push(
      'The estimate is the median on the scale of the data, as many rows above it as below; the mean, which sums to totals, is given beside it (worked out by smearing over the residuals).',
    );
  }
  return notes;
}

/** How much wider the new-row intervals are than those for the mean: the caption of the predictions' chart. */
export function intervalCaption(lexicon: Lexicon, predictions: readonly RecordPrediction[]): string {
  const outside = predictions.filter((p) => p.outside.length > 0);
  const widest = predictions.reduce<RecordPrediction | undefined>(
    (most, p) => (most === undefined || widthOf(p) > widthOf(most) ? p : most),
    undefined,
  );
  if (widest === undefined) return '';
  const rounding = predictionRounding(widest);
  const main =
    widest.lower === null
      ? 'The model fits exactly, so there is no interval'
      : widest.upper === null
        ? `The least certain is ${widest.label}: the interval for a new row has no upper end`
        : predictions.length === 1
          ? `A new row is expected between ${range(widest.lower, widest.upper, rounding)}`.replace(
              ' to ',
              ' and ',
            ) + (lexicon.response.unit ? `\u00a0${lexicon.response.unit}` : '')
          : `The least certain is ${widest.label}: a new row may lie anywhere from ${rangeWithUnit(widest.lower, widest.upper, rounding, lexicon.response.unit)}`;
  const beyond =
    outside.length === 0
      ? ''
      : `; ${listed(outside.slice(0, 3).map((p) => p.label))}${outside.length > 3 ? ` and ${outside.length - 3} more` : ''} ${outside.length === 1 ? 'lies' : 'lie'} outside the data (hollow)`;
  return `${main}${beyond}.`;
}
