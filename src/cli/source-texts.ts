import { readFile } from 'node:fs/promises';
import type { Problem } from '../problem.ts';

/**
 * The text of the file at `path`, by the names under which problems point into it. Problems name a file
 * as reports show it; all places in a source text that a command can meet are in the one file it was given.
 */
export async function sourceTexts(path: string, problems: readonly Problem[]): Promise<Map<string, string>> {
  const names = new Set(
    problems.flatMap((problem) => (problem.place.kind === 'source' ? [problem.place.file] : [])),
  );
  if (names.size === 0) return new Map();
  try {
    const text = await readFile(path, 'utf8');
    return new Map([...names].map((name) => [name, text]));
  } catch {
    return new Map();
  }
}
