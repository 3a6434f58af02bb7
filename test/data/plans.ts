import type { DataPlan, VariablePlan, VariableType } from '../../src/study/study.ts';

/** A variable with every setting at its default. */
export function variable(
  name: string,
  type: VariableType = 'number',
  more: Partial<VariablePlan> = {},
): VariablePlan {
  return {
    name,
    type,
    column: name,
    unit: null,
    label: null,
    atLeast: null,
    atMost: null,
    levels: null,
    baseline: null,
    flagValues: null,
    pattern: null,
    missing: [],
    ...more,
  };
}

/** A plan with every setting at its default. */
export function plan(variables: readonly VariablePlan[], more: Partial<DataPlan> = {}): DataPlan {
  return {
    file: 'rows.csv',
    format: { delimiter: null, decimalMark: '.', encoding: null },
    missing: [''],
    rowId: null,
    time: null,
    variables,
    onBadValue: 'stop',
    ...more,
  };
}

export function numbersPlan(file: string, names: readonly string[]): DataPlan {
  return plan(
    names.map((name) => variable(name)),
    { file },
  );
}
