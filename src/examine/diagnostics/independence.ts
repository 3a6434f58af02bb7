import { decimalNumber, wholeNumber } from '../../numerals.ts';
import { allowsRelatedNeighbours } from '../allowed-for.ts';
import type { Chosen } from '../chosen.ts';
import { concernOf, type Diagnostic, notPossible } from '../diagnostic.ts';
import { durbinWatson, exactTails, normalTails, type Tails } from '../durbin-watson.ts';
import { orthonormalRows } from '../orthonormal-design.ts';
import type { SecondPass } from '../second-pass.ts';

/** Rows up to which the p-value is exact, and n p² up to which that is quick. */
const EXACT_ROWS = 2000;
const EXACT_WORK = 2e6;
/** Correlation of neighbours that hardly widens an interval. */
const SLIGHT = 0.1;

/** Σ (e_t − e_{t−1})²/Σ e_t² in time order, with a two-sided p-value. */
export const independence: Diagnostic = {
  name: 'independence',
  topic: 'independence',
  question: 'Do neighbours in time resemble each other?',
  statisticName: 'Durbin–Watson statistic',
  source: 'Durbin & Watson 1950, 1951; Imhof 1961; Helstrom 1983; Rice 1980',
  find(chosen, second) {
    const order = chosen.sample.timeOrder;
    if (order === null) return null;
    if (chosen.s === null || second === null)
      return notPossible('The model fits these rows exactly, so there are no residuals to compare.');
    if (order.length < 3) return notPossible('There are too few rows to judge neighbours in time.');
    const statistic = durbinWatson(chosen.residuals, order);
    const { tails, exact } = tailsOf(chosen, second, statistic);
    const p = Math.min(1, 2 * Math.min(tails.lower, tails.upper));
    const related = 1 - statistic / 2;
    const concern = concernOf(p, Math.abs(related) < SLIGHT);
    const how = exact ? 'exact' : 'approximate';
    const correlation = `about ${decimalNumber(related, 2)}`;
    const told =
      concern === 0
        ? `Neighbours in time are not visibly related (correlation ${correlation}).`
        : statistic < 2
          ? `A row’s residual resembles the one before it (correlation ${correlation}): there is less information in the rows than their number says, ${allowsRelatedNeighbours(chosen) ? 'which the declared standard errors allow for and the tests of whole models do not' : 'and the intervals are probably too narrow'}.`
          : `A row’s residual tends to oppose the one before it (correlation ${correlation}), as where one period’s excess is booked in the next.`;
    return {
      statistic,
      df: [],
      p_value: p,
      mark: null,
      verdict: told + aboutTheOrder(chosen),
      concern,
      advice:
        concern === 0
          ? null
          : 'Look at the residuals in time order for a season, a drift or a step, and bring what causes it into the model.',
      figures: [
        { name: `${how} p-value against neighbours that resemble each other`, value: tails.lower },
        { name: `${how} p-value against neighbours that oppose each other`, value: tails.upper },
      ],
    };
  },
};

function tailsOf(chosen: Chosen, second: SecondPass, statistic: number): { tails: Tails; exact: boolean } {
  const n = chosen.sample.rowCount;
  const p = chosen.fit.columns.length;
  if (n <= EXACT_ROWS && n * p * p <= EXACT_WORK) {
    return { tails: exactTails(statistic, orthonormalRows(chosen), n, p), exact: true };
  }
  return { tails: normalTails(statistic, n, p, second.neighbours!), exact: false };
}

/** What a reader should know of how the rows were put in order. */
function aboutTheOrder(chosen: Chosen): string {
  const { study, sample } = chosen;
  const time = study.data.time === null ? undefined : sample.columns.get(study.data.time);
  if (time === undefined || time.kind === 'category' || time.kind === 'text') return '';
  const order = sample.timeOrder!;
  const gaps = gapsIn(time.values, order);
  let repeated = 0;
  let moved = 0;
  for (let t = 1; t < order.length; t++) {
    if (time.values[order[t]!] === time.values[order[t - 1]!]) repeated++;
    if (time.values[t]! < time.values[t - 1]!) moved++;
  }
  const rows = (count: number, one: string, many: string) =>
    count === 1 ? `1 row ${one}` : `${wholeNumber(count)} rows ${many}`;
  return (
    (repeated > 0
      ? ` ${rows(repeated, 'shares its time', 'share their time')} with the row before; they are taken in file order.`
      : '') +
    (moved > 0
      ? ` In the file ${rows(moved, 'stands', 'stand')} below a later one; they are taken in time order.`
      : '') +
    (gaps.length > 0
      ? ` ${rows(gaps.length, 'stands', 'stand')} behind a gap in time (${gaps.length === 1 ? '' : 'the first is '}row ${sample.lines[order[gaps[0]!]!]}); the rows on both sides of a gap are taken as neighbours.`
      : '')
  );
}

/** Times further apart than this many usual steps have a gap between them. */
const GAP = 1.5;
/** Steps this far from the usual one, as a share of it, are still usual: months differ by a tenth. */
const USUAL = 0.25;
/** Where more than this share of the steps is not usual, there is no usual step. The three limits are our own. */
const MOST_UNUSUAL = 0.1;

/**
 * Positions in time order that stand behind a gap; none where the times are not mostly one step apart. A time that comes
 * twice, as an hour does when clocks are put back, is one more unusual step; where most do, there is no step at all.
 */
function gapsIn(values: ArrayLike<number>, order: Int32Array): number[] {
  const steps = Float64Array.from(order.subarray(1), (row, k) => values[row]! - values[order[k]!]!);
  if (steps.length === 0) return [];
  const usual = steps.slice().sort()[(steps.length - 1) >> 1]!;
  const unusual = steps.filter((step) => !(Math.abs(step - usual) <= USUAL * usual)).length;
  if (usual === 0 || unusual > MOST_UNUSUAL * steps.length) return [];
  return Array.from(steps.keys()).flatMap((k) => (steps[k]! > GAP * usual ? [k + 1] : []));
}
