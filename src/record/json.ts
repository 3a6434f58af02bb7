/**
 * JSON text of a value in the key order of its schema: the same value gives the same bytes, whatever
 * order its keys were put in. Lists of numbers and short texts stay on one line, so that a record can
 * be read and compared by lines.
 *
 * A number that is not finite has no JSON form. It is a fault of the program, never of a study, and
 * throws with its path.
 */
export function jsonText(value: unknown, schema: SchemaNode): string {
  const output: Output = { root: schema, parts: [], path: [] };
  write(value, schema, output, '\n');
  output.parts.push('\n');
  return output.parts.join('');
}

/** As much of a JSON Schema as the order of keys needs. */
export interface SchemaNode {
  readonly $ref?: string;
  readonly $defs?: { readonly [name: string]: SchemaNode };
  readonly properties?: { readonly [key: string]: SchemaNode };
  readonly items?: SchemaNode;
  readonly anyOf?: readonly SchemaNode[];
}

interface Output {
  readonly root: SchemaNode;
  readonly parts: string[];
  readonly path: (string | number)[];
}

/** Longest text that may share a line with others of its list. */
const SHORT = 40;

type Primitive = string | number | boolean | null;

function isPrimitive(value: unknown): value is Primitive {
  return (
    value === null || typeof value === 'number' || typeof value === 'string' || typeof value === 'boolean'
  );
}

/** Appends the value's text; `line` begins a further line of it. */
function write(value: unknown, schema: SchemaNode | undefined, output: Output, line: string) {
  if (isPrimitive(value)) {
    output.parts.push(primitive(value, output));
  } else if (Array.isArray(value)) {
    writeList(value, structureOf(schema, output.root)?.items, output, line);
  } else if (typeof value === 'object' && value !== null) {
    writeObject(value as { [key: string]: unknown }, structureOf(schema, output.root), output, line);
  } else {
    throw new TypeError(`${output.path.join('.')} has no JSON form.`);
  }
}

function writeList(list: readonly unknown[], items: SchemaNode | undefined, output: Output, line: string) {
  const { parts } = output;
  if (list.every((item) => isPrimitive(item) && (typeof item !== 'string' || item.length <= SHORT))) {
    for (let k = 0; k < list.length; k++)
      parts.push(k === 0 ? '[' : ', ', primitive(list[k] as Primitive, output));
    parts.push(list.length === 0 ? '[]' : ']');
    return;
  }
  const inner = `${line}  `;
  for (let k = 0; k < list.length; k++) {
    parts.push(k === 0 ? '[' : ',', inner);
    output.path.push(k);
    write(list[k], items, output, inner);
    output.path.pop();
  }
  parts.push(line, ']');
}

function writeObject(
  value: { readonly [key: string]: unknown },
  node: SchemaNode | undefined,
  output: Output,
  line: string,
) {
  const { parts } = output;
  const inner = `${line}  `;
  let first = true;
  for (const key of orderedKeys(value, node)) {
    parts.push(first ? '{' : ',', inner, JSON.stringify(key), ': ');
    first = false;
    output.path.push(key);
    write(value[key], childOf(node, key), output, inner);
    output.path.pop();
  }
  if (first) parts.push('{}');
  else parts.push(line, '}');
}

function childOf(node: SchemaNode | undefined, key: string): SchemaNode | undefined {
  const { properties } = node ?? {};
  return properties !== undefined && Object.hasOwn(properties, key) ? properties[key] : undefined;
}

/** Keys that the schema knows, in its order; then the rest in code-point order. Absent (undefined) keys are left out. */
function orderedKeys(value: { readonly [key: string]: unknown }, node: SchemaNode | undefined): string[] {
  const properties = node?.properties ?? {};
  const keys = Object.keys(properties).filter((key) => Object.hasOwn(value, key) && value[key] !== undefined);
  const rest = Object.keys(value).filter(
    (key) => value[key] !== undefined && !Object.hasOwn(properties, key),
  );
  return rest.length === 0 ? keys : [...keys, ...rest.sort()];
}

function primitive(value: Primitive, output: Output): string {
  if (typeof value !== 'number') return JSON.stringify(value);
  if (!Number.isFinite(value)) {
    throw new TypeError(`${output.path.join('.')} is ${value}, which has no JSON form.`);
  }
  // The same digits as JSON.stringify, which writes −0 as 0 too.
  return String(value);
}

/** Follows `$ref` into `$defs`, and `anyOf` to the alternative that has a structure. */
function structureOf(schema: SchemaNode | undefined, root: SchemaNode): SchemaNode | undefined {
  if (schema?.$ref !== undefined) return structureOf(root.$defs?.[schema.$ref.replace('#/$defs/', '')], root);
  if (schema?.anyOf !== undefined) {
    const alternatives = schema.anyOf.map((alternative) => structureOf(alternative, root));
    return alternatives.find((node) => node?.properties !== undefined || node?.items !== undefined);
  }
  return schema;
}
