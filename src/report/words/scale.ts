import { fixed, value } from '../numbers.ts';
import type { Lexicon } from './lexicon.ts';

/** "natural", "log", "sqrt", "reciprocal" or "box_cox", from the record's text of a scale. */
export function scaleKind(scale: string): 'natural' | 'log' | 'sqrt' | 'reciprocal' | 'box_cox' {
  for (const kind of ['log', 'sqrt', 'reciprocal', 'box_cox'] as const) {
    if (scale.startsWith(kind)) return kind;
  }
  return 'natural';
}

/** The name of a scale: "square root". */
export function scaleName(scale: string): string {
  switch (scaleKind(scale)) {
    case 'sqrt':
      return 'square-root';
    case 'box_cox':
      return 'Box–Cox';
    default:
      return scaleKind(scale);
  }
}

/** What was fitted, in words: "fuel burned", "the logarithm of fuel burned" … */
export function fittedQuantity(response: Lexicon['response']): string {
  switch (scaleKind(response.scale)) {
    case 'natural':
      return response.label;
    case 'log':
      return `the logarithm of ${response.label}`;
    case 'sqrt':
      return `the square root of ${response.label}`;
    case 'reciprocal':
      return `1/${response.label}`;
    case 'box_cox':
      return response.lambda === null
        ? `${response.label} on its Box–Cox scale`
        : `${response.label} on the Box–Cox scale with λ = ${value(response.lambda)}`;
  }
}

/** The unit of the fitted quantity; null where the scale has none that helps. */
export function fittedUnit(response: Lexicon['response']): string | null {
  const { unit } = response;
  if (unit === null || unit === '') return null;
  switch (scaleKind(response.scale)) {
    case 'natural':
      return unit;
    case 'sqrt':
      return `√${unit}`;
    case 'reciprocal':
      return `1/${unit}`;
    default:
      return null;
  }
}

/** Per cent that a difference b on the log scale stands for: (e^b − 1)·100. */
export function percentOfLog(b: number): number {
  return Math.expm1(b) * 100;
}

/** A sentence that tells how to read numbers of a model that is not on the natural scale; null on the natural one. */
export function scaleSentence(lexicon: Lexicon): string | null {
  const { response } = lexicon;
  switch (scaleKind(response.scale)) {
    case 'natural':
      return null;
    case 'log':
      return `The model is for the natural logarithm of ${response.label}, so that each term goes with a change in per cent: a coefficient b stands for (e^b − 1) × 100 %. Predictions are turned back to ${response.unit ?? 'the scale of the data'}.`;
    case 'reciprocal':
      return `The model is for ${fittedQuantity(response)}: what raises it lowers ${response.label}. Predictions are turned back to ${response.unit ?? 'the scale of the data'}.`;
    default:
      return `The model is for ${fittedQuantity(response)}; effects below are on that scale. Predictions are turned back to ${response.unit ?? 'the scale of the data'}.`;
  }
}

/** "95 %" style confidence is in numbers.ts; this is the short mark for chart axes: "−20 %". */
export function percentTick(percent: number): string {
  const text = fixed(percent, Math.abs(percent) < 1 && percent !== 0 ? 1 : 0);
  return `${percent > 0 ? '+' : ''}${text}\u202f%`;
}
