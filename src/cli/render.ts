import { dirname, join } from 'node:path';
import type { Problem } from '../problem.ts';
import { readRecord } from '../record/read-record.ts';
import type { StudyRecord } from '../record/record.ts';
import { writeResults } from '../record/write-results.ts';
import type { ReportFormat } from '../report/render.ts';
import type { CommonOptions } from './common-options.ts';
import { DONE, UNUSABLE } from './exit-status.ts';
import { hasError } from './has-error.ts';
import { reportFiles, type TemplatePaths } from './report-files.ts';
import { showProblems } from './show-problems.ts';
import { sourceTexts } from './source-texts.ts';
import type { Terminal } from './terminal.ts';

export interface RenderCommandOptions extends CommonOptions {
  readonly out?: string;
  readonly format?: ReportFormat;
  /** A template of the user's own, for the one format that is rendered. */
  readonly template?: string;
}

/** `plumbrule render RECORD`: the reports of a record, from the record alone. */
export async function renderCommand(
  path: string,
  options: RenderCommandOptions,
  terminal: Terminal,
): Promise<number> {
  const problems: Problem[] = [];
  const report = (problem: Problem) => problems.push(problem);
  const out = options.out ?? dirname(path);
  let written: readonly string[] = [];

  const record = await readRecord(path, report);
  if (record !== null) {
    const formats = options.format === undefined ? record.study.report.formats : [options.format];
    const templates = templatesFor(record, formats, options.template, report);
    const files = hasError(problems) ? [] : await reportFiles(record, formats, templates, report);
    if (!hasError(problems) && (await writeResults(out, files, report))) {
      written = files.map((file) => join(out, file.name));
    }
  }

  await showProblems(
    problems,
    await sourceTexts(problems, templatePlace(record, options)),
    options.problems,
    terminal,
  );
  if (hasError(problems)) return UNUSABLE;
  if (options.quiet !== true && options.problems === 'text') {
    for (const file of written) terminal.out(`${file}\n`);
  }
  return DONE;
}

/** Where the user's template lies, by the name under which its problems know it. */
function templatePlace(record: StudyRecord | null, options: RenderCommandOptions): Map<string, string> {
  const format = options.format ?? record?.study.report.formats[0];
  if (record === null || format === undefined || options.template === undefined) return new Map();
  return new Map([[record.study.report.templates[format] ?? `template for ${format}`, options.template]]);
}

/** A record does not know where its study lies, so the study's own templates are not looked for. */
function templatesFor(
  record: StudyRecord,
  formats: readonly ReportFormat[],
  template: string | undefined,
  report: (problem: Problem) => void,
): TemplatePaths {
  const [format] = formats;
  if (template !== undefined && format !== undefined && formats.length === 1) return { [format]: template };
  if (template !== undefined) {
    report({
      code: 'command_unusable',
      severity: 'error',
      place: { kind: 'command' },
      message: '--template is for one format, and this record asks for two.',
      hint: 'Say which with --format.',
    });
    return {};
  }
  for (const each of formats) {
    const named = record.study.report.templates[each];
    if (named === null) continue;
    report({
      code: 'template_unreadable',
      severity: 'warning',
      place: { kind: 'file', file: named },
      message: `The study's own template for ${each} is not used: a record does not say where its study lies.`,
      hint: `Name it with --format ${each} --template.`,
    });
  }
  return {};
}
