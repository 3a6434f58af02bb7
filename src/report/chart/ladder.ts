import type { RecordTerm } from '../record-type.ts';
import { effectOf, shortEffect } from '../words/effect.ts';
import { type Lexicon, labelOf, raised } from '../words/lexicon.ts';
import { stepRange } from '../words/term.ts';
import { bottomAxis, plumbLine, roomy, spanOf, WIDTH } from './axes.ts';
import { differenceTicks, differenceTitle } from './effects.ts';
import { clipped, drawing, element, type Figure, label } from './svg.ts';

const ROW = 36;
/** More levels of one category than this are shown by their extremes. */
const LEVELS = 4;
const ROWS = 16;

interface LadderRow {
  readonly name: string;
  readonly where: string;
  readonly estimate: number;
  readonly lower: number | null;
  readonly upper: number | null;
}

/** What a typical step of each term goes with, on one axis with a plumb line at zero; null without steps. */
export function ladderChart(lexicon: Lexicon, terms: readonly RecordTerm[]): Figure | null {
  const all = ladderRows(lexicon, terms);
  if (all.length === 0) return null;
  const rows = all.slice(0, ROWS);
  const plot = { left: 14, right: WIDTH - 14, top: 10, bottom: 14 + rows.length * ROW + 10 };
  const x = roomy(
    spanOf([0, ...rows.flatMap((r) => [r.estimate, r.lower, r.upper])]),
    [plot.left, plot.right],
    0.05,
  );
  const zero = x(0);
  const rungs = rows
    .map((row, i) => {
      const y = plot.top + i * ROW;
      const line = y + 25;
      const interval =
        row.lower === null || row.upper === null
          ? ''
          : element('line', { class: 'rung', x1: x(row.lower), x2: x(row.upper), y1: line, y2: line });
      return (
        label(plot.left, y + 13, clipped(`${raised(row.name)}: ${row.where}`, 66), 'name') +
        element('line', { class: 'reach', x1: zero, x2: x(row.estimate), y1: line, y2: line }) +
        interval +
        element('circle', { class: 'mark chosen', cx: x(row.estimate), cy: line, r: 4.5 })
      );
    })
    .join('');
  const [first] = rows;
  const caption = `${raised(first!.name)} (${first!.where}) makes the largest typical difference: ${effectOf(lexicon, first!)}.${all.length > rows.length ? ` The ${all.length - rows.length} smallest steps are left out of the drawing.` : ''}`;
  const height = plot.bottom + 44;
  return {
    svg: drawing(
      'ladder',
      { width: WIDTH, height },
      'What a typical step of each term goes with',
      rows.map((r) => `${raised(r.name)}, ${r.where}: ${shortEffect(lexicon, r)}`).join('; '),
      bottomAxis(plot, x, differenceTicks(lexicon, x, 6), differenceTitle(lexicon)) +
        plumbLine(zero, plot.top - 6, plot.bottom) +
        rungs,
    ),
    caption,
  };
}

function ladderRows(lexicon: Lexicon, terms: readonly RecordTerm[]): LadderRow[] {
  const seen = new Set<string>();
  return terms
    .flatMap((term) => {
      const variable = term.variables[0] ?? term.name;
      const sorted = [...term.typical_steps].sort((a, b) => a.estimate - b.estimate);
      const steps = sorted.length > LEVELS ? [sorted[0]!, sorted.at(-1)!] : sorted;
      return steps.flatMap((step) => {
        const where = stepRange(lexicon, variable, step);
        // Two terms of one variable (a straight part and a bend) have the same typical step.
        const key = `${variable}\u0000${where}`;
        if (seen.has(key) || !Number.isFinite(step.estimate)) return [];
        seen.add(key);
        return [
          {
            name: labelOf(lexicon, variable),
            where,
            estimate: step.estimate,
            lower: step.lower,
            upper: step.upper,
          },
        ];
      });
    })
    .sort((a, b) => Math.abs(b.estimate) - Math.abs(a.estimate));
}
