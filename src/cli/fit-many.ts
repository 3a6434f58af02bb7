import { join } from 'node:path';
import { hasError } from '../problem.ts';
import { type ReadStudy, type RunOptions, readStudyAndData } from '../run/read-study-and-data.ts';
import { studyName } from './fit-one.ts';
import { doJob, faultText, inTurn, type Job } from './level-job.ts';
import type { ManyRecords } from './many-records.ts';
import { faultyRun, type ManyRun } from './many-run.ts';
import { safeNames } from './safe-names.ts';

export interface ManyOptions {
  readonly parameters: ReadonlyMap<string, string>;
  readonly onProgress?: NonNullable<RunOptions['onProgress']>;
  /** The records of an earlier such run, as found before anything is written; each run is held against that at its place. */
  readonly earlier?: ManyRecords | null;
}

/**
 * Runs several studies, one after the other, each into its own folder below `out`. None stops the others, not even by a
 * fault of the program.
 */
export async function fitMany(
  paths: readonly string[],
  out: string,
  options: ManyOptions,
): Promise<ManyRun[]> {
  const folders = safeNames(paths.map(studyName));
  const runs: ManyRun[] = [];
  for (const [index, path] of paths.entries()) {
    const folder = folders[index]!;
    const progress: NonNullable<RunOptions['onProgress']> = (stage, done, total) =>
      options.onProgress?.(`${folder} (${index + 1} of ${paths.length}): ${stage}`, done, total);
    const inner = { ...options, onProgress: progress };
    const job = jobOf({ name: folder, folder, study: path, level: null }, out, options.earlier);
    try {
      const read = await readStudyAndData(path, inner);
      if (read.levels !== null && read.table !== null) {
        runs.push(...(await fitRepeats(path, read, out, inner, folder)));
      } else {
        const { parameters } = options;
        runs.push(await doJob(path, read, asked(read, job), { parameters, onProgress: progress }));
      }
    } catch (fault) {
      runs.push(faultyRun(job, path, faultText(fault)));
    }
  }
  return runs;
}

/**
 * Runs a study that repeats, once for each level, each into its own folder below `out`; the runs come in the order of
 * the levels.
 * @param name the study's among others, which begins the names of its runs and is the folder of theirs; left out where it
 * is the only one
 */
export async function fitRepeats(
  path: string,
  read: ReadStudy,
  out: string,
  options: ManyOptions,
  name: string | null = null,
): Promise<ManyRun[]> {
  const levels = (read.levels ?? []).map(({ level }) => level);
  if (levels.length === 0 || hasError(read.problems)) {
    const place = { name: name ?? studyName(path), folder: name ?? '.', study: path, level: null };
    return [await doJob(path, { ...read, table: null }, jobOf(place, out, null), {})];
  }
  const folders = safeNames(levels);
  const jobs = levels.map((level, index): Job => {
    const shown = name === null ? level : `${name}, ${level}`;
    const folder = name === null ? folders[index]! : `${name}/${folders[index]!}`;
    return jobOf({ name: shown, folder, study: `${path}, ${level}`, level }, out, options.earlier);
  });
  let done = 0;
  const onDone = () => options.onProgress?.('fitting levels', ++done, jobs.length);
  const { inThreads, threadsFor } = await import('./level-threads.ts');
  const threads = threadsFor(read.study!, jobs.length, read.table!.rowCount);
  const runs =
    threads > 1
      ? await inThreads(path, read, jobs, options.parameters, threads, onDone)
      : await inTurn(path, read, jobs, options.parameters, onDone);
  // What was found in reading the study and its data is the study's, and said once.
  const [first, ...rest] = runs;
  return [{ ...first!, problems: [...read.problems, ...first!.problems] }, ...rest];
}

function jobOf(
  place: Pick<Job, 'name' | 'folder' | 'study' | 'level'>,
  out: string,
  earlier: ManyRecords | null | undefined,
): Job {
  const { folder } = place;
  const job = { ...place, out: join(out, folder), hasEarlier: null, earlier: null };
  if (earlier == null) return job;
  if (earlier.folders.has(folder)) return { ...job, hasEarlier: true, earlier: join(earlier.root, folder) };
  // Where levels of it were run before, it is not new.
  const repeated = place.level === null && [...earlier.folders].some((each) => each.startsWith(`${folder}/`));
  return repeated ? job : { ...job, hasEarlier: false };
}

/** A study that repeats but whose levels could not be read is held against nothing. */
function asked({ study }: ReadStudy, job: Job): Job {
  return (study?.repeatFor ?? null) === null ? job : { ...job, hasEarlier: null, earlier: null };
}
