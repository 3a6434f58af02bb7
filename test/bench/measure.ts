/** Small tools of the benches: timings are printed as ratios of what was measured in the same run. */

export interface Timed<T> {
  readonly seconds: number;
  readonly value: T;
}

/** Runs `work` and prints the best of `repeats` times. */
export function time<T>(what: string, work: () => T, repeats: number): Timed<T> {
  let seconds = Number.POSITIVE_INFINITY;
  let value: T | undefined;
  for (let k = 0; k < repeats; k++) {
    const start = performance.now();
    value = work();
    seconds = Math.min(seconds, (performance.now() - start) / 1000);
  }
  line(what, `${seconds.toFixed(3)} s`);
  return { seconds, value: value as T };
}

export function ratio(what: string, a: number, b: number): void {
  line(what, `ratio ${(a / b).toFixed(a / b < 0.1 ? 4 : 2)}`);
}

export function line(what: string, value: string): void {
  process.stdout.write(`${what.padEnd(72)} ${value}\n`);
}

/** Invented numbers in (−½, ½) from a small generator: the same for a seed. */
export function invented(count: number, seed: number): number[] {
  let state = Math.imul(seed, 2654435761) >>> 0;
  return Array.from({ length: count }, () => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
    return state / 2 ** 32 - 0.5;
  });
}
