/**
 * The factor of 1,000,000 × 21 beside general-purpose QR decompositions of the same matrix, and 1,000 candidates
 * from one factor beside fitting each from the rows. Ratios of times in one run on one machine.
 */
import { spawnSync } from 'node:child_process';
import { Matrix, QrDecomposition } from 'ml-matrix';
import { factorRows } from '../../src/engine/factor.ts';
import { fitCandidate } from '../../src/engine/fit-candidate.ts';
import { refineFit } from '../../src/engine/refine.ts';
import { testModel, variable } from '../engine/models.ts';
import { invented, line, ratio, time } from './measure.ts';

const ROWS = 1_000_000;
const PREDICTORS = 19;

function modelOf(rows: number, predictors: number, candidates: number[][]) {
  const data: Record<string, number[]> = { y: invented(rows, 1) };
  for (let j = 0; j < predictors; j++) data[`x${j}`] = invented(rows, j + 2);
  return testModel(
    data,
    Array.from({ length: predictors }, (_, j) => variable(`x${j}`)),
    candidates,
  );
}

function python(script: string): string | null {
  const env = { ...process.env };
  // Settings that some machines make for old builds would slow the library that is measured against.
  delete env.OPENBLAS_CORETYPE;
  delete env.OPENBLAS_L2_SIZE;
  for (const name of ['/usr/bin/python3', 'python3']) {
    const run = spawnSync(name, ['-c', script], { encoding: 'utf8', env });
    if (run.status === 0) return run.stdout;
  }
  return null;
}

export function benchFactor(): void {
  const all = [[0, ...Array.from({ length: PREDICTORS }, (_, j) => j + 1)]];
  const { rows, design, facts } = modelOf(ROWS, PREDICTORS, all);
  const factor = time(
    'factor of 1,000,000 × 21 in one pass (20 columns and the response)',
    () => factorRows(rows),
    3,
  );

  const numpy = python(`
import time, numpy as np
a = np.random.default_rng(1).standard_normal((${ROWS}, 21))
best = 1e9
for _ in range(3):
    t = time.perf_counter(); np.linalg.qr(a, mode='r'); best = min(best, time.perf_counter() - t)
print(best)
`);
  if (numpy === null) line("LAPACK's QR", 'python3-numpy is not on this machine');
  else ratio("factor / LAPACK's QR (R only) through numpy, all cores", factor.seconds, Number(numpy));

  const small = 100_000;
  const matrix = new Matrix(small, 21);
  for (let j = 0; j < 21; j++) matrix.setColumn(j, invented(small, j + 1));
  const general = time(`ml-matrix QR of ${small} × 21`, () => new QrDecomposition(matrix), 1);
  ratio('factor / ml-matrix QR, per row', factor.seconds / ROWS, general.seconds / small);

  const plain = fitCandidate(factor.value, design.candidates[0]!, facts);
  const refined = time('refining the fit of 1,000,000 × 20', () => refineFit(plain, rows, facts), 1);
  ratio('refinement / factor', refined.seconds, factor.seconds);
}

export function benchCandidates(): void {
  const predictors = 19;
  const candidates = Array.from({ length: 1000 }, (_, k) => [
    0,
    ...Array.from({ length: predictors }, (_, j) => j + 1).filter((j) => ((k * 2654435761) >>> (j % 20)) & 1),
  ]);
  const { rows, design, facts } = modelOf(100_000, predictors, candidates);
  const pass = time('one pass over 100,000 × 20', () => factorRows(rows), 3);
  const fits = time(
    '1,000 candidates from that factor',
    () => design.candidates.map((one) => fitCandidate(pass.value, one, facts)),
    3,
  );
  ratio('pass and 1,000 candidates / one pass', pass.seconds + fits.seconds, pass.seconds);
  const each = time(
    '10 of them, each from the rows',
    () => {
      for (const one of design.candidates.slice(0, 10)) {
        const own = modelRows(rows, one.columns);
        factorRows(own);
      }
    },
    1,
  );
  ratio('pass and 1,000 candidates / each from the rows', pass.seconds + fits.seconds, each.seconds * 100);
}

/** The same rows with only some of the columns. */
function modelRows(rows: ReturnType<typeof modelOf>['rows'], columns: readonly number[]): typeof rows {
  const map = [...columns, rows.predictorCount];
  return {
    ...rows,
    width: map.length,
    predictorCount: columns.length,
    scales: Float64Array.from(map, (j) => rows.scales[j]!),
    fill: (wanted, from, to, stride, hi, lo) =>
      rows.fill(
        wanted.map((j) => map[j]!),
        from,
        to,
        stride,
        hi,
        lo,
      ),
  };
}
