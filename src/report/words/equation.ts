import { rounded, roundingFor, value, withUnit } from '../numbers.ts';
import type { RecordCoefficient, RecordModel } from '../record-type.ts';
import { type Lexicon, unitOf, variableNamed } from './lexicon.ts';
import { scaleKind } from './scale.ts';

/** The chosen model's equation, taken apart so that a page can set one summand to a line. */
export interface Equation {
  /** "fuel (L)", "log fuel". */
  readonly left: string;
  /** Each with its sign: "+", "−" or, first, "". `factor` is empty for the intercept. */
  readonly summands: readonly { readonly sign: string; readonly number: string; readonly factor: string }[];
  /** All of it on one line. */
  readonly text: string;
  /** How to read the marks in it; null where there are none. */
  readonly note: string | null;
}

export function equationOf(
  lexicon: Lexicon,
  model: RecordModel,
  coefficients: readonly RecordCoefficient[],
): Equation {
  const summands = model.columns.map((column, j) => {
    const coefficient = coefficients[j];
    const estimate = coefficient?.estimate ?? column.estimate;
    // One digit more than the tables, so that working the equation out by hand stays close.
    const rounding = roundingFor(estimate, (coefficient?.standard_error ?? 0) / 10);
    return {
      sign: estimate < 0 ? '−' : j === 0 ? '' : '+',
      number: rounded(Math.abs(estimate), rounding),
      factor: column.pieces.map((piece) => pieceText(lexicon, piece)).join(' × '),
    };
  });
  const left = leftSide(lexicon);
  const right = summands
    .map(({ sign, number, factor }, j) => {
      const body = factor === '' ? number : `${number} × ${factor}`;
      return j === 0 ? `${sign}${body}` : ` ${sign} ${body}`;
    })
    .join('');
  return { left, summands, text: `${left} = ${right}`, note: noteOn(right) };
}

function leftSide({ response }: Lexicon): string {
  const unit = response.unit ? ` (${response.unit})` : '';
  switch (scaleKind(response.scale)) {
    case 'natural':
      return response.variable + unit;
    case 'log':
      return `log ${response.variable}${unit}`;
    case 'sqrt':
      return `√${response.variable}${unit}`;
    case 'reciprocal':
      return `1/${response.variable}${unit}`;
    case 'box_cox':
      return `(${response.variable}^λ − 1)/λ${response.lambda === null ? '' : ` with λ = ${response.lambda}`}`;
  }
}

function pieceText(lexicon: Lexicon, piece: RecordModel['columns'][number]['pieces'][number]): string {
  const unit = unitOf(lexicon, piece.variable);
  const name = unit ? `${piece.variable} (${unit})` : piece.variable;
  switch (piece.kind) {
    case 'level':
      return `[${piece.variable} is ${piece.level}]`;
    case 'power':
      return unit
        ? `(${piece.variable} in ${unit})${exponent(piece.to ?? 1)}`
        : `${piece.variable}${exponent(piece.to ?? 1)}`;
    case 'bend': {
      const at = withUnit(value(piece.at ?? 0, 6), unit);
      return piece.side === 'below'
        ? `max(0, ${at} − ${piece.variable})`
        : `max(0, ${piece.variable} − ${at})`;
    }
    case 'spline':
      return `curve ${piece.index} of ${name}`;
    default:
      return flagText(lexicon, piece.variable) ?? name;
  }
}

/** "[urgent is yes]" for a flag, whose second level is coded 1; null for a number. */
function flagText(lexicon: Lexicon, name: string): string | null {
  const variable = variableNamed(lexicon, name);
  if (variable?.type !== 'flag') return null;
  return `[${name} is ${variable.levels?.[1]?.level ?? 'yes'}]`;
}

function exponent(to: number): string {
  if (!Number.isInteger(to)) return `^${to}`;
  return [...String(to)].map((c) => (c === '-' ? '⁻' : '⁰¹²³⁴⁵⁶⁷⁸⁹'[Number(c)]!)).join('');
}

function noteOn(right: string): string | null {
  const notes = [
    ...(right.includes('[') ? ['[…] is 1 where it holds and 0 elsewhere.'] : []),
    ...(right.includes('max(0, ') ? ['max(0, …) is 0 where the difference is negative.'] : []),
  ];
  return notes.length === 0 ? null : notes.join(' ');
}
