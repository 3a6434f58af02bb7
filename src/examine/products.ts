import type { DesignColumn, Piece } from '../model/design.ts';
import { columnName } from '../model/names.ts';

/**
 * The squares and products of design columns that are not among them already: powers of one variable are put together, a
 * level times itself is itself, and two levels of one category exclude each other. What other dependencies there are is
 * for the factor to find.
 */
export function squaresAndProducts(columns: readonly DesignColumn[]): DesignColumn[] {
  const seen = new Set(columns.map((column) => keyOf(merged(column.pieces) ?? [])));
  const products: DesignColumn[] = [];
  for (let j = 0; j < columns.length; j++) {
    for (let k = 0; k <= j; k++) {
      const pieces = merged([...columns[k]!.pieces, ...columns[j]!.pieces]);
      if (pieces === null) continue;
      const key = keyOf(pieces);
      if (seen.has(key)) continue;
      seen.add(key);
      products.push({ name: columnName(pieces), pieces, unit: null });
    }
  }
  return products;
}

/** Pieces with the powers of each variable put together; null where the product is 0 in every row. */
function merged(pieces: readonly Piece[]): Piece[] | null {
  const powers = new Map<string, number>();
  const levels = new Map<string, string>();
  const rest: Piece[] = [];
  for (const piece of pieces) {
    if (piece.kind === 'level') {
      const level = levels.get(piece.variable);
      if (level !== undefined && level !== piece.level) return null;
      levels.set(piece.variable, piece.level);
    } else if (piece.kind === 'variable') powers.set(piece.variable, (powers.get(piece.variable) ?? 0) + 1);
    else if (piece.kind === 'power') powers.set(piece.variable, (powers.get(piece.variable) ?? 0) + piece.to);
    else rest.push(piece);
  }
  return [
    ...[...powers]
      .filter(([, to]) => to !== 0)
      .map(
        ([variable, to]): Piece =>
          to === 1 ? { kind: 'variable', variable } : { kind: 'power', variable, to },
      ),
    ...[...levels].map(([variable, level]): Piece => ({ kind: 'level', variable, level })),
    ...rest,
  ];
}

function keyOf(pieces: readonly Piece[]): string {
  return JSON.stringify(pieces.map((piece) => JSON.stringify(piece)).sort());
}
