import type { Problem } from '../problem.ts';
import type { Terminal } from './terminal.ts';

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
    const { formatProblems } = await import('./format-problems.ts');
    terminal.err(withLineEnd(formatProblems(problems, sources)));
  }
}

function withLineEnd(text: string): string {
  return text.endsWith('\n') ? text : `${text}\n`;
}
