import type { Chosen } from './chosen.ts';

/**
 * What one diagnostic found. A statement about these rows and this model, with what to do about it; the
 * record and the report carry it as it is.
 */
export interface Finding {
  readonly name: string;
  readonly question: string;
  readonly statistic: number | null;
  readonly statistic_name: string;
  readonly df: number[];
  readonly p_value: number | null;
  /** The customary mark the statistic is held against, as text; null where a p-value speaks. */
  readonly mark: string | null;
  readonly verdict: string;
  /** 0 nothing to see, 1 worth a look, 2 take care before relying on it. */
  readonly concern: 0 | 1 | 2;
  readonly advice: string | null;
}

/** One diagnostic: the question it answers, where its statistic was published, and how it is found. */
export interface Diagnostic {
  readonly name: string;
  readonly question: string;
  readonly statisticName: string;
  readonly source: string;
  /** Null where the question does not arise (no time order declared). */
  readonly find: (chosen: Chosen) => Omit<Finding, 'name' | 'question' | 'statistic_name'> | null;
}

/** The concern a p-value raises where the null hypothesis is what one hopes for. */
export function concernOf(p: number): 0 | 1 | 2 {
  return p < 0.001 ? 2 : p < 0.05 ? 1 : 0;
}

/** A diagnostic that could not be worked out: the sentence says why. */
export function notPossible(verdict: string): Omit<Finding, 'name' | 'question' | 'statistic_name'> {
  return { statistic: null, df: [], p_value: null, mark: null, verdict, concern: 0, advice: null };
}
