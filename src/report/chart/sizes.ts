import { count, rounded } from '../numbers.ts';
import type { RecordFamily, StudyRecord } from '../record-type.ts';
import { counted } from '../words/lexicon.ts';
import { criterionName, criterionRounding } from '../words/selection.ts';
import { bottomAxis, leftAxis, plotOf, roomy, spanOf, ticksOf, WIDTH } from './axes.ts';
import { drawing, element, type Figure, through } from './svg.ts';

const HEIGHT = 260;

/** How the best value falls, or rises, with the number of coefficients; null for fewer than two sizes. */
export function sizesChart(
  family: RecordFamily,
  selection: StudyRecord['selection'],
  name: string,
): Figure | null {
  const sizes = family.best_by_size.flatMap((one) =>
    one.value === null || !Number.isFinite(one.value) ? [] : [{ ...one, value: one.value }],
  );
  if (sizes.length < 2) return null;
  const plot = plotOf(HEIGHT);
  const x = roomy(spanOf(sizes.map((one) => one.coefficient_count)), [plot.left, plot.right], 0.06);
  const y = roomy(spanOf(sizes.map((one) => one.value)), [plot.bottom, plot.top + 6], 0.06);
  const criterion = criterionName(selection.rank_by);
  const course = through(
    sizes.map((one) => x(one.coefficient_count)),
    sizes.map((one) => y(one.value)),
  );
  const every = Math.ceil(sizes.length / 12);
  const caption = sizesCaption(sizes, selection, criterion);
  return {
    svg: drawing(
      name,
      { width: WIDTH, height: HEIGHT },
      `${family.name}: the best ${criterion} by number of coefficients`,
      caption,
      leftAxis(plot, y, ticksOf(y, 5), `best ${criterion}`) +
        bottomAxis(
          plot,
          x,
          sizes
            .filter((_, i) => i % every === 0)
            .map((one) => ({ value: one.coefficient_count, text: count(one.coefficient_count) })),
          'number of coefficients',
        ) +
        element('path', { class: 'thread course', d: course }) +
        sizes
          .map((one) => {
            const chosen = one.candidate === selection.chosen;
            return element('circle', {
              class: chosen ? 'mark chosen' : one.admitted ? 'mark' : 'mark refused',
              cx: x(one.coefficient_count),
              cy: y(one.value),
              r: chosen ? 6 : 4.5,
            });
          })
          .join(''),
    ),
    caption,
  };
}

type Size = RecordFamily['best_by_size'][number] & { readonly value: number };

function sizesCaption(
  sizes: readonly Size[],
  selection: StudyRecord['selection'],
  criterion: string,
): string {
  const rounding = criterionRounding(selection);
  const higher = selection.rank_by === 'adjusted_r_squared';
  const best = sizes.reduce((a, b) => ((higher ? b.value > a.value : b.value < a.value) ? b : a));
  const [first] = sizes;
  const at = (one: Size): string => counted(one.coefficient_count, 'coefficient', 'coefficients', count);
  const course =
    best === first
      ? `The best ${criterion} is that of the smallest size, ${at(best)}`
      : `The best ${criterion} goes from ${rounded(first!.value, rounding)} with ${at(first!)} to ${rounded(best.value, rounding)} with ${at(best)}${best === sizes.at(-1) ? ', the largest size' : ' and is worse with more'}`;
  const hollow = sizes.some((one) => !one.admitted) ? ' Hollow: not admitted.' : '';
  return `${course}.${hollow}`;
}
