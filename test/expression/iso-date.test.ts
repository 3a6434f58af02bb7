import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { calendarDay, daysOf, isoDays, isoWeekday } from '../../src/expression/iso-date.ts';

const DAY = 86_400_000;

/** The reference is the calendar of the JavaScript engine itself (ECMA-262, Date, in UTC). */
const anyInstant = fc.integer({ min: -62_167_219_200_000, max: 253_402_300_799_999 });

describe('dates', () => {
  test('agree with the calendar of the engine from year 0 to 9999', () => {
    fc.assert(
      fc.property(anyInstant, (time) => {
        const date = new Date(time);
        const days = time / DAY;
        expect(calendarDay(days)).toEqual({
          year: date.getUTCFullYear(),
          month: date.getUTCMonth() + 1,
          day: date.getUTCDate(),
        });
        expect(isoWeekday(days)).toBe(date.getUTCDay() === 0 ? 7 : date.getUTCDay());
        const whole = Math.floor(days);
        expect(daysOf(date.getUTCFullYear(), date.getUTCMonth() + 1, date.getUTCDate())).toBe(whole);
        expect(isoDays(date.toISOString().slice(0, 10))).toBe(whole);
        expect(isoDays(date.toISOString())! * DAY).toBeCloseTo(time, 0);
      }),
      { numRuns: 1000 },
    );
  });

  test.each([
    ['1970-01-01', 0],
    ['1969-12-31', -1],
    ['2024-02-29', 19782],
    [' 2024-02-29 ', 19782],
    ['1970-01-02T06:00', 1.25],
    ['1970-01-02 06:00:00', 1.25],
    ['1970-01-02T06:00:00.000Z', 1.25],
    ['1970-01-02T06:00+06:00', 1],
    ['1970-01-02T06:00-0600', 1.5],
    ['1970-01-01T00:00+01', -1 / 24],
  ])('%s is day %f', (text, days) => {
    expect(isoDays(text)).toBe(days);
  });

  test.each([
    '2023-02-29',
    '1900-02-29',
    '2024-04-31',
    '2024-13-01',
    '2024-00-10',
    '2024-01-00',
    '2024-1-1',
    '20240101',
    '01.02.2024',
    '2024-01-01T24:00',
    '2024-01-01T10:60',
    '2024-01-01T10:00:60',
    '2024-01-01T10:00+24:00',
    '2024-01-01T10',
    '2024',
    '',
  ])('%s is no date', (text) => {
    expect(isoDays(text)).toBeNull();
  });
});
