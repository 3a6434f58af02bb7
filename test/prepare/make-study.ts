import type { Column, Table } from '../../src/data/table.ts';
import { checkExpression } from '../../src/expression/check-expression.ts';
import type { ValueType } from '../../src/expression/expression.ts';
import type { Problem } from '../../src/problem.ts';
import type { CandidatePlan, Scale, Study, TermPlan, VariablePlan } from '../../src/study/study.ts';
import { byName, expressionOf } from './columns.ts';

export interface Written {
  readonly derive?: Readonly<Record<string, string>>;
  /** [where, because]. */
  readonly leaveOut?: readonly (readonly [string, string])[];
  readonly response: string;
  readonly weights?: string;
  readonly time?: string;
  readonly rowId?: string;
  readonly candidates: readonly { readonly terms: readonly (string | TermPlan)[]; readonly scale?: Scale }[];
}

/** A study whose declared variables are the columns given, in their order. */
export function makeStudy(columns: readonly Column[], written: Written): Study {
  const types = new Map<string, ValueType>(columns.map((column) => [column.name, column.kind]));
  const place = { kind: 'source', file: 'study.yaml', line: 1, column: 1, length: 1 } as const;
  const derive = Object.entries(written.derive ?? {}).map(([name, text]) => {
    const expression = expressionOf(text);
    const { type, faults } = checkExpression(expression, (used) => types.get(used) ?? null, []);
    if (faults.length > 0 || (type !== 'number' && type !== 'flag' && type !== 'date')) {
      throw new Error(`${text}: ${faults[0]?.message ?? type}`);
    }
    types.set(name, type);
    return { name, expression, text, unit: null, label: null, type };
  });
  const natural: Scale = { kind: 'natural' };
  return {
    file: 'study.yaml',
    folder: '.',
    sha256: '',
    title: 'A test',
    question: null,
    data: {
      file: 'data.csv',
      format: { delimiter: null, decimalMark: '.', encoding: null },
      missing: [''],
      rowId: written.rowId ?? null,
      time: written.time ?? null,
      variables: columns.map((column) => variablePlan(column)),
      onBadValue: 'leave_out_row',
    },
    derive,
    leaveOut: (written.leaveOut ?? []).map(([text, because]) => ({
      where: expressionOf(text),
      text,
      because,
    })),
    response: { variable: written.response, scale: natural },
    weights: written.weights ?? null,
    families: [],
    candidates: written.candidates.map(
      (candidate, index): CandidatePlan => ({
        name: `Candidate ${index + 1}`,
        terms: candidate.terms.map((term) =>
          typeof term === 'string' ? { kind: 'variable', variable: term } : term,
        ),
        scale: candidate.scale ?? natural,
        intercept: true,
      }),
    ),
    selection: {
      rankBy: 'aicc',
      preferSmallerWithin: 0,
      significance: 0.05,
      oneStandardError: false,
      validation: null,
      honestError: null,
      holdOut: null,
      splitSample: null,
      stability: null,
      average: false,
      admit: {
        vif: null,
        pValue: null,
        signs: new Map(),
        rowsPerCoefficient: null,
        adjustedRSquared: null,
      },
    },
    inference: {
      confidence: 0.95,
      dependentColumns: 'drop',
      standardErrors: { kind: 'classical' },
      hypotheses: [],
      levelComparisons: 'holm',
      simultaneous: 'none',
      slopesAt: new Map(),
    },
    examination: { lags: null, splitAt: null, bootstrap: null },
    predict: { rows: [], file: null, interval: 0.95, total: false },
    acceptance: [],
    report: {
      formats: [],
      templates: { html: null, markdown: null, comparison: { html: null, markdown: null } },
      keepSample: true,
      caution: null,
    },
    parameters: [],
    settings: [],
    placeOf: () => place,
    keyPlaceOf: () => place,
  };
}

function variablePlan(column: Column): VariablePlan {
  return {
    name: column.name,
    type: column.kind,
    column: column.name,
    unit: null,
    label: null,
    atLeast: null,
    atMost: null,
    levels: null,
    baseline: null,
    flagValues: null,
    pattern: null,
    missing: [],
  };
}

/** A table of the columns; row i is on line i + 2, below the header. */
export function makeTable(columns: readonly Column[], badRows: readonly number[] | null = null): Table {
  const [first] = columns;
  const rowCount =
    first === undefined ? 0 : first.kind === 'category' ? first.codes.length : first.values.length;
  return {
    file: 'data.csv',
    sha256: '',
    rowCount,
    columns: byName(columns),
    lines: Uint32Array.from({ length: rowCount }, (_, row) => row + 2),
    ignored: [],
    badValues: [],
    badValueCount: badRows?.length ?? 0,
    badRows: badRows && Uint8Array.from({ length: rowCount }, (_, row) => (badRows.includes(row) ? 1 : 0)),
    summaries: [],
    format: { delimiter: ',', encoding: 'utf-8' },
  };
}

/** A place to report to. */
export function gatherer(): { readonly problems: Problem[]; readonly report: (problem: Problem) => void } {
  const problems: Problem[] = [];
  return { problems, report: (problem) => problems.push(problem) };
}
