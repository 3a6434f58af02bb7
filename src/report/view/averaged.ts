import {
  percent,
  range,
  rangeWithUnit,
  rounded,
  roundingFor,
  roundingOfInterval,
  share,
  withUnit,
} from '../numbers.ts';
import type { StudyRecord } from '../record-type.ts';
import type { AveragedView } from '../view.ts';
import { counted, type Lexicon, listed } from '../words/lexicon.ts';

/** Candidates of less weight than this are counted, not named. */
const NAMED_FROM = 0.005;
const NAMED = 5;
const PREDICTIONS = 20;

/** Estimates averaged over the admitted candidates; null where the study does not ask. */
export function averagedView({ selection }: StudyRecord, { response }: Lexicon): AveragedView | null {
  const { averaged } = selection;
  if (averaged === undefined) return null;
  const named = averaged.candidates.filter(({ weight }) => weight >= NAMED_FROM).slice(0, NAMED);
  const rest = averaged.candidates.length - named.length;
  const weights = named.map(({ candidate, weight }) => `${candidate} ${percent(weight)}`);
  return {
    sentence: `Each admitted candidate counts by its weight of evidence: ${listed([...weights, ...(rest > 0 ? [`${counted(rest, 'other')} next to nothing`] : [])])}. A coefficient is 0 in the candidates that lack it, and its standard error holds what the candidates disagree by (Burnham & Anderson 2002).`,
    confidence: percent(averaged.confidence),
    coefficients: averaged.coefficients.map((one) => {
      const rounding = roundingFor(one.estimate, one.standard_error);
      return {
        name: one.name,
        weight: share(one.weight),
        estimate: rounded(one.estimate, rounding),
        standardError: rounded(one.standard_error, rounding),
        interval: range(one.lower, one.upper, rounding),
      };
    }),
    predictionConfidence: percent(averaged.prediction_interval),
    predictions: averaged.predictions.slice(0, PREDICTIONS).map((one) => {
      const rounding = roundingOfInterval(one.estimate, one.lower, one.upper);
      return {
        label: one.label,
        estimate: withUnit(rounded(one.estimate, rounding), response.unit),
        interval: rangeWithUnit(one.lower, one.upper, rounding, response.unit),
      };
    }),
  };
}
