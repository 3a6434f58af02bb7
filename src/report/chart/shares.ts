import { scaleLinear } from 'd3-scale';
import { percent, THIN } from '../numbers.ts';
import { bottomAxis, WIDTH } from './axes.ts';
import { clipped, drawing, element, type Figure, label } from './svg.ts';

const ROW = 30;

export interface Share {
  readonly name: string;
  /** Between 0 and 1. */
  readonly share: number;
  readonly chosen: boolean;
}

/** One bar for each share, a mark at its end; null without any. */
export function sharesChart(
  shares: readonly Share[],
  name: string,
  title: string,
  axis: string,
  caption: string,
): Figure | null {
  if (shares.length === 0) return null;
  const plot = { left: 14, right: WIDTH - 60, top: 6, bottom: 10 + shares.length * ROW };
  const x = scaleLinear().domain([0, 1]).range([plot.left, plot.right]);
  const body = shares
    .map((one, i) => {
      const y = plot.top + i * ROW;
      return (
        label(plot.left, y + 12, clipped(one.name, 58), one.chosen ? 'name strong' : 'name') +
        element('line', { class: 'reach', x1: x(0), x2: x(1), y1: y + 21, y2: y + 21 }) +
        element('line', { class: 'rung', x1: x(0), x2: x(one.share), y1: y + 21, y2: y + 21 }) +
        element('circle', {
          class: one.chosen ? 'mark chosen' : 'mark',
          cx: x(one.share),
          cy: y + 21,
          r: 4,
        }) +
        label(plot.right + 10, y + 25, percent(one.share), 'num')
      );
    })
    .join('');
  return {
    svg: drawing(
      name,
      { width: WIDTH, height: plot.bottom + 44 },
      title,
      shares.map((one) => `${one.name}: ${percent(one.share)}`).join('; '),
      bottomAxis(
        plot,
        x,
        [0, 0.25, 0.5, 0.75, 1].map((value) => ({ value, text: `${value * 100}${THIN}%` })),
        axis,
      ) + body,
    ),
    caption,
  };
}
