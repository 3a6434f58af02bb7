import { join } from 'node:path';
import { compareRecords } from '../compare/compare.ts';
import { readCompared } from '../compare/read-compared.ts';
import type { Problem } from '../problem.ts';
import { writeResults } from '../record/write-results.ts';
import type { CommonOptions } from './common-options.ts';
import { type ComparisonFormat, comparisonFiles, comparisonIn } from './comparison-files.ts';
import { comparisonSummary } from './comparison-summary.ts';
import { DONE, NOT_ACCEPTED, UNUSABLE } from './exit-status.ts';
import { hasError } from './has-error.ts';
import { showProblems } from './show-problems.ts';
import { sourceTexts } from './source-texts.ts';
import type { Terminal } from './terminal.ts';

export interface CompareCommandOptions extends CommonOptions {
  readonly out?: string;
  readonly format?: ComparisonFormat;
}

/**
 * `plumbrule compare EARLIER LATER`: what is different between two records. Files are written where a folder is named;
 * without one, a format that is named is printed in place of the summary. A limit against the earlier record that is missed
 * makes the exit status 1, as it does in `fit --against`.
 */
export async function compareCommand(
  earlierPath: string,
  laterPath: string,
  options: CompareCommandOptions,
  terminal: Terminal,
): Promise<number> {
  const problems: Problem[] = [];
  const report = (problem: Problem) => problems.push(problem);
  const earlier = await readCompared(earlierPath, report);
  const later = await readCompared(laterPath, report);
  const comparison = earlier === null || later === null ? null : compareRecords(earlier, later, report);
  const { out, format } = options;
  let places: string[] = [];
  if (comparison !== null && out !== undefined && !hasError(problems)) {
    const files = comparisonFiles(comparison, later!.record, format === undefined ? undefined : [format]);
    if (await writeResults(out, files, report)) places = files.map(({ name }) => join(out, name));
  }
  await showProblems(problems, await sourceTexts(problems), options.problems, terminal);
  if (comparison === null || hasError(problems)) return UNUSABLE;
  const status = comparison.acceptance.some(({ passed }) => passed === false) ? NOT_ACCEPTED : DONE;
  if (options.problems === 'json') return status;
  if (format !== undefined && out === undefined) {
    terminal.out(comparisonIn(format, comparison, later!.record));
  } else if (options.quiet !== true) {
    terminal.out(comparisonSummary(comparison, later!.record, places, terminal));
  }
  return status;
}
