import { designRows } from '../../model/design-rows.ts';
import { wholeNumber } from '../../numerals.ts';
import { chiSquaredUpper } from '../../stats/distributions.ts';
import { allowsUnevenSpread } from '../allowed-for.ts';
import { factorOf, regress, rowsWith } from '../auxiliary.ts';
import { concernOf, type Diagnostic, notPossible } from '../diagnostic.ts';
import { squaresAndProducts } from '../products.ts';

/** n m² up to which the auxiliary regression is quick. */
const WORK = 2e9;
/** Share of the squared residuals' variation below which it hardly matters. */
const SLIGHT = 0.02;

/**
 * n R² of the squared residuals on the model's columns, their squares and their products; dependent ones join the
 * earlier ones, and χ² has as many degrees of freedom as are left.
 */
export const unevenSpread: Diagnostic = {
  name: 'uneven_spread',
  topic: 'spread',
  question: 'Does the spread change in the middle, or where variables meet?',
  statisticName: 'White statistic',
  source: 'White 1980',
  find(chosen, second) {
    if (second === null)
      return notPossible('The model fits these rows exactly, so there is no spread to judge.');
    const { fit, columns, sample, residuals } = chosen;
    const s = chosen.s!;
    const n = sample.rowCount;
    const own = fit.columns.filter((column) => column !== 0).map((column) => columns[column]!);
    const constant = notPossible('The model has no column that varies, so the spread can depend on none.');
    if (own.length === 0) return constant;
    const design = [columns[0]!, ...own, ...squaresAndProducts(own)];
    if (n * design.length ** 2 > WORK)
      return notPossible(
        `The ${design.length - 1} squares and products of the columns are too many to be tested in ${wholeNumber(n)} rows in reasonable time; the first test of even spread stands for both.`,
      );
    const rows = rowsWith(
      designRows(design, { rowCount: n, columns: sample.columns }, [], null),
      [],
      [
        (from, to, out, at) => {
          for (let i = from; i < to; i++) out[at + i - from] = (residuals[i]! / s) ** 2;
        },
      ],
    );
    const auxiliary = regress(
      factorOf(rows),
      design.map((_, j) => j),
    );
    const df = auxiliary.rank - 1;
    if (df < 1) return constant;
    if (auxiliary.rank >= n)
      return notPossible(
        `With the squares and products of its columns the model has ${design.length} columns for ${wholeNumber(n)} rows, too many for the test.`,
      );
    const share =
      auxiliary.totalSumOfSquares > 0
        ? Math.max(0, 1 - auxiliary.residualSumOfSquares / auxiliary.totalSumOfSquares)
        : 0;
    const p = chiSquaredUpper(n * share, df);
    const concern = concernOf(p, share < SLIGHT);
    return {
      statistic: n * share,
      df: [df],
      p_value: p,
      mark: null,
      verdict:
        concern === 0
          ? 'The squared residuals do not visibly depend on squares and products of the model’s variables.'
          : `The size of the residuals depends on the model’s variables in a way that bends or that several of them share: ${allowsUnevenSpread(chosen) ? 'the declared standard errors allow for that, but intervals for new rows do not, and' : 'intervals'} are too narrow in some places and too wide in others.`,
      concern,
      advice:
        concern === 0
          ? null
          : `Look at the residuals against each variable; declare weights${allowsUnevenSpread(chosen) ? ' or another scale of the response' : ', another scale of the response, or robust standard errors'}.`,
      figures: [{ name: 'share of the squared residuals’ variation', value: share }],
    };
  },
};
