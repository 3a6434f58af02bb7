import type { Chosen } from './chosen.ts';
import type { Diagnostic, Finding } from './diagnostic.ts';
import { collinearity } from './diagnostics/collinearity.ts';
import { enoughRows } from './diagnostics/enough-rows.ts';
import { equalSpread } from './diagnostics/equal-spread.ts';
import { independence } from './diagnostics/independence.ts';
import { influence } from './diagnostics/influence.ts';
import { outlyingRows } from './diagnostics/outlying-rows.ts';

/** Every diagnostic, in the order in which a reviewer asks. */
export const DIAGNOSTICS: readonly Diagnostic[] = [
  enoughRows,
  collinearity,
  equalSpread,
  independence,
  outlyingRows,
  influence,
];

/** What each diagnostic finds; those whose question does not arise are left out. */
export function examine(chosen: Chosen): Finding[] {
  return DIAGNOSTICS.flatMap((diagnostic) => {
    const found = diagnostic.find(chosen);
    if (found === null) return [];
    const { name, question, statisticName } = diagnostic;
    return [{ name, question, statistic_name: statisticName, ...found }];
  });
}
