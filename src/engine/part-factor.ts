import type { CandidateModel } from '../model/design.ts';
import type { Factor } from './factor.ts';
import type { RowFacts } from './fit-candidate.ts';
import { eliminate, matrix } from './kernel.ts';

/** A candidate with no columns about it but its own. */
export interface Part {
  readonly factor: Factor;
  readonly candidate: CandidateModel;
  readonly facts: RowFacts;
}

/**
 * The factor of one candidate's columns alone, the candidate's columns numbered anew (the intercept stays column 0,
 * and is there in any case). Double arithmetic. For fits of which there are many and of which only the candidate's own
 * figures are wanted: estimates, inverse and VIF do not depend on the other columns of the union.
 */
export function partFactor(factor: Factor, candidate: CandidateModel, facts: RowFacts): Part {
  const { stride, hi } = factor.triangle;
  const responseAt = factor.predictorCount + candidate.responseColumn;
  const union = [0, ...candidate.columns.filter((column) => column !== 0).sort((a, b) => a - b)];
  const at = new Map(union.map((column, j) => [column, j]));
  const own = [...union, responseAt];
  const height = responseAt + 1;
  const width = own.length;
  const work = matrix(height, width, false);
  own.forEach((column, j) => {
    for (let i = 0; i <= column; i++) work.hi[j * height + i] = hi[column * stride + i]!;
  });
  // Rows below the last column taken so far are still zero.
  let end = 0;
  own.forEach((column, j) => {
    end = Math.max(end, column + 1);
    eliminate(work, j, j, end, width);
  });
  const triangle = matrix(width, width, false);
  for (let j = 0; j < width; j++)
    for (let i = 0; i <= j; i++) triangle.hi[j * width + i] = work.hi[j * height + i]!;
  return {
    factor: {
      width,
      predictorCount: width - 1,
      rowCount: factor.rowCount,
      triangle,
      scales: Float64Array.from(own, (column) => factor.scales[column]!),
    },
    candidate: {
      ...candidate,
      responseColumn: 0,
      columns: candidate.columns.map((column) => at.get(column)!),
      terms: candidate.terms.map((term) => ({
        ...term,
        columns: term.columns.map((column) => at.get(column)!),
      })),
    },
    facts: {
      ...facts,
      logJacobians: [facts.logJacobians[candidate.responseColumn]!],
      columnNames: union.map((column) => facts.columnNames[column]!),
      columnVariables: union.map((column) => facts.columnVariables[column]!),
    },
  };
}
