import { type JsonSchema, resolved } from './json-schema.ts';

/**
 * TypeScript source of a module that exports `name`: the default of every key with a fixed path, by its
 * dotted path and in schema order. Keys below a name of the writer's choice or in a list are not among them.
 */
export function defaultsCode(schema: JsonSchema, name: string): string {
  const lines = [...defaults(schema, schema, [])].map(
    ([path, value]) => `  '${path}': ${JSON.stringify(value)},`,
  );
  return `\nexport const ${name} = {\n${lines.join('\n')}\n} as const;\n`;
}

function* defaults(
  schema: JsonSchema,
  root: JsonSchema,
  path: readonly string[],
): Generator<readonly [string, unknown]> {
  for (const [key, written] of Object.entries(schema.properties ?? {})) {
    const property = resolved(written, root);
    const here = [...path, key];
    if (property.default !== undefined) yield [here.join('.'), property.default];
    yield* defaults(property, root, here);
    for (const branch of property.anyOf ?? []) yield* defaults(resolved(branch, root), root, here);
  }
}
