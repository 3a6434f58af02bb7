import type { Scale } from '../study/study.ts';

/** The response on the scale it is fitted on: g(y). Box & Cox 1964 for `box_cox`, (y^λ − 1)/λ, log at λ = 0. */
export function toScale(y: number, scale: Scale): number {
  switch (scale.kind) {
    case 'natural':
      return y;
    case 'log':
      return Math.log(y);
    case 'sqrt':
      return Math.sqrt(y);
    case 'reciprocal':
      return 1 / y;
    case 'box_cox':
      return scale.lambda === 0 ? Math.log(y) : Math.expm1(scale.lambda * Math.log(y)) / scale.lambda;
  }
}

/** g⁻¹(z), back to the response's own scale; NaN where z is outside the image of g. */
export function fromScale(z: number, scale: Scale): number {
  switch (scale.kind) {
    case 'natural':
      return z;
    case 'log':
      return Math.exp(z);
    case 'sqrt':
      return z < 0 ? Number.NaN : z * z;
    case 'reciprocal':
      return z <= 0 ? Number.NaN : 1 / z;
    case 'box_cox':
      if (scale.lambda === 0) return Math.exp(z);
      return 1 + scale.lambda * z < 0 ? Number.NaN : Math.exp(Math.log1p(scale.lambda * z) / scale.lambda);
  }
}

/** The derivative of g⁻¹ at z; NaN where z is outside the image of g. */
export function scaleDerivative(z: number, scale: Scale): number {
  switch (scale.kind) {
    case 'natural':
      return 1;
    case 'log':
      return Math.exp(z);
    case 'sqrt':
      return z < 0 ? Number.NaN : 2 * z;
    case 'reciprocal':
      return z <= 0 ? Number.NaN : -1 / (z * z);
    case 'box_cox': {
      const y = fromScale(z, scale);
      return y ** (1 - scale.lambda);
    }
  }
}

/** Whether g⁻¹ falls as z rises: only the reciprocal. */
export function isDecreasing(scale: Scale): boolean {
  return scale.kind === 'reciprocal';
}

/**
 * J, the log-Jacobian of the scale over the rows: what a log-likelihood needs so that fits on different
 * scales can be compared (Box & Cox 1964). Σ ln |g′(y_i)|.
 */
export function logJacobian(y: Float64Array, scale: Scale): number {
  if (scale.kind === 'natural') return 0;
  let logs = 0;
  for (const value of y) logs += Math.log(Math.abs(value));
  switch (scale.kind) {
    case 'log':
      return -logs;
    case 'sqrt':
      return -0.5 * logs - y.length * Math.LN2;
    case 'reciprocal':
      return -2 * logs;
    case 'box_cox':
      return (scale.lambda - 1) * logs;
  }
}

/** "natural", "log", "sqrt", "reciprocal" or "box_cox 0.5": the scale as the record writes it. */
export function scaleName(scale: Scale): string {
  return scale.kind === 'box_cox' ? `box_cox ${scale.lambda}` : scale.kind;
}
