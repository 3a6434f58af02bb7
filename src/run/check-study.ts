import type { Table } from '../data/table.ts';
import type { Sample } from '../prepare/sample.ts';
import type { Problem } from '../problem.ts';
import type { Study } from '../study/study.ts';
import { type RunOptions, readStudyAndData } from './read-study-and-data.ts';
import { ofLevel, sampleOf } from './run-sample.ts';

export interface CheckedStudy {
  readonly study: Study | null;
  readonly table: Table | null;
  readonly sample: Sample | null;
  /** False where the study itself kept its data from being looked at. */
  readonly dataRead: boolean;
  /** Everything found, in the order found. */
  readonly problems: readonly Problem[];
}

/** Reads and checks a study and its data, down to the rows that would be fitted, and fits nothing. */
export async function checkStudy(path: string, options: RunOptions = {}): Promise<CheckedStudy> {
  const read = await readStudyAndData(path, options);
  const { study, table, dataRead } = read;
  const problems = [...read.problems];
  if (study === null || table === null) return { study, table, sample: null, dataRead, problems };
  if (read.levels !== null && options.level === undefined) {
    // Each run has its own rows: all are checked, and none of them stands for the study.
    for (const { level } of read.levels) problems.push(...ofLevel(level, sampleOf(read, level).problems));
    return { study, table, sample: null, dataRead, problems };
  }
  const made = sampleOf(read, options.level);
  return {
    study: made.ground?.study ?? study,
    table: made.ground?.table ?? table,
    sample: made.sample,
    dataRead,
    problems: [...problems, ...made.problems],
  };
}
