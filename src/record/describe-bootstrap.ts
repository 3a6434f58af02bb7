import { type Bootstrap, bootstrapCoefficients } from '../examine/bootstrap.ts';
import type { Chosen } from '../examine/chosen.ts';
import { wholeNumber } from '../numerals.ts';
import type { BootstrapPrediction } from '../predict/bootstrap-predictions.ts';
import type { RecordExamination } from './record.ts';

/** What drawing again gave, as far as it could be had. */
export interface Bootstrapped {
  readonly draws: Bootstrap;
  /** Null where there were too many predictions, or too few repetitions. */
  readonly predictions: readonly BootstrapPrediction[] | null;
}

/** The bootstrap of the chosen model; null where none was asked for or the model leaves nothing to draw. */
export function describeBootstrap(
  chosen: Chosen,
  bootstrapped: Bootstrapped | null,
): NonNullable<RecordExamination['bootstrap']> | null {
  if (bootstrapped === null) return null;
  const { draws, predictions } = bootstrapped;
  const { fit, study, columns } = chosen;
  const { by, repetitions, seed } = draws.plan;
  const coefficients = bootstrapCoefficients(draws, fit, study.inference.confidence);
  return {
    by,
    repetitions,
    used: draws.used,
    seed,
    block_length: draws.blockLength,
    confidence: study.inference.confidence,
    note: noteOf(bootstrapped),
    coefficients: (coefficients ?? []).map((one, j) => ({
      name: columns[fit.columns[j]!]!.name,
      estimate: fit.estimates[j]!,
      bias: one.bias,
      standard_error: one.standardError,
      lower: one.lower,
      upper: one.upper,
      basic_lower: one.basicLower,
      basic_upper: one.basicUpper,
    })),
    prediction_interval: study.predict.interval,
    predictions: (predictions ?? []).map((one) => ({ ...one })),
  };
}

function noteOf({ draws, predictions }: Bootstrapped): string | null {
  const { used, plan } = draws;
  const lost = plan.repetitions - used;
  const sentences = [
    ...(lost > 0
      ? [
          `In ${wholeNumber(lost)} of ${wholeNumber(plan.repetitions)} repetitions the rows drawn could not tell every coefficient, and they are left out.`,
        ]
      : []),
    ...(predictions === null
      ? [
          used < 2
            ? 'Too few repetitions are left for intervals.'
            : 'There are too many predictions for intervals of each in reasonable time.',
        ]
      : []),
  ];
  return sentences.length === 0 ? null : sentences.join(' ');
}
