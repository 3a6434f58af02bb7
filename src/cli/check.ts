import { hasError, type Problem } from '../problem.ts';
import { type CheckedStudy, checkStudy } from '../run/check-study.ts';
import type { StudyOptions } from './common-options.ts';
import { contractSummary } from './contract-summary.ts';
import { DONE, UNUSABLE } from './exit-status.ts';
import { givenParameters } from './given-parameters.ts';
import { progressOn } from './progress.ts';
import { showDataNotRead, showProblems } from './show-problems.ts';
import { sourceTexts } from './source-texts.ts';
import type { Terminal } from './terminal.ts';

/** `plumbrule check STUDY`: declaration and data contract, no fit. */
export async function checkCommand(path: string, options: StudyOptions, terminal: Terminal): Promise<number> {
  const misuse: Problem[] = [];
  const parameters = givenParameters(options.with ?? [], (problem) => misuse.push(problem));
  if (misuse.length > 0) {
    await showProblems(misuse, new Map(), options.problems, terminal);
    return UNUSABLE;
  }
  const progress = progressOn(terminal, options.quiet === true);
  let checked: CheckedStudy;
  try {
    checked = await checkStudy(path, { onProgress: progress.show, parameters });
  } finally {
    progress.clear();
  }
  await showProblems(checked.problems, await sourceTexts(checked.problems), options.problems, terminal);
  if (options.quiet !== true && options.problems === 'text') {
    if (!checked.dataRead) showDataNotRead(checked.problems, terminal);
    terminal.out(contractSummary(checked, terminal));
  }
  return hasError(checked.problems) ? UNUSABLE : DONE;
}
