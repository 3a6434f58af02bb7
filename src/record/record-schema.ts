import { readFileSync } from 'node:fs';
import type { SchemaNode } from './json.ts';

/** The record's JSON Schema, read from the file that is shipped beside the program. */
export function recordSchema(): SchemaNode {
  const file = new URL('../../schemas/record.schema.json', import.meta.url);
  return JSON.parse(readFileSync(file, 'utf8')) as SchemaNode;
}
