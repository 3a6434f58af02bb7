import { significant } from '../numbers.ts';
import type { RecordExamination } from '../record-type.ts';
import { bottomAxis, placesAlong, roomy, spanOf, ticksOf, WIDTH } from './axes.ts';
import { clipped, dots, drawing, element, type Figure, label, scatter } from './svg.ts';

const HEIGHT = 190;
/** The rows named, each at a height of its own. */
const NAMED = 3;
const NAME_STEP = 20;

/** "C0081 (row 82)" or "row 82". */
export function rowTitle(row: number, id: string | null): string {
  return id === null ? `row ${row}` : `${id} (row ${row})`;
}

/** All rows strung along their Cook's distance, with the largest three hung by name; null where it is defined for none. */
export function influenceChart(examination: RecordExamination): Figure | null {
  const { points } = examination;
  const rows = points.row.flatMap((row, i) => {
    const d = points.cooks_distance[i];
    return d === null || d === undefined || !Number.isFinite(d) ? [] : [{ row, id: points.id[i] ?? null, d }];
  });
  if (rows.length === 0) return null;
  const plot = { left: 20, right: WIDTH - 20, top: 22 + NAMED * NAME_STEP, bottom: HEIGHT - 42 };
  const distances = rows.map((r) => r.d);
  const x = roomy([0, spanOf([0, ...distances])[1]], [plot.left, plot.right], 0.03);
  const middle = (plot.top + plot.bottom) / 2;
  const heights = rows.map((_, i) => middle + scatter(i) * 4);
  const top = [...rows.keys()]
    .sort((i, j) => rows[j]!.d - rows[i]!.d || rows[i]!.row - rows[j]!.row)
    .slice(0, NAMED);
  // Names point to the middle; of two on one side the outer one hangs higher, so that no line runs through a name.
  const isLeft = (i: number) => x(rows[i]!.d) < WIDTH / 2;
  const outward = [...top.filter((i) => !isLeft(i)), ...top.filter(isLeft).reverse()];
  const names = outward
    .map((i, k) => {
      const { row, id, d } = rows[i]!;
      const [cx, cy, name] = [x(d), heights[i]!, 16 + k * NAME_STEP];
      const [aside, anchor] = isLeft(i) ? [6, 'start'] : [-6, 'end'];
      return (
        element('line', { class: 'plumb', x1: cx, x2: cx, y1: name - 8, y2: cy - 4 }) +
        element('circle', { class: 'mark chosen', cx, cy, r: 4 }) +
        label(cx + aside, name, clipped(id ?? `row ${row}`, 22), 'name', anchor)
      );
    })
    .join('');
  const [first, second] = top.map((i) => rows[i]);
  const caption = `${rowTitle(first!.row, first!.id)} moves the coefficients most: Cook’s distance ${significant(first!.d, 2)}${second === undefined ? '' : `, the next ${significant(second.d, 2)} (${rowTitle(second.row, second.id)})`}.`;
  const opening = caption[0] === 'r' && first!.id === null ? `R${caption.slice(1)}` : caption;
  return {
    svg: drawing(
      'influence',
      { width: WIDTH, height: HEIGHT },
      'Influence of each row',
      opening,
      bottomAxis(plot, x, ticksOf(x, 6), 'Cook’s distance of each row') +
        dots(placesAlong(x, distances), heights, 'dots') +
        names,
    ),
    caption: opening,
  };
}
