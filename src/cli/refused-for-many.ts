import type { Problem } from '../problem.ts';
import type { FitCommandOptions } from './fit-options.ts';

/** What goes with one record is refused for many. */
export function refusedForMany({ against }: FitCommandOptions): Problem[] {
  if (against === undefined) return [];
  return [
    {
      code: 'command_unusable',
      severity: 'error',
      place: { kind: 'command' },
      message: '--against compares one run with one earlier record, and these are several runs.',
      hint: 'Compare their records one by one with plumbrule compare.',
    },
  ];
}
