import type { ValueType } from '../expression/expression.ts';
import { nearest } from '../expression/nearest.ts';
import { type Path, quote, showPath } from './path.ts';
import { fault, type Reading } from './reading.ts';
import type { VariableType } from './study.ts';

/** A declared or derived variable, as far as it can be known. */
export interface Named {
  readonly name: string;
  readonly derived: boolean;
  /** null where it is not known because of a fault that is reported already. */
  readonly type: VariableType | null;
  /** Declared levels of a category. */
  readonly levels: readonly string[] | null;
}

export type Names = ReadonlyMap<string, Named>;

export const TYPE_WORDS: Readonly<Record<VariableType, string>> = {
  number: 'a number',
  integer: 'an integer',
  category: 'a category',
  flag: 'a flag',
  date: 'a date',
  text: 'a text',
  identifier: 'an identifier',
};

/** What a variable is to an expression. */
export function valueTypeOf(type: VariableType): ValueType {
  if (type === 'integer') return 'number';
  return type === 'identifier' ? 'text' : type;
}

/** The variable of that name; an unknown name is reported at `path`, with the nearest known one. */
export function lookUp(reading: Reading, names: Names, name: string, path: Path): Named | null {
  const named = names.get(name);
  if (named !== undefined) return named;
  const message = `${showPath(path)} names ${quote(name)}, which is neither a variable nor derived.`;
  fault(reading, 'name_unknown', path, message, didYouMean(name, names.keys()) ?? oneName(name));
  return null;
}

/** For what looks worked out from names. */
function oneName(text: string): string | undefined {
  return /[-+*/^~()=]/.test(text)
    ? 'One name stands here; what is worked out from variables is given a name under derive.'
    : undefined;
}

export function didYouMean(word: string, among: Iterable<string>): string | undefined {
  const near = nearest(word, among);
  return near === null ? undefined : `Did you mean ${near}?`;
}

/** Looks a name up and reports it where its type is not among those that suit the purpose. */
export function lookUpOfType(
  reading: Reading,
  names: Names,
  name: string,
  path: Path,
  suited: readonly VariableType[],
  purpose: string,
  hint?: string,
): Named | null {
  const named = lookUp(reading, names, name, path);
  if (named === null || named.type === null) return null;
  if (suited.includes(named.type)) return named;
  const message = `${showPath(path)} names ${name}, which is ${TYPE_WORDS[named.type]}; ${purpose}.`;
  fault(reading, 'type_unsuited', path, message, hint);
  return null;
}
