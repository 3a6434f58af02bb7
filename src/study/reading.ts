import type { ProblemCode, Report, SourcePlace } from '../problem.ts';
import type { Path } from './path.ts';
import type { StudyFile } from './study-file.generated.ts';
import type { Written } from './written.ts';

/** A value as written in which any part may be missing, because the schema check has found it unusable. */
export type Loose<T> = T extends readonly (infer Item)[]
  ? readonly (Loose<Item> | undefined)[]
  : T extends object
    ? { readonly [Key in keyof T]?: Loose<T[Key]> | undefined }
    : T;

/** What every part of the meaning check reads, and how it tells what is wrong. */
export interface Reading {
  readonly file: Loose<StudyFile>;
  readonly written: Written;
  readonly report: Report;
}

/** Reports an error at a value. */
export function fault(reading: Reading, code: ProblemCode, path: Path, message: string, hint?: string): void {
  faultAt(reading, code, reading.written.placeOf(path), message, hint);
}

/** Reports an error at the key that a path ends in. */
export function keyFault(
  reading: Reading,
  code: ProblemCode,
  path: Path,
  message: string,
  hint?: string,
): void {
  faultAt(reading, code, reading.written.keyPlaceOf(path), message, hint);
}

export function faultAt(
  reading: Reading,
  code: ProblemCode,
  place: SourcePlace,
  message: string,
  hint?: string,
): void {
  reading.report({ code, severity: 'error', place, message, ...(hint === undefined ? {} : { hint }) });
}

export function warning(
  reading: Reading,
  code: ProblemCode,
  place: SourcePlace,
  message: string,
  hint?: string,
): void {
  reading.report({ code, severity: 'warning', place, message, ...(hint === undefined ? {} : { hint }) });
}

/** The texts of a list of cells, each as it is spelt in the study file ("007" of 007). */
export function cellTexts(
  reading: Reading,
  list: readonly (string | number | boolean | undefined)[],
  path: Path,
): readonly string[] {
  return list.flatMap((value, index) =>
    value === undefined ? [] : [cellText(reading, value, [...path, index])],
  );
}

export function cellText(reading: Reading, value: string | number | boolean, path: Path): string {
  return reading.written.textAt(path) ?? String(value);
}

/** Entries of a mapping under names of the writer's choice, in the order of the text. */
export function entriesInOrder<Value>(
  reading: Reading,
  mapping: Readonly<Record<string, Value>> | undefined,
  path: Path,
): readonly (readonly [string, Value])[] {
  if (mapping === undefined) return [];
  return reading.written.keysAt(path).map((key) => [key, mapping[key]!]);
}
