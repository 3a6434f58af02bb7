import type { ReadStudy } from '../run.ts';
import { type FittedStudy, fitRead } from './fit-one.ts';

/** A run that is to be made. */
export interface Job {
  readonly level: string;
  readonly out: string;
}

/** What came of a job; a fault of the program is a text. */
export type JobResult = { readonly fitted: FittedStudy } | { readonly fault: string };

/** The runs one after the other, in the order of the jobs. */
export async function inTurn(
  path: string,
  read: ReadStudy,
  jobs: readonly Job[],
  parameters: ReadonlyMap<string, string>,
  onDone: () => void,
): Promise<JobResult[]> {
  const results: JobResult[] = [];
  for (const job of jobs) {
    results.push(await doJob(path, read, job, parameters));
    onDone();
  }
  return results;
}

/** One run; a fault of the program is its result and nothing more. */
export async function doJob(
  path: string,
  read: ReadStudy,
  { level, out }: Job,
  parameters: ReadonlyMap<string, string>,
): Promise<JobResult> {
  try {
    return { fitted: await fitRead(path, read, out, { level, parameters }) };
  } catch (fault) {
    return { fault: faultText(fault) };
  }
}

export function faultText(fault: unknown): string {
  return fault instanceof Error ? (fault.stack ?? `${fault.name}: ${fault.message}`) : String(fault);
}
