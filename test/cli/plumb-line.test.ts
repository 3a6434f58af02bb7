import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { plumbLine, printable, wrapped } from '../../src/cli/plumb-line.ts';
import { collecting } from './collect.ts';

describe('plumbLine', () => {
  test('hangs labels and answers on one line, with the bob at the end', () => {
    const { terminal } = collecting({ width: 40 });
    const text = plumbLine(
      [
        { label: 'asked', paragraphs: ['How much gas does a firing take?'] },
        {
          label: 'careful',
          paragraphs: [{ mark: '·', text: 'A first caution, of some length.' }, 'Another.'],
        },
        { label: 'written', paragraphs: [{ line: 'a  b' }, { line: 'results/x' }] },
      ],
      terminal,
    );
    expect(text).toBe(
      [
        '    asked │ How much gas does a firing',
        '          │ take?',
        '          │',
        '  careful │ · A first caution, of some',
        '          │   length.',
        '          │ Another.',
        '          │',
        '  written │ a  b',
        '          ▼ results/x',
        '',
      ].join('\n'),
    );
  });

  test('colour codes stand only where the terminal shows them', () => {
    const sections = [{ label: 'asked', paragraphs: ['What?'] }];
    expect(plumbLine(sections, collecting().terminal)).not.toContain('\u001b');
    expect(plumbLine(sections, collecting({ colour: true }).terminal)).toContain('\u001b[1masked\u001b[22m');
  });

  test('a text from the data cannot steer the terminal', () => {
    const evil = 'a\u001b[2Jb\u0007c\u009bd\ne\u202ef';
    const text = plumbLine(
      [
        {
          label: 'data',
          paragraphs: [
            evil,
            { mark: '·', text: evil },
            { columns: [{ heading: 'x', align: 'left' }], rows: [[evil]] },
            { line: evil },
          ],
        },
      ],
      collecting().terminal,
    );
    expect(text.replaceAll('\n', '')).not.toMatch(/[\p{Cc}\u202e]/u);
    expect(printable(evil)).toBe('a<U+001B>[2Jb<U+0007>c<U+009B>d e<U+202E>f');
  });
});

describe('wrapped', () => {
  test('keeps words and no line is too long unless its one word is', () => {
    fc.assert(
      fc.property(fc.array(fc.stringMatching(/^[a-zé\u00a0]{1,12}$/), { minLength: 1 }), (words) => {
        const lines = wrapped(words.join(' '), 10);
        expect(lines.join(' ')).toBe(words.join(' '));
        for (const line of lines) expect(line.length <= 10 || !line.includes(' ')).toBe(true);
      }),
    );
  });

  test('a number keeps its unit', () => {
    expect(wrapped('takes 1\u202f234\u00a0L', 8)).toEqual(['takes', '1\u202f234\u00a0L']);
    expect(wrapped('', 8)).toEqual(['']);
  });
});

test('a table aligns, shortens what may shrink, and gives no place to marks above letters', () => {
  const { terminal } = collecting({ width: 48 });
  const columns = [
    { heading: 'row', align: 'left' as const, shrinks: true },
    { heading: 'estimate', align: 'right' as const },
  ];
  const text = (name: string) =>
    plumbLine(
      [{ label: 'predicts', paragraphs: [{ columns, rows: [['cafe\u0301', '1.5'], [name, '−12'], ['c']] }] }],
      terminal,
    );
  expect(text('a name')).toBe(
    [
      ' predicts │ row     estimate',
      '          │ cafe\u0301         1.5',
      '          │ a name       −12',
      '          ▼ c',
      '',
    ].join('\n'),
  );
  const long = text('a name that goes on and on and on and on').split('\n');
  expect(long[2]).toBe('          │ a name that goes on and o…       −12');
  for (const line of long) expect([...line].length).toBeLessThanOrEqual(49);
});
