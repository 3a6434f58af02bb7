import { join } from 'node:path';
import type { ComparedSide } from '../compare/compare.ts';
import { hasError, type Problem, type Report } from '../problem.ts';
import { junitSuite, junitText } from '../report/junit.ts';
import { type ReadStudy, readStudyAndData } from '../run/read-study-and-data.ts';
import { UNUSABLE } from './exit-status.ts';
import { defaultFolder, type FittedStudy, fitRead, statusOf } from './fit-one.ts';
import type { FitCommandOptions } from './fit-options.ts';
import { givenParameters } from './given-parameters.ts';
import { isFolderOfStudies } from './is-folder.ts';
import { progressOn } from './progress.ts';
import { showDataNotRead, showProblems } from './show-problems.ts';
import { shownFolder } from './shown-folder.ts';
import { sourceTexts } from './source-texts.ts';
import { summary } from './summary.ts';
import type { Terminal } from './terminal.ts';
import { writeText } from './write-text.ts';

/**
 * `plumbrule fit STUDY …`: the whole study, down to record, reports and tables in the output folder; with an earlier
 * record also what is different from it, written together with the rest.
 */
export async function fitCommand(
  paths: readonly string[],
  options: FitCommandOptions,
  terminal: Terminal,
): Promise<number> {
  const before: Problem[] = [];
  const path = paths[0]!;
  const several = paths.length > 1 || (await isFolderOfStudies(path));
  const parameters = givenParameters(options.with ?? [], (problem) => before.push(problem));
  if (hasError(before)) {
    await showProblems(before, await sourceTexts(before), options.problems, terminal);
    return UNUSABLE;
  }
  const progress = progressOn(terminal, options.quiet === true);
  const setting = { parameters, progress, terminal, options };
  let fitted: FittedStudy;
  const late: Problem[] = [];
  try {
    if (several) return await (await import('./fit-several.ts')).fitSeveral(paths, setting);
    const read = await readStudyAndData(path, { onProgress: progress.show, parameters });
    if (read.levels !== null) {
      return await (await import('./fit-several.ts')).fitRepeated(path, read, setting);
    }
    const earlier = await readEarlier(options.against, read, (problem) => before.push(problem));
    if (hasError(before)) {
      progress.clear();
      const found = [...read.problems, ...before];
      await showProblems(found, await sourceTexts(found), options.problems, terminal);
      return UNUSABLE;
    }
    const out = options.out ?? defaultFolder(path);
    fitted = await fitRead(path, read, out, { onProgress: progress.show, parameters, earlier });
    if (options.junit !== undefined) {
      const { written, problems, comparison } = fitted;
      const run = { study: path, record: written?.record ?? null, problems, comparison };
      await writeText(options.junit, junitText([junitSuite(run)]), (problem) => late.push(problem));
    }
  } finally {
    progress.clear();
  }

  const problems = [...before, ...fitted.problems, ...late];
  const shown = options.quiet !== true && options.problems === 'text';
  await showProblems(problems, await sourceTexts(problems, fitted.templates), options.problems, terminal);
  if (!fitted.dataRead && shown) showDataNotRead(problems, terminal);
  if (shown) await showResults(fitted, terminal);
  return late.length > 0 ? UNUSABLE : statusOf(fitted);
}

async function showResults({ written, comparison }: FittedStudy, terminal: Terminal): Promise<void> {
  if (written === null) return;
  const found = places(written.out, written.names);
  terminal.out(summary(written.record, found, terminal, comparison !== null));
  if (comparison === null) return;
  const { comparisonSummary } = await import('./comparison-summary.ts');
  const shown = found.filter((place) => place.includes('comparison.'));
  terminal.out(`\n${comparisonSummary(comparison, written.record, shown, terminal)}`);
}

/**
 * The earlier record, which may lie where the new one is going to be written; nothing of a study that repeats, whose levels
 * could not be read.
 */
async function readEarlier(
  path: string | undefined,
  { study }: ReadStudy,
  report: Report,
): Promise<ComparedSide | null> {
  if (path === undefined || (study?.repeatFor ?? null) !== null) return null;
  const { DEEPEST, findRecords, hasRecord } = await import('./many-records.ts');
  const below = (await hasRecord(path)) ? new Set<string>() : (await findRecords(path, DEEPEST)).folders;
  if (below.size > 0) {
    const [first] = below;
    report({
      code: 'command_unusable',
      severity: 'error',
      place: { kind: 'command' },
      message: `--against names "${path}", which holds the records of other runs, each in its own folder, and no record of its own: this is one run.`,
      hint: `Name the folder of its earlier results there, such as "${join(path, first!)}".`,
    });
    return null;
  }
  const { readCompared } = await import('../compare/read-compared.ts');
  return readCompared(path, report);
}

/** The reports first, for a reader; then the record and the tables' folder. Relative where that is shorter. */
function places(out: string, names: readonly string[]): string[] {
  const folder = shownFolder(out);
  const reports = names
    .filter((name) => /^(?:report|comparison)\./.test(name) && !name.endsWith('.json'))
    .sort();
  return [...reports, 'record.json', 'tables'].map((name) => join(folder, name));
}
