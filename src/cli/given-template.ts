import type { Report } from '../problem.ts';
import type { StudyRecord } from '../record/record.ts';
import {
  type ReportFormat,
  type TemplateNames,
  type TemplateOf,
  templateName,
} from '../report/template-names.ts';
import type { TemplatePaths } from './report-files.ts';

/**
 * The template that a command line names for one format. Those that the record's study names are not looked for, which is
 * said: a record does not know where its study lies.
 */
export function givenTemplate(
  named: TemplateNames,
  formats: readonly ReportFormat[],
  template: string | undefined,
  report: Report,
): TemplatePaths {
  const [format] = formats;
  if (template !== undefined && format !== undefined && formats.length === 1) return { [format]: template };
  if (template !== undefined) {
    report({
      code: 'command_unusable',
      severity: 'error',
      place: { kind: 'command' },
      message: `--template is for one format, and ${formats.length === 0 ? 'none is made here' : 'two are made here'}.`,
      hint: 'Say which with --format.',
    });
    return {};
  }
  for (const each of formats) {
    const name = named[each];
    if (name === null) continue;
    report({
      code: 'template_unreadable',
      severity: 'warning',
      place: { kind: 'file', file: name },
      message: `The study's own template for ${each} is not used: a record does not say where its study lies.`,
      hint: `Name it with --format ${each} --template.`,
    });
  }
  return {};
}

/** Where such a template lies, by the name under which its problems know it. */
export function givenTemplatePlace(
  record: StudyRecord | null,
  of: TemplateOf,
  { format, template }: { readonly format?: ReportFormat | 'json'; readonly template?: string },
): Map<string, string> {
  if (record === null || template === undefined || format === undefined || format === 'json')
    return new Map();
  return new Map([[templateName(record, of, format), template]]);
}
