import { readTable } from './data/read-table.ts';
import type { Table } from './data/table.ts';
import { candidateCovariances } from './engine/candidate-covariances.ts';
import { checkFits } from './engine/check-fits.ts';
import { checkMagnitudes } from './engine/check-magnitudes.ts';
import { checkStandardErrors } from './engine/check-standard-errors.ts';
import { type Factored, type FittedAll, factorAll, fitAll } from './engine/fit-all.ts';
import { refineFit } from './engine/refine.ts';
import { bootstrap } from './examine/bootstrap.ts';
import { checkFindingNames } from './examine/check-finding-names.ts';
import { checkHypotheses } from './examine/check-hypotheses.ts';
import { type Chosen, examineRows } from './examine/chosen.ts';
import { buildDesign } from './model/build-design.ts';
import type { Design } from './model/design.ts';
import { type DesignRows, designRows, numbersOf } from './model/design-rows.ts';
import { toScale } from './model/response-scale.ts';
import { wholeNumber } from './numerals.ts';
import { type AveragedPrediction, averagePredictions } from './predict/average-predictions.ts';
import { bootstrapPredictions } from './predict/bootstrap-predictions.ts';
import { tryHoldOut } from './predict/hold-out.ts';
import { type Predicted, type PredictionRows, predict, smearingResiduals } from './predict/predict.ts';
import { fileRows, statedRows } from './predict/prediction-rows.ts';
import { prepareSample } from './prepare/prepare-sample.ts';
import { type LevelRows, rowsByLevel, tableOfRows } from './prepare/rows-of-level.ts';
import type { Sample } from './prepare/sample.ts';
import { splitSample } from './prepare/set-aside.ts';
import { type Spread, spreadsOf } from './prepare/spread.ts';
import { subSample } from './prepare/sub-sample.ts';
import type { Problem, Report } from './problem.ts';
import { buildRecord, type Run } from './record/build-record.ts';
import type { Bootstrapped } from './record/describe-bootstrap.ts';
import type { SelectionFindings } from './record/describe-selection.ts';
import { type KeptSample, keepSample } from './record/keep-sample.ts';
import type { StudyRecord } from './record/record.ts';
import { residualColumns } from './record/residual-columns.ts';
import type { ResidualColumns } from './record/tables.ts';
import { checkEstimating } from './select/check-estimating.ts';
import type { Choice } from './select/choose.ts';
import { choose } from './select/choose.ts';
import type { Ground } from './select/material.ts';
import type { Search } from './select/procedure.ts';
import type { ChoiceTrust } from './select/question-choice.ts';
import type { FoundFamily } from './select/search-families.ts';
import { type Validated, validateCandidates } from './select/validate-candidates.ts';
import { readStudy } from './study/read-study.ts';
import type { Study } from './study/study.ts';

export interface RunOptions {
  /** Values for the study's parameters, by name, as text; the defaults where left out. */
  readonly parameters?: ReadonlyMap<string, string>;
  /** For a study that repeats for a variable: the level whose rows are run. */
  readonly level?: string;
  /** Told of long work: the stage in words, how much is done, and of how much where that is known. */
  readonly onProgress?: (stage: string, done: number, total: number | null) => void;
}

export interface CheckedStudy {
  readonly study: Study | null;
  readonly table: Table | null;
  readonly sample: Sample | null;
  /** False where the study itself kept its data from being looked at. */
  readonly dataRead: boolean;
  /** Everything found, in the order found. */
  readonly problems: readonly Problem[];
}

export interface RunResult {
  /** Null where an error stopped the run; the problems say which. */
  readonly record: StudyRecord | null;
  /** False where the study itself kept its data from being looked at. */
  readonly dataRead: boolean;
  readonly problems: readonly Problem[];
  /** Row figures of the chosen model, for a table; null where none was chosen. */
  readonly residuals: ResidualColumns | null;
  /** The rows used, to be kept beside the record; null where the study declines it or nothing was fitted. */
  readonly kept: KeptSample | null;
}

/** A study with its data, read once for all that is done with it. */
export interface ReadStudy {
  readonly study: Study | null;
  /** Null where it cannot be used. */
  readonly table: Table | null;
  /** False where the study itself kept its data from being looked at. */
  readonly dataRead: boolean;
  readonly problems: readonly Problem[];
  /** The rows of each level that the study repeats for; null where it does not repeat, or nothing was read. */
  readonly levels: readonly LevelRows[] | null;
}

/** Reads and checks a study and its data's contract. */
export async function readStudyAndData(path: string, options: RunOptions = {}): Promise<ReadStudy> {
  const problems: Problem[] = [];
  const report: Report = (problem) => problems.push(problem);
  const study = await readStudy(path, report, options.parameters);
  if (study === null || hasError(problems)) {
    return { study, table: null, dataRead: false, problems, levels: null };
  }
  const repeatFor = study.repeatFor ?? null;
  const table = await readTable(study.data, study.folder, report, {
    onProgress: (rows) => options.onProgress?.('reading rows', rows, null),
    // Each level lists and counts its own, which a list cut short does not tell.
    ...(repeatFor === null || study.data.onBadValue === 'stop' ? {} : { limit: Number.POSITIVE_INFINITY }),
  });
  checkFindingNames(study, report);
  const column = repeatFor === null ? undefined : table?.columns.get(repeatFor);
  const levels = column === undefined ? null : rowsByLevel(column);
  if (table !== null && levels !== null) reportWithoutLevel(study, table, levels, report);
  return { study, table, dataRead: true, problems, levels };
}

/** Rows that belong to no run, and that there is any run at all. */
function reportWithoutLevel(study: Study, table: Table, levels: readonly LevelRows[], report: Report): void {
  const without = levels.reduce((left, { rows }) => left - rows.length, table.rowCount);
  if (without === 0) return;
  const none = levels.length === 0;
  report({
    code: 'repeat_level_missing',
    severity: none ? 'error' : 'warning',
    place: { kind: 'cell', file: table.file, variable: study.repeatFor! },
    message: none
      ? `No row has a value of ${study.repeatFor}, which the study repeats for.`
      : `${wholeNumber(without)} ${without === 1 ? 'row has' : 'rows have'} no value of ${study.repeatFor}, which the study repeats for, and ${without === 1 ? 'belongs' : 'belong'} to no run.`,
  });
}

/** What one run works on: a study with all rows, or with those of one level. */
interface RunRows {
  readonly study: Study;
  readonly table: Table;
  readonly repeat: Run['repeat'];
}

/** The study and the rows of one run; null, with the reason reported, where the level is not there. */
function oneRun(
  { study, table, levels }: ReadStudy,
  level: string | undefined,
  report: Report,
): RunRows | null {
  if (study === null || table === null) return null;
  const variable = study.repeatFor ?? null;
  if (variable === null && level === undefined) return { study, table, repeat: null };
  const found = levels?.find((each) => each.level === level);
  if (variable === null || level === undefined || found === undefined) {
    report({
      code: 'repeat_level_unknown',
      severity: 'error',
      place: { kind: 'file', file: study.file },
      message:
        variable === null
          ? `The study does not repeat, so it has no run for "${level}".`
          : level === undefined
            ? `The study repeats for ${variable}, and no level was named.`
            : `No row has "${level}" as its ${variable}, which the study repeats for.`,
    });
    return null;
  }
  const rows = tableOfRows(study.data, table, found.rows, report);
  if (rows === null) return null;
  const label = study.data.variables.find(({ name }) => name === variable)?.label ?? variable;
  return {
    study: { ...study, title: `${study.title}: ${label} ${level}` },
    table: rows,
    repeat: { variable, level },
  };
}

/** Reads and checks a study and its data, down to the rows that would be fitted, and fits nothing. */
export async function checkStudy(path: string, options: RunOptions = {}): Promise<CheckedStudy> {
  const read = await readStudyAndData(path, options);
  const { study, table, dataRead } = read;
  const problems = [...read.problems];
  if (study === null || table === null) return { study, table, sample: null, dataRead, problems };
  if (read.levels !== null && options.level === undefined) {
    // Each run has its own rows: all are checked, and none of them stands for the study.
    for (const { level } of read.levels) problems.push(...ofLevel(level, sampleOf(read, level).problems));
    return { study, table, sample: null, dataRead, problems };
  }
  const made = sampleOf(read, options.level);
  return {
    study: made.ground?.study ?? study,
    table: made.ground?.table ?? table,
    sample: made.sample,
    dataRead,
    problems: [...problems, ...made.problems],
  };
}

/** Problems of one of many runs, each saying whose it is. */
export function ofLevel(level: string, problems: readonly Problem[]): Problem[] {
  return problems.map((problem) => ({ ...problem, message: `${level}: ${problem.message}` }));
}

function sampleOf(
  read: ReadStudy,
  level: string | undefined,
): { readonly ground: RunRows | null; readonly sample: Sample | null; readonly problems: Problem[] } {
  const problems: Problem[] = [];
  const report: Report = (problem) => problems.push(problem);
  const ground = oneRun(read, level, report);
  const sample = ground === null ? null : prepareSample(ground.study, ground.table, report);
  if (ground !== null && sample !== null) checkStandardErrors(ground.study, sample, report);
  return { ground, sample, problems };
}

/**
 * The whole study, stage by stage:
 *
 *     study file ─ data ─ sample ─ design ─ factor ─ search ─ fits ─ choice ─ examination ─ predictions ─ record
 *
 * Every candidate is fitted on the same rows; where an error is found the stages after it are left out.
 */
export async function runStudy(path: string, options: RunOptions = {}): Promise<RunResult> {
  return runRead(await readStudyAndData(path, options), options);
}

/** The stages after reading; of a study that repeats, for the rows of one level. */
export async function runRead(read: ReadStudy, options: RunOptions = {}): Promise<RunResult> {
  const { dataRead } = read;
  const problems = [...read.problems];
  const report: Report = (problem) => problems.push(problem);
  const stopped: () => RunResult = () => ({ record: null, dataRead, problems, residuals: null, kept: null });
  const { ground, sample, problems: found } = sampleOf(read, options.level);
  problems.push(...found);
  if (ground === null || sample === null || hasError(problems)) return stopped();
  const { study, table, repeat } = ground;

  const declared = buildDesign(study, sample, report);
  if (declared === null) return stopped();
  checkHypotheses(study, declared, report);
  const whole = groundOf(study, sample, declared);
  if (!checkMagnitudes(study, sample, declared, whole.rows, table.file, report)) return stopped();

  // All rows serve for choosing and for estimating, unless the study splits them.
  const split = splitGround(study, sample, declared, report);
  if (hasError(problems)) return stopped();

  // What a search of the families finds is a candidate like any other from there on.
  const factored = factorGround(split?.choosing ?? whole, options);
  const searched = await searchAll(study, split?.choosing ?? whole, factored, report, options);
  if (hasError(problems)) return stopped();
  const { design } = searched;
  const choosing = { ...(split?.choosing ?? whole), design };
  const estimating = { ...(split?.estimating ?? whole), design };

  const fits = fitGround(study, choosing, options, report, factored);
  checkFits(study, choosing.sample, design, fits.fits, report);
  if (hasError(problems)) return stopped();

  const validated = validateCandidates(
    study,
    { ...choosing, facts: fits.facts },
    fits,
    report,
    options.onProgress,
  );
  if (hasError(problems)) return stopped();
  const ranked = { ...fits, validation: validated?.validation };
  const choice = choose(study, ranked, report);
  if (hasError(problems)) return stopped();

  const trust = await questionAll(
    study,
    choosing,
    searched.search,
    ranked,
    choice,
    validated,
    report,
    options,
  );
  if (hasError(problems)) return stopped();

  const fitted = split === null ? ranked : fitGround(study, estimating, options, report);
  if (split !== null && choice.chosen !== null) checkEstimating(study, fitted.fits[choice.chosen]!, report);
  if (hasError(problems)) return stopped();
  const { rows } = estimating;
  const spreads = spreadsOf(estimating.sample);
  const chosen =
    choice.chosen === null
      ? null
      : examineChosen(study, estimating.sample, spreads, design, rows, fitted, choice.chosen);
  const ahead = chosen === null ? null : await predictAll(chosen, report);
  if (hasError(problems)) return stopped();
  const bootstrapped = chosen === null ? null : bootstrapAll(chosen, ahead!.sources, options);

  const kept = study.report.keepSample ? await keepSample(study, sample) : null;
  const record = buildRecord({
    study,
    table,
    sample,
    repeat,
    spreads: split === null ? spreads : spreadsOf(sample),
    design,
    rows,
    fitted,
    ranked,
    choice,
    families: searched.families,
    findings: {
      validated,
      trust,
      averagedPredictions: averageAhead(chosen, ranked, trust, report),
      holdOut: tryHeldOut(chosen, sample),
      split:
        split === null
          ? null
          : { choosing: split.choosing.rows.rowCount, estimating: split.estimating.rows.rowCount },
    },
    chosen,
    predicted: ahead?.predicted ?? null,
    bootstrapped,
    kept,
    problems,
  });
  return { record, dataRead, problems, residuals: chosen === null ? null : residualColumns(chosen), kept };
}

/** Rows that something is done with: all of the sample, or a part of it. */
type Part = Omit<Ground, 'folds' | 'facts'>;

function groundOf(study: Study, sample: Sample, design: Design): Part {
  const own = numbersOf(sample, study.response.variable);
  return { sample, design, own, rows: rowsOf(study, sample, design, own) };
}

/** The part that the choice is made on and the one that the chosen model is estimated from; null where all rows serve for both. */
function splitGround(
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

function factorGround({ design, rows, own }: Part, options: RunOptions): Factored {
  return factorAll(design, rows, own, (done, total) =>
    options.onProgress?.('fitting candidates', done, total),
  );
}

interface Searched {
  /** The declared design with the models found among its candidates. */
  readonly design: Design;
  readonly families: readonly FoundFamily[];
  /** Makes the searches again on other rows; null without families. */
  readonly search: Search | null;
}

/** Searches the families that the study declares. */
async function searchAll(
  study: Study,
  { design, rows, sample }: Part,
  factored: Factored,
  report: Report,
  options: RunOptions,
): Promise<Searched> {
  if (design.families.length === 0) return { design, families: [], search: null };
  const { candidatesFrom, searchFamilies } = await import('./select/search-families.ts');
  const { checkFamilies } = await import('./select/check-families.ts');
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

function fitGround(
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
async function questionAll(
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
  const { questionChoice } = await import('./select/question-choice.ts');
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
function tryHeldOut(chosen: Chosen | null, sample: Sample): SelectionFindings['holdOut'] {
  const { heldOut } = sample;
  if (heldOut === undefined) return null;
  return {
    rows: heldOut.rowCount,
    trial: chosen === null ? null : tryHoldOut(chosen, heldOut, smearingResiduals(chosen)),
  };
}

/** The rows stated in the study, predicted by all admitted candidates together where it asks for that. */
function averageAhead(
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
function examineChosen(
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
async function predictAll(
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
function bootstrapAll(
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

function hasError(problems: readonly Problem[]): boolean {
  return problems.some((problem) => problem.severity === 'error');
}
