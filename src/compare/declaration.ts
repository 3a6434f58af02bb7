import { parseExpression } from '../expression/parse-expression.ts';
import type { DesignColumn, Piece } from '../model/design.ts';
import { baseVariables } from '../prepare/derive.ts';
import type { RecordModel, StudyRecord } from '../record/record.ts';
import type { DerivationPlan, Scale, StandardErrorsPlan } from '../study/study.ts';

/** What a record tells of how its study turns rows into what is fitted. */
export interface Declaration {
  readonly derive: readonly DerivationPlan[];
  readonly weights: string | null;
  readonly time: string | null;
  readonly standardErrors: StandardErrorsPlan;
}

/** A model as it was declared and expanded, so that it can be fitted to other rows. */
export interface ModelDefinition {
  readonly name: string;
  readonly response: { readonly variable: string; readonly scale: Scale };
  readonly intercept: boolean;
  /** Without the intercept. */
  readonly columns: readonly DesignColumn[];
  /** By category: the level that the others are compared with. */
  readonly baselines: ReadonlyMap<string, string>;
}

export function declarationOf(record: StudyRecord): Declaration {
  const usedAs = (use: string) =>
    record.data.variables.find((variable) => variable.used_as.includes(use))?.name ?? null;
  const derive = record.data.variables.flatMap((variable): DerivationPlan[] => {
    if (variable.derived_from === null) return [];
    const parsed = parseExpression(variable.derived_from);
    if ('fault' in parsed) return [];
    const type = variable.type === 'flag' || variable.type === 'date' ? variable.type : 'number';
    return [
      {
        name: variable.name,
        expression: parsed.expression,
        text: variable.derived_from,
        unit: variable.unit,
        label: variable.label,
        type,
      },
    ];
  });
  return {
    derive,
    weights: usedAs('weights'),
    time: usedAs('time order'),
    standardErrors: standardErrorsOf(settingOf(record, 'inference.standard_errors')),
  };
}

/** The value in force of a setting; null where the record does not know it. */
export function settingOf(record: StudyRecord, key: string): string | null {
  return record.study.settings.find((setting) => setting.key === key)?.value ?? null;
}

const HETEROSCEDASTIC = ['hc0', 'hc1', 'hc2', 'hc3', 'hc4'] as const;

/** From the setting's text: "classical", "hc3", "clustered_by vessel", "hac_lags 4", "hac_lags auto". */
function standardErrorsOf(text: string | null): StandardErrorsPlan {
  const [kind, ...rest] = (text ?? 'classical').split(' ');
  const named = HETEROSCEDASTIC.find((each) => each === kind);
  if (named !== undefined) return { kind: named };
  const value = rest.join(' ');
  if (kind === 'clustered_by') {
    return { kind: 'clustered', by: value.startsWith('"') ? (JSON.parse(value) as string) : value };
  }
  if (kind === 'hac_lags') return { kind: 'hac', lags: value === 'auto' ? 'auto' : Number(value) };
  return { kind: 'classical' };
}

/** The chosen model of a record as one that can be fitted again; null where none was chosen. */
export function definitionOf(record: StudyRecord): ModelDefinition | null {
  const { model } = record;
  if (model === null) return null;
  const columns = model.columns
    .filter((column) => column.pieces.length > 0)
    .map(({ name, unit, pieces }) => ({ name, unit, pieces: pieces as readonly Piece[] }));
  return {
    name: model.candidate,
    response: { variable: model.response.variable, scale: scaleOf(model.response) },
    intercept: model.intercept,
    columns,
    baselines: baselinesOf(record, columns),
  };
}

function scaleOf({ scale, lambda }: RecordModel['response']): Scale {
  for (const kind of ['log', 'sqrt', 'reciprocal'] as const) if (scale === kind) return { kind };
  return scale.startsWith('box_cox') ? { kind: 'box_cox', lambda: lambda ?? 1 } : { kind: 'natural' };
}

/** The first level with a row, in the record's order, which begins with the declared baseline. */
function baselinesOf(record: StudyRecord, columns: readonly DesignColumn[]): Map<string, string> {
  const baselines = new Map<string, string>();
  for (const variable of categoriesOf(columns)) {
    const levels = record.data.variables.find(({ name }) => name === variable)?.levels ?? [];
    const first = levels.find(({ rows }) => rows > 0);
    if (first !== undefined) baselines.set(variable, first.level);
  }
  return baselines;
}

/** The categories that levels of a design belong to. */
export function categoriesOf(columns: readonly DesignColumn[]): string[] {
  const names = columns.flatMap(({ pieces }) =>
    pieces.flatMap((piece) => (piece.kind === 'level' ? [piece.variable] : [])),
  );
  return [...new Set(names)];
}

/** The variables that a model reads, its response and weights among them, derived ones as they are. */
export function variablesOf(definition: ModelDefinition, declaration: Declaration): string[] {
  return [
    ...new Set([
      definition.response.variable,
      ...definition.columns.flatMap(({ pieces }) => pieces.map(({ variable }) => variable)),
      ...(declaration.weights === null ? [] : [declaration.weights]),
    ]),
  ];
}

/** Whether a model reads the same under two declarations: the weights, and every derived variable under it. */
export function readsAlike(definition: ModelDefinition, a: Declaration, b: Declaration): boolean {
  if (a.weights !== b.weights) return false;
  const derivations = (declaration: Declaration) =>
    variablesOf(definition, declaration).map((name) => {
      const bases = baseVariables(name, declaration.derive);
      const texts = declaration.derive
        .filter((plan) => reads(name, plan.name, declaration.derive))
        .map((plan) => `${plan.name}=${plan.text}`);
      return [...bases, ...texts].sort().join('\n');
    });
  return JSON.stringify(derivations(a)) === JSON.stringify(derivations(b));
}

/** Whether `name` is or rests on the derived variable `derived`: taking that one away changes what it rests on. */
function reads(name: string, derived: string, derive: readonly DerivationPlan[]): boolean {
  if (name === derived) return true;
  const without = derive.filter((plan) => plan.name !== derived);
  return baseVariables(name, without).has(derived);
}

/** Whether two definitions are of one model: the same response, columns and baselines. */
export function sameModel(a: ModelDefinition, b: ModelDefinition): boolean {
  const text = ({ response, intercept, columns, baselines }: ModelDefinition) =>
    JSON.stringify([
      response,
      intercept,
      columns.map(({ pieces }) => JSON.stringify(pieces)).sort(),
      [...baselines].sort(),
    ]);
  return text(a) === text(b);
}
