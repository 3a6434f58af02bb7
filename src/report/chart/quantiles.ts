import { count, fixed, significant } from '../numbers.ts';
import type { RecordExamination } from '../record-type.ts';
import { bottomAxis, leftAxis, placesAlong, plotOf, roomy, spanOf, ticksOf, WIDTH } from './axes.ts';
import { between, clipped, dots, drawing, element, type Figure, label } from './svg.ts';

const HEIGHT = 290;
/** The farthest residuals are named where they lie outside the band. */
const NAMED = 2;

/** Residuals in order against normal quantiles, with the band that normal errors keep to; null without them. */
export function quantilesChart({ normal_quantiles: found, points }: RecordExamination): Figure | null {
  if (found === null || found === undefined || found.expected.length < 3) return null;
  const { expected, residual, lower, upper } = found;
  const plot = plotOf(HEIGHT);
  const x = roomy(spanOf(expected), [plot.left, plot.right]);
  const y = roomy(spanOf([...expected, ...residual, ...(lower ?? []), ...(upper ?? [])]), [
    plot.bottom,
    plot.top,
  ]);
  const band =
    lower === null || upper === null
      ? ''
      : element('path', {
          class: 'band',
          d: between(placesAlong(x, expected), placesAlong(y, upper), placesAlong(y, lower)),
        });
  const outside = ranksOutside(found);
  const far = [...outside].sort((a, b) => Math.abs(residual[b]!) - Math.abs(residual[a]!)).slice(0, NAMED);
  const names = far.map((i) => {
    const row = points.standardised_residual.indexOf(residual[i]!);
    const name = row < 0 ? '' : clipped(points.id[row] ?? `row ${points.row[row]}`, 22);
    const left = residual[i]! > 0;
    return (
      element('circle', { class: 'mark chosen', cx: x(expected[i]!), cy: y(residual[i]!), r: 4 }) +
      label(x(expected[i]!) + (left ? -9 : 9), y(residual[i]!) + 4, name, 'name', left ? 'end' : 'start')
    );
  });
  const [low, high] = [expected[0]!, expected.at(-1)!];
  const caption = quantilesCaption(found, outside.length);
  return {
    svg: drawing(
      'quantiles',
      { width: WIDTH, height: HEIGHT },
      'Residuals in order against those of normal errors',
      caption,
      band +
        leftAxis(plot, y, ticksOf(y, 5), 'standardised residual') +
        bottomAxis(plot, x, ticksOf(x, 6), 'expected of normal errors') +
        element('line', { class: 'plumb', x1: x(low), y1: y(low), x2: x(high), y2: y(high) }) +
        dots(placesAlong(x, expected), placesAlong(y, residual), 'dots') +
        names.join(''),
    ),
    caption,
  };
}

function ranksOutside({
  residual,
  lower,
  upper,
}: NonNullable<RecordExamination['normal_quantiles']>): number[] {
  if (lower === null || upper === null) return [];
  return residual.flatMap((z, i) => (z < lower[i]! || z > upper[i]! ? [i] : []));
}

function quantilesCaption(
  { expected, residual, lower }: NonNullable<RecordExamination['normal_quantiles']>,
  outside: number,
): string {
  if (lower === null) {
    const top = residual.length - 1;
    const i = Math.abs(residual[top]!) >= Math.abs(residual[0]!) ? top : 0;
    return `On the line, residuals are as those of normal errors; the farthest is ${fixed(residual[i], 1)} where ${fixed(expected[i], 1)} would be expected.`;
  }
  const n = residual.length;
  if (outside === 0) return 'All residuals lie in the band where 95 % of those of normal errors would lie.';
  return `${count(outside)} of the ${count(n)}\u00a0residuals drawn (${significant((outside / n) * 100, 2)}\u202f%) ${outside === 1 ? 'lies' : 'lie'} outside the band in which each would lie 95 times in 100 if errors were normal.`;
}
