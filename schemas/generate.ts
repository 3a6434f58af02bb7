/**
 * Makes everything that follows from the schemas, so that nothing can drift from them:
 *
 *     npx tsx schemas/generate.ts            writes the files
 *     npx tsx schemas/generate.ts --check    exits 1 and names those that are not fresh
 *
 * A schema is added by one more entry in `SCHEMAS`.
 */
import { readFileSync, writeFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { compile } from 'json-schema-to-typescript';
import { checkCode } from './check-code.ts';
import { defaultsCode } from './defaults-code.ts';
import type { JsonSchema } from './json-schema.ts';
import { keyReference } from './key-reference.ts';

interface SchemaOutputs {
  /** The schema, relative to the project's root, as all other files here. */
  readonly schema: string;
  /** TypeScript types of a value as written. */
  readonly types?: string;
  /** A check compiled ahead of time, which spares every run the compiler; see `checkCode`. */
  readonly check?: { readonly file: string; readonly name: string; readonly verbose: boolean };
  /** The defaults of all keys with a fixed path, as a constant. */
  readonly defaults?: { readonly file: string; readonly name: string };
  /** The reference of all keys, for people. */
  readonly keys?: { readonly file: string; readonly title: string; readonly introduction: string };
}

const SCHEMAS: readonly SchemaOutputs[] = [
  {
    schema: 'schemas/study.schema.json',
    types: 'src/study/study-file.generated.ts',
    check: { file: 'src/study/check-study-file.generated.ts', name: 'checkStudyFile', verbose: true },
    defaults: { file: 'src/study/study-defaults.generated.ts', name: 'STUDY_DEFAULTS' },
    keys: {
      file: 'schemas/study-keys.md',
      title: 'Keys of the study file',
      introduction:
        'Every key that a study file may have. NAME stands for a name of your choice and [ ] for each item of a list. A key without a default may be left out unless it is marked required.',
    },
  },
  {
    schema: 'schemas/record.schema.json',
    types: 'src/record/study-record.generated.ts',
    check: { file: 'src/record/check-study-record.generated.ts', name: 'checkStudyRecord', verbose: false },
  },
  { schema: 'schemas/comparison.schema.json', types: 'src/compare/comparison-file.generated.ts' },
];

const ROOT = new URL('../', import.meta.url);

/** The generated files of one schema: path relative to the root → text. */
async function outputs(entry: SchemaOutputs): Promise<Map<string, string>> {
  const text = readFileSync(new URL(entry.schema, ROOT), 'utf8');
  const schema = JSON.parse(text) as JsonSchema;
  const banner = `// Generated from ${entry.schema} by schemas/generate.ts. Change the schema, then: npx tsx schemas/generate.ts\n`;
  const made = new Map<string, string>();
  if (entry.types !== undefined) made.set(entry.types, await typesCode(text, schema.title ?? 'File', banner));
  if (entry.check !== undefined) {
    const { file, name, verbose } = entry.check;
    made.set(file, banner + checkCode(schema, name, verbose));
  }
  if (entry.defaults !== undefined) {
    made.set(entry.defaults.file, banner + defaultsCode(schema, entry.defaults.name));
  }
  if (entry.keys !== undefined) {
    made.set(
      entry.keys.file,
      `<!-- Generated from ${entry.schema} by schemas/generate.ts. -->\n\n${keyReference(schema, entry.keys)}`,
    );
  }
  return made;
}

async function typesCode(schemaText: string, title: string, banner: string): Promise<string> {
  // A description beside a $ref would make one more type of each use; the type's own description is enough.
  const schema = JSON.parse(schemaText, (_, value) =>
    typeof value?.$ref === 'string' ? { $ref: value.$ref } : value,
  );
  return compile(schema, title, {
    bannerComment: banner.trimEnd(),
    additionalProperties: false,
    // An array of minItems n becomes a plain array: the schema check has counted the items already.
    ignoreMinAndMaxItems: true,
    style: { singleQuote: true, printWidth: 110 },
  });
}

function current(path: string): string | null {
  try {
    return readFileSync(new URL(path, ROOT), 'utf8');
  } catch {
    return null;
  }
}

/** Runs the generator; gives the exit status. */
export async function generate(check: boolean): Promise<number> {
  const stale: string[] = [];
  for (const entry of SCHEMAS) {
    for (const [path, text] of await outputs(entry)) {
      if (current(path) === text) continue;
      stale.push(path);
      if (!check) writeFileSync(new URL(path, ROOT), text);
    }
  }
  if (stale.length === 0) process.stdout.write('Generated files are fresh.\n');
  else if (!check) process.stdout.write(`Written: ${stale.join(', ')}\n`);
  else process.stderr.write(`Not fresh, run npx tsx schemas/generate.ts: ${stale.join(', ')}\n`);
  return check && stale.length > 0 ? 1 : 0;
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  process.exitCode = await generate(process.argv.includes('--check'));
}
