import { type ScaleLinear, scaleLinear } from 'd3-scale';
import { fixed, scientific } from '../numbers.ts';
import { clipped, element, label } from './svg.ts';

export type Scale = ScaleLinear<number, number>;

/** Where the data are drawn, in units of the viewBox. */
export interface Plot {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

/** Width of every drawing: a phone shows it at about three quarters, a wide page a little enlarged. */
export const WIDTH = 460;

/** The plain frame with room for tick labels on the left and a title below. */
export function plotOf(height: number): Plot {
  return { left: 54, right: WIDTH - 12, top: 26, bottom: height - 42 };
}

/** Smallest and largest number; [0, 1] where there is none; widened where they are equal. Beyond 1e300 counts as without end. */
export function spanOf(values: Iterable<number | null>): [number, number] {
  let low = Number.POSITIVE_INFINITY;
  let high = Number.NEGATIVE_INFINITY;
  for (const value of values) {
    if (value === null || !(Math.abs(value) < 1e300)) continue;
    if (value < low) low = value;
    if (value > high) high = value;
  }
  if (low > high) return [0, 1];
  // A span of a few last bits, or of subnormal numbers, has no ticks.
  if (high - low > Math.max(1e-290, 1e-13 * Math.max(Math.abs(low), Math.abs(high)))) return [low, high];
  const size = Math.max(Math.abs(low), Math.abs(high)) * 0.05;
  const half = size > 1e-290 ? size : 1;
  return [low - half, high + half];
}

/** A linear scale with a little room at both ends, so that no dot sits on the frame. */
export function roomy(span: readonly [number, number], range: readonly [number, number], room = 0.04): Scale {
  const add = (span[1] - span[0]) * room;
  return scaleLinear()
    .domain([span[0] - add, span[1] + add])
    .range([...range]);
}

/**
 * Where a scale puts each of many values: what it gives for them one by one, without a function of its own for each scale,
 * which is slow until it has run for long.
 */
export function placesAlong(scale: Scale, values: readonly number[]): Float64Array {
  const [low, high] = scale.domain() as [number, number];
  const [from, to] = scale.range() as [number, number];
  const at = new Float64Array(values.length);
  for (let i = 0; i < values.length; i++) {
    const share = (values[i]! - low) / (high - low);
    at[i] = from * (1 - share) + to * share;
  }
  return at;
}

export interface Tick {
  readonly value: number;
  readonly text: string;
}

/** Round ticks with as many decimals as their step needs. */
export function ticksOf(scale: Scale, wanted: number): Tick[] {
  const values = scale.ticks(wanted);
  const step = values.length > 1 ? Math.abs(values[1]! - values[0]!) : Math.abs(values[0] ?? 1) || 1;
  const exponent = Math.floor(Math.log10(step) + 1e-9);
  const largest = Math.max(...values.map(Math.abs), 0);
  const wide = largest >= 1e7 || exponent < -5;
  return values.map((value) => ({
    value,
    text:
      wide && value !== 0
        ? scientific(value, Math.max(1, Math.floor(Math.log10(Math.abs(value))) - exponent + 1))
        : fixed(value, wide ? 0 : Math.max(0, -exponent)),
  }));
}

/** The bottom axis: ticks, their labels, the title. */
export function bottomAxis(
  plot: Plot,
  scale: (x: number) => number,
  ticks: readonly Tick[],
  title: string,
): string {
  const marks = ticks
    .map(({ value, text }) => {
      const x = scale(value);
      return (
        element('line', { class: 'tick', x1: x, x2: x, y1: plot.bottom, y2: plot.bottom + 4 }) +
        label(x, plot.bottom + 17, text, 'num', 'middle')
      );
    })
    .join('');
  return (
    element('line', { class: 'axis', x1: plot.left, x2: plot.right, y1: plot.bottom, y2: plot.bottom }) +
    marks +
    label((plot.left + plot.right) / 2, plot.bottom + 35, clipped(title, 64), 'title', 'middle')
  );
}

/** The left axis: quiet lines across, labels, the title above the axis so that nobody has to turn the head. */
export function leftAxis(
  plot: Plot,
  scale: (y: number) => number,
  ticks: readonly Tick[],
  title: string,
): string {
  const marks = ticks
    .map(({ value, text }) => {
      const y = scale(value);
      return (
        element('line', { class: 'grid', x1: plot.left, x2: plot.right, y1: y, y2: y }) +
        label(plot.left - 6, y + 4, text, 'num', 'end')
      );
    })
    .join('');
  return marks + label(4, 13, clipped(title, 70), 'title');
}

/** "cargo, t": an axis title with its unit. */
export function axisTitle(name: string, unit: string | null): string {
  return unit === null || unit === '' ? name : `${name}, ${unit}`;
}

/** A plumb line: a straight upright at x with the bob at its end. */
export function plumbLine(x: number, top: number, bottom: number): string {
  return (
    element('line', { class: 'plumb', x1: x, x2: x, y1: top, y2: bottom - 9 }) +
    `<path class="bob" d="M${x.toFixed(1)} ${(bottom + 3).toFixed(1)}l-4 -8.5v-3.5h8v3.5z"/>`
  );
}
