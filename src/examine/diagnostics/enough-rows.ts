import { wholeNumber } from '../../numerals.ts';
import type { Diagnostic } from '../diagnostic.ts';

/** Rows per coefficient. */
export const enoughRows: Diagnostic = {
  name: 'enough_rows',
  topic: 'rows',
  question: 'Are there enough rows for this many coefficients?',
  statisticName: 'rows per coefficient',
  source: 'common practice, no source',
  find(chosen) {
    const n = chosen.sample.rowCount;
    const p = chosen.fit.columns.length;
    const ratio = n / p;
    const concern = ratio < 5 ? 2 : ratio < 10 ? 1 : 0;
    return {
      statistic: ratio,
      df: [],
      p_value: null,
      mark: 'ten to twenty (common practice)',
      verdict: `${wholeNumber(n)} rows carry ${wholeNumber(p)} coefficients${concern === 0 ? '.' : ': R² flatters the model, and the coefficients may not come back on new rows.'}`,
      concern,
      advice:
        concern === 0
          ? null
          : 'Look at the predicted R² rather than R², and prefer a smaller candidate or wait for more rows.',
    };
  },
};
