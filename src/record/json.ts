/**
 * JSON text of a value in the key order of its schema: the same value gives the same bytes, whatever
 * order its keys were put in. Lists of numbers and short texts stay on one line, so that a record can
 * be read and compared by lines.
 *
 * A number that is not finite has no JSON form. It is a fault of the program, never of a study, and
 * throws with its path.
 */
export function jsonText(value: unknown, schema: SchemaNode): string {
  const lines: string[] = [];
  write(value, schema, { root: schema, lines, path: [] }, '', '');
  return `${lines.join('\n')}\n`;
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
  readonly lines: string[];
  readonly path: (string | number)[];
}

/** Longest text that may share a line with others of its list. */
const SHORT = 40;

type Primitive = string | number | boolean | null;

function isPrimitive(value: unknown): value is Primitive {
  return value === null || ['string', 'number', 'boolean'].includes(typeof value);
}

/** Appends lines: `lead` goes before the value's first line, `indent` before its further ones. */
function write(value: unknown, schema: SchemaNode | undefined, output: Output, lead: string, indent: string) {
  const node = resolve(schema, output.root);
  if (isPrimitive(value)) {
    output.lines.push(lead + primitive(value, output));
  } else if (Array.isArray(value)) {
    writeList(value, node?.items, output, lead, indent);
  } else if (typeof value === 'object' && value !== null) {
    writeObject(value as { [key: string]: unknown }, node, output, lead, indent);
  } else {
    throw new TypeError(`${output.path.join('.')} has no JSON form.`);
  }
}

function writeList(
  list: readonly unknown[],
  items: SchemaNode | undefined,
  output: Output,
  lead: string,
  indent: string,
) {
  if (list.every((item) => isPrimitive(item) && (typeof item !== 'string' || item.length <= SHORT))) {
    const parts = (list as readonly Primitive[]).map((item) => primitive(item, output));
    output.lines.push(`${lead}[${parts.join(', ')}]`);
    return;
  }
  output.lines.push(`${lead}[`);
  const inner = `${indent}  `;
  list.forEach((item, index) => {
    output.path.push(index);
    write(item, items, output, inner, inner);
    output.path.pop();
    if (index < list.length - 1) endWithComma(output.lines);
  });
  output.lines.push(`${indent}]`);
}

function writeObject(
  value: { readonly [key: string]: unknown },
  node: SchemaNode | undefined,
  output: Output,
  lead: string,
  indent: string,
) {
  const keys = orderedKeys(value, node);
  if (keys.length === 0) {
    output.lines.push(`${lead}{}`);
    return;
  }
  output.lines.push(`${lead}{`);
  const inner = `${indent}  `;
  keys.forEach((key, index) => {
    output.path.push(key);
    const child = node?.properties !== undefined && Object.hasOwn(node.properties, key);
    write(
      value[key],
      child ? node.properties?.[key] : undefined,
      output,
      `${inner}${JSON.stringify(key)}: `,
      inner,
    );
    output.path.pop();
    if (index < keys.length - 1) endWithComma(output.lines);
  });
  output.lines.push(`${indent}}`);
}

/** Keys that the schema knows, in its order; then the rest in code-point order. Absent (undefined) keys are left out. */
function orderedKeys(value: { readonly [key: string]: unknown }, node: SchemaNode | undefined): string[] {
  const known = Object.keys(node?.properties ?? {});
  const present = Object.keys(value).filter((key) => value[key] !== undefined);
  const rest = present.filter((key) => !known.includes(key)).sort();
  return [...known.filter((key) => Object.hasOwn(value, key) && value[key] !== undefined), ...rest];
}

function endWithComma(lines: string[]) {
  lines[lines.length - 1] += ',';
}

function primitive(value: Primitive, output: Output): string {
  if (typeof value === 'number' && !Number.isFinite(value)) {
    throw new TypeError(`${output.path.join('.')} is ${value}, which has no JSON form.`);
  }
  return JSON.stringify(value);
}

/** Follows `$ref` into `$defs`, and `anyOf` to the alternative that has a structure. */
function resolve(schema: SchemaNode | undefined, root: SchemaNode): SchemaNode | undefined {
  if (schema?.$ref !== undefined) return resolve(root.$defs?.[schema.$ref.replace('#/$defs/', '')], root);
  if (schema?.anyOf !== undefined) {
    const alternatives = schema.anyOf.map((alternative) => resolve(alternative, root));
    return alternatives.find((node) => node?.properties !== undefined || node?.items !== undefined);
  }
  return schema;
}
