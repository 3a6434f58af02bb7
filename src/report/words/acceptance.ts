import { NONE, share, value, withUnit } from '../numbers.ts';
import type { StudyRecord } from '../record-type.ts';
import { counted } from './lexicon.ts';

type Criterion = StudyRecord['acceptance'][number];

const NAMES: Readonly<Record<string, string>> = {
  r_squared: 'R²',
  adjusted_r_squared: 'Adjusted R²',
  predicted_r_squared: 'Predicted R²',
  residual_standard_error: 'Residual standard error',
  largest_vif: 'Largest variance inflation factor',
  condition_number: 'Condition number',
  rows_used: 'Rows used',
  chosen: 'Candidate chosen',
};

export function criterionLabel(criterion: string): string {
  return Object.hasOwn(NAMES, criterion) ? NAMES[criterion]! : criterion;
}

export function acceptanceValue({ criterion, value: figure }: Criterion, unit: string | null): string {
  if (figure === null) return NONE;
  if (typeof figure === 'string') return figure;
  if (criterion.endsWith('r_squared')) return share(figure);
  return withUnit(value(figure), criterion === 'residual_standard_error' ? unit : null);
}

/** "Both acceptance criteria are met." and the like; null where the study declares none. */
export function acceptanceSentence(acceptance: readonly Criterion[]): string | null {
  const all = acceptance.length;
  if (all === 0) return null;
  const missed = acceptance.filter((c) => !c.passed).length;
  if (missed === 0)
    return all === 1 ? 'The acceptance criterion is met.' : `All ${all} acceptance criteria are met.`;
  if (missed === all)
    return all === 1 ? 'The acceptance criterion is missed.' : `All ${all} acceptance criteria are missed.`;
  return `${missed} of ${counted(all, 'acceptance criterion', 'acceptance criteria')} ${missed === 1 ? 'is' : 'are'} missed.`;
}
