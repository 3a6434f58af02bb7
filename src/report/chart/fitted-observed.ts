import type { RecordExamination, RecordModel } from '../record-type.ts';
import { type Lexicon, raised } from '../words/lexicon.ts';
import { typicalMiss } from '../words/miss.ts';
import { fittedQuantity, fittedUnit } from '../words/scale.ts';
import {
  axisTitle,
  bottomAxis,
  leftAxis,
  placesAlong,
  plotOf,
  roomy,
  spanOf,
  ticksOf,
  WIDTH,
} from './axes.ts';
import { dots, drawing, element, type Figure } from './svg.ts';

const HEIGHT = 330;

/** Observed against fitted values with the line on which they agree. */
export function fittedObservedChart(
  lexicon: Lexicon,
  points: RecordExamination['points'],
  model: RecordModel,
): Figure {
  const plot = plotOf(HEIGHT);
  const span = spanOf([...points.fitted, ...points.observed]);
  const x = roomy(span, [plot.left, plot.right]);
  const y = roomy(span, [plot.bottom, plot.top]);
  const quantity = fittedQuantity(lexicon.response);
  const unit = fittedUnit(lexicon.response);
  const [low, high] = x.domain() as [number, number];
  const caption = agreement(lexicon, model);
  return {
    svg: drawing(
      'fitted-observed',
      { width: WIDTH, height: HEIGHT },
      `Observed against fitted: ${quantity}`,
      caption,
      leftAxis(plot, y, ticksOf(y, 6), axisTitle(`observed: ${quantity}`, unit)) +
        bottomAxis(plot, x, ticksOf(x, 6), axisTitle(`fitted: ${quantity}`, unit)) +
        dots(placesAlong(x, points.fitted), placesAlong(y, points.observed), 'dots') +
        element('line', { class: 'plumb', x1: x(low), y1: y(low), x2: x(high), y2: y(high) }),
    ),
    caption,
  };
}

function agreement(lexicon: Lexicon, model: RecordModel): string {
  const miss = typicalMiss(lexicon, model.residual_standard_error);
  // On the log scale the miss is a share of the response itself.
  const { response } = lexicon;
  const quantity = response.scale === 'log' ? response.label : fittedQuantity(response);
  if (miss === null) return 'On the line, observed and fitted values agree.';
  return `${raised(quantity)} as observed lies typically ${miss} from what the model says; on the line they agree.`;
}
