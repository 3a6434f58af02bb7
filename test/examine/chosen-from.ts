/** A chosen model from plain columns, by the way that a run takes: sample, design, fits, rows. */
import type { Column } from '../../src/data/table.ts';
import { type FittedAll, fitAll } from '../../src/engine/fit-all.ts';
import { refineFit } from '../../src/engine/refine.ts';
import { type Chosen, examineRows } from '../../src/examine/chosen.ts';
import type { Finding } from '../../src/examine/diagnostic.ts';
import { examine } from '../../src/examine/examine.ts';
import { buildDesign } from '../../src/model/build-design.ts';
import type { Design } from '../../src/model/design.ts';
import { type DesignRows, designRows, numbersOf } from '../../src/model/design-rows.ts';
import { toScale } from '../../src/model/response-scale.ts';
import { prepareSample } from '../../src/prepare/prepare-sample.ts';
import { spreadsOf } from '../../src/prepare/spread.ts';
import type { ExaminationPlan, Study } from '../../src/study/study.ts';
import { numbers } from '../prepare/columns.ts';
import { makeStudy, makeTable, type Written } from '../prepare/make-study.ts';

export interface Fitted {
  readonly chosen: Chosen;
  readonly study: Study;
  readonly design: Design;
  readonly rows: DesignRows;
  readonly fitted: FittedAll;
}

export interface Wanted extends Omit<Written, 'response' | 'candidates'> {
  readonly terms: Written['candidates'][number]['terms'];
  /** Candidates beside the one examined, which is the first. */
  readonly others?: Written['candidates'];
  readonly scale?: NonNullable<Written['candidates'][number]['scale']>;
  readonly intercept?: boolean;
  readonly examination?: Partial<ExaminationPlan>;
  readonly change?: (study: Study) => Study;
}

/** Fits "y" to the terms and examines the rows of the first candidate, or of the one asked for. */
export function chosenFrom(columns: readonly Column[], wanted: Wanted, index = 0): Fitted {
  const {
    terms,
    others = [],
    scale,
    examination,
    intercept = true,
    change = (same) => same,
    ...rest
  } = wanted;
  const written = makeStudy(columns, {
    ...rest,
    response: 'y',
    candidates: [{ terms, ...(scale === undefined ? {} : { scale }) }, ...others],
  });
  const study = change({
    ...written,
    candidates: written.candidates.map((candidate) => ({ ...candidate, intercept })),
    examination: { ...written.examination, ...examination },
  });
  const fault = (problem: { severity: string; message: string }) => {
    if (problem.severity === 'error') throw new Error(problem.message);
  };
  const sample = prepareSample(study, makeTable(columns), fault)!;
  const design = buildDesign(study, sample, fault)!;
  const own = numbersOf(sample, 'y');
  const responses = design.responses.map((plan) => own.map((y) => toScale(y, plan.scale)));
  const rows = designRows(design.columns, sample, responses, study.weights);
  const fitted = fitAll(design, rows, own, { pressRanks: true });
  const fit = refineFit(fitted.fits[index]!, rows, fitted.facts);
  const chosen = examineRows(study, sample, spreadsOf(sample), design.columns, fit, rows);
  return { chosen, study, design, rows, fitted };
}

/** Columns of numbers by name. */
export function numberColumns(data: Readonly<Record<string, readonly number[]>>): Column[] {
  return Object.entries(data).map(([name, values]) => numbers(name, values));
}

export function findingNamed(chosen: Chosen, name: string): Finding {
  const found = examine(chosen).find((finding) => finding.name === name);
  if (found === undefined) throw new Error(`There is no finding ${name}.`);
  return found;
}
