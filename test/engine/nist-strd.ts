/**
 * Reads a file of the NIST Statistical Reference Datasets, linear regression (StRD, National Institute of
 * Standards and Technology). The files are not part of the project: tests read them where they are present.
 */
import { existsSync, readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';

const FOLDER = fileURLToPath(new URL('../../../shared/reference/nist-strd/', import.meta.url));

export const STRD_PRESENT = existsSync(FOLDER);

export const STRD_SETS = [
  'Norris',
  'Pontius',
  'NoInt1',
  'NoInt2',
  'Filip',
  'Longley',
  'Wampler1',
  'Wampler2',
  'Wampler3',
  'Wampler4',
  'Wampler5',
] as const;

export type StrdName = (typeof STRD_SETS)[number];

export interface StrdSet {
  readonly name: StrdName;
  readonly y: number[];
  /** Predictor variables, one array each. */
  readonly x: number[][];
  readonly estimates: number[];
  readonly standardErrors: number[];
  readonly residualStandardError: number;
  readonly rSquared: number;
  readonly residualSumOfSquares: number;
  readonly overallF: number;
}

export function readStrd(name: StrdName): StrdSet {
  const lines = readFileSync(`${FOLDER}${name}.dat`, 'latin1').split(/\r?\n/);
  const numbers = (line: string) =>
    line
      .trim()
      .split(/\s+/)
      .filter((text) => text !== '')
      .map((text) => Number(text.replace(/D/i, 'e')))
      .filter((value) => !Number.isNaN(value));
  const coefficients = lines
    .filter((line) => /^\s*B\d+\s/.test(line))
    .map((line) => numbers(line.replace(/B\d+/, '')));
  const after = (pattern: RegExp, skip = 0) =>
    numbers(lines[lines.findIndex((line) => pattern.test(line)) + skip]!.replace(pattern, ''));
  const start = lines.findLastIndex((line) => /^\s*Data:\s+y/i.test(line));
  const rows = lines
    .slice(start + 1)
    .map(numbers)
    .filter((row) => row.length > 0);
  const regression = lines.find((line) => /^Regression\s/.test(line))!;
  return {
    name,
    y: rows.map((row) => row[0]!),
    x: rows[0]!.slice(1).map((_, j) => rows.map((row) => row[j + 1]!)),
    estimates: coefficients.map((row) => row[0]!),
    standardErrors: coefficients.map((row) => row[1]!),
    residualStandardError: after(/^\s*Standard Deviation(?=\s+[\d.])/)[0]!,
    rSquared: after(/^\s*R-Squared/)[0]!,
    residualSumOfSquares: numbers(
      lines.find((line) => /^Residual\s+\d/.test(line))!.replace('Residual', ''),
    )[1]!,
    overallF: numbers(regression.replace('Regression', '')).at(-1)!,
  };
}

/** Correct digits: −log10 of the relative error, capped at 15; absolute where the certified value is 0. */
export function correctDigits(found: number, certified: number): number {
  if (found === certified) return 15;
  const error = certified === 0 ? Math.abs(found) : Math.abs(found - certified) / Math.abs(certified);
  return Math.min(15, -Math.log10(error));
}
