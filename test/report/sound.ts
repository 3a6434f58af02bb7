import { expect } from 'vitest';
import type { Figure } from '../../src/report/chart/svg.ts';

/** Tags open and close in order, one svg with title and description, no number gone wrong, nothing unescaped. */
export function sound(figure: Figure | null): void {
  if (figure === null) return;
  expect(figure.svg).not.toMatch(/NaN|Infinity|undefined|null/);
  const open: string[] = [];
  for (const [, closing, name, self] of figure.svg.matchAll(/<(\/?)([a-zA-Z]+)[^>]*?(\/?)>/g)) {
    if (closing) expect(open.pop()).toBe(name);
    else if (!self) open.push(name!);
  }
  expect(open).toEqual([]);
  expect(figure.svg).toMatch(
    /^<svg class="chart" viewBox="0 0 [\d.]+ [\d.]+" role="img" aria-labelledby="([\w-]+)-t \1-d"><title id="\1-t">[^<]+<\/title><desc id="\1-d">[^<]+<\/desc>/,
  );
  expect(figure.caption).toMatch(/[.?!]$/);
}
