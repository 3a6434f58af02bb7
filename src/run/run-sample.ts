import type { Table } from '../data/table.ts';
import { checkStandardErrors } from '../engine/check-standard-errors.ts';
import { prepareSample } from '../prepare/prepare-sample.ts';
import { tableOfRows } from '../prepare/rows-of-level.ts';
import type { Sample } from '../prepare/sample.ts';
import type { Problem, Report } from '../problem.ts';
import type { Run } from '../record/build-record.ts';
import type { Study } from '../study/study.ts';
import type { ReadStudy } from './read-study-and-data.ts';

/** What one run works on: a study with all rows, or with those of one level. */
export interface RunRows {
  readonly study: Study;
  readonly table: Table;
  readonly repeat: Run['repeat'];
}

/** The study and the rows of one run; null, with the reason reported, where the level is not there. */
function oneRun(
  { study, table, levels }: ReadStudy,
  level: string | undefined,
  report: Report,
): RunRows | null {
  if (study === null || table === null) return null;
  const variable = study.repeatFor ?? null;
  if (variable === null && level === undefined) return { study, table, repeat: null };
  const found = levels?.find((each) => each.level === level);
  if (variable === null || level === undefined || found === undefined) {
    report({
      code: 'repeat_level_unknown',
      severity: 'error',
      place: { kind: 'file', file: study.file },
      message:
        variable === null
          ? `The study does not repeat, so it has no run for "${level}".`
          : level === undefined
            ? `The study repeats for ${variable}, and no level was named.`
            : `No row has "${level}" as its ${variable}, which the study repeats for.`,
    });
    return null;
  }
  const rows = tableOfRows(study.data, table, found.rows, report);
  if (rows === null) return null;
  const label = study.data.variables.find(({ name }) => name === variable)?.label ?? variable;
  return {
    study: { ...study, title: `${study.title}: ${label} ${level}` },
    table: rows,
    repeat: { variable, level },
  };
}

/** Problems of one of many runs, each saying whose it is. */
export function ofLevel(level: string, problems: readonly Problem[]): Problem[] {
  return problems.map((problem) => ({ ...problem, message: `${level}: ${problem.message}` }));
}

export function sampleOf(
  read: ReadStudy,
  level: string | undefined,
): { readonly ground: RunRows | null; readonly sample: Sample | null; readonly problems: Problem[] } {
  const problems: Problem[] = [];
  const report: Report = (problem) => problems.push(problem);
  const ground = oneRun(read, level, report);
  const sample = ground === null ? null : prepareSample(ground.study, ground.table, report);
  if (ground !== null && sample !== null) checkStandardErrors(ground.study, sample, report);
  return { ground, sample, problems };
}
