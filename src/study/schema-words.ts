import type { ErrorObject } from 'ajv';
import { listed, type Path, quote } from './path.ts';
import type { Written } from './written.ts';

/** The part of the schema that a value broke. */
export interface BrokenSchema {
  readonly properties?: Readonly<Record<string, { readonly type?: unknown }>>;
  readonly type?: string | readonly string[];
  readonly enum?: readonly unknown[];
  readonly minimum?: number;
  readonly maximum?: number;
  readonly exclusiveMinimum?: number;
  readonly exclusiveMaximum?: number;
  readonly minItems?: number;
  readonly maxItems?: number;
  readonly maxLength?: number;
  readonly anyOf?: readonly { readonly $ref?: string }[];
}

/** A comma inside braces ends a text, and what follows reads as a key without a value. */
export const COMMA_HINT = 'A text with a comma inside braces stands in quotes.';

/** A value as a message shows it. */
export function shown(path: Path, data: unknown, written: Written): string {
  if (data === null || data === undefined) return 'empty';
  if (typeof data === 'string') return quote(data);
  if (Array.isArray(data)) return 'a list';
  if (typeof data === 'object') {
    const keys = Object.keys(data);
    return keys.length === 0
      ? 'an empty mapping'
      : `a mapping with the ${keys.length === 1 ? 'key' : 'keys'} ${listed(keys.slice(0, 4).map(plainKey), 'and')}`;
  }
  return written.textAt(path) ?? String(data);
}

function plainKey(key: string): string {
  return /^\w+$/.test(key) ? key : quote(key);
}

const TYPE_WORDS: Readonly<Record<string, string>> = {
  string: 'a text',
  number: 'a number',
  integer: 'a whole number',
  boolean: 'true or false',
  array: 'a list',
  object: 'a mapping of keys',
  null: 'empty',
};

export function typeWords(schema: BrokenSchema): string {
  const types = [schema.type ?? []].flat();
  return listed(
    types.filter((type) => type !== 'null').map((type) => TYPE_WORDS[type] ?? type),
    'or',
  );
}

export function typeHint(error: ErrorObject, path: Path, written: Written): string | undefined {
  const types = [(error.parentSchema as BrokenSchema).type ?? []].flat();
  const data = error.data as unknown;
  const text = written.textAt(path) ?? '';
  const key = path.at(-1);
  if (data === null) {
    if (path[0] === 'predict' && path[1] === 'rows') return COMMA_HINT;
    return typeof key === 'string'
      ? 'Write something under it, or remove the key.'
      : 'Write something, or remove the "-".';
  }
  if (types.includes('string') && (typeof data === 'number' || typeof data === 'boolean'))
    return `Put it in quotes: "${text}".`;
  if (types.includes('number') || types.includes('integer')) {
    if (/^-?\d+,\d+$/.test(text)) return `Write ${text.replace(',', '.')}.`;
    if (typeof data === 'string' && /^-?[\d.]+$/.test(data)) return 'Write the number without quotes.';
  }
  if (types.includes('boolean') && /^(yes|no|on|off)$/i.test(text)) return 'Write true or false.';
  const limits = ['at_least', 'at_most'].filter((limit) =>
    Object.hasOwn((error.parentSchema as BrokenSchema).properties ?? {}, limit),
  );
  if (limits.length > 0 && typeof data === 'number')
    return `Write ${listed(
      limits.map((limit) => `{ ${limit}: ${text} }`),
      'or',
    )}.`;
  if (types.includes('array') && typeof data === 'string')
    return 'Put it in brackets, also where it is only one: [ … ].';
  return undefined;
}

export function rangeWords(schema: BrokenSchema): string {
  const words: string[] = [];
  if (schema.exclusiveMinimum !== undefined) words.push(`above ${schema.exclusiveMinimum}`);
  if (schema.minimum !== undefined) words.push(`at least ${schema.minimum}`);
  if (schema.exclusiveMaximum !== undefined) words.push(`below ${schema.exclusiveMaximum}`);
  if (schema.maximum !== undefined) words.push(`at most ${schema.maximum}`);
  return listed(words, 'and');
}

export function itemWords({ minItems, maxItems }: BrokenSchema): string {
  if (minItems !== undefined && minItems === maxItems) return `exactly ${minItems}`;
  const words: string[] = [];
  if (minItems !== undefined) words.push(`at least ${minItems}`);
  if (maxItems !== undefined) words.push(`at most ${maxItems}`);
  return listed(words, 'and');
}

export function countOf(data: unknown): string {
  const count = Array.isArray(data) ? data.length : 0;
  return count === 0 ? 'no items' : count === 1 ? '1 item' : `${count} items`;
}
