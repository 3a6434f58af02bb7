import type { Chosen } from './chosen.ts';
import type { SecondPass } from './second-pass.ts';
import type { WithoutRows } from './without-row.ts';

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
  /** Further figures, where the one statistic does not say all. */
  readonly figures?: Figure[];
}

/** A figure beside a finding's statistic. */
export interface Figure {
  readonly name: string;
  readonly value: number | null;
}

/** What a finding is about: several may be about one thing, and a reader's list names it once. */
export type Topic =
  | 'rows'
  | 'collinearity'
  | 'shape'
  | 'spread'
  | 'independence'
  | 'normality'
  | 'constancy'
  | 'outliers'
  | 'influence';

/** What a diagnostic answers; its name and question are added to it. */
export type Found = Omit<Finding, 'name' | 'question' | 'statistic_name'>;

/** One diagnostic: the question it answers, where its statistic was published, and how it is found. */
export interface Diagnostic {
  readonly name: string;
  readonly topic: Topic;
  readonly question: string;
  readonly statisticName: string;
  readonly source: string;
  /**
   * Null where the question does not arise (no time order declared).
   * @param second null where the model leaves nothing to examine
   * @param without null where the model was examined by itself
   */
  readonly find: (chosen: Chosen, second: SecondPass | null, without: WithoutRows | null) => Found | null;
}

/**
 * The concern a p-value raises where the null hypothesis is what one hopes for. In very many rows a trifle is significant:
 * what is slight in size is worth a look at most.
 */
export function concernOf(p: number, slight = false): 0 | 1 | 2 {
  return p < 0.001 && !slight ? 2 : p < 0.05 ? 1 : 0;
}

/** A diagnostic that could not be worked out: the sentence says why. */
export function notPossible(verdict: string): Found {
  return { statistic: null, df: [], p_value: null, mark: null, verdict, concern: 0, advice: null };
}
