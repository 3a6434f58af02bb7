import { join, resolve } from 'node:path';
import { hasError, type Problem } from '../problem.ts';
import { writeResults } from '../record/write-results.ts';
import { goneSuite, junitText } from '../report/junit.ts';
import type { GoneRun, Overview } from '../report/overview.ts';
import type { CommonOptions } from './common-options.ts';
import { UNUSABLE } from './exit-status.ts';
import { goneRuns, type ManyRecords } from './many-records.ts';
import type { ManyRun } from './many-run.ts';
import { OVERVIEW_FILES, overviewFiles } from './overview-files.ts';
import { overviewSummary } from './overview-summary.ts';
import { showProblems } from './show-problems.ts';
import { shownFolder } from './shown-folder.ts';
import { sourceTexts } from './source-texts.ts';
import type { Terminal } from './terminal.ts';
import { writeText } from './write-text.ts';

export interface FinishSetting {
  /** Where the overview goes; null: nothing is written. */
  readonly out: string | null;
  readonly junit?: string;
  /** Where templates lie, by the names under which problems know them. */
  readonly templates: ReadonlyMap<string, string>;
  readonly terminal: Terminal;
  readonly options: CommonOptions;
}

/** Overview, JUnit XML, problems and the summary of many runs; the worst exit status of all. */
export async function finishMany(
  title: string,
  runs: readonly ManyRun[],
  earlier: ManyRecords | null,
  before: readonly Problem[],
  { out, junit, templates, terminal, options }: FinishSetting,
): Promise<number> {
  const late: Problem[] = [];
  const report = (problem: Problem) => late.push(problem);
  const gone = earlier === null ? [] : await goneRuns(earlier, runs);
  if (earlier !== null && gone.length > 0) report(goneProblem(gone, earlier.root, out));
  const overview: Overview = {
    title,
    compared: earlier !== null,
    runs: runs.map(({ entry }) => entry),
    gone,
  };
  let written = false;
  if (out !== null && runs.length > 0) {
    written = await writeResults(out, overviewFiles(overview), report, OVERVIEW_FILES);
  }
  if (junit !== undefined && runs.length > 0) {
    const suites = [...runs.map(({ suite }) => suite), ...gone.map(goneSuite)];
    await writeText(junit, junitText(suites), report);
  }

  const all = [...before, ...runs.flatMap(({ problems }) => problems), ...late];
  await showProblems(told(all, runs, options), await sourceTexts(all, templates), options.problems, terminal);
  if (process.env.PLUMBRULE_DEBUG === '1') {
    for (const { fault } of runs) if (fault !== null) terminal.err(`${fault}\n`);
  }
  if (options.quiet !== true && options.problems === 'text' && runs.length > 0) {
    const places = out !== null && written ? OVERVIEW_FILES.map((name) => join(shownFolder(out), name)) : [];
    terminal.out(overviewSummary(overview, places, terminal));
  }
  return Math.max(hasError([...before, ...late]) ? UNUSABLE : 0, ...runs.map(({ status }) => status));
}

/** Names in one sentence; the overview has all. */
const MOST_NAMED = 8;

function goneProblem(gone: readonly GoneRun[], root: string, out: string | null): Problem {
  const names = gone.slice(0, MOST_NAMED).map(({ name }) => `"${name}"`);
  const more = gone.length - names.length;
  const list = `${names.join(', ')}${more > 0 ? ` and ${more} more` : ''}`;
  const here = out !== null && resolve(out) === resolve(root);
  return {
    code: 'earlier_run_gone',
    severity: 'warning',
    place: { kind: 'file', file: root },
    message: `${gone.length === 1 ? 'One earlier record has no run' : `${gone.length} earlier records have no run`} now: ${list}.`,
    ...(here
      ? {
          hint: `Nothing was deleted: ${gone.length === 1 ? 'its results lie' : 'their results lie'} there still, in ${gone
            .slice(0, MOST_NAMED)
            .map(({ folder }) => `${folder}/`)
            .join(', ')}${more > 0 ? ', …' : ''}. Remove what nobody needs any more.`,
        }
      : {}),
  };
}

/** A person is told of errors only where the runs are many: each report has its own warnings. JSON has all. */
function told(all: readonly Problem[], runs: readonly ManyRun[], options: CommonOptions): readonly Problem[] {
  return options.problems === 'json' || runs.length <= FEW
    ? all
    : all.filter(({ severity, code }) => severity === 'error' || OF_ALL.includes(code));
}

const FEW = 3;
/** Warnings about the runs as a whole, or that no report has. */
const OF_ALL: readonly Problem['code'][] = ['repeat_level_missing', 'earlier_run_gone', 'records_unlike'];
