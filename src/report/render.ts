import type { Report } from '../problem.ts';
import type { ComparedCriterion } from './comparison-type.ts';
import { fillOwnTemplate, fillTemplate, type TemplateSpecification } from './fill-template.ts';
import { markdownView } from './markdown.ts';
import type { StudyRecord } from './record-type.ts';
import { type ReportFormat, templateName } from './template-names.ts';
import { HTML, MARKDOWN } from './templates.generated.ts';
import { buildView } from './view/build-view.ts';
import type { ReportView } from './view.ts';

export interface RenderOptions {
  /** Formats to render; those that the record's study asks for where left out. */
  readonly formats?: readonly ReportFormat[];
  /** The text of the user's own templates; the program's own where left out. */
  readonly templateText?: { readonly html?: string; readonly markdown?: string };
  /**
   * What came of the criteria that only an earlier record can judge: `acceptance` of the comparison of this record. Where
   * left out, they are listed as needing one.
   */
  readonly verdicts?: readonly ComparedCriterion[] | null;
}

export interface Rendered {
  readonly html?: string;
  readonly markdown?: string;
}

/**
 * Reports of a record, from the record and the verdicts of its comparison, and nothing else. The same give the same bytes. A user's
 * template that cannot be compiled or run is reported as `template_broken`, and its format is left out.
 */
export function render(record: StudyRecord, options: RenderOptions, report: Report): Rendered {
  const view = buildView(record, options.verdicts ?? null);
  return filled(options.formats ?? record.study.report.formats, options.templateText ?? {}, report, {
    template: { html: HTML, markdown: MARKDOWN },
    view: { html: () => view, markdown: (): ReportView => markdownView(view) },
    file: (format) => templateName(record, 'report', format),
  });
}

/** What is filled: the program's own templates, the view of each format, and what problems call the user's templates. */
export interface Filling {
  readonly template: { readonly [format in ReportFormat]: unknown };
  readonly view: { readonly [format in ReportFormat]: () => object };
  readonly file: (format: ReportFormat) => string;
}

/** Each format from the user's template where there is one, else from the program's own. */
export function filled(
  formats: readonly ReportFormat[],
  templateText: NonNullable<RenderOptions['templateText']>,
  report: Report,
  { template, view, file }: Filling,
): Rendered {
  const result: { html?: string; markdown?: string } = {};
  for (const format of formats) {
    const text = templateText[format];
    const markdown = format === 'markdown';
    const made =
      text === undefined
        ? fillTemplate(template[format] as TemplateSpecification, view[format]())
        : fillOwnTemplate(text, file(format), markdown, view[format](), report);
    if (made !== null) result[format] = markdown ? tidied(made) : made;
  }
  return result;
}

/** At most one empty line in a row, none at the ends: what an `{{#if}}` leaves behind. */
export function tidied(markdown: string): string {
  return `${markdown
    .replace(/[ \t]+$/gm, '')
    .replace(/\n{3,}/g, '\n\n')
    .trim()}\n`;
}
