import type { Chosen } from './chosen.ts';

/** Days between neighbours in time, from … to, and how many make the season that they suggest. */
const SEASONS: readonly (readonly [number, number, number])[] = [
  [1, 1, 7],
  [28, 31, 12],
  [89, 92, 4],
];

/** What is left of n − p must be this many times the lags that were not asked for. */
const ROOM = 3;

/**
 * How many rows back neighbours in time are compared: as the study declares, else a season where the times are dates a
 * day, a month or a quarter apart in the middle, else 1. 0 where no time is declared, or no lag can be had.
 */
export function lagsOf(chosen: Chosen): number {
  const { sample, fit, study } = chosen;
  if (sample.timeOrder === null) return 0;
  const declared = study.examination.lags;
  if (declared !== null) return fit.degreesOfFreedom - declared < 1 ? 0 : declared;
  const season = seasonOf(chosen);
  if (fit.degreesOfFreedom >= ROOM * season) return season;
  return fit.degreesOfFreedom > 1 ? 1 : 0;
}

/** From the gap in the middle between times that differ. */
function seasonOf({ sample, study }: Chosen): number {
  const column = study.data.time === null ? undefined : sample.columns.get(study.data.time);
  if (column?.kind !== 'date') return 1;
  const order = sample.timeOrder!;
  const gaps = new Float64Array(Math.max(0, order.length - 1));
  for (let t = 1; t < order.length; t++)
    gaps[t - 1] = column.values[order[t]!]! - column.values[order[t - 1]!]!;
  const real = gaps.filter((gap) => gap > 0).sort();
  if (real.length === 0) return 1;
  const gap = real[(real.length - 1) >> 1]!;
  return SEASONS.find(([least, most]) => gap >= least && gap <= most)?.[2] ?? 1;
}
