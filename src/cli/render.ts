import { dirname, join } from 'node:path';
import { readVerdicts } from '../compare/read-verdicts.ts';
import { hasError, type Problem } from '../problem.ts';
import { readRecord } from '../record/read-record.ts';
import { replacedRecord } from '../record/replaced-record.ts';
import { writeResults } from '../record/write-results.ts';
import { type ReportFormat, templateNames } from '../report/template-names.ts';
import type { CommonOptions } from './common-options.ts';
import { DONE, UNUSABLE } from './exit-status.ts';
import { givenTemplate, givenTemplatePlace } from './given-template.ts';
import { reportFiles } from './report-files.ts';
import { showProblems } from './show-problems.ts';
import { placedAt, sourceTexts } from './source-texts.ts';
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
    const templates = givenTemplate(templateNames(record, 'report'), formats, options.template, report);
    // Where this record was held against an earlier one, the comparison beside it says what came of that.
    const verdicts = await readVerdicts(path, record, report);
    const files = hasError(problems) ? [] : await reportFiles(record, formats, templates, verdicts, report);
    const obstacle = replacedRecord(out, [{ file: path, record }]);
    if (!hasError(problems) && (await writeResults(out, files, report, [], obstacle))) {
      written = files.map((file) => join(out, file.name));
    }
  }

  const placed = placedAt(problems, givenTemplatePlace(record, 'report', options));
  await showProblems(placed, await sourceTexts(placed), options.problems, terminal);
  if (hasError(problems)) return UNUSABLE;
  if (options.quiet !== true && options.problems === 'text') {
    for (const file of written) terminal.out(`${file}\n`);
  }
  return DONE;
}
