import { designRows } from '../../model/design-rows.ts';
import { chiSquaredUpper } from '../../stats/distributions.ts';
import { allowsUnevenSpread } from '../allowed-for.ts';
import { type Auxiliary, type ColumnWriter, factorOf, regress, rowsWith } from '../auxiliary.ts';
import type { Chosen } from '../chosen.ts';
import { concernOf, type Diagnostic, notPossible } from '../diagnostic.ts';
import type { SecondPass } from '../second-pass.ts';

/** Share of the squared residuals' variation below which it hardly matters. */
const SLIGHT = 0.01;

/** n R² of the squared residuals on the model's columns, χ² on their number without the intercept. */
export const equalSpread: Diagnostic = {
  name: 'equal_spread',
  topic: 'spread',
  question: 'Is the spread even?',
  statisticName: 'Breusch–Pagan statistic, Koenker’s form',
  source: 'Breusch & Pagan 1979; Koenker 1981',
  find(chosen, second) {
    if (second === null)
      return notPossible('The model fits these rows exactly, so there is no spread to judge.');
    const found = koenker(chosen, second);
    if (found === null)
      return notPossible('The model has no column that varies, so the spread can depend on none.');
    const { statistic, df } = found;
    const p = chiSquaredUpper(statistic, df);
    const concern = concernOf(p, statistic < SLIGHT * chosen.sample.rowCount);
    return {
      statistic,
      df: [df],
      p_value: p,
      mark: null,
      verdict:
        concern === 0
          ? 'The squared residuals do not visibly depend on the model’s variables.'
          : `The size of the residuals depends on the model’s variables: ${allowsUnevenSpread(chosen) ? 'the declared standard errors allow for that, but intervals for new rows do not, and' : 'standard errors and intervals'} are too narrow in some places and too wide in others.`,
      concern,
      advice: concern === 0 ? null : `${remedy(chosen)}; do not lean on intervals at the edge of the data.`,
    };
  },
};

/** What may even the spread out: only a scale that is defined for every value of the response. */
function remedy({ study, spreads, fit }: Chosen): string {
  if (fit.candidate.response.scale.kind !== 'natural') {
    return 'Try the response on another scale, or declare weights';
  }
  const smallest = spreads.get(study.response.variable)?.smallest ?? Number.NEGATIVE_INFINITY;
  if (smallest > 0) return 'Try the response on a log or square-root scale, or declare weights';
  return smallest === 0
    ? 'Try the response on a square-root scale (it has zeros, so it has no logarithm), or declare weights'
    : 'Declare weights, or bring what the spread depends on into the model (the response has values below zero, so a log or square-root scale is not open to it)';
}

/** The statistic and its degrees of freedom; null where no column of the model varies. */
function koenker(chosen: Chosen, second: SecondPass): { statistic: number; df: number } | null {
  const { fit, sample } = chosen;
  if (fit.columns.every((column) => column === 0)) return null;
  const auxiliary = second.regressSquares?.() ?? unweighted(chosen);
  const share =
    auxiliary.totalSumOfSquares > 0 ? 1 - auxiliary.residualSumOfSquares / auxiliary.totalSumOfSquares : 0;
  const df = auxiliary.rank - 1;
  return df < 1 ? null : { statistic: sample.rowCount * Math.max(0, share), df };
}

/** Of a weighted study: w e² on the columns as they are. */
function unweighted({ columns, fit, sample, residuals, s }: Chosen): Auxiliary {
  const design = [columns[0]!, ...fit.columns.filter((column) => column !== 0).map((j) => columns[j]!)];
  const rows = designRows(design, sample, [], null);
  const squares: ColumnWriter = (from, to, out, at) => {
    for (let i = from; i < to; i++) out[at + i - from] = (residuals[i]! / s!) ** 2;
  };
  return regress(
    factorOf(rowsWith(rows, [], [squares])),
    design.map((_, j) => j),
  );
}
