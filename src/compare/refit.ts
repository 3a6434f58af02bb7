import type { Column } from '../data/table.ts';
import { type Covariance, declaredCovariance } from '../engine/covariance.ts';
import { EXTENDED_BUDGET, factorExtended, factorRows } from '../engine/factor.ts';
import type { Fit } from '../engine/fit.ts';
import { rowFacts } from '../engine/fit-all.ts';
import { fitCandidate } from '../engine/fit-candidate.ts';
import { refineFit } from '../engine/refine.ts';
import { presentLevels } from '../model/build-design.ts';
import type { CandidateModel, DesignColumn, Piece } from '../model/design.ts';
import { type DesignRows, designRows } from '../model/design-rows.ts';
import { columnName } from '../model/names.ts';
import { toScale } from '../model/response-scale.ts';
import { baseVariables, evaluateDerived } from '../prepare/derive.ts';
import { gatherColumn } from '../prepare/gather.ts';
import { isMissing } from '../prepare/is-missing.ts';
import { timeOrder } from '../prepare/time-order.ts';
import { categoriesOf, type Declaration, type ModelDefinition, variablesOf } from './declaration.ts';

/** Rows with the columns that models read. */
export interface Rows {
  readonly rowCount: number;
  readonly columns: ReadonlyMap<string, Column>;
}

/** A model fitted to some rows. */
export interface Refit {
  readonly definition: ModelDefinition;
  readonly fit: Fit;
  readonly design: DesignRows;
  /** The union's columns: the intercept, the model's, then those of levels that the model had not seen. */
  readonly columns: readonly DesignColumn[];
  readonly rows: Rows;
  /** s; null without degrees of freedom or where the fit is exact. */
  readonly s: number | null;
  /** b by name of column. */
  readonly estimates: ReadonlyMap<string, number>;
}

/** Rows as a declaration has them: what can be derived of them is added. */
export function evaluated(rows: Rows, { derive }: Declaration): Rows {
  const atHand = derive.filter((plan) =>
    [...baseVariables(plan.name, derive)].every((name) => rows.columns.has(name)),
  );
  return { rowCount: rows.rowCount, columns: evaluateDerived(atHand, rows.columns, rows.rowCount).columns };
}

/** The rows at the positions, with the named columns only. */
export function pickRows(rows: Rows, index: Int32Array, names: readonly string[]): Rows {
  const columns = new Map<string, Column>();
  for (const name of names) {
    const column = rows.columns.get(name);
    if (column !== undefined) columns.set(name, gatherColumn(column, index));
  }
  return { rowCount: index.length, columns };
}

/**
 * Fits a model to rows, the same least squares as a run of a study. Levels that the model has not seen get columns
 * of their own, as they would in a study. A sentence says why it cannot be done: without the level that others are
 * compared with coefficients would mean something else, unless only the span of the columns is `wanted`.
 */
export function refit(
  definition: ModelDefinition,
  declaration: Declaration,
  rows: Rows,
  wanted: 'coefficients' | 'span' = 'coefficients',
): Refit | string {
  const unfit =
    whyNotRead(definition, declaration, rows) ?? whyNotCompared(definition, rows, wanted === 'coefficients');
  if (unfit !== null) return unfit;
  const columns = [
    { name: 'intercept', pieces: [], unit: null },
    ...withUnseenLevels(definition, rows),
  ] satisfies DesignColumn[];
  const { variable, scale } = definition.response;
  const own = numbers(rows, variable);
  const response = scale.kind === 'natural' ? own : own.map((y) => toScale(y, scale));
  const design = designRows(columns, rows, [response], declaration.weights);
  const candidate: CandidateModel = {
    name: definition.name,
    response: definition.response,
    intercept: definition.intercept,
    terms: [],
    columns: columns.map((_, column) => column).slice(definition.intercept ? 0 : 1),
    responseColumn: 0,
  };
  const facts = rowFacts({ columns, responses: [definition.response] }, design, own);
  const extended = rows.rowCount * design.width * design.width <= EXTENDED_BUDGET;
  const first = fitCandidate(extended ? factorExtended(design) : factorRows(design), candidate, facts);
  const fit = extended ? first : refineFit(first, design, facts);
  return {
    definition,
    fit,
    design,
    columns,
    rows,
    s:
      fit.degreesOfFreedom < 1 || fit.exact
        ? null
        : Math.sqrt(fit.residualSumOfSquares / fit.degreesOfFreedom),
    estimates: new Map(fit.columns.map((column, j) => [columns[column]!.name, fit.estimates[j]!])),
  };
}

/** The covariance that the study declares, of a fit. */
export function covarianceOf({ fit, design, rows }: Refit, declaration: Declaration): Covariance | null {
  const { time, standardErrors: plan } = declaration;
  const column = time === null ? undefined : rows.columns.get(time);
  const order = column === undefined ? null : timeOrder(column, rows.rowCount);
  return declaredCovariance(plan, fit, design, { columns: rows.columns, timeOrder: order });
}

/** Everything that a fit and its covariance read. */
export function namesToPick(definition: ModelDefinition, declaration: Declaration): string[] {
  const { standardErrors, time } = declaration;
  return [
    ...variablesOf(definition, declaration),
    ...(standardErrors.kind === 'clustered' ? [standardErrors.by] : []),
    ...(time === null ? [] : [time]),
  ];
}

function whyNotRead(definition: ModelDefinition, declaration: Declaration, rows: Rows): string | null {
  if (rows.rowCount === 0) return 'There is no row to fit.';
  const { variable, scale } = definition.response;
  for (const name of variablesOf(definition, declaration)) {
    const column = rows.columns.get(name);
    if (column === undefined) return `${name} is not among what was kept.`;
    for (let i = 0; i < rows.rowCount; i++) {
      if (isMissing(column, i)) return `${name} is missing or undefined in some of the rows.`;
    }
  }
  if (scale.kind !== 'natural' && numbers(rows, variable).some((y) => !Number.isFinite(toScale(y, scale)))) {
    return `${variable} has values that the ${scale.kind} scale does not take.`;
  }
  return null;
}

function whyNotCompared(definition: ModelDefinition, rows: Rows, strict: boolean): string | null {
  for (const [category, baseline] of definition.baselines) {
    const column = rows.columns.get(category);
    if (column?.kind !== 'category') return `${category} is no category there.`;
    if (strict && !presentLevels(column).includes(baseline)) {
      return `No row has ${category} "${baseline}", with which the other levels are compared.`;
    }
  }
  return null;
}

/** The model's columns, and for each level that it has not seen the same columns with that level in place. */
function withUnseenLevels({ columns, baselines }: ModelDefinition, rows: Rows): DesignColumn[] {
  const all = new Map(columns.map((column) => [keyOf(column.pieces), column]));
  for (const category of categoriesOf(columns)) {
    const column = rows.columns.get(category);
    if (column?.kind !== 'category') continue;
    const levels = [...all.values()].flatMap(({ pieces }) => levelsOf(pieces, category));
    const known = new Set([...levels, baselines.get(category)]);
    for (const level of presentLevels(column)) {
      if (known.has(level)) continue;
      for (const { pieces, unit } of [...all.values()]) {
        if (levelsOf(pieces, category).length === 0) continue;
        const changed = pieces.map((piece) =>
          piece.kind === 'level' && piece.variable === category ? { ...piece, level } : piece,
        );
        const key = keyOf(changed);
        if (!all.has(key)) all.set(key, { name: columnName(changed), pieces: changed, unit });
      }
    }
  }
  return [...all.values()];
}

function levelsOf(pieces: readonly Piece[], category: string): string[] {
  return pieces.flatMap((piece) =>
    piece.kind === 'level' && piece.variable === category ? [piece.level] : [],
  );
}

function keyOf(pieces: readonly Piece[]): string {
  return JSON.stringify(pieces.map((piece) => JSON.stringify(piece)).sort());
}

function numbers(rows: Rows, name: string): Float64Array {
  const column = rows.columns.get(name);
  if (column === undefined || column.kind === 'category' || column.kind === 'text') {
    throw new TypeError(`${name} is not a column of numbers`);
  }
  return column.values;
}
