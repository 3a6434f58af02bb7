import { mkdirSync, mkdtempSync, readdirSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { runCommandLine } from '../../src/cli/command-line.ts';
import type { Problem } from '../../src/problem.ts';
import type { StudyRecord } from '../../src/record/record.ts';
import { recordFaults } from '../../src/record/record-faults.ts';
import { recordText } from '../../src/record/record-text.ts';
import { runStudy } from '../../src/run/run-study.ts';
import { collecting } from '../cli/collect.ts';

type Content = string | Uint8Array;

/** What lies in the folder of a run. */
export interface Files {
  /** The text of study.yaml; null for none. */
  readonly study: Content | null;
  /** The text of data.csv; null for none. */
  readonly data: Content | null;
  readonly others?: { readonly [name: string]: Content };
  /** Folders to be made. */
  readonly folders?: readonly string[];
}

export interface Outcome {
  /** Of `plumbrule fit`. */
  readonly status: number;
  readonly problems: readonly Problem[];
  /** "error code at place" of each problem; see `mark`. */
  readonly marks: readonly string[];
  readonly record: StudyRecord | null;
  /** Standard output and standard error of `plumbrule fit`. */
  readonly out: string;
  readonly err: string;
  /** What `plumbrule fit` left in the output folder, by name. */
  readonly results: ReadonlyMap<string, string>;
  /** What no run may do, whatever it is given, and this one did; sentences. */
  readonly faults: readonly string[];
}

/** Results of an earlier run that lie in the output folder before each run. */
const EARLIER: { readonly [name: string]: string } = {
  'record.json': '{ "earlier": true }\n',
  'report.html': '<p>earlier</p>\n',
  'notes.txt': 'A file of the analyst’s own.\n',
};

/**
 * Runs a study twice in a folder of its own, through the library and through the command line `fit` with the
 * results of an earlier run in its output folder, and holds both against what must be so of every run.
 */
export async function wholeRun(files: Files, out = 'out'): Promise<Outcome> {
  const home = mkdtempSync(join(tmpdir(), 'whole-run-'));
  try {
    for (const [name, content] of Object.entries({
      'study.yaml': files.study,
      'data.csv': files.data,
      ...files.others,
    })) {
      if (content !== null) writeFileSync(join(home, name), content);
    }
    for (const folder of ['out', ...(files.folders ?? [])])
      mkdirSync(join(home, folder), { recursive: true });
    for (const [name, content] of Object.entries(EARLIER)) writeFileSync(join(home, 'out', name), content);
    return await runIn(home, out, `${files.study}\n${files.data}`);
  } finally {
    rmSync(home, { recursive: true });
  }
}

async function runIn(home: string, out: string, inputs: string): Promise<Outcome> {
  const path = join(home, 'study.yaml');
  const { record, problems } = await runStudy(path);
  const { terminal, printed } = collecting();
  const status = await runCommandLine(['fit', path, '--out', join(home, out)], terminal);
  const results = filesIn(join(home, 'out'));
  return {
    status,
    problems,
    marks: problems.map((problem) => mark(problem, home)),
    record,
    ...printed,
    results,
    faults: [
      ...problems.flatMap((problem) => problemFaults(problem, home, inputs)),
      ...(record === null ? [] : recordFaultsOf(record)),
      ...statusFaults(status, record, problems, printed.err),
      ...resultFaults(status, record, results, home),
      ...[...(status < 2 ? results : [])].flatMap(([name, text]) => wordFaults(name, text, inputs)),
    ],
  };
}

/** "predictor_constant 14:22+2" in the study, "cell_not_number row 3 x", "data_empty data.csv"; a warning in brackets. */
export function mark({ code, severity, place }: Problem, home: string): string {
  const where = () => {
    switch (place.kind) {
      case 'source':
        return `${place.file === join(home, 'study.yaml') ? '' : `${place.file.replace(`${home}/`, '')}:`}${place.line}:${place.column}+${place.length}`;
      case 'cell':
        return [
          ...(place.file === 'data.csv' ? [] : [place.file]),
          ...(place.row === undefined ? [] : [`row ${place.row}`]),
          ...(place.variable === undefined ? [] : [place.variable]),
        ].join(' ');
      case 'file':
        return place.file.replace(`${home}/`, '');
      case 'command':
        return 'command';
    }
  };
  const text = `${code} ${where()}`;
  return severity === 'warning' ? `(${text})` : text;
}

/** What a value that is none becomes when it is written; no word of ours, but perhaps of the input. */
function strayWord(text: string, inputs: string): string | undefined {
  return ['NaN', 'Infinity', 'undefined', '[object '].find(
    (word) => text.includes(word) && !inputs.includes(word),
  );
}

/** A problem is said in whole sentences and points to something that is there. */
function problemFaults({ code, place, message, hint }: Problem, home: string, inputs: string): string[] {
  const faults: string[] = [];
  for (const text of [message, ...(hint === undefined ? [] : [hint])]) {
    if (!/^\S.*[^\s.?][.?]$/su.test(text)) faults.push(`${code}: no sentence: ${text}`);
    if (strayWord(text.replace(/is undefined there|"undefined [^"]*"/g, ''), inputs) !== undefined) {
      faults.push(`${code} holds what is no word: ${text}`);
    }
  }
  if (place.kind === 'command') return faults;
  const file = place.file.startsWith('/') ? place.file : join(home, place.file);
  const lines = linesOf(file);
  if (place.kind === 'source') {
    const line = lines?.[place.line - 1];
    if (!(place.column >= 1 && place.length >= 1) || (lines !== null && line === undefined)) {
      faults.push(`${code} points outside the file: ${place.line}:${place.column}+${place.length}`);
    }
  } else if (place.kind === 'cell') {
    if (place.row === undefined && place.variable === undefined)
      faults.push(`${code} has no row and no column`);
    if (place.row !== undefined && !(place.row >= 1 && (lines === null || place.row <= lines.length))) {
      faults.push(`${code} points outside the file: row ${place.row}`);
    }
  }
  return faults;
}

function linesOf(file: string): string[] | null {
  try {
    return readFileSync(file, 'latin1').split(/\r\n|\n|\r/);
  } catch {
    return null;
  }
}

function recordFaultsOf(record: StudyRecord): string[] {
  return [...recordFaults(record), ...notFinite(record, 'record')].slice(0, 5);
}

/** Every number of a value that is NaN or infinite, and every absent value in a list, by its path. */
export function notFinite(value: unknown, path: string): string[] {
  if (typeof value === 'number') return Number.isFinite(value) ? [] : [`${path} is ${value}`];
  if (value === undefined) return [`${path} is undefined`];
  if (ArrayBuffer.isView(value)) return [`${path} is no plain list`];
  if (typeof value !== 'object' || value === null) return [];
  return Object.entries(value).flatMap(([key, inner]) => notFinite(inner, `${path}.${key}`));
}

function statusFaults(
  status: number,
  record: StudyRecord | null,
  problems: readonly Problem[],
  err: string,
): string[] {
  const faults: string[] = [];
  const hasError = problems.some(({ severity }) => severity === 'error');
  if (![0, 1, 2].includes(status)) faults.push(`status ${status}: ${err}`);
  if ((record === null) !== hasError) faults.push('a record beside an error, or neither');
  if (record === null && status !== 2) faults.push(`status ${status} without a record`);
  if (status === 2 && err === '') faults.push('status 2 without a word');
  for (const { message } of problems) {
    const [start] = message.split(/[^ -~]/u);
    if (!err.includes(start!.slice(0, 60))) faults.push(`not printed: ${message}`);
  }
  return faults;
}

/** All of the results or none: earlier ones stay where nothing was found, and nothing is left half-written. */
function resultFaults(
  status: number,
  record: StudyRecord | null,
  results: ReadonlyMap<string, string>,
  home: string,
): string[] {
  const faults: string[] = [];
  if (results.get('notes.txt') !== EARLIER['notes.txt']) faults.push('notes.txt was touched');
  for (const name of filesIn(home).keys()) if (name.includes('.plumbrule-')) faults.push(`${name} is left`);
  if (status === 2) {
    for (const [name, text] of Object.entries(EARLIER)) {
      if (results.get(name) !== text) faults.push(`the earlier ${name} was touched`);
    }
    const more = [...results.keys()].filter((name) => !Object.hasOwn(EARLIER, name));
    return more.length === 0 ? faults : [...faults, `written: ${more.join(', ')}`];
  }
  if (status < 2 && record !== null && results.get('record.json') !== recordText(record)) {
    faults.push('record.json is not the record');
  }
  return faults;
}

function wordFaults(name: string, text: string, inputs: string): string[] {
  if (name === 'notes.txt' || name === 'record.json') return [];
  const word = strayWord(text, inputs);
  const at = word === undefined ? -1 : text.indexOf(word);
  return at < 0 ? [] : [`${name}: …${text.slice(Math.max(0, at - 40), at + 40)}…`];
}

function filesIn(folder: string): Map<string, string> {
  const names = readdirSync(folder, { recursive: true, encoding: 'utf8' }).sort();
  return new Map(
    names
      .filter((name) => statSync(join(folder, name)).isFile())
      .map((name) => [name, readFileSync(join(folder, name), 'utf8')]),
  );
}
