import { count, fixed, rounded, roundingFor, withUnit } from '../numbers.ts';
import type { RecordExamination } from '../record-type.ts';
import { type Lexicon, labelOf, raised, unitOf } from '../words/lexicon.ts';
import { fittedQuantity, fittedUnit } from '../words/scale.ts';
import {
  axisTitle,
  bottomAxis,
  leftAxis,
  placesAlong,
  plotOf,
  roomy,
  spanOf,
  ticksOf,
  WIDTH,
} from './axes.ts';
import { levelPositions, strips } from './strips.ts';
import { correlation, ranks, shareBetween, spreadAlong, twoThirds } from './summary.ts';
import { at, dots, drawing, element, type Figure, through } from './svg.ts';

type Points = RecordExamination['points'];

const HEIGHT = 270;

function residualTitle(lexicon: Lexicon): string {
  return axisTitle('residual (observed − fitted)', fittedUnit(lexicon.response));
}

function size(lexicon: Lexicon, x: number): string {
  return withUnit(rounded(x, roundingFor(x, x)), fittedUnit(lexicon.response));
}

/** Residuals against fitted values, with lines between which two thirds of them lie. */
export function residualsFittedChart(lexicon: Lexicon, points: Points): Figure {
  const quantity = fittedQuantity(lexicon.response);
  const caption = spreadCaption(lexicon, points);
  return {
    svg: againstNumber(
      lexicon,
      points,
      points.fitted,
      'residuals-fitted',
      axisTitle(`fitted: ${quantity}`, fittedUnit(lexicon.response)),
      caption,
    ),
    caption,
  };
}

function spreadCaption(lexicon: Lexicon, points: Points): string {
  const bins = spreadAlong(points.fitted, points.residual, 3);
  const low = bins[0]?.spread;
  const high = bins[2]?.spread;
  // A thinning that keeps the extremes would make the spread of the rows drawn look larger than it is.
  if (low === undefined || high === undefined || low === 0 || high === 0 || points.thinned) {
    return 'Residuals against fitted values; an even spread looks like a level band.';
  }
  const sizes = `two thirds of the residuals lie within ${size(lexicon, low)} in the lowest third of fitted values, ${size(lexicon, high)} in the highest`;
  if (high / low > 1.5) return `The spread grows with the fitted value: ${sizes}.`;
  if (low / high > 1.5) return `The spread shrinks as the fitted value grows: ${sizes}.`;
  return `The spread is much the same along the fitted values: ${sizes}.`;
}

/** Dots, the zero line and a line at ± the size that two thirds do not exceed. */
function againstNumber(
  lexicon: Lexicon,
  points: Points,
  xs: readonly number[],
  name: string,
  title: string,
  description: string,
): string {
  const plot = plotOf(HEIGHT);
  const x = roomy(spanOf(xs), [plot.left, plot.right]);
  const y = roomy(spanOf([0, ...points.residual]), [plot.bottom, plot.top]);
  const bins =
    points.thinned || xs.length < 40
      ? []
      : spreadAlong(xs, points.residual, Math.min(8, Math.floor(xs.length / 15)));
  const side = (sign: 1 | -1): string =>
    bins.length < 2
      ? ''
      : element('path', {
          class: 'trend',
          d: through(
            bins.map((bin) => x(bin.middle)),
            bins.map((bin) => y(sign * bin.spread)),
          ),
        });
  return drawing(
    name,
    { width: WIDTH, height: HEIGHT },
    `Residuals against ${title}`,
    description,
    leftAxis(plot, y, ticksOf(y, 5), residualTitle(lexicon)) +
      bottomAxis(plot, x, ticksOf(x, 6), title) +
      element('line', { class: 'plumb', x1: plot.left, x2: plot.right, y1: y(0), y2: y(0) }) +
      dots(placesAlong(x, xs), placesAlong(y, points.residual), 'dots') +
      side(1) +
      side(-1),
  );
}

/** Residuals in time order; null where the study declares no time. */
export function residualsTimeChart(lexicon: Lexicon, points: Points): Figure | null {
  const { time_position: position } = points;
  if (position === null || position.length < 2) return null;
  const order = position.map((_, i) => i).sort((a, b) => position[a]! - position[b]!);
  const plot = plotOf(HEIGHT);
  const x = roomy(spanOf(position), [plot.left, plot.right], 0.02);
  const y = roomy(spanOf([0, ...points.residual]), [plot.bottom, plot.top]);
  const thread =
    order.length <= 400 && !points.thinned
      ? element('path', {
          class: 'thread',
          d: order
            .map((i, k) => `${k === 0 ? 'M' : 'L'}${at(x(position[i]!))} ${at(y(points.residual[i]!))}`)
            .join(''),
        })
      : '';
  const caption = neighbourCaption(
    order.map((i) => points.residual[i]!),
    points.thinned,
  );
  return {
    svg: drawing(
      'residuals-time',
      { width: WIDTH, height: HEIGHT },
      'Residuals in time order',
      caption,
      leftAxis(plot, y, ticksOf(y, 5), residualTitle(lexicon)) +
        bottomAxis(plot, x, ticksOf(x, 6), 'position in time order') +
        element('line', { class: 'plumb', x1: plot.left, x2: plot.right, y1: y(0), y2: y(0) }) +
        thread +
        dots(
          placesAlong(
            x,
            order.map((i) => position[i]!),
          ),
          placesAlong(
            y,
            order.map((i) => points.residual[i]!),
          ),
          'dots',
        ),
    ),
    caption,
  };
}

function neighbourCaption(ordered: readonly number[], thinned: boolean): string {
  if (thinned)
    return `Residuals in time order (${count(ordered.length)} rows drawn); a wave or a step would show a cause that the model lacks.`;
  const r = correlation(ordered.slice(1), ordered.slice(0, -1));
  if (r === null) return 'Residuals in time order.';
  const words =
    Math.abs(r) < 0.2
      ? 'Neighbours in time are hardly alike'
      : r > 0
        ? 'Neighbours in time resemble each other'
        : 'Neighbours in time tend to opposite sides';
  // The finding beside the chart has the figure.
  return `${words}.`;
}

/** Residuals against the model's variable that their size goes with most; null where there is none. */
export function residualsPredictorChart(lexicon: Lexicon, points: Points): Figure | null {
  const sizes = points.residual.map(Math.abs);
  const sizeRanks = ranks(sizes);
  let best: {
    variable: string;
    strength: number;
    signed: number;
    numbers: number[] | null;
    texts: string[] | null;
  } | null = null;
  for (const { variable, numbers, texts } of points.values) {
    const signed =
      numbers !== null
        ? correlation(ranks(numbers), sizeRanks)
        : texts !== null
          ? Math.sqrt(shareBetween(sizes, texts) ?? 0)
          : null;
    if (signed === null) continue;
    if (best === null || Math.abs(signed) > best.strength)
      best = { variable, strength: Math.abs(signed), signed, numbers, texts };
  }
  if (best === null) return null;
  const name = labelOf(lexicon, best.variable);
  const title = axisTitle(name, unitOf(lexicon, best.variable));
  if (best.numbers !== null) {
    const caption =
      best.strength < 0.1
        ? `The size of the residuals goes with none of the model’s variables; ${name}, drawn here, comes nearest (rank correlation ${fixed(best.signed, 2)}).`
        : `Of the model’s variables, ${name} goes most with the size of the residuals (rank correlation ${fixed(best.signed, 2)}): they are ${best.signed > 0 ? 'larger' : 'smaller'} where it is high.`;
    return {
      svg: againstNumber(lexicon, points, best.numbers, 'residuals-predictor', title, caption),
      caption,
    };
  }
  return againstLevels(lexicon, points, best.variable, best.texts as string[]);
}

function againstLevels(lexicon: Lexicon, points: Points, variable: string, texts: readonly string[]): Figure {
  const name = labelOf(lexicon, variable);
  const levels = [...new Set(texts)].sort();
  const spreads = levels
    .map((level) => ({
      level,
      spread: twoThirds(points.residual.filter((_, i) => texts[i] === level)) ?? 0,
    }))
    .sort((a, b) => a.spread - b.spread);
  const low = spreads[0];
  const high = spreads.at(-1);
  const caption =
    low === undefined || high === undefined
      ? `Residuals by ${name}.`
      : `The size of the residuals differs most by ${name}: from ${size(lexicon, low.spread)} (${low.level}) to ${size(lexicon, high.spread)} (${high.level}).`;
  const places = levelPositions(levels);
  return {
    svg: strips(
      'residuals-predictor',
      `Residuals by ${name}`,
      caption,
      residualTitle(lexicon),
      places,
      texts,
      points.residual,
    ),
    caption: raised(caption),
  };
}
