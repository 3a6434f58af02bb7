import type { AdmissionRule } from '../admission-rule.ts';
import { adjustedRSquared as adjusted } from '../r-squared.ts';
import { beside, limitText } from '../words.ts';

export const adjustedRSquared: AdmissionRule = {
  name: 'adjusted_r_squared',
  sentences: ({ adjustedRSquared: limit }) =>
    limit === null ? [] : [`Adjusted R² must be at least ${limitText(limit.atLeast)}.`],
  refusals: ({ adjustedRSquared: limit }, index, { fits }) => {
    const fit = fits[index]!;
    // A candidate without degrees of freedom is refused before any rule.
    if (limit === null || fit.degreesOfFreedom < 1) return [];
    const value = adjusted(fit);
    if (value === null) return ['Adjusted R² is not defined, because the response does not vary.'];
    if (value >= limit.atLeast) return [];
    return [`Adjusted R² is ${beside(value, limit.atLeast)}, below ${limitText(limit.atLeast)}.`];
  },
};
