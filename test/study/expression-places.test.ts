import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { parseDocument, type Scalar } from 'yaml';
import { offsetsInSource } from '../../src/study/scalar-offsets.ts';
import { changed, marked, read, SMALL } from './sample.ts';

function derived(yaml: string): string {
  return changed(
    changed(SMALL, 'response: y', `derive:\n  z:\n    expression: ${yaml}\nresponse: y`),
    '[x]',
    '[x, z]',
  );
}

describe('a fault inside an expression', () => {
  it.each([
    ['plain', 'x + «xq1» * 2'],
    ['plain over lines', 'x +\n      «xq1» * 2'],
    ['plain over lines and a blank one', 'x +\n\n      2 * «xq1»'],
    ['in double quotes', '"x + «xq1»"'],
    ['in double quotes with escaped quotes', '"if(k == \\"low\\", «xq1», 2)"'],
    ['in double quotes over lines', '"x +\n      «xq1»"'],
    ['in single quotes', "'x + «xq1»'"],
    ['in single quotes with a doubled one', "'if(k == ''low'', «xq1», 2)'"],
    ['folded', '>\n      x +\n      «xq1» * 2'],
    ['folded and stripped', '>-\n      x + «xq1»\n      * 2'],
    ['literal', '|\n      x +\n      «xq1» * 2'],
    ['literal with a deeper line', '|\n      x +\n        «xq1» * 2'],
    ['folded with a comment on its header', '> # why\n      x + «xq1»'],
  ])('has its place where the text is %s', (_, yaml) => {
    const { text, places } = marked(derived(yaml));
    expect(read(text).places).toEqual(places.map((place) => `${place} expression_name`));
  });

  it('has the place of the whole text where the source spells it otherwise', () => {
    const { text, places } = marked(derived('«"x \\u002b xq1"»'));
    expect(read(text).places).toEqual(places.map((place) => `${place} expression_name`));
  });
});

describe('offsetsInSource', () => {
  const letters = fc.stringMatching(/^[a-z(][a-z0-9()+*' "]{0,30}[a-z)]$/);
  it('finds every letter of a text, however it is written', () => {
    fc.assert(
      fc.property(letters, fc.constantFrom('"', "'", '>', '|', ''), (text, style) => {
        const source =
          style === '"'
            ? `a: "${text.replaceAll('"', '\\"')}"`
            : style === "'"
              ? `a: '${text.replaceAll("'", "''")}'`
              : style === ''
                ? `a: ${text}`
                : `a: ${style}\n  ${text}\n`;
        const scalar = parseDocument(source).get('a', true) as Scalar;
        fc.pre(typeof scalar?.value === 'string');
        const value = scalar.value as string;
        const offsets = offsetsInSource(scalar, source)!;
        expect(offsets).toHaveLength(value.length + 1);
        for (let index = 0; index < value.trimEnd().length; index++) {
          expect(source[offsets[index]!]).toBe(value[index]);
          if (index > 0) expect(offsets[index]!).toBeGreaterThan(offsets[index - 1]!);
        }
      }),
    );
  });
});
