import type { Place, Problem } from '../problem.ts';
import { excerpt, safeText } from './excerpt.ts';

/**
 * Problems as text for a terminal, sorted by file (in the order in which files are first named), then by place.
 * One into a source text stands as `file:line:column  what is wrong, what to do`, with the line and a mark beneath
 * it where `sources` holds the text of the file. Empty where there are no problems; otherwise ends in a line end.
 */
export function formatProblems(problems: readonly Problem[], sources: ReadonlyMap<string, string>): string {
  const lines = new Map(
    [...sources].map(([file, text]) => [file, text.replace(/^\ufeff/, '').split(/\r?\n/)]),
  );
  return sortProblems(problems)
    .map((problem) => `${[headline(problem), ...shownLine(problem.place, lines)].join('\n')}\n`)
    .join('');
}

/**
 * Problems as JSON for other programs, sorted as for people:
 *
 *     { "errors": 1, "warnings": 0, "problems": [
 *         { "code": "name_unknown", "severity": "error",
 *           "place": { "kind": "source", "file": "study.yaml", "line": 31, "column": 20, "length": 7 },
 *           "message": "…", "hint": "Did you mean headwind?" } ] }
 *
 * `place.kind` is "source" (line, column and length in characters, from 1), "cell" (`row` is the line in the data
 * file, `variable` its variable; each may be null), "file" or "command". `hint` is null where there is none.
 */
export function problemsAsJson(problems: readonly Problem[]): string {
  const sorted = sortProblems(problems).map(({ code, severity, place, message, hint }) => ({
    code,
    severity,
    place:
      place.kind === 'cell' ? { ...place, row: place.row ?? null, variable: place.variable ?? null } : place,
    message,
    hint: hint ?? null,
  }));
  const errors = sorted.filter(({ severity }) => severity === 'error').length;
  return `${JSON.stringify({ errors, warnings: sorted.length - errors, problems: sorted }, null, 2)}\n`;
}

/** By file, then line and column, or row; problems of equal place keep their order. */
export function sortProblems(problems: readonly Problem[]): readonly Problem[] {
  const files = [...new Set(problems.map(({ place }) => fileOf(place)))];
  const keyed = problems.map((problem) => ({
    problem,
    key: [fileOf(problem.place) === '' ? -1 : files.indexOf(fileOf(problem.place)), ...position(problem)],
  }));
  keyed.sort((a, b) => a.key.map((part, index) => part - b.key[index]!).find((part) => part !== 0) ?? 0);
  return keyed.map(({ problem }) => problem);
}

function fileOf(place: Place): string {
  return place.kind === 'command' ? '' : place.file;
}

/** That there are more stands behind those that are listed. */
function position({ code, place }: Problem): readonly [number, number] {
  if (code === 'problems_more') return [Number.MAX_SAFE_INTEGER, 0];
  if (place.kind === 'source') return [place.line, place.column];
  return place.kind === 'cell' ? [place.row ?? 0, 0] : [0, 0];
}

function headline({ place, severity, message, hint }: Problem): string {
  const what = `${severity === 'warning' ? 'Warning: ' : ''}${message}${hint === undefined ? '' : ` ${hint}`}`;
  return safeText(`${placeText(place)}${what}`);
}

function placeText(place: Place): string {
  switch (place.kind) {
    case 'source':
      return `${place.file}:${place.line}:${place.column}  `;
    case 'cell': {
      const row = place.row === undefined ? '' : `, row ${place.row}`;
      const column = place.variable === undefined ? '' : `, column ${place.variable}`;
      return `${place.file}${row}${column}: `;
    }
    case 'file':
      return `${place.file}: `;
    case 'command':
      return '';
  }
}

function shownLine(place: Place, lines: ReadonlyMap<string, readonly string[]>): readonly string[] {
  if (place.kind !== 'source') return [];
  const line = lines.get(place.file)?.[place.line - 1];
  if (line === undefined || line.trim() === '') return [];
  const { text, mark } = excerpt(line, place.column, place.length);
  const gutter = `${place.line}`.padStart(5);
  return [`${gutter} | ${text}`, `${' '.repeat(gutter.length)} | ${mark}`];
}
