import type { AcceptanceFigure, AcceptancePlan } from '../study/study.ts';
import type { RecordCandidate, StudyRecord } from './record.ts';

type Criterion = StudyRecord['acceptance'][number];

/** Each declared acceptance criterion with its limit, value and whether it is met. An undefined value misses its limit. */
export function acceptanceOf(
  plans: readonly AcceptancePlan[],
  chosen: RecordCandidate | null,
  rowsUsed: number,
): Criterion[] {
  return plans.map((plan) => {
    if (plan.criterion === 'chosen') {
      const passed = chosen !== null && plan.names.includes(chosen.name);
      return { criterion: 'chosen', limit: plan.names.join(' or '), value: chosen?.name ?? null, passed };
    }
    const value = figureOf(plan.criterion, chosen, rowsUsed);
    const passed =
      value !== null &&
      (plan.atLeast === null || value >= plan.atLeast) &&
      (plan.atMost === null || value <= plan.atMost);
    return { criterion: plan.criterion, limit: limitText(plan.atLeast, plan.atMost), value, passed };
  });
}

function figureOf(figure: AcceptanceFigure, chosen: RecordCandidate | null, rowsUsed: number): number | null {
  if (figure === 'rows_used') return rowsUsed;
  return chosen === null ? null : chosen[figure];
}

function limitText(atLeast: number | null, atMost: number | null): string {
  const parts = [
    ...(atLeast === null ? [] : [`at least ${atLeast}`]),
    ...(atMost === null ? [] : [`at most ${atMost}`]),
  ];
  return parts.join(' and ');
}
