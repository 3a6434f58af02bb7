import type Handlebars from 'handlebars';
import type { Comparison } from './comparison-type.ts';
import type { ComparisonView } from './comparison-view.ts';
import { mapped } from './markdown.ts';
import type { StudyRecord } from './record-type.ts';
import {
  environment,
  type ReportFormat,
  require,
  type TemplateSpecification,
  tidied,
  WALLS,
} from './render.ts';
import { COMPARISON_HTML, COMPARISON_MARKDOWN } from './templates.generated.ts';
import { comparisonView } from './view/comparison.ts';

/** A comparison as a page or as Markdown for a pull request; `record` is the later of the two. */
export function renderComparison(comparison: Comparison, record: StudyRecord, format: ReportFormat): string {
  const view = comparisonView(comparison, record);
  const handlebars = environment(require('handlebars/dist/handlebars.runtime.min.js') as typeof Handlebars);
  const template = format === 'html' ? COMPARISON_HTML : COMPARISON_MARKDOWN;
  const seen = format === 'html' ? view : (mapped(view) as ComparisonView);
  const made = handlebars.template(template as TemplateSpecification)(seen, WALLS);
  return format === 'html' ? made : tidied(made);
}
