import { basename, dirname, join, resolve } from 'node:path';
import type { ComparedSide } from '../compare/compare.ts';
import type { Comparison } from '../compare/comparison.ts';
import { hasError, type Problem, type Report } from '../problem.ts';
import type { StudyRecord } from '../record/record.ts';
import { recordPieces } from '../record/record-text.ts';
import { candidatesTable, coefficientsTable, predictionsTable, residualsTable } from '../record/tables.ts';
import { RESULT_FILES, type ResultFile, writeResults } from '../record/write-results.ts';
import { templateNames } from '../report/template-names.ts';
import type { ReadStudy, RunOptions } from '../run/read-study-and-data.ts';
import { type RunResult, runRead } from '../run/run-study.ts';
import { DONE, NOT_ACCEPTED, UNUSABLE } from './exit-status.ts';
import { reportFiles, templatesIn } from './report-files.ts';

/** What came of one study. */
export interface FittedStudy {
  /** The study file as it was named. */
  readonly path: string;
  readonly problems: readonly Problem[];
  readonly dataRead: boolean;
  /** Where templates lie, by the names under which problems know them. */
  readonly templates: ReadonlyMap<string, string>;
  /** Null where nothing was written. */
  readonly written: Written | null;
  /** What is different from an earlier record; null where none was given. */
  readonly comparison: Comparison | null;
}

export interface FitOptions extends RunOptions {
  /** An earlier record to compare with; what is different is written together with the rest. */
  readonly earlier?: ComparedSide | null;
}

export interface Written {
  readonly record: StudyRecord;
  readonly out: string;
  /** Files in the output folder. */
  readonly names: readonly string[];
}

/**
 * Runs a study that is read already, down to record, reports and tables in the output folder; of one that repeats, for
 * the level that the options name.
 */
export async function fitRead(
  path: string,
  read: ReadStudy,
  out: string,
  options: FitOptions,
): Promise<FittedStudy> {
  const problems: Problem[] = [];
  const report = (problem: Problem) => problems.push(problem);
  const result = await runRead(read, options);
  problems.push(...result.problems);
  const { dataRead } = result;
  if (result.record === null || hasError(problems)) {
    return { path, problems, dataRead, templates: new Map(), written: null, comparison: null };
  }
  const templates = templatePlaces(result.record, dirname(path));
  const comparison = options.earlier
    ? await compareWith(options.earlier, result.record, result, out, report)
    : null;
  const files = await resultFiles(result.record, result, comparison, dirname(path), report);
  if (comparison !== null) files.push(...(await filesOf(comparison, result.record, dirname(path), report)));
  let written: Written | null = null;
  if (!hasError(problems)) {
    options.onProgress?.('writing results', 0, null);
    const done = await writeResults(out, files, report, RESULT_FILES);
    if (done) written = { record: result.record, out, names: files.map((file) => file.name) };
  }
  return { path, problems, dataRead, templates, written, comparison };
}

/** 2 where nothing was written; 1 where no candidate was admitted or an acceptance criterion was missed; else 0. */
export function statusOf({ written, comparison }: FittedStudy): number {
  if (written === null) return UNUSABLE;
  const accepted =
    written.record.acceptance.every((criterion) => criterion.passed) &&
    (comparison?.acceptance ?? []).every((criterion) => criterion.passed !== false);
  return written.record.selection.chosen !== null && accepted ? DONE : NOT_ACCEPTED;
}

/** results/ and the study's name. */
export function defaultFolder(path: string): string {
  return join('results', studyName(path));
}

/** The name of a study: its file's, or its folder's where the file is called study.yaml. */
export function studyName(path: string): string {
  const name = basename(path).replace(/(?:\.study)?\.ya?ml$/i, '');
  return name === 'study' ? basename(dirname(resolve(path))) || name : name;
}

async function compareWith(
  earlier: ComparedSide,
  record: StudyRecord,
  { kept }: RunResult,
  out: string,
  report: Report,
): Promise<Comparison | null> {
  const { compareRecords } = await import('../compare/compare.ts');
  const later = { record, rows: kept?.rows ?? null, file: join(out, 'record.json') };
  return compareRecords(earlier, later, report);
}

async function filesOf(
  comparison: Comparison,
  record: StudyRecord,
  folder: string,
  report: Report,
): Promise<ResultFile[]> {
  const { COMPARISON_FORMATS, comparisonFiles } = await import('./comparison-files.ts');
  const templates = templatesIn(templateNames(record, 'comparison'), folder);
  return comparisonFiles(comparison, record, COMPARISON_FORMATS, templates, report);
}

async function resultFiles(
  record: StudyRecord,
  result: RunResult,
  comparison: Comparison | null,
  folder: string,
  report: (problem: Problem) => void,
): Promise<ResultFile[]> {
  const templates = templatesIn(templateNames(record, 'report'), folder);
  return [
    { name: 'record.json', content: recordPieces(record) },
    ...(await reportFiles(
      record,
      record.study.report.formats,
      templates,
      comparison?.acceptance ?? null,
      report,
    )),
    { name: 'tables/candidates.csv', content: candidatesTable(record) },
    { name: 'tables/coefficients.csv', content: coefficientsTable(record) },
    ...(result.residuals === null
      ? []
      : [{ name: 'tables/residuals.csv', content: residualsTable(result.residuals) }]),
    ...(result.kept === null ? [] : [{ name: result.kept.file, content: result.kept.content }]),
    ...(record.predictions.length === 0
      ? []
      : [{ name: 'tables/predictions.csv', content: predictionsTable(record) }]),
  ];
}

/** Where the templates that a study names lie, by the names under which problems know them. */
function templatePlaces(record: StudyRecord, folder: string): Map<string, string> {
  const names = (['report', 'comparison'] as const).flatMap((of) => Object.values(templateNames(record, of)));
  return new Map(names.flatMap((name) => (name === null ? [] : [[name, resolve(folder, name)]])));
}
