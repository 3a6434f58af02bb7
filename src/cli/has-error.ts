import type { Problem } from '../problem.ts';

/** Whether any of the problems keeps the study, the data or the command line from being used. */
export function hasError(problems: readonly Problem[]): boolean {
  return problems.some((problem) => problem.severity === 'error');
}
