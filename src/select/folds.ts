import { formatDate } from '../data/format-date.ts';
import type { Column } from '../data/table.ts';
import { clustersOf } from '../engine/clusters.ts';
import type { Sample } from '../prepare/sample.ts';
import type { Report } from '../problem.ts';
import { type Random, randomFrom } from '../stats/random.ts';
import { shuffle } from '../stats/shuffle.ts';
import type { FoldPlan, Study } from '../study/study.ts';
import { counted } from './words.ts';

/** One way of holding rows out, each row at most once. */
export type FoldSet =
  /** Each part is held out in turn and predicted from all the others. */
  | {
      readonly kind: 'parts';
      /** 0 … count − 1 per row. */
      readonly partOf: Int32Array;
      readonly count: number;
    }
  /** Each part after the first is predicted from all before it. Positions of rows, ascending within a part. */
  | { readonly kind: 'growing'; readonly parts: readonly Int32Array[] }
  /** Every row is predicted from all the others. */
  | { readonly kind: 'single' };

/** What is held out, as drawn for the rows of a sample. */
export interface Folds {
  readonly plan: FoldPlan;
  /** One for each repeat. */
  readonly sets: readonly FoldSet[];
  /** How a fold is named to a person, by its position: "fold 3", "vessel Tern", "the rows of 2024-03-01". */
  readonly nameOf: (fold: number) => string;
  /** Folds in a set; n where rows are held out one at a time. */
  readonly count: number;
}

const USUAL = 10;

/**
 * Draws what is held out: parts of rows or of whole groups in random order, or the times in their own. Groups go, the largest
 * first, to the part that has the fewest rows so far. Null, reported, where there are fewer rows or groups than parts,
 * or nothing after the first origin.
 */
export function drawFolds(plan: FoldPlan, study: Study, sample: Sample, report: Report): Folds | null {
  switch (plan.by) {
    case 'rows':
      return rowFolds(plan, study, sample.rowCount, report);
    case 'group':
      return groupFolds(plan, study, sample.columns.get(plan.group!)!, report);
    case 'time':
      return timeFolds(plan, study, sample, report);
    case 'leave_one_out':
      return enough(plan, study, 2, sample.rowCount, 'row', report)
        ? {
            plan,
            sets: [{ kind: 'single' }],
            nameOf: (row) => sample.ids?.[row] ?? `line ${sample.lines[row]}`,
            count: sample.rowCount,
          }
        : null;
  }
}

function rowFolds(plan: FoldPlan, study: Study, n: number, report: Report): Folds | null {
  const count = plan.folds ?? Math.max(2, Math.min(USUAL, n));
  if (!enough(plan, study, count, n, 'row', report)) return null;
  const random = randomFrom(plan.seed);
  const sets = Array.from({ length: plan.repeats }, (): FoldSet => {
    const partOf = new Int32Array(n);
    shuffle(
      Int32Array.from({ length: n }, (_, row) => row),
      random,
    ).forEach((row, k) => {
      partOf[row] = k % count;
    });
    return { kind: 'parts', partOf, count };
  });
  return { plan, sets, nameOf: (fold) => `fold ${fold + 1}`, count };
}

function groupFolds(plan: FoldPlan, study: Study, column: Column, report: Report): Folds | null {
  const { codes, count: groups } = clustersOf(column);
  const count = plan.folds ?? Math.max(2, Math.min(USUAL, groups));
  if (!enough(plan, study, count, groups, `group of ${plan.group}`, report, `groups of ${plan.group}`))
    return null;
  const sizes = new Int32Array(groups);
  for (const code of codes) sizes[code]!++;
  const random = randomFrom(plan.seed);
  // With a part for each group there is one way only, and it is not drawn.
  const repeats = count === groups ? 1 : plan.repeats;
  const sets = Array.from({ length: repeats }, (): FoldSet => {
    const partOfGroup = count === groups ? Int32Array.from(sizes.keys()) : dealt(sizes, count, random);
    return { kind: 'parts', partOf: codes.map((code) => partOfGroup[code]!), count };
  });
  const first = firstRows(codes, groups);
  const nameOf = (fold: number) =>
    count === groups ? `${plan.group} ${textAt(column, first[fold]!)}` : `fold ${fold + 1}`;
  return { plan, sets, nameOf, count };
}

/** The part of each group. */
function dealt(sizes: Int32Array, count: number, random: Random): Int32Array {
  const order = shuffle(Int32Array.from(sizes.keys()), random);
  const bySize = Array.from(order).sort((a, b) => sizes[b]! - sizes[a]!);
  const rows = new Float64Array(count);
  const partOf = new Int32Array(sizes.length);
  for (const group of bySize) {
    let least = 0;
    for (let part = 1; part < count; part++) if (rows[part]! < rows[least]!) least = part;
    partOf[group] = least;
    rows[least]! += sizes[group]!;
  }
  return partOf;
}

function timeFolds(plan: FoldPlan, study: Study, sample: Sample, report: Report): Folds | null {
  const column = sample.columns.get(study.data.time!)!;
  const times = timeGroups(column, sample.timeOrder!);
  const start = plan.start ?? Math.max(1, Math.floor(times.length / 2));
  if (start >= times.length) {
    report({
      code: 'origin_too_late',
      severity: 'error',
      place: study.placeOf([...plan.path, plan.start === null ? 'by' : 'start']),
      message:
        plan.start === null
          ? `${plan.path.join('.')} cannot hold later times out: ${study.data.time} has one value only in the rows used.`
          : `${plan.path.join('.')}.start is ${start}, but ${study.data.time} has only ${counted(times.length, 'distinct value')} in the rows used, so nothing is left to predict.`,
      hint:
        plan.start === null ? 'Hold out rows or groups instead.' : `Start at ${times.length - 1} or earlier.`,
    });
    return null;
  }
  const parts = [joined(times.slice(0, start))];
  for (let at = start; at < times.length; at += plan.horizon)
    parts.push(joined(times.slice(at, at + plan.horizon)));
  const nameOf = (fold: number) => {
    const at = start + fold * plan.horizon;
    const text = (time: number) => textAt(column, times[Math.min(time, times.length - 1)]![0]!);
    const last = Math.min(at + plan.horizon, times.length) - 1;
    return last === at ? `the rows of ${text(at)}` : `the rows of ${text(at)} to ${text(last)}`;
  };
  return { plan, sets: [{ kind: 'growing', parts }], nameOf, count: parts.length - 1 };
}

/** Positions of the rows of each distinct time, in order. */
function timeGroups(column: Column, order: Int32Array): number[][] {
  const groups: number[][] = [];
  let last: number | string | null = null;
  for (const row of order) {
    const value = column.kind === 'category' ? column.codes[row]! : column.values[row]!;
    if (groups.length === 0 || value !== last) groups.push([row]);
    else groups.at(-1)!.push(row);
    last = value;
  }
  return groups;
}

function joined(groups: readonly (readonly number[])[]): Int32Array {
  return Int32Array.from(groups.flat()).sort();
}

function firstRows(codes: Int32Array, groups: number): Int32Array {
  const first = new Int32Array(groups).fill(-1);
  codes.forEach((code, row) => {
    if (first[code] === -1) first[code] = row;
  });
  return first;
}

function textAt(column: Column, row: number): string {
  if (column.kind === 'category') return column.levels[column.codes[row]!]!;
  if (column.kind === 'date') return formatDate(column.values[row]!);
  return String(column.values[row]);
}

function enough(
  plan: FoldPlan,
  study: Study,
  count: number,
  have: number,
  one: string,
  report: Report,
  many?: string,
): boolean {
  if (count <= have) return true;
  const key = plan.folds === null ? 'by' : 'folds';
  report({
    code: 'folds_too_many',
    severity: 'error',
    place: study.placeOf([...plan.path, key]),
    message: `${plan.path.join('.')} asks for ${count} parts, but there ${have === 1 ? 'is' : 'are'} only ${counted(have, one, many)} to draw them from.`,
    hint: 'Ask for fewer folds, or wait for more rows.',
  });
  return false;
}

/**
 * The folds of some of the rows: what is held out together stays together.
 * @param index positions of the rows, ascending, each once
 */
export function restrictFolds(folds: Folds, index: Int32Array, rowCount: number): Folds {
  const place = new Int32Array(rowCount).fill(-1);
  index.forEach((row, i) => {
    place[row] = i;
  });
  const sets = folds.sets.map((set): FoldSet => {
    if (set.kind === 'single') return set;
    if (set.kind === 'parts') return { ...set, partOf: index.map((row) => set.partOf[row]!) };
    const parts = set.parts
      .map((part) => part.map((row) => place[row]!).filter((row) => row >= 0))
      .filter((part) => part.length > 0);
    return { kind: 'growing', parts };
  });
  return { ...folds, sets };
}

/** Positions of the rows of each part, ascending. */
export function rowsByPart(partOf: Int32Array, count: number): Int32Array[] {
  const sizes = new Int32Array(count);
  for (const part of partOf) if (part >= 0) sizes[part]!++;
  const lists = Array.from(sizes, (size) => new Int32Array(size));
  const next = new Int32Array(count);
  partOf.forEach((part, row) => {
    if (part >= 0) lists[part]![next[part]!++] = row;
  });
  return lists;
}
