import { bottomAxis, placesAlong, plumbLine, roomy, spanOf, ticksOf, WIDTH } from './axes.ts';
import { clipped, dots, drawing, element, label, scatter } from './svg.ts';

/** Levels beyond this are gathered under "other levels" in a drawing. */
const LEVELS = 24;
const ROW = 26;

/** The row of a strip drawing on which each level stands. */
export function levelPositions(levels: readonly string[]): ReadonlyMap<string, number> {
  return new Map(levels.slice(0, LEVELS).map((level, i) => [level, i]));
}

/** One strip of dots per level, values along the bottom axis. */
export function strips(
  name: string,
  title: string,
  description: string,
  axis: string,
  places: ReadonlyMap<string, number>,
  texts: readonly string[],
  values: readonly number[],
): string {
  const rows = places.size;
  const plot = { left: 110, right: WIDTH - 12, top: 10, bottom: 16 + rows * ROW };
  const height = plot.bottom + 42;
  const x = roomy(spanOf([0, ...values]), [plot.left, plot.right]);
  const middle = (i: number): number => plot.top + 6 + i * ROW + ROW / 2;
  const names = [...places]
    .map(
      ([level, i]) =>
        label(plot.left - 8, middle(i) + 4, clipped(level, 16), 'name', 'end') +
        element('line', { class: 'grid', x1: plot.left, x2: plot.right, y1: middle(i), y2: middle(i) }),
    )
    .join('');
  const heights = values.map((_, i) => {
    const row = places.get(texts[i] ?? '');
    return row === undefined ? Number.NaN : middle(row) + scatter(i);
  });
  return drawing(
    name,
    { width: WIDTH, height },
    title,
    description,
    names +
      bottomAxis(plot, x, ticksOf(x, 6), axis) +
      plumbLine(x(0), plot.top, plot.bottom) +
      dots(placesAlong(x, values), heights, 'dots'),
  );
}
