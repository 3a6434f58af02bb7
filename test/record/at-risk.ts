import { spawn } from 'node:child_process';
import { readdirSync, readFileSync, utimesSync } from 'node:fs';
import { join, relative } from 'node:path';
import { fileURLToPath } from 'node:url';
import { build } from 'esbuild';
import type { Outcome, Task } from './run-at-risk.ts';

/**
 * Has tasks done by a process of its own, one after the other; null where it was killed. `kill` is asked every millisecond
 * whether it is to be.
 */
export type RunTasks = (tasks: readonly Task[], kill?: () => boolean) => Promise<readonly Outcome[] | null>;

/** Makes the program `run-at-risk.ts` ready in a folder: bundled, it starts ten times as fast. */
export async function atRisk(folder: string): Promise<RunTasks> {
  const program = join(folder, 'run-at-risk.mjs');
  await build({
    entryPoints: [fileURLToPath(new URL('run-at-risk.ts', import.meta.url))],
    outfile: program,
    bundle: true,
    platform: 'node',
    format: 'esm',
    logLevel: 'silent',
  });
  return (tasks, kill = () => false) =>
    new Promise((resolve, reject) => {
      const child = spawn(process.execPath, [program]);
      child.stdin.end(JSON.stringify(tasks));
      const asking = setInterval(() => kill() && child.kill('SIGKILL'), 1);
      let [out, err] = ['', ''];
      child.stdout.on('data', (text) => {
        out += text;
      });
      child.stderr.on('data', (text) => {
        err += text;
      });
      child.on('close', (status, signal) => {
        clearInterval(asking);
        if (signal === 'SIGKILL') resolve(null);
        else if (status === 0) resolve(JSON.parse(out) as Outcome[]);
        else reject(new Error(err));
      });
    });
}

/** Does the work for each, two at a time. */
export async function inPairs<T>(each: Iterable<T>, work: (one: T) => Promise<void>): Promise<void> {
  const waiting = [...each];
  const worker = async () => {
    for (let one = waiting.shift(); one !== undefined; one = waiting.shift()) await work(one);
  };
  await Promise.all([worker(), worker()]);
}

/** Every file below a folder with its text, by its relative name; without what we hide. */
export function shown(folder: string): { [name: string]: string } {
  const found: { [name: string]: string } = {};
  for (const entry of readdirSync(folder, { recursive: true, withFileTypes: true })) {
    const path = join(entry.parentPath, entry.name);
    const name = relative(folder, path);
    if (entry.isFile() && !name.includes('.plumbrule-')) found[name] = readFileSync(path, 'utf8');
  }
  return found;
}

export function hidden(folder: string): string[] {
  return readdirSync(folder).filter((name) => name.startsWith('.plumbrule-'));
}

/** Makes what we hide in a folder look as if nobody had touched it for two hours. */
export function forgotten(folder: string): void {
  const time = Date.now() / 1000 - 7200;
  for (const name of hidden(folder)) {
    for (const within of ['', ...entriesOf(join(folder, name))])
      utimesSync(join(folder, name, within), time, time);
  }
}

function entriesOf(path: string): string[] {
  try {
    return readdirSync(path, { recursive: true, encoding: 'utf8' });
  } catch {
    return [];
  }
}
