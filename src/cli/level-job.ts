import { hasError, type Problem } from '../problem.ts';
import type { ReadStudy, RunOptions } from '../run/read-study-and-data.ts';
import { ofLevel } from '../run/run-sample.ts';
import { UNUSABLE } from './exit-status.ts';
import { fitRead, statusOf } from './fit-one.ts';
import { readEarlier } from './many-records.ts';
import { faultyRun, type ManyRun, manyRun, type RunPlace } from './many-run.ts';

/** A run of many that is to be made. */
export interface Job extends RunPlace {
  /** The level whose rows it has; null for a study that does not repeat. */
  readonly level: string | null;
  readonly out: string;
  /** The folder of the earlier record that it is held against; null for none. It may be the folder that is written to. */
  readonly earlier: string | null;
}

/** The runs one after the other, in the order of the jobs. */
export async function inTurn(
  path: string,
  read: ReadStudy,
  jobs: readonly Job[],
  parameters: ReadonlyMap<string, string>,
  onDone: () => void,
): Promise<ManyRun[]> {
  const runs: ManyRun[] = [];
  for (const job of jobs) {
    runs.push(await doJob(path, read, job, { parameters }));
    onDone();
  }
  return runs;
}

/**
 * One run; a fault of the program is its result and nothing more. Of the problems found in reading a study that repeats,
 * which are said once, it has none.
 */
export async function doJob(path: string, read: ReadStudy, job: Job, options: RunOptions): Promise<ManyRun> {
  try {
    const run = await made(path, read, job, options);
    // Its own suite and its line in the overview say whose they are already.
    return job.level === null ? run : { ...run, problems: ofLevel(job.level, run.problems) };
  } catch (fault) {
    return faultyRun(job, path, faultText(fault));
  }
}

async function made(path: string, read: ReadStudy, job: Job, options: RunOptions): Promise<ManyRun> {
  const { level } = job;
  const before: Problem[] = [];
  const earlier =
    job.earlier === null ? null : await readEarlier(job.earlier, level, (one) => before.push(one));
  const shared = level === null ? 0 : read.problems.length;
  if (hasError(before)) {
    const problems = [...read.problems.slice(shared), ...before];
    return manyRun(job, { record: null, comparison: null, files: [], problems, status: UNUSABLE });
  }
  const fitted = await fitRead(path, read, job.out, {
    ...options,
    ...(level === null ? {} : { level }),
    earlier,
  });
  const { written, comparison } = fitted;
  return manyRun(
    // What lies at its place but is of another level is no earlier record of it.
    { ...job, hasEarlier: job.hasEarlier === true ? earlier !== null : job.hasEarlier },
    {
      record: written?.record ?? null,
      comparison: written === null ? null : comparison,
      files: written?.names ?? [],
      problems: [...before, ...fitted.problems.slice(shared)],
      status: statusOf(fitted),
      templates: fitted.templates,
    },
  );
}

export function faultText(fault: unknown): string {
  return fault instanceof Error ? (fault.stack ?? `${fault.name}: ${fault.message}`) : String(fault);
}
