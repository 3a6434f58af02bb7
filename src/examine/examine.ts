import type { Chosen } from './chosen.ts';
import type { Diagnostic, Finding } from './diagnostic.ts';
import { choiceWithoutARow } from './diagnostics/choice-without-a-row.ts';
import { collinearity } from './diagnostics/collinearity.ts';
import { drift } from './diagnostics/drift.ts';
import { enoughRows } from './diagnostics/enough-rows.ts';
import { equalSpread } from './diagnostics/equal-spread.ts';
import { independence } from './diagnostics/independence.ts';
import { influence } from './diagnostics/influence.ts';
import { lackOfFit } from './diagnostics/lack-of-fit.ts';
import { normality } from './diagnostics/normality.ts';
import { outlyingRows } from './diagnostics/outlying-rows.ts';
import { responseScale } from './diagnostics/response-scale.ts';
import { sameInBothParts } from './diagnostics/same-in-both-parts.ts';
import { serialCorrelation } from './diagnostics/serial-correlation.ts';
import { shape } from './diagnostics/shape.ts';
import { skewnessAndTails } from './diagnostics/skewness-and-tails.ts';
import { unevenSpread } from './diagnostics/uneven-spread.ts';
import { secondPass } from './second-pass.ts';
import type { WithoutRows } from './without-row.ts';

/** Every diagnostic, in the order in which a reviewer asks. */
export const DIAGNOSTICS: readonly Diagnostic[] = [
  enoughRows,
  collinearity,
  shape,
  lackOfFit,
  responseScale,
  equalSpread,
  unevenSpread,
  independence,
  serialCorrelation,
  sameInBothParts,
  drift,
  normality,
  skewnessAndTails,
  outlyingRows,
  influence,
  choiceWithoutARow,
];

/** What each diagnostic finds; those whose question does not arise are left out. */
export function examine(chosen: Chosen, without: WithoutRows | null = null): Finding[] {
  const second = secondPass(chosen);
  return DIAGNOSTICS.flatMap((diagnostic) => {
    const found = diagnostic.find(chosen, second, without);
    if (found === null) return [];
    const { name, question, statisticName } = diagnostic;
    return [{ name, question, statistic_name: statisticName, ...found }];
  });
}
