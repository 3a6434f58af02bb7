import { cooksDistance, rowName, rowNameFirst } from '../chosen.ts';
import { type Diagnostic, notPossible } from '../diagnostic.ts';

/** The largest Cook’s distance. */
export const influence: Diagnostic = {
  name: 'influence',
  question: 'Does one row carry the result?',
  statisticName: 'largest Cook’s distance',
  source: 'Cook 1977',
  find(chosen) {
    const full: number[] = [];
    let row = -1;
    let largest = -1;
    for (let i = 0; i < chosen.sample.rowCount; i++) {
      const d = cooksDistance(chosen, i);
      if (d === null) {
        if (chosen.s !== null) full.push(i);
      } else if (d > largest) {
        largest = d;
        row = i;
      }
    }
    if (row < 0) return notPossible('Without residual degrees of freedom influence cannot be judged.');
    const name = rowName(chosen.sample, row);
    const alone =
      full.length === 0
        ? ''
        : ` ${full
            .slice(0, 5)
            .map((i, k) => (k === 0 ? rowNameFirst : rowName)(chosen.sample, i))
            .join(
              ', ',
            )}${full.length > 5 ? ` and ${full.length - 5} more` : ''}: fitted by a coefficient of its own (leverage 1), so nothing checks it.`;
    const concern = full.length > 0 || largest >= 1 ? 2 : largest >= 0.5 ? 1 : 0;
    return {
      statistic: largest,
      df: [],
      p_value: null,
      mark: 'worth a look above 0.5, a result that hangs on one row above 1 (common practice)',
      verdict:
        (largest >= 0.5
          ? `${rowNameFirst(chosen.sample, row)} moves the coefficients noticeably: without it the model would say something else.`
          : `No single row moves the coefficients much; ${name} moves them most.`) + alone,
      concern,
      advice:
        concern === 0
          ? null
          : 'Check these rows at their source, and say in the study what the result is without them.',
    };
  },
};
