import { readFile } from 'node:fs/promises';
import { resolve } from 'node:path';
import type { Report } from '../problem.ts';
import type { StudyRecord } from '../record/record.ts';
import type { ResultFile } from '../record/write-results.ts';
import { type RenderOptions, render } from '../report/render.ts';
import type { ReportFormat, TemplateNames } from '../report/template-names.ts';

const NAMES: { readonly [format in ReportFormat]: string } = { html: 'report.html', markdown: 'report.md' };

/** The user's own templates, as paths, by format; the program's own where left out. */
export type TemplatePaths = { readonly [format in ReportFormat]?: string };

/**
 * The reports of a record as files to be written; a template that cannot be read or used is reported and its report left out.
 *
 * @param verdicts what came of the criteria that need an earlier record; null where they are not judged
 */
export async function reportFiles(
  record: StudyRecord,
  formats: readonly ReportFormat[],
  templates: TemplatePaths,
  verdicts: NonNullable<RenderOptions['verdicts']> | null,
  report: Report,
): Promise<ResultFile[]> {
  const templateText = await templateTexts(formats, templates, report);
  if (templateText === null) return [];
  const rendered = render(record, { formats, templateText, verdicts }, report);
  return formats.flatMap((format) => {
    const content = rendered[format];
    return content === undefined ? [] : [{ name: NAMES[format], content }];
  });
}

/** The texts of the user's own templates; null, with an error reported, where one cannot be read. */
export async function templateTexts(
  formats: readonly ReportFormat[],
  templates: TemplatePaths,
  report: Report,
): Promise<{ readonly [format in ReportFormat]?: string } | null> {
  const texts: { html?: string; markdown?: string } = {};
  for (const format of formats) {
    const path = templates[format];
    if (path === undefined) continue;
    const text = await templateAt(path, report);
    if (text === null) return null;
    texts[format] = text;
  }
  return texts;
}

/** Where they lie, `folder` being that of the study. */
export function templatesIn({ html, markdown }: TemplateNames, folder: string): TemplatePaths {
  return {
    ...(html === null ? {} : { html: resolve(folder, html) }),
    ...(markdown === null ? {} : { markdown: resolve(folder, markdown) }),
  };
}

async function templateAt(path: string, report: Report): Promise<string | null> {
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(await readFile(path));
  } catch (fault) {
    report({
      code: 'template_unreadable',
      severity: 'error',
      place: { kind: 'file', file: path },
      message: `The template cannot be read: ${reason(fault)}.`,
    });
    return null;
  }
}

function reason(fault: unknown): string {
  const code = (fault as { readonly code?: unknown }).code;
  if (code === 'ENOENT') return 'there is no such file';
  if (code === 'EISDIR') return 'it is a folder';
  if (code === 'ERR_ENCODING_INVALID_ENCODED_DATA') return 'it is not UTF-8 text';
  return `the system says ${String(code)}`;
}
