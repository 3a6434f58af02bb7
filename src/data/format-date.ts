const DAY = 86_400_000;

/**
 * A date column's value as ISO 8601 text: "2026-03-01", or "2026-03-01T14:30" where it is not midnight (seconds
 * and thousandths only where they are not zero). `days` counts from 1970-01-01 UTC; missing (NaN) gives "".
 */
export function formatDate(days: number): string {
  if (!Number.isFinite(days)) return '';
  const milliseconds = Math.round(days * DAY);
  // Date holds 10^8 days on either side of 1970 (ECMA-262); arithmetic on dates may lead further.
  if (Math.abs(milliseconds) > 1e8 * DAY) return `${days} days from 1970-01-01`;
  const text = new Date(milliseconds).toISOString();
  const split = text.indexOf('T');
  const date = text.slice(0, split);
  const time = text
    .slice(split, -1)
    .replace(/\.000$/, '')
    .replace(/^(T\d\d:\d\d):00$/, '$1');
  return time === 'T00:00' ? date : date + time;
}
