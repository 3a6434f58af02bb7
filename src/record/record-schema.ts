import { packageFile } from '../package-file.ts';
import type { SchemaNode } from './json.ts';

/** The record's JSON Schema, read from the file that is shipped beside the program. */
export function recordSchema(): SchemaNode {
  return JSON.parse(packageFile('schemas/record.schema.json')) as SchemaNode;
}
