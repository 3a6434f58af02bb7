import { basename, join, resolve } from 'node:path';
import { compareRecords } from '../compare/compare.ts';
import { readCompared } from '../compare/read-compared.ts';
import { hasError, type Problem } from '../problem.ts';
import { writeResults } from '../record/write-results.ts';
import { type CompareCommandOptions, filesOf, statusOfComparison } from './compared-files.ts';
import { DONE, UNUSABLE } from './exit-status.ts';
import { finishMany } from './finish-many.ts';
import { givenTemplate, givenTemplatePlace } from './given-template.ts';
import { type ManyRecords, readEarlier, recordName } from './many-records.ts';
import { type ManyRun, manyRun } from './many-run.ts';
import { progressOn } from './progress.ts';
import { showProblems } from './show-problems.ts';
import type { Terminal } from './terminal.ts';

/** The records of many runs, each against that at its place among earlier ones, with an overview. */
export async function compareMany(
  earlier: ManyRecords,
  later: ManyRecords,
  options: CompareCommandOptions,
  terminal: Terminal,
): Promise<number> {
  const problems = refused(options);
  if (hasError(problems)) {
    await showProblems(problems, new Map(), options.problems, terminal);
    return UNUSABLE;
  }
  const progress = progressOn(terminal, options.quiet === true);
  const runs: ManyRun[] = [];
  const templates = new Map<string, string>();
  /** That a study's own templates are not used is said once and not for each of its levels. */
  const said = new Set<string>();
  try {
    for (const folder of later.folders) {
      const run = await comparedRun(folder, earlier, later, options, templates);
      const fresh = run.problems.filter(({ code, severity, message, place }) => {
        if (code !== 'template_unreadable' || severity !== 'warning') return true;
        const text = JSON.stringify([message, place]);
        return said.has(text) ? false : said.add(text) !== undefined;
      });
      runs.push({ ...run, problems: fresh });
      progress.show('comparing records', runs.length, later.folders.size);
    }
  } finally {
    progress.clear();
  }
  const title = `${basename(resolve(later.root))} against ${basename(resolve(earlier.root))}`;
  const setting = { out: options.out ?? null, templates, terminal, options };
  return finishMany(title, runs, earlier, problems, setting);
}

/** What does not go with many records. */
function refused({ out, format, template }: CompareCommandOptions): Problem[] {
  const problems: Problem[] = [];
  if (format !== undefined && out === undefined) {
    problems.push({
      code: 'command_unusable',
      severity: 'error',
      place: { kind: 'command' },
      message: '--format without --out prints one comparison, and these are many.',
      hint: 'Name a folder for them with --out.',
    });
  }
  const pages = format === undefined ? (['html', 'markdown'] as const) : format === 'json' ? [] : [format];
  givenTemplate({ html: null, markdown: null }, pages, template, (problem) => problems.push(problem));
  return problems;
}

async function comparedRun(
  folder: string,
  earlier: ManyRecords,
  later: ManyRecords,
  options: CompareCommandOptions,
  templates: Map<string, string>,
): Promise<ManyRun> {
  const problems: Problem[] = [];
  const report = (problem: Problem) => problems.push(problem);
  const place = { name: folder, folder, study: folder, hasEarlier: earlier.folders.has(folder) };
  const stopped = { record: null, comparison: null, files: [], problems, status: UNUSABLE };
  const now = await readCompared(join(later.root, folder), report);
  if (now === null) return manyRun(place, stopped);
  const { record } = now;
  const named = { ...place, name: recordName(folder, record) };
  const level = record.data.repeat?.level ?? null;
  const before = place.hasEarlier ? await readEarlier(join(earlier.root, folder), level, report) : null;
  if (hasError(problems)) return manyRun(named, stopped);
  if (before === null) {
    const found = { record, comparison: null, files: [], problems, status: DONE };
    return manyRun({ ...named, hasEarlier: false }, found);
  }
  const comparison = compareRecords(before, now, report);
  if (comparison === null) return manyRun(named, stopped);
  for (const [name, path] of givenTemplatePlace(record, 'comparison', options)) templates.set(name, path);
  const files = await filesOf(comparison, record, options, report);
  if (hasError(problems)) return manyRun(named, stopped);
  const { out } = options;
  if (out !== undefined && !(await writeResults(join(out, folder), files, report)))
    return manyRun(named, stopped);
  const status = statusOfComparison(comparison);
  const names = out === undefined ? [] : files.map(({ name }) => name);
  return manyRun(named, { record, comparison, files: names, problems, status });
}
