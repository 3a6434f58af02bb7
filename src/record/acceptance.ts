import type { Chosen } from '../examine/chosen.ts';
import { fromScale } from '../model/response-scale.ts';
import type { AcceptanceFigure, AcceptancePlan, EarlierAcceptancePlan } from '../study/study.ts';
import type {
  RecordCandidate,
  RecordEarlierCriterion,
  RecordFinding,
  RecordPrediction,
  StudyRecord,
} from './record.ts';

type Criterion = StudyRecord['acceptance'][number];

/** What acceptance criteria are held against. */
export interface Accepted {
  /** The chosen candidate as the record shows it; null where none was admitted. */
  readonly candidate: RecordCandidate | null;
  /** Names of the families whose search found it. */
  readonly families: readonly string[];
  readonly chosen: Chosen | null;
  readonly findings: readonly RecordFinding[];
  readonly predictions: readonly RecordPrediction[];
  readonly rowsRead: number;
  readonly rowsUsed: number;
  /** Rows lost to bad, missing or undefined values. */
  readonly rowsLost: number;
  /** Latest time among the rows used, in days since 1970-01-01; null where the study's time is not a date. */
  readonly newest: number | null;
}

/**
 * Each declared acceptance criterion with its limit, value and whether it is met; those apart that need an earlier
 * record. An undefined value misses its limit.
 */
export function acceptanceOf(plans: readonly AcceptancePlan[], found: Accepted): Criterion[] {
  return plans.filter(isJudgedAlone).map((plan): Criterion => {
    switch (plan.criterion) {
      case 'chosen': {
        const value = found.candidate?.name ?? null;
        const passed = value !== null && [value, ...found.families].some((name) => plan.names.includes(name));
        return { criterion: 'chosen', limit: plan.names.join(' or '), value, passed };
      }
      case 'sign': {
        const value = coefficientOf(plan.of, found.candidate);
        const passed = value !== null && (plan.sign === 'positive' ? value > 0 : value < 0);
        return { criterion: 'sign', of: plan.of, limit: plan.sign, value, passed };
      }
      case 'age_of_newest_row': {
        const value = found.newest === null ? null : plan.on - found.newest;
        const passed = value !== null && value <= plan.atMost;
        const limit = `at most ${plan.atMost} days on ${plan.onText}`;
        return { criterion: 'age_of_newest_row', limit, value, passed };
      }
      case 'p_value': {
        const finding = found.findings.find(({ name }) => name === plan.of);
        return held(plan, plan.of, finding?.p_value ?? null);
      }
      case 'coefficient':
        return held(plan, plan.of, coefficientOf(plan.of, found.candidate));
      default:
        return held(plan, null, figureOf(plan.criterion, found));
    }
  });
}

/** The criteria that need an earlier record, with their limits. */
export function acceptanceAgainstEarlier(plans: readonly AcceptancePlan[]): RecordEarlierCriterion[] {
  return plans.flatMap((plan) =>
    isJudgedAlone(plan)
      ? []
      : [
          {
            criterion: plan.criterion,
            ...(plan.of === null ? {} : { of: plan.of }),
            limit: earlierLimit(plan),
            at_least: plan.atLeast,
            at_most: plan.atMost,
          },
        ],
  );
}

function isJudgedAlone(plan: AcceptancePlan): plan is Exclude<AcceptancePlan, EarlierAcceptancePlan> {
  return plan.criterion !== 'coefficient_change' && plan.criterion !== 'new_rows_inside';
}

function earlierLimit({ criterion, atLeast, atMost }: EarlierAcceptancePlan): string {
  const limit = limitText(atLeast, atMost);
  if (criterion === 'new_rows_inside') return limit;
  return `${limit} ${atMost === 1 ? 'standard error' : 'standard errors'}`;
}

interface Limits {
  readonly criterion: string;
  readonly atLeast: number | null;
  readonly atMost: number | null;
}

function held({ criterion, atLeast, atMost }: Limits, of: string | null, value: number | null): Criterion {
  const passed =
    value !== null && (atLeast === null || value >= atLeast) && (atMost === null || value <= atMost);
  return { criterion, ...(of === null ? {} : { of }), limit: limitText(atLeast, atMost), value, passed };
}

function figureOf(figure: AcceptanceFigure, found: Accepted): number | null {
  const { candidate, chosen } = found;
  switch (figure) {
    case 'rows_used':
      return found.rowsUsed;
    case 'rows_lost_share':
      return found.rowsRead === 0 ? null : found.rowsLost / found.rowsRead;
    case 'rows_per_coefficient':
      return candidate === null || candidate.coefficient_count === 0
        ? null
        : candidate.rows / candidate.coefficient_count;
    case 'largest_vif':
      return candidate === null ? null : (candidate.largest_vif ?? (standsAlone(candidate) ? 1 : null));
    case 'cv_rmse':
      return chosen === null ? null : relativeErrors(chosen).rootMeanSquare;
    case 'bias':
      return chosen === null ? null : relativeErrors(chosen).mean;
    case 'prediction_interval_width':
      return widest(found.predictions, ({ lower, upper }) => span(lower, upper));
    case 'relative_interval_width':
      return widest(found.predictions, ({ lower, upper, estimate }) => {
        const width = span(lower, upper);
        return width === null || estimate === 0 ? null : width / Math.abs(estimate);
      });
    default:
      return candidate === null ? null : candidate[figure];
  }
}

/** A lone column beside the intercept is not shown an inflation; 1/(1 − R²) with nothing to explain it by is 1. */
function standsAlone({ coefficients, intercept }: RecordCandidate): boolean {
  return coefficients.length - (intercept ? 1 : 0) === 1;
}

/** A coefficient by its own name, or by that of its term where the term has no other. */
function coefficientOf(name: string, candidate: RecordCandidate | null): number | null {
  const coefficients = candidate?.coefficients ?? [];
  const own = coefficients.find((coefficient) => coefficient.name === name);
  if (own !== undefined) return own.estimate;
  const ofTerm = coefficients.filter((coefficient) => coefficient.term === name);
  return ofTerm.length === 1 ? ofTerm[0]!.estimate : null;
}

/**
 * Errors of the fit on the response's own scale relative to its mean: √(Σ(y − ŷ)²/(n − p))/ȳ, the CV(RMSE) of
 * ASHRAE Guideline 14, and Σ(ŷ − y)/(n ȳ); ŷ = g⁻¹(Xb). Null where not defined. Rows count alike, whatever their weights.
 */
function relativeErrors({ fit, observed, fitted }: Chosen): {
  readonly rootMeanSquare: number | null;
  readonly mean: number | null;
} {
  const { scale } = fit.candidate.response;
  let [squares, sum, total] = [0, 0, 0];
  for (let i = 0; i < observed.length; i++) {
    const y = fromScale(observed[i]!, scale);
    const error = fromScale(fitted[i]!, scale) - y;
    squares += error * error;
    sum += error;
    total += y;
  }
  const finite = (value: number) => (Number.isFinite(value) ? value : null);
  return {
    rootMeanSquare: finite(Math.sqrt(squares / fit.degreesOfFreedom) / Math.abs(total / observed.length)),
    mean: finite(sum / Math.abs(total)),
  };
}

function span(lower: number | null, upper: number | null): number | null {
  return lower === null || upper === null ? null : upper - lower;
}

/** The largest of the predictions' widths; null where one of them has none, or nothing is predicted. */
function widest(
  predictions: readonly RecordPrediction[],
  widthOf: (prediction: RecordPrediction) => number | null,
): number | null {
  let most: number | null = null;
  for (const prediction of predictions) {
    const width = widthOf(prediction);
    if (width === null) return null;
    most = Math.max(most ?? 0, width);
  }
  return most;
}

function limitText(atLeast: number | null, atMost: number | null): string {
  const parts = [
    ...(atLeast === null ? [] : [`at least ${atLeast}`]),
    ...(atMost === null ? [] : [`at most ${atMost}`]),
  ];
  return parts.join(' and ');
}
