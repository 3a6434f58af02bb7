import { join } from 'node:path';
import type { Problem } from '../problem.ts';
import type { OverviewRun } from '../report/overview.ts';
import { ofLevel, type ReadStudy, type RunOptions, readStudyAndData } from '../run.ts';
import { OWN_FAULT } from './exit-status.ts';
import { fitRead, statusOf, studyName } from './fit-one.ts';
import { faultText, inTurn, type Job, type JobResult } from './level-job.ts';
import { safeNames } from './safe-names.ts';

/** One run of many: of a study, or of one level of a study that repeats. */
export interface ManyRun extends OverviewRun {
  /** The study file as it was named. */
  readonly path: string;
  readonly status: number;
  /** The fault of the program that ended it, for `PLUMBRULE_DEBUG`; else null. */
  readonly fault: string | null;
}

export interface ManyOptions {
  readonly parameters: ReadonlyMap<string, string>;
  readonly onProgress?: NonNullable<RunOptions['onProgress']>;
}

/**
 * Runs several studies, one after the other, each into its own folder below `out`. None stops the others, not even by a
 * fault of the program.
 */
export async function fitMany(
  paths: readonly string[],
  out: string,
  options: ManyOptions,
): Promise<ManyRun[]> {
  const folders = safeNames(paths.map(studyName));
  const runs: ManyRun[] = [];
  for (const [index, path] of paths.entries()) {
    const folder = folders[index]!;
    const progress: NonNullable<RunOptions['onProgress']> = (stage, done, total) =>
      options.onProgress?.(`${folder} (${index + 1} of ${paths.length}): ${stage}`, done, total);
    const inner = { ...options, onProgress: progress };
    try {
      const read = await readStudyAndData(path, inner);
      if (read.levels !== null && read.table !== null) {
        runs.push(...(await fitRepeats(path, read, join(out, folder), inner, folder)));
      } else {
        const fitted = await fitRead(path, read, join(out, folder), inner);
        runs.push(runOf(path, folder, folder, { fitted }, fitted.problems));
      }
    } catch (fault) {
      runs.push(runOf(path, folder, folder, { fault: faultText(fault) }, []));
    }
  }
  return runs;
}

/**
 * Runs a study that repeats, once for each level, each into its own folder below `out`; the runs come in the order of
 * the levels.
 * @param name the study's among others, which begins the names of its runs; left out where it is the only one
 */
export async function fitRepeats(
  path: string,
  read: ReadStudy,
  out: string,
  options: ManyOptions,
  name: string | null = null,
): Promise<ManyRun[]> {
  const levels = (read.levels ?? []).map(({ level }) => level);
  if (levels.length === 0 || read.problems.some(({ severity }) => severity === 'error')) {
    const stopped = await fitRead(path, { ...read, table: null }, out, {});
    return [runOf(path, name ?? studyName(path), name ?? '.', { fitted: stopped }, read.problems)];
  }
  const folders = safeNames(levels);
  const jobs = levels.map((level, index): Job => ({ level, out: join(out, folders[index]!) }));
  let done = 0;
  const onDone = () => options.onProgress?.('fitting levels', ++done, jobs.length);
  const { inThreads, threadsFor } = await import('./level-threads.ts');
  const threads = threadsFor(jobs.length);
  const results =
    threads > 1
      ? await inThreads(path, read, jobs, options.parameters, threads, onDone)
      : await inTurn(path, read, jobs, options.parameters, onDone);
  const runs = levels.map((level, index) => {
    const result = results[index]!;
    // What was found in reading the study and its data is the study's, and said once.
    const own = 'fitted' in result ? result.fitted.problems.slice(read.problems.length) : [];
    const shown = name === null ? level : `${name}, ${level}`;
    const folder = name === null ? folders[index]! : `${name}/${folders[index]!}`;
    return runOf(path, shown, folder, result, ofLevel(level, own), level);
  });
  const [first, ...rest] = runs;
  return [{ ...first!, problems: [...read.problems, ...first!.problems] }, ...rest];
}

function runOf(
  path: string,
  name: string,
  folder: string,
  result: JobResult,
  problems: readonly Problem[],
  level: string | null = null,
): ManyRun {
  const base = { path, name, folder, study: level === null ? path : `${path}, ${level}` };
  if ('fitted' in result) {
    const { written } = result.fitted;
    return {
      ...base,
      record: written?.record ?? null,
      files: written?.names ?? [],
      problems,
      status: statusOf(result.fitted),
      fault: null,
    };
  }
  const [first = ''] = result.fault.split('\n');
  const problem: Problem = {
    code: 'run_failed',
    severity: 'error',
    place: { kind: 'file', file: path },
    message: `${level === null ? '' : `${level}: `}The run failed through a fault of the program's own, and nothing of it was written. ${first}${/[.!?]$/.test(first) ? '' : '.'}`,
    hint: 'Set PLUMBRULE_DEBUG=1 to see where it happened.',
  };
  return {
    ...base,
    record: null,
    files: [],
    problems: [...problems, problem],
    status: OWN_FAULT,
    fault: result.fault,
  };
}
