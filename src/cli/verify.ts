import { hasError, type Problem } from '../problem.ts';
import type { Difference } from '../record/differences.ts';
import { type Verified, verifyRecord } from '../verify.ts';
import type { CommonOptions } from './common-options.ts';
import { DONE, NOT_ACCEPTED, UNUSABLE } from './exit-status.ts';
import { progressOn } from './progress.ts';
import { showProblems } from './show-problems.ts';
import { sourceTexts } from './source-texts.ts';
import type { Terminal } from './terminal.ts';

export interface VerifyCommandOptions extends CommonOptions {
  readonly study?: string;
  readonly tolerance?: string;
}

/** `plumbrule verify RECORD`: its study run again; every number must come back. */
export async function verifyCommand(
  path: string,
  options: VerifyCommandOptions,
  terminal: Terminal,
): Promise<number> {
  const tolerance = options.tolerance === undefined ? 0 : toleranceOf(options.tolerance);
  if (tolerance === null) {
    const message = `--tolerance is ${JSON.stringify(options.tolerance)}, but must be a number from 0 to below 1.`;
    await showProblems([commandProblem(message)], new Map(), options.problems, terminal);
    return UNUSABLE;
  }
  const progress = progressOn(terminal, options.quiet === true);
  let verified: Verified;
  try {
    verified = await verifyRecord(path, {
      tolerance,
      onProgress: progress.show,
      ...(options.study === undefined ? {} : { study: options.study }),
    });
  } finally {
    progress.clear();
  }
  const found = verified.differences.map((difference) => asProblem(path, difference));
  const problems = [...verified.problems, ...found];
  await showProblems(problems, await sourceTexts(problems), options.problems, terminal);
  if (!verified.ran) return UNUSABLE;
  if (options.quiet !== true && options.problems === 'text')
    terminal.out(`${verdict(verified, tolerance)}\n`);
  return hasError(problems) ? NOT_ACCEPTED : DONE;
}

function toleranceOf(text: string): number | null {
  const value = /^\d*\.?\d+(?:[eE][-+]?\d+)?$/.test(text) ? Number(text) : Number.NaN;
  return value >= 0 && value < 1 ? value : null;
}

function commandProblem(message: string): Problem {
  return { code: 'command_unusable', severity: 'error', place: { kind: 'command' }, message };
}

function asProblem(file: string, { key, earlier, later, relative }: Difference): Problem {
  const apart = relative === null ? '' : ` (${relative.toExponential(1)} of the larger apart)`;
  return {
    code: 'record_differs',
    severity: 'error',
    place: { kind: 'file', file },
    message: `${key} was ${earlier} and is now ${later}${apart}.`,
  };
}

function verdict({ study, compared, differences, problems }: Verified, tolerance: number): string {
  const how = tolerance === 0 ? 'to the last bit' : `to ${tolerance} of their size`;
  if (differences.length === 0) {
    const all = `${study} gives all ${compared.toLocaleString('en-GB')} numbers of the record again, ${how}.`;
    return hasError(problems) ? `${all} But not everything that it was made from is the same.` : all;
  }
  const most = Math.max(...differences.map(({ relative }) => relative ?? Number.POSITIVE_INFINITY));
  const many = differences.length === 1 ? 'One entry differs' : `${differences.length} entries differ`;
  const advice =
    most < 1e-9
      ? ' Numbers differ in their last digits only, as they may on another kind of machine: --tolerance 1e-9 passes over that.'
      : '';
  return `${study} does not give the record again. ${many}.${advice}`;
}
