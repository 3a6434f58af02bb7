/** The thread that `level-threads.ts` starts: it asks for a run, makes it, tells what came of it, and asks again. */
import { parentPort, workerData } from 'node:worker_threads';
import { readStudy } from '../study/read-study.ts';
import { doJob, type Job } from './level-job.ts';
import type { ThreadData } from './level-threads.ts';
import { faultyRun, type ManyRun } from './many-run.ts';

const { path, read, studySha256, parameters } = workerData as ThreadData;
const port = parentPort;
if (port === null) throw new Error('This file is run as a thread.');

const study = await readStudy(path, () => {}, parameters);
const changed = study === null || study.sha256 !== studySha256;

port.on('message', async (job: Job | null) => {
  if (job === null) {
    port.close();
    return;
  }
  const run: ManyRun = changed
    ? faultyRun(job, path, `Error: ${path} was changed while it was run.`)
    : await doJob(path, { ...read, study }, job, { parameters });
  port.postMessage(run);
});
port.postMessage('ready');
