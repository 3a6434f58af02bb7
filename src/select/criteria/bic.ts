import type { Criterion } from '../criterion.ts';
import { informationCriterion, whyNoLikelihood } from '../information.ts';

export const bic: Criterion = {
  name: 'bic',
  title: 'BIC',
  better: 'lower',
  acrossScales: true,
  description:
    'Schwarz’s Bayesian information criterion, −2 ln L + k ln n with k the coefficients and the error variance: a stronger penalty on size the more rows there are.',
  source: 'Schwarz 1978',
  value: (index, { fits }) => informationCriterion(fits[index]!, (k, n) => k * Math.log(n)),
  whyUndefined: (index, { fits }) => whyNoLikelihood(fits[index]!),
};
