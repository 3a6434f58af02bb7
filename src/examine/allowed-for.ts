import type { Chosen } from './chosen.ts';

/** Whether the declared standard errors stay right where the errors' spread is uneven. */
export function allowsUnevenSpread({ study }: Pick<Chosen, 'study'>): boolean {
  return study.inference.standardErrors.kind !== 'classical';
}

/** Whether the declared standard errors stay right where errors that follow one another in time are related. */
export function allowsRelatedNeighbours({ study }: Pick<Chosen, 'study'>): boolean {
  return study.inference.standardErrors.kind === 'hac';
}
