import { fixed, NONE, percent, range, roundingFor, share } from '../numbers.ts';
import type { RecordCoefficient, StudyRecord } from '../record-type.ts';
import type { MoreView } from '../view.ts';
import { stopped } from '../words/lexicon.ts';

/** Measures beside estimates and errors, with the columns that the study asks for; null for an older record. */
export function moreView(
  { model, examination, study }: StudyRecord,
  coefficients: readonly RecordCoefficient[],
): MoreView | null {
  const inference = model?.inference;
  if (inference === undefined || coefficients.length < 2) return null;
  const drawn = examination?.bootstrap?.coefficients ?? [];
  return {
    simultaneous: inference.simultaneous === null ? null : stopped(inference.simultaneous.sentence),
    confidence: percent(study.confidence),
    hasDrawn: drawn.length > 0,
    coefficients: coefficients.map((own) => {
      const measures = inference.coefficients.find(({ name }) => name === own.name);
      const again = drawn.find(({ name }) => name === own.name);
      const rounding = roundingFor(own.estimate, own.standard_error);
      const semi = measures?.semi_partial_correlation ?? null;
      return {
        name: own.name,
        standardised: fixed(measures?.standardised, 2),
        partial: fixed(measures?.partial_correlation, 2),
        lost: semi === null ? NONE : share(semi * semi),
        simultaneous: range(
          measures?.simultaneous_lower ?? null,
          measures?.simultaneous_upper ?? null,
          rounding,
        ),
        drawn: again === undefined ? NONE : range(again.lower, again.upper, rounding),
      };
    }),
  };
}
