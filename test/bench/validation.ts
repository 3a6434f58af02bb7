/**
 * 10-fold cross-validation of 1,000 candidates on 100,000 × 20 beside one pass over the rows, and 1,000 bootstrap repetitions of a subset
 * search over 15 columns on 1,000 rows. Ratios of times in one run on one machine.
 */
import { bestSubsets } from '../../src/engine/best-subsets.ts';
import { factorRows } from '../../src/engine/factor.ts';
import { fitCandidate } from '../../src/engine/fit-candidate.ts';
import { crossValidate } from '../../src/select/cross-validate.ts';
import type { Folds } from '../../src/select/folds.ts';
import { declaredProcedure, type Search } from '../../src/select/procedure.ts';
import { stability } from '../../src/select/stability.ts';
import { testModel, variable } from '../engine/models.ts';
import { makeGround } from '../select/make-ground.ts';
import { studyWith } from '../select/study-with.ts';
import { invented, line, ratio, time } from './measure.ts';

export function benchValidation(): void {
  const n = 100_000;
  const predictors = 19;
  const data: Record<string, number[]> = { y: invented(n, 1) };
  for (let j = 0; j < predictors; j++) data[`x${j}`] = invented(n, j + 2);
  const candidates = Array.from({ length: 1000 }, (_, k) => [
    0,
    ...Array.from({ length: predictors }, (_, j) => j + 1).filter(
      (j) => (Math.imul(k + 1, 2654435761) >>> (j + 3)) & 1,
    ),
  ]);
  const { rows, design, facts } = testModel(
    data,
    Array.from({ length: predictors }, (_, j) => variable(`x${j}`)),
    candidates,
  );
  const pass = time('one pass over 100,000 × 20', () => factorRows(rows), 5);
  const fits = design.candidates.map((one) => fitCandidate(pass.value, one, facts));
  const partOf = invented(n, 99).map((value) => Math.floor((value + 0.5) * 10));
  const folds: Folds = {
    plan: { by: 'rows', folds: 10, repeats: 1, seed: 1, group: null, start: null, horizon: 1, path: [] },
    sets: [{ kind: 'parts', partOf: Int32Array.from(partOf), count: 10 }],
    nameOf: String,
    count: 10,
  };
  const own = Float64Array.from(data.y!);
  const validated = time(
    '10-fold cross-validation of 1,000 candidates, pass and all',
    () => crossValidate({ rows, own, fits, folds, ranks: true }),
    5,
  );
  ratio('cross-validation of 1,000 candidates / one pass (to be at most 5)', validated.seconds, pass.seconds);
}

export function benchBootstrap(): void {
  const n = 1000;
  const predictors = 15;
  const data: Record<string, number[]> = {};
  for (let j = 0; j < predictors; j++) data[`x${j}`] = invented(n, j + 2);
  data.y = invented(n, 1).map((e, i) => e + 0.2 * data.x0![i]! + 0.1 * data.x3![i]! - 0.06 * data.x7![i]!);
  const all = [0, ...Array.from({ length: predictors }, (_, j) => j + 1)];
  const { ground } = makeGround(
    data,
    Array.from({ length: predictors }, (_, j) => variable(`x${j}`)),
    [all],
  );
  const [largest] = ground.design.candidates;
  const groups = Array.from({ length: predictors }, (_, j) => ({ columns: [j + 1], needs: [] }));
  const search: Search = ({ factor }) =>
    bestSubsets(factor, {
      always: [0],
      groups,
      responseColumn: 0,
      atLeast: 0,
      atMost: predictors,
      keep: 1,
      mostColumns: predictors + 1,
    }).sizes.flatMap(({ kept }) =>
      kept.map(({ groups: found }) => ({
        ...largest!,
        name: found.map((g) => `x${g}`).join(' '),
        terms: largest!.terms.filter((_, g) => found.includes(g)),
        columns: [0, ...found.map((g) => g + 1)],
      })),
    );
  const procedure = declaredProcedure(studyWith({ rankBy: 'aicc' }), ground.design, search);
  const pass = time('one pass over 1,000 × 16', () => factorRows(ground.rows), 20);
  const found = time(
    '1,000 bootstrap repetitions of a search over 15 columns, 1,000 rows',
    () =>
      stability({
        plan: { repetitions: 1000, seed: 1, by: 'rows', group: null, blockLength: null },
        ground,
        procedure,
      }),
    1,
  );
  ratio('each repetition / one pass', found.seconds / 1000, pass.seconds);
  line(
    'most often chosen',
    `${found.value.candidates[0]!.chosen} of 1,000: ${found.value.candidates[0]!.candidate}`,
  );
}
