import { parseNumber, splitNumbers } from './numbers-in-text.ts';

/** One place at which two records say different things. */
export interface Difference {
  /** "candidates[1].coefficients[0].estimate" */
  readonly key: string;
  /** As JSON; "absent" where the key is not there. */
  readonly earlier: string;
  readonly later: string;
  /** |a − b| relative to the larger, where both are numbers; else null. */
  readonly relative: number | null;
}

/** Keys that say how a record came about, not what was found; they are compared by the caller. */
const ORIGIN: ReadonlySet<string> = new Set(['tool.version', 'study.sha256', 'data.sha256']);

/**
 * Every key path at which two records differ, in the order of the first, those only in the second last. Numbers are
 * the same where they are the same double, or, with a tolerance above 0, where |a − b| is at most the tolerance times
 * the larger of the two (in a list of numbers: times the largest of either list, since a value near 0 among large
 * ones has no digits of its own). Sentences are then the same where their words are and their numbers differ by no
 * more than the tolerance or one step of the last digit shown.
 */
export function differences(earlier: unknown, later: unknown, tolerance: number): Difference[] {
  const found: Difference[] = [];
  compare(earlier, later, '', { tolerance, scale: 0 }, found);
  return found;
}

interface Measure {
  readonly tolerance: number;
  /** The largest number of the list that is being compared; 0 outside lists of numbers. */
  readonly scale: number;
}

function compare(a: unknown, b: unknown, key: string, measure: Measure, found: Difference[]): void {
  if (ORIGIN.has(key)) return;
  if (typeof a === 'number' && typeof b === 'number') {
    if (!sameNumber(a, b, measure)) found.push(difference(key, a, b));
  } else if (typeof a === 'string' && typeof b === 'string') {
    if (!sameText(a, b, measure.tolerance)) found.push(difference(key, a, b));
  } else if (Array.isArray(a) && Array.isArray(b)) {
    const inner = { ...measure, scale: Math.max(largest(a), largest(b)) };
    for (let i = 0; i < Math.max(a.length, b.length); i++) compare(a[i], b[i], `${key}[${i}]`, inner, found);
  } else if (isObject(a) && isObject(b)) {
    for (const name of new Set([...Object.keys(a), ...Object.keys(b)])) {
      compare(a[name], b[name], key === '' ? name : `${key}.${name}`, { ...measure, scale: 0 }, found);
    }
  } else if (a !== b) {
    found.push(difference(key, a, b));
  }
}

function sameNumber(a: number, b: number, { tolerance, scale }: Measure): boolean {
  if (tolerance === 0) return Object.is(a, b);
  return Math.abs(a - b) <= tolerance * Math.max(Math.abs(a), Math.abs(b), scale);
}

function sameText(a: string, b: string, tolerance: number): boolean {
  if (a === b) return true;
  if (tolerance === 0) return false;
  const [left, right] = [splitNumbers(a), splitNumbers(b)];
  if (left.length !== right.length) return false;
  return left.every((part, index) => {
    const other = right[index]!;
    if (part === other) return true;
    const [x, y] = [parseNumber(part), parseNumber(other)];
    if (x === null || y === null) return false;
    const step = Math.max(x.step, y.step) * (1 + 1e-9);
    return (
      Math.abs(x.value - y.value) <=
      Math.max(step, tolerance * Math.max(Math.abs(x.value), Math.abs(y.value)))
    );
  });
}

function largest(list: readonly unknown[]): number {
  let most = 0;
  for (const item of list) if (typeof item === 'number') most = Math.max(most, Math.abs(item));
  return most;
}

function difference(key: string, a: unknown, b: unknown): Difference {
  const relative =
    typeof a === 'number' && typeof b === 'number'
      ? Math.abs(a - b) / Math.max(Math.abs(a), Math.abs(b), Number.MIN_VALUE)
      : null;
  return { key, earlier: shown(a), later: shown(b), relative };
}

/** Longest text of a value in a message. */
const LONGEST = 120;

function shown(value: unknown): string {
  if (value === undefined) return 'absent';
  const text = JSON.stringify(value);
  return text.length <= LONGEST ? text : `${text.slice(0, LONGEST - 1)}…`;
}

function isObject(value: unknown): value is Readonly<Record<string, unknown>> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

/** How many numbers a value holds. */
export function countNumbers(value: unknown): number {
  if (typeof value === 'number') return 1;
  if (typeof value !== 'object' || value === null) return 0;
  let count = 0;
  for (const inner of Object.values(value)) count += countNumbers(inner);
  return count;
}
