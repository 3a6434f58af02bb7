import { EXTENDED_BUDGET, factorExtended, factorRows } from '../../engine/factor.ts';
import { fitCandidate } from '../../engine/fit-candidate.ts';
import { designRows } from '../../model/design-rows.ts';
import { chiSquaredUpper } from '../../stats/distributions.ts';
import type { Chosen } from '../chosen.ts';
import { concernOf, type Diagnostic, notPossible } from '../diagnostic.ts';

/** n R² of the squared residuals on the model's columns, χ² on their number without the intercept. */
export const equalSpread: Diagnostic = {
  name: 'equal_spread',
  topic: 'spread',
  question: 'Is the spread even?',
  statisticName: 'Breusch–Pagan statistic, Koenker’s form',
  source: 'Breusch & Pagan 1979; Koenker 1981',
  find(chosen) {
    if (chosen.s === null)
      return notPossible('The model fits these rows exactly, so there is no spread to judge.');
    const found = koenker(chosen);
    if (found === null) return notPossible('The model has no column that varies, so the spread can depend on none.');
    const { statistic, df } = found;
    const p = chiSquaredUpper(statistic, df);
    const concern = concernOf(p);
    return {
      statistic,
      df: [df],
      p_value: p,
      mark: null,
      verdict:
        concern === 0
          ? 'The squared residuals do not visibly depend on the model’s variables.'
          : 'The size of the residuals depends on the model’s variables: standard errors and intervals are too narrow in some places and too wide in others.',
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
export function koenker(chosen: Chosen): { statistic: number; df: number } | null {
  const { columns, fit, sample, residuals } = chosen;
  const own = fit.columns.filter((column) => column !== 0);
  if (own.length === 0) return null;
  // R² does not depend on the unit of the residuals, and in this one their fourth powers can be held.
  const largest = residuals.reduce((most, e) => Math.max(most, Math.abs(e)), 0);
  if (largest === 0) return { statistic: 0, df: own.length };
  const rows = designRows(
    [columns[0]!, ...own.map((column) => columns[column]!)],
    sample,
    [residuals.map((e) => (e / largest) ** 2)],
    null,
  );
  const factor = rows.rowCount * rows.width ** 2 <= EXTENDED_BUDGET ? factorExtended(rows) : factorRows(rows);
  const auxiliary = fitCandidate(
    factor,
    {
      name: '',
      response: { variable: '', scale: { kind: 'natural' } },
      intercept: true,
      terms: [],
      columns: Array.from({ length: own.length + 1 }, (_, j) => j),
      responseColumn: 0,
    },
    {
      logWeights: 0,
      logJacobians: [0],
      columnNames: [],
      columnVariables: Array.from({ length: own.length + 1 }, () => []),
    },
  );
  const share =
    auxiliary.totalSumOfSquares > 0 ? 1 - auxiliary.residualSumOfSquares / auxiliary.totalSumOfSquares : 0;
  const df = auxiliary.columns.length - 1;
  return df < 1 ? null : { statistic: sample.rowCount * Math.max(0, share), df };
}
