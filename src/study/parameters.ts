// biome-ignore-all lint/suspicious/noTemplateCurlyInString: a study uses its parameters in this form.
import type { Report, SourcePlace } from '../problem.ts';
import { didYouMean } from './names.ts';
import { listed, type Path, quote, showPath } from './path.ts';
import type { ParameterPlan } from './study.ts';
import type { Written } from './written.ts';

/** Values for parameters as the command line gives them: name → text. */
export type GivenParameters = ReadonlyMap<string, string>;

export interface Parametrised {
  /** The study with every `${name}` replaced, places still being those of the text. */
  readonly written: Written;
  /** In order of declaration. */
  readonly parameters: readonly ParameterPlan[];
}

/** `${name}`, or `$${…}`, which stands for `${…}` itself. */
const USE = /\$(\$?)\{([^}]*)\}/g;

/** A parameter in force: its value and how that is spelt. */
interface InForce extends ParameterPlan {
  readonly text: string;
}

/**
 * Puts the parameters' values where the study uses them. A text that is one use and nothing else takes the value with
 * its type, so that a number stays a number; within other text a value stands as it is spelt. What `parameters` holds
 * is taken as it is. Undeclared names, in the study or among the given, are reported with the nearest declared one.
 */
export function putParameters(written: Written, given: GivenParameters, report: Report): Parametrised {
  const top = written.value;
  const declared = isMapping(top) && Object.hasOwn(top, 'parameters') ? top.parameters : undefined;
  const sound = declared === undefined || declared === null || isMapping(declared);
  const parameters = new Map<string, InForce>();
  const names = written.keysAt(['parameters']);
  if (isMapping(declared)) {
    for (const name of names) {
      const value = declared[name];
      if (isScalar(value)) parameters.set(name, inForce(written, name, value, given.get(name), report));
    }
  }
  if (sound) reportUndeclared(given, names, report);

  const put: Put = { written, parameters, names, sound, report, used: new Set(), changes: new Map() };
  const value = isMapping(top) ? putInMapping(put, top, []) : top;
  for (const name of names) {
    if (put.used.has(name)) continue;
    const path = ['parameters', name];
    report({
      code: 'name_unused',
      severity: 'warning',
      place: written.keyPlaceOf(path),
      message: `${showPath(path)} is declared, but nothing uses it.`,
      hint: `Write \${${name}} where its value is to stand, or remove it.`,
    });
  }
  return {
    written: put.changes.size === 0 ? written : { ...written, value, ...lookUps(written, put.changes) },
    parameters: [...parameters.values()].map(({ text: _, ...plan }) => plan),
  };
}

function inForce(
  written: Written,
  name: string,
  fallback: Scalar,
  text: string | undefined,
  report: Report,
): InForce {
  const asDeclared = {
    name,
    default: fallback,
    value: fallback,
    given: false,
    text: written.textAt(['parameters', name]) ?? String(fallback),
  };
  if (text === undefined) return asDeclared;
  const value = valueLike(fallback, text);
  if (value !== null) return { ...asDeclared, value, given: true, text };
  const kind = typeof fallback === 'number' ? 'a number' : 'true or false';
  report({
    code: 'parameter_value',
    severity: 'error',
    place: { kind: 'command' },
    message: `The parameter ${name} is ${kind} (its default is ${String(fallback)}), and ${quote(text)} is not.`,
    ...(typeof fallback === 'number' && /^-?\d+,\d+$/.test(text)
      ? { hint: `Write ${name}=${text.replace(',', '.')}.` }
      : {}),
  });
  return asDeclared;
}

/** The text as a value of the default's type; null where it is none. */
function valueLike(fallback: Scalar, text: string): Scalar | null {
  if (typeof fallback === 'string') return text;
  if (typeof fallback === 'boolean') return text === 'true' ? true : text === 'false' ? false : null;
  const value = /^[-+]?(?:\d+\.?\d*|\.\d+)(?:[eE][-+]?\d+)?$/.test(text) ? Number(text) : Number.NaN;
  return Number.isFinite(value) ? value : null;
}

function reportUndeclared(given: GivenParameters, names: readonly string[], report: Report): void {
  for (const name of given.keys()) {
    if (names.includes(name)) continue;
    const hint =
      didYouMean(name, names) ??
      (names.length === 0
        ? 'The study declares no parameters.'
        : `Its parameters are ${listed(names, 'and')}.`);
    report({
      code: 'parameter_unknown',
      severity: 'error',
      place: { kind: 'command' },
      message: `${quote(name)} is not a parameter of the study.`,
      hint,
    });
  }
}

interface Put {
  readonly written: Written;
  readonly parameters: ReadonlyMap<string, InForce>;
  readonly names: readonly string[];
  /** Whether `parameters` can be read at all; what is wrong with it is told by the schema check. */
  readonly sound: boolean;
  readonly report: Report;
  readonly used: Set<string>;
  /** By path as JSON. */
  readonly changes: Map<string, Change>;
}

/** A scalar that was changed: its text now, and where each stretch of it comes from. */
interface Change {
  readonly text: string;
  readonly stretches: readonly Stretch[];
}

/** `start` … `end` of the new text come from `from` … `to` of the scalar as it is read from the file. */
interface Stretch {
  readonly start: number;
  readonly end: number;
  readonly from: number;
  readonly to: number;
  /** Written as it stands there, so that characters correspond one by one. */
  readonly literal: boolean;
}

function putInto(put: Put, value: unknown, path: Path): unknown {
  if (typeof value === 'string') return value.includes('${') ? putInText(put, value, path) : value;
  if (Array.isArray(value)) return value.map((item, index) => putInto(put, item, [...path, index]));
  return isMapping(value) ? putInMapping(put, value, path) : value;
}

function putInMapping(put: Put, mapping: Record<string, unknown>, path: Path): Record<string, unknown> {
  const copy: Record<string, unknown> = Object.create(null);
  for (const [key, inner] of Object.entries(mapping)) {
    const at = [...path, key];
    const name = [...key.matchAll(USE)].find((use) => use[1] === '' && put.names.includes(use[2]!.trim()));
    if (name !== undefined) {
      put.used.add(name[2]!.trim());
      put.report({
        code: 'value_not_allowed',
        severity: 'error',
        place: put.written.keyPlaceOf(at),
        message: `The key ${quote(key)} has a parameter in it; a parameter can stand in a value only.`,
      });
    }
    copy[key] = path.length === 0 && key === 'parameters' ? inner : putInto(put, inner, at);
  }
  return copy;
}

function putInText(put: Put, text: string, path: Path): unknown {
  const stretches: Stretch[] = [];
  let out = '';
  let at = 0;
  let whole: InForce | null = null;
  const append = (piece: string, from: number, to: number, literal: boolean) => {
    stretches.push({ start: out.length, end: out.length + piece.length, from, to, literal });
    out += piece;
  };
  for (const use of text.matchAll(USE)) {
    const [from, to] = [use.index, use.index + use[0].length];
    append(text.slice(at, from), at, from, true);
    at = to;
    if (use[1] === '$') {
      append(use[0].slice(1), from + 1, to, true);
      continue;
    }
    const name = use[2]!.trim();
    const parameter = put.parameters.get(name);
    put.used.add(name);
    if (parameter === undefined) reportUnknown(put, name, path, from, to);
    else if (from === 0 && to === text.length) whole = parameter;
    append(parameter?.text ?? use[0], from, to, false);
  }
  append(text.slice(at), at, text.length, true);
  put.changes.set(JSON.stringify(path), { text: out, stretches });
  return whole === null ? out : whole.value;
}

function reportUnknown(put: Put, name: string, path: Path, start: number, end: number): void {
  if (!put.sound || put.names.includes(name)) return;
  const near = didYouMean(name, put.names);
  put.report({
    code: 'parameter_unknown',
    severity: 'error',
    place: put.written.placeWithin(path, start, end),
    message: `${showPath(path)} uses the parameter ${quote(name)}, which is not declared under parameters.`,
    hint: near ?? 'A text that is to hold ${ itself has $${ there.',
  });
}

function lookUps(
  written: Written,
  changes: ReadonlyMap<string, Change>,
): Pick<Written, 'textAt' | 'placeWithin'> {
  const changeAt = (path: Path) => changes.get(JSON.stringify(path));
  return {
    textAt: (path) => changeAt(path)?.text ?? written.textAt(path),
    placeWithin: (path, start, end): SourcePlace => {
      const change = changeAt(path);
      if (change === undefined) return written.placeWithin(path, start, end);
      return written.placeWithin(path, origin(change, start, 'from'), origin(change, end, 'to'));
    },
  };
}

/** Where a character of the new text comes from; inside a parameter's value, the use as a whole. */
function origin({ stretches }: Change, offset: number, side: 'from' | 'to'): number {
  const found = stretches.find(({ start, end }) =>
    side === 'from' ? offset >= start && offset < end : offset > start && offset <= end,
  );
  if (found === undefined) return offset === 0 ? 0 : (stretches.at(-1)?.to ?? offset);
  return found.literal ? found.from + (offset - found.start) : found[side];
}

type Scalar = string | number | boolean;

function isScalar(value: unknown): value is Scalar {
  return typeof value === 'string' || typeof value === 'number' || typeof value === 'boolean';
}

function isMapping(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}
