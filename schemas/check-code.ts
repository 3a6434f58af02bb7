import { Ajv2020 } from 'ajv/dist/2020.js';
import standaloneModule from 'ajv/dist/standalone/index.js';
import type { JsonSchema } from './json-schema.ts';

// The package is CommonJS: at run time the function is one `default` further down than its types say.
const standalone = standaloneModule as unknown as typeof standaloneModule.default;

/**
 * TypeScript source of a module that exports `name`, a check of a value against the schema that needs no
 * schema compiler at run time. `name(value)` is true where the value is valid, else `name.errors` lists
 * every fault in the compiler's own form; where `verbose`, with the value and the part of the schema it broke.
 */
export function checkCode(schema: JsonSchema, name: string, verbose: boolean): string {
  const ajv = new Ajv2020({
    strict: true,
    allowUnionTypes: true,
    allErrors: true,
    verbose,
    code: { source: true, esm: true },
  });
  const check = ajv.compile(withoutNotes(schema) as JsonSchema);
  const code = standalone(ajv, check)
    .replace('"use strict";', '')
    .replace(/export default \w+;/, '')
    .replace(/export const validate =/, 'const validate =')
    .replaceAll(
      /const (\w+) = require\("(ajv\/dist\/runtime\/\w+)"\)\.default;?/g,
      // Loaders differ in how much of a CommonJS module they unwrap.
      'import $1Module from "$2.js";\nconst $1 = typeof $1Module === "function" ? $1Module : $1Module.default;\n',
    );
  if (code.includes('require(')) throw new Error('The compiled check still requires a module.');
  return [
    '// @ts-nocheck: written by the schema compiler, checked by its tests.',
    "import type { ErrorObject } from 'ajv';",
    code.trim(),
    `export const ${name}: ((value: unknown) => boolean) & { errors?: ErrorObject[] | null } = validate;`,
    '',
  ].join('\n');
}

/** The schema without what is only for readers; the compiled module carries the rest with it. */
function withoutNotes(schema: JsonSchema): unknown {
  const notes = new Set(['title', 'description', 'default', 'examples']);
  return JSON.parse(JSON.stringify(schema), function (this: object, key: string, value: unknown) {
    // A note is text or an example beside a type; a property that happens to be named "title" is a schema.
    const isNote = notes.has(key) && !(key !== 'examples' && typeof value === 'object' && value !== null);
    return isNote ? undefined : value;
  });
}
