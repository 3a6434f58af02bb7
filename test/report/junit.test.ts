import { describe, expect, test } from 'vitest';
import { type JunitRun, junitSuite, junitText } from '../../src/report/junit.ts';
import { smallRecord } from '../record/small-record.ts';

const junitOf = (runs: readonly JunitRun[]) => junitText(runs.map(junitSuite));

const record = () => ({
  ...smallRecord(),
  acceptance: [
    { criterion: 'r_squared', limit: 'at least 0.9', value: 0.97, passed: true },
    { criterion: 'coefficient', of: 'a<b & "c"', limit: 'at most 1', value: 2, passed: false },
    { criterion: 'p_value', of: 'equal_spread', limit: 'at least 0.05', value: null, passed: false },
  ],
});

describe('JUnit XML', () => {
  test('a test for the run, the choice and each criterion', () => {
    const text = junitOf([{ study: 'small.study.yaml', record: record(), problems: [] }]);
    expect(text).toBe(`<?xml version="1.0" encoding="UTF-8"?>
<testsuites name="plumbrule" tests="5" failures="2" errors="0" skipped="0">
  <testsuite name="A small study" tests="5" failures="2" errors="0" skipped="0">
    <testcase classname="small.study.yaml" name="The study runs"/>
    <testcase classname="small.study.yaml" name="A candidate is admitted"/>
    <testcase classname="small.study.yaml" name="R²: at least 0.9"/>
    <testcase classname="small.study.yaml" name="Coefficient of a&lt;b &amp; &quot;c&quot;: at most 1">
      <failure message="Coefficient of a&lt;b &amp; &quot;c&quot; is 2; the study asks for at most 1." type="coefficient">Coefficient of a&lt;b &amp; &quot;c&quot; is 2; the study asks for at most 1.</failure>
    </testcase>
    <testcase classname="small.study.yaml" name="P-value of equal spread: at least 0.05">
      <failure message="P-value of equal spread is not defined; the study asks for at least 0.05." type="p_value">P-value of equal spread is not defined; the study asks for at least 0.05.</failure>
    </testcase>
  </testsuite>
</testsuites>
`);
  });

  test('what stopped a run is an error with its place; warnings are not', () => {
    const text = junitOf([
      {
        study: 'a.yaml',
        record: null,
        problems: [
          {
            code: 'name_unused',
            severity: 'warning',
            place: { kind: 'command' },
            message: 'Only a warning.',
          },
          {
            code: 'cell_not_number',
            severity: 'error',
            place: { kind: 'cell', file: 'a.csv', row: 3, variable: 'x' },
            message: '"1\u0000\u001b" is not a number.',
            hint: 'Look there.',
          },
          {
            code: 'yaml_syntax',
            severity: 'error',
            place: { kind: 'source', file: 'a.yaml', line: 2, column: 5, length: 1 },
            message: 'Second.',
          },
        ],
      },
    ]);
    expect(text).toContain('tests="1" failures="0" errors="1"');
    expect(text).toContain(
      '<error message="a.csv, row 3: &quot;1\ufffd\ufffd&quot; is not a number. Look there." type="cell_not_number">',
    );
    expect(text).toContain('Look there.&#10;a.yaml:2:5  Second.</error>');
    expect(text).not.toContain('Only a warning');
  });

  test('no candidate admitted is a failure; no runs are an empty list', () => {
    const none = record();
    const text = junitOf([
      { study: 's', record: { ...none, selection: { ...none.selection, chosen: null } }, problems: [] },
    ]);
    expect(text).toContain('<failure message');
    expect(junitOf([])).toContain('tests="0" failures="0" errors="0"');
  });
});
