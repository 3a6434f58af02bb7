import { availableParallelism } from 'node:os';
import { Worker } from 'node:worker_threads';
import { packageUrl } from '../package-file.ts';
import type { ReadStudy } from '../run/read-study-and-data.ts';
import { doJob, type Job } from './level-job.ts';
import { faultyRun, type ManyRun } from './many-run.ts';

/** What a thread is started with: all that can be handed over; the study itself it reads again. */
export interface ThreadData {
  readonly path: string;
  readonly read: Omit<ReadStudy, 'study'>;
  /** The study must still be the one whose data this is. */
  readonly studySha256: string;
  readonly parameters: ReadonlyMap<string, string>;
}

/** Where the code of a thread is, with what Node needs to run it. */
export interface ThreadScript {
  readonly url: URL;
  readonly execArgv?: readonly string[];
}

/**
 * A thread costs about 1.8 s of processor time (loading, compiling and warming up), a run of 500 rows with its reports and
 * tables about 0.07 s: 200 such runs took 13.9 s in turn and 17.5 s in two threads, and by the clock 23.4 s and 13.6 s, on
 * two cores that had other work as well. With fewer runs than this a thread costs more than it saves.
 */
const RUNS_OF_A_THREAD = 25;
/** Each thread holds the table. */
const MOST_THREADS = 16;

/** How many threads pay for so many runs; 1: none, all runs are made in turn. Threads need the built program. */
export function threadsFor(runs: number, cores: number = availableParallelism()): number {
  if (import.meta.url.endsWith('.ts')) return 1;
  return Math.max(1, Math.min(cores, MOST_THREADS, Math.floor(runs / RUNS_OF_A_THREAD)));
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
  const { study, ...rest } = read;
  const workerData: ThreadData = { path, read: rest, studySha256: study!.sha256, parameters };
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
        worker.postMessage(current < 0 ? null : jobs[current]);
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
