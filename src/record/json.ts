/**
 * JSON text of a value in the key order of its schema: the same value gives the same bytes, whatever
 * order its keys were put in. Lists of numbers and short texts stay on one line, so that a record can
 * be read and compared by lines.
 *
 * A number that is not finite has no JSON form. It is a fault of the program, never of a study, and
 * throws with its path.
 */
export function jsonText(value: unknown, schema: SchemaNode): string {
  return jsonPieces(value, schema).join('');
}

/**
 * The same text in pieces, one after the other. A string of some hundred thousand characters costs several times what its
 * pieces cost, since each is given memory of its own by the system: what is only to be written is better left in pieces.
 */
export function jsonPieces(value: unknown, schema: SchemaNode): string[] {
  const output: Output = { root: schema, pieces: [], parts: [], length: 0, path: [] };
  write(value, schema, output, '\n');
  put(output, '\n');
  endPiece(output);
  return output.pieces;
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
  readonly pieces: string[];
  /** Of the piece that is being made. */
  parts: string[];
  length: number;
  readonly path: (string | number)[];
}

/** Characters of a piece. */
const PIECE = 30_000;

function put(output: Output, text: string): void {
  output.parts.push(text);
  output.length += text.length;
  if (output.length >= PIECE) endPiece(output);
}

function endPiece(output: Output): void {
  output.pieces.push(output.parts.join(''));
  output.parts = [];
  output.length = 0;
}

/** Longest text that may share a line with others of its list. */
const SHORT = 40;

/** A list of more numbers than this is not read by people: it goes without spaces. */
const LONG = 50;

type Primitive = string | number | boolean | null;

function isPrimitive(value: unknown): value is Primitive {
  return (
    value === null || typeof value === 'number' || typeof value === 'string' || typeof value === 'boolean'
  );
}

/** Appends the value's text; `line` begins a further line of it. */
function write(value: unknown, schema: SchemaNode | undefined, output: Output, line: string) {
  if (isPrimitive(value)) {
    put(output, primitive(value, output));
  } else if (Array.isArray(value)) {
    writeList(value, structureOf(schema, output.root)?.items, output, line);
  } else if (typeof value === 'object' && value !== null) {
    writeObject(value as { [key: string]: unknown }, structureOf(schema, output.root), output, line);
  } else {
    throw new TypeError(`${output.path.join('.')} has no JSON form.`);
  }
}

function writeList(list: readonly unknown[], items: SchemaNode | undefined, output: Output, line: string) {
  if (list.every((item) => item === null || Number.isFinite(item))) {
    // Most of a record are long lists of numbers, which the language writes several times faster at once.
    const text = JSON.stringify(list);
    put(output, list.length > LONG ? text : text.replace(/,/g, ', '));
    return;
  }
  if (list.every((item) => isPrimitive(item) && (typeof item !== 'string' || item.length <= SHORT))) {
    put(output, `[${list.map((item) => primitive(item as Primitive, output)).join(', ')}]`);
    return;
  }
  const inner = `${line}  `;
  for (let k = 0; k < list.length; k++) {
    put(output, k === 0 ? `[${inner}` : `,${inner}`);
    output.path.push(k);
    write(list[k], items, output, inner);
    output.path.pop();
  }
  put(output, `${line}]`);
}

function writeObject(
  value: { readonly [key: string]: unknown },
  node: SchemaNode | undefined,
  output: Output,
  line: string,
) {
  const inner = `${line}  `;
  let before = '{';
  for (const key of orderedKeys(value, node)) {
    put(output, `${before}${inner}${JSON.stringify(key)}: `);
    before = ',';
    output.path.push(key);
    write(value[key], childOf(node, key), output, inner);
    output.path.pop();
  }
  put(output, before === '{' ? '{}' : `${line}}`);
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
  if (typeof value === 'number' && !Number.isFinite(value)) {
    throw new TypeError(`${output.path.join('.')} is ${value}, which has no JSON form.`);
  }
  return JSON.stringify(value);
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
