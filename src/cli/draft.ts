import { draftStudy } from '../draft/draft-study.ts';
import { hasError, type Problem } from '../problem.ts';
import type { CommonOptions } from './common-options.ts';
import { DONE, UNUSABLE } from './exit-status.ts';
import { isThere } from './is-there.ts';
import { showProblems } from './show-problems.ts';
import { sourceTexts } from './source-texts.ts';
import type { Terminal } from './terminal.ts';
import { writeText } from './write-text.ts';

export interface DraftCommandOptions extends CommonOptions {
  readonly response: string;
  readonly out?: string;
}

/** `plumbrule draft DATA --response NAME`: a first study file from a data file. */
export async function draftCommand(
  data: string,
  options: DraftCommandOptions,
  terminal: Terminal,
): Promise<number> {
  const { out, response } = options;
  const problems: Problem[] = [];
  if (out !== undefined && (await isThere(out))) {
    problems.push({
      code: 'output_unwritable',
      severity: 'error',
      place: { kind: 'file', file: out },
      message: `"${out}" is there already, and a draft does not take the place of a study.`,
      hint: 'Name another file with --out.',
    });
  } else {
    const drafted = await draftStudy(data, { response, ...(out === undefined ? {} : { out }) });
    problems.push(...drafted.problems);
    if (drafted.text !== null && out !== undefined) {
      await writeText(out, drafted.text, (problem) => problems.push(problem));
    } else if (drafted.text !== null && options.problems === 'text') terminal.out(drafted.text);
  }
  await showProblems(problems, await sourceTexts(problems), options.problems, terminal);
  return hasError(problems) ? UNUSABLE : DONE;
}
