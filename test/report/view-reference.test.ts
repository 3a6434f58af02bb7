import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { buildView } from '../../src/report/view/build-view.ts';
import { partsOf, type ViewKey, viewReference } from '../../templates/view-reference.ts';
import { declaredRecord, EXAMINED, SEARCHED, TANGLED, TESTED } from './declared-record.ts';
import { sampleRecord } from './sample-record.ts';

const read = (file: string): string => readFileSync(new URL(`../../${file}`, import.meta.url), 'utf8');

describe('the reference of the view object', () => {
  const reference = viewReference();
  it('is fresh', () => {
    expect(read('templates/view.md')).toBe(reference);
  });
  it('reads interfaces: docstrings of several lines, keys written in place, lists and null', () => {
    const source = `/** A part. */
export interface Part {
  /**
   * The first,
   * on two lines.
   */
  readonly first: string | null;
  readonly pairs: readonly { readonly left: string; readonly right: number }[];
  /** Deep. */
  readonly deep: {
    /** Inner. */
    readonly inner: readonly string[];
  } | null;
  readonly many: readonly {
    readonly one: boolean;
  }[];
}
`;
    const key = (name: string, type: string, meaning = '', keys: ViewKey[] = []): ViewKey => ({
      name,
      type,
      meaning,
      keys,
    });
    expect(partsOf(source)).toEqual([
      {
        name: 'Part',
        meaning: 'A part.',
        keys: [
          key('first', 'string | null', 'The first, on two lines.'),
          key('pairs', 'list', '', [key('left', 'string'), key('right', 'number')]),
          key('deep', 'keys | null', 'Deep.', [key('inner', 'readonly string[]', 'Inner.')]),
          key('many', 'list', '', [key('one', 'boolean')]),
        ],
      },
    ]);
  });
  it('says what every key means', () => {
    const parts = ['view.ts', 'comparison-view.ts', 'words/caution.ts'].flatMap((file) =>
      partsOf(read(`src/report/${file}`)),
    );
    const silent = parts.flatMap(({ name, keys }) =>
      keys.filter(({ meaning }) => meaning === '').map((key) => `${name}.${key.name}`),
    );
    expect(silent).toEqual([]);
  });
  it('has every key that a view has', async () => {
    const keys = new Set(
      [...reference.matchAll(/^\| `(?:\w+(?:\[ \])?\.)*(\w+)` \|/gm)].map((found) => found[1]),
    );
    const seen = new Set<string>();
    const walk = (value: unknown): void => {
      if (Array.isArray(value)) for (const one of value) walk(one);
      else if (typeof value === 'object' && value !== null)
        for (const [key, one] of Object.entries(value)) {
          seen.add(key);
          walk(one);
        }
    };
    const declared = [EXAMINED, TANGLED, TESTED, SEARCHED].map((one) => declaredRecord(one));
    for (const record of [sampleRecord(), ...(await Promise.all(declared))]) walk(buildView(record));
    expect(seen.size).toBeGreaterThan(150);
    expect([...seen].filter((key) => !keys.has(key))).toEqual([]);
  });
});
