import { significant } from '../numbers.ts';
import type { RecordCoefficient, RecordExamination } from '../record-type.ts';
import { bottomAxis, plumbLine, roomy, spanOf, ticksOf, WIDTH } from './axes.ts';
import { clipped, drawing, element, type Figure, label } from './svg.ts';

const ROW = 34;
const ROWS = 16;

type Bootstrap = NonNullable<RecordExamination['bootstrap']>;

/** One coefficient's interval as declared and as drawn from the rows again, in its standard errors from the estimate. */
export interface TwoIntervals {
  readonly name: string;
  readonly declared: readonly [number, number];
  readonly drawn: readonly [number, number];
  /** How many times as wide the drawn one is. */
  readonly ratio: number;
}

/** Coefficients with both intervals. */
export function twoIntervals(
  bootstrap: Bootstrap,
  coefficients: readonly RecordCoefficient[],
): TwoIntervals[] {
  return bootstrap.coefficients.flatMap((drawn) => {
    const own = coefficients.find(({ name }) => name === drawn.name);
    if (own === undefined || own.lower === null || own.upper === null) return [];
    const error = own.standard_error;
    if (error === null || !(error > 0) || !(own.upper > own.lower)) return [];
    const { estimate, lower, upper } = own;
    const away = (v: number): number => (v - estimate) / error;
    return [
      {
        name: drawn.name,
        declared: [away(lower), away(upper)] as const,
        drawn: [away(drawn.lower), away(drawn.upper)] as const,
        ratio: (drawn.upper - drawn.lower) / (upper - lower),
      },
    ];
  });
}

/** Both intervals of each coefficient on one axis with a plumb line at the estimate; null where there are none. */
export function bootstrapChart(all: readonly TwoIntervals[], caption: string): Figure | null {
  const shown = all.filter(({ drawn }) => drawn.every((v) => Math.abs(v) < 1e6)).slice(0, ROWS);
  if (shown.length === 0) return null;
  const plot = { left: 14, right: WIDTH - 14, top: 10, bottom: 14 + shown.length * ROW + 6 };
  const x = roomy(
    spanOf(shown.flatMap((one) => [...one.declared, ...one.drawn, 0])),
    [plot.left, plot.right],
    0.04,
  );
  const body = shown
    .map((one, i) => {
      const y = plot.top + i * ROW;
      return (
        label(plot.left, y + 12, clipped(one.name, 60), 'name') +
        element('line', {
          class: 'rung thick',
          x1: x(one.drawn[0]),
          x2: x(one.drawn[1]),
          y1: y + 22,
          y2: y + 22,
        }) +
        element('line', {
          class: 'rung',
          x1: x(one.declared[0]),
          x2: x(one.declared[1]),
          y1: y + 22,
          y2: y + 22,
        })
      );
    })
    .join('');
  return {
    svg: drawing(
      'bootstrap',
      { width: WIDTH, height: plot.bottom + 44 },
      'Intervals as declared and as drawn from the rows again',
      shown.map(({ name, ratio }) => `${name}: ${significant(ratio, 2)} times as wide`).join('; '),
      plumbLine(x(0), plot.top - 6, plot.bottom) +
        bottomAxis(plot, x, ticksOf(x, 6), 'distance from the estimate, in standard errors') +
        body,
    ),
    caption: `${caption} Thin: as declared; thick: drawn from the rows again.`,
  };
}
