import type { Criterion } from '../criterion.ts';
import { informationCriterion, parameterCount, whyNoLikelihood } from '../information.ts';

export const aicc: Criterion = {
  name: 'aicc',
  title: 'AICc',
  better: 'lower',
  acrossScales: true,
  description:
    'AIC corrected for small samples, AIC + 2k(k + 1)/(n − k − 1); it needs more than k + 1 rows, k being the coefficients and the error variance.',
  source: 'Hurvich & Tsai 1989',
  value: (index, { fits }) =>
    informationCriterion(fits[index]!, (k, n) =>
      n <= k + 1 ? Number.NaN : 2 * k + (2 * k * (k + 1)) / (n - k - 1),
    ),
  whyUndefined: (index, { fits }) => {
    const fit = fits[index]!;
    const k = parameterCount(fit);
    return fit.rowCount <= k + 1
      ? `with ${fit.columns.length} coefficients it needs more than ${k + 1} rows, and there are ${fit.rowCount}`
      : whyNoLikelihood(fit);
  },
};
