import { createHash } from 'node:crypto';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Problem } from '../../src/problem.ts';
import { readStudy } from '../../src/study/read-study.ts';
import { SMALL } from './sample.ts';

let folder = '';
beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), 'plumbrule-study-'));
});
afterAll(() => {
  rmSync(folder, { recursive: true });
});

async function readBytes(bytes: string | Uint8Array) {
  const path = join(folder, 'study.yaml');
  writeFileSync(path, bytes);
  return { path, ...(await readPath(path)) };
}

async function readPath(path: string) {
  const problems: Problem[] = [];
  const study = await readStudy(path, (problem) => problems.push(problem));
  return { study, problems };
}

describe('readStudy', () => {
  it('reads a file, and hashes its bytes', async () => {
    const { study, problems } = await readBytes(SMALL);
    expect(problems).toEqual([]);
    expect(study).toMatchObject({ file: 'study.yaml', folder });
    expect(study!.sha256).toBe(createHash('sha256').update(SMALL).digest('hex'));
  });

  it.each([
    ['a file that is not there', 'none.yaml', 'There is no such study file.'],
    ['a folder', '.', 'The study file is a folder.'],
  ])('cannot read %s', async (_, name, message) => {
    const { study, problems } = await readPath(join(folder, name));
    expect(study).toBeNull();
    expect(problems).toMatchObject([{ code: 'study_unreadable', place: { kind: 'file' }, message }]);
  });

  it('cannot read an empty file, nor one that is far too large', async () => {
    expect((await readBytes('')).problems).toMatchObject([
      { code: 'study_unreadable', message: 'The study file is empty.' },
    ]);
    expect((await readBytes('a,b\n'.repeat(600_000))).problems).toMatchObject([
      {
        code: 'study_unreadable',
        message: 'The study file has 2.4 MB; the most is 2 MB.',
        hint: 'Is this the data file?',
      },
    ]);
  });

  it('knows a record, however large', async () => {
    for (const padding of [0, 2_100_000]) {
      const record = `{\n  "format": "plumbrule-record/1",\n  "filler": "${'x'.repeat(padding)}"\n}\n`;
      const { study, problems } = await readBytes(record);
      expect(study).toBeNull();
      expect(problems).toMatchObject([
        { code: 'study_unreadable', message: 'This is a record, not a study.' },
      ]);
      expect(problems[0]!.hint).toContain('plumbrule render');
    }
  });

  it('says where a file stops being UTF-8', async () => {
    const latin = Buffer.from('plumbrule: 1\ntitle: Für alle é\n', 'latin1');
    const { path, study, problems } = await readBytes(latin);
    expect(study).toBeNull();
    expect(problems).toMatchObject([
      { code: 'study_not_utf8', place: { kind: 'source', file: path, line: 2, column: 9, length: 1 } },
    ]);
    const cut = Buffer.from('a: é').subarray(0, 4);
    expect((await readBytes(cut)).problems).toMatchObject([
      { code: 'study_not_utf8', place: { line: 1, column: 4 } },
    ]);
    const wide = Buffer.from('\ufeffa: 1', 'utf16le');
    expect((await readBytes(wide)).problems).toMatchObject([
      { code: 'study_not_utf8', place: { line: 1, column: 1 } },
    ]);
  });
});
