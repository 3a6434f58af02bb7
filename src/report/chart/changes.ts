import type { ComparedModel } from '../comparison-type.ts';
import { fixed } from '../numbers.ts';
import { bottomAxis, plumbLine, roomy, spanOf, ticksOf, WIDTH } from './axes.ts';
import { clipped, drawing, element, type Figure, label } from './svg.ts';

const ROW = 30;
const ROWS = 20;

/** How far each coefficient moved in its earlier standard errors, on one axis with a plumb line at zero; null where none did. */
export function changesChart(model: ComparedModel, name: string): Figure | null {
  const all = model.coefficients.flatMap((c) =>
    c.in_standard_errors === null ? [] : [{ name: c.name, change: c.in_standard_errors }],
  );
  if (all.every(({ change }) => change === 0)) return null;
  const rows = all.slice(0, ROWS);
  const plot = { left: 14, right: WIDTH - 14, top: 10, bottom: 14 + rows.length * ROW + 8 };
  // Two errors on either side are always in view, so that small moves look small.
  const x = roomy(spanOf([-2, 2, ...rows.map(({ change }) => change)]), [plot.left, plot.right], 0.04);
  const zero = x(0);
  const zone = element('rect', {
    class: 'zone',
    x: x(-2),
    y: plot.top - 4,
    width: x(2) - x(-2),
    height: plot.bottom - plot.top + 4,
  });
  const rungs = rows
    .map((row, i) => {
      const y = plot.top + i * ROW;
      const line = y + 21;
      const far = Math.abs(row.change) > 2;
      return (
        label(plot.left, y + 11, clipped(row.name, 60), 'name') +
        element('line', { class: 'rung', x1: zero, x2: x(row.change), y1: line, y2: line }) +
        element('circle', { class: far ? 'mark chosen' : 'mark', cx: x(row.change), cy: line, r: 4 })
      );
    })
    .join('');
  const beyond = all.filter(({ change }) => Math.abs(change) > 2).length;
  const left = all.length > rows.length ? ` The last ${all.length - rows.length} are not drawn.` : '';
  const caption =
    beyond === 0
      ? `No coefficient moved by more than two of its earlier standard errors.${left}`
      : `${beyond === 1 ? 'One coefficient' : `${beyond} coefficients`} moved by more than two earlier standard errors (outside the shaded strip).${left}`;
  return {
    svg: drawing(
      name,
      { width: WIDTH, height: plot.bottom + 44 },
      'How far each coefficient moved',
      rows.map((row) => `${row.name}: ${fixed(row.change, 2)}`).join('; '),
      zone +
        bottomAxis(plot, x, ticksOf(x, 6), 'change, in earlier standard errors') +
        plumbLine(zero, plot.top - 6, plot.bottom) +
        rungs,
    ),
    caption,
  };
}
