import { checkFits } from '../engine/check-fits.ts';
import { checkMagnitudes } from '../engine/check-magnitudes.ts';
import { checkHypotheses } from '../examine/check-hypotheses.ts';
import { buildDesign } from '../model/build-design.ts';
import { spreadsOf } from '../prepare/spread.ts';
import { hasError, type Problem, type Report } from '../problem.ts';
import { buildRecord } from '../record/build-record.ts';
import { type KeptSample, keepSample } from '../record/keep-sample.ts';
import type { StudyRecord } from '../record/record.ts';
import { residualColumns } from '../record/residual-columns.ts';
import type { ResidualColumns } from '../record/tables.ts';
import { checkEstimating } from '../select/check-estimating.ts';
import { choose } from '../select/choose.ts';
import { validateCandidates } from '../select/validate-candidates.ts';
import { type ReadStudy, type RunOptions, readStudyAndData } from './read-study-and-data.ts';
import { sampleOf } from './run-sample.ts';
import {
  averageAhead,
  bootstrapAll,
  examineChosen,
  factorGround,
  fitGround,
  groundOf,
  predictAll,
  questionAll,
  searchAll,
  splitGround,
  tryHeldOut,
} from './stages.ts';

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
