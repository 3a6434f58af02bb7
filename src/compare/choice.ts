import type { FitContext } from '../engine/fit.ts';
import type { RecordCandidate, StudyRecord } from '../record/record.ts';
import { summarise } from '../select/summarise.ts';
import { allOf, type Side } from './attribute.ts';
import type { ChoiceChange, Contender } from './comparison.ts';
import { type ModelDefinition, settingOf } from './declaration.ts';
import { evaluated, namesToPick, pickRows, refit } from './refit.ts';

/** Criteria of which a larger value is better. */
const HIGHER: readonly string[] = ['adjusted_r_squared'];
/** Criteria that a fit has by itself. */
const FROM_ONE_FIT = ['adjusted_r_squared', 'aic', 'aicc', 'bic', 'mallows_cp'] as const;

/**
 * What became of the choice: the earlier one on the later rows, and how far it is from the later one by the later rule.
 *
 * @param later null where its rows were not kept: then only what stands in its record can be told
 */
export function compareChoice(
  before: StudyRecord,
  now: StudyRecord,
  earlier: ModelDefinition | null,
  later: Side | null,
): ChoiceChange {
  const rankBy = now.selection.rank_by;
  const first = before.selection.chosen === null ? null : contender(before, now, earlier, later);
  const second = now.selection.chosen === null ? null : candidateIn(now, now.selection.chosen);
  const [a, b] = [first?.value ?? null, second?.value ?? null];
  return {
    changed: before.selection.chosen !== now.selection.chosen,
    rank_by: rankBy,
    rule_changed: ruleOf(before) !== ruleOf(now),
    earlier: first,
    later: second,
    difference: a === null || b === null ? null : HIGHER.includes(rankBy) ? b - a : a - b,
    prefer_smaller_within: now.selection.prefer_smaller_within,
  };
}

function ruleOf({ selection }: StudyRecord): string {
  const { rank_by, prefer_smaller_within, significance, admission } = selection;
  return JSON.stringify([rank_by, prefer_smaller_within, significance, admission]);
}

/** Whether two candidates are declared alike, as far as a record tells. */
export function declaredAlike(a: RecordCandidate, b: RecordCandidate): boolean {
  return (
    a.scale === b.scale && a.intercept === b.intercept && JSON.stringify(a.terms) === JSON.stringify(b.terms)
  );
}

function contender(
  before: StudyRecord,
  now: StudyRecord,
  earlier: ModelDefinition | null,
  later: Side | null,
): Contender {
  const name = before.selection.chosen!;
  const was = before.candidates.find((candidate) => candidate.name === name)!;
  const same =
    now.candidates.find((candidate) => candidate.name === name && declaredAlike(was, candidate)) ??
    now.candidates.find((candidate) => declaredAlike(was, candidate));
  if (same !== undefined) return { ...candidateIn(now, same.name)!, name };
  const none = {
    name,
    value: null,
    coefficient_count: null,
    found: 'none' as const,
    admitted: null,
    refused_because: [],
  };
  if (earlier === null || later === null) {
    return { ...none, reason: 'It is no candidate any more, and the later rows were not kept to fit it to.' };
  }
  const rows = evaluated(later.base, later.declaration);
  const names = namesToPick(earlier, later.declaration);
  const fitted = refit(earlier, later.declaration, pickRows(rows, allOf(rows), names));
  if (typeof fitted === 'string') {
    return { ...none, reason: `It cannot be fitted to the later rows: ${fitted}` };
  }
  const context: FitContext = {
    fits: [fitted.fit],
    press: [null],
    pressOmitted: null,
    fullModelVariance: [fullVariance(now)],
    columnNames: fitted.columns.map((column) => column.name),
  };
  const figures = summarise(0, context);
  const rankBy = now.selection.rank_by;
  const criterion = FROM_ONE_FIT.find((each) => each === rankBy);
  const value = criterion === undefined ? null : figures[criterion];
  return {
    ...none,
    value,
    coefficient_count: figures.coefficient_count,
    found: 'refitted',
    reason: value === null ? `It has no value of ${rankBy} that one fit could give.` : null,
  };
}

function candidateIn(record: StudyRecord, name: string): Contender | null {
  const candidate = record.candidates.find((each) => each.name === name);
  if (candidate === undefined) return null;
  const value = record.selection.ranking.find((each) => each.candidate === name)?.value ?? null;
  return {
    name,
    value,
    coefficient_count: candidate.coefficient_count,
    found: 'record',
    admitted: candidate.admitted,
    refused_because: [...candidate.refused_because],
    reason:
      value === null
        ? `${settingOf(record, 'selection.rank_by') ?? 'The criterion'} gives it no value of its own.`
        : null,
  };
}

/** s² of the union of all terms, which the record holds by way of Cp = RSS/s² − n + 2p; null where it has none. */
function fullVariance({ candidates }: StudyRecord): number | null {
  for (const { mallows_cp: cp, residual_sum_of_squares: rss, rows, coefficient_count: p } of candidates) {
    if (cp !== null && cp + rows - 2 * p > 0) return rss / (cp + rows - 2 * p);
  }
  return null;
}
