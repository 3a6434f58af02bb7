import {
  existsSync,
  lstatSync,
  readdirSync,
  readFileSync,
  renameSync,
  statSync,
  writeFileSync,
} from 'node:fs';
import { dirname, join } from 'node:path';
import { type Turn, TurnLost, takeTurn } from './folder-turn.ts';
import { BACK, discard, FORWARD, HIDDEN, isMarked, tidy, toTrash } from './hidden-files.ts';
import { makeFolder } from './make-folder.ts';
import { isSystemFault, reason, type SystemFault, systemFault } from './system-fault.ts';

/** What a run changes in a folder: names of files relative to it. */
export interface Change {
  /** New files, which lie in `new` of the hidden folder and replace those of the same names. */
  readonly coming: readonly string[];
  /** Files of earlier runs that go without another in their place. */
  readonly gone: readonly string[];
}

/** Where the new files lie in a hidden folder, and where those are put that they replace. */
export const NEW = 'new';
const EARLIER = 'earlier';
const RECORD = 'record.json';

/** Files could not be brought where they belong; the message is the end of a sentence. */
export class MoveStuck extends Error {}

/**
 * Moves the new files of a hidden folder into the folder around it: none of them, or all.
 *
 * A marker in the hidden folder decides that the move is made. Then all files that go or are replaced are moved aside,
 * the record first, and only then are the new ones moved in, the record last; so the folder holds a part of the earlier
 * files or a part of the new ones and never some of both, and where it has a record it has all that belongs to it. A run
 * that is killed on the way leaves the marker, and whoever next writes there or reads the record finishes the move (see
 * `finishMoves`). A fault of the file system has everything moved back, and is thrown.
 *
 * `obstacle` is asked when no other run can change the folder any more: why the files are not to be moved in, as the
 * end of a sentence, or null.
 */
export async function moveIn(
  folder: string,
  staging: string,
  change: Change,
  obstacle: () => string | null,
): Promise<void> {
  let decided = false;
  for (;;) {
    const turn = await takeTurn(folder);
    try {
      finishWith(turn, folder);
      // Our turn was lost on the way; what was left of the move is done now.
      if (decided) return;
      const why = obstacle();
      if (why !== null) throw new MoveStuck(why);
      refuseFolders(folder, change);
      turn.hold();
      writeMarker(staging, change);
      decided = true;
      moveOrBack(turn, folder, staging, change);
      tidy(folder);
      return;
    } catch (fault) {
      if (!(fault instanceof TurnLost)) throw fault;
    } finally {
      turn.end();
    }
  }
}

/**
 * Finishes moves in a folder that were interrupted, and waits for one that is under way. Gives why that cannot be done,
 * as the end of a sentence; null where it is done, where there is nothing to finish, and where the folder cannot be
 * listed.
 */
export async function finishMoves(folder: string): Promise<string | null> {
  for (;;) {
    let staging: string | undefined;
    try {
      [staging] = markedIn(folder);
    } catch {
      return null;
    }
    if (staging === undefined) return null;
    try {
      const turn = await takeTurn(folder);
      try {
        finishWith(turn, folder);
      } finally {
        turn.end();
      }
    } catch (fault) {
      if (fault instanceof MoveStuck) return fault.message;
      if (isSystemFault(fault)) return unfinished(staging, fault);
      if (!(fault instanceof TurnLost)) throw fault;
    }
  }
}

/** Hidden folders with a marker. */
function markedIn(folder: string): string[] {
  const hidden = readdirSync(folder).filter((name) => name.startsWith(HIDDEN));
  return hidden.map((name) => join(folder, name)).filter(isMarked);
}

function unfinished(staging: string, fault: SystemFault): string {
  return `a run ended while it moved its files in, and its move cannot be finished: ${reason(fault)}; the files are in "${staging}"`;
}

function finishWith(turn: Turn, folder: string): void {
  for (const staging of markedIn(folder)) {
    try {
      const back = existsSync(join(staging, BACK));
      const change = readMarker(join(staging, back ? BACK : FORWARD));
      (back ? moveBack : moveForward)(turn, folder, staging, change);
      discard(toTrash(staging));
    } catch (fault) {
      if (!isSystemFault(fault)) throw fault;
      throw new MoveStuck(unfinished(staging, fault));
    }
  }
}

function moveOrBack(turn: Turn, folder: string, staging: string, change: Change): void {
  try {
    moveForward(turn, folder, staging, change);
    toTrash(staging);
  } catch (fault) {
    if (!isSystemFault(fault)) throw fault;
    // Whoever took our turn has finished the move and removed the hidden folder.
    if (!existsSync(staging)) throw new TurnLost();
    try {
      renameSync(join(staging, FORWARD), join(staging, BACK));
      moveBack(turn, folder, staging, change);
      discard(toTrash(staging));
    } catch (second) {
      // Whoever has the turn now moves the rest back.
      if (second instanceof TurnLost) throw fault;
      if (!isSystemFault(second)) throw second;
      throw new MoveStuck(
        `${reason(fault)}, and earlier files cannot be moved back: ${reason(second)}; they are in "${staging}", and the next run that writes here moves them back`,
      );
    }
    throw fault;
  }
}

/** May be begun at any state between none and all files moved. */
function moveForward(turn: Turn, folder: string, staging: string, { coming, gone }: Change): void {
  // A file whose successor has left `new` is that successor.
  const replaced = coming.filter((name) => isThere(join(staging, NEW, name)));
  moveAll(turn, recordFirst([...gone, ...replaced]), folder, join(staging, EARLIER));
  makeFolders(folder, coming);
  moveAll(turn, recordFirst(coming).reverse(), join(staging, NEW), folder);
}

/** The way back from any such state. */
function moveBack(turn: Turn, folder: string, staging: string, { coming, gone }: Change): void {
  const moved = coming.filter((name) => !isThere(join(staging, NEW, name)));
  moveAll(turn, recordFirst(moved), folder, join(staging, NEW));
  moveAll(turn, recordFirst([...gone, ...coming]).reverse(), join(staging, EARLIER), folder);
}

/**
 * Moves those files that are there. Folders in the hidden one are made before anything is decided, and none here: where
 * another run has finished the move and removed the hidden folder, nothing can be moved any more.
 */
function moveAll(turn: Turn, names: readonly string[], from: string, to: string): void {
  for (const name of names) {
    if (!isThere(join(from, name))) continue;
    turn.hold();
    renameSync(join(from, name), join(to, name));
  }
}

/** The folders that files of these names lie in. */
export function makeFolders(folder: string, names: readonly string[]): void {
  for (const path of new Set(names.map((name) => dirname(join(folder, name))))) {
    makeFolder(path);
  }
}

function recordFirst(names: readonly string[]): string[] {
  return [...names].sort((a, b) => Number(b === RECORD) - Number(a === RECORD));
}

/** Whole or not at all, so that it also says that all new files are there. */
function writeMarker(staging: string, change: Change): void {
  makeFolders(join(staging, EARLIER), [...change.coming, ...change.gone]);
  const beside = join(staging, 'marker');
  writeFileSync(beside, JSON.stringify(change));
  renameSync(beside, join(staging, FORWARD));
}

/** Results may come from elsewhere, and a marker with them: no name in it leads out of the folder. */
function readMarker(path: string): Change {
  try {
    const { coming, gone } = JSON.parse(readFileSync(path, 'utf8')) as Change;
    if ([...coming, ...gone].every(staysWithin)) return { coming: [...coming], gone: [...gone] };
  } catch (fault) {
    if (isSystemFault(fault)) throw fault;
  }
  throw systemFault('EBADMSG');
}

function staysWithin(name: unknown): boolean {
  return (
    typeof name === 'string' &&
    name !== '' &&
    name.split('/').every((part) => !['', '.', '..'].includes(part) && !/[\\:\0]/.test(part))
  );
}

/** A folder where a file of ours belongs is someone else's: refuse rather than move it. */
function refuseFolders(folder: string, { coming, gone }: Change): void {
  for (const name of [...coming, ...gone]) {
    if (statSync(join(folder, name), { throwIfNoEntry: false })?.isDirectory()) throw systemFault('EISDIR');
  }
}

/** Whether a file or a link lies there; a folder is refused as above. */
function isThere(path: string): boolean {
  const found = lstatSync(path, { throwIfNoEntry: false });
  if (found?.isDirectory()) throw systemFault('EISDIR');
  return found !== undefined;
}
