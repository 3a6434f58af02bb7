import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { type RunResult, runStudy } from '../../src/run/run-study.ts';

/** Runs a study written as text, its data files beside it, in a folder of its own that is taken away again. */
export async function runText(study: string, files: Readonly<Record<string, string>>): Promise<RunResult> {
  const folder = await mkdtemp(join(tmpdir(), 'plumbrule-'));
  try {
    await writeFile(join(folder, 'study.yaml'), study);
    for (const [name, text] of Object.entries(files)) await writeFile(join(folder, name), text);
    return await runStudy(join(folder, 'study.yaml'));
  } finally {
    await rm(folder, { recursive: true });
  }
}

/** A CSV of columns of equal length. */
export function csvOf(columns: Readonly<Record<string, readonly (number | string)[]>>): string {
  const names = Object.keys(columns);
  const rows = columns[names[0]!]!.map((_, i) => names.map((name) => columns[name]![i]!).join(','));
  return `${[names.join(','), ...rows].join('\n')}\n`;
}
