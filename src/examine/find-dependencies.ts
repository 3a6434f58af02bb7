import type { FittedAll } from '../engine/fit-all.ts';
import type { Chosen } from './chosen.ts';
import { type Condition, conditionOf } from './collinearity/condition.ts';
import { type NearDependency, nearDependencies } from './collinearity/dependencies.ts';

/** How far the columns of the chosen model can be told apart. */
export interface Collinearity {
  /** Names of its columns, in the order of each row of proportions. */
  readonly columns: string[];
  readonly indices: Condition['indices'];
  readonly proportions: Condition['proportions'];
  /** Most serious first. */
  readonly dependencies: NearDependency[];
}

/** Condition indices, variance-decomposition proportions and what they point at; no pass over the rows. */
export function findDependencies(chosen: Chosen, fitted: FittedAll): Collinearity {
  const condition = conditionOf(chosen.fit, fitted.factor);
  return {
    columns: chosen.fit.columns.map((column) => chosen.columns[column]!.name),
    ...condition,
    dependencies: nearDependencies(chosen, condition, fitted),
  };
}
