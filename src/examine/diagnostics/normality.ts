import { wholeNumber } from '../../numerals.ts';
import { SHAPIRO_WILK_ROWS, shapiroWilk } from '../../stats/shapiro-wilk.ts';
import { concernOf, type Diagnostic, notPossible } from '../diagnostic.ts';

/** W above this looks normal to the eye. */
const SLIGHT = 0.99;

/** W of the residuals. */
export const normality: Diagnostic = {
  name: 'normality',
  topic: 'normality',
  question: 'Are the errors like a normal distribution’s?',
  statisticName: 'Shapiro–Wilk W',
  source: 'Shapiro & Wilk 1965; Royston 1995 (AS R94)',
  find(chosen) {
    if (chosen.s === null)
      return notPossible('The model fits these rows exactly, so it has no errors to judge.');
    const n = chosen.sample.rowCount;
    const [fewest, most] = SHAPIRO_WILK_ROWS;
    if (n > most)
      return notPossible(
        `The Shapiro–Wilk test is made for at most ${wholeNumber(most)} rows; of ${wholeNumber(n)}, skewness and tails say more.`,
      );
    const found = n < fewest ? null : shapiroWilk(chosen.residuals);
    if (found === null)
      return notPossible('There are too few different residuals to judge their distribution.');
    const concern = concernOf(found.p, found.w > SLIGHT);
    return {
      statistic: found.w,
      df: [],
      p_value: found.p,
      mark: null,
      verdict:
        concern === 0
          ? 'The residuals look as those of normal errors may.'
          : 'The residuals do not look like those of normal errors: p-values are approximate, and prediction intervals may be too short on one side.',
      concern,
      advice:
        concern === 0
          ? null
          : 'Look at the largest residuals first; then try the response on another scale, or ask for bootstrap intervals.',
    };
  },
};
