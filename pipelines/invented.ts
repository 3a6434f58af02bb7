/** What the generators of invented data share: seeded random numbers and plain CSV. */
import { writeFileSync } from 'node:fs';

export interface Random {
  /** Between 0 and 1. */
  uniform(): number;
  between(low: number, high: number): number;
  /** A whole number from low to high, both included. */
  whole(low: number, high: number): number;
  normal(mean: number, deviation: number): number;
  /** A count with the given mean. */
  poisson(mean: number): number;
  /** One of the values, by weight. */
  pick<T>(choices: readonly (readonly [T, number])[]): T;
}

/** The same seed gives the same numbers: mulberry32 (after Tommy Ettinger, public domain) and Box & Muller 1958. */
export function seeded(seed: number): Random {
  let state = seed >>> 0;
  const uniform = (): number => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = state;
    mixed = Math.imul(mixed ^ (mixed >>> 15), mixed | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4294967296;
  };
  const standardNormal = () => Math.sqrt(-2 * Math.log(1 - uniform())) * Math.cos(2 * Math.PI * uniform());
  return {
    uniform,
    between: (low, high) => low + (high - low) * uniform(),
    whole: (low, high) => low + Math.floor((high - low + 1) * uniform()),
    normal: (mean, deviation) => mean + deviation * standardNormal(),
    poisson(mean) {
      // Knuth's product of uniforms; means here are small.
      const floor = Math.exp(-mean);
      let count = -1;
      for (let product = 1; product > floor; product *= uniform()) count++;
      return count;
    },
    pick(choices) {
      let left = uniform() * choices.reduce((sum, [, weight]) => sum + weight, 0);
      for (const [value, weight] of choices) {
        left -= weight;
        if (left < 0) return value;
      }
      return choices[choices.length - 1]![0];
    },
  };
}

/** Whether the later file is to be made, by --later: the rows of the first as they stand some months on, and new ones. */
export const later = process.argv.includes('--later');

/**
 * Writes a CSV, to the file named on the command line where there is one. A cell that holds the delimiter or
 * a quote is quoted.
 */
export function writeCsv(
  file: URL,
  header: readonly string[],
  rows: readonly (readonly string[])[],
  delimiter = ',',
): void {
  const cell = (text: string) =>
    text.includes(delimiter) || text.includes('"') ? `"${text.replaceAll('"', '""')}"` : text;
  const lines = [header, ...rows].map((row) => row.map(cell).join(delimiter));
  writeFileSync(
    process.argv.slice(2).find((each) => !each.startsWith('--')) ?? file,
    `${lines.join('\n')}\n`,
  );
}

/** 2025-03-09 or, with the time, 2025-03-09T07:40. */
export function isoDate(day: number, minutes?: number): string {
  const text = new Date((day * 1440 + (minutes ?? 0)) * 60_000).toISOString();
  return minutes === undefined ? text.slice(0, 10) : text.slice(0, 16);
}

/** Days since 1970-01-01 of an ISO date. */
export function dayOf(date: string): number {
  return Date.parse(`${date}T00:00:00Z`) / 86_400_000;
}
