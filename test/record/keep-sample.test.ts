import { mkdtemp, readFile, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { gunzipSync, gzipSync } from 'node:zlib';
import fc from 'fast-check';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import type { Column } from '../../src/data/table.ts';
import type { Sample } from '../../src/prepare/sample.ts';
import type { Problem } from '../../src/problem.ts';
import { keepSample } from '../../src/record/keep-sample.ts';
import { quotedCell, unguardedText } from '../../src/record/quoted-cell.ts';
import { readSample } from '../../src/record/read-sample.ts';
import type { RecordVariable, StudyRecord } from '../../src/record/record.ts';
import type { Study, VariablePlan, VariableType } from '../../src/study/study.ts';

let folder: string;
beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'plumbrule-sample-'));
});
afterAll(() => rm(folder, { recursive: true }));

interface Kept {
  readonly ids: readonly string[] | null;
  readonly numbers: readonly number[];
  readonly dates: readonly number[];
  readonly levels: readonly (string | null)[];
  readonly texts: readonly (string | null)[];
}

/** A study and sample of one column of each kind, as much of them as is kept. */
function sampleOf({ ids, numbers, dates, levels, texts }: Kept): {
  study: Study;
  sample: Sample;
  types: Map<string, VariableType>;
} {
  const names = [...new Set(levels.filter((level) => level !== null))];
  const columns: Column[] = [
    { kind: 'number', name: 'size, "in" t', values: Float64Array.from(numbers) },
    { kind: 'date', name: 'day', values: Float64Array.from(dates) },
    {
      kind: 'category',
      name: '=kind',
      levels: names,
      baseline: names[0] ?? '',
      codes: Int32Array.from(levels, (level) => (level === null ? -1 : names.indexOf(level))),
    },
    { kind: 'text', name: 'note', values: [...texts] },
    { kind: 'flag', name: 'open', values: Float64Array.from(numbers, (x) => (x > 0 ? 1 : 0)) },
  ];
  const types = new Map<string, VariableType>(
    columns.map(({ name, kind }) => [name, kind === 'number' ? 'number' : kind] as const),
  );
  const n = numbers.length;
  const sample = {
    rowCount: n,
    lines: Uint32Array.from({ length: n }, (_, i) => i + 2),
    ids,
    columns: new Map(columns.map((column) => [column.name, column])),
  } as unknown as Sample;
  const study = {
    data: { variables: columns.map(({ name }) => ({ name }) as VariablePlan) },
  } as unknown as Study;
  return { study, sample, types };
}

function recordOf(
  types: ReadonlyMap<string, VariableType>,
  rows: number,
  hasIds: boolean,
  sample: { file: string; sha256: string } | null,
): StudyRecord {
  const variables = [...types].map(([name, type]) => ({ name, type, levels: null, used_as: [] as string[] }));
  const id = { name: 'the id', type: 'identifier', levels: null, used_as: ['row identity'] };
  return {
    data: {
      rows_used: rows,
      sample,
      variables: [...variables, ...(hasIds ? [id] : [])] as unknown as RecordVariable[],
    },
  } as StudyRecord;
}

async function readBack(bytes: Uint8Array, record: StudyRecord) {
  await writeFile(join(folder, 'sample.csv.gz'), bytes);
  const problems: Problem[] = [];
  const rows = await readSample(join(folder, 'record.json'), record, (problem) => problems.push(problem));
  return { rows, problems };
}

const word = fc.string({ unit: 'grapheme', minLength: 1, maxLength: 12 }).filter(
  // The reader of data takes line ends for what they are and trims; such texts cannot come from it.
  (text) => text.trim() === text && !/[\0\r]/.test(text),
);
const number = fc.oneof(
  fc.double({ noNaN: false, noDefaultInfinity: true }),
  fc.integer(),
  fc.integer({ min: -1e9, max: 1e9 }).map((x) => x / 1000),
  fc.constantFrom(-0, 0, 5e-324, Number.MAX_VALUE, 1e15, 123456789012345.6, 0.1 + 0.2, 1e-7),
);

describe('the rows used', () => {
  test('come back as they were, to the last bit, and always as the same bytes', async () => {
    const rows = fc.array(
      fc.record({ id: word, number, date: number, level: fc.option(word), text: fc.option(word) }),
      { minLength: 1, maxLength: 30 },
    );
    await fc.assert(
      fc.asyncProperty(rows, fc.boolean(), async (all, hasIds) => {
        const { study, sample, types } = sampleOf({
          ids: hasIds ? all.map(({ id }) => id) : null,
          numbers: all.map(({ number: x }) => x),
          dates: all.map(({ date }) => date),
          levels: all.map(({ level }) => level),
          texts: all.map(({ text }) => text),
        });
        const kept = await keepSample(study, sample);
        const bytes = Buffer.concat(kept.content);
        expect(Buffer.concat((await keepSample(study, sample)).content).equals(bytes)).toBe(true);
        // Bytes 4 to 7 of a gzip file are its time (RFC 1952).
        expect([...bytes.subarray(4, 8)]).toEqual([0, 0, 0, 0]);
        const { rows: back, problems } = await readBack(bytes, recordOf(types, all.length, hasIds, kept));
        expect(problems).toEqual([]);
        expect([...back!.lines]).toEqual([...sample.lines]);
        expect(back!.ids).toEqual(sample.ids);
        for (const [name, column] of sample.columns) {
          const found = back!.columns.get(name)!;
          expect(found.kind).toBe(column.kind);
          if (column.kind === 'category' && found.kind === 'category') {
            const text = ({ levels, codes }: typeof column) => [...codes].map((code) => levels[code] ?? null);
            expect(text(found)).toEqual(text(column));
          } else if (column.kind === 'text') expect((found as typeof column).values).toEqual(column.values);
          else {
            const values = (found as { values: Float64Array }).values;
            column.kind !== 'category' &&
              column.values.forEach((value, i) => {
                expect(Object.is(values[i], value), `${value} became ${values[i]}`).toBe(true);
              });
          }
        }
      }),
      { numRuns: 60 },
    );
  });

  test('numbers are written as short as they can be', async () => {
    const numbers = [1, 2.5, -0.25, 1000, Number.NaN, 1234567.125, 0];
    const { study, sample } = sampleOf({
      ids: null,
      numbers,
      dates: numbers.map(() => 19968.527777777777),
      levels: numbers.map(() => 'a'),
      texts: numbers.map(() => null),
    });
    const lines = gunzipSync(Buffer.concat((await keepSample(study, sample)).content))
      .toString()
      .split('\n');
    expect(lines[0]).toBe(`row,"size, ""in"" t",day,'=kind,note,open`);
    expect(lines.slice(1, -1).map((line) => line.split(',')[1])).toEqual(
      numbers.map((x) => (Number.isNaN(x) ? '' : String(x))),
    );
    expect(lines[1]).toBe('2,1,19968.527777777777,a,,1');
  });

  test('texts that look like formulas are guarded, and told from those that begin with an apostrophe', () => {
    for (const text of ['=1+1', "'=1", "''-x", "'", '@a', 'plain', "it's", '-', '+44', '\ttab']) {
      const cell = quotedCell(text);
      expect(/^"?[=+\-@\t\r]/.test(cell), cell).toBe(false);
      const bare = cell.startsWith('"') ? cell.slice(1, -1).replaceAll('""', '"') : cell;
      expect(unguardedText(bare)).toBe(text);
    }
  });
});

describe('rows that cannot be read back', () => {
  const { study, sample, types } = sampleOf({
    ids: null,
    numbers: [1, 2, 3],
    dates: [1, 2, 3],
    levels: ['a', 'b', 'a'],
    texts: [null, 'x', null],
  });

  async function refused(change: (text: string) => Uint8Array | string) {
    const kept = await keepSample(study, sample);
    const text = gunzipSync(Buffer.concat(kept.content)).toString();
    const made = change(text);
    const bytes = typeof made === 'string' ? gzipSync(made) : made;
    const { rows, problems } = await readBack(bytes, recordOf(types, 3, false, kept));
    expect(rows).toBeNull();
    expect(problems.map(({ code, severity }) => [code, severity])).toEqual([['sample_unreadable', 'error']]);
    return problems[0]!.message;
  }

  test('an edited value, a row more or less, another column', async () => {
    expect(await refused((text) => text.replace('2,1,', '2,9,'))).toMatch(/their hash is another/);
    expect(await refused((text) => `${text}5,1,1,a,,1\n`)).toMatch(/not as the record describes them/);
    expect(await refused((text) => `${text.split('\n').slice(0, 3).join('\n')}\n`)).toMatch(
      /hash is another/,
    );
    expect(await refused((text) => text.replace('note', 'nota'))).toMatch(
      /name variables that it does not have/,
    );
  });

  test('a truncated file, one that is no gzip, an open quote, bytes that are no UTF-8', async () => {
    expect(await refused((text) => gzipSync(text).subarray(0, 40))).toMatch(/the file is damaged/);
    expect(await refused(() => Buffer.from('row,a\n1,2\n'))).toMatch(/the file is damaged/);
    expect(await refused((text) => `${text}5,"1`)).toMatch(/cannot be read as a table/);
    expect(await refused(() => gzipSync(Buffer.from([114, 111, 119, 0xff, 0xfe])))).toMatch(/damaged/);
  });

  test('a folder in its place', async () => {
    const record = recordOf(types, 3, false, { file: '.', sha256: 'a'.repeat(64) });
    const problems: Problem[] = [];
    expect(
      await readSample(join(folder, 'record.json'), record, (problem) => problems.push(problem)),
    ).toBeNull();
    expect(problems[0]).toMatchObject({ code: 'sample_unreadable', severity: 'error' });
  });

  test('that they were declined, or have gone, is a warning', async () => {
    for (const [kept, message] of [
      [null, /^No rows were kept with this record/],
      [{ file: 'gone.csv.gz', sha256: 'a'.repeat(64) }, /^The rows kept with this record are not there/],
    ] as const) {
      const problems: Problem[] = [];
      const record = recordOf(types, 3, false, kept);
      expect(await readSample(join(folder, 'record.json'), record, (p) => problems.push(p))).toBeNull();
      expect(problems).toHaveLength(1);
      expect(problems[0]).toMatchObject({ code: 'sample_unreadable', severity: 'warning' });
      expect(problems[0]!.message).toMatch(message);
    }
  });

  test('the file is named beside the record', async () => {
    const kept = await keepSample(study, sample);
    await readBack(Buffer.concat(kept.content), recordOf(types, 3, false, kept));
    expect(kept.file).toBe('sample.csv.gz');
    expect((await readFile(join(folder, kept.file))).length).toBeGreaterThan(20);
  });
});
