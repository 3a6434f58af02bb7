import { rounded, roundingFor, withUnit } from '../numbers.ts';
import type { RecordExamination } from '../record-type.ts';
import { type Lexicon, labelOf, unitOf } from '../words/lexicon.ts';
import { fittedUnit } from '../words/scale.ts';
import {
  axisTitle,
  bottomAxis,
  leftAxis,
  placesAlong,
  roomy,
  type Scale,
  spanOf,
  ticksOf,
  WIDTH,
} from './axes.ts';
import { quantileOf } from './summary.ts';
import { clipped, dots, drawing, element, type Figure, through } from './svg.ts';

type Points = RecordExamination['points'];

/** Panels beyond this many say less than they cost. */
const PANELS = 6;
const HEIGHT = 178;
const ACROSS = 2;
/** Fewer different values than this make strips, not a course. */
const FEWEST_VALUES = 8;
/** Rows in a bin of the line of middles. */
const IN_A_BIN = 12;

/** Residuals against each numeric variable of the model, small; null for fewer than two, which the larger drawing serves. */
export function residualsEachChart(lexicon: Lexicon, points: Points): Figure | null {
  const variables = points.values.flatMap(({ variable, numbers }) =>
    numbers !== null && new Set(numbers).size >= FEWEST_VALUES ? [{ variable, numbers }] : [],
  );
  if (variables.length < 2) return null;
  const shown = variables.slice(0, PANELS);
  const wide = WIDTH / ACROSS;
  const span = spanOf([0, ...points.residual]);
  const drawn = shown.map(({ variable, numbers }, k) => {
    const left = (k % ACROSS) * wide;
    const top = Math.floor(k / ACROSS) * HEIGHT;
    const plot = { left: left + 46, right: left + wide - 10, top: top + 14, bottom: top + HEIGHT - 52 };
    const x = roomy(spanOf(numbers), [plot.left, plot.right]);
    const y = roomy(span, [plot.bottom, plot.top]);
    const middles = points.thinned ? [] : middlesAlong(numbers, points.residual);
    return {
      variable,
      strays: Math.max(0, ...middles.map((m) => Math.abs(m.y))),
      svg:
        leftAxis(plot, y, ticksOf(y, 3), '') +
        bottomAxis(plot, x, ticksOf(x, 3), panelTitle(lexicon, variable)) +
        element('line', { class: 'plumb', x1: plot.left, x2: plot.right, y1: y(0), y2: y(0) }) +
        dots(placesAlong(x, numbers), placesAlong(y, points.residual), 'dots fine') +
        (middles.length < 3 ? '' : element('path', { class: 'trend', d: course(x, y, middles) })),
    };
  });
  const most = [...drawn].sort((a, b) => b.strays - a.strays)[0]!;
  const size = withUnit(
    rounded(most.strays, roundingFor(most.strays, most.strays)),
    fittedUnit(lexicon.response),
  );
  const caption =
    most.strays > 0
      ? `Dashed: the middle residual along each variable. It strays most along ${labelOf(lexicon, most.variable)}, by up to ${size}; a steady bend would be a curve that the model lacks.`
      : 'Residuals along each variable; a steady bend would be a curve that the model lacks.';
  return {
    svg: drawing(
      'residuals-each',
      { width: WIDTH, height: Math.ceil(shown.length / ACROSS) * HEIGHT },
      'Residuals against each variable of the model',
      caption,
      drawn.map(({ svg }) => svg).join(''),
    ),
    caption,
  };
}

function course(x: Scale, y: Scale, middles: readonly Middle[]): string {
  return through(
    middles.map((middle) => x(middle.x)),
    middles.map((middle) => y(middle.y)),
  );
}

/** Label and unit, short enough for a panel. */
function panelTitle(lexicon: Lexicon, variable: string): string {
  const unit = unitOf(lexicon, variable);
  return axisTitle(clipped(labelOf(lexicon, variable), unit === null ? 30 : 26), unit);
}

interface Middle {
  readonly x: number;
  readonly y: number;
}

/** Medians of both sides over bins of about equal count in order of x. */
export function middlesAlong(x: readonly number[], y: readonly number[]): Middle[] {
  const order = x
    .map((_, i) => i)
    .filter((i) => Number.isFinite(x[i]!) && Number.isFinite(y[i]!))
    .sort((a, b) => x[a]! - x[b]!);
  const bins = Math.min(8, Math.floor(order.length / IN_A_BIN));
  return Array.from({ length: bins }, (_, b) => {
    const rows = order.slice(
      Math.floor((b * order.length) / bins),
      Math.floor(((b + 1) * order.length) / bins),
    );
    const middle = (values: readonly number[]): number =>
      quantileOf(
        rows.map((i) => values[i]!),
        0.5,
      );
    return { x: middle(x), y: middle(y) };
  });
}
