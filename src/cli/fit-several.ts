import { join, relative, resolve } from 'node:path';
import type { Problem } from '../problem.ts';
import { writeResults } from '../record/write-results.ts';
import { junitText } from '../report/junit.ts';
import { overviewEntry } from '../report/overview.ts';
import type { ReadStudy } from '../run.ts';
import { UNUSABLE } from './exit-status.ts';
import { findStudies } from './find-studies.ts';
import { fitMany, fitRepeats, type ManyRun } from './fit-many.ts';
import { defaultFolder, studyName } from './fit-one.ts';
import type { FitCommandOptions } from './fit-options.ts';
import { OVERVIEW_FILES, overviewFiles } from './overview-files.ts';
import { overviewSummary } from './overview-summary.ts';
import type { Progress } from './progress.ts';
import { showProblems } from './show-problems.ts';
import { sourceTexts } from './source-texts.ts';
import type { Terminal } from './terminal.ts';
import { writeText } from './write-text.ts';

interface Setting {
  readonly parameters: ReadonlyMap<string, string>;
  readonly progress: Progress;
  readonly terminal: Terminal;
  readonly options: FitCommandOptions;
}

/** `plumbrule fit STUDY …`: several studies, or all of a folder, each into its own folder, with an overview. */
export async function fitSeveral(paths: readonly string[], setting: Setting): Promise<number> {
  const problems: Problem[] = [];
  const studies = await findStudies(paths, (problem) => problems.push(problem));
  const out = setting.options.out ?? 'results';
  const runs = await fitMany(studies, out, {
    parameters: setting.parameters,
    onProgress: setting.progress.show,
  });
  const title =
    paths.length === 1 ? `All studies of ${studyName(join(paths[0]!, 'study.yaml'))}` : 'Several studies';
  return finish(title, out, runs, problems, setting);
}

/** A study that repeats for a variable, read already: its runs, each into its own folder, with an overview. */
export async function fitRepeated(path: string, read: ReadStudy, setting: Setting): Promise<number> {
  const out = setting.options.out ?? defaultFolder(path);
  const runs = await fitRepeats(path, read, out, {
    parameters: setting.parameters,
    onProgress: setting.progress.show,
  });
  return finish(read.study?.title ?? studyName(path), out, runs, [], setting);
}

/** Overview, JUnit XML, problems and the summary; the worst exit status of all. */
async function finish(
  title: string,
  out: string,
  runs: readonly ManyRun[],
  before: readonly Problem[],
  { progress, terminal, options }: Setting,
): Promise<number> {
  const late: Problem[] = [];
  const report = (problem: Problem) => late.push(problem);
  const entries = runs.map(overviewEntry);
  let written = false;
  if (runs.length > 0) {
    written = await writeResults(out, overviewFiles(title, entries), report, OVERVIEW_FILES);
  }
  if (options.junit !== undefined && runs.length > 0) {
    const suites = runs.map(({ study, record, problems }) => ({ study, record, problems }));
    await writeText(options.junit, junitText(suites), report);
  }
  progress.clear();

  const all = [...before, ...runs.flatMap(({ problems }) => problems), ...late];
  await showProblems(told(all, runs, options), await sourceTexts(all), options.problems, terminal);
  if (process.env.PLUMBRULE_DEBUG === '1') {
    for (const { fault } of runs) if (fault !== null) terminal.err(`${fault}\n`);
  }
  if (options.quiet !== true && options.problems === 'text' && runs.length > 0) {
    const near = relative('.', out);
    const shown = near.startsWith('..') ? resolve(out) : near;
    const places = written ? OVERVIEW_FILES.map((name) => join(shown, name)) : [];
    terminal.out(overviewSummary(title, entries, places, terminal));
  }
  const failed = [...before, ...late].some(({ severity }) => severity === 'error');
  return Math.max(failed ? UNUSABLE : 0, ...runs.map(({ status }) => status));
}

/** A person is told of errors only where the runs are many: each report has its own warnings. JSON has all. */
function told(
  all: readonly Problem[],
  runs: readonly ManyRun[],
  options: FitCommandOptions,
): readonly Problem[] {
  return options.problems === 'json' || runs.length <= FEW
    ? all
    : all.filter(({ severity, code }) => severity === 'error' || code === 'repeat_level_missing');
}

const FEW = 3;
