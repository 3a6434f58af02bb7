import type { Criterion } from '../criterion.ts';
import { adjustedRSquared } from '../r-squared.ts';

export const adjustedRSquaredCriterion: Criterion = {
  name: 'adjusted_r_squared',
  title: 'adjusted R²',
  better: 'higher',
  acrossScales: false,
  description:
    'The share of the response’s variation that the model accounts for, with an allowance for the number of coefficients: 1 − (RSS/(n − p))/(TSS/(n − 1)).',
  source: 'Ezekiel 1930',
  value: (index, { fits }) => adjustedRSquared(fits[index]!),
  whyUndefined: (index, { fits }) =>
    fits[index]!.degreesOfFreedom < 1 ? 'no degrees of freedom are left' : 'the response does not vary',
};
