import type { Piece } from '../../model/design.ts';
import type { Chosen } from '../chosen.ts';
import type { Setting } from './settings.ts';

/**
 * The derivative of the chosen model's design row by one variable at a setting, length p: its product with the
 * estimates is the slope there. Where the slope jumps (at a bend), it is the one above.
 */
export function derivativeAt({ fit, columns }: Chosen, setting: Setting, variable: string): Float64Array {
  return Float64Array.from(fit.columns, (column) => {
    const { pieces } = columns[column]!;
    let sum = 0;
    pieces.forEach((piece, k) => {
      if (piece.variable !== variable || piece.kind === 'level') return;
      let product = pieceSlope(piece, Number(setting.get(variable)));
      pieces.forEach((other, m) => {
        if (m !== k) product *= pieceValue(other, setting);
      });
      sum += product;
    });
    return sum;
  });
}

function pieceValue(piece: Piece, setting: Setting): number {
  const value = setting.get(piece.variable);
  if (piece.kind === 'level') return value === piece.level ? 1 : 0;
  const x = Number(value);
  switch (piece.kind) {
    case 'variable':
      return x;
    case 'power':
      return x ** piece.to;
    case 'bend':
      return Math.max(0, piece.side === 'above' ? x - piece.at : piece.at - x);
    case 'spline':
      return curved(x, piece, (d) => d ** 3);
  }
}

function pieceSlope(piece: Exclude<Piece, { kind: 'level' }>, x: number): number {
  switch (piece.kind) {
    case 'variable':
      return 1;
    case 'power':
      return piece.to * x ** (piece.to - 1);
    case 'bend':
      return piece.side === 'above' ? (x >= piece.at ? 1 : 0) : x < piece.at ? -1 : 0;
    case 'spline':
      return curved(x, piece, (d) => 3 * d ** 2);
  }
}

/** The curved column of a natural cubic spline (see `splinePair`), or its derivative. */
function curved(
  x: number,
  { knots, index }: Extract<Piece, { kind: 'spline' }>,
  cube: (distance: number) => number,
): number {
  const last = knots.at(-1)!;
  const part = (knot: number) => (cube(Math.max(0, x - knot)) - cube(Math.max(0, x - last))) / (last - knot);
  return part(knots[index - 1]!) - part(knots.at(-2)!);
}
