import { basename, dirname, join, relative, resolve } from 'node:path';
import type { ComparedSide } from '../compare/compare.ts';
import type { Comparison } from '../compare/comparison.ts';
import type { Problem, Report } from '../problem.ts';
import type { StudyRecord } from '../record/record.ts';
import { recordFaults } from '../record/record-faults.ts';
import { recordText } from '../record/record-text.ts';
import { candidatesTable, coefficientsTable, predictionsTable, residualsTable } from '../record/tables.ts';
import { RESULT_FILES, type ResultFile, writeResults } from '../record/write-results.ts';
import { type RunResult, runStudy } from '../run.ts';
import type { StudyOptions } from './common-options.ts';
import { DONE, NOT_ACCEPTED, UNUSABLE } from './exit-status.ts';
import { givenParameters } from './given-parameters.ts';
import { hasError } from './has-error.ts';
import { progressOn } from './progress.ts';
import { reportFiles, templatesOf } from './report-files.ts';
import { showDataNotRead, showProblems } from './show-problems.ts';
import { sourceTexts } from './source-texts.ts';
import { summary } from './summary.ts';
import type { Terminal } from './terminal.ts';

export interface FitCommandOptions extends StudyOptions {
  readonly out?: string;
  /** An earlier record, or the folder of its results, to compare with. */
  readonly against?: string;
}

/**
 * `plumbrule fit STUDY`: the whole study, down to record, reports and tables in the output folder; with an earlier
 * record also what is different from it, written together with the rest.
 */
export async function fitCommand(
  path: string,
  options: FitCommandOptions,
  terminal: Terminal,
): Promise<number> {
  const problems: Problem[] = [];
  const parameters = givenParameters(options.with ?? [], (problem) => problems.push(problem));
  if (hasError(problems)) {
    await showProblems(problems, new Map(), options.problems, terminal);
    return UNUSABLE;
  }
  const report: Report = (problem) => problems.push(problem);
  // The earlier record may lie where the new one is going to be written.
  const earlier = options.against === undefined ? null : await readEarlier(options.against, report);
  if (hasError(problems)) {
    await showProblems(problems, await sourceTexts(problems), options.problems, terminal);
    return UNUSABLE;
  }
  const progress = progressOn(terminal, options.quiet === true);
  let dataRead = false;
  let comparison: Comparison | null = null;
  let templates: ReadonlyMap<string, string> = new Map();
  let written: { readonly record: StudyRecord; readonly out: string; readonly names: string[] } | null = null;
  try {
    const result = await runStudy(path, { onProgress: progress.show, parameters });
    problems.push(...result.problems);
    dataRead = result.dataRead;
    if (result.record !== null && !hasError(problems)) {
      const out = options.out ?? defaultFolder(path);
      templates = templatePlaces(result.record, dirname(path));
      const files = await resultFiles(result.record, result, dirname(path), report);
      if (earlier !== null) {
        comparison = await compareWith(earlier, result.record, result, out, report);
        if (comparison !== null) files.push(...(await filesOf(comparison, result.record)));
      }
      if (!hasError(problems)) {
        progress.show('writing results', 0, null);
        const done = await writeResults(out, files, report, RESULT_FILES);
        if (done) written = { record: result.record, out, names: files.map((file) => file.name) };
      }
    }
  } finally {
    progress.clear();
  }

  await showProblems(problems, await sourceTexts(problems, templates), options.problems, terminal);
  if (!dataRead && options.quiet !== true && options.problems === 'text') showDataNotRead(problems, terminal);
  if (written === null) return UNUSABLE;
  if (options.quiet !== true && options.problems === 'text') {
    terminal.out(summary(written.record, places(written.out, written.names), terminal));
    if (comparison !== null) {
      const { comparisonSummary } = await import('./comparison-summary.ts');
      const shown = places(written.out, written.names).filter((place) => place.includes('comparison.'));
      terminal.out(`\n${comparisonSummary(comparison, written.record, shown, terminal)}`);
    }
  }
  return statusOf(written.record);
}

async function readEarlier(path: string, report: Report): Promise<ComparedSide | null> {
  const { readCompared } = await import('../compare/read-compared.ts');
  return readCompared(path, report);
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

async function filesOf(comparison: Comparison, record: StudyRecord): Promise<ResultFile[]> {
  const { comparisonFiles } = await import('./comparison-files.ts');
  return comparisonFiles(comparison, record);
}

async function resultFiles(
  record: StudyRecord,
  result: RunResult,
  folder: string,
  report: (problem: Problem) => void,
): Promise<ResultFile[]> {
  const faults = recordFaults(record);
  if (faults.length > 0)
    throw new Error(`The record is not as its schema says: ${faults.slice(0, 3).join(' ')}`);
  return [
    { name: 'record.json', content: recordText(record) },
    ...(await reportFiles(record, record.study.report.formats, templatesOf(record, folder), report)),
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
  const named = Object.values(record.study.report.templates).filter((name) => name !== null);
  return new Map(named.map((name) => [name, resolve(folder, name)]));
}

/** 0, or 1 where no candidate was admitted or an acceptance criterion was missed. */
export function statusOf(record: StudyRecord): number {
  const accepted = record.acceptance.every((criterion) => criterion.passed);
  return record.selection.chosen !== null && accepted ? DONE : NOT_ACCEPTED;
}

/** results/ and the study's name: its file's, or its folder's where the file is called study.yaml. */
export function defaultFolder(path: string): string {
  const name = basename(path).replace(/(?:\.study)?\.ya?ml$/i, '');
  return join('results', name === 'study' ? basename(dirname(resolve(path))) || name : name);
}

/** The reports first, for a reader; then the record and the tables' folder. Relative where that is shorter. */
function places(out: string, names: readonly string[]): string[] {
  const near = relative('.', out);
  const shown = near.startsWith('..') ? resolve(out) : near;
  const reports = names
    .filter((name) => /^(?:report|comparison)\./.test(name) && !name.endsWith('.json'))
    .sort();
  return [...reports, 'record.json', 'tables'].map((name) => join(shown, name));
}
