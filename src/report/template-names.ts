import type { StudyRecord } from './record-type.ts';

export type ReportFormat = 'html' | 'markdown';

export type TemplateNames = { readonly [format in ReportFormat]: string | null };

/** What a template is for: the reports of a record, or what is different from an earlier one. */
export type TemplateOf = 'report' | 'comparison';

/** The templates that a study names, relative to it. */
export function templateNames({ study }: StudyRecord, of: TemplateOf): TemplateNames {
  const { html, markdown, comparison } = study.report.templates;
  return of === 'report' ? { html, markdown } : (comparison ?? { html: null, markdown: null });
}

/** What problems call the user's template of a format: as the study names it, or by what it is for. */
export function templateName(record: StudyRecord, of: TemplateOf, format: ReportFormat): string {
  const what = of === 'report' ? 'template' : 'template of the comparison';
  return templateNames(record, of)[format] ?? `${what} for ${format}`;
}
