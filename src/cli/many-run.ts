import type { Comparison } from '../compare/comparison.ts';
import type { Problem } from '../problem.ts';
import type { StudyRecord } from '../record/record.ts';
import { type JunitSuite, junitSuite } from '../report/junit.ts';
import { type OverviewEntry, overviewEntry } from '../report/overview.ts';
import { OWN_FAULT } from './exit-status.ts';

/** What tells a run from the others. */
export interface RunPlace {
  /** What it is called among the others: the study's name, the level. */
  readonly name: string;
  /** The folder of its results, relative to that of the overview, with forward slashes. */
  readonly folder: string;
  /** The study file as it was named, with the level where there is one. */
  readonly study: string;
  /** Whether it has an earlier record; null where runs are not compared, or this one could not be looked for. */
  readonly hasEarlier: boolean | null;
}

/**
 * What is kept of one run of many: what the overview, JUnit XML and the terminal say of it. Records are far larger, and
 * are let go of as soon as this is made.
 */
export interface ManyRun {
  readonly folder: string;
  readonly entry: OverviewEntry;
  readonly suite: JunitSuite;
  readonly problems: readonly Problem[];
  readonly status: number;
  /** Where templates lie, by the names under which problems know them. */
  readonly templates: ReadonlyMap<string, string>;
  /** The fault of the program that ended it, for `PLUMBRULE_DEBUG`; else null. */
  readonly fault: string | null;
}

export interface RunFound {
  /** Null where the run stopped on an error. */
  readonly record: StudyRecord | null;
  /** Null where it was not compared with an earlier record. */
  readonly comparison: Comparison | null;
  /** Names of the files in its folder. */
  readonly files: readonly string[];
  readonly problems: readonly Problem[];
  readonly status: number;
  readonly templates?: ReadonlyMap<string, string>;
}

/** What is kept of a run. */
export function manyRun(place: RunPlace, found: RunFound, fault: string | null = null): ManyRun {
  const run = { ...place, ...found };
  const { problems, status } = found;
  return {
    folder: place.folder,
    entry: overviewEntry(run),
    suite: junitSuite(run),
    problems,
    status,
    templates: found.templates ?? new Map(),
    fault,
  };
}

/** A run that a fault of the program ended. `path` is that of its study. */
export function faultyRun(place: RunPlace, path: string, fault: string): ManyRun {
  const [first = ''] = fault.split('\n');
  const problem: Problem = {
    code: 'run_failed',
    severity: 'error',
    place: { kind: 'file', file: path },
    message: `${place.study === path ? '' : `${place.name}: `}The run failed through a fault of the program's own, and nothing of it was written. ${first}${/[.!?]$/.test(first) ? '' : '.'}`,
    hint: 'Set PLUMBRULE_DEBUG=1 to see where it happened.',
  };
  const found = { record: null, comparison: null, files: [], problems: [problem], status: OWN_FAULT };
  return manyRun(place, found, fault);
}
