import { checkExpression } from '../expression/check-expression.ts';
import type { ValueType } from '../expression/expression.ts';
import { parseExpression } from '../expression/parse-expression.ts';
import type { DesignColumn, Piece } from '../model/design.ts';
import type { Predictor } from '../predict/predictor.ts';
import type { DataPlan, DerivationPlan, Scale, VariablePlan } from '../study/study.ts';
import type { RecordModel } from './record.ts';

type Recorded = NonNullable<RecordModel['prediction']>;

/** A model read again from its record, and how rows for it are written. */
export interface RecordedPredictor {
  readonly predictor: Predictor;
  /** Header of the column that names a row, or null. */
  readonly rowId: string | null;
  readonly format: DataPlan['format'];
  readonly missing: readonly string[];
}

/**
 * The predictor of a recorded model, to the last bit that of the fit. A sentence instead where the record's parts do not
 * fit together: it has been edited, since no run writes such a record.
 */
export function recordedPredictor(model: RecordModel, recorded: Recorded): RecordedPredictor | string {
  const p = model.columns.length;
  const root = columnMajor(recorded.root, p);
  const covarianceRoot = recorded.covariance_root === null ? root : columnMajor(recorded.covariance_root, p);
  if (root === null || covarianceRoot === null)
    return `the roots under model.prediction must be ${p} × ${p}, as model.columns`;
  if (!(recorded.df > 0)) return 'model.prediction.df must be above 0';
  const scale = scaleOf(model.response.scale, model.response.lambda);
  if (scale === null) return `model.response.scale "${model.response.scale}" is not a scale`;

  const variables = recorded.variables.map(planOf);
  const types = new Map<string, ValueType>(variables.map(({ name, type }) => [name, valueType(type)]));
  const derive: DerivationPlan[] = [];
  for (const { name, expression: text, type } of recorded.derived) {
    const plan = derivationOf(name, text, type, types);
    if (plan === null) return `the expression of ${name} under model.prediction.derived cannot be used`;
    derive.push(plan);
    types.set(name, type);
  }
  const columns: DesignColumn[] = [];
  for (const column of model.columns) {
    const pieces = column.pieces.map((piece) => pieceOf(piece, types));
    if (pieces.includes(null)) return `the column "${column.name}" of model.columns cannot be formed`;
    columns.push({ name: column.name, unit: column.unit, pieces: pieces as Piece[] });
  }
  const needed = new Set(recorded.variables.filter((one) => one.needed).map(({ name }) => name));
  const s = model.residual_standard_error;
  const variance = recorded.error_variance;
  return {
    predictor: {
      model: [...new Set(columns.flatMap((column) => column.pieces.map((piece) => piece.variable)))],
      inputs: variables.filter(({ name }) => needed.has(name)),
      extras: variables.filter(({ name }) => !needed.has(name)),
      derive,
      levels: new Map(
        recorded.variables.flatMap(({ name, levels }) => (levels === null ? [] : [[name, levels] as const])),
      ),
      flagTexts: new Map(
        variables.flatMap(({ name, flagValues }) =>
          flagValues === null ? [] : [[name, flagValues] as const],
        ),
      ),
      response: { variable: model.response.variable, scale },
      columns,
      estimates: Float64Array.from(model.columns, ({ estimate }) => estimate),
      rootInverse: root,
      s,
      covariance:
        s === null || variance === null ? null : { root: covarianceRoot, classicalRoot: root, variance },
      degreesOfFreedom: recorded.df,
      largestLeverage: model.largest_leverage,
      smearing: model.smearing === null ? null : Float64Array.from(model.smearing),
      weights: recorded.weights,
      ranges: new Map(recorded.ranges.map(({ variable, ...range }) => [variable, range])),
    },
    rowId: recorded.row_id,
    format: { delimiter: null, decimalMark: recorded.decimal_mark, encoding: null },
    missing: recorded.missing,
  };
}

function columnMajor(rows: readonly (readonly number[])[], p: number): Float64Array | null {
  if (rows.length !== p || rows.some((row) => row.length !== p)) return null;
  const matrix = new Float64Array(p * p);
  for (let i = 0; i < p; i++) for (let j = 0; j < p; j++) matrix[j * p + i] = rows[i]![j]!;
  return matrix;
}

function scaleOf(name: string, lambda: number | null): Scale | null {
  if (name === 'natural' || name === 'log' || name === 'sqrt' || name === 'reciprocal') return { kind: name };
  return name.startsWith('box_cox') && lambda !== null ? { kind: 'box_cox', lambda } : null;
}

/** Levels are not part of how a row is read: one that is not known is told with its row. */
function planOf(variable: Recorded['variables'][number]): VariablePlan {
  const [no, yes] = variable.values ?? [];
  return {
    name: variable.name,
    type: variable.type,
    column: variable.column,
    unit: null,
    label: null,
    atLeast: variable.at_least,
    atMost: variable.at_most,
    levels: null,
    baseline: null,
    flagValues: no === undefined || yes === undefined ? null : [no, yes],
    pattern: variable.pattern,
    missing: variable.missing,
  };
}

function derivationOf(
  name: string,
  text: string,
  type: DerivationPlan['type'],
  types: ReadonlyMap<string, ValueType>,
): DerivationPlan | null {
  const parsed = parseExpression(text);
  if (!('expression' in parsed)) return null;
  const checked = checkExpression(parsed.expression, (each) => types.get(each) ?? null, [...types.keys()]);
  if (checked.faults.length > 0 || checked.type !== type) return null;
  return { name, expression: parsed.expression, text, unit: null, label: null, type };
}

function valueType(type: VariablePlan['type']): ValueType {
  if (type === 'integer') return 'number';
  return type === 'identifier' ? 'text' : type;
}

/** A piece whose variable is there and of the kind that it needs; null where it is not. */
function pieceOf(
  piece: RecordModel['columns'][number]['pieces'][number],
  types: ReadonlyMap<string, ValueType>,
): Piece | null {
  const { kind, variable, level, to, at, side, knots, index } = piece;
  const type = types.get(variable);
  if (type === undefined || type === 'text' || (type === 'category') !== (kind === 'level')) return null;
  switch (kind) {
    case 'variable':
      return { kind, variable };
    case 'level':
      return level === undefined ? null : { kind, variable, level };
    case 'power':
      return to === undefined ? null : { kind, variable, to };
    case 'bend':
      return at === undefined || side === undefined ? null : { kind, variable, at, side };
    case 'spline':
      if (knots === undefined || knots.length < 3 || index === undefined) return null;
      return index >= 1 && index <= knots.length - 2 ? { kind, variable, knots, index } : null;
  }
}
