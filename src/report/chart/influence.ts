import { significant } from '../numbers.ts';
import type { RecordExamination } from '../record-type.ts';
import { bottomAxis, leftAxis, plotOf, roomy, spanOf, ticksOf, WIDTH } from './axes.ts';
import { at, clipped, drawing, element, type Figure, label } from './svg.ts';

const HEIGHT = 250;

/** "C0081 (row 82)" or "row 82". */
export function rowTitle(row: number, id: string | null): string {
  return id === null ? `row ${row}` : `${id} (row ${row})`;
}

/** Cook's distance of each row in file order, the three largest named; null where it is defined for none. */
export function influenceChart(examination: RecordExamination): Figure | null {
  const { points } = examination;
  const rows = points.row.flatMap((row, i) => {
    const d = points.cooks_distance[i];
    return d === null || d === undefined || !Number.isFinite(d) ? [] : [{ row, id: points.id[i] ?? null, d }];
  });
  if (rows.length === 0) return null;
  const plot = plotOf(HEIGHT);
  const x = roomy(spanOf(rows.map((r) => r.row)), [plot.left, plot.right], 0.02);
  const largest = Math.max(...rows.map((r) => r.d));
  const y = roomy([0, largest || 1], [plot.bottom, plot.top], 0).nice(4);
  const stems = `<path class="stems" d="${rows.map((r) => `M${at(x(r.row))} ${at(plot.bottom)}V${at(y(r.d))}`).join('')}"/>`;
  const top = [...rows].sort((a, b) => b.d - a.d || a.row - b.row).slice(0, 3);
  const taken: { x: number; y: number }[] = [];
  const names = top
    .map((r) => {
      const cx = x(r.row);
      const cy = y(r.d);
      const dot = element('circle', { class: 'mark chosen', cx, cy, r: 4 });
      // Names of rows beside each other would run together; the table below has them all.
      if (taken.some((t) => Math.abs(t.x - cx) < 90 && Math.abs(t.y - cy) < 14)) return dot;
      taken.push({ x: cx, y: cy });
      const left = cx > (plot.left + plot.right) / 2;
      return (
        dot +
        label(
          cx + (left ? -8 : 8),
          cy + 4,
          clipped(r.id ?? `row ${r.row}`, 22),
          'name',
          left ? 'end' : 'start',
        )
      );
    })
    .join('');
  const [first, second] = top;
  const caption = `${rowTitle(first!.row, first!.id)} moves the coefficients most: Cook’s distance ${significant(first!.d, 2)}${second === undefined ? '' : `, the next ${significant(second.d, 2)} (${rowTitle(second.row, second.id)})`}.`;
  const opening = caption[0] === 'r' && first!.id === null ? `R${caption.slice(1)}` : caption;
  return {
    svg: drawing(
      'influence',
      { width: WIDTH, height: HEIGHT },
      'Influence of each row',
      opening,
      leftAxis(plot, y, ticksOf(y, 4), 'Cook’s distance') +
        bottomAxis(plot, x, ticksOf(x, 6), 'row of the data file') +
        stems +
        names,
    ),
    caption: opening,
  };
}
