import { rounded, roundingFor, value, withUnit } from '../numbers.ts';
import { type Lexicon, labelOf } from './lexicon.ts';
import { fittedUnit, percentOfLog, scaleKind } from './scale.ts';

/**
 * How far observed values typically lie from the model, from the residual standard error s: "30 L", on a log
 * scale "8.7 %" or, from twofold on, "a factor of 2.7", with weights "49 kWh at the mean weight (days 30.4)", since
 * there the spread is s/√w. Null where s is.
 */
export function typicalMiss(lexicon: Lexicon, s: number | null): string | null {
  if (s === null || !Number.isFinite(s)) return null;
  const weights = [...lexicon.variables.values()].find((v) => v.used_as.includes('weights'));
  const mean = weights?.mean ?? null;
  if (weights !== undefined && (mean === null || mean <= 0)) return null;
  const spread = mean === null ? s : s / Math.sqrt(mean);
  const text = missText(lexicon, spread);
  if (weights === undefined || mean === null) return text;
  return `${text} at the mean weight (${labelOf(lexicon, weights.name)} ${withUnit(value(mean, 3), weights.unit)})`;
}

function missText(lexicon: Lexicon, spread: number): string {
  if (scaleKind(lexicon.response.scale) !== 'log')
    return withUnit(rounded(spread, roundingFor(spread, spread)), fittedUnit(lexicon.response));
  // Beyond twofold a per cent upwards ("170 %") says little of what it is downwards.
  if (spread > Math.LN2) {
    const factor = Math.exp(spread);
    return `a factor of ${rounded(factor, roundingFor(factor, factor))}`;
  }
  const size = percentOfLog(spread);
  return withUnit(rounded(size, roundingFor(size, size)), '%');
}
