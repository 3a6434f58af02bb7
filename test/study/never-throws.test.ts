import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { read, SMALL, SOUND } from './sample.ts';

/** Pieces that mean something to YAML, to the schema or to an expression. */
const PIECES = [
  '\n',
  '  ',
  '\t',
  ': ',
  '- ',
  '? ',
  '[',
  ']',
  '{',
  '}',
  ',',
  '"',
  "'",
  '#',
  '&a ',
  '*a',
  '!t ',
  '|',
  '>',
  '%',
  '@',
  '`',
  '---\n',
  '...\n',
  '<<',
  '~',
  'null',
  '.inf',
  '.nan',
  '1e400',
  '-1',
  '0.5',
  'true',
  '__proto__',
  'constructor',
  'toString',
  'cargo',
  'vessel',
  'speed ^',
  '(',
  ')',
  'interaction',
  'polynomial',
  'knots',
  'levels',
  '\r',
  '\u0000',
  '\ud800',
  '\ufeff',
  '🚢',
];

/** One change of a text: a stretch of it is replaced by something else, repeated or moved. */
const change = fc.record({
  at: fc.double({ min: 0, max: 1, noNaN: true }),
  length: fc.nat(30),
  piece: fc.oneof(fc.constantFrom(...PIECES), fc.string({ maxLength: 6 }), fc.constant(null)),
  to: fc.double({ min: 0, max: 1, noNaN: true }),
});

describe('the reader', () => {
  it('throws on no text, and gives a study or an error, never both', () => {
    fc.assert(
      fc.property(
        fc.constantFrom(SOUND, SMALL),
        fc.array(change, { minLength: 1, maxLength: 5 }),
        (start, changes) => {
          let text = start;
          for (const { at, length, piece, to } of changes) {
            const from = Math.floor(at * text.length);
            const end = from + length;
            if (piece !== null) text = text.slice(0, from) + piece + text.slice(end);
            else {
              const target = Math.floor(to * text.length);
              text = text.slice(0, target) + text.slice(from, end) + text.slice(target);
            }
          }
          const { study, problems } = read(text);
          const errors = problems.filter(({ severity }) => severity === 'error');
          expect(study === null).toBe(errors.length > 0);
          const lines = text.split('\n').length;
          for (const { place, message } of problems) {
            expect(message).toMatch(/\S\.$/);
            if (place.kind !== 'source') continue;
            expect(place.line).toBeGreaterThanOrEqual(1);
            expect(place.line).toBeLessThanOrEqual(lines);
            expect(place.column).toBeGreaterThanOrEqual(1);
            expect(place.length).toBeGreaterThanOrEqual(1);
          }
        },
      ),
      { numRuns: 600 },
    );
  });

  it('throws on no text of arbitrary letters', () => {
    fc.assert(
      fc.property(fc.array(fc.constantFrom(...PIECES), { maxLength: 60 }), (pieces) => {
        expect(read(pieces.join('')).study).toBeNull();
      }),
      { numRuns: 600 },
    );
  });
});
