import type { AdmissionRule } from '../admission-rule.ts';
import { jointF, keptPositions } from '../terms.ts';
import { limitText, listedUpTo, probabilityBeside } from '../words.ts';

/** The rule speaks of terms, each tested with all its columns; the intercept is no term. */
export const pValue: AdmissionRule = {
  name: 'p_value',
  sentences: ({ pValue: limit }) =>
    limit === null ? [] : [`The p-value of every term must be at most ${limitText(limit.atMost)}.`],
  refusals: ({ pValue: limit }, index, { fits }) => {
    const fit = fits[index]!;
    // A candidate without degrees of freedom is refused before any rule.
    if (limit === null || fit.degreesOfFreedom < 1) return [];
    if (fit.exact && fit.candidate.terms.some((term) => keptPositions(fit, term).length > 0)) {
      return ['It fits these rows exactly, so no term has a p-value.'];
    }
    const above = fit.candidate.terms
      .map((term) => ({ name: term.name, p: jointF(fit, term)?.p_value ?? 0 }))
      .filter(({ p }) => p > limit.atMost)
      .sort((a, b) => b.p - a.p)
      .map(({ name, p }) => ({ name, p: probabilityBeside(p, limit.atMost) }));
    if (above.length === 0) return [];
    const figures = above.map(({ name, p }, k) => (k === 0 ? `${name} is ${p}` : `of ${name} ${p}`));
    return [`The p-value of ${listedUpTo(figures, 3)}, above ${limitText(limit.atMost)}.`];
  },
};
