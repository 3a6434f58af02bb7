import { nearest } from '../expression/nearest.ts';
import type { Problem, Report } from '../problem.ts';
import type { DataPlan, VariablePlan } from '../study/study.ts';
import { showText } from './fault-sentence.ts';

export interface HeaderMatch {
  /** The declared variables to be read, with the index of each one's column, in file order. */
  readonly found: readonly { readonly variable: VariablePlan; readonly position: number }[];
  readonly ignored: readonly string[];
  /** Whether every required column is there, once. */
  readonly complete: boolean;
}

/** Finds the declared variables in the header. `required` are names of variables that must be there. */
export function matchHeader(
  plan: DataPlan,
  header: readonly string[],
  line: number,
  required: ReadonlySet<string>,
  optional: ReadonlySet<string>,
  report: Report,
): HeaderMatch {
  const names = header.map((name) => name.trim());
  const positions = new Map<string, number[]>();
  names.forEach((name, position) => {
    const seen = positions.get(name);
    if (seen === undefined) positions.set(name, [position]);
    else seen.push(position);
  });
  const declared = new Set(plan.variables.map((variable) => variable.column));
  let complete = true;

  for (const [name, at] of positions) {
    if (at.length === 1 || name === '') continue;
    const used = declared.has(name);
    if (used) complete = false;
    report(headerTwice(plan.file, line, name, at, used));
  }

  const found: { variable: VariablePlan; position: number }[] = [];
  const free = names.filter((name) => name !== '' && !declared.has(name));
  const onlyOne = names.length === 1 && plan.variables.length > 1;
  for (const variable of plan.variables) {
    const must = required.has(variable.name);
    if (!must && !optional.has(variable.name)) continue;
    const position = positions.get(variable.column)?.[0];
    if (position !== undefined) {
      found.push({ variable, position });
    } else if (must) {
      // Of a header that is one column every other one is missing: the first tells it.
      if (complete || !onlyOne) report(columnMissing(plan, line, variable, free, onlyOne));
      complete = false;
    }
  }
  found.sort((a, b) => a.position - b.position);
  const ignored = names
    .map((name, position) => (name === '' ? `(column ${position + 1})` : name))
    .filter((name) => !declared.has(name));
  return { found, ignored, complete };
}

function headerTwice(file: string, row: number, name: string, at: readonly number[], used: boolean): Problem {
  const columns = at.map((position) => position + 1);
  const list = `${columns.slice(0, -1).join(', ')} and ${columns.at(-1)}`;
  return {
    code: 'header_twice',
    severity: used ? 'error' : 'warning',
    place: { kind: 'cell', file, row },
    message: `The header names ${showText(name)} ${at.length === 2 ? 'twice' : `${at.length} times`}, in columns ${list}.`,
    ...(used ? { hint: 'Give each column a name of its own.' } : {}),
  };
}

function columnMissing(
  plan: DataPlan,
  row: number,
  variable: VariablePlan,
  free: readonly string[],
  onlyOne: boolean,
): Problem {
  const near = onlyOne ? null : nearest(variable.column, free);
  const { delimiter } = plan.format;
  const hint =
    near !== null
      ? `Did you mean ${near}?`
      : onlyOne
        ? `The header was read as a single column; ${delimiter === null ? 'declare data.format.delimiter' : `data.format.delimiter is ${showText(delimiter)}`}.`
        : null;
  const wanted = variable.column === variable.name ? '' : ` of the variable ${variable.name}`;
  return {
    code: 'column_missing',
    severity: 'error',
    place: { kind: 'cell', file: plan.file, row, variable: variable.name },
    message: `The header has no column ${showText(variable.column)}${wanted}.`,
    ...(hint === null ? {} : { hint }),
  };
}
