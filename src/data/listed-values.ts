import type { BadValue } from './table.ts';

/**
 * The bad cells that are listed: so many of the first, among them the first of each text of each variable, so that one
 * slip repeated over a whole file does not hide another.
 * @param found in file order; the result is too
 */
export function listedValues(found: readonly BadValue[], limit: number): BadValue[] {
  const seen = new Set<string>();
  const places = { first: [] as number[], again: [] as number[] };
  found.forEach(({ variable, text }, place) => {
    const key = JSON.stringify([variable, text]);
    (seen.has(key) ? places.again : places.first).push(place);
    seen.add(key);
  });
  return [...places.first, ...places.again]
    .slice(0, limit)
    .sort((a, b) => a - b)
    .map((place) => found[place]!);
}
