import type { Design } from '../model/design.ts';
import { columnBounds, type DesignRows, numbersOf } from '../model/design-rows.ts';
import { scaleName } from '../model/response-scale.ts';
import type { Sample } from '../prepare/sample.ts';
import type { Report } from '../problem.ts';
import type { Study } from '../study/study.ts';

/**
 * Nothing beyond these is fitted: sums of squares of the response, (X′WX)⁻¹ and their products, which go up to the
 * fourth power of what is fitted, would leave the range of doubles.
 */
const LARGEST = 1e75;
const SMALLEST = 1e-75;

/**
 * Looks for predictors, responses and weights that are not finite somewhere (a power that overflows, 0 to a
 * negative power) or too large or too small to compute with; true where all is well. Each is reported once.
 */
export function checkMagnitudes(
  study: Study,
  sample: Sample,
  design: Design,
  rows: DesignRows,
  dataFile: string,
  report: Report,
): boolean {
  let sound = true;
  const check = (name: string, variable: string, largest: Extreme): void => {
    const fault = faultOf(largest);
    if (fault === null) return;
    sound = false;
    report({
      code: 'value_not_finite',
      severity: 'error',
      place: { kind: 'cell', file: dataFile, row: sample.lines[largest.row]!, variable },
      message: `${name} ${fault.what}.`,
      hint: fault.hint,
    });
  };
  const response = study.response.variable;
  const own = largestOf(numbersOf(sample, response));
  check(response, response, own);
  design.responses.forEach(({ scale }, k) => {
    if (scale.kind === 'natural' || faultOf(own) !== null) return;
    check(`${response} on the ${scaleName(scale)} scale`, response, largestOf(rows.responses[k]!));
  });
  if (study.weights !== null) {
    // A weight that is next to nothing beside the others makes nothing of the columns that only its rows have.
    const weights = numbersOf(sample, study.weights);
    const largest = largestOf(weights);
    const smallest = smallestOf(weights);
    const name = `The weight ${study.weights}`;
    check(name, study.weights, faultOf(largest) === null && faultOf(smallest) !== null ? smallest : largest);
  }
  // A variable that is too large is said once, and not again for each column that is made of it.
  const said = new Set<string>();
  const pieces = design.columns.flatMap((column) => column.pieces);
  for (const name of new Set(pieces.flatMap((piece) => (piece.kind === 'level' ? [] : [piece.variable])))) {
    const largest = largestOf(numbersOf(sample, name));
    if (Math.abs(largest.value) <= LARGEST) continue;
    said.add(name);
    check(name, name, largest);
  }
  const bounds = columnBounds(sample);
  design.columns.forEach((column, index) => {
    const { name, pieces } = column;
    if (pieces.every((piece) => piece.kind === 'level') || pieces.some((piece) => said.has(piece.variable)))
      return;
    const [first] = pieces;
    const { variable } = first!;
    const alone = pieces.length === 1;
    const largest =
      alone && first?.kind === 'variable'
        ? largestOf(numbersOf(sample, variable))
        : largestOfColumn(index, rows);
    // Effects are worked out at combinations of values that no row has.
    const anywhere = { ...largest, value: bounds(column) };
    if (!alone && faultOf(largest) === null && anywhere.value > LARGEST)
      check(`${name}, with each of its variables at the largest,`, variable, anywhere);
    else check(name, variable, largest);
  });
  return sound;
}

/** A size in a column, and the row where it is. */
interface Extreme {
  readonly value: number;
  readonly row: number;
}

function faultOf({ value }: Extreme): { readonly what: string; readonly hint: string } | null {
  const size = Math.abs(value);
  if (!Number.isFinite(value)) {
    return {
      what: 'is not a finite number there',
      hint: 'Leave such rows out for a stated reason, or choose a term that is defined in all rows.',
    };
  }
  if (size === 0 || (size <= LARGEST && size >= SMALLEST)) return null;
  const shown = Number(value.toPrecision(3));
  return {
    what:
      size > LARGEST
        ? `is about ${shown} there, too large for its squares to be computed with`
        : `is about ${shown} there, too small for its squares to be computed with`,
    hint: `Bring it into another unit by a derived variable: between ${SMALLEST} and ${LARGEST} all is well.`,
  };
}

/** The largest size and where it is first; the first that is not a finite number, where one is. */
function largestOf(values: Float64Array): Extreme {
  let row = 0;
  let largest = 0;
  for (let i = 0; i < values.length; i++) {
    const size = Math.abs(values[i]!);
    if (!(size < Number.POSITIVE_INFINITY)) return { value: values[i]!, row: i };
    if (size > largest) {
      largest = size;
      row = i;
    }
  }
  return { value: values[row]!, row };
}

/** Of weights, which are above 0. */
function smallestOf(values: Float64Array): Extreme {
  let row = 0;
  for (let i = 1; i < values.length; i++) if (values[i]! < values[row]!) row = i;
  return { value: values[row]!, row };
}

const BLOCK = 1024;

/** Of a column that is computed; without its weights and its power of two. */
function largestOfColumn(column: number, rows: DesignRows): Extreme {
  const values = new Float64Array(BLOCK);
  let found: Extreme = { value: 0, row: 0 };
  for (let from = 0; from < rows.rowCount; from += BLOCK) {
    const count = Math.min(BLOCK, rows.rowCount - from);
    rows.fill([column], from, from + count, BLOCK, values, null);
    for (let i = 0; i < count; i++) {
      const value = values[i]! / rows.scales[column]! / (rows.rootWeights?.[from + i] ?? 1);
      if (!Number.isFinite(value)) return { value, row: from + i };
      if (Math.abs(value) > Math.abs(found.value)) found = { value, row: from + i };
    }
  }
  return found;
}
