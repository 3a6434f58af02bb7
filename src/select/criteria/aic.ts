import type { Criterion } from '../criterion.ts';
import { informationCriterion, whyNoLikelihood } from '../information.ts';

export const aic: Criterion = {
  name: 'aic',
  title: 'AIC',
  better: 'lower',
  acrossScales: true,
  description:
    'Akaike’s information criterion, −2 ln L + 2k with k the coefficients and the error variance: expected distance from the process that made the data.',
  source: 'Akaike 1974',
  value: (index, { fits }) => informationCriterion(fits[index]!, (k) => 2 * k),
  whyUndefined: (index, { fits }) => whyNoLikelihood(fits[index]!),
};
