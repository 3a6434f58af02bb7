import type { Chosen } from '../examine/chosen.ts';
import { presentLevels } from '../model/build-design.ts';
import { numbersOf } from '../model/design-rows.ts';
import type { Sample } from '../prepare/sample.ts';
import { binomialInterval } from '../stats/binomial-interval.ts';
import { modelVariables } from './outside-data.ts';
import { type Prediction, predict } from './predict.ts';

/** The chosen model tried once on the rows that were set aside; on the response's own scale. */
export interface HoldOutTrial {
  /** Rows set aside, and those of them that the model cannot predict (a level that it does not know). */
  readonly rows: number;
  readonly rowsNotPredicted: number;
  /** Σ w (y − ŷ)/Σ w: positive where the model predicts too little. Null where none is predicted. */
  readonly meanError: number | null;
  /** Σ w (y − ŷ)²/Σ w. */
  readonly meanSquaredError: number | null;
  /** Mean of the response in the rows predicted. */
  readonly meanResponse: number | null;
  /** Rows whose response lies inside their prediction interval, of those that have one. */
  readonly inside: number;
  readonly withInterval: number;
  /** 95 % interval for the share inside (Clopper & Pearson 1934). */
  readonly insideInterval: readonly [number, number];
}

const CONFIDENCE = 0.95;

/**
 * Errors of the mean response (by smearing where the scale is not natural), and how often the prediction interval holds the
 * response: as for any rows predicted, with the weights of the rows.
 */
export function tryHoldOut(chosen: Chosen, heldOut: Sample, smearing: Float64Array | null): HoldOutTrial {
  const n = heldOut.rowCount;
  const isKnown = knownRows(chosen, heldOut);
  const own = numbersOf(heldOut, chosen.study.response.variable);
  const weights = chosen.study.weights === null ? null : numbersOf(heldOut, chosen.study.weights);
  const { predictions } = predict(
    { ...chosen, study: { ...chosen.study, predict: { ...chosen.study.predict, total: false } } },
    [
      {
        rowCount: n,
        labelOf: String,
        columns: heldOut.columns,
        given: Array.from({ length: n }, () => []),
        placeOf: (row) => ({ kind: 'cell', file: chosen.study.data.file, row: heldOut.lines[row]! }),
        severity: 'warning',
      },
    ],
    smearing,
    () => {},
  );
  let weight = 0;
  let errors = 0;
  let squares = 0;
  let responses = 0;
  let predicted = 0;
  let inside = 0;
  let withInterval = 0;
  for (const prediction of predictions) {
    const row = Number(prediction.label);
    const mean = prediction.mean ?? (smearing === null ? prediction.estimate : null);
    if (isKnown[row] === 0 || mean === null) continue;
    const w = weights === null ? 1 : weights[row]!;
    const y = own[row]!;
    predicted++;
    weight += w;
    errors += w * (y - mean);
    squares += w * (y - mean) ** 2;
    responses += w * y;
    if (prediction.lower === null && prediction.upper === null) continue;
    withInterval++;
    if (holds(prediction, y)) inside++;
  }
  const share = (value: number) => (weight > 0 ? value / weight : null);
  return {
    rows: n,
    rowsNotPredicted: n - predicted,
    meanError: share(errors),
    meanSquaredError: share(squares),
    meanResponse: share(responses),
    inside,
    withInterval,
    insideInterval: binomialInterval(inside, withInterval, CONFIDENCE),
  };
}

/** 1 for each row all of whose levels the model's own rows have. */
function knownRows(chosen: Chosen, heldOut: Sample): Uint8Array {
  const isKnown = new Uint8Array(heldOut.rowCount).fill(1);
  for (const name of modelVariables(chosen)) {
    const here = heldOut.columns.get(name);
    const sample = chosen.sample.columns.get(name);
    if (here?.kind !== 'category' || sample?.kind !== 'category') continue;
    const known = new Set(presentLevels(sample));
    const codes = here.levels.map((level) => known.has(level));
    here.codes.forEach((code, row) => {
      if (codes[code] !== true) isKnown[row] = 0;
    });
  }
  return isKnown;
}

function holds({ lower, upper }: Prediction, y: number): boolean {
  return (lower === null || y >= lower) && (upper === null || y <= upper);
}
