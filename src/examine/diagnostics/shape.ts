import { fUpper } from '../../stats/distributions.ts';
import { concernOf, type Diagnostic, notPossible } from '../diagnostic.ts';
import { percent } from '../percent.ts';

/** Share of the residuals' squares that a curve in the fitted values tells, below which it hardly matters. */
const SLIGHT = 0.01;

/** Partial F of the squares and cubes of the fitted values, added to the model. */
export const shape: Diagnostic = {
  name: 'shape',
  topic: 'shape',
  question: 'Is something curved that the model takes as straight?',
  statisticName: 'RESET statistic',
  source: 'Ramsey 1969',
  find(chosen, second) {
    if (second === null) return notPossible('The model fits these rows exactly, so no shape is left over.');
    const { fit, sample } = chosen;
    const p = fit.columns.length;
    const { residualSumOfSquares: rss, rank } = second.regressResiduals('powers');
    const df1 = rank - p;
    const df2 = sample.rowCount - rank;
    if (df1 < 1)
      return notPossible(
        'The fitted values take too few different values to show whether anything is curved.',
      );
    if (df2 < 1) return notPossible('There are too few rows to add a curve to the model.');
    // Residuals in units of s: their squares sum to n − p.
    const total = fit.degreesOfFreedom;
    const statistic = (Math.max(0, total - rss) / df1 / rss) * df2;
    if (!Number.isFinite(statistic))
      return notPossible('With a curve in its fitted values the model would fit these rows exactly.');
    const value = fUpper(statistic, df1, df2);
    const share = Math.max(0, 1 - rss / total);
    const concern = concernOf(value, share < SLIGHT);
    return {
      statistic,
      df: [df1, df2],
      p_value: value,
      mark: null,
      verdict:
        concern === 0
          ? 'No curve in the fitted values is visible that the model lacks.'
          : `A curve in the fitted values tells ${percent(share)} of what the model leaves: its errors depend on where in the data one looks.`,
      concern,
      advice:
        concern === 0
          ? null
          : 'Look at the residuals against each variable for a bend; declare a curve, an interaction or another scale of the response as a candidate.',
      figures: [{ name: 'share of the residuals’ squares told by the curve', value: share }],
    };
  },
};
