import type { Covariance } from '../../engine/covariance.ts';
import { counted, listed } from '../../select/words.ts';
import { type Chosen, rowName } from '../chosen.ts';

/** The covariance of the chosen model's estimates, told to a reader. */
export interface StandardErrors {
  readonly kind: Covariance['kind'];
  /** "classical", "HC3", "clustered by vessel", "HAC with 4 lags". */
  readonly name: string;
  /** What they allow for, where they were published, and which t they go with. */
  readonly sentence: string;
  /** Degrees of freedom of t; null where there are no standard errors. */
  readonly df: number | null;
  readonly clusters: number | null;
  readonly lags: number | null;
  /** What to be careful about, as sentences. */
  readonly cautions: string[];
}

const PUBLISHED = {
  hc0: 'White 1980',
  hc1: 'MacKinnon & White 1985, with the factor n/(n − p)',
  hc2: 'MacKinnon & White 1985, squared residuals over 1 − h',
  hc3: 'MacKinnon & White 1985, squared residuals over (1 − h)²',
  hc4: 'Cribari-Neto 2004, squared residuals over a power of 1 − h that grows with leverage',
} as const;

/** Below this many clusters their errors are customarily taken to be too small (common practice, no single source). */
const FEW_CLUSTERS = 20;

export function standardErrorsOf(chosen: Chosen): StandardErrors {
  const { covariance, study, fit } = chosen;
  const plan = study.inference.standardErrors;
  if (covariance === null) {
    return {
      kind: plan.kind,
      name: plan.kind === 'clustered' || plan.kind === 'hac' ? plan.kind : nameOf(plan.kind),
      sentence: 'There are no standard errors: the fit leaves no error to judge by.',
      df: null,
      clusters: null,
      lags: null,
      cautions: [],
    };
  }
  const { kind, df, clusters, lags } = covariance;
  const t = `t on ${df} degrees of freedom`;
  const also =
    ' Prediction intervals for a new row add the classical s² to the uncertainty of the mean; the F test of the whole model and comparisons of candidates are the classical ones.';
  const told = {
    kind,
    df,
    clusters: clusters?.count ?? null,
    lags,
    cautions: cautionsOf(chosen, covariance),
  };
  switch (kind) {
    case 'classical':
      return {
        ...told,
        name: 'classical',
        sentence: `Standard errors are the classical ones, for errors of equal spread that know nothing of one another; ${t}.`,
      };
    case 'clustered':
      return {
        ...told,
        name: `clustered by ${clusters!.by}`,
        sentence: `Standard errors allow for errors that go together within the ${clusters!.count} clusters of ${clusters!.by} and for unequal spread (Liang & Zeger 1986, with the factor G/(G − 1) · (n − 1)/(n − p)); ${t}, one less than the clusters.${also}`,
      };
    case 'hac':
      return {
        ...told,
        name: `HAC with ${counted(lags!, 'lag')}`,
        sentence: `Standard errors allow for errors that go together over ${counted(lags!, 'row')} in time order and for unequal spread (Newey & West 1987, Bartlett weights, no small-sample factor); ${t}.${also}`,
      };
    default:
      return {
        ...told,
        name: nameOf(kind),
        sentence: `Standard errors allow for errors of unequal spread (${nameOf(kind)}: ${PUBLISHED[kind]}); ${t}.${also}`,
      };
  }

  function nameOf(plain: string): string {
    return plain === 'classical' ? plain : plain.toUpperCase();
  }

  function cautionsOf(of: Chosen, { clusters: groups, undefinedCount, undefinedRows }: Covariance): string[] {
    const cautions: string[] = [];
    const p = fit.columns.length;
    if (groups !== null && groups.count < p) {
      cautions.push(
        `${groups.by} makes ${groups.count} clusters for ${p} coefficients: no more than ${groups.count - 1} of them can be tested together, and every standard error rests on little.`,
      );
    } else if (groups !== null && groups.count < FEW_CLUSTERS) {
      cautions.push(
        `${groups.by} makes only ${groups.count} clusters: standard errors from so few tend to be too small.`,
      );
    }
    const own = fit.columns.some((column) => {
      const [first, ...rest] = of.columns[column]!.pieces;
      return first?.kind === 'level' && rest.length === 0 && first.variable === groups?.by;
    });
    if (groups !== null && own) {
      cautions.push(
        `The levels of ${groups.by} are the clusters and have coefficients of their own: with no second cluster of a level to compare it with, the standard errors of those coefficients say nothing.`,
      );
    }
    if (undefinedCount > 0) {
      const names = undefinedRows.map((row) => rowName(of.sample, row));
      const more = undefinedCount - names.length;
      cautions.push(
        `${nameOf(plan.kind)} is not defined for ${listed([...names, ...(more > 0 ? [`${more} more`] : [])])}, fitted by a coefficient of ${undefinedCount === 1 ? 'its' : 'their'} own (leverage 1): such a row adds nothing to the standard errors, and that of its own coefficient says nothing.`,
      );
    }
    return cautions;
  }
}
