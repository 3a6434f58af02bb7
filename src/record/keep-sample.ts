import { createHash } from 'node:crypto';
import { createGzip, gzipSync } from 'node:zlib';
import type { Column } from '../data/table.ts';
import type { Sample } from '../prepare/sample.ts';
import type { Study } from '../study/study.ts';
import { quotedCell } from './quoted-cell.ts';
import type { KeptRows } from './read-sample.ts';

/** The rows used, ready to be written beside a record. */
export interface KeptSample {
  readonly file: string;
  /** SHA-256 of the text, uncompressed, in lower-case hexadecimal. */
  readonly sha256: string;
  /** The compressed bytes, in order. */
  readonly content: readonly Uint8Array[];
  /** The same rows as they would be read back. */
  readonly rows: KeptRows;
}

export const SAMPLE_FILE = 'sample.csv.gz';

/** Fixed, so that the same rows give the same bytes; the lowest, since a million rows are to take seconds. */
const COMPRESSION = 1;
/** Rows written at a time. */
const BLOCK = 2048;
/** Bytes that one number may take: 17 digits, sign, mark and exponent, with room. */
const WIDEST_NUMBER = 32;

/**
 * The sample as CSV, compressed: the line in the data file, the identity where there is one, then the declared
 * variables in order of declaration. Numbers have all their digits, dates are days since 1970-01-01, flags 0 and
 * 1, levels texts, and what is missing is empty. Texts that a spreadsheet would take for a formula get a leading
 * apostrophe. One block of rows is held at a time, and the compressed whole.
 */
export async function keepSample(study: Study, sample: Sample): Promise<KeptSample> {
  const rows = keptRows(study, sample);
  const columns = [...rows.columns.values()];
  const header = [
    'row',
    ...(sample.ids === null ? [] : ['id']),
    ...columns.map((column) => quotedCell(column.name)),
  ];
  const writers = [
    numberWriter(sample.lines),
    ...(sample.ids === null ? [] : [textWriter(sample.ids)]),
    ...columns.map(columnWriter),
  ];
  const head = Buffer.from(`${header.join(',')}\n`);
  const blocks = blocksOf(writers, sample.rowCount);
  const { sha256, content } =
    sample.rowCount <= BLOCK ? packed([head, ...blocks]) : await packing(head, blocks);
  return { file: SAMPLE_FILE, sha256, content, rows };
}

type Packed = Pick<KeptSample, 'sha256' | 'content'>;

/** What fits into one block, at once: streams cost more than the work. */
function packed(parts: readonly Uint8Array[]): Packed {
  const bytes = Buffer.concat(parts);
  return {
    sha256: createHash('sha256').update(bytes).digest('hex'),
    content: [gzipSync(bytes, { level: COMPRESSION })],
  };
}

/** Block by block, compressed while the next one is written. */
async function packing(head: Uint8Array, blocks: Iterable<Uint8Array>): Promise<Packed> {
  const hash = createHash('sha256');
  const gzip = createGzip({ level: COMPRESSION });
  const content: Uint8Array[] = [];
  gzip.on('data', (chunk: Uint8Array) => content.push(chunk));
  const ended = new Promise<void>((resolve, reject) => {
    gzip.on('end', resolve);
    gzip.on('error', reject);
  });
  const send = async (bytes: Uint8Array) => {
    hash.update(bytes);
    if (!gzip.write(bytes)) await new Promise((resolve) => gzip.once('drain', resolve));
  };
  await send(head);
  for (const block of blocks) await send(block);
  gzip.end();
  await ended;
  return { sha256: hash.digest('hex'), content };
}

/** What of a sample is kept: the declared variables that the study fits with. */
function keptRows(study: Study, sample: Sample): KeptRows {
  const columns = study.data.variables.flatMap(({ name }) => sample.columns.get(name) ?? []);
  return {
    rowCount: sample.rowCount,
    lines: sample.lines,
    ids: sample.ids,
    columns: new Map(columns.map((column) => [column.name, column])),
  };
}

/** Writes the cell of a row at `at` in `bytes` and gives the place after it; `room` says what a row may take at most. */
interface CellWriter {
  readonly room: (from: number, to: number) => number;
  readonly write: (row: number, bytes: Buffer, at: number) => number;
}

const COMMA = 44;
const LINE_FEED = 10;

function* blocksOf(writers: readonly CellWriter[], rowCount: number): Iterable<Uint8Array> {
  for (let from = 0; from < rowCount; from += BLOCK) {
    yield blockOf(writers, from, Math.min(from + BLOCK, rowCount));
  }
}

function blockOf(writers: readonly CellWriter[], from: number, to: number): Buffer {
  const room = writers.reduce((sum, writer) => sum + writer.room(from, to) + 1, 0);
  const bytes = Buffer.allocUnsafe(room * (to - from));
  let at = 0;
  for (let row = from; row < to; row++) {
    for (const writer of writers) {
      at = writer.write(row, bytes, at);
      bytes[at++] = COMMA;
    }
    bytes[at - 1] = LINE_FEED;
  }
  return bytes.subarray(0, at);
}

function columnWriter(column: Column): CellWriter {
  switch (column.kind) {
    case 'text':
      return textWriter(column.values);
    case 'category':
      return levelWriter(column.levels, column.codes);
    default:
      return numberWriter(column.values);
  }
}

function textWriter(values: readonly (string | null)[]): CellWriter {
  const cellOf = (row: number) => quotedCell(values[row] ?? '');
  return {
    room(from, to) {
      let most = 0;
      for (let row = from; row < to; row++) most = Math.max(most, Buffer.byteLength(cellOf(row)));
      return most;
    },
    write: (row, bytes, at) => at + bytes.write(cellOf(row), at),
  };
}

function levelWriter(levels: readonly string[], codes: Int32Array): CellWriter {
  const cells = levels.map((level) => Buffer.from(quotedCell(level)));
  const most = Math.max(0, ...cells.map((cell) => cell.length));
  return {
    room: () => most,
    write: (row, bytes, at) => at + (cells[codes[row]!]?.copy(bytes, at) ?? 0),
  };
}

/** A negative zero keeps its sign, so that every double comes back as it was. */
function writeZero(zero: number, bytes: Buffer, start: number): number {
  let at = start;
  if (Object.is(zero, -0)) bytes[at++] = 45;
  bytes[at++] = 48;
  return at;
}

/** Most digits behind the decimal mark that are tried for a whole column. */
const MOST_DECIMALS = 9;
const EXACT = 1e15;

/**
 * Measurements are written with a few decimals, and then m · 10^−d with a whole m is the shortest text of the
 * double (m has no more than 15 digits), found without asking for one number's digits at a time.
 */
function numberWriter(values: ArrayLike<number>): CellWriter {
  const decimals = decimalsOf(values);
  const power = 10 ** Math.max(0, decimals);
  return {
    room: () => WIDEST_NUMBER,
    write(row, bytes, at) {
      const value = values[row]!;
      if (value === 0) return writeZero(value, bytes, at);
      if (decimals >= 0 && !Number.isNaN(value)) {
        return writeDecimal(Math.round(value * power), decimals, bytes, at);
      }
      return Number.isNaN(value) ? at : at + bytes.write(String(value), at, 'latin1');
    },
  };
}

/** The fewest decimals at which every value of a column is exact; −1 where there are none. */
function decimalsOf(values: ArrayLike<number>): number {
  let decimals = 0;
  let power = 1;
  for (let i = 0; i < values.length; i++) {
    const value = values[i]!;
    // A text of NaN is empty whatever the decimals.
    if (Number.isNaN(value)) continue;
    if (!Number.isFinite(value)) return -1;
    while (Math.round(value * power) / power !== value || Math.abs(value * power) >= EXACT) {
      if (++decimals > MOST_DECIMALS || Math.abs(value * power) >= EXACT) return -1;
      power *= 10;
    }
  }
  return decimals;
}

const digits = new Uint8Array(20);

/** m · 10^−decimals as text, without zeros at its end. */
function writeDecimal(scaled: number, decimals: number, bytes: Buffer, start: number): number {
  let at = start;
  let rest = scaled;
  if (rest < 0) {
    bytes[at++] = 45;
    rest = -rest;
  }
  let count = 0;
  // The remainder of doubles is slow; below 2^31 that of whole numbers is not.
  while (rest > 0x7fffffff) {
    const next = Math.floor(rest / 10);
    digits[count++] = 48 + (rest - next * 10);
    rest = next;
  }
  for (let small = rest | 0; small > 0 || count <= decimals; small = (small / 10) | 0)
    digits[count++] = 48 + (small % 10);
  let last = 0;
  while (last < decimals && digits[last] === 48) last++;
  for (let k = count - 1; k >= decimals; k--) bytes[at++] = digits[k]!;
  if (last < decimals) {
    bytes[at++] = 46;
    for (let k = decimals - 1; k >= last; k--) bytes[at++] = digits[k]!;
  }
  return at;
}
