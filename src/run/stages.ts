import { candidateCovariances } from '../engine/candidate-covariances.ts';
import { type Factored, type FittedAll, factorAll, fitAll } from '../engine/fit-all.ts';
import { refineFit } from '../engine/refine.ts';
import { bootstrap } from '../examine/bootstrap.ts';
import { type Chosen, examineRows } from '../examine/chosen.ts';
import type { Design } from '../model/design.ts';
import { type DesignRows, designRows, numbersOf } from '../model/design-rows.ts';
import { toScale } from '../model/response-scale.ts';
import { type AveragedPrediction, averagePredictions } from '../predict/average-predictions.ts';
import { bootstrapPredictions } from '../predict/bootstrap-predictions.ts';
import { tryHoldOut } from '../predict/hold-out.ts';
import { type Predicted, type PredictionRows, predict, smearingResiduals } from '../predict/predict.ts';
import { fileRows, statedRows } from '../predict/prediction-rows.ts';
import type { Sample } from '../prepare/sample.ts';
import { splitSample } from '../prepare/set-aside.ts';
import type { Spread } from '../prepare/spread.ts';
import { subSample } from '../prepare/sub-sample.ts';
import type { Report } from '../problem.ts';
import type { Bootstrapped } from '../record/describe-bootstrap.ts';
import type { SelectionFindings } from '../record/describe-selection.ts';
import type { Choice } from '../select/choose.ts';
import type { Ground } from '../select/material.ts';
import type { Search } from '../select/procedure.ts';
import type { ChoiceTrust } from '../select/question-choice.ts';
import type { FoundFamily } from '../select/search-families.ts';
import type { Validated } from '../select/validate-candidates.ts';
import type { Study } from '../study/study.ts';
import type { RunOptions } from './read-study-and-data.ts';

/** Rows that something is done with: all of the sample, or a part of it. */
export type Part = Omit<Ground, 'folds' | 'facts'>;

export function groundOf(study: Study, sample: Sample, design: Design): Part {
  const own = numbersOf(sample, study.response.variable);
  return { sample, design, own, rows: rowsOf(study, sample, design, own) };
}

/** The part that the choice is made on and the one that the chosen model is estimated from; null where all rows serve for both. */
export function splitGround(
  study: Study,
  sample: Sample,
  design: Design,
  report: Report,
): { readonly choosing: Part; readonly estimating: Part } | null {
  const plan = study.selection.splitSample;
  const parts = plan === null ? null : splitSample(plan, study, sample, report);
  if (parts === null) return null;
  return {
    choosing: groundOf(study, subSample(sample, parts.choosing), design),
    estimating: groundOf(study, subSample(sample, parts.estimating), design),
  };
}

export function factorGround({ design, rows, own }: Part, options: RunOptions): Factored {
  return factorAll(design, rows, own, (done, total) =>
    options.onProgress?.('fitting candidates', done, total),
  );
}

export interface Searched {
  /** The declared design with the models found among its candidates. */
  readonly design: Design;
  readonly families: readonly FoundFamily[];
  /** Makes the searches again on other rows; null without families. */
  readonly search: Search | null;
}

/** Searches the families that the study declares. */
export async function searchAll(
  study: Study,
  { design, rows, sample }: Part,
  factored: Factored,
  report: Report,
  options: RunOptions,
): Promise<Searched> {
  if (design.families.length === 0) return { design, families: [], search: null };
  const { candidatesFrom, searchFamilies } = await import('../select/search-families.ts');
  const { checkFamilies } = await import('../select/check-families.ts');
  const ground = { ...factored, sample: () => ({ rows, sample }) };
  const found = searchFamilies(study, design, ground, {
    everySize: true,
    onProgress: (name, visited) => options.onProgress?.(`searching ${name}`, visited, null),
  });
  checkFamilies(study, design, ground, found, report);
  return {
    design: { ...design, candidates: [...design.candidates, ...found.candidates] },
    families: found.families,
    search: (material) => candidatesFrom(study, design, material),
  };
}

export function fitGround(
  study: Study,
  { sample, design, rows, own }: Part,
  options: RunOptions,
  report: Report,
  factored?: Factored,
) {
  const fits = fitAll(
    design,
    rows,
    own,
    {
      pressRanks: study.selection.rankBy === 'press',
      onProgress: (done, total) => options.onProgress?.('fitting candidates', done, total),
    },
    factored,
  );
  return { ...fits, covariances: candidateCovariances(study, sample, fits.fits, rows, report) };
}

/** Makes the choice again from other rows where the study asks how far it can be trusted. */
export async function questionAll(
  study: Study,
  part: Part,
  search: Search | null,
  fitted: FittedAll,
  choice: Choice,
  validated: Validated | null,
  report: Report,
  options: RunOptions,
): Promise<ChoiceTrust | null> {
  const { honestError, stability, average } = study.selection;
  if (honestError === null && stability === null && !average) return null;
  const { questionChoice } = await import('../select/question-choice.ts');
  const folds = study.selection.rankBy === 'cross_validation' ? (validated?.folds ?? null) : null;
  return questionChoice(
    study,
    { ...part, facts: fitted.facts, folds },
    fitted,
    choice,
    search,
    report,
    options.onProgress,
  );
}

/** The chosen model on the rows that were set aside, once. */
export function tryHeldOut(chosen: Chosen | null, sample: Sample): SelectionFindings['holdOut'] {
  const { heldOut } = sample;
  if (heldOut === undefined) return null;
  return {
    rows: heldOut.rowCount,
    trial: chosen === null ? null : tryHoldOut(chosen, heldOut, smearingResiduals(chosen)),
  };
}

/** The rows stated in the study, predicted by all admitted candidates together where it asks for that. */
export function averageAhead(
  chosen: Chosen | null,
  fitted: FittedAll,
  trust: ChoiceTrust | null,
  report: Report,
): AveragedPrediction[] {
  if (chosen === null || trust?.averaged == null) return [];
  return averagePredictions(chosen, fitted, trust.averaged, report);
}

function rowsOf(study: Study, sample: Sample, design: Design, own: Float64Array): DesignRows {
  const responses = design.responses.map(({ scale }) =>
    scale.kind === 'natural' ? own : own.map((y) => toScale(y, scale)),
  );
  return designRows(design.columns, sample, responses, study.weights);
}

/** The chosen model is refined whatever it costs; the record shows the refined figures. */
export function examineChosen(
  study: Study,
  sample: Sample,
  spreads: ReadonlyMap<string, Spread>,
  design: Design,
  rows: DesignRows,
  fitted: FittedAll,
  index: number,
): Chosen {
  const fit = refineFit(fitted.fits[index]!, rows, fitted.facts);
  return examineRows(study, sample, spreads, design.columns, fit, rows);
}

/** Rows stated in the study, then those of its file. */
export async function predictAll(
  chosen: Chosen,
  report: Report,
): Promise<{ predicted: Predicted; sources: readonly PredictionRows[] }> {
  const smearing = smearingResiduals(chosen);
  const stated = statedRows(chosen, report);
  const fromFile = await fileRows(chosen, report);
  const sources = fromFile === null ? [stated] : [stated, fromFile];
  return { predicted: predict(chosen, sources, smearing, report), sources };
}

/** Draws the rows again and again where the study asks for it. */
export function bootstrapAll(
  chosen: Chosen,
  sources: readonly PredictionRows[],
  options: RunOptions,
): Bootstrapped | null {
  const plan = chosen.study.examination.bootstrap;
  if (plan === null) return null;
  const draws = bootstrap(chosen, plan, (done, total) =>
    options.onProgress?.('drawing rows again', done, total),
  );
  return draws === null ? null : { draws, predictions: bootstrapPredictions(chosen, sources, draws) };
}
