import type { ComparedCriterion } from '../comparison-type.ts';
import { fixed, NONE, value, withUnit } from '../numbers.ts';
import type { RecordEarlierCriterion, StudyRecord } from '../record-type.ts';
import { counted, listed, lowered } from './lexicon.ts';

type Criterion = StudyRecord['acceptance'][number];

const NAMES: Readonly<Record<string, string>> = {
  r_squared: 'R²',
  adjusted_r_squared: 'Adjusted R²',
  predicted_r_squared: 'Predicted R²',
  residual_standard_error: 'Residual standard error',
  largest_vif: 'Largest variance inflation factor',
  condition_number: 'Condition number',
  rows_used: 'Number of rows used',
  rows_lost_share: 'Share of rows lost',
  rows_per_coefficient: 'Rows per coefficient',
  cv_rmse: 'Error relative to the mean, CV(RMSE)',
  bias: 'Bias relative to the mean',
  prediction_interval_width: 'Widest prediction interval',
  relative_interval_width: 'Widest prediction interval, relative',
  p_value: 'P-value',
  coefficient: 'Coefficient',
  sign: 'Sign',
  age_of_newest_row: 'Age of the newest row',
  chosen: 'Candidate chosen',
  coefficient_change: 'Largest change of a coefficient',
  new_rows_inside: 'Share of the new rows inside the earlier prediction intervals',
};

/** "Adjusted R²", "Coefficient of cargo" */
export function criterionLabel({ criterion, of }: Pick<Criterion, 'criterion' | 'of'>): string {
  const name = Object.hasOwn(NAMES, criterion) ? NAMES[criterion]! : criterion;
  if (of === undefined) return name;
  if (criterion === 'coefficient_change') return `Change of the coefficient of ${of}`;
  return criterion === 'p_value' ? `${name} of ${of.replaceAll('_', ' ')}` : `${name} of ${of}`;
}

/** The figure that was held against the limit, with as many digits as it takes to tell the two apart. */
export function acceptanceValue(
  {
    criterion,
    limit,
    value: figure,
  }: Pick<Criterion, 'criterion' | 'limit' | 'value'> & { readonly passed?: boolean | null },
  unit: string | null,
): string {
  if (figure === null) return NONE;
  if (typeof figure === 'string') return figure;
  if (criterion === 'age_of_newest_row') return counted(figure, 'day', 'days', (days) => value(days, 6));
  const limits = limit.split(' ').map(Number);
  const apart = (rounded: number): boolean => rounded === figure || !limits.includes(rounded);
  if (criterion.endsWith('r_squared')) {
    let decimals = 3;
    while (decimals < 17 && !apart(Number(figure.toFixed(decimals)))) decimals++;
    return fixed(figure, decimals);
  }
  let digits = 4;
  while (digits < 17 && !apart(Number(figure.toPrecision(digits)))) digits++;
  const own = criterion === 'coefficient_change' ? 'standard errors' : null;
  return withUnit(value(figure, digits), criterion === 'residual_standard_error' ? unit : own);
}

/** "2 of 5 acceptance criteria are missed: adjusted R² and rows used." Null where the study declares none. */
export function acceptanceSentence(acceptance: readonly Criterion[]): string | null {
  const all = acceptance.length;
  if (all === 0) return null;
  const missed = acceptance.filter((c) => !c.passed);
  if (missed.length === 0)
    return all === 1 ? 'The acceptance criterion is met.' : `All ${all} acceptance criteria are met.`;
  const which = listed(missed.map((c) => lowered(criterionLabel(c))));
  if (missed.length === all && all > 1) return `All ${all} acceptance criteria are missed: ${which}.`;
  const what =
    all === 1
      ? 'The acceptance criterion is'
      : `${missed.length} of ${counted(all, 'acceptance criterion', 'acceptance criteria')} ${missed.length === 1 ? 'is' : 'are'}`;
  return `${what} missed: ${which}.`;
}

/** What was missed by how much, one sentence each: "R² is 0.754; the study asks for at least 0.99." */
export function missedSentences(acceptance: readonly Criterion[], unit: string | null): string[] {
  return acceptance
    .filter((c) => !c.passed)
    .map((c) => {
      const undefinedAs = c.criterion === 'chosen' ? 'none' : 'not defined';
      const is = c.value === null ? undefinedAs : acceptanceValue(c, unit);
      return `${criterionLabel(c)} is ${is}; the study asks for ${c.limit}.`;
    });
}

/** "1 criterion needs an earlier record and is not judged here: largest change of a coefficient." Null for none. */
export function needsEarlierSentence(criteria: EarlierCriteria): string | null {
  return aboutEach(
    criteria,
    (all) =>
      `${counted(all, 'criterion needs', 'criteria need')} an earlier record and ${all === 1 ? 'is' : 'are'} not judged here`,
  );
}

/** "1 criterion is held against the earlier record below: largest change of a coefficient." Null for none. */
export function heldBelowSentence(criteria: EarlierCriteria): string | null {
  return aboutEach(
    criteria,
    (all) => `${counted(all, 'criterion is', 'criteria are')} held against the earlier record below`,
  );
}

type EarlierCriteria = readonly RecordEarlierCriterion[] | undefined;

/** What is said of them, and which they are. */
function aboutEach(criteria: EarlierCriteria, said: (all: number) => string): string | null {
  if (criteria === undefined || criteria.length === 0) return null;
  return `${said(criteria.length)}: ${listed(criteria.map((c) => lowered(criterionLabel(c))))}.`;
}

/** "Against the earlier record 1 of 2 criteria is missed; comparison.html says what changed." Null for none. */
export function againstEarlierSentence(criteria: readonly ComparedCriterion[]): string | null {
  if (criteria.length === 0) return null;
  const judged = criteria.filter(({ passed }) => passed !== null).length;
  const missed = criteria.filter(({ passed }) => passed === false).length;
  const told =
    judged === 0
      ? 'no criterion can be judged, since no row is new'
      : missed > 0
        ? `${missed} of ${counted(judged, 'criterion', 'criteria')} ${missed === 1 ? 'is' : 'are'} missed`
        : `${judged === 1 ? 'one criterion is' : `all ${judged} criteria are`} met`;
  return `Against the earlier record ${told}; comparison.html says what changed.`;
}

/** What came of a criterion that was held against an earlier record. */
export function comparedCriterionSentence(criterion: ComparedCriterion): string {
  const label = criterionLabel(criterion);
  const asked = `the study asks for ${criterion.limit}`;
  if (criterion.passed === null) return `${label} is not judged, since no row is new; ${asked}.`;
  if (criterion.value === null) return `${label} cannot be told, which misses its limit; ${asked}.`;
  return `${label} is ${acceptanceValue(criterion, null)}; ${asked}.`;
}

/** What came of a criterion in a word; null: it could not be judged. */
export function verdictWord(passed: boolean | null): string {
  return passed === null ? 'not judged' : passed ? 'met' : 'missed';
}
