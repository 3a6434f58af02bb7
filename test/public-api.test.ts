import { readFileSync } from 'node:fs';
import { expect, test } from 'vitest';
import * as plumbrule from '../src/index.ts';

/** What others may rely on. A change here is a change of version. */
const FUNCTIONS = [
  'checkStudy',
  'compareRecords',
  'predictFromRecord',
  'readCompared',
  'render',
  'renderComparison',
  'runStudy',
  'verifyRecord',
];

const TYPES = [
  'CheckedStudy',
  'Column',
  'ComparedSide',
  'Comparison',
  'Difference',
  'GroupTotal',
  'KeptRows',
  'KeptSample',
  'Place',
  'PredictRecordOptions',
  'PredictedFigures',
  'Problem',
  'ProblemCode',
  'RecordCandidate',
  'RecordCoefficient',
  'RecordExamination',
  'RecordFinding',
  'RecordModel',
  'RecordPrediction',
  'RecordPredictions',
  'RecordTerm',
  'RecordVariable',
  'RenderOptions',
  'Rendered',
  'Report',
  'ReportFormat',
  'ResidualColumns',
  'RowOutcome',
  'RunOptions',
  'RunResult',
  'Sample',
  'Severity',
  'Study',
  'StudyRecord',
  'Table',
  'Verified',
  'VerifyOptions',
];

test('the library has these functions and no others', () => {
  expect(Object.keys(plumbrule).sort()).toEqual(FUNCTIONS);
  for (const value of Object.values(plumbrule)) expect(typeof value).toBe('function');
});

test('the library names these types and no others', () => {
  const text = readFileSync(new URL('../src/index.ts', import.meta.url), 'utf8').replace(
    /\/\*[\s\S]*?\*\//g,
    '',
  );
  const names = [...text.matchAll(/export (type )?\{([^}]*)\}/g)].flatMap(([, all, list]) =>
    (list as string)
      .split(',')
      .map((entry) => entry.trim())
      .filter((entry) => entry !== '' && (all !== undefined || entry.startsWith('type ')))
      .map((entry) => entry.replace(/^type /, '')),
  );
  expect(names.sort()).toEqual(TYPES);
  expect(text).not.toMatch(/export \*/);
});
