import { definitionName, type JsonSchema, resolved } from './json-schema.ts';

interface Row {
  readonly path: string;
  readonly value: string;
  readonly fallback: string;
  readonly meaning: string;
}

/** Definitions that several keys share; each gets a section of its own instead of being repeated. */
const SHARED = [
  'candidate',
  'subset_family',
  'backward_family',
  'forward_family',
  'term',
  'member',
  'scale',
  'hypothesis',
  'limits',
];

/** Of these every form is shown with its keys. */
const SHOWN_BY_FORM = ['term', 'scale', 'hypothesis'];

/**
 * The reference of all keys of a schema, as Markdown for people: one section for each key at the top with a
 * table of everything beneath it, then one for each shared form.
 */
export function keyReference(
  schema: JsonSchema,
  page: { readonly title: string; readonly introduction: string },
): string {
  const parts = [`# ${page.title}`, page.introduction];
  const simple: Row[] = [];
  const sections: string[] = [];
  for (const [key, written] of Object.entries(schema.properties ?? {})) {
    const property = resolved(written, schema);
    const required = schema.required?.includes(key) ?? false;
    const rows = [...rowsBelow(property, schema, key)];
    if (rows.length === 0) simple.push(row(key, written, schema, required));
    else {
      const heading = `## ${key}${required ? ' (required)' : ''}`;
      sections.push(
        [heading, property.description ?? '', table(rows)].filter((part) => part !== '').join('\n\n'),
      );
    }
  }
  parts.push('## At the top', table(simple), ...sections);
  for (const name of SHARED) {
    const definition = schema.$defs?.[name];
    if (definition !== undefined) parts.push(sharedSection(name, definition, schema));
  }
  return `${parts.join('\n\n')}\n`;
}

function sharedSection(name: string, definition: JsonSchema, root: JsonSchema): string {
  const parts = [`## ${headingOf(name)}`, definition.description ?? ''];
  const rows: Row[] = [];
  for (const branch of definition.anyOf ?? [definition]) {
    const form = resolved(branch, root);
    const below = [...rowsBelow(form, root, '')];
    if (below.length === 0) continue;
    if (branch !== definition && !SHOWN_BY_FORM.includes(name)) continue;
    rows.push(...below.map((each, index) => (index === 0 ? withForm(each, form, definition) : each)));
  }
  if (rows.length > 0) parts.push(table(rows));
  else parts.push(`One of: ${(definition.anyOf ?? []).map((branch) => formOf(branch, root)).join(', ')}.`);
  return parts.join('\n\n');
}

/** "`{ bend, at, side }`" of an object, "text" of a text. */
function formOf(branch: JsonSchema, root: JsonSchema): string {
  const keys = Object.keys(resolved(branch, root).properties ?? {});
  return keys.length > 0 ? `\`{ ${keys.join(', ')} }\`` : valueWords(branch, root);
}

/** The first key of a form carries what the form means. */
function withForm(first: Row, form: JsonSchema, definition: JsonSchema): Row {
  if (form === definition) return first;
  return { ...first, meaning: `${form.description ?? ''} ${first.meaning}`.trim() };
}

function* rowsBelow(schema: JsonSchema, root: JsonSchema, path: string): Generator<Row> {
  for (const [key, written] of Object.entries(schema.properties ?? {})) {
    const here = path === '' ? key : `${path}.${key}`;
    yield* rowAndBelow(here, written, root, schema.required?.includes(key) ?? false);
  }
  const others = schema.additionalProperties;
  if (typeof others === 'object') yield* rowAndBelow(`${path}.NAME`, others, root, false);
  if (schema.items !== undefined && !isShared(schema.items) && !isPlain(resolved(schema.items, root))) {
    yield* rowsBelow(resolved(schema.items, root), root, `${path}[ ]`);
  }
  for (const branch of schema.anyOf ?? []) yield* rowsBelow(resolved(branch, root), root, path);
}

function* rowAndBelow(
  path: string,
  written: JsonSchema,
  root: JsonSchema,
  required: boolean,
): Generator<Row> {
  yield row(path, written, root, required);
  if (!isShared(written)) yield* rowsBelow(resolved(written, root), root, path);
}

function row(path: string, written: JsonSchema, root: JsonSchema, required: boolean): Row {
  const property = resolved(written, root);
  return {
    path,
    value: valueWords(written, root),
    fallback: required ? 'required' : property.default === undefined ? '' : code(property.default),
    meaning: [property.description ?? '', examplesOf(property)].filter((part) => part !== '').join(' '),
  };
}

function examplesOf(schema: JsonSchema): string {
  const shown = (schema.examples ?? []).filter(
    (example) => typeof example !== 'object' || Array.isArray(example),
  );
  return shown.length === 0 ? '' : `For example ${shown.map(code).join(' or ')}.`;
}

/** What a value may be, in words. */
function valueWords(written: JsonSchema, root: JsonSchema): string {
  if (isShared(written)) {
    const name = definitionName(written.$ref ?? '');
    return `[${headingOf(name).toLowerCase()}](#${headingOf(name).toLowerCase().replaceAll(' ', '-')})`;
  }
  const schema = resolved(written, root);
  if (schema.const !== undefined) return code(schema.const);
  if (schema.enum !== undefined) return schema.enum.map(code).join(', ');
  if (schema.anyOf !== undefined) return schema.anyOf.map((branch) => valueWords(branch, root)).join(' or ');
  const words = [schema.type ?? []].flat().map((type) => typeWord(type, schema, root));
  return words.join(' or ') + limitsOf(schema);
}

function typeWord(type: string, schema: JsonSchema, root: JsonSchema): string {
  switch (type) {
    case 'string':
      return 'text';
    case 'integer':
      return 'whole number';
    case 'boolean':
      return 'true or false';
    case 'null':
      return 'null';
    case 'object':
      return typeof schema.additionalProperties === 'object' && schema.properties === undefined
        ? 'keys by name'
        : 'keys';
    case 'array': {
      const item = schema.items === undefined ? 'anything' : valueWords(schema.items, root);
      return item === 'keys' ? 'list' : `list of ${item}`;
    }
    default:
      return type;
  }
}

function limitsOf(schema: JsonSchema): string {
  const limits: string[] = [];
  if (schema.exclusiveMinimum !== undefined) limits.push(`above ${schema.exclusiveMinimum}`);
  if (schema.minimum !== undefined) limits.push(`at least ${schema.minimum}`);
  if (schema.exclusiveMaximum !== undefined) limits.push(`below ${schema.exclusiveMaximum}`);
  if (schema.maximum !== undefined) limits.push(`at most ${schema.maximum}`);
  return limits.length === 0 ? '' : `, ${limits.join(', ')}`;
}

function isShared(schema: JsonSchema): boolean {
  return schema.$ref !== undefined && SHARED.includes(definitionName(schema.$ref));
}

function isPlain(schema: JsonSchema): boolean {
  return schema.properties === undefined && schema.additionalProperties === undefined;
}

function headingOf(name: string): string {
  return (
    {
      candidate: 'Named candidates',
      subset_family: 'Families of subsets',
      backward_family: 'Families by backward elimination',
      forward_family: 'Families by forward selection',
      term: 'Terms',
      member: 'Members of an interaction',
      scale: 'Scales',
      hypothesis: 'Hypotheses',
      limits: 'Limits',
    }[name] ?? name
  );
}

function code(value: unknown): string {
  return `\`${typeof value === 'string' && /^\S+$/.test(value) && value.length > 1 ? value : JSON.stringify(value)}\``;
}

function table(rows: readonly Row[]): string {
  const cell = (text: string) => text.replaceAll('|', '\\|').replaceAll('\n', ' ');
  const lines = rows.map(
    (each) => `| \`${each.path}\` | ${cell(each.value)} | ${cell(each.fallback)} | ${cell(each.meaning)} |`,
  );
  return ['| key | value | default | meaning |', '|---|---|---|---|', ...lines].join('\n');
}
