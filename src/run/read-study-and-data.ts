import { readTable } from '../data/read-table.ts';
import type { Table } from '../data/table.ts';
import { checkFindingNames } from '../examine/check-finding-names.ts';
import { wholeNumber } from '../numerals.ts';
import { type LevelRows, rowsByLevel } from '../prepare/rows-of-level.ts';
import { hasError, type Problem, type Report } from '../problem.ts';
import { readStudy } from '../study/read-study.ts';
import type { Study } from '../study/study.ts';

export interface RunOptions {
  /** Values for the study's parameters, by name, as text; the defaults where left out. */
  readonly parameters?: ReadonlyMap<string, string>;
  /** For a study that repeats for a variable: the level whose rows are run. */
  readonly level?: string;
  /** Told of long work: the stage in words, how much is done, and of how much where that is known. */
  readonly onProgress?: (stage: string, done: number, total: number | null) => void;
}

/** A study with its data, read once for all that is done with it. */
export interface ReadStudy {
  readonly study: Study | null;
  /** Null where it cannot be used. */
  readonly table: Table | null;
  /** False where the study itself kept its data from being looked at. */
  readonly dataRead: boolean;
  readonly problems: readonly Problem[];
  /** The rows of each level that the study repeats for; null where it does not repeat, or nothing was read. */
  readonly levels: readonly LevelRows[] | null;
}

/** Reads and checks a study and its data's contract. */
export async function readStudyAndData(path: string, options: RunOptions = {}): Promise<ReadStudy> {
  const problems: Problem[] = [];
  const report: Report = (problem) => problems.push(problem);
  const study = await readStudy(path, report, options.parameters);
  if (study === null || hasError(problems)) {
    return { study, table: null, dataRead: false, problems, levels: null };
  }
  const repeatFor = study.repeatFor ?? null;
  const table = await readTable(study.data, study.folder, report, {
    onProgress: (rows) => options.onProgress?.('reading rows', rows, null),
    // Each level lists and counts its own, which a list cut short does not tell.
    ...(repeatFor === null || study.data.onBadValue === 'stop' ? {} : { limit: Number.POSITIVE_INFINITY }),
  });
  checkFindingNames(study, report);
  const column = repeatFor === null ? undefined : table?.columns.get(repeatFor);
  const levels = column === undefined ? null : rowsByLevel(column);
  if (table !== null && levels !== null) reportWithoutLevel(study, table, levels, report);
  return { study, table, dataRead: true, problems, levels };
}

/** Rows that belong to no run, and that there is any run at all. */
function reportWithoutLevel(study: Study, table: Table, levels: readonly LevelRows[], report: Report): void {
  const without = levels.reduce((left, { rows }) => left - rows.length, table.rowCount);
  if (without === 0) return;
  const none = levels.length === 0;
  report({
    code: 'repeat_level_missing',
    severity: none ? 'error' : 'warning',
    place: { kind: 'cell', file: table.file, variable: study.repeatFor! },
    message: none
      ? `No row has a value of ${study.repeatFor}, which the study repeats for.`
      : `${wholeNumber(without)} ${without === 1 ? 'row has' : 'rows have'} no value of ${study.repeatFor}, which the study repeats for, and ${without === 1 ? 'belongs' : 'belong'} to no run.`,
  });
}
