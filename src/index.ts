/**
 * Plumbrule as a library: the same stages as the command line, as functions. Everything that can be wrong
 * with a study or its data comes back as problems with a place; only a fault of the program throws.
 */
export { type ComparedSide, compareRecords } from './compare/compare.ts';
export type { Comparison } from './compare/comparison.ts';
export { readCompared } from './compare/read-compared.ts';
export type { Column, Table } from './data/table.ts';
export {
  type GroupTotal,
  type PredictedFigures,
  type PredictRecordOptions,
  predictFromRecord,
  type RecordPredictions,
  type RowOutcome,
} from './predict-record.ts';
export type { Sample } from './prepare/sample.ts';
export type { Place, Problem, ProblemCode, Report, Severity } from './problem.ts';
export type { Difference } from './record/differences.ts';
export type { KeptSample } from './record/keep-sample.ts';
export type { KeptRows } from './record/read-sample.ts';
export type {
  RecordCandidate,
  RecordCoefficient,
  RecordExamination,
  RecordFinding,
  RecordModel,
  RecordPrediction,
  RecordTerm,
  RecordVariable,
  StudyRecord,
} from './record/record.ts';
export type { ResidualColumns } from './record/tables.ts';
export { type Rendered, type RenderOptions, render } from './report/render.ts';
export { renderComparison } from './report/render-comparison.ts';
export type { ReportFormat } from './report/template-names.ts';
export { type CheckedStudy, checkStudy } from './run/check-study.ts';
export type { RunOptions } from './run/read-study-and-data.ts';
export { type RunResult, runStudy } from './run/run-study.ts';
export type { Study } from './study/study.ts';
export { type Verified, type VerifyOptions, verifyRecord } from './verify.ts';
