import type { Comparison } from '../compare/comparison.ts';
import { hasError, type Problem, type Report } from '../problem.ts';
import type { StudyRecord } from '../record/record.ts';
import type { ResultFile } from '../record/write-results.ts';
import { templateNames } from '../report/template-names.ts';
import type { CommonOptions } from './common-options.ts';
import { COMPARISON_FORMATS, type ComparisonFormat, comparisonFiles } from './comparison-files.ts';
import { DONE, NOT_ACCEPTED } from './exit-status.ts';
import { givenTemplate } from './given-template.ts';

export interface CompareCommandOptions extends CommonOptions {
  readonly out?: string;
  readonly format?: ComparisonFormat;
  /** A template of the user's own, for the one format that is written or printed. */
  readonly template?: string;
}

/** 1 where a limit against the earlier record is missed. */
export function statusOfComparison({ acceptance }: Comparison): number {
  return acceptance.some(({ passed }) => passed === false) ? NOT_ACCEPTED : DONE;
}

/** The files that are asked for: those of all formats into a folder, one that is printed, or none. */
export async function filesOf(
  comparison: Comparison,
  record: StudyRecord,
  { out, format, template }: CompareCommandOptions,
  report: Report,
): Promise<ResultFile[]> {
  const formats: readonly ComparisonFormat[] =
    format !== undefined ? [format] : out !== undefined ? COMPARISON_FORMATS : [];
  const pages = formats.filter((each) => each !== 'json');
  const found: Problem[] = [];
  const templates = givenTemplate(templateNames(record, 'comparison'), pages, template, (problem) =>
    found.push(problem),
  );
  found.forEach(report);
  return hasError(found) ? [] : comparisonFiles(comparison, record, formats, templates, report);
}
