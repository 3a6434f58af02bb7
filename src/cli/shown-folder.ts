import { relative, resolve } from 'node:path';

/** An output folder as a person is told of it: relative where it lies below the current one. */
export function shownFolder(out: string): string {
  const near = relative('.', out);
  return near.startsWith('..') ? resolve(out) : near;
}
