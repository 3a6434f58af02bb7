import type { Problem } from '../problem.ts';
import type { Comparison } from './comparison-type.ts';
import type { GoneRun } from './overview.ts';
import type { StudyRecord } from './record-type.ts';
import { acceptanceValue, comparedCriterionSentence, criterionLabel } from './words/acceptance.ts';
import { lexiconOf } from './words/lexicon.ts';
import { fittedUnit } from './words/scale.ts';

/** One run of a study, for `junitText`. */
export interface JunitRun {
  /** The study file as it was named. */
  readonly study: string;
  /** Null where the run stopped on an error. */
  readonly record: StudyRecord | null;
  readonly problems: readonly Problem[];
  /** With an earlier record, which judges the criteria that need one; without, they are skipped. */
  readonly comparison?: Comparison | null;
}

/** What came of a run, as JUnit XML has it. */
export interface JunitSuite {
  readonly name: string;
  /** The study file as it was named. */
  readonly study: string;
  readonly cases: readonly TestCase[];
}

interface TestCase {
  readonly name: string;
  readonly outcome: 'passed' | 'failure' | 'error' | 'skipped';
  readonly type: string;
  readonly message: string;
}

/**
 * Runs as JUnit XML, in the form that continuous-integration servers read (common practice, after the report format of
 * Apache Ant's junit task): a suite for each study. No clock time.
 */
export function junitText(suites: readonly JunitSuite[]): string {
  const lines = [
    '<?xml version="1.0" encoding="UTF-8"?>',
    `<testsuites name="plumbrule" ${counts(suites.flatMap(({ cases }) => cases))}>`,
    ...suites.flatMap(({ name, study, cases }) => [
      `  <testsuite name="${escaped(name)}" ${counts(cases)}>`,
      ...cases.flatMap((one) => caseLines(one, study)),
      '  </testsuite>',
    ]),
    '</testsuites>',
  ];
  return `${lines.join('\n')}\n`;
}

/**
 * The suite of a run: one test for the run itself, one for the choice, and one for each acceptance criterion. A problem
 * that stopped the run is an error, a criterion missed a failure, and a criterion that could not be judged is skipped.
 */
export function junitSuite(run: JunitRun): JunitSuite {
  return { name: run.record?.study.title ?? run.study, study: run.study, cases: casesOf(run) };
}

/** The suite of an earlier record that no run stands for: one test, skipped. */
export function goneSuite({ name, folder }: GoneRun): JunitSuite {
  const message = `There is an earlier record in ${folder}, and no run now.`;
  const cases: TestCase[] = [{ name: RUNS, outcome: 'skipped', type: 'gone', message }];
  return { name, study: name, cases };
}

const RUNS = 'The study runs';

function casesOf({ record, problems, comparison }: JunitRun): TestCase[] {
  const errors = problems.filter(({ severity }) => severity === 'error');
  const ran: TestCase =
    errors.length === 0 && record !== null
      ? passed(RUNS)
      : {
          name: RUNS,
          outcome: 'error',
          type: errors[0]?.code ?? 'stopped',
          message: errors.map(said).join('\n') || 'The run stopped.',
        };
  if (record === null) return [ran];
  const { chosen, because } = record.selection;
  const choice = 'A candidate is admitted';
  const unit = fittedUnit(lexiconOf(record).response);
  return [
    ran,
    chosen === null
      ? { name: choice, outcome: 'failure', type: 'selection', message: because }
      : passed(choice),
    ...record.acceptance.map((criterion): TestCase => {
      const label = criterionLabel(criterion);
      const name = `${label}: ${criterion.limit}`;
      if (criterion.passed) return passed(name);
      const value = criterion.value === null ? 'not defined' : acceptanceValue(criterion, unit);
      const message = `${label} is ${value}; the study asks for ${criterion.limit}.`;
      return { name, outcome: 'failure', type: criterion.criterion, message };
    }),
    ...(comparison?.acceptance ?? record.acceptance_against_earlier ?? []).map(earlierCase),
  ];
}

function earlierCase(
  criterion:
    | Comparison['acceptance'][number]
    | NonNullable<StudyRecord['acceptance_against_earlier']>[number],
): TestCase {
  const name = `${criterionLabel(criterion)}: ${criterion.limit}`;
  const type = criterion.criterion;
  if (!('passed' in criterion)) {
    return { name, outcome: 'skipped', type, message: 'It needs an earlier record.' };
  }
  if (criterion.passed === true) return passed(name);
  const outcome = criterion.passed === null ? 'skipped' : 'failure';
  return { name, outcome, type, message: comparedCriterionSentence(criterion) };
}

function passed(name: string): TestCase {
  return { name, outcome: 'passed', type: '', message: '' };
}

function said({ place, message, hint }: Problem): string {
  const at =
    place.kind === 'command'
      ? ''
      : place.kind === 'source'
        ? `${place.file}:${place.line}:${place.column}  `
        : place.kind === 'cell'
          ? `${place.file}${place.row === undefined ? '' : `, row ${place.row}`}: `
          : `${place.file}: `;
  return `${at}${message}${hint === undefined ? '' : ` ${hint}`}`;
}

function counts(cases: readonly TestCase[]): string {
  const count = (outcome: TestCase['outcome']) => cases.filter((one) => one.outcome === outcome).length;
  return `tests="${cases.length}" failures="${count('failure')}" errors="${count('error')}" skipped="${count('skipped')}"`;
}

function caseLines({ name, outcome, type, message }: TestCase, study: string): string[] {
  const open = `    <testcase classname="${escaped(study)}" name="${escaped(name)}"`;
  if (outcome === 'passed') return [`${open}/>`];
  const [first = ''] = message.split('\n');
  if (outcome === 'skipped') {
    return [`${open}>`, `      <skipped message="${escaped(first)}"/>`, '    </testcase>'];
  }
  return [
    `${open}>`,
    `      <${outcome} message="${escaped(first)}" type="${escaped(type)}">${escaped(message)}</${outcome}>`,
    '    </testcase>',
  ];
}

/** Characters that XML 1.0 (2.2) has no place for, not even as references. */
const NOT_XML = /[^\t\n\r\u0020-\ud7ff\ue000-\ufffd\u{10000}-\u{10ffff}]/gu;

function escaped(text: string): string {
  return text
    .replace(NOT_XML, '\ufffd')
    .replaceAll('&', '&amp;')
    .replaceAll('<', '&lt;')
    .replaceAll('>', '&gt;')
    .replaceAll('"', '&quot;')
    .replaceAll('\n', '&#10;')
    .replaceAll('\r', '&#13;')
    .replaceAll('\t', '&#9;');
}
