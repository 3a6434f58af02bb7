import type { RecordPrediction } from '../record-type.ts';
import type { Lexicon } from '../words/lexicon.ts';
import { intervalCaption } from '../words/prediction.ts';
import { axisTitle, bottomAxis, roomy, spanOf, ticksOf, WIDTH } from './axes.ts';
import { clipped, drawing, element, type Figure, label } from './svg.ts';

const ROW = 38;
const ROWS = 24;

/** Each prediction with the interval for the mean (thick) and for a new row (thin); null for none. */
export function predictionsChart(lexicon: Lexicon, predictions: readonly RecordPrediction[]): Figure | null {
  const rows = predictions
    .filter((p) => [p.estimate, p.lower, p.upper].every(Number.isFinite))
    .slice(0, ROWS);
  if (rows.length === 0) return null;
  const plot = { left: 14, right: WIDTH - 14, top: 8, bottom: 16 + rows.length * ROW };
  const height = plot.bottom + 44;
  const x = roomy(spanOf(rows.flatMap((p) => [p.lower, p.upper, p.estimate])), [plot.left, plot.right], 0.05);
  const body = rows
    .map((p, i) => {
      const top = plot.top + i * ROW;
      const y = top + 27;
      const mean =
        Number.isFinite(p.mean_lower) && Number.isFinite(p.mean_upper)
          ? element('line', { class: 'rung thick', x1: x(p.mean_lower), x2: x(p.mean_upper), y1: y, y2: y })
          : '';
      return (
        label(plot.left, top + 14, clipped(p.label, 60), 'name') +
        element('line', { class: 'rung', x1: x(p.lower), x2: x(p.upper), y1: y, y2: y }) +
        mean +
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
