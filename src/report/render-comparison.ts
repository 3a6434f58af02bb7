import type { Comparison } from './comparison-type.ts';
import type { ComparisonView } from './comparison-view.ts';
import { mapped } from './markdown.ts';
import type { StudyRecord } from './record-type.ts';
import { fillTemplate, type ReportFormat, type TemplateSpecification, tidied } from './render.ts';
import { COMPARISON_HTML, COMPARISON_MARKDOWN } from './templates.generated.ts';
import { comparisonView } from './view/comparison.ts';

/** A comparison as a page or as Markdown for a pull request; `record` is the later of the two. */
export function renderComparison(comparison: Comparison, record: StudyRecord, format: ReportFormat): string {
  const view = comparisonView(comparison, record);
  if (format === 'html') return fillTemplate(COMPARISON_HTML as TemplateSpecification, view);
  return tidied(fillTemplate(COMPARISON_MARKDOWN as TemplateSpecification, mapped(view) as ComparisonView));
}
