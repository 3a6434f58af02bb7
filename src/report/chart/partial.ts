import { bisectLeft } from 'd3-array';
import { isoDate } from '../numbers.ts';
import type { RecordExamination, RecordTerm } from '../record-type.ts';
import { type Lexicon, labelOf, unitOf } from '../words/lexicon.ts';
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
import { differenceTicks, differenceTitle } from './effects.ts';
import { between, dots, drawing, element, type Figure, through } from './svg.ts';

const HEIGHT = 280;

type Curve = NonNullable<RecordTerm['curve']>;

/** Value of the curve at x, between its points by straight lines; NaN for an empty curve. */
export function curveAt(curve: Pick<Curve, 'x' | 'y'>, x: number): number {
  const { x: xs, y: ys } = curve;
  if (xs.length < 2) return ys[0] ?? Number.NaN;
  const right = Math.min(Math.max(bisectLeft(xs, x), 1), xs.length - 1);
  const [x0, x1, y0, y1] = [xs[right - 1]!, xs[right]!, ys[right - 1]!, ys[right]!];
  return x1 === x0 ? y0 : y0 + ((x - x0) / (x1 - x0)) * (y1 - y0);
}

/** The partial relationship of a numeric variable: its curve and band, with each row's component plus residual. */
export function partialChart(
  lexicon: Lexicon,
  name: string,
  curve: Curve,
  points: RecordExamination['points'] | null,
  caption: string,
): Figure | null {
  const usable = curve.x
    .map((x, i) => ({ x, y: curve.y[i]!, lower: curve.lower[i] ?? null, upper: curve.upper[i] ?? null }))
    .filter((p) => Number.isFinite(p.x) && Number.isFinite(p.y));
  if (usable.length < 2) return null;
  const numbers = points?.values.find((v) => v.variable === curve.variable)?.numbers ?? null;
  const shown =
    numbers === null || points === null ? NO_ROWS : componentsPlusResiduals(curve, numbers, points.residual);
  const plot = plotOf(HEIGHT);
  const x = roomy(spanOf(usable.map((p) => p.x).concat(shown.x)), [plot.left, plot.right]);
  const drawn: (number | null)[] = [0, ...usable.flatMap((p) => [p.y, p.lower, p.upper])];
  const y = roomy(spanOf(drawn.concat(shown.y)), [plot.bottom, plot.top]);
  const banded = usable.filter((p) => p.lower !== null && p.upper !== null);
  const band = between(
    banded.map((p) => x(p.x)),
    banded.map((p) => y(p.upper as number)),
    banded.map((p) => y(p.lower as number)),
  );
  const path = through(
    usable.map((p) => x(p.x)),
    usable.map((p) => y(p.y)),
  );
  const label = labelOf(lexicon, curve.variable);
  const dated = lexicon.variables.get(curve.variable)?.type === 'date';
  const ticks = ticksOf(x, dated ? 4 : 6).map((t) =>
    dated ? { value: t.value, text: isoDate(t.value) } : t,
  );
  return {
    svg: drawing(
      name,
      { width: WIDTH, height: HEIGHT },
      `Partial relationship with ${label}`,
      caption,
      leftAxis(plot, y, differenceTicks(lexicon, y, 5), `${differenceTitle(lexicon)}, the other terms held`) +
        bottomAxis(plot, x, ticks, axisTitle(label, unitOf(lexicon, curve.variable))) +
        dots(placesAlong(x, shown.x), placesAlong(y, shown.y), 'dots faint') +
        (band === '' ? '' : element('path', { class: 'band', d: band })) +
        element('path', { class: 'curve', d: path }),
    ),
    caption,
  };
}

const NO_ROWS = { x: [], y: [] };

/** Each row’s value of the variable, and the curve there with the row’s residual; rows without either are left out. */
function componentsPlusResiduals(
  curve: Curve,
  numbers: readonly number[],
  residuals: readonly number[],
): { readonly x: number[]; readonly y: number[] } {
  const [x, y]: [number[], number[]] = [[], []];
  for (let i = 0; i < numbers.length; i++) {
    const height = curveAt(curve, numbers[i]!) + residuals[i]!;
    if (!Number.isFinite(numbers[i]!) || !Number.isFinite(height)) continue;
    x.push(numbers[i]!);
    y.push(height);
  }
  return { x, y };
}
