import type { CategoryColumn } from '../data/table.ts';
import { wholeNumber } from '../numerals.ts';
import type { Sample } from '../prepare/sample.ts';
import type { Report } from '../problem.ts';
import type { ResponsePlan, Study, TermPlan } from '../study/study.ts';
import type { CandidateModel, Design, DesignColumn, FamilyModel, ModelTerm, Piece } from './design.ts';
import { columnName, superscript, termName } from './names.ts';

/**
 * The union of all candidates' design columns, those of families last, in order of first use after the intercept,
 * and each candidate as indexes into it. A column that two terms share (a polynomial and its own variable) stands
 * in the union once.
 *
 * Reports `category_one_level` where a category has a single level among the sample's rows; null then.
 */
export function buildDesign(study: Study, sample: Sample, report: Report): Design | null {
  const units = unitsOf(study);
  const columns: DesignColumn[] = [{ name: 'intercept', pieces: [], unit: null }];
  const indexOf = new Map<string, number>([[keyOf([]), 0]]);
  const responses: ResponsePlan[] = [];
  const refused = new Set<string>();

  const columnIndex = (pieces: readonly Piece[]): number => {
    const key = keyOf(pieces);
    let index = indexOf.get(key);
    if (index === undefined) {
      index = columns.length;
      indexOf.set(key, index);
      columns.push({ name: columnName(pieces), pieces, unit: unitOf(pieces, units) });
    }
    return index;
  };

  const modelTerm = (term: TermPlan, path: readonly (string | number)[]): ModelTerm => {
    const oneLevel = (column: CategoryColumn, level: string | null) => {
      if (refused.has(column.name)) return;
      refused.add(column.name);
      report({
        code: 'category_one_level',
        severity: 'error',
        place: study.placeOf(path),
        message: `${column.name} has ${level === null ? 'no level' : `only the level "${level}"`} in the ${sample.rowCount === 1 ? 'one row' : `${wholeNumber(sample.rowCount)} rows`} used, so it cannot be a term.`,
        hint: 'Look at what leave_out and missing values take away, or take the term out.',
      });
    };
    const products = expand(term, sample, oneLevel);
    return { name: termName(term), plan: term, columns: unique(products.map(columnIndex)) };
  };

  const candidates = study.candidates.map((plan, index): CandidateModel => {
    const { position = index } = plan;
    const terms = plan.terms.map((term, k) => modelTerm(term, ['candidates', position, 'terms', k]));
    const own = unique(terms.flatMap((term) => term.columns));
    const response = { variable: study.response.variable, scale: plan.scale };
    return {
      name: plan.name,
      position,
      response,
      intercept: plan.intercept,
      terms,
      columns: plan.intercept ? [0, ...own] : own,
      responseColumn: responseIndex(response, responses),
    };
  });
  const families = study.families.map((plan): FamilyModel => {
    const response = { variable: study.response.variable, scale: plan.scale };
    return {
      plan,
      terms: plan.terms.map(({ term, path }) => modelTerm(term, path)),
      response,
      responseColumn: responseIndex(response, responses),
    };
  });
  return refused.size > 0 ? null : { columns, responses, candidates, families };
}

/** The products of pieces a term stands for. */
function expand(
  term: TermPlan,
  sample: Sample,
  oneLevel: (column: CategoryColumn, level: string | null) => void,
): Piece[][] {
  switch (term.kind) {
    case 'variable': {
      const column = sample.columns.get(term.variable);
      if (column?.kind !== 'category') return [[{ kind: 'variable', variable: term.variable }]];
      const present = presentLevels(column);
      if (present.length < 2) oneLevel(column, present[0] ?? null);
      return present
        .filter((level) => level !== baselineOf(column, present))
        .map((level) => [{ kind: 'level', variable: term.variable, level }]);
    }
    case 'interaction':
      return term.of
        .map((member) => expand(member, sample, oneLevel))
        .reduce((products, more) => products.flatMap((left) => more.map((right) => [...left, ...right])));
    case 'polynomial':
      return Array.from({ length: term.degree }, (_, i) => [power(term.variable, i + 1)]);
    case 'power':
      return [[power(term.variable, term.to)]];
    case 'bend':
      return [[{ kind: 'bend', variable: term.variable, at: term.at, side: term.side }]];
    case 'spline':
      return [
        [{ kind: 'variable', variable: term.variable }],
        ...Array.from({ length: term.knots.length - 2 }, (_, i): Piece[] => [
          { kind: 'spline', variable: term.variable, knots: term.knots, index: i + 1 },
        ]),
      ];
  }
}

/** Levels with at least one row in the sample, in the column's order. */
export function presentLevels(column: CategoryColumn): string[] {
  const seen = new Uint8Array(column.levels.length);
  for (const code of column.codes) if (code >= 0) seen[code] = 1;
  return column.levels.filter((_, code) => seen[code] === 1);
}

/** The declared baseline, or the first present level where the baseline has no row. */
export function baselineOf(column: CategoryColumn, present: readonly string[]): string | null {
  return present.includes(column.baseline) ? column.baseline : (present[0] ?? null);
}

function power(variable: string, to: number): Piece {
  return to === 1 ? { kind: 'variable', variable } : { kind: 'power', variable, to };
}

/** Products in another order are the same column. */
function keyOf(pieces: readonly Piece[]): string {
  return JSON.stringify(pieces.map((piece) => JSON.stringify(piece)).sort());
}

function unique(indexes: readonly number[]): number[] {
  return [...new Set(indexes)];
}

function responseIndex(response: ResponsePlan, responses: ResponsePlan[]): number {
  const key = JSON.stringify(response);
  const found = responses.findIndex((other) => JSON.stringify(other) === key);
  return found >= 0 ? found : responses.push(response) - 1;
}

function unitsOf(study: Study): Map<string, string | null> {
  return new Map([...study.data.variables, ...study.derive].map((each) => [each.name, each.unit]));
}

/** "t·kn³" for cargo × speed³; null where a numeric piece has no unit. */
function unitOf(pieces: readonly Piece[], units: ReadonlyMap<string, string | null>): string | null {
  const parts: string[] = [];
  for (const piece of pieces) {
    if (piece.kind === 'level') continue;
    const unit = units.get(piece.variable) ?? null;
    if (unit === null || piece.kind === 'spline') return null;
    if (piece.kind !== 'power' || piece.to === 1) parts.push(unit);
    else
      parts.push(
        /^[\p{L}°%]+$/u.test(unit) ? `${unit}${superscript(piece.to)}` : `(${unit})${superscript(piece.to)}`,
      );
  }
  return parts.length === 0 ? null : parts.join('·');
}
