import fc from 'fast-check';
import { expect, test } from 'vitest';
import { formatDate } from '../../src/data/format-date.ts';
import { datePatternReader, readIsoDate } from '../../src/data/read-date.ts';

/** Milliseconds from the year 1 to 9999, whole. */
const moments = fc.integer({ min: Date.parse('0001-01-01T00:00Z'), max: Date.parse('9999-12-31T23:59Z') });

test('an ISO text of any moment gives the days that the language counts', () => {
  fc.assert(
    fc.property(moments, (milliseconds) => {
      const text = new Date(milliseconds).toISOString();
      expect(readIsoDate(text)).toBeCloseTo(milliseconds / 86_400_000, 7);
      expect(readIsoDate(text.slice(0, 10))).toBe(Math.floor(milliseconds / 86_400_000));
    }),
  );
});

test('a value formatted and read again is the same moment', () => {
  fc.assert(
    fc.property(moments, (milliseconds) => {
      const days = milliseconds / 86_400_000;
      expect(Math.round(readIsoDate(formatDate(days)) * 86_400_000)).toBe(milliseconds);
    }),
  );
});

test('the text of a date', () => {
  expect(formatDate(0)).toBe('1970-01-01');
  expect(formatDate(20513.5)).toBe('2026-03-01T12:00');
  expect(formatDate(20513 + 1 / 86_400)).toBe('2026-03-01T00:00:01');
  expect(formatDate(20513 + 0.25 / 86_400)).toBe('2026-03-01T00:00:00.250');
  expect(formatDate(-1)).toBe('1969-12-31');
  expect(formatDate(Number.NaN)).toBe('');
  expect(formatDate(1e12)).toBe('1000000000000 days from 1970-01-01');
  // 0.1 of a day is not a double; the text is that of the nearest thousandth of a second.
  expect(formatDate(20513.1)).toBe('2026-03-01T02:24');
});

test('offsets from UTC', () => {
  expect(readIsoDate('2026-03-01T00:30+01:00')).toBe(readIsoDate('2026-02-28T23:30Z'));
  expect(readIsoDate('2026-03-01T00:30-0130')).toBe(readIsoDate('2026-03-01T02:00'));
  expect(readIsoDate('2026-03-01T00:30+01')).toBe(readIsoDate('2026-02-28T23:30'));
});

test.each([
  '2026-02-29',
  '1900-02-29',
  '2026-13-01',
  '2026-00-01',
  '2026-01-00',
  '2026-04-31',
  '2026-3-1',
  '20260301',
  '2026-03',
  '2026-03-01T24:00',
  '2026-03-01T12:60',
  '2026-03-01T12:00:60',
  '2026-03-01T12',
  '2026-03-01Z',
  '01/03/2026',
  '46082',
  '',
])('%j is not an ISO date', (text) => {
  expect(readIsoDate(text)).toBeNaN();
});

test('leap days exist where they should', () => {
  expect(readIsoDate('2000-02-29')).toBe(11016);
  expect(readIsoDate('2024-02-29')).toBe(Date.UTC(2024, 1, 29) / 86_400_000);
});

test('patterns', () => {
  const us = datePatternReader('MM/DD/YYYY');
  expect(us?.('3/1/2026')).toBe(20513);
  expect(us?.('13/01/2026')).toBeNaN();
  const packed = datePatternReader('YYYYMMDDhhmmss');
  expect(packed?.('20260301060000')).toBe(20513.25);
  expect(packed?.('2026030106000')).toBeNaN();
  expect(datePatternReader('YYYY-MM')?.('2026-03')).toBe(20513);
  expect(datePatternReader('YYYY')?.('2026')).toBe(Date.UTC(2026, 0, 1) / 86_400_000);
  const literal = datePatternReader('[YYYY] (MM) DD.');
  expect(literal?.('[2026] (03) 01.')).toBe(20513);
  expect(literal?.('[2026] (03) 01x')).toBeNaN();
  const month = datePatternReader('DD.MM.YYYY');
  expect(month?.('30.02.2026')).toBeNaN();
  expect(month?.('31.12.2026')).toBe(Date.UTC(2026, 11, 31) / 86_400_000);
  expect(datePatternReader('YYYY-MM-DD hh:mm')?.('2026-03-01 24:00')).toBeNaN();
});

test.each(['DD.MM', 'YYYY-DD', 'YYYY-MM-MM', 'hh:mm', ''])('%j tells no day from another', (pattern) => {
  expect(datePatternReader(pattern)).toBeNull();
});
