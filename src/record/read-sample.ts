import { createHash } from 'node:crypto';
import { createReadStream } from 'node:fs';
import { dirname, join } from 'node:path';
import { createGunzip } from 'node:zlib';
import type { TextPiece } from '../data/decode-text.ts';
import { readPlainNumber } from '../data/read-number.ts';
import { splitRows } from '../data/split-rows.ts';
import type { Column } from '../data/table.ts';
import type { Report } from '../problem.ts';
import { unguardedText } from './quoted-cell.ts';
import type { RecordVariable, StudyRecord } from './record.ts';

/** The rows that a record was made from, as they were kept beside it. */
export interface KeptRows {
  readonly rowCount: number;
  /** Line in the data file of each row. */
  readonly lines: Uint32Array;
  /** Null where the study declares no row identity. */
  readonly ids: readonly string[] | null;
  /** Declared variables that the study fits with. */
  readonly columns: ReadonlyMap<string, Column>;
}

/**
 * Reads the sample kept beside a record; null where there is none. That it was declined or has gone is a warning;
 * one that is damaged, edited or another record's is an error (`sample_unreadable`).
 *
 * @param path of the record
 */
export async function readSample(
  path: string,
  record: StudyRecord,
  report: Report,
): Promise<KeptRows | null> {
  const kept = record.data.sample ?? null;
  if (kept === null) {
    refuse(
      path,
      'warning',
      'No rows were kept with this record, so that it cannot be compared row by row.',
      'report.keep_sample: true keeps them.',
      report,
    );
    return null;
  }
  const file = join(dirname(path), kept.file);
  const hash = createHash('sha256');
  const reader = startReading(record);
  const damaged = (what: string) => {
    refuse(
      file,
      'error',
      what,
      'Fit the study again, or bring back the results as they were written.',
      report,
    );
    return null;
  };
  try {
    for await (const batch of splitRows(textOf(file, hash), { delimiter: ',', newline: '\n' }, file)) {
      if (batch.fault !== null) return damaged('The rows kept with this record cannot be read as a table.');
      const fault = reader.take(batch.cells);
      if (fault !== null) return damaged(fault);
    }
  } catch (fault) {
    const code = (fault as { readonly code?: unknown }).code;
    if (code === 'ENOENT') {
      refuse(
        file,
        'warning',
        'The rows kept with this record are not there, so that it cannot be compared row by row.',
        'Keep the whole folder of results, not the record alone.',
        report,
      );
      return null;
    }
    if (typeof code !== 'string') throw fault;
    return damaged(`The rows kept with this record cannot be read: ${reason(code)}.`);
  }
  if (hash.digest('hex') !== kept.sha256) {
    return damaged(
      'The rows kept with this record are not those that it was made from: their hash is another.',
    );
  }
  return reader.finish() ?? damaged('The rows kept with this record are not as many as it was made from.');
}

function reason(code: string): string {
  if (code.startsWith('Z_') || code === 'ERR_ENCODING_INVALID_ENCODED_DATA') return 'the file is damaged';
  if (code === 'EACCES' || code === 'EPERM') return 'permission is denied';
  return code === 'EISDIR' ? 'it is a folder' : `the system says ${code}`;
}

function refuse(
  file: string,
  severity: 'error' | 'warning',
  message: string,
  hint: string,
  report: Report,
): void {
  report({ code: 'sample_unreadable', severity, place: { kind: 'file', file }, message, hint });
}

/** The uncompressed text in pieces; its bytes go through the hash. */
async function* textOf(
  file: string,
  hash: { update(bytes: Uint8Array): unknown },
): AsyncGenerator<TextPiece> {
  const decoder = new TextDecoder('utf-8', { fatal: true });
  const source = createReadStream(file);
  const gunzip = createGunzip();
  source.on('error', (fault) => gunzip.destroy(fault));
  for await (const bytes of source.pipe(gunzip) as AsyncIterable<Uint8Array>) {
    hash.update(bytes);
    yield { text: decoder.decode(bytes, { stream: true }), last: false, replaced: false };
  }
  yield { text: decoder.decode(), last: true, replaced: false };
}

interface Reader {
  /** Takes rows of cells; what is wrong with them, or null. */
  readonly take: (cells: readonly (readonly string[])[]) => string | null;
  /** Null where rows are wanting. */
  readonly finish: () => KeptRows | null;
}

interface Builder {
  readonly set: (row: number, cell: string) => void;
  readonly column: Column;
}

function startReading(record: StudyRecord): Reader {
  const n = record.data.rows_used;
  const lines = new Uint32Array(n);
  const hasIds = record.data.variables.some((variable) => variable.used_as.includes('row identity'));
  const ids = hasIds ? new Array<string>(n).fill('') : null;
  const variables = new Map(record.data.variables.map((variable) => [variable.name, variable]));
  const first = hasIds ? 2 : 1;
  let builders: Builder[] | null = null;
  let count = 0;
  return {
    take(cells) {
      for (const row of cells) {
        if (builders === null) {
          const named = row.slice(first).map((cell) => variables.get(unguardedText(cell)));
          if (row[0] !== 'row' || named.includes(undefined)) {
            return 'The rows kept with this record name variables that it does not have.';
          }
          builders = named.map((variable) => builderOf(variable!, n));
          continue;
        }
        if (row.length !== first + builders.length || count === n) {
          return 'The rows kept with this record are not as the record describes them.';
        }
        lines[count] = Number(row[0]);
        if (ids !== null) ids[count] = unguardedText(row[1]!);
        for (let j = 0; j < builders.length; j++) builders[j]!.set(count, row[first + j]!);
        count++;
      }
      return null;
    },
    finish() {
      if (count !== n || builders === null) return null;
      return {
        rowCount: n,
        lines,
        ids,
        columns: new Map(builders.map(({ column }) => [column.name, column])),
      };
    },
  };
}

function builderOf(variable: RecordVariable, n: number): Builder {
  const { name, type } = variable;
  switch (type) {
    case 'category':
      return categoryBuilder(variable, n);
    case 'text':
    case 'identifier': {
      const values = new Array<string | null>(n).fill(null);
      return {
        column: { kind: 'text', name, values },
        set: (row, cell) => {
          values[row] = cell === '' ? null : unguardedText(cell);
        },
      };
    }
    default: {
      const values = new Float64Array(n);
      const texts = variable.levels?.map(({ level }) => level) ?? [];
      const flag = type === 'flag' && texts.length === 2;
      return {
        column: {
          kind: type === 'date' ? 'date' : type === 'flag' ? 'flag' : 'number',
          name,
          values,
          ...(flag ? { flagTexts: [texts[0]!, texts[1]!] as const } : {}),
        },
        set: (row, cell) => {
          const value = readPlainNumber(cell, 46);
          values[row] = Number.isNaN(value) && cell !== '' ? Number(cell) : value;
        },
      };
    }
  }
}

/** Levels in the record's order, which begins with the baseline. */
function categoryBuilder({ name, levels: described }: RecordVariable, n: number): Builder {
  const codes = new Int32Array(n);
  const levels = (described ?? []).map(({ level }) => level);
  const known = new Map(levels.map((level, code) => [level, code]));
  return {
    column: { kind: 'category', name, codes, levels, baseline: levels[0] ?? '' },
    set: (row, cell) => {
      if (cell === '') {
        codes[row] = -1;
        return;
      }
      const level = unguardedText(cell);
      let code = known.get(level);
      if (code === undefined) {
        code = levels.push(level) - 1;
        known.set(level, code);
      }
      codes[row] = code;
    },
  };
}
