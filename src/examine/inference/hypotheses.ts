import { errorOf } from '../../engine/covariance.ts';
import type { FTest } from '../../select/f-test.ts';
import { waldTest } from '../../select/wald-test.ts';
import { listedUpTo, probability, significant } from '../../select/words.ts';
import { tTwoSidedQuantile } from '../../stats/distributions.ts';
import type { EqualityPlan, HypothesisPlan } from '../../study/study.ts';
import type { Chosen } from '../chosen.ts';

/** What became of one declared hypothesis. */
export interface HypothesisResult {
  readonly name: string;
  readonly equalities: {
    /** "cargo × vessel Tern − cargo × vessel Holm". */
    readonly combination: string;
    readonly equals: number;
    /** Of the combination; null where the chosen model lacks one of its coefficients, as all that follows. */
    readonly estimate: number | null;
    readonly standard_error: number | null;
    readonly lower: number | null;
    readonly upper: number | null;
  }[];
  /** t of a single equality; null for several. */
  readonly t: number | null;
  /** F of all equalities together; null where they cannot be tested. */
  readonly test: FTest | null;
  readonly verdict: string;
}

/** Tests each declared hypothesis by Wald's F with the declared covariance; one equality gives F = t². */
export function testHypotheses(chosen: Chosen): HypothesisResult[] {
  return chosen.study.inference.hypotheses.map((plan) => testOne(chosen, plan));
}

function testOne(chosen: Chosen, plan: HypothesisPlan): HypothesisResult {
  const { fit, columns, covariance, study } = chosen;
  const positionOf = new Map(fit.columns.map((column, j) => [columns[column]!.name, j]));
  const absent = [...new Set(plan.equalities.flatMap(({ combination }) => [...combination.keys()]))].filter(
    (name) => !positionOf.has(name),
  );
  if (absent.length > 0) {
    return {
      name: plan.name,
      equalities: plan.equalities.map((each) => ({ ...told(each), ...NOTHING })),
      t: null,
      test: null,
      verdict: `Not tested: the chosen model has no coefficient ${listedUpTo(absent, 3)}.`,
    };
  }
  const statements = plan.equalities.map(({ combination }) => {
    const statement = new Float64Array(fit.columns.length);
    for (const [name, multiplier] of combination) statement[positionOf.get(name)!] = multiplier;
    return statement;
  });
  const estimates = statements.map((statement) =>
    statement.reduce((sum, multiplier, j) => sum + multiplier * fit.estimates[j]!, 0),
  );
  const reach = covariance === null ? 0 : tTwoSidedQuantile(1 - study.inference.confidence, covariance.df);
  const equalities = plan.equalities.map((each, k) => {
    const error = covariance === null ? 0 : errorOf(covariance, statements[k]!);
    const known = { ...told(each), ...NOTHING, estimate: estimates[k]! };
    if (!(error > 0)) return known;
    return {
      ...known,
      standard_error: error,
      lower: estimates[k]! - reach * error,
      upper: estimates[k]! + reach * error,
    };
  });
  const differences = plan.equalities.map(({ equals }, k) => estimates[k]! - equals);
  const test = covariance === null ? null : waldTest(covariance, statements, differences);
  const error = equalities[0]?.standard_error ?? null;
  return {
    name: plan.name,
    equalities,
    t: equalities.length === 1 && error !== null ? differences[0]! / error : null,
    test,
    verdict: verdictOf(chosen, equalities, test),
  };
}

const NOTHING = { estimate: null, standard_error: null, lower: null, upper: null };

function told({ combination, equals }: EqualityPlan) {
  return { combination: combinationText(combination), equals };
}

/** "2 × speed − headwind". */
export function combinationText(combination: ReadonlyMap<string, number>): string {
  return [...combination]
    .filter(([, multiplier]) => multiplier !== 0)
    .map(([name, multiplier], k) => {
      const size = Math.abs(multiplier);
      const sign = multiplier < 0 ? '−' : '+';
      const lead = k === 0 ? (multiplier < 0 ? '−' : '') : `${sign} `;
      return `${lead}${size === 1 ? '' : `${size} × `}${name}`;
    })
    .join(' ');
}

function verdictOf(
  { study }: Chosen,
  equalities: HypothesisResult['equalities'],
  test: FTest | null,
): string {
  if (test === null || test.p_value === null) {
    return equalities.length > 1
      ? 'It cannot be tested: the standard errors at hand cannot tell its equalities apart.'
      : 'It cannot be tested: nothing is left to judge it by.';
  }
  const { confidence } = study.inference;
  const against = test.p_value < 1 - confidence;
  const p = `p-value ${probability(test.p_value)}`;
  const [only] = equalities;
  if (equalities.length > 1) {
    return against
      ? `The data speak against it: ${equalities.length} equalities that all held would hardly leave the estimates so far off (${p}).`
      : `The data do not speak against it (${p}); that does not show that it holds.`;
  }
  const estimate = significant(only!.estimate!, 3);
  const interval = `${Number((confidence * 100).toPrecision(6))} % interval ${significant(only!.lower!, 3)} to ${significant(only!.upper!, 3)}`;
  const value = significant(only!.equals, 3);
  return against
    ? `The data speak against it: the estimate is ${estimate} (${interval}), not ${value} (${p}).`
    : `The data do not speak against it: the estimate is ${estimate} (${interval}), and ${value} is within reach (${p}); that does not show that it holds.`;
}
