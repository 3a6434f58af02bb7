import { mkdir, mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { runCommandLine } from '../../src/cli/command-line.ts';
import { collecting } from './collect.ts';

/** One command line with what it printed. */
export async function plumbrule(...args: string[]) {
  const { terminal, printed } = collecting();
  const status = await runCommandLine(args, terminal);
  return { status, ...printed };
}

/** Does something in a folder that holds the files given, and takes the folder away again. */
export async function inFolder<Result>(
  files: Readonly<Record<string, string>>,
  work: (folder: string) => Promise<Result>,
): Promise<Result> {
  const folder = await mkdtemp(join(tmpdir(), 'plumbrule-'));
  try {
    for (const [name, text] of Object.entries(files)) {
      await mkdir(dirname(join(folder, name)), { recursive: true });
      await writeFile(join(folder, name), text);
    }
    return await work(folder);
  } finally {
    await rm(folder, { recursive: true });
  }
}
