import { createHash } from 'node:crypto';
import { jsonPieces, type SchemaNode } from './json.ts';
import type { StudyRecord } from './record.ts';
import { recordSchema } from './record-schema.ts';

/** The text of record.json: keys in the schema's order, full-precision numbers, the same bytes every time. */
export function recordText(record: StudyRecord): string {
  return recordPieces(record).join('');
}

/** The same text in pieces, for writing. */
export function recordPieces(record: StudyRecord): string[] {
  schema ??= recordSchema();
  return jsonPieces(record, schema);
}

/** SHA-256 of that text, as hexadecimal digits. */
export function recordSha256(record: StudyRecord): string {
  const hash = createHash('sha256');
  for (const piece of recordPieces(record)) hash.update(piece);
  return hash.digest('hex');
}

/** Read once: a run over many levels writes a record for each. */
let schema: SchemaNode | undefined;
