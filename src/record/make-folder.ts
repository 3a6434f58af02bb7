import { mkdirSync, statSync } from 'node:fs';
import { dirname } from 'node:path';
import { isSystemFault } from './system-fault.ts';

/**
 * Makes a folder and those that it lies in, and gives the outermost that was made; undefined where all were there. Unlike
 * `mkdir` with `recursive`, it comes to an end where a system has no such place for a folder whose parent is there, as
 * below /proc.
 */
export function makeFolder(path: string): string | undefined {
  if (statSync(path, { throwIfNoEntry: false })?.isDirectory()) return undefined;
  const made = dirname(path) === path ? undefined : makeFolder(dirname(path));
  try {
    mkdirSync(path);
  } catch (fault) {
    // Another run may have made it meanwhile.
    if (!isSystemFault(fault) || fault.code !== 'EEXIST' || !statSync(path).isDirectory()) throw fault;
    return made;
  }
  return made ?? path;
}
