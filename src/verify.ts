import { createHash } from 'node:crypto';
import { readFile, realpath, stat } from 'node:fs/promises';
import { dirname, join, relative, resolve } from 'node:path';
import { packageVersion } from './package-file.ts';
import type { Problem, Report } from './problem.ts';
import { countNumbers, type Difference, differences } from './record/differences.ts';
import { readRecord } from './record/read-record.ts';
import type { StudyRecord } from './record/record.ts';
import { recordText } from './record/record-text.ts';
import type { RunOptions } from './run/read-study-and-data.ts';
import { runStudy } from './run/run-study.ts';

export interface VerifyOptions extends Pick<RunOptions, 'onProgress'> {
  /** The study file, or the folder that it lies in; looked for where left out (see `findStudy`). */
  readonly study?: string;
  /** Relative difference up to which two numbers are taken as the same; 0, the default: they are the same double. */
  readonly tolerance?: number;
}

export interface Verified {
  readonly record: StudyRecord | null;
  /** The study that was run, as a path from the current folder; null where none was. */
  readonly study: string | null;
  /** Whether the study could be run again; only then do the differences mean anything. */
  readonly ran: boolean;
  /** Numbers of the record that were compared. */
  readonly compared: number;
  readonly differences: readonly Difference[];
  /** Hashes and versions that are not those of the record, and whatever kept the study from running. */
  readonly problems: readonly Problem[];
}

/**
 * Runs the study of a record again, with the parameters that the record states, and compares everything: reading ─
 * finding the study ─ running ─ comparing.
 */
export async function verifyRecord(path: string, options: VerifyOptions = {}): Promise<Verified> {
  const problems: Problem[] = [];
  const report: Report = (problem) => problems.push(problem);
  const failed = (record: StudyRecord | null, study: string | null): Verified => ({
    record,
    study,
    ran: false,
    compared: 0,
    differences: [],
    problems,
  });
  const record = await readRecord(path, report);
  if (record === null) return failed(null, null);
  const study = await findStudy(path, record, options.study, report);
  if (study === null) return failed(record, null);

  const given = (record.study.parameters ?? []).filter((parameter) => parameter.given);
  const again = await runStudy(study, {
    parameters: new Map(given.map(({ name, value }) => [name, String(value)])),
    ...(record.data.repeat == null ? {} : { level: record.data.repeat.level }),
    ...(options.onProgress === undefined ? {} : { onProgress: options.onProgress }),
  });
  if (again.record === null) {
    problems.push(...again.problems.filter(({ severity }) => severity === 'error'));
    return failed(record, study);
  }
  reportOrigins(path, record, again.record, report);
  // Through text and back: a record holds what its text says, and a negative zero is 0 there.
  const later = JSON.parse(recordText(again.record)) as StudyRecord;
  return {
    record,
    study,
    ran: true,
    compared: countNumbers(record),
    differences: differences(record, later, options.tolerance ?? 0),
    problems,
  };
}

/** Folders above that of the record in which its study is looked for. */
const LEVELS = 3;

/**
 * The study file of a record, which states its name and hash but not where it lies. Named by the caller, it is taken as
 * it is. Otherwise it is looked for in the folder of the record, up to three folders above it, and in the current
 * folder, and has to be the very file that the record was made from; two such files in different places are not
 * decided between.
 */
export async function findStudy(
  recordPath: string,
  record: StudyRecord,
  named: string | undefined,
  report: Report,
): Promise<string | null> {
  const { file, sha256 } = record.study;
  const refuse = (message: string, hint: string) => {
    report({
      code: 'study_not_found',
      severity: 'error',
      place: { kind: 'file', file: recordPath },
      message,
      hint,
    });
    return null;
  };
  if (named !== undefined) return (await isFolder(named)) ? join(named, file) : named;

  const folders = [resolve(dirname(recordPath))];
  while (folders.length <= LEVELS) folders.push(dirname(folders.at(-1)!));
  folders.push(resolve('.'));
  const same = new Map<string, string>();
  const other: string[] = [];
  for (const folder of new Set(folders)) {
    const path = join(folder, file);
    const hash = await hashOf(path);
    if (hash === sha256) same.set(await realpath(path), shownPath(path));
    else if (hash !== null) other.push(shownPath(path));
  }
  const [first, ...more] = same.values();
  if (first === undefined && other.length > 0) {
    return refuse(
      `The study ${file} was not found: ${other.join(' and ')} is not the file that the record was made from, or has changed since.`,
      'Name it with --study to run it all the same.',
    );
  }
  if (first === undefined) {
    return refuse(
      `The study ${file} was not found in the record's folder, in those above it or in the current folder.`,
      'Name it with --study.',
    );
  }
  return more.length === 0
    ? first
    : refuse(
        `The study ${file} was found more than once: ${[first, ...more].join(', ')}.`,
        'Say which with --study.',
      );
}

/** What the record and the new run do not share from the start. */
function reportOrigins(path: string, record: StudyRecord, again: StudyRecord, report: Report): void {
  const place = { kind: 'file', file: path } as const;
  if (record.tool.version !== again.tool.version) {
    report({
      code: 'record_other_version',
      severity: 'warning',
      place,
      message: `The record was made by version ${record.tool.version} of Plumbrule, and this is version ${packageVersion()}; differences may come from that.`,
    });
  }
  const changed = (what: string, file: string) =>
    report({
      code: 'record_differs',
      severity: 'error',
      place,
      message: `${what} ${file} is not the file that the record was made from: its SHA-256 differs.`,
    });
  if (record.study.sha256 !== again.study.sha256) changed('The study', again.study.file);
  if (record.data.sha256 !== again.data.sha256) changed('The data file', again.data.file);
}

async function hashOf(path: string): Promise<string | null> {
  try {
    return createHash('sha256')
      .update(await readFile(path))
      .digest('hex');
  } catch {
    return null;
  }
}

async function isFolder(path: string): Promise<boolean> {
  try {
    return (await stat(path)).isDirectory();
  } catch {
    return false;
  }
}

function shownPath(path: string): string {
  const near = relative('.', path);
  return near.startsWith('..') ? path : near;
}
