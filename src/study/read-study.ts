import { createHash } from 'node:crypto';
import { open, readFile, stat } from 'node:fs/promises';
import { dirname, resolve } from 'node:path';
import type { Report } from '../problem.ts';
import type { GivenParameters } from './parameters.ts';
import { isRecord, parseStudy, recordGiven, unreadable } from './parse-study.ts';
import type { Study } from './study.ts';

/** No study that a person reviews is larger; a file that is will be something else. */
const MOST_BYTES = 2_000_000;

/**
 * Reads and checks a study file. Places name the file as `path` does. Null where the file cannot be read or anything
 * in it is an error; all of it is reported. `given` are values for the study's parameters, by name.
 */
export async function readStudy(
  path: string,
  report: Report,
  given: GivenParameters = new Map(),
): Promise<Study | null> {
  const bytes = await readBytes(path, report);
  if (bytes === null) return null;
  const text = decode(bytes, path, report);
  if (text === null) return null;
  const sha256 = createHash('sha256').update(bytes).digest('hex');
  return parseStudy(text, path, resolve(dirname(path)), sha256, report, given);
}

async function readBytes(path: string, report: Report): Promise<Uint8Array | null> {
  try {
    const about = await stat(path);
    if (about.isDirectory()) {
      report(unreadable(path, 'The study file is a folder.', 'Name the study file in it.'));
      return null;
    }
    if (about.size > MOST_BYTES) {
      if (isRecord(await beginning(path))) {
        report(recordGiven(path));
        return null;
      }
      const size = (about.size / 1_000_000).toFixed(1);
      report(unreadable(path, `The study file has ${size} MB; the most is 2 MB.`, 'Is this the data file?'));
      return null;
    }
    return await readFile(path);
  } catch (error) {
    const code = (error as NodeJS.ErrnoException).code;
    if (code === 'ENOENT' || code === 'ENOTDIR') report(unreadable(path, 'There is no such study file.'));
    else if (code === 'EACCES') report(unreadable(path, 'The study file may not be read.'));
    else report(unreadable(path, `The study file cannot be read (${code ?? String(error)}).`));
    return null;
  }
}

/** The first kilobyte of a file, as far as it is text. */
async function beginning(path: string): Promise<string> {
  const file = await open(path);
  try {
    const { buffer, bytesRead } = await file.read(Buffer.alloc(1024), 0, 1024, 0);
    return buffer.toString('utf8', 0, bytesRead);
  } finally {
    await file.close();
  }
}

function decode(bytes: Uint8Array, path: string, report: Report): string | null {
  try {
    return new TextDecoder('utf-8', { fatal: true, ignoreBOM: true }).decode(bytes);
  } catch {
    const { line, column } = firstFault(bytes);
    report({
      code: 'study_not_utf8',
      severity: 'error',
      place: { kind: 'source', file: path, line, column, length: 1 },
      message: 'The study file is not written in UTF-8.',
      hint: 'Save it as UTF-8 in your editor.',
    });
    return null;
  }
}

/** Where the bytes stop being UTF-8: the longest sound beginning, found by halving. */
function firstFault(bytes: Uint8Array): { readonly line: number; readonly column: number } {
  const isSound = (length: number) => {
    try {
      // As a stream: a character that the cut splits is no fault.
      new TextDecoder('utf-8', { fatal: true, ignoreBOM: true }).decode(bytes.subarray(0, length), {
        stream: true,
      });
      return true;
    } catch {
      return false;
    }
  };
  let [sound, unsound] = [0, bytes.length];
  while (unsound - sound > 1) {
    const middle = (sound + unsound) >> 1;
    if (isSound(middle)) sound = middle;
    else unsound = middle;
  }
  const before = new TextDecoder('utf-8').decode(bytes.subarray(0, sound));
  const lineStart = before.lastIndexOf('\n') + 1;
  return {
    line: before.split('\n').length,
    column: before.slice(lineStart).replace(/\ufffd+$/, '').length + 1,
  };
}
