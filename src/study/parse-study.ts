import { basename } from 'node:path';
import type { Problem, Report } from '../problem.ts';
import { checkStudyFile } from './check-study-file.generated.ts';
import { type GivenParameters, putParameters } from './parameters.ts';
import type { Path } from './path.ts';
import type { Loose } from './reading.ts';
import { resolveStudy } from './resolve-study.ts';
import { schemaFaults } from './schema-faults.ts';
import type { Study } from './study.ts';
import type { StudyFile } from './study-file.generated.ts';
import { readYaml, type Written } from './written.ts';

/**
 * Reads a study from the text of its file: YAML, then the schema, then the meaning. Everything that is wrong is
 * reported in one go, with its place in `shownFile`; the result is null where any of it is an error. `folder` is
 * where relative file names start; `sha256` is of the file's bytes; `given` are values for its parameters.
 */
export function parseStudy(
  text: string,
  shownFile: string,
  folder: string,
  sha256: string,
  report: Report,
  given: GivenParameters = new Map(),
): Study | null {
  let errors = 0;
  const counting = (problem: Problem) => {
    if (problem.severity === 'error') errors++;
    report(problem);
  };
  if (isRecord(text)) {
    counting(recordGiven(shownFile));
    return null;
  }
  // An editor shows no byte-order mark, so columns are counted without it.
  const source = text.startsWith('\ufeff') ? text.slice(1) : text;
  const asWritten = readYaml(source, shownFile, counting);
  if (asWritten === null) return null;
  const { written, parameters } = putParameters(asWritten, given, counting);
  if (written.value === null) {
    counting(unreadable(shownFile, 'The study file is empty.'));
    return null;
  }
  if (!isMapping(written.value)) {
    counting(notMapping(written));
    return null;
  }
  checkStudyFile(written.value);
  const faults = schemaFaults(checkStudyFile.errors ?? [], written);
  for (const { problem } of faults) counting(problem);
  const unusable = faults.flatMap((each) => (each.unusable === null ? [] : [each.unusable]));
  const file = without(written.value, unusable) as Loose<StudyFile>;
  const origin = { file: basename(shownFile), folder, sha256, parameters };
  const study = resolveStudy({ file, written, report: counting }, origin);
  return errors === 0 ? study : null;
}

/** Whether a text, or its beginning, is that of a record, which `fit` has written from a study. */
export function isRecord(text: string): boolean {
  return /^\ufeff?\s*\{\s*"format"\s*:\s*"plumbrule-record\//.test(text);
}

export function recordGiven(file: string): Problem {
  const hint = 'plumbrule render writes its reports again; plumbrule fit needs the study file.';
  return unreadable(file, 'This is a record, not a study.', hint);
}

export function unreadable(file: string, message: string, hint?: string): Problem {
  const place = { kind: 'file', file } as const;
  return {
    code: 'study_unreadable',
    severity: 'error',
    place,
    message,
    ...(hint === undefined ? {} : { hint }),
  };
}

function notMapping(written: Written): Problem {
  return {
    code: 'value_not_allowed',
    severity: 'error',
    place: written.placeOf([]),
    message: 'A study is a mapping of keys, which this file is not.',
    hint: 'It begins with plumbrule: 1. Is this the data file?',
  };
}

function isMapping(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

/** A copy in which the values at the paths are undefined: their keys and indexes stay, so that names are still known. */
function without(value: unknown, paths: readonly Path[]): unknown {
  if (paths.length === 0) return value;
  if (paths.some((path) => path.length === 0)) return undefined;
  const below = (step: string | number) =>
    paths.filter((path) => path[0] === step).map((path) => path.slice(1));
  if (Array.isArray(value)) return value.map((item, index) => without(item, below(index)));
  if (!isMapping(value)) return value;
  const copy: Record<string, unknown> = Object.create(null);
  for (const [key, inner] of Object.entries(value)) copy[key] = without(inner, below(key));
  return copy;
}
