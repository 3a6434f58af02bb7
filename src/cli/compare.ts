import { join } from 'node:path';
import { compareRecords } from '../compare/compare.ts';
import { readCompared } from '../compare/read-compared.ts';
import { hasError, type Problem } from '../problem.ts';
import { replacedRecord } from '../record/replaced-record.ts';
import { type ResultFile, writeResults } from '../record/write-results.ts';
import { type CompareCommandOptions, filesOf, statusOfComparison } from './compared-files.ts';
import { comparisonSummary } from './comparison-summary.ts';
import { UNUSABLE } from './exit-status.ts';
import { givenTemplatePlace } from './given-template.ts';
import { DEEPEST, findRecords, hasRecord, type ManyRecords } from './many-records.ts';
import { showProblems } from './show-problems.ts';
import { placedAt, sourceTexts } from './source-texts.ts';
import type { Terminal } from './terminal.ts';

/**
 * `plumbrule compare EARLIER LATER`: what is different between two records, or between each two of many. Files are written
 * where a folder is named; without one, a format that is named is printed in place of the summary. A limit against the
 * earlier record that is missed makes the exit status 1, as it does in `fit --against`.
 */
export async function compareCommand(
  earlierPath: string,
  laterPath: string,
  options: CompareCommandOptions,
  terminal: Terminal,
): Promise<number> {
  const problems: Problem[] = [];
  const report = (problem: Problem) => problems.push(problem);
  const [before, now] = [await manyBelow(earlierPath), await manyBelow(laterPath)];
  if (before !== null && now !== null) {
    return (await import('./compare-many.ts')).compareMany(before, now, options, terminal);
  }
  if (before !== null || now !== null) report(oneOfMany((before ?? now)!.root));
  const earlier = hasError(problems) ? null : await readCompared(earlierPath, report);
  const later = hasError(problems) ? null : await readCompared(laterPath, report);
  const comparison = earlier === null || later === null ? null : compareRecords(earlier, later, report);
  const { out, format } = options;
  let files: ResultFile[] = [];
  if (comparison !== null) files = await filesOf(comparison, later!.record, options, report);
  let places: string[] = [];
  if (out !== undefined && files.length > 0 && !hasError(problems)) {
    const obstacle = replacedRecord(out, [earlier!, later!]);
    if (await writeResults(out, files, report, [], obstacle))
      places = files.map(({ name }) => join(out, name));
  }
  const placed = placedAt(problems, givenTemplatePlace(later?.record ?? null, 'comparison', options));
  await showProblems(placed, await sourceTexts(placed), options.problems, terminal);
  if (comparison === null || hasError(problems)) return UNUSABLE;
  const status = statusOfComparison(comparison);
  if (options.problems === 'json') return status;
  if (format !== undefined && out === undefined) {
    for (const { content } of files) terminal.out(content as string);
  } else if (options.quiet !== true) {
    terminal.out(comparisonSummary(comparison, later!.record, places, terminal));
  }
  return status;
}

/** The records below a folder that is none of a single record; null where it is, or has none. */
async function manyBelow(path: string): Promise<ManyRecords | null> {
  if (await hasRecord(path)) return null;
  const records = await findRecords(path, DEEPEST);
  return records.folders.size === 0 ? null : records;
}

function oneOfMany(many: string): Problem {
  return {
    code: 'command_unusable',
    severity: 'error',
    place: { kind: 'command' },
    message: `"${many}" holds the records of many runs, each in its own folder, and the other is one record.`,
    hint: 'Compare one record with one, or the folders of two such runs.',
  };
}
