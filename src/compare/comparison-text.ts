import { packageFile } from '../package-file.ts';
import { jsonText, type SchemaNode } from '../record/json.ts';
import type { Comparison } from './comparison.ts';

/** The text of comparison.json: keys in the schema's order, full-precision numbers, the same bytes every time. */
export function comparisonText(comparison: Comparison): string {
  return jsonText(comparison, JSON.parse(packageFile('schemas/comparison.schema.json')) as SchemaNode);
}
