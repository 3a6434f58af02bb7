import { count, value } from '../numbers.ts';
import type { StudyRecord } from '../record-type.ts';
import { counted } from './lexicon.ts';

/** How many models the choice was made among. */
export interface ModelsLookedAt {
  readonly count: number;
  /** Whether they were counted; otherwise the number is an upper bound. */
  readonly exact: boolean;
  /** Whether any were searched for. */
  readonly searched: boolean;
}

export function modelsLookedAt({
  candidates,
  families = [],
  selection,
}: Pick<StudyRecord, 'candidates' | 'families' | 'selection'>): ModelsLookedAt {
  return {
    count: selection.models_looked_at ?? candidates.length,
    exact: families.every((family) => family.searched_exactly),
    searched: families.length > 0,
  };
}

/** "6 candidates"; where some were searched for "261 models", "up to 1.1 × 10¹⁵ models". */
export function modelsPhrase(looked: ModelsLookedAt): string {
  if (!looked.searched) return counted(looked.count, 'candidate', 'candidates', count);
  const number = (n: number): string => (n < 1e6 ? count(n) : value(n, 2));
  return `${looked.exact ? '' : 'up to '}${counted(looked.count, 'model', 'models', number)}`;
}
