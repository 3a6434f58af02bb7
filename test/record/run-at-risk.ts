/**
 * A program that writes results and is killed, stopped or refused by the file system at a step of its own choosing. It is
 * bundled and run by `at-risk.ts`, which gives it tasks on its standard input. A step is whatever changes something on the
 * disk: a file made, a half of its text, a folder made or removed, a file moved or removed. To list a folder is one too.
 */
import fs from 'node:fs';
import { syncBuiltinESMExports } from 'node:module';
import { join } from 'node:path';
import { setTimeout } from 'node:timers/promises';
import { isMainThread, parentPort, Worker } from 'node:worker_threads';

/** What one process does. */
export interface Task {
  /** Write files into a folder, finish moves in it, or only take turns in it. */
  readonly what: 'write' | 'finish' | 'turns';
  /** Of several, one after the other. */
  readonly folders: readonly string[];
  readonly files?: { readonly [name: string]: string };
  /** Written in place of `files` every second time. */
  readonly inTurnWith?: { readonly [name: string]: string };
  readonly obsolete?: readonly string[];
  /** Before the step with this number it is killed. */
  readonly kill?: number;
  /** Before each step all that lies in a folder is copied to another, "1" within it, "2" and so on. */
  readonly keep?: { readonly from: string; readonly to: string };
  /** At the step with this number the file system gives an error. */
  readonly fail?: number;
  /** Before the step with this number it is stopped for a minute, in which someone else does another task. */
  readonly stop?: { readonly at: number; readonly other: Task };
  /** Milliseconds since 1970 at which to begin, and from there between one folder and the next. */
  readonly begin?: number;
  readonly every?: number;
}

/** What it prints of each task. */
export interface Outcome {
  readonly done: boolean;
  readonly steps: number;
  readonly problems: readonly string[];
  /** How often somebody else was found to have the turn as well. */
  readonly together: number;
}

let task: Task;
let steps = 0;
let counted = true;

function step(): void {
  if (!counted) return;
  steps++;
  if (task.keep !== undefined) uncounted(() => copy(task.keep!.from, join(task.keep!.to, String(steps))));
  if (steps === task.kill) {
    process.kill(process.pid, 'SIGKILL');
    Atomics.wait(new Int32Array(new SharedArrayBuffer(4)), 0, 0);
  }
  if (steps === task.stop?.at) uncounted(() => stopped(task.stop!.other));
  if (steps === task.fail) throw Object.assign(new Error('EIO'), { code: 'EIO', errno: -5 });
}

function uncounted(work: () => void): void {
  counted = false;
  work();
  counted = true;
}

function copy(from: string, to: string): void {
  fs.mkdirSync(to, { recursive: true });
  if (fs.existsSync(from)) fs.cpSync(from, to, { recursive: true, preserveTimestamps: true });
}

let someoneElse: Worker | null = null;

/** A minute goes by: for the clock, for this process's own lock, and for everyone else. */
function stopped(other: Task): void {
  const minute = 60_000;
  const before = real.now();
  for (const folder of task.folders) age(folder, minute);
  const over = new Int32Array(new SharedArrayBuffer(4));
  someoneElse ??= new Worker(process.argv[1]!);
  someoneElse.unref();
  someoneElse.postMessage({ other, over });
  Atomics.wait(over, 0, 0);
  Date.now = () => real.now() + minute + (real.now() - before);
}

function age(folder: string, by: number): void {
  if (!fs.existsSync(folder)) return;
  for (const name of fs.readdirSync(folder)) {
    if (!name.startsWith('.plumbrule-lock-')) continue;
    const time = (real.now() - by) / 1000;
    fs.utimesSync(join(folder, name), time, time);
  }
}

const real = {
  now: Date.now,
  open: fs.openSync,
  readdir: fs.readdirSync,
  mkdir: fs.mkdirSync,
  rename: fs.renameSync,
  rmdir: fs.rmdirSync,
  unlink: fs.unlinkSync,
  write: fs.writeFileSync,
};

function writeFile(
  file: string | number,
  data: string | Uint8Array,
  options?: { readonly flag?: string },
): void {
  const fd = typeof file === 'number' ? file : fs.openSync(file, options?.flag ?? 'w');
  try {
    const bytes = Buffer.from(data);
    const half = Math.ceil(bytes.length / 2);
    for (const part of [bytes.subarray(0, half), bytes.subarray(half)]) {
      if (part.length === 0) continue;
      step();
      real.write(fd, part);
    }
  } finally {
    if (typeof file !== 'number') fs.closeSync(fd);
  }
}

function remove(path: string): void {
  const found = fs.lstatSync(path, { throwIfNoEntry: false });
  if (found === undefined) return;
  if (!found.isDirectory()) {
    step();
    // As the real one does with `force`.
    if (fs.existsSync(path)) real.unlink(path);
    return;
  }
  for (const name of real.readdir(path)) remove(join(path, name));
  step();
  real.rmdir(path);
}

const counting = (work: (...given: never[]) => unknown) =>
  ((...given: never[]) => {
    step();
    return work(...given);
  }) as never;

Object.assign(fs, {
  openSync: counting(real.open),
  readdirSync: counting(real.readdir),
  mkdirSync: counting(real.mkdir),
  renameSync: counting(real.rename),
  rmdirSync: counting(real.rmdir),
  writeFileSync: writeFile,
  rmSync: remove,
});
syncBuiltinESMExports();

const { writeResults } = await import('../../src/record/write-results.ts');
const { finishMoves } = await import('../../src/record/move-results.ts');
const { takeTurn } = await import('../../src/record/folder-turn.ts');

async function outcomeOf(given: Task): Promise<Outcome> {
  const { what, folders, files = {}, inTurnWith = files, obsolete, begin, every = 0 } = given;
  let done = true;
  let together = 0;
  const problems: string[] = [];
  for (const [index, folder] of folders.entries()) {
    if (begin !== undefined) await setTimeout(Math.max(0, begin + index * every - Date.now()));
    if (what === 'finish') {
      const why = await finishMoves(folder);
      if (why !== null) problems.push(why);
    } else if (what === 'turns') {
      const turn = await takeTurn(folder);
      try {
        real.write(join(folder, 'inside'), '', { flag: 'wx' });
        await setTimeout(1);
        real.unlink(join(folder, 'inside'));
      } catch {
        together++;
      }
      turn.end();
    } else {
      const list = Object.entries(index % 2 === 0 ? files : inTurnWith).map(([name, content]) => ({
        name,
        content,
      }));
      done &&= await writeResults(folder, list, ({ message }) => problems.push(message), obsolete);
    }
  }
  return { done, steps, problems, together };
}

async function outcomesOf(tasks: readonly Task[]): Promise<Outcome[]> {
  const outcomes: Outcome[] = [];
  for (const next of tasks) {
    task = next;
    steps = 0;
    Date.now = real.now;
    outcomes.push(await outcomeOf(task));
  }
  return outcomes;
}

if (isMainThread) {
  const tasks = JSON.parse(fs.readFileSync(0, 'utf8')) as Task[];
  process.stdout.write(JSON.stringify(await outcomesOf(tasks)));
}
parentPort?.on('message', async ({ other, over }: { readonly other: Task; readonly over: Int32Array }) => {
  await outcomesOf([other]);
  Atomics.store(over, 0, 1);
  Atomics.notify(over, 0);
});
