import type { Problem } from '../problem.ts';
import type { Terminal } from './terminal.ts';

/** A terminal shows so many; more than that come from a file that is no study, or from one slip. */
const MOST = 50;

/**
 * Prints problems once, sorted: as text on standard error, or as JSON on standard output, where then
 * nothing else is printed. `sources` holds the text of each file that a problem may point into.
 */
export async function showProblems(
  problems: readonly Problem[],
  sources: ReadonlyMap<string, string>,
  form: 'text' | 'json',
  terminal: Terminal,
): Promise<void> {
  if (form === 'json') {
    const { problemsAsJson } = await import('./format-problems.ts');
    terminal.out(withLineEnd(problemsAsJson(problems)));
  } else if (problems.length > 0) {
    const { formatProblems, sortProblems } = await import('./format-problems.ts');
    terminal.err(withLineEnd(formatProblems(sortProblems(problems).slice(0, MOST), sources)));
    const more = problems.length - MOST;
    if (more > 0) terminal.err(`${more} more problems are not shown; --problems json lists them all.\n`);
  }
}

/** Says, below errors in a study, that its data has not been looked at yet: there may be more to come. */
export function showDataNotRead(problems: readonly Problem[], terminal: Terminal): void {
  const inStudy = problems.some(({ severity, place }) => severity === 'error' && place.kind === 'source');
  if (inStudy) terminal.err('The data has not been read yet: that comes once the study has no error.\n');
}

function withLineEnd(text: string): string {
  return text.endsWith('\n') ? text : `${text}\n`;
}
