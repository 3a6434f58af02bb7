import { wholeNumber } from '../../numerals.ts';
import { tTwoSided } from '../../stats/distributions.ts';
import { deletedResidual, rowName, rowNameFirst } from '../chosen.ts';
import { type Diagnostic, notPossible } from '../diagnostic.ts';

/** The largest deleted residual, its p-value multiplied by the number of rows looked at (Bonferroni). */
export const outlyingRows: Diagnostic = {
  name: 'outlying_rows',
  topic: 'outliers',
  question: 'Does any row not belong with the rest?',
  statisticName: 'largest deleted residual',
  source: 'Belsley, Kuh & Welsch 1980; Bonferroni’s inequality',
  find(chosen) {
    let row = -1;
    let largest = 0;
    for (let i = 0; i < chosen.sample.rowCount; i++) {
      const t = deletedResidual(chosen, i);
      if (t !== null && Math.abs(t) > Math.abs(largest)) {
        largest = t;
        row = i;
      }
    }
    if (chosen.s === null) return notPossible('The model fits these rows exactly, so no row stands out.');
    if (row < 0) return notPossible('There are too few degrees of freedom to judge single rows.');
    const df = chosen.fit.degreesOfFreedom - 1;
    const p = Math.min(1, chosen.sample.rowCount * tTwoSided(largest, df));
    const name = rowName(chosen.sample, row);
    const concern = p < 0.001 ? 2 : p < 0.05 ? 1 : 0;
    const direction = largest > 0 ? 'above' : 'below';
    return {
      statistic: Number.isFinite(largest) ? largest : null,
      df: [df],
      p_value: p,
      mark: null,
      verdict:
        concern === 0
          ? `The row farthest from the model, ${name}, is no farther than the farthest of ${wholeNumber(chosen.sample.rowCount)} rows may well be.`
          : `${rowNameFirst(chosen.sample, row)} lies farther ${direction} the model than chance among ${wholeNumber(chosen.sample.rowCount)} rows explains.`,
      concern,
      advice:
        concern === 0
          ? null
          : `Look at ${name} at its source. Leave it out only for a reason that has nothing to do with its residual, and declare that reason.`,
    };
  },
};
