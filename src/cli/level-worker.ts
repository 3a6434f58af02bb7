/** The thread that `level-threads.ts` starts: it asks for a run, makes it, tells what came of it, and asks again. */
import { parentPort, workerData } from 'node:worker_threads';
import { readStudy } from '../study/read-study.ts';
import { doJob } from './level-job.ts';
import type { ThreadData, ThreadTask } from './level-threads.ts';
import { faultyRun, type ManyRun } from './many-run.ts';

const { path, read, studySha256, parameters } = workerData as ThreadData;
const port = parentPort;
if (port === null) throw new Error('This file is run as a thread.');

const study = await readStudy(path, () => {}, parameters);
const changed = study === null || study.sha256 !== studySha256;

port.on('message', async (task: ThreadTask | null) => {
  if (task === null) {
    port.close();
    return;
  }
  const { job } = task;
  const run: ManyRun = changed
    ? faultyRun(job, path, `Error: ${path} was changed while it was run.`)
    : await doJob(path, { ...read, ...task.read, study }, job, { parameters });
  port.postMessage(run);
});
port.postMessage('ready');
