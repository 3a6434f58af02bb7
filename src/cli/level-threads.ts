import { availableParallelism } from 'node:os';
import { Worker } from 'node:worker_threads';
import { packageUrl } from '../package-file.ts';
import { partOfTable } from '../prepare/rows-of-level.ts';
import type { ReadStudy } from '../run/read-study-and-data.ts';
import type { Study } from '../study/study.ts';
import { doJob, type Job } from './level-job.ts';
import { faultyRun, type ManyRun } from './many-run.ts';

/** What a thread is started with; the study itself, which cannot be handed over, it reads again. */
export interface ThreadData {
  readonly path: string;
  readonly read: Pick<ReadStudy, 'dataRead' | 'problems'>;
  /** The study must still be the one whose data this is. */
  readonly studySha256: string;
  readonly parameters: ReadonlyMap<string, string>;
}

/** One run, with its rows and no others: the threads do not hold the whole table each. */
export interface ThreadTask {
  readonly job: Job;
  readonly read: Pick<ReadStudy, 'table' | 'levels'>;
}

/** Where the code of a thread is, with what Node needs to run it. */
export interface ThreadScript {
  readonly url: URL;
  readonly execArgv?: readonly string[];
}

/** Seconds that a thread costs in processor time: loading, compiling and warming up. */
const COST = 2;
const MOST_THREADS = 16;

/**
 * How many threads pay for the runs of a study; 1: none, all are made in turn. Threads need the built program.
 *
 * On two cores 200 runs of 500 rows took 5.4 s both in turn, where the engine's compiler has the other core, and in two
 * threads, so that light runs are left alone until there are as many; a few heavy ones are worth a thread each.
 */
export function threadsFor(
  study: Study,
  runs: number,
  rows: number,
  cores: number = availableParallelism(),
): number {
  if (import.meta.url.endsWith('.ts')) return 1;
  return threadsThatPay(runs, secondsOfARun(study, rows / Math.max(1, runs)), cores);
}

export function threadsThatPay(runs: number, seconds: number, cores: number): number {
  return Math.max(1, Math.min(cores, MOST_THREADS, runs, Math.floor((runs * seconds) / COST)));
}

/** Fitting, examining and writing, whatever the number of rows; for each row; and for each row that is drawn again. */
const [OF_ANY, OF_A_ROW, OF_A_ROW_AGAIN] = [0.025, 1e-5, 2e-7];
/** Searching families, once. */
const OF_A_SEARCH = 0.01;

/** About what a run takes, in seconds: rough, since only whether threads pay hangs on it. */
export function secondsOfARun(study: Study, rows: number): number {
  const { selection, examination, families } = study;
  const parts = [selection.validation, selection.honestError].map((plan) =>
    plan === null ? 0 : (plan.folds ?? 10) * plan.repeats,
  );
  const choices = (selection.stability?.repetitions ?? 0) + parts[1]!;
  const again = choices + parts[0]! + (examination.bootstrap?.repetitions ?? 0);
  const searches = families.length === 0 ? 0 : families.length * (1 + choices);
  return OF_ANY + rows * (OF_A_ROW + again * OF_A_ROW_AGAIN) + searches * OF_A_SEARCH;
}

/** Makes the runs in threads, each taking the next that waits; the results are in the order of the jobs. */
export async function inThreads(
  path: string,
  read: ReadStudy,
  jobs: readonly Job[],
  parameters: ReadonlyMap<string, string>,
  threads: number,
  onDone: () => void,
  script: ThreadScript = { url: packageUrl('dist/cli/level-worker.js') },
): Promise<ManyRun[]> {
  const { study, table, dataRead, problems } = read;
  const workerData: ThreadData = {
    path,
    read: { dataRead, problems },
    studySha256: study!.sha256,
    parameters,
  };
  const rowsOf = new Map(read.levels!.map(({ level, rows }) => [level, rows]));
  const task = (job: Job): ThreadTask => {
    const level = job.level!;
    const part = partOfTable(table!, rowsOf.get(level)!);
    return { job, read: { table: part, levels: [{ level, rows: Int32Array.from(part.lines.keys()) }] } };
  };
  const results = new Array<ManyRun | undefined>(jobs.length);
  let next = 0;
  const work = () =>
    new Promise<void>((resolve) => {
      const worker = new Worker(script.url, {
        workerData,
        ...(script.execArgv === undefined ? {} : { execArgv: [...script.execArgv] }),
      });
      let current = -1;
      const give = () => {
        current = next < jobs.length ? next++ : -1;
        worker.postMessage(current < 0 ? null : task(jobs[current]!));
      };
      worker.on('message', (result: ManyRun | 'ready') => {
        if (result !== 'ready') {
          results[current] = result;
          onDone();
        }
        give();
      });
      // A thread that dies takes the run with it that it was making; the others go on.
      worker.on('error', (fault) => {
        if (current >= 0)
          results[current] = faultyRun(jobs[current]!, path, `${fault.name}: ${fault.message}`);
      });
      worker.on('exit', () => resolve());
    });
  await Promise.all(Array.from({ length: threads }, work));
  // Where all threads died, what is left is done here.
  for (const [index, job] of jobs.entries()) {
    if (results[index] !== undefined) continue;
    results[index] = await doJob(path, read, job, { parameters });
    onDone();
  }
  return results as ManyRun[];
}
