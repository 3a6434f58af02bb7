import { type Criterion, finiteOrNull } from '../criterion.ts';

export const crossValidation: Criterion = {
  name: 'cross_validation',
  title: 'cross-validated error',
  better: 'lower',
  acrossScales: true,
  description:
    'The mean squared error of predicting rows that were held out from those that were not, Σ w (y − ŷ)²/Σ w on the response’s own scale, each row held out as the study declares.',
  source: 'Stone 1974; Geisser 1975',
  value: (index, { validation }) => {
    const figures = validation?.figures[index] ?? null;
    return figures === null ? null : finiteOrNull(figures.meanSquaredError);
  },
  whyUndefined: (index, { validation }) => validation?.whyNot[index] ?? 'candidates were not cross-validated',
};
