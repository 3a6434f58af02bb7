import type { Report } from '../problem.ts';
import type { Comparison } from './comparison-type.ts';
import { mapped } from './markdown.ts';
import type { StudyRecord } from './record-type.ts';
import { filled, type Rendered, type RenderOptions } from './render.ts';
import { templateName } from './template-names.ts';
import { COMPARISON_HTML, COMPARISON_MARKDOWN } from './templates.generated.ts';
import { comparisonView } from './view/comparison.ts';

/**
 * A comparison as a page and as Markdown for a pull request, both where the options name no format; `record` is the later
 * of the two. A user's template that cannot be compiled or run is reported as `template_broken`, and its format is left out.
 */
export function renderComparison(
  comparison: Comparison,
  record: StudyRecord,
  options: Pick<RenderOptions, 'formats' | 'templateText'>,
  report: Report,
): Rendered {
  const view = comparisonView(comparison, record);
  return filled(options.formats ?? ['html', 'markdown'], options.templateText ?? {}, report, {
    template: { html: COMPARISON_HTML, markdown: COMPARISON_MARKDOWN },
    view: { html: () => view, markdown: () => mapped(view) as object },
    file: (format) => templateName(record, 'comparison', format),
  });
}
