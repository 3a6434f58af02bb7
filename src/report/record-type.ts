/**
 * The one place where the report takes in the record's type, so that the report's other files do not
 * depend on where that type is declared.
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
} from '../record/record.ts';
