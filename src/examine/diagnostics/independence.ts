import { decimalNumber, wholeNumber } from '../../numerals.ts';
import type { Chosen } from '../chosen.ts';
import { type Diagnostic, notPossible } from '../diagnostic.ts';

/** Σ (e_t − e_{t−1})²/Σ e_t² in time order. */
export const independence: Diagnostic = {
  name: 'independence',
  question: 'Do neighbours in time resemble each other?',
  statisticName: 'Durbin–Watson statistic',
  source: 'Durbin & Watson 1950, 1951',
  find(chosen) {
    const order = chosen.sample.timeOrder;
    if (order === null) return null;
    if (chosen.s === null || order.length < 3)
      return notPossible('Too few rows or degrees of freedom to judge neighbours in time.');
    const statistic = durbinWatson(chosen.residuals, order);
    const away = Math.abs(statistic - 2);
    const concern = away > 1 ? 2 : away > 0.5 ? 1 : 0;
    const repeated = repeatedTimes(chosen);
    const correlation = `about ${decimalNumber(1 - statistic / 2, 2)}`;
    return {
      statistic,
      df: [],
      p_value: null,
      mark: 'near 2 for unrelated neighbours; below 1.5 or above 2.5 is worth a look (common practice)',
      verdict:
        (concern === 0
          ? `Neighbours in time are not visibly related (correlation ${correlation}).`
          : statistic < 2
            ? `A row’s residual resembles the one before it (correlation ${correlation}): there is less information in the rows than their number says, and the intervals are too narrow.`
            : `A row’s residual tends to oppose the one before it (correlation ${correlation}), as where one period’s excess is booked in the next.`) +
        (repeated > 0
          ? ` ${wholeNumber(repeated)} rows share their time with the row before; they are taken in file order.`
          : ''),
      concern,
      advice:
        concern === 0
          ? null
          : 'Look at the residuals in time order for a season, a drift or a step, and bring what causes it into the model.',
    };
  },
};

/** The statistic over residuals taken in the given order; between 0 and 4. */
export function durbinWatson(residuals: Float64Array, order: Int32Array): number {
  let differences = 0;
  let squares = 0;
  let before = 0;
  for (let t = 0; t < order.length; t++) {
    const e = residuals[order[t]!]!;
    if (t > 0) differences += (e - before) ** 2;
    squares += e * e;
    before = e;
  }
  return differences / squares;
}

function repeatedTimes(chosen: Chosen): number {
  const { study, sample } = chosen;
  const time = study.data.time === null ? undefined : sample.columns.get(study.data.time);
  if (time === undefined || time.kind === 'category' || time.kind === 'text') return 0;
  let count = 0;
  const order = sample.timeOrder!;
  for (let t = 1; t < order.length; t++) if (time.values[order[t]!] === time.values[order[t - 1]!]) count++;
  return count;
}
