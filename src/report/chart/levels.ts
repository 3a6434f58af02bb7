import type { Lexicon } from '../words/lexicon.ts';
import { bottomAxis, plumbLine, roomy, spanOf, WIDTH } from './axes.ts';
import { differenceTicks, differenceTitle } from './effects.ts';
import { clipped, drawing, element, type Figure, label } from './svg.ts';

const ROW = 27;
const ROWS = 40;

export interface LevelMark {
  readonly name: string;
  /** Null for the baseline, which stands at zero by definition. */
  readonly difference: {
    readonly estimate: number;
    readonly lower: number | null;
    readonly upper: number | null;
  } | null;
}

/** Differences or slopes with their intervals, one to a line, about a plumb line at zero; null where there are none. */
export function levelsChart(
  lexicon: Lexicon,
  name: string,
  title: string,
  marks: readonly LevelMark[],
  caption: string,
  axis = differenceTitle(lexicon),
): Figure | null {
  const shown = marks
    .filter((m) => m.difference === null || Number.isFinite(m.difference.estimate))
    .slice(0, ROWS);
  if (shown.every((m) => m.difference === null)) return null;
  const longest = Math.max(...shown.map((m) => [...m.name].length));
  const plot = {
    left: Math.min(190, 26 + longest * 6.8),
    right: WIDTH - 14,
    top: 10,
    bottom: 18 + shown.length * ROW,
  };
  const height = plot.bottom + 44;
  const x = roomy(
    spanOf([
      0,
      ...shown.flatMap((m) =>
        m.difference ? [m.difference.estimate, m.difference.lower, m.difference.upper] : [],
      ),
    ]),
    [plot.left, plot.right],
    0.06,
  );
  const body = shown
    .map((m, i) => {
      const y = plot.top + 4 + i * ROW + ROW / 2;
      const text =
        label(plot.left - 10, y + 4, clipped(m.name, 25), 'name', 'end') +
        element('line', { class: 'grid', x1: plot.left, x2: plot.right, y1: y, y2: y });
      if (m.difference === null)
        return text + element('circle', { class: 'mark refused', cx: x(0), cy: y, r: 4.5 });
      const { estimate, lower, upper } = m.difference;
      const interval =
        lower === null || upper === null
          ? ''
          : element('line', { class: 'rung', x1: x(lower), x2: x(upper), y1: y, y2: y });
      return text + interval + element('circle', { class: 'mark chosen', cx: x(estimate), cy: y, r: 4.5 });
    })
    .join('');
  return {
    svg: drawing(
      name,
      { width: WIDTH, height },
      title,
      caption,
      plumbLine(x(0), plot.top - 4, plot.bottom) +
        bottomAxis(plot, x, differenceTicks(lexicon, x, 5), axis) +
        body,
    ),
    caption: marks.length > ROWS ? `${caption} The first ${ROWS} are drawn.` : caption,
  };
}
