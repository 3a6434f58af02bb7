import { counted } from '../../select/words.ts';
import { chiSquaredUpper } from '../../stats/distributions.ts';
import { allowsRelatedNeighbours } from '../allowed-for.ts';
import { concernOf, type Diagnostic, notPossible } from '../diagnostic.ts';
import { percent } from '../percent.ts';

/** Share of the residuals' squares that earlier residuals tell, below which it hardly matters. */
const SLIGHT = 0.01;

/**
 * n R² of the residuals on the model's columns and the residuals up to L rows before, those before the first row taken as
 * zero; χ² on L.
 */
export const serialCorrelation: Diagnostic = {
  name: 'serial_correlation',
  topic: 'independence',
  question: 'Do rows further apart in time resemble each other?',
  statisticName: 'Breusch–Godfrey statistic',
  source: 'Breusch 1978; Godfrey 1978',
  find(chosen, second) {
    const { sample, study, fit } = chosen;
    if (sample.timeOrder === null) return null;
    if (second === null)
      return notPossible('The model fits these rows exactly, so there are no residuals to compare.');
    const { lags } = second;
    if (lags === 0) {
      const wanted = study.examination.lags ?? 1;
      return notPossible(
        `Looking ${rowsBack(wanted)} takes more than the ${counted(fit.degreesOfFreedom, 'degree')} of freedom that the model leaves.`,
      );
    }
    const { residualSumOfSquares, rank } = second.regressResiduals('lags');
    const df = rank - fit.columns.length;
    if (df < 1) return notPossible('Earlier residuals cannot be told from the model’s own columns here.');
    const share = Math.max(0, 1 - residualSumOfSquares / fit.degreesOfFreedom);
    const statistic = sample.rowCount * share;
    const p = chiSquaredUpper(statistic, df);
    const concern = concernOf(p, share < SLIGHT);
    return {
      statistic,
      df: [df],
      p_value: p,
      mark: null,
      verdict:
        concern === 0
          ? `Residuals up to ${rowsBack(lags)} say nothing visible about a row’s own.`
          : `Residuals up to ${rowsBack(lags)} tell ${percent(share)} of a row’s own: something that lasts or comes round again is not in the model${allowsRelatedNeighbours(chosen) ? '. The declared standard errors allow for what fades within their lags' : ', and the intervals are not to be trusted'}.`,
      concern,
      advice:
        concern === 0
          ? null
          : `Bring the season, the trend or the state that lasts into the model${allowsRelatedNeighbours(chosen) ? '' : ', or declare standard errors that allow for related neighbours'}.`,
      figures: [
        { name: 'rows back', value: lags },
        { name: 'share of the residuals’ squares told by earlier residuals', value: share },
      ],
    };
  },
};

function rowsBack(lags: number): string {
  return lags === 1 ? '1 row back' : `${lags} rows back`;
}
