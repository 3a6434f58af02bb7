import { readdir } from 'node:fs/promises';
import { join, resolve } from 'node:path';
import type { Report } from '../problem.ts';
import { isFolderOfStudies } from './is-folder.ts';

/**
 * The study files that paths name: a file is itself, a folder stands for every `study.yaml` and `*.study.yaml` in it
 * and below, in the order of their paths. Folders called node_modules or results and hidden ones are passed over, and
 * so are links to folders, which may go round in a circle. Each file once, however often it is named. A folder
 * without a study is reported.
 */
export async function findStudies(paths: readonly string[], report: Report): Promise<string[]> {
  const found = new Map<string, string>();
  const add = (path: string) => {
    if (!found.has(resolve(path))) found.set(resolve(path), path);
  };
  for (const path of paths) {
    if (!(await isFolderOfStudies(path))) {
      add(path);
      continue;
    }
    const inside = await studiesBelow(path, report);
    if (inside.length === 0) {
      report({
        code: 'command_unusable',
        severity: 'error',
        place: { kind: 'command' },
        message: `There is no study in the folder "${path}" or below it.`,
        hint: 'A study file is called study.yaml or ends in .study.yaml.',
      });
    }
    for (const each of inside) add(each);
  }
  return [...found.values()];
}

const STUDY_FILE = /^(?:study|.+\.study)\.ya?ml$/;

async function studiesBelow(folder: string, report: Report): Promise<string[]> {
  let entries: Awaited<ReturnType<typeof entriesOf>>;
  try {
    entries = await entriesOf(folder);
  } catch (fault) {
    report({
      code: 'command_unusable',
      severity: 'error',
      place: { kind: 'command' },
      message: `The folder "${folder}" cannot be looked into (${String((fault as NodeJS.ErrnoException).code)}).`,
    });
    return [];
  }
  const studies: string[] = [];
  for (const entry of entries) {
    const path = join(folder, entry.name);
    if (entry.isDirectory()) {
      const passed = entry.name.startsWith('.') || ['node_modules', 'results'].includes(entry.name);
      if (!passed) studies.push(...(await studiesBelow(path, report)));
    } else if (STUDY_FILE.test(entry.name) && !entry.name.startsWith('.')) {
      studies.push(path);
    }
  }
  return studies;
}

/** Sorted by code units: no file system's order and no locale. */
async function entriesOf(folder: string) {
  const entries = await readdir(folder, { withFileTypes: true });
  return entries.sort((a, b) => (a.name < b.name ? -1 : a.name > b.name ? 1 : 0));
}
