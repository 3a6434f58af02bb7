import { fileURLToPath } from 'node:url';
import type { Problem, SourcePlace } from '../../src/problem.ts';
import type { AdmitPlan, SelectionPlan, Study } from '../../src/study/study.ts';

export type SelectionChange = Partial<Omit<SelectionPlan, 'admit'>> & { readonly admit?: Partial<AdmitPlan> };

export const NO_RULES: AdmitPlan = {
  vif: null,
  pValue: null,
  signs: new Map(),
  rowsPerCoefficient: null,
  adjustedRSquared: null,
};

/** A study with this selection and, beside it, the least that the type asks for. */
export function studyWith(change: SelectionChange): Study {
  return {
    file: 'study.yaml',
    folder: fileURLToPath(new URL('.', import.meta.url)),
    sha256: '',
    title: 'A study',
    question: null,
    data: {
      file: 'data.csv',
      format: { delimiter: null, decimalMark: '.', encoding: null },
      missing: [],
      rowId: null,
      time: null,
      variables: [],
      onBadValue: 'stop',
    },
    derive: [],
    leaveOut: [],
    response: { variable: 'y', scale: { kind: 'natural' } },
    weights: null,
    candidates: [],
    families: [],
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
      ...change,
      admit: { ...NO_RULES, ...change.admit },
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
    predict: { rows: [], file: null, interval: 0.9, total: false },
    acceptance: [],
    report: {
      formats: [],
      templates: { html: null, markdown: null, comparison: { html: null, markdown: null } },
      keepSample: true,
      caution: null,
    },
    parameters: [],
    settings: [],
    placeOf: place,
    keyPlaceOf: place,
  };
}

/** Collects what is reported. */
export function collector(): { readonly problems: Problem[]; readonly report: (problem: Problem) => void } {
  const problems: Problem[] = [];
  return { problems, report: (problem) => problems.push(problem) };
}

/** The path's last step gives the line, so that a test can tell places apart. */
function place(path: readonly (string | number)[]): SourcePlace {
  return {
    kind: 'source',
    file: 'study.yaml',
    line: path.length,
    column: 1,
    length: String(path.at(-1)).length,
  };
}
