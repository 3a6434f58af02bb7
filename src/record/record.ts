/**
 * The record of a run, as schemas/record.schema.json describes it. The types are generated from that
 * schema; this file names the parts that other rooms use.
 */
export type {
  RecordCandidate,
  RecordCoefficient,
  RecordEarlierCriterion,
  RecordExamination,
  RecordFamily,
  RecordFinding,
  RecordModel,
  RecordPrediction,
  RecordTerm,
  RecordVariable,
  StudyRecord,
} from './study-record.generated.ts';
