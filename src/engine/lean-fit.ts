import type { CandidateModel } from '../model/design.ts';
import type { Factor } from './factor.ts';
import type { LeanFit } from './fit.ts';
import { isExact, logLikelihood, type RowFacts } from './fit-candidate.ts';
import { type SolveScratch, solveColumns } from './solve-columns.ts';

/**
 * What the criteria read of a candidate's fit, at a small part of the cost of `fitCandidate`: where the same choice is made a
 * thousand times over, only those that come near to being chosen need the rest. Double arithmetic.
 */
export function leanFit(
  factor: Factor,
  candidate: CandidateModel,
  facts: RowFacts,
  scratch: SolveScratch,
): LeanFit {
  const { width: m, rowCount: n } = factor;
  const responseAt = factor.predictorCount + candidate.responseColumn;
  const triangle = factor.triangle.hi;
  const rank = solveColumns(triangle, m, candidate.columns, responseAt, scratch);
  const scale = factor.scales[responseAt]!;
  const rss = scratch.residualSquares / (scale * scale);
  let aboutMean = 0;
  for (let i = responseAt * m + 1; i <= responseAt * m + responseAt; i++)
    aboutMean += triangle[i]! * triangle[i]!;
  const mean = triangle[responseAt * m]! ** 2;
  const size = (mean + aboutMean) / (scale * scale);
  const exact = isExact(rss, size);
  return {
    candidate,
    rowCount: n,
    columns: rank === candidate.columns.length ? candidate.columns : keptOf(candidate, scratch),
    residualSumOfSquares: rss,
    totalSumOfSquares: candidate.intercept ? aboutMean / (scale * scale) : size,
    degreesOfFreedom: n - rank,
    exact,
    logLikelihood: exact ? null : logLikelihood(n, rss, facts, candidate.responseColumn),
  };
}

function keptOf(candidate: CandidateModel, scratch: SolveScratch): number[] {
  return candidate.columns.filter((_, j) => scratch.kept[j] === 1);
}
