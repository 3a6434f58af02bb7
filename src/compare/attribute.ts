import { coefficientError } from '../engine/covariance.ts';
import type { StudyRecord } from '../record/record.ts';
import type { CoefficientChange, ComparedModel, Parts } from './comparison.ts';
import { type Declaration, type ModelDefinition, readsAlike, sameModel } from './declaration.ts';
import type { MatchedRows } from './match-rows.ts';
import { covarianceOf, evaluated, namesToPick, pickRows, type Refit, type Rows, refit } from './refit.ts';

/** A model as each of the two records declares it; where one of them does not tell, as the other does. */
export interface ModelPair {
  readonly chosen: ComparedModel['chosen'];
  readonly earlier: ModelDefinition;
  readonly later: ModelDefinition;
}

/** One of the two records with its rows, base and derived variables as it declares them. */
export interface Side {
  readonly record: StudyRecord;
  readonly declaration: Declaration;
  /** Rows with base variables only. */
  readonly base: Rows;
}

/**
 * A model before and after, and every difference of a coefficient taken apart in the declared order: rows removed,
 * values revised, rows added, declaration changed. Each step is a fit of its own; the parts add up to the whole.
 */
export function compareModel(
  pair: ModelPair,
  earlier: Side,
  later: Side,
  matched: MatchedRows,
): { readonly model: ComparedModel; readonly before: Refit | null } {
  const fits = fitSteps(pair, earlier, later, matched);
  const { first, last } = fits;
  const before = typeof first === 'string' ? null : first;
  const after = typeof last === 'string' ? null : last;
  const errorsBefore = before === null ? new Map<string, number>() : errorsOf(before, earlier);
  const errorsAfter = after === null ? new Map<string, number>() : errorsOf(after, later);
  const moved = [...pair.later.baselines].find(([category, level]) => {
    const was = pair.earlier.baselines.get(category);
    return was !== undefined && was !== level;
  });
  const apart = moved === undefined ? takeApart(fits) : () => null;
  const names = [...new Set([...(after?.estimates.keys() ?? []), ...(before?.estimates.keys() ?? [])])];
  const units = new Map([...(before?.columns ?? []), ...(after?.columns ?? [])].map((c) => [c.name, c.unit]));
  const coefficients = names.map((name): CoefficientChange => {
    const a = before?.estimates.get(name) ?? null;
    const b = after?.estimates.get(name) ?? null;
    const difference = a === null || b === null || moved !== undefined ? null : b - a;
    const error = errorsBefore.get(name) ?? null;
    const measured = difference === null || error === null || error === 0 ? null : difference / error;
    return {
      name,
      unit: units.get(name) ?? null,
      before: a,
      before_standard_error: error,
      after: b,
      after_standard_error: errorsAfter.get(name) ?? null,
      difference,
      parts: difference === null ? null : apart(name, difference),
      in_standard_errors: measured !== null && Number.isFinite(measured) ? measured : null,
    };
  });
  const notes = [
    ...(moved === undefined
      ? []
      : [
          `Levels of ${moved[0]} are compared with ${moved[1]} now and were compared with ${pair.earlier.baselines.get(moved[0])} before, so that coefficients say other things and are not subtracted.`,
        ]),
    ...sentences('It cannot be fitted to the earlier rows', first),
    ...sentences('It cannot be fitted to the later rows', last),
    ...fits.between.flatMap((step) => sentences('A step between the two cannot be fitted', step)),
  ];
  return {
    before,
    model: {
      candidate: pair.later.name,
      chosen: pair.chosen,
      rows_before: earlier.base.rowCount,
      rows_after: after === null ? null : after.fit.rowCount,
      residual_standard_error: { before: before?.s ?? null, after: after?.s ?? null },
      note: notes.length === 0 ? null : [...new Set(notes)].join(' '),
      coefficients,
      largest_change: largestChange(coefficients),
    },
  };
}

function sentences(start: string, step: Refit | string): string[] {
  return typeof step === 'string' ? [`${start}: ${step.charAt(0).toLowerCase()}${step.slice(1)}`] : [];
}

function largestChange(coefficients: readonly CoefficientChange[]): ComparedModel['largest_change'] {
  let largest: ComparedModel['largest_change'] = null;
  for (const { name, in_standard_errors: change } of coefficients) {
    if (change === null) continue;
    if (largest === null || Math.abs(change) > Math.abs(largest.in_standard_errors)) {
      largest = { name, in_standard_errors: change };
    }
  }
  return largest;
}

type Step = Refit | string;

/** The fits from the first to the last; a step that changes nothing is the fit before it, the same object. */
interface Steps {
  readonly first: Step;
  readonly between: readonly [Step, Step, Step];
  readonly last: Step;
}

function fitSteps(pair: ModelPair, earlier: Side, later: Side, matched: MatchedRows): Steps {
  const { declaration } = earlier;
  const names = namesToPick(pair.earlier, declaration);
  const old = evaluated(earlier.base, declaration);
  const renewed = evaluated(later.base, declaration);
  const fitEarlier = (rows: Rows) => refit(pair.earlier, declaration, rows);

  const first = fitEarlier(pickRows(old, allOf(old), names));
  const { keptEarlier, keptLater, removed, added } = matched;
  const keptOld = pickRows(old, keptEarlier, names);
  const keptNew = pickRows(renewed, keptLater, names);
  const withoutRemoved = removed.length === 0 ? first : fitEarlier(keptOld);
  const revised = sameRows(keptOld, keptNew) ? withoutRemoved : fitEarlier(keptNew);
  const whole = added.length === 0 ? revised : fitEarlier(pickRows(renewed, allOf(renewed), names));
  const last =
    sameModel(pair.earlier, pair.later) && readsAlike(pair.later, declaration, later.declaration)
      ? whole
      : fitLater(pair, later);
  return { first, between: [withoutRemoved, revised, whole], last };
}

function fitLater(pair: ModelPair, later: Side): Step {
  const rows = evaluated(later.base, later.declaration);
  const names = namesToPick(pair.later, later.declaration);
  return refit(pair.later, later.declaration, pickRows(rows, allOf(rows), names));
}

export function allOf(rows: Rows): Int32Array {
  return Int32Array.from({ length: rows.rowCount }, (_, row) => row);
}

/** Whether two sets of rows hold the same values in the same order. */
function sameRows(a: Rows, b: Rows): boolean {
  return [...a.columns].every(([name, x]) => {
    const y = b.columns.get(name);
    if (y === undefined || x.kind !== y.kind) return false;
    if (x.kind === 'category' && y.kind === 'category') {
      return x.codes.every((code, row) => x.levels[code] === y.levels[y.codes[row]!]);
    }
    if (x.kind === 'text' || y.kind === 'text' || x.kind === 'category' || y.kind === 'category') {
      return (x as { values: readonly unknown[] }).values.every(
        (value, row) => value === (y as { values: readonly unknown[] }).values[row],
      );
    }
    return x.values.every((value, row) => Object.is(value, y.values[row]));
  });
}

/**
 * The parts of one coefficient's difference. What the last step that changed anything contributes is the rest, so that
 * nothing is lost to rounding between the parts and the whole.
 */
function takeApart({ first, between, last }: Steps): (name: string, difference: number) => Parts | null {
  const steps = [first, ...between, last];
  const changed = [0, 1, 2, 3].filter((k) => steps[k] !== steps[k + 1]);
  return (name, difference) => {
    const parts = [0, 0, 0, 0];
    let sum = 0;
    for (const k of changed) {
      const before = estimateOf(steps[k]!, name);
      const after = estimateOf(steps[k + 1]!, name);
      if (before === null || after === null) return null;
      parts[k] = k === changed.at(-1) ? difference - sum : after - before;
      sum += parts[k]!;
    }
    const [removed, revised, added, declaration] = parts as [number, number, number, number];
    return { removed, revised, added, declaration };
  };
}

function estimateOf(step: Step, name: string): number | null {
  return typeof step === 'string' ? null : (step.estimates.get(name) ?? null);
}

/** How nearly an estimate must agree with that of a record to be of the same model, in its standard errors. */
const SAME = 1e-6;

/** Standard errors by name: the record's where it has this very model as a candidate, else those of the fit. */
function errorsOf(model: Refit, { record, declaration }: Side): Map<string, number> {
  const candidate = record.candidates.find(({ name }) => name === model.definition.name);
  const covariance = covarianceOf(model, declaration);
  const errors = new Map<string, number>();
  model.fit.columns.forEach((column, j) => {
    const name = model.columns[column]!.name;
    const own = covariance === null ? null : coefficientError(covariance, j);
    const there = candidate?.coefficients.find((coefficient) => coefficient.name === name);
    const recorded = there?.standard_error ?? null;
    const same =
      recorded !== null && Math.abs(there!.estimate - model.estimates.get(name)!) <= SAME * recorded;
    const error = same ? recorded : own;
    if (error !== null) errors.set(name, error);
  });
  return errors;
}

/** Whether a fit of a record's chosen model gives the record's estimates again. */
export function givesRecord(model: Refit, record: StudyRecord): boolean {
  const candidate = record.candidates.find(({ name }) => name === record.selection.chosen);
  return (record.model?.columns ?? []).every(({ name, estimate }) => {
    const found = model.estimates.get(name);
    const error = candidate?.coefficients.find((each) => each.name === name)?.standard_error ?? 0;
    return found !== undefined && Math.abs(found - estimate) <= SAME * Math.max(error, Math.abs(estimate));
  });
}
