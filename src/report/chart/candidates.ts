import { scaleSymlog } from 'd3-scale';
import { count, fixed, value } from '../numbers.ts';
import type { StudyRecord } from '../record-type.ts';
import { criterionName, criterionRounding, distanceCaption } from '../words/selection.ts';
import { bottomAxis, leftAxis, type Plot, plotOf, roomy, spanOf, type Tick, WIDTH } from './axes.ts';
import { clipped, drawing, element, type Figure, label } from './svg.ts';

const HEIGHT = 290;
/** Beyond this many candidates only the chosen and the best are named in the drawing. */
const NAMED = 8;

/** Distance from the best against number of coefficients; null where nothing is ranked by a number. */
export function candidatesChart(record: StudyRecord): Figure | null {
  const { selection } = record;
  const marks = selection.ranking.flatMap((r) => {
    const candidate = record.candidates.find((c) => c.name === r.candidate);
    if (candidate === undefined || r.difference === null || !Number.isFinite(r.difference)) return [];
    return [
      { ...r, difference: r.difference, size: candidate.coefficient_count, admitted: candidate.admitted },
    ];
  });
  if (marks.length < 2) return null;
  const plot: Plot = { ...plotOf(HEIGHT), top: 30 };
  const x = roomy(spanOf(marks.map((m) => m.size)), [plot.left, plot.right], 0.12);
  const largest = Math.max(...marks.map((m) => m.difference));
  const positive = marks.map((m) => m.difference).filter((d) => d > 0);
  const unit =
    Math.max(selection.prefer_smaller_within, positive.length ? Math.min(...positive) : 1, largest / 1e4) ||
    1;
  // Small distances are what the choice turns on, large ones only have to be seen as large.
  const y = scaleSymlog()
    .constant(unit)
    .domain([0, largest * 1.5 || 1])
    .range([plot.bottom - 12, plot.top]);
  const name = criterionName(selection.rank_by);
  const within =
    selection.prefer_smaller_within > 0
      ? element('rect', {
          class: 'zone',
          x: plot.left,
          width: plot.right - plot.left,
          y: Math.max(plot.top, y(Math.min(selection.prefer_smaller_within, largest * 1.5))),
          height:
            plot.bottom - Math.max(plot.top, y(Math.min(selection.prefer_smaller_within, largest * 1.5))),
        })
      : '';
  const circles = marks
    .map((m) => {
      const chosen = m.candidate === selection.chosen;
      return element('circle', {
        class: chosen ? 'mark chosen' : m.admitted ? 'mark' : 'mark refused',
        cx: x(m.size),
        cy: y(m.difference),
        r: chosen ? 6 : 4.5,
      });
    })
    .join('');
  const named = marks.filter(
    (m) => marks.length <= NAMED || m.candidate === selection.chosen || m.rank === 1,
  );
  const sizes = [...new Set(marks.map((m) => m.size))].sort((a, b) => a - b);
  const every = Math.ceil(sizes.length / 10);
  return {
    svg: drawing(
      'candidates',
      { width: WIDTH, height: HEIGHT },
      `Candidates: distance from the best ${name}`,
      `${marks.length} candidates by number of coefficients; the lower, the closer to the best. ${distanceCaption(selection, record.candidates)}`,
      within +
        leftAxis(
          plot,
          y,
          distanceTicks(y, unit, largest, criterionRounding(selection).decimals),
          `distance from the best ${name} (0 is best)`,
        ) +
        bottomAxis(
          plot,
          x,
          sizes.filter((_, i) => i % every === 0).map((s) => ({ value: s, text: count(s) })),
          'number of coefficients',
        ) +
        circles +
        placedNames(
          named.map((m) => ({
            x: x(m.size),
            y: y(m.difference),
            text: m.candidate,
            strong: m.candidate === selection.chosen,
          })),
          plot,
        ),
    ),
    caption: [
      distanceCaption(selection, record.candidates),
      ...(marks.some((m) => !m.admitted) ? ['Hollow: not admitted.'] : []),
      ...(within === '' ? [] : [`Shaded: within ${value(selection.prefer_smaller_within)} of the best.`]),
    ].join(' '),
  };
}

/** 0 and steps of 1, 2, 5 × 10ⁿ that stand far enough apart. */
function distanceTicks(y: (v: number) => number, unit: number, largest: number, decimals: number): Tick[] {
  const ticks: Tick[] = [{ value: 0, text: '0' }];
  let last = y(0);
  for (let e = Math.floor(Math.log10(unit)); e <= Math.ceil(Math.log10(largest || 1)); e++) {
    for (const m of [1, 2, 5]) {
      const value = m * 10 ** e;
      if (value > largest * 1.5 || last - y(value) < 24) continue;
      ticks.push({ value, text: fixed(value, Math.max(0, Math.min(-e, decimals + 2))) });
      last = y(value);
    }
  }
  return ticks;
}

interface Name {
  readonly x: number;
  readonly y: number;
  readonly text: string;
  readonly strong: boolean;
}

/** Names beside their marks, on the side with room; one that would cover another moves or is left to the table. */
function placedNames(names: readonly Name[], plot: Plot): string {
  const taken: { x1: number; x2: number; y: number }[] = [];
  const dots = names.map((n) => ({ x: n.x, y: n.y }));
  return [...names]
    .sort((a, b) => Number(b.strong) - Number(a.strong))
    .map((n) => {
      const text = clipped(n.text, 28);
      const width = [...text].length * 6.6 + 4;
      for (const [dx, dy, anchor] of [
        [9, 4, 'start'],
        [-9, 4, 'end'],
        [9, -9, 'start'],
        [-9, -9, 'end'],
        [9, 17, 'start'],
        [-9, 17, 'end'],
      ] as const) {
        const x1 = anchor === 'start' ? n.x + dx : n.x + dx - width;
        const box = { x1, x2: x1 + width, y: n.y + dy };
        const free =
          box.x1 >= plot.left &&
          box.x2 <= plot.right + 8 &&
          box.y > plot.top + 2 &&
          box.y < plot.bottom &&
          taken.every((t) => box.x2 < t.x1 || box.x1 > t.x2 || Math.abs(box.y - t.y) > 13) &&
          dots.every(
            (d) =>
              (d.x === n.x && d.y === n.y) ||
              d.x < box.x1 - 6 ||
              d.x > box.x2 + 6 ||
              Math.abs(box.y - 4 - d.y) > 10,
          );
        if (!free) continue;
        taken.push(box);
        return label(n.x + dx, n.y + dy, text, n.strong ? 'name strong' : 'name', anchor);
      }
      return '';
    })
    .join('');
}
