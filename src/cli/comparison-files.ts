import type { Comparison } from '../compare/comparison.ts';
import { comparisonText } from '../compare/comparison-text.ts';
import type { Report } from '../problem.ts';
import type { StudyRecord } from '../record/record.ts';
import type { ResultFile } from '../record/write-results.ts';
import { renderComparison } from '../report/render-comparison.ts';
import { type TemplatePaths, templateTexts } from './report-files.ts';

export const COMPARISON_FORMATS = ['html', 'markdown', 'json'] as const;

export type ComparisonFormat = (typeof COMPARISON_FORMATS)[number];

const NAMES: { readonly [format in ComparisonFormat]: string } = {
  html: 'comparison.html',
  markdown: 'comparison.md',
  json: 'comparison.json',
};

/**
 * A comparison as files to be written; `record` is the later of the two. A template of the user's own that cannot be read
 * or used is reported, and its file left out.
 */
export async function comparisonFiles(
  comparison: Comparison,
  record: StudyRecord,
  formats: readonly ComparisonFormat[],
  templates: TemplatePaths,
  report: Report,
): Promise<ResultFile[]> {
  const pages = formats.filter((format) => format !== 'json');
  const templateText = await templateTexts(pages, templates, report);
  if (templateText === null) return [];
  const rendered = renderComparison(comparison, record, { formats: pages, templateText }, report);
  return formats.flatMap((format) => {
    const content = format === 'json' ? comparisonText(comparison) : rendered[format];
    return content === undefined ? [] : [{ name: NAMES[format], content }];
  });
}
