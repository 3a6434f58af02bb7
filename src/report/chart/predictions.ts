import type { RecordPrediction } from '../record-type.ts';
import type { Lexicon } from '../words/lexicon.ts';
import { intervalCaption } from '../words/prediction.ts';
import { axisTitle, bottomAxis, roomy, spanOf, ticksOf, WIDTH } from './axes.ts';
import { clipped, drawing, element, type Figure, label } from './svg.ts';

const ROW = 38;
const ROWS = 24;

/** Each prediction with the interval for the mean (thick) and for a new row (thin); null for none. */
export function predictionsChart(lexicon: Lexicon, predictions: readonly RecordPrediction[]): Figure | null {
  const rows = predictions.filter((p) => Math.abs(p.estimate) < 1e300).slice(0, ROWS);
  if (rows.length === 0) return null;
  const plot = { left: 14, right: WIDTH - 14, top: 8, bottom: 16 + rows.length * ROW };
  const height = plot.bottom + 44;
  const x = roomy(spanOf(rows.flatMap((p) => [p.lower, p.upper, p.estimate])), [plot.left, plot.right], 0.05);
  const body = rows
    .map((p, i) => {
      const top = plot.top + i * ROW;
      const y = top + 27;
      // An interval without an upper end goes on to the edge.
      const rung = (form: string, lower: number | null, upper: number | null) =>
        lower === null
          ? ''
          : element('line', {
              class: form,
              x1: x(lower),
              x2: upper === null ? plot.right : x(upper),
              y1: y,
              y2: y,
            });
      return (
        label(plot.left, top + 14, clipped(p.label, 60), 'name') +
        rung('rung', p.lower, p.upper) +
        rung('rung thick', p.mean_lower, p.mean_upper) +
        element('circle', {
          class: p.outside.length > 0 ? 'mark refused' : 'mark chosen',
          cx: x(p.estimate),
          cy: y,
          r: 5,
        })
      );
    })
    .join('');
  const caption = `${intervalCaption(lexicon, predictions)} Thin: a new row; thick: the mean.${predictions.length > rows.length ? ` The first ${rows.length} are drawn.` : ''}`;
  return {
    svg: drawing(
      'predictions',
      { width: WIDTH, height },
      `Predictions of ${lexicon.response.label} with their intervals`,
      caption,
      bottomAxis(plot, x, ticksOf(x, 6), axisTitle(lexicon.response.label, lexicon.response.unit)) + body,
    ),
    caption,
  };
}
