import { daysOf, isoDays } from '../expression/iso-date.ts';

/** Days since 1970-01-01 UTC of a date text, with a fraction for a time of day; NaN where it is not a date. */
export type DateReader = (text: string) => number;

/** A day of the calendar as days from 1970-01-01; NaN where there is no such day. */
function dayNumber(year: number, month: number, day: number): number {
  if (month < 1 || month > 12 || day < 1 || day > 31) return Number.NaN;
  const days = daysOf(year, month, day);
  // A 30 February would be counted on into March.
  return days < daysOf(month < 12 ? year : year + 1, month < 12 ? month + 1 : 1, 1) ? days : Number.NaN;
}

/**
 * ISO 8601: `2026-03-01`, or with a time `2026-03-01T14:30`, `2026-03-01 14:30:05.25`, then `Z`, `+01:00`, `+0100`
 * or `+01`. A time without an offset is taken as UTC. There is no hour 24 and no second 60.
 */
export const readIsoDate: DateReader = (text) => isoDays(text) ?? Number.NaN;

/**
 * A reader of dates of a declared pattern, made of YYYY MM DD hh mm ss (each at most once) and literal text; null
 * where the pattern has no YYYY, repeats a part, or has a day without a month. A month or day that the pattern
 * leaves out is the first. Parts other than the year may be written with one digit where no digit stands beside them
 * ("1.3.2026" for DD.MM.YYYY).
 */
export function datePatternReader(pattern: string): DateReader | null {
  const pieces = pattern.split(/(YYYY|MM|DD|hh|mm|ss)/);
  const parts: string[] = [];
  let source = '^';
  pieces.forEach((piece, index) => {
    if (index % 2 === 0) {
      source += piece.replace(/[.*+?^${}()|[\]\\/-]/g, '\\$&');
      return;
    }
    const next = pieces[index + 1] ?? '';
    const before = pieces[index - 1] ?? '';
    const open =
      (next === '' ? index === pieces.length - 2 : !/^\d/.test(next)) &&
      (before === '' ? index === 1 : !/\d$/.test(before));
    source += piece === 'YYYY' ? '(\\d{4})' : open ? '(\\d{1,2})' : '(\\d{2})';
    parts.push(piece);
  });
  if (new Set(parts).size !== parts.length || !parts.includes('YYYY')) return null;
  if (parts.includes('DD') && !parts.includes('MM')) return null;
  const form = new RegExp(`${source}$`);
  return (text) => {
    const found = form.exec(text);
    if (found === null) return Number.NaN;
    const part = (name: string, otherwise: number): number => {
      const index = parts.indexOf(name);
      return index < 0 ? otherwise : Number(found[index + 1]);
    };
    const day = dayNumber(part('YYYY', 0), part('MM', 1), part('DD', 1));
    const [hour, minute, second] = [part('hh', 0), part('mm', 0), part('ss', 0)];
    if (hour > 23 || minute > 59 || second > 59) return Number.NaN;
    return day + ((hour * 60 + minute) * 60 + second) / 86_400;
  };
}
