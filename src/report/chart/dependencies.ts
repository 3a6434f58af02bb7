import { significant } from '../numbers.ts';
import type { RecordExamination } from '../record-type.ts';
import { listed } from '../words/lexicon.ts';
import { WIDTH } from './axes.ts';
import { clipped, drawing, element, type Figure, label } from './svg.ts';

const ROW = 26;
const ROWS = 18;
const MAPS = 5;
/** A share of a coefficient's variance below this is not drawn. */
const FAINT = 0.1;
/** Above this a column carries the dependency (Belsley, Kuh & Welsch 1980). */
const CARRIES = 0.5;

type Collinearity = NonNullable<RecordExamination['collinearity']>;

/** Which columns carry each near dependency: a dot for the share of a coefficient's variance; null without one. */
export function dependenciesChart(collinearity: Collinearity): Figure | null {
  const shown = collinearity.dependencies.slice(0, MAPS);
  if (shown.length === 0) return null;
  const shares = shown.map(({ index }) => {
    const k = collinearity.indices.indexOf(index);
    return collinearity.proportions[k] ?? collinearity.columns.map(() => 0);
  });
  const rows = collinearity.columns
    .map((name, j) => ({ name, shares: shares.map((own) => own[j] ?? 0) }))
    .filter((row) => row.shares.some((share) => share > FAINT))
    .slice(0, ROWS);
  // Two columns and one dependency are said in the sentence.
  if (rows.length === 0 || (rows.length <= 2 && shown.length === 1)) return null;
  const left = 200;
  const top = 44;
  const step = Math.min(90, (WIDTH - left - 20) / shown.length);
  const x = (k: number): number => left + 40 + k * step;
  const bottom = top + rows.length * ROW;
  const heads = shown
    .map(
      ({ index }, k) =>
        element('line', { class: 'grid', x1: x(k), x2: x(k), y1: top - 6, y2: bottom }) +
        label(x(k), top - 14, significant(index, 3), 'num', 'middle'),
    )
    .join('');
  const body = rows
    .map((row, i) => {
      const y = top + i * ROW + ROW / 2;
      return (
        element('line', { class: 'grid', x1: left, x2: x(shown.length - 1) + 30, y1: y, y2: y }) +
        label(left - 12, y + 4, clipped(row.name, 26), 'name', 'end') +
        row.shares
          .map((share, k) =>
            share > FAINT
              ? element('circle', {
                  class: share > CARRIES ? 'mark chosen' : 'mark refused',
                  cx: x(k),
                  cy: y,
                  r: 10 * Math.sqrt(share),
                })
              : '',
          )
          .join('')
      );
    })
    .join('');
  const first = shown[0]!;
  const caption = `${listed(first.columns.map(({ name }) => name).slice(0, 6))} carry the strongest dependency (condition index ${significant(first.index, 3)}). Each dot is the share of a coefficient’s variance that goes with it; filled: more than half.`;
  return {
    svg: drawing(
      'dependencies',
      { width: WIDTH, height: bottom + 14 },
      'Which columns carry each near dependency',
      caption,
      label(left + 20, 14, 'condition index', 'title') + heads + body,
    ),
    caption,
  };
}
