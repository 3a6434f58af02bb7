import type { RecordCandidate, StudyRecord } from '../record-type.ts';

/**
 * The chosen candidate with the figures that the model is reported by: of the rows that the choice was not made on, where the
 * study splits them. Undefined where none was chosen.
 */
export function estimatedCandidate(record: StudyRecord): RecordCandidate | undefined {
  return (
    record.selection.split_sample?.estimated ??
    record.candidates.find((candidate) => candidate.name === record.selection.chosen)
  );
}
