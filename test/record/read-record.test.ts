import { chmod, mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import fc from 'fast-check';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import type { Problem } from '../../src/problem.ts';
import { findJsonFault } from '../../src/record/json-fault.ts';
import { readRecord } from '../../src/record/read-record.ts';
import type { StudyRecord } from '../../src/record/record.ts';
import { recordText } from '../../src/record/record-text.ts';
import { smallRecord } from './small-record.ts';

let folder: string;
beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'plumbrule-record-'));
});
afterAll(() => rm(folder, { recursive: true }));

async function read(content: string | Uint8Array) {
  const path = join(folder, 'record.json');
  await writeFile(path, content);
  return readPath(path);
}

async function readPath(path: string) {
  const problems: Problem[] = [];
  const record = await readRecord(path, (problem) => problems.push(problem));
  expect(problems.every((problem) => problem.code === 'record_unreadable')).toBe(true);
  expect(record === null).toBe(problems.length > 0);
  return { record, problems, messages: problems.map((problem) => problem.message) };
}

describe('readRecord', () => {
  test('gives back what was written', async () => {
    const { record } = await read(recordText(smallRecord()));
    expect(record).toEqual(smallRecord());
  });

  test('passes over keys of a later version, at the top and within', async () => {
    const later = { ...smallRecord(), novelty: 1, model: { ...smallRecord().model, novelty: [1] } };
    expect((await read(JSON.stringify(later))).record).not.toBeNull();
  });

  test('a file that is not there, a folder, one that may not be read', async () => {
    expect((await readPath(join(folder, 'none.json'))).messages).toEqual([
      'The record cannot be read: there is no such file.',
    ]);
    expect((await readPath(folder)).messages).toEqual(['The record cannot be read: it is a folder.']);
    const path = join(folder, 'closed.json');
    await writeFile(path, '{}');
    await chmod(path, 0);
    // The superuser may read everything, so there the file is found not to be a record instead.
    const expected = process.getuid?.() === 0 ? /not a record/ : /permission is denied/;
    expect((await readPath(path)).messages[0]).toMatch(expected);
  });

  test('not UTF-8, not JSON (with line and column), not a record', async () => {
    expect((await read(Uint8Array.of(0x22, 0xff, 0x22))).messages).toEqual(['The record is not UTF-8 text.']);
    const broken = await read('{\n  "format": "plumbrule-record/1",\n  "tool" {}\n}');
    expect(broken.problems[0]).toMatchObject({
      place: { kind: 'source', line: 3, column: 10 },
      message: 'The record is not JSON: a colon was expected after the key.',
    });
    expect((await read('')).messages[0]).toMatch(/the text ends where a value was expected/);
    for (const text of ['[]', 'null', '"plumbrule-record/1"', '{"format": 1}', '{"format": "other"}']) {
      expect((await read(text)).messages, text).toEqual([
        'This is not a record: it has no "format": "plumbrule-record/1".',
      ]);
    }
  });

  test('a version that is not read', async () => {
    const { problems } = await read(JSON.stringify({ ...smallRecord(), format: 'plumbrule-record/2' }));
    expect(problems[0]?.message).toBe(
      'The record has format "plumbrule-record/2"; this version reads "plumbrule-record/1".',
    );
  });

  test('says where it is not as the schema says', async () => {
    const bad = JSON.parse(recordText(smallRecord()));
    bad.candidates[0].rows = 1.5;
    bad.model.degrees_of_freedom = '2';
    bad.selection.rank_by = 'luck';
    bad.tool.name = 'other';
    delete bad.warnings;
    expect((await read(JSON.stringify(bad))).messages.sort()).toEqual([
      'The record has no warnings.',
      'candidates[0].rows must be integer.',
      'model.degrees_of_freedom must be integer.',
      'selection.rank_by must be one of "adjusted_r_squared", "aic", "aicc", "bic", "mallows_cp", "press", "cross_validation", "partial_f".',
      'tool.name must be "plumbrule".',
    ]);
    const { messages } = await read('{"format": "plumbrule-record/1"}');
    expect(messages).toHaveLength(11);
    expect(messages[10]).toMatch(/^\d+ more faults of this record are not listed\.$/);
  });

  test.each<[string, (record: StudyRecord) => void, string]>([
    [
      'a choice that is no candidate',
      (record) => {
        record.selection.chosen = 'Bent';
        if (record.model !== null) record.model.candidate = 'Bent';
      },
      'selection.chosen names "Bent", which is no candidate.',
    ],
    [
      'a ranking of what is no candidate',
      (record) =>
        record.selection.ranking.push({ rank: 2, candidate: 'Bent', value: null, difference: null }),
      'selection.ranking names "Bent", which is no candidate.',
    ],
    [
      'a model that was not chosen',
      (record) => {
        record.selection.chosen = null;
      },
      'model is not that of selection.chosen.',
    ],
    [
      'a model without its examination',
      (record) => {
        record.examination = null;
      },
      'model and examination must both be there, or neither.',
    ],
    [
      'an inverse of another size',
      (record) => record.model?.inverse[1]?.push(1),
      'model.inverse must be 2 × 2, as model.columns.',
    ],
    [
      'points of unequal number',
      (record) => record.examination?.points.leverage.pop(),
      'examination.points has lists of unequal length.',
    ],
    [
      'a curve of unequal lists',
      (record) =>
        record.model?.terms.push({
          name: 'x',
          kind: 'number',
          variables: ['x'],
          columns: ['x'],
          joint_f: null,
          generalised_vif: null,
          generalised_vif_per_column: null,
          typical_steps: [],
          curve: { variable: 'x', x: [1], y: [1, 2], lower: [], upper: [] },
          slopes: [],
          slopes_omitted: 0,
        }),
      'The curve of term "x" has lists of unequal length.',
    ],
  ])('parts that contradict each other: %s', async (_what, spoil, message) => {
    const record = smallRecord();
    spoil(record);
    expect((await read(JSON.stringify(record))).messages).toEqual([message]);
  });
});

describe('findJsonFault', () => {
  test('finds a fault exactly where JSON.parse refuses', () => {
    const spoilt = fc
      .tuple(
        fc.json({ maxDepth: 4 }),
        fc.nat(),
        fc.constantFrom('', '{', ']', ',', '"', ':', '01', '\n', '\\', 'x'),
      )
      .map(([text, at, piece]) => {
        const place = at % (text.length + 1);
        return text.slice(0, place) + piece + text.slice(place + (at % 2));
      });
    fc.assert(
      fc.property(spoilt, (text) => {
        let refused = false;
        try {
          JSON.parse(text);
        } catch {
          refused = true;
        }
        expect(findJsonFault(text) !== null, text).toBe(refused);
      }),
      { numRuns: 2000 },
    );
  });

  test.each([
    ['[1, 2,\n 3 4]', 2, 4, 'a comma or "]" was expected'],
    ['{"a": 1,\n}', 2, 1, 'a key in double quotes was expected'],
    ['{"a": }', 1, 7, 'a value was expected'],
    ['{} {}', 1, 4, 'nothing more was expected after the value'],
    ['["a\n"]', 1, 2, 'a text in double quotes is not closed or has a character that is not allowed in it'],
    ['[NaN]', 1, 2, 'a value or "]" was expected'],
    ['{a: 1}', 1, 2, 'a key in double quotes or "}" was expected'],
    ['[[1]', 1, 5, 'the text ends where a comma or "]" was expected'],
  ])('%j', (text, line, column, message) => {
    expect(findJsonFault(text)).toEqual({ line, column, message });
  });

  test('nesting does not exhaust the stack', () => {
    expect(findJsonFault('['.repeat(1_000_000))).toMatchObject({ line: 1, column: 1_000_001 });
  });
});
