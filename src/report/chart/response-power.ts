import { scaleLinear } from 'd3-scale';
import { fixed } from '../numbers.ts';
import type { RecordFinding } from '../record-type.ts';
import { bottomAxis, roomy, WIDTH } from './axes.ts';
import { drawing, element, type Figure, label } from './svg.ts';

const NAMED = [
  { value: -1, text: 'reciprocal' },
  { value: 0, text: 'log' },
  { value: 0.5, text: 'root' },
  { value: 1, text: 'natural' },
] as const;

/** Powers of the response that suit the rows, on one axis with the usual scales; null where the finding has none. */
export function responsePowerChart(finding: RecordFinding): Figure | null {
  const figure = (part: string): number | null =>
    finding.figures?.find(({ name }) => name.includes(part))?.value ?? null;
  const best = finding.statistic;
  const lower = figure('lower end');
  const upper = figure('upper end');
  const declared = figure('declared');
  if (best === null || lower === null || upper === null) return null;
  const plot = { left: 16, right: WIDTH - 16, top: 34, bottom: 74 };
  const ends = [best, lower, upper, declared ?? best, -1, 1];
  const x = roomy([Math.min(...ends), Math.max(...ends)], [plot.left, plot.right], 0.05);
  const line = plot.top + 20;
  const scales = NAMED.map(({ value, text }) => {
    const own = declared !== null && Math.abs(value - declared) < 1e-9;
    return (
      element('line', { class: 'grid', x1: x(value), x2: x(value), y1: plot.top - 8, y2: plot.bottom }) +
      label(x(value), plot.top - 14, text, own ? 'name strong' : 'name', 'middle')
    );
  }).join('');
  const whole = Math.max(1, Math.ceil((Math.max(...ends) - Math.min(...ends)) / 4));
  const ticks = scaleLinear()
    .domain(x.domain())
    .ticks(6 / whole > 1 ? 6 : 4);
  const decimals = ticks.every(Number.isInteger) ? 0 : 1;
  const caption = `Powers between ${fixed(lower, 2)} and ${fixed(upper, 2)} suit these rows, ${fixed(best, 2)} best${declared === null ? '' : `; the declared scale (hollow) is ${fixed(declared, 2).replace(/\.?0+$/, '')}`}.`;
  return {
    svg: drawing(
      'response-power',
      { width: WIDTH, height: plot.bottom + 44 },
      'Which power of the response suits these rows',
      caption,
      scales +
        bottomAxis(
          plot,
          x,
          ticks.map((value) => ({ value, text: fixed(value, decimals) })),
          'power λ of the response',
        ) +
        element('line', { class: 'rung thick', x1: x(lower), x2: x(upper), y1: line, y2: line }) +
        (declared === null
          ? ''
          : element('circle', { class: 'mark refused', cx: x(declared), cy: line, r: 5 })) +
        element('circle', { class: 'mark chosen', cx: x(best), cy: line, r: 5 }),
    ),
    caption,
  };
}
