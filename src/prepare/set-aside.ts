import type { Table } from '../data/table.ts';
import type { Report } from '../problem.ts';
import { randomFrom } from '../stats/random.ts';
import { shuffle } from '../stats/shuffle.ts';
import type { HoldOutPlan, SplitSamplePlan, Study } from '../study/study.ts';
import type { Derived } from './derive.ts';
import { evaluateExpression } from './evaluate-expression.ts';
import { rowCountText } from './line-list.ts';
import type { Sample } from './sample.ts';
import { subSample } from './sub-sample.ts';
import { UNDEFINED_HINT } from './warn-of-undefined.ts';

/**
 * Sets aside the rows on which the chosen model will be tried, by the declared rule and before anything is fitted. They
 * stand among the losses under a reason of their own and come back as `heldOut`. Null, reported, where the rule sets
 * aside none or all.
 */
export function setAside(
  study: Study,
  table: Table,
  derived: Derived,
  sample: Sample,
  report: Report,
): Sample | null {
  const plan = study.selection.holdOut;
  if (plan === null) return sample;
  const apart = apartOf(plan, table, derived, sample, report);
  const held = positionsWhere(apart, 1);
  const rest = positionsWhere(apart, 0);
  if (held.length === 0 || rest.length === 0) {
    report({
      code: 'hold_out_nothing',
      severity: 'error',
      place: study.placeOf(['selection', 'hold_out']),
      message: `selection.hold_out sets aside ${held.length === 0 ? 'none' : 'all'} of the ${rowCountText(sample.rowCount)} that could be used.`,
      hint: held.length === 0 ? 'Set aside more.' : 'Set aside fewer, so that there are rows to fit.',
    });
    return null;
  }
  const loss = {
    because: 'held out, to try the chosen model on',
    kind: 'held_out' as const,
    rows: held.length,
    variable: null,
    missingAny: null,
  };
  return {
    ...subSample(sample, rest),
    losses: [...sample.losses, loss],
    heldOut: subSample(sample, held),
  };
}

/** 1 for each row of the sample that is to be set aside. */
function apartOf(
  plan: HoldOutPlan,
  table: Table,
  derived: Derived,
  sample: Sample,
  report: Report,
): Uint8Array {
  const n = sample.rowCount;
  const apart = new Uint8Array(n);
  switch (plan.kind) {
    case 'share':
      for (const position of drawn(n, Math.round(plan.share * n), plan.seed)) apart[position] = 1;
      return apart;
    case 'last':
      for (const position of sample.timeOrder!.subarray(Math.max(0, n - plan.rows))) apart[position] = 1;
      return apart;
    case 'where': {
      const condition = evaluateExpression(
        plan.where,
        derived.columns,
        table.rowCount,
        derived.undefinedRows,
      );
      const undefinedAt: number[] = [];
      sample.rows.forEach((row, position) => {
        apart[position] = condition.values[row] === 1 ? 1 : 0;
        if (condition.undefinedRows?.flags[row] === 1) undefinedAt.push(position);
      });
      const [first] = undefinedAt;
      if (first !== undefined) {
        report({
          code: 'value_not_finite',
          severity: 'warning',
          place: { kind: 'cell', file: table.file, row: sample.lines[first]! },
          message: `selection.hold_out.where, "${plan.text}", has no finite value in ${rowCountText(undefinedAt.length)}, of which this is the first; it sets none of them aside.`,
          hint: UNDEFINED_HINT,
        });
      }
      return apart;
    }
  }
}

/** The rows that the choice is made on and those that the chosen model is estimated from. */
export interface SplitSample {
  /** Positions in the sample, ascending. */
  readonly choosing: Int32Array;
  readonly estimating: Int32Array;
}

/** Draws the two parts; null, reported, where one of them would have fewer than two rows. */
export function splitSample(
  plan: SplitSamplePlan,
  study: Study,
  sample: Sample,
  report: Report,
): SplitSample | null {
  const n = sample.rowCount;
  const count = Math.round(plan.share * n);
  if (count < 2 || n - count < 2) {
    report({
      code: 'split_too_small',
      severity: 'error',
      place: study.placeOf(['selection', 'split_sample']),
      message: `selection.split_sample leaves ${rowCountText(Math.min(count, n - count))} for ${count < n - count ? 'choosing' : 'estimating'}, of ${n}.`,
      hint: 'Choose another share, or do not split.',
    });
    return null;
  }
  const chosen = new Uint8Array(n);
  for (const position of drawn(n, count, plan.seed)) chosen[position] = 1;
  return { choosing: positionsWhere(chosen, 1), estimating: positionsWhere(chosen, 0) };
}

/** So many of 0 … n − 1, drawn without replacement. */
function drawn(n: number, count: number, seed: number): Int32Array {
  const all = Int32Array.from({ length: n }, (_, position) => position);
  return shuffle(all, randomFrom(seed)).subarray(0, count);
}

function positionsWhere(flags: Uint8Array, wanted: number): Int32Array {
  const found: number[] = [];
  flags.forEach((flag, position) => {
    if (flag === wanted) found.push(position);
  });
  return Int32Array.from(found);
}
