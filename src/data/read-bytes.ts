import { createHash } from 'node:crypto';
import { type FileHandle, open, readdir, stat } from 'node:fs/promises';
import { basename, dirname, resolve } from 'node:path';
import { pipeline, Readable } from 'node:stream';
import { nearest } from '../expression/nearest.ts';
import type { Problem, Report } from '../problem.ts';

/** An open data file: its bytes once, unpacked where its name ends in .gz. */
export interface ByteSource {
  readonly bytes: AsyncGenerator<Buffer>;
  /** How many there are, unpacked; null where that is not known. */
  readonly size: number | null;
  /** Whether the file is another, or has another size or time of change, than when it was opened. */
  readonly hasChanged: () => Promise<boolean>;
  /** SHA-256 of the file as stored, over the very bytes that were read; reads what is left first. */
  readonly finish: () => Promise<string>;
  readonly close: () => Promise<void>;
}

/** Opens a data file. `file` is the name to show; null after a problem. */
export async function openBytes(
  file: string,
  folder: string,
  chunkSize: number,
  report: Report,
): Promise<ByteSource | null> {
  const path = resolve(folder, file);
  let handle: FileHandle;
  let before: Version;
  try {
    handle = await open(path, 'r');
  } catch (error) {
    report(await unreadable(file, path, error));
    return null;
  }
  try {
    const found = await handle.stat({ bigint: true });
    if (!found.isFile()) {
      const what = found.isDirectory() ? 'a folder' : 'not a regular file';
      report(problem(file, `The data file ${file} is ${what}.`));
      await handle.close();
      return null;
    }
    before = versionOf(found);
  } catch (error) {
    report(problem(file, `The data file ${file} cannot be read (${reason(error)}).`));
    await handle.close();
    return null;
  }

  const packed = /\.gz$/i.test(file);
  const hash = createHash('sha256');
  const readChunk = async (): Promise<Buffer | null> => {
    const buffer = Buffer.allocUnsafe(chunkSize);
    const { bytesRead: count } = await handle.read(buffer, 0, chunkSize, null);
    if (count === 0) return null;
    const chunk = buffer.subarray(0, count);
    hash.update(chunk);
    return chunk;
  };
  async function* stored(): AsyncGenerator<Buffer> {
    for (let chunk = await readChunk(); chunk !== null; chunk = await readChunk()) yield chunk;
  }

  return {
    bytes: packed ? unpacked(stored(), chunkSize) : stored(),
    size: packed ? null : Number(before.size),
    hasChanged: async () => {
      const now = await stat(path, { bigint: true }).then(versionOf, () => null);
      return now === null || !sameVersion(before, now);
    },
    finish: async () => {
      // Bytes after the end of a packed stream are still bytes of the file.
      while ((await readChunk()) !== null);
      return hash.digest('hex');
    },
    close: () => handle.close(),
  };
}

/** Bytes that come from elsewhere, such as standard input. */
export function streamedBytes(stream: AsyncIterable<Uint8Array>): ByteSource {
  const hash = createHash('sha256');
  async function* pass(): AsyncGenerator<Buffer> {
    for await (const chunk of stream) {
      hash.update(chunk);
      yield Buffer.from(chunk.buffer, chunk.byteOffset, chunk.byteLength);
    }
  }
  const bytes = pass();
  return {
    bytes,
    size: null,
    hasChanged: async () => false,
    finish: async () => {
      while (!(await bytes.next()).done);
      return hash.digest('hex');
    },
    close: async () => {
      await bytes.return(undefined);
    },
  };
}

/** Whether an error comes from the system or from unpacking, and so from the file rather than from the program. */
export function isReadingError(error: unknown): boolean {
  return error instanceof Error && 'code' in error && /^(?:E(?!RR_)|Z_)/.test(String(error.code));
}

/** The problem for a file that fails while it is being read. */
export function brokenOff(file: string, error: unknown): Problem {
  return reason(error).startsWith('Z_')
    ? problem(
        file,
        `The data file ${file} cannot be unpacked (${reason(error)}).`,
        'Its name ends in .gz, but it is not a whole gzip file.',
      )
    : problem(file, `The data file ${file} cannot be read (${reason(error)}).`);
}

interface Version {
  readonly size: bigint;
  readonly modified: bigint;
  readonly inode: bigint;
}

function versionOf(found: { size: bigint; mtimeNs: bigint; ino: bigint }): Version {
  return { size: found.size, modified: found.mtimeNs, inode: found.ino };
}

function sameVersion(a: Version, b: Version): boolean {
  return a.size === b.size && a.modified === b.modified && a.inode === b.inode;
}

async function* unpacked(stored: AsyncGenerator<Buffer>, chunkSize: number): AsyncGenerator<Buffer> {
  const { createGunzip } = await import('node:zlib');
  const gunzip = createGunzip({ chunkSize: Math.max(64, chunkSize) });
  // An error on either side ends the loop below by destroying `gunzip`; nothing is left for the callback.
  pipeline(Readable.from(stored, { objectMode: true, highWaterMark: 2 }), gunzip, () => {});
  for await (const chunk of gunzip) yield chunk as Buffer;
}

async function unreadable(file: string, path: string, error: unknown): Promise<Problem> {
  if (reason(error) !== 'ENOENT') {
    return problem(file, `The data file ${file} cannot be opened (${reason(error)}).`);
  }
  const beside = await readdir(dirname(path)).catch(() => []);
  const near = nearest(basename(path), beside);
  return problem(file, `There is no data file ${file}.`, near === null ? undefined : `Did you mean ${near}?`);
}

/** The system's own short word for what went wrong; its longer messages hold absolute paths. */
function reason(error: unknown): string {
  if (typeof error === 'object' && error !== null && 'code' in error) return String(error.code);
  return 'unknown reason';
}

function problem(file: string, message: string, hint?: string): Problem {
  const place = { kind: 'file', file } as const;
  return { code: 'data_unreadable', severity: 'error', place, message, ...(hint ? { hint } : {}) };
}
