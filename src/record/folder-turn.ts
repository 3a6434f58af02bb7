import { randomUUID } from 'node:crypto';
import { readdirSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { setTimeout } from 'node:timers/promises';
import { HIDDEN } from './hidden-files.ts';
import { isSystemFault, withoutFault } from './system-fault.ts';

/** A run's turn to move files in a folder: while it lasts, no other run has one. */
export interface Turn {
  /**
   * To be called before each step. Throws `TurnLost` where the run was stopped for so long that another took it for
   * dead.
   */
  readonly hold: () => void;
  readonly end: () => void;
}

export class TurnLost extends Error {}

const LOCK = `${HIDDEN}lock-`;
/** Moving files takes milliseconds: a lock untouched for so long, in milliseconds, was left by a run that was killed. */
const STALE = 5000;
/** Between two touches of a run's own lock, in milliseconds. */
const TOUCH = STALE / 5;
const LONGEST_PAUSE = 20;

/**
 * Waits until no other run has its turn in the folder.
 *
 * Each run makes a lock of its own name, looks for others, and steps back for a random while where it finds a living
 * one. Of two runs at least the one that looks later sees the other's lock, so that never both have their turn. A lock
 * that was left by a killed run is passed over and removed; since a name is never used again, nobody removes the lock
 * of another run by mistake, which with one name for all could happen where two wait for the same dead run. Ages
 * are differences of the file system's own times, so that clocks of several machines need not agree.
 */
export async function takeTurn(folder: string): Promise<Turn> {
  const name = `${LOCK}${randomUUID()}`;
  const path = join(folder, name);
  for (;;) {
    const since = Date.now();
    writeFileSync(path, '');
    try {
      if (clearOfOthers(folder, name)) return turnWith(path, since);
    } catch (fault) {
      rmSync(path, { force: true });
      throw fault;
    }
    rmSync(path, { force: true });
    await setTimeout(1 + Math.random() * LONGEST_PAUSE);
  }
}

/** Whether a run's own lock is there and no other living one; removes dead ones. */
function clearOfOthers(folder: string, own: string): boolean {
  const locks = readdirSync(folder).filter((name) => name.startsWith(LOCK));
  // A run that was stopped between making and looking may have been taken for dead.
  if (!locks.includes(own)) return false;
  if (locks.length === 1) return true;
  const now = touched(join(folder, own));
  if (now === null) return false;
  const others = locks.filter((name) => name !== own).map((name) => join(folder, name));
  const living = others.filter((path) => {
    const at = touched(path);
    return at !== null && now - at <= STALE;
  });
  if (living.length > 0) return false;
  for (const path of others) rmSync(path, { force: true });
  return true;
}

/** Milliseconds; null where the lock is gone. */
function touched(path: string): number | null {
  return statSync(path, { throwIfNoEntry: false })?.mtimeMs ?? null;
}

function turnWith(path: string, since: number): Turn {
  let last = since;
  return {
    hold() {
      const now = Date.now();
      if (Math.abs(now - last) < TOUCH) return;
      try {
        writeFileSync(path, '.', { flag: 'r+' });
      } catch (fault) {
        if (isSystemFault(fault) && fault.code === 'ENOENT') throw new TurnLost();
        throw fault;
      }
      last = now;
    },
    // What cannot be removed is stale soon.
    end: () => withoutFault(() => rmSync(path, { force: true })),
  };
}
