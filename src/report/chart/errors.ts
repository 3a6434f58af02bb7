import { bottomAxis, plumbLine, roomy, ticksOf, WIDTH } from './axes.ts';
import { clipped, drawing, element, type Figure, label } from './svg.ts';

const ROW = 34;

export interface ErrorMark {
  readonly name: string;
  /** Root mean squared error, on the response's own scale. */
  readonly error: number;
  /** One standard error on either side; null where there is none. */
  readonly low: number | null;
  readonly high: number | null;
  /** Whether it is the honest one. */
  readonly strong: boolean;
}

/** Errors on rows not seen, one to a line, from a plumb line at zero; null for fewer than two. */
export function errorsChart(marks: readonly ErrorMark[], axis: string, caption: string): Figure | null {
  if (marks.length < 2) return null;
  const plot = { left: 14, right: WIDTH - 14, top: 10, bottom: 14 + marks.length * ROW + 6 };
  const largest = Math.max(...marks.map((m) => Math.max(m.error, m.high ?? 0)));
  const x = roomy([0, largest > 0 ? largest : 1], [plot.left, plot.right], 0.04);
  const body = marks
    .map((m, i) => {
      const y = plot.top + i * ROW + 22;
      const spread =
        m.low === null || m.high === null
          ? ''
          : element('line', { class: 'rung', x1: x(m.low), x2: x(m.high), y1: y, y2: y });
      return (
        label(plot.left + 6, y - 9, clipped(m.name, 58), m.strong ? 'name strong' : 'name') +
        element('line', { class: 'reach', x1: x(0), x2: x(m.error), y1: y, y2: y }) +
        spread +
        element('circle', { class: m.strong ? 'mark chosen' : 'mark', cx: x(m.error), cy: y, r: 4.5 })
      );
    })
    .join('');
  return {
    svg: drawing(
      'errors',
      { width: WIDTH, height: plot.bottom + 44 },
      'Errors on rows not seen',
      caption,
      plumbLine(x(0), plot.top - 6, plot.bottom) + bottomAxis(plot, x, ticksOf(x, 6), axis) + body,
    ),
    caption,
  };
}
