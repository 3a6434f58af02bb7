import type { Comparison } from '../compare/comparison.ts';
import { comparisonText } from '../compare/comparison-text.ts';
import type { StudyRecord } from '../record/record.ts';
import type { ResultFile } from '../record/write-results.ts';
import { renderComparison } from '../report/render-comparison.ts';

export const COMPARISON_FORMATS = ['html', 'markdown', 'json'] as const;

export type ComparisonFormat = (typeof COMPARISON_FORMATS)[number];

const NAMES: { readonly [format in ComparisonFormat]: string } = {
  html: 'comparison.html',
  markdown: 'comparison.md',
  json: 'comparison.json',
};

/** A comparison as files to be written; `record` is the later of the two. */
export function comparisonFiles(
  comparison: Comparison,
  record: StudyRecord,
  formats: readonly ComparisonFormat[] = COMPARISON_FORMATS,
): ResultFile[] {
  return formats.map((format) => ({
    name: NAMES[format],
    content: comparisonIn(format, comparison, record),
  }));
}

export function comparisonIn(format: ComparisonFormat, comparison: Comparison, record: StudyRecord): string {
  return format === 'json' ? comparisonText(comparison) : renderComparison(comparison, record, format);
}
