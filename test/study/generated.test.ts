import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { generate } from '../../schemas/generate.ts';
import type { JsonSchema } from '../../schemas/json-schema.ts';
import { EXPECTED, unionKey } from '../../src/study/schema-faults.ts';

const schema = JSON.parse(
  readFileSync(new URL('../../schemas/study.schema.json', import.meta.url), 'utf8'),
) as JsonSchema;

/** Every schema inside a schema, with the words that lead to it. */
function* inside(value: unknown, path: string): Generator<readonly [string, JsonSchema]> {
  if (typeof value !== 'object' || value === null) return;
  yield [path, value as JsonSchema];
  for (const [key, inner] of Object.entries(value)) {
    if (key !== 'examples' && key !== 'default') yield* inside(inner, `${path}/${key}`);
  }
}

describe('the schema of the study file', () => {
  it('describes every key', () => {
    const silent: string[] = [];
    for (const [path, each] of inside(schema, '')) {
      for (const [key, property] of Object.entries(each.properties ?? {})) {
        if (typeof property.description !== 'string') silent.push(`${path}/${key}`);
      }
    }
    expect(silent).toEqual([]);
  });

  it('allows no other keys in a mapping of fixed keys', () => {
    const open = [...inside(schema, '')].filter(
      ([path, each]) =>
        each.type === 'object' && each.additionalProperties === undefined && !path.endsWith('/properties'),
    );
    expect(open.map(([path]) => path)).toEqual([]);
  });

  it('has a sentence for every union', () => {
    const unions = [...inside(schema, '')].filter(([, each]) => Array.isArray(each.anyOf));
    expect(unions.length).toBeGreaterThan(0);
    for (const [, union] of unions) {
      expect(Object.keys(EXPECTED)).toContain(unionKey(union as Parameters<typeof unionKey>[0]));
    }
  });
});

describe('what is generated from the schemas', () => {
  it('is fresh', async () => {
    expect(await generate(true)).toBe(0);
  });
});
