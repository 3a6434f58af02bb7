import type { AdmissionRule } from '../admission-rule.ts';
import { jointF, keptPositions } from '../terms.ts';
import { limitText, listedUpTo, probabilityBeside } from '../words.ts';

/** The rule speaks of terms, each tested with all its columns; the intercept is no term. */
export const pValue: AdmissionRule = {
  name: 'p_value',
  sentences: ({ pValue: limit }) =>
    limit === null ? [] : [`The p-value of every term must be at most ${limitText(limit.atMost)}.`],
  refusals: ({ pValue: limit }, index, { fits, covariances }) => {
    const fit = fits[index]!;
    const covariance = covariances?.[index] ?? undefined;
    // A candidate without degrees of freedom is refused before any rule.
    if (limit === null || fit.degreesOfFreedom < 1) return [];
    if (fit.exact && fit.candidate.terms.some((term) => keptPositions(fit, term).length > 0)) {
      return ['It fits these rows exactly, so no term has a p-value.'];
    }
    const untested = fit.candidate.terms.filter(
      (term) => keptPositions(fit, term).length > 1 && jointF(fit, term, covariance) === null,
    );
    if (untested.length > 0) {
      const names = listedUpTo(
        untested.map((term) => term.name),
        3,
      );
      return [`The coefficients of ${names} cannot be tested together with the declared standard errors.`];
    }
    const above = fit.candidate.terms
      .map((term) => ({ name: term.name, p: jointF(fit, term, covariance)?.p_value ?? 0 }))
      .filter(({ p }) => p > limit.atMost)
      .sort((a, b) => b.p - a.p)
      .map(({ name, p }) => ({ name, p: probabilityBeside(p, limit.atMost) }));
    if (above.length === 0) return [];
    const figures = above.map(({ name, p }, k) => (k === 0 ? `${name} is ${p}` : `of ${name} ${p}`));
    return [`The p-value of ${listedUpTo(figures, 3)}, above ${limitText(limit.atMost)}.`];
  },
};
