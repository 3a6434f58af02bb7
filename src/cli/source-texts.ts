import { readFile } from 'node:fs/promises';
import type { Problem } from '../problem.ts';

/**
 * The texts of the files that problems point into, for excerpts. `paths` says where a file lies that problems
 * name otherwise; all others are named by their path. One that cannot be read is left out.
 */
export async function sourceTexts(
  problems: readonly Problem[],
  paths: ReadonlyMap<string, string> = new Map(),
): Promise<Map<string, string>> {
  const names = new Set(
    problems.flatMap((problem) => (problem.place.kind === 'source' ? [problem.place.file] : [])),
  );
  const texts = new Map<string, string>();
  for (const name of names) {
    try {
      texts.set(name, await readFile(paths.get(name) ?? name, 'utf8'));
    } catch {
      // The problem is shown without its line.
    }
  }
  return texts;
}

/** Problems in a template that the command line names stand at that file, whatever the library calls it. */
export function placedAt(problems: readonly Problem[], paths: ReadonlyMap<string, string>): Problem[] {
  return problems.map((problem) => {
    const { place } = problem;
    const path = place.kind === 'source' ? paths.get(place.file) : undefined;
    return path === undefined || place.kind !== 'source'
      ? problem
      : { ...problem, place: { ...place, file: path } };
  });
}
