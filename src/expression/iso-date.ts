const PATTERN =
  /^(\d{4})-(\d\d)-(\d\d)(?:[T ](\d\d):(\d\d)(?::(\d\d)(\.\d{1,9})?)?(?:Z|([+-])(\d\d)(?::?(\d\d))?)?)?$/;

/**
 * Days since 1970-01-01 UTC of an ISO 8601 date ("2024-03-01") or date and time ("2024-03-01T07:30", also
 * with seconds and an offset from UTC; without an offset it counts as UTC), or null where the text is none or
 * names a day that does not exist. The time of day is added in the same steps as for the cells of the data,
 * so that equal times are equal numbers.
 */
export function isoDays(text: string): number | null {
  const found = PATTERN.exec(text.trim());
  if (found === null) return null;
  const part = (index: number) => Number(found[index] ?? 0);
  const [year, month, day] = [part(1), part(2), part(3)];
  if (month < 1 || month > 12 || day < 1 || day > daysInMonth(year, month)) return null;
  const [hour, minute, second] = [part(4), part(5), part(6)];
  if (hour > 23 || minute > 59 || second > 59 || part(9) > 23 || part(10) > 59) return null;
  const offset = (found[8] === '-' ? -1 : 1) * (part(9) * 60 + part(10));
  return daysOf(year, month, day) + ((hour * 60 + minute - offset) * 60 + (second + part(7))) / 86_400;
}

/** Days from 1970-01-01 to a day of the Gregorian calendar (carried back before its introduction, as ISO 8601 does). */
export function daysOf(year: number, month: number, day: number): number {
  // Years counted from March put the leap day at the end, so that the days before a month are linear in it.
  const y = month > 2 ? year : year - 1;
  const century = Math.floor(y / 400);
  const yearOfCycle = y - century * 400;
  const dayOfYear = Math.floor((153 * (month + (month > 2 ? -3 : 9)) + 2) / 5) + day - 1;
  const dayOfCycle =
    yearOfCycle * 365 + Math.floor(yearOfCycle / 4) - Math.floor(yearOfCycle / 100) + dayOfYear;
  return century * 146_097 + dayOfCycle - 719_468;
}

export interface CalendarDay {
  readonly year: number;
  readonly month: number;
  readonly day: number;
}

/** The Gregorian day in which a count of days since 1970-01-01 (with any fraction) falls. */
export function calendarDay(days: number): CalendarDay {
  const shifted = Math.floor(days) + 719_468;
  const cycle = Math.floor(shifted / 146_097);
  const dayOfCycle = shifted - cycle * 146_097;
  const yearOfCycle = Math.floor(
    (dayOfCycle -
      Math.floor(dayOfCycle / 1_460) +
      Math.floor(dayOfCycle / 36_524) -
      Math.floor(dayOfCycle / 146_096)) /
      365,
  );
  const dayOfYear =
    dayOfCycle - (365 * yearOfCycle + Math.floor(yearOfCycle / 4) - Math.floor(yearOfCycle / 100));
  const fromMarch = Math.floor((5 * dayOfYear + 2) / 153);
  const month = fromMarch < 10 ? fromMarch + 3 : fromMarch - 9;
  return {
    year: yearOfCycle + cycle * 400 + (month <= 2 ? 1 : 0),
    month,
    day: dayOfYear - Math.floor((153 * fromMarch + 2) / 5) + 1,
  };
}

/** Day of the week, 1 = Monday … 7 = Sunday (ISO 8601). 1970-01-01 was a Thursday. */
export function isoWeekday(days: number): number {
  const sinceMonday = (Math.floor(days) + 3) % 7;
  return (sinceMonday < 0 ? sinceMonday + 7 : sinceMonday) + 1;
}

function daysInMonth(year: number, month: number): number {
  if (month === 2) return year % 4 === 0 && (year % 100 !== 0 || year % 400 === 0) ? 29 : 28;
  return month === 4 || month === 6 || month === 9 || month === 11 ? 30 : 31;
}
