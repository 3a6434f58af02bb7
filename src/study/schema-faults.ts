import type { ErrorObject } from 'ajv';
import { functionNamed } from '../expression/functions.ts';
import { nearest } from '../expression/nearest.ts';
import type { Problem, ProblemCode } from '../problem.ts';
import { listed, type Path, quote, showPath } from './path.ts';
import { chooseBranches } from './schema-unions.ts';
import {
  type BrokenSchema,
  COMMA_HINT,
  countOf,
  itemWords,
  rangeWords,
  shown,
  typeHint,
  typeWords,
} from './schema-words.ts';
import type { Written } from './written.ts';

/** A value or key that the schema does not allow, as a problem, and what to leave out of the further checks. */
export interface SchemaFault {
  readonly problem: Problem;
  /** The value that cannot be used; null where a key is missing. */
  readonly unusable: Path | null;
}

/** Translates what the compiled schema found into sentences with places. One sentence for each broken value. */
export function schemaFaults(errors: readonly ErrorObject[], written: Written): readonly SchemaFault[] {
  const located = errors.map((error) => ({ error, path: pathOf(error.instancePath, written.value) }));
  const faults: SchemaFault[] = [];
  const said = new Set<string>();
  for (const { error, path } of withoutMisspelt(chooseBranches(located))) {
    const fault = translate(error, path, written);
    if (fault === null) continue;
    // A wrong type breaks limits and lists of allowed values as well; the first sentence is enough.
    const ofKeys = error.keyword === 'required' || error.keyword === 'additionalProperties';
    const key = `${showPath(path)} ${ofKeys ? fault.problem.message : ''}`;
    if (said.has(key)) continue;
    said.add(key);
    faults.push(fault);
  }
  return faults;
}

interface Located {
  readonly error: ErrorObject;
  readonly path: Path;
}

/** Leaves out that a required key is missing where it only is misspelt, which is told as such. */
function withoutMisspelt(errors: readonly Located[]): readonly Located[] {
  const meant = new Set<string>();
  for (const { error } of errors) {
    if (error.keyword !== 'additionalProperties') continue;
    const known = Object.keys((error.parentSchema as BrokenSchema).properties ?? {});
    meant.add(`${error.instancePath} ${nearest(String(error.params.additionalProperty), known)}`);
  }
  return errors.filter(
    ({ error }) =>
      error.keyword !== 'required' ||
      !meant.has(`${error.instancePath} ${String(error.params.missingProperty)}`),
  );
}

/** The steps of a JSON pointer; a step into an array is a number. */
function pathOf(pointer: string, top: unknown): Path {
  let value: unknown = top;
  return pointer
    .split('/')
    .slice(1)
    .map((step) => {
      const key = step.replaceAll('~1', '/').replaceAll('~0', '~');
      const inList = Array.isArray(value);
      value = (value as Record<string, unknown>)[key];
      return inList ? Number(key) : key;
    });
}

function translate(error: ErrorObject, path: Path, written: Written): SchemaFault | null {
  const schema = error.parentSchema as BrokenSchema;
  const name = path.length === 0 ? 'The study' : showPath(path);
  const value = shown(path, error.data, written);
  const wrong = (code: ProblemCode, message: string, hint?: string): SchemaFault => ({
    problem: problem(code, written, path, message, hint),
    unusable: path,
  });
  switch (error.keyword) {
    case 'additionalProperties': {
      const key = String(error.params.additionalProperty);
      const isEmpty = (error.data as Record<string, unknown>)[key] === null;
      return unknownKey(key, path, Object.keys(schema.properties ?? {}), isEmpty, written);
    }
    case 'required': {
      const place = written.placeOf(path);
      const message = `${name} lacks the key ${error.params.missingProperty}.`;
      return { problem: { code: 'key_missing', severity: 'error', place, message }, unusable: null };
    }
    case 'propertyNames': {
      const key = String(error.params.propertyName);
      const at = [...path, key];
      const message = `${quote(key)} cannot be the name of a variable.`;
      const hint =
        'A name has up to 100 characters, no back-quotes or line breaks, and no blanks at its ends; the header in the data goes under column.';
      const place = written.keyPlaceOf(at);
      return {
        problem: { code: 'value_not_allowed', severity: 'error', place, message, hint },
        unusable: null,
      };
    }
    case 'type':
      return wrong(
        'value_not_allowed',
        `${name} must be ${typeWords(schema)}, but is ${value}.`,
        typeHint(error, path, written),
      );
    case 'const':
      return wrong(
        'value_not_allowed',
        `${name} is ${value}, and this version of Plumbrule reads study format ${String(error.params.allowedValue)}.`,
        `Write ${name}: ${String(error.params.allowedValue)}.`,
      );
    case 'enum':
      return notOneOf(name, value, error.data, (schema.enum ?? []).map(String), wrong);
    case 'minLength':
      return wrong('value_not_allowed', `${name} is empty.`, 'Write something, or remove the key.');
    case 'maxLength':
      return error.propertyName === undefined
        ? wrong(
            'value_not_allowed',
            `${name} is ${value}, but must be ${schema.maxLength === 1 ? 'one character' : `at most ${schema.maxLength} characters`}.`,
          )
        : null;
    case 'minProperties':
      return wrong('value_not_allowed', `${name} is empty.`, 'Write at least one key under it.');
    case 'minItems':
    case 'maxItems':
      return wrong(
        'limit_nonsense',
        `${name} has ${countOf(error.data)}, but must have ${itemWords(schema)}.`,
      );
    case 'minimum':
    case 'maximum':
    case 'exclusiveMinimum':
    case 'exclusiveMaximum':
      return wrong('limit_nonsense', `${name} is ${value}, but must be ${rangeWords(schema)}.`);
    case 'anyOf': {
      const expected = EXPECTED[unionKey(schema)] ?? 'of another form';
      const near = nearForm(error.data, expected);
      return wrong('value_not_allowed', `${name} is ${value}, but must be ${expected}.`, near);
    }
    default:
      // What follows from another fault: the pattern of a name is told under propertyNames.
      return error.propertyName === undefined
        ? wrong('value_not_allowed', `${name} is ${value}, which is not allowed here.`)
        : null;
  }
}

/** What each union of the schema takes, by the definitions among its branches. A test holds the list complete. */
export const EXPECTED: Readonly<Record<string, string>> = {
  scaled_response: "a variable's name or { variable: …, scale: … }",
  box_cox: 'natural, log, sqrt, reciprocal or { box_cox: … }',
  'clustered hac': 'classical, hc0, hc1, hc2, hc3, hc4, { clustered_by: … } or { hac_lags: … }',
  'single_hypothesis joint_hypothesis': '{ name: …, combination: …, equals: … } or { name: …, all_of: […] }',
  'candidate subset_family backward_family forward_family':
    '{ terms: […], name: … }, { subsets_of: […], name: … }, { eliminate_from: […], name: …, leave_at: … } or { add_from: […], name: …, enter_at: … }',
  'interaction polynomial power bend spline':
    "a variable's name or one of { interaction: […] }, { polynomial: …, degree: … }, { power: …, to: … }, { bend: …, at: … }, { spline: …, knots: […] }",
  'polynomial power bend spline':
    "a variable's name or one of { polynomial: …, degree: … }, { power: …, to: … }, { bend: …, at: … }, { spline: …, knots: […] }",
};

/** "interaction polynomial power bend spline" of the union of terms. */
export function unionKey(schema: { readonly anyOf?: readonly { readonly $ref?: string }[] }): string {
  const names = (schema.anyOf ?? []).flatMap(({ $ref }) => $ref?.split('/').at(-1) ?? []);
  return names.join(' ');
}

function nearForm(data: unknown, form: string): string | undefined {
  const names = [...form.matchAll(/\{ (\w+):/g)].map((found) => found[1]!);
  // Words that stand for themselves come first in such a form: "natural, log, sqrt, reciprocal or { … }".
  const plain = form.startsWith('a ') ? [] : (form.split(/ or |\{/)[0]!.match(/\w+/g) ?? []);
  const words = [...names, ...plain];
  const keys =
    typeof data === 'string' ? [data] : typeof data === 'object' && data !== null ? Object.keys(data) : [];
  // Before what it may be a slip of the pen for: log is two letters from something else.
  const called = keys.find((key) => functionNamed(key) !== null && !words.includes(key));
  if (called !== undefined && names.includes('spline'))
    return `What is worked out, such as ${called}(…), is given a name under derive, and that is the term.`;
  for (const key of keys) {
    const near = nearest(key, words);
    if (near !== null) return `Did you mean ${near}?`;
  }
  return undefined;
}

function unknownKey(
  key: string,
  path: Path,
  known: readonly string[],
  isEmpty: boolean,
  written: Written,
): SchemaFault {
  const at = [...path, key];
  const near = nearest(key, known);
  const otherwise = isEmpty ? COMMA_HINT : `Keys here are ${listed(known, 'and')}.`;
  const hint = near === null ? otherwise : `Did you mean ${near}?`;
  const place = written.keyPlaceOf(at);
  const message = `${showPath(at)} is not a key here.`;
  return { problem: { code: 'key_unknown', severity: 'error', place, message, hint }, unusable: at };
}

function notOneOf(
  name: string,
  value: string,
  data: unknown,
  allowed: readonly string[],
  wrong: (code: ProblemCode, message: string, hint?: string) => SchemaFault,
): SchemaFault {
  const near = typeof data === 'string' ? nearest(data, allowed) : null;
  const shownAllowed = allowed.map((word) => (/^[\w-]+$/.test(word) ? word : quote(word)));
  return wrong(
    'value_not_allowed',
    `${name} is ${value}, which is not one of ${listed(shownAllowed, 'and')}.`,
    near === null ? undefined : `Did you mean ${near}?`,
  );
}

function problem(code: ProblemCode, written: Written, path: Path, message: string, hint?: string): Problem {
  return {
    code,
    severity: 'error',
    place: written.placeOf(path),
    message,
    ...(hint === undefined ? {} : { hint }),
  };
}
