import fc from 'fast-check';

interface Schema {
  readonly $ref?: string;
  readonly $defs?: { readonly [name: string]: Schema };
  readonly type?: string | readonly string[];
  readonly const?: unknown;
  readonly enum?: readonly unknown[];
  readonly anyOf?: readonly Schema[];
  readonly properties?: { readonly [key: string]: Schema };
  readonly required?: readonly string[];
  readonly items?: Schema;
  readonly pattern?: string;
  readonly minimum?: number;
  readonly maximum?: number;
  readonly exclusiveMinimum?: number;
  readonly exclusiveMaximum?: number;
}

/** Values of every shape that a schema allows (as far as the record's schema goes). */
export function valuesOf(schema: Schema, root: Schema = schema): fc.Arbitrary<unknown> {
  if (schema.$ref !== undefined) {
    const target = root.$defs?.[schema.$ref.replace('#/$defs/', '')];
    if (target === undefined) throw new Error(`${schema.$ref} is not defined.`);
    return valuesOf(target, root);
  }
  if (schema.const !== undefined) return fc.constant(schema.const);
  if (schema.enum !== undefined) return fc.constantFrom(...schema.enum);
  if (schema.anyOf !== undefined) return fc.oneof(...schema.anyOf.map((part) => valuesOf(part, root)));
  const types = typeof schema.type === 'string' ? [schema.type] : (schema.type ?? []);
  return fc.oneof(...types.map((type) => valuesOfType(type, schema, root)));
}

function valuesOfType(type: string, schema: Schema, root: Schema): fc.Arbitrary<unknown> {
  switch (type) {
    case 'null':
      return fc.constant(null);
    case 'boolean':
      return fc.boolean();
    case 'string':
      return schema.pattern === undefined ? fc.string({ unit: 'grapheme' }) : fc.constant('0'.repeat(64));
    case 'integer':
      return fc.integer({ min: schema.minimum ?? -1_000_000 });
    case 'number':
      return fc.double({
        noNaN: true,
        noDefaultInfinity: true,
        min: schema.exclusiveMinimum === undefined ? (schema.minimum ?? -1e300) : 1e-9,
        max: schema.exclusiveMaximum === undefined ? (schema.maximum ?? 1e300) : 1 - 1e-9,
      });
    case 'array':
      return fc.array(valuesOf(schema.items ?? {}, root), { maxLength: 3 });
    case 'object': {
      const properties = Object.entries(schema.properties ?? {}).map(
        ([key, part]) => [key, valuesOf(part, root)] as const,
      );
      const required = schema.required ?? [];
      return fc.record(Object.fromEntries(properties), { requiredKeys: [...required] });
    }
    default:
      throw new Error(`No values for type ${type}.`);
  }
}
