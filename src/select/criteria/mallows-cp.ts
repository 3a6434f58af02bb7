import { type Criterion, finiteOrNull } from '../criterion.ts';

export const mallowsCp: Criterion = {
  name: 'mallows_cp',
  title: 'Mallows’ Cp',
  better: 'lower',
  acrossScales: false,
  description:
    'Mallows’ Cp, RSS/s² − n + 2p with s² from the model of all candidates’ terms together: an estimate of the total squared error of the fitted values.',
  source: 'Mallows 1973',
  value: (index, { fits, fullModelVariance }) => {
    const fit = fits[index]!;
    const variance = fullModelVariance[fit.candidate.responseColumn] ?? null;
    if (variance === null || !(variance > 0)) return null;
    return finiteOrNull(fit.residualSumOfSquares / variance - fit.rowCount + 2 * fit.columns.length);
  },
  whyUndefined: () =>
    'the model of all candidates’ terms together has no error variance to hold it against (it leaves no degrees of freedom, or fits these rows exactly)',
};
