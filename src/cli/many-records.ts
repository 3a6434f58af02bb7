import { readdir } from 'node:fs/promises';
import { join } from 'node:path';
import type { ComparedSide } from '../compare/compare.ts';
import type { Report } from '../problem.ts';
import { finishMoves } from '../record/move-results.ts';
import { readRecord } from '../record/read-record.ts';
import type { StudyRecord } from '../record/record.ts';
import type { GoneRun } from '../report/overview.ts';
import { isThere } from './is-there.ts';

/** The records of many runs, each in its own folder below that of all. */
export interface ManyRecords {
  readonly root: string;
  /** Folders with a record, relative to the root, with forward slashes, in the order of their names. */
  readonly folders: ReadonlySet<string>;
}

/** How deep folders of runs lie: a study's levels lie in a folder of the study where there are several studies. */
export const DEEPEST = 2;

/** Records in the folders below `root`, down to so many levels; the root's own record apart. Hidden folders are passed over. */
export async function findRecords(root: string, depth: number): Promise<ManyRecords> {
  return { root, folders: new Set(await foldersBelow(root, '', depth)) };
}

async function foldersBelow(root: string, folder: string, depth: number): Promise<string[]> {
  if (depth === 0) return [];
  const entries = await readdir(join(root, folder), { withFileTypes: true }).catch(() => []);
  const names = entries
    .filter((entry) => !entry.isFile() && !entry.name.startsWith('.'))
    .map(({ name }) => name);
  const found: string[] = [];
  // By code units: no file system's order and no locale.
  for (const name of names.sort()) {
    const path = folder === '' ? name : `${folder}/${name}`;
    if (await hasRecord(join(root, path))) found.push(path);
    found.push(...(await foldersBelow(root, path, depth - 1)));
  }
  return found;
}

/** Whether results of one run lie in a folder; where a run was killed while it moved them in, that is finished first. */
export async function hasRecord(folder: string): Promise<boolean> {
  const record = join(folder, 'record.json');
  if (await isThere(record)) return true;
  await finishMoves(folder);
  return isThere(record);
}

/** The earlier records that many runs are held against; null, with an error reported, where there are none. */
export async function findEarlier(root: string, depth: number, report: Report): Promise<ManyRecords | null> {
  const records = await findRecords(root, depth);
  if (records.folders.size > 0) return records;
  const what = !(await isThere(root))
    ? 'and there is nothing there'
    : root.endsWith('.json') || (await hasRecord(root))
      ? 'and that is one record'
      : 'and there is no record in the folders below it';
  report({
    code: 'command_unusable',
    severity: 'error',
    place: { kind: 'command' },
    message: `--against names "${root}", ${what}: these are several runs, each of which is held against its own earlier record.`,
    hint: 'Name the folder that an earlier run of the same went to with --out: each record is looked for in the folder of its run there.',
  });
  return null;
}

/**
 * Earlier records that no run stands for any more. What a run that failed may have held counts as there still: it cannot
 * be told.
 */
export async function goneRuns(
  { root, folders }: ManyRecords,
  runs: readonly { readonly folder: string; readonly entry: { readonly outcome: string } }[],
): Promise<GoneRun[]> {
  const there = new Set(runs.map(({ folder }) => folder));
  const failed = runs.flatMap(({ folder, entry }) => (entry.outcome === 'failed' ? [folder] : []));
  const covered = (folder: string) =>
    there.has(folder) || failed.some((each) => each === '.' || folder.startsWith(`${each}/`));
  const gone: GoneRun[] = [];
  for (const folder of folders) {
    if (covered(folder)) continue;
    const record = await readRecord(join(root, folder, 'record.json'), () => {});
    gone.push({
      name: record === null ? folder : recordName(folder, record),
      folder,
      chosen: record?.selection.chosen ?? null,
      rowsUsed: record?.data.rows_used ?? null,
    });
  }
  return gone;
}

/** The earlier record of a run; null where what lies at its place is of another level, which is a warning. */
export async function readEarlier(
  folder: string,
  level: string | null,
  report: Report,
): Promise<ComparedSide | null> {
  const { readCompared } = await import('../compare/read-compared.ts');
  const earlier = await readCompared(folder, report);
  if (earlier === null) return null;
  const was = earlier.record.data.repeat?.level ?? null;
  if (was === level) return earlier;
  report({
    code: 'records_unlike',
    severity: 'warning',
    place: { kind: 'file', file: earlier.file },
    message: `This earlier record is ${was === null ? 'of all levels together' : `of the level "${was}"`}, so that the run ${level === null ? 'of all levels together' : `of "${level}"`} is not compared with it.`,
  });
  return null;
}

/** What a record is called among others: by its level, with the study's folder where it lies in one. */
export function recordName(folder: string, { data }: StudyRecord): string {
  const level = data.repeat?.level;
  if (level === undefined) return folder;
  const [study, ...below] = folder.split('/');
  return below.length === 0 ? level : `${study}, ${level}`;
}
