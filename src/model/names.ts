import type { TermPlan } from '../study/study.ts';
import type { Piece } from './design.ts';

const SUPERSCRIPTS: Readonly<Record<string, string>> = {
  '0': '⁰',
  '1': '¹',
  '2': '²',
  '3': '³',
  '4': '⁴',
  '5': '⁵',
  '6': '⁶',
  '7': '⁷',
  '8': '⁸',
  '9': '⁹',
  '-': '⁻',
};

/** "³" for 3; "^1.5" where the exponent has no superscript form; "" for 1. */
export function superscript(exponent: number): string {
  if (exponent === 1) return '';
  if (!Number.isInteger(exponent)) return `^${exponent}`;
  return [...String(exponent)].map((digit) => SUPERSCRIPTS[digit]!).join('');
}

/** The name of a term as tables show it. */
export function termName(term: TermPlan): string {
  switch (term.kind) {
    case 'variable':
      return term.variable;
    case 'interaction':
      return term.of.map(termName).join(' × ');
    case 'polynomial':
      return `${term.variable}, degree ${term.degree}`;
    case 'power':
      return `${term.variable}${superscript(term.to)}`;
    case 'bend':
      return `${term.variable} ${term.side} ${term.at}`;
    case 'spline':
      return `${term.variable}, spline`;
  }
}

/** The name of one piece of a design column. */
export function pieceName(piece: Piece): string {
  switch (piece.kind) {
    case 'variable':
      return piece.variable;
    case 'level':
      return `${piece.variable} ${piece.level}`;
    case 'power':
      return `${piece.variable}${superscript(piece.to)}`;
    case 'bend':
      return `${piece.variable} ${piece.side} ${piece.at}`;
    case 'spline':
      return `${piece.variable}, curve ${piece.index}`;
  }
}

/** The name of a design column from its pieces; an empty product is the intercept. */
export function columnName(pieces: readonly Piece[]): string {
  return pieces.length === 0 ? 'intercept' : pieces.map(pieceName).join(' × ');
}
