import { join, relative, resolve } from 'node:path';
import type { ComparedSide } from '../compare/compare.ts';
import type { Problem, Report } from '../problem.ts';
import { junitText } from '../report/junit.ts';
import type { StudyOptions } from './common-options.ts';
import { UNUSABLE } from './exit-status.ts';
import { defaultFolder, type FittedStudy, fitOne, statusOf } from './fit-one.ts';
import { givenParameters } from './given-parameters.ts';
import { hasError } from './has-error.ts';
import { progressOn } from './progress.ts';
import { showDataNotRead, showProblems } from './show-problems.ts';
import { sourceTexts } from './source-texts.ts';
import { summary } from './summary.ts';
import type { Terminal } from './terminal.ts';
import { writeText } from './write-text.ts';

export interface FitCommandOptions extends StudyOptions {
  readonly out?: string;
  /** An earlier record, or the folder of its results, to compare with. */
  readonly against?: string;
  /** Where the acceptance criteria go as JUnit XML. */
  readonly junit?: string;
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
  const before: Problem[] = [];
  const parameters = givenParameters(options.with ?? [], (problem) => before.push(problem));
  // The earlier record may lie where the new one is going to be written.
  const earlier =
    options.against === undefined || hasError(before)
      ? null
      : await readEarlier(options.against, (problem) => before.push(problem));
  if (hasError(before)) {
    await showProblems(before, await sourceTexts(before), options.problems, terminal);
    return UNUSABLE;
  }
  const progress = progressOn(terminal, options.quiet === true);
  let fitted: FittedStudy;
  const late: Problem[] = [];
  try {
    const out = options.out ?? defaultFolder(path);
    fitted = await fitOne(path, out, { onProgress: progress.show, parameters, earlier });
    if (options.junit !== undefined) {
      const { written, problems, comparison } = fitted;
      const run = { study: path, record: written?.record ?? null, problems, comparison };
      await writeText(options.junit, junitText([run]), (problem) => late.push(problem));
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

async function readEarlier(path: string, report: Report): Promise<ComparedSide | null> {
  const { readCompared } = await import('../compare/read-compared.ts');
  return readCompared(path, report);
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
