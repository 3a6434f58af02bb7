import { scaleLinear } from 'd3-scale';
import { powerOfTen } from '../numbers.ts';
import type { Lexicon } from '../words/lexicon.ts';
import { fittedQuantity, fittedUnit, percentOfLog, percentTick, scaleKind } from '../words/scale.ts';
import { axisTitle, type Scale, type Tick, ticksOf } from './axes.ts';

/** Ticks for differences on the fitted scale: in its unit, or on a log scale in per cent. */
export function differenceTicks(lexicon: Lexicon, scale: Scale, wanted: number): Tick[] {
  if (scaleKind(lexicon.response.scale) !== 'log') return ticksOf(scale, wanted);
  const [low, high] = scale.domain() as [number, number];
  // Round per cents where the span is small; where it is large, round multiples; where it is huge, powers of ten.
  if (high - low > 12 * Math.LN10)
    return scaleLinear()
      .domain([low / Math.LN10, high / Math.LN10])
      .ticks(wanted)
      .filter(Number.isInteger)
      .map((power) => ({ value: power * Math.LN10, text: `×\u202f${powerOfTen(power)}` }));
  if (high - low > 4)
    return ticksOf(scale, wanted).map(({ value }) => ({
      value,
      text: `×\u202f${Number(Math.exp(value).toPrecision(2))}`,
    }));
  const percents = scaleLinear()
    .domain([percentOfLog(low), percentOfLog(high)])
    .ticks(wanted);
  return percents.filter((p) => p > -100).map((p) => ({ value: Math.log1p(p / 100), text: percentTick(p) }));
}

/** "difference in fuel burned, L". */
export function differenceTitle(lexicon: Lexicon): string {
  const kind = scaleKind(lexicon.response.scale);
  const quantity = kind === 'log' ? lexicon.response.label : fittedQuantity(lexicon.response);
  return axisTitle(`difference in ${quantity}`, kind === 'log' ? null : fittedUnit(lexicon.response));
}
