import {
  cpSync,
  existsSync,
  mkdirSync,
  mkdtempSync,
  readdirSync,
  rmSync,
  utimesSync,
  writeFileSync,
} from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { afterAll, beforeAll, describe, expect, test, vi } from 'vitest';
import type { Problem } from '../../src/problem.ts';
import { takeTurn } from '../../src/record/folder-turn.ts';
import { readRecord } from '../../src/record/read-record.ts';
import { recordText } from '../../src/record/record-text.ts';
import { RESULT_FILES, writeResults } from '../../src/record/write-results.ts';
import { randomFrom } from '../../src/stats/random.ts';
import { plumbrule } from '../cli/in-folder.ts';
import { atRisk, forgotten, hidden, inPairs, type RunTasks, shown } from './at-risk.ts';
import type { Outcome, Task } from './run-at-risk.ts';
import { smallRecord } from './small-record.ts';

type Texts = { readonly [name: string]: string };

let home: string;
let runAll: RunTasks;
/** Of results that are written over earlier ones: the folder before each step. They are not to be changed. */
let states: readonly string[];
let count = 0;
beforeAll(async () => {
  home = mkdtempSync(join(tmpdir(), 'plumbrule-at-risk-'));
  runAll = await atRisk(home);
  const folder = folderWith(OLD);
  states = await statesOf(writing(folder), folder);
}, 60_000);
afterAll(() => rmSync(home, { recursive: true }), 60_000);

const FOREIGN: Texts = { 'notes.txt': 'mine', 'tables/notes.txt': 'mine too' };

function record(title: string): string {
  return recordText({ ...smallRecord(), study: { ...smallRecord().study, title } });
}

/** Files of one run: those of its own, and one text for all but the record. */
function generation(title: string, names: readonly string[]): Texts {
  return Object.fromEntries(
    names.map((name) => [name, name === 'record.json' ? record(title) : `${title} ${name}`]),
  );
}

const OLD = generation('old', [
  'report.html',
  'report.md',
  'tables/candidates.csv',
  'tables/residuals.csv',
  'comparison.html',
  'sample.csv.gz',
  'record.json',
]);
const FRESH = generation('new', [
  'record.json',
  'report.html',
  'tables/candidates.csv',
  'tables/predictions.csv',
  'sample.csv.gz',
]);
const OTHER = generation('other', ['record.json', 'report.md', 'tables/candidates.csv', 'comparison.md']);

/** A folder with these files and some of someone else's. */
function folderWith(files: Texts): string {
  const folder = join(home, String(count++), 'results');
  for (const [name, text] of Object.entries({ ...files, ...FOREIGN })) {
    mkdirSync(dirname(join(folder, name)), { recursive: true });
    writeFileSync(join(folder, name), text);
  }
  return folder;
}

function writing(folder: string, files: Texts = FRESH): Task {
  return { what: 'write', folders: [folder], files, obsolete: RESULT_FILES };
}

/** Our files in a folder, after making sure that those of others are as they were. */
function ours(folder: string): Texts {
  const all = shown(folder);
  for (const [name, text] of Object.entries(FOREIGN)) {
    expect(all[name], name).toBe(text);
    delete all[name];
  }
  return all;
}

/** Which run's results lie in a folder: the whole of one's, or a part. */
function lyingIn(folder: string, ...runs: readonly Texts[]): { readonly of: Texts; readonly whole: boolean } {
  const found = ours(folder);
  const names = Object.keys(found);
  const of = runs.find((files) => names.every((name) => files[name] === found[name]));
  if (of === undefined) throw new Error(`files of several runs: ${JSON.stringify(names)}`);
  const whole = names.length === Object.keys(of).length;
  // Where there is a record there is everything that belongs to it.
  if (found['record.json'] !== undefined) expect(whole, `only ${names}`).toBe(true);
  return { of, whole };
}

async function read(folder: string) {
  const problems: Problem[] = [];
  const found = await readRecord(join(folder, 'record.json'), (problem) => problems.push(problem));
  return { title: found?.study.title ?? null, problems };
}

async function write(folder: string, files: Texts, obsolete: readonly string[] = []): Promise<Problem[]> {
  const problems: Problem[] = [];
  const list = Object.entries(files).map(([name, content]) => ({ name, content }));
  await writeResults(folder, list, (problem) => problems.push(problem), obsolete);
  return problems;
}

function copied(folder: string): string {
  const copy = join(home, String(count++), 'results');
  cpSync(folder, copy, { recursive: true, preserveTimestamps: true });
  return copy;
}

/** What the next run, and what the next reader find after a kill; both see the same results. */
async function recovered(folder: string): Promise<Texts> {
  forgotten(folder);
  const copy = copied(folder);

  const { title, problems } = await read(copy);
  expect(problems).toEqual([]);
  const readAgain = lyingIn(copy, OLD, FRESH);
  expect(readAgain.whole).toBe(true);
  expect(title).toBe(readAgain.of === OLD ? 'old' : 'new');

  // A reader has no need to tidy up where nothing was being moved; the next run does.
  expect(await write(folder, { 'later.txt': 'later' })).toEqual([]);
  const { 'later.txt': later, ...rest } = ours(folder);
  expect(later).toBe('later');
  expect(rest).toEqual(readAgain.of);
  expect(hidden(folder)).toEqual([]);
  return readAgain.of;
}

async function run(task: Task): Promise<Outcome | null> {
  return (await runAll([task]))?.[0] ?? null;
}

function upTo(steps: number): number[] {
  return Array.from({ length: steps }, (_, k) => k + 1);
}

/** Does a task once to its end and gives, for each of its steps, a folder as it was before that step. */
async function statesOf(task: Task, from: string): Promise<string[]> {
  const to = join(home, String(count++));
  const outcome = await run({ ...task, keep: { from, to } });
  expect(outcome).toMatchObject({ done: true, problems: [] });
  return upTo(outcome!.steps).map((step) => join(to, String(step)));
}

function markerIn(folder: string): boolean {
  return hidden(folder).some((name) => existsSync(join(folder, name, 'forward.json')));
}

/** All names in a folder, with one in place of what is random in them. */
function namesIn(folder: string): string[] {
  const names = readdirSync(folder, { recursive: true, encoding: 'utf8' });
  return names.map((name) => name.replace(/[0-9a-f]{8}-[-0-9a-f]{27}/, '…')).sort();
}

describe('a run that is killed', () => {
  test('before any of its steps, over earlier results', async () => {
    // More than one for each file that is written, each that is moved aside and each that is moved in.
    expect(states.length).toBeGreaterThan(20);
    const after: Texts[] = [];
    for (const state of states) {
      lyingIn(state, OLD, FRESH);
      after.push(await recovered(copied(state)));
    }
    // Old results up to a step, new ones from there on.
    const decided = after.indexOf(FRESH);
    expect(decided).toBeGreaterThan(0);
    expect(after.map((files) => files === FRESH)).toEqual(states.map((_, step) => step >= decided));
  });

  test('leaves the disk as it was before that step', async () => {
    const first = Math.floor(states.length / 3);
    await inPairs(
      upTo(12).map((k) => first + 3 * k),
      async (kill) => {
        const folder = folderWith(OLD);
        expect(await run({ ...writing(folder), kill })).toBeNull();
        const state = states[kill - 1]!;
        expect(namesIn(folder), `killed before step ${kill}`).toEqual(namesIn(state));
        expect(ours(folder)).toEqual(ours(state));
        await recovered(folder);
      },
    );
  });

  test('before any of its steps, into a new folder', async () => {
    const above = join(home, String(count++));
    for (const state of await statesOf(writing(join(above, 'deep/results')), above)) {
      const folder = join(state, 'deep/results');
      if (existsSync(folder)) expect(shown(folder)).toEqual(FRESH);
      if (existsSync(dirname(folder))) forgotten(dirname(folder));
      expect(await write(folder, OTHER, RESULT_FILES)).toEqual([]);
      expect(shown(folder)).toEqual(OTHER);
      expect([...hidden(folder), ...hidden(dirname(folder))]).toEqual([]);
    }
  });

  test('and another that is killed before any step of finishing its move', async () => {
    const begun = states.filter((state) => markerIn(state));
    let steps = 0;
    // A move that is only decided, one on its way, and one that is as good as over.
    for (const share of [0, 1 / 2, 1]) {
      const folder = copied(begun[Math.round(share * (begun.length - 1))]!);
      forgotten(folder);
      for (const state of await statesOf({ what: 'finish', folders: [folder] }, folder)) {
        lyingIn(state, OLD, FRESH);
        expect(await recovered(state)).toEqual(FRESH);
        steps++;
      }
    }
    expect(steps).toBeGreaterThan(30);
  });

  test('at random moments of writing one run after the other', { timeout: 120_000 }, async () => {
    const random = randomFrom(20_261_201);
    const found = new Set<Texts>();
    await inPairs(upTo(24), async () => {
      const folder = folderWith(OLD);
      const folders = Array.from({ length: 10_000 }, () => folder);
      const wait = 30 * random.next();
      let begun: number | null = null;
      const killed = await runAll([{ ...writing(folder), folders, inTurnWith: OLD }], () => {
        if (begun === null && hidden(folder).length > 0) begun = performance.now();
        return begun !== null && performance.now() - begun > wait;
      });
      expect(killed).toBeNull();
      lyingIn(folder, OLD, FRESH);
      found.add(await recovered(folder));
    });
    expect(found.size).toBe(2);
  });

  test('what was hidden less than an hour ago may be in use, and is left alone', async () => {
    const folder = folderWith(OLD);
    await run({ ...writing(folder), kill: 8 });
    expect(await write(folder, OTHER)).toEqual([]);
    expect(hidden(folder)).toHaveLength(1);
    forgotten(folder);
    expect(await write(folder, OTHER)).toEqual([]);
    expect(hidden(folder)).toEqual([]);
  });
});

describe('a file system that refuses', () => {
  test('at any step: all of the earlier results, or all of the new ones', async () => {
    const folders = states.map(() => folderWith(OLD));
    const outcomes = (await runAll(folders.map((folder, k) => ({ ...writing(folder), fail: k + 1 }))))!;
    for (const [k, folder] of folders.entries()) {
      const { done, problems } = outcomes[k]!;
      expect(problems).toHaveLength(done ? 0 : 1);
      expect(ours(folder), `refused at step ${k + 1}`).toEqual(done ? FRESH : OLD);
      for (const problem of problems) {
        expect(problem).toMatch(
          /^The results cannot be written to ".*": the system says EIO\. Earlier .* untouched\.$/,
        );
      }
      forgotten(folder);
      await write(folder, { 'later.txt': 'later' });
      expect(hidden(folder)).toEqual([]);
    }
    expect(new Set(outcomes.map(({ done }) => done)).size).toBe(2);
  });

  test('and a kill before any step of moving back', async () => {
    // The record is moved in last, so that refusing it takes the longest way back.
    const whole = states.findIndex(
      (state, k) => k > 0 && ours(state)['record.json'] === FRESH['record.json'],
    );
    const folder = folderWith(OLD);
    const to = join(home, String(count++));
    const outcome = (await run({ ...writing(folder), fail: whole, keep: { from: folder, to } }))!;
    expect(outcome.done).toBe(false);
    expect(ours(folder)).toEqual(OLD);
    expect(outcome.steps - whole).toBeGreaterThan(10);
    for (const step of upTo(outcome.steps).slice(whole)) {
      const state = join(to, String(step));
      lyingIn(state, OLD, FRESH);
      // Until the way back is marked, the way is forward.
      expect(await recovered(state)).toEqual(step === whole + 1 ? FRESH : OLD);
    }
  });

  test('a move that cannot be finished is told by readers and by runs, and finished when it can be', async () => {
    const folder = copied(states.findLast((state) => Object.keys(ours(state)).length === 0)!);
    forgotten(folder);
    mkdirSync(join(folder, 'report.html'));
    const stuck =
      /a run ended while it moved its files in, and its move cannot be finished: a folder stands where one of the files belongs; the files are in ".*\.plumbrule-/;
    const { title, problems } = await read(folder);
    expect(title).toBeNull();
    expect(problems[0]?.code).toBe('record_unreadable');
    expect(problems[0]?.message).toMatch(stuck);
    const [refused] = await write(folder, OTHER, RESULT_FILES);
    expect(refused?.code).toBe('output_unwritable');
    expect(refused?.message).toMatch(stuck);
    rmSync(join(folder, 'report.html'), { recursive: true });
    expect(await read(folder)).toEqual({ title: 'new', problems: [] });
    expect(ours(folder)).toEqual(FRESH);
    expect(hidden(folder)).toEqual([]);
  });

  test.each([
    '{"coming": ["../../outside"], "gone": []}',
    '{"coming": [], "gone": ["/etc/outside"]}',
    '{"co',
    '{}',
  ])('a list of files that no run of ours can have written is not followed: %s', async (list) => {
    const folder = folderWith({});
    const staging = join(folder, '.plumbrule-00000000');
    mkdirSync(join(staging, 'new'), { recursive: true });
    writeFileSync(join(staging, 'forward.json'), list);
    const { problems } = await read(folder);
    expect(problems[0]?.message).toContain('its list of files is damaged');
  });
});

describe('runs at once', () => {
  test.each([2, 4])('%i into one folder, again and again, leave the whole of one', async (runs) => {
    const rounds = 12;
    const folders = upTo(rounds).map((round) =>
      round % 3 === 0 ? join(home, `crowd-${runs}-${round}`, 'results') : folderWith(OLD),
    );
    const begin = Date.now() + 400;
    const all = [FRESH, OTHER, generation('third', [...RESULT_FILES]), generation('fourth', ['record.json'])];
    const outcomes = await Promise.all(
      all.slice(0, runs).map((files) => run({ ...writing(folders[0]!, files), folders, begin, every: 40 })),
    );
    for (const outcome of outcomes) expect(outcome).toMatchObject({ done: true, problems: [] });
    for (const [index, folder] of folders.entries()) {
      if ((index + 1) % 3 === 0)
        for (const [name, text] of Object.entries(FOREIGN)) {
          mkdirSync(dirname(join(folder, name)), { recursive: true });
          writeFileSync(join(folder, name), text);
        }
      expect(lyingIn(folder, ...all).whole).toBe(true);
      expect([...hidden(folder), ...hidden(dirname(folder))]).toEqual([]);
    }
  });

  test('one that is stopped for a minute at any step, while another goes past it', {
    timeout: 120_000,
  }, async () => {
    const last = new Set<Texts>();
    // From a little before its turn on.
    const first = states.findIndex((state) => hidden(state).some((name) => name.includes('lock')));
    const steps = upTo(states.length).slice(first - 2);
    const folders = steps.map(() => folderWith(OLD));
    const tasks = steps.map((at, k) => {
      const folder = folders[k]!;
      return { ...writing(folder), stop: { at, other: writing(folder, OTHER) } };
    });
    const outcomes = (await runAll(tasks))!;
    for (const [k, folder] of folders.entries()) {
      expect(outcomes[k], `stopped before step ${steps[k]}`).toMatchObject({ done: true, problems: [] });
      const { of, whole } = lyingIn(folder, FRESH, OTHER);
      expect(whole).toBe(true);
      expect(hidden(folder)).toEqual([]);
      last.add(of);
    }
    // Stopped before its turn it comes last, stopped in its turn the other does.
    expect(last.size).toBe(2);
  });

  test('never do two have their turn together, even where all find the lock of a dead run', async () => {
    const folder = folderWith({});
    const outcomes = Promise.all(
      upTo(4).map(() => run({ what: 'turns', folders: Array.from({ length: 40 }, () => folder) })),
    );
    let dead = 0;
    const leaving = setInterval(() => {
      const path = join(folder, `.plumbrule-lock-dead-${dead++}`);
      writeFileSync(path, '');
      utimesSync(path, Date.now() / 1000 - 60, Date.now() / 1000 - 60);
    }, 5);
    const found = await outcomes;
    clearInterval(leaving);
    expect(found.map((outcome) => outcome?.together)).toEqual([0, 0, 0, 0]);
    expect(dead).toBeGreaterThan(5);
  });

  test('the lock of a living run is waited for, one of a dead run is passed over and removed', async () => {
    const folder = folderWith(OLD);
    const lock = join(folder, '.plumbrule-lock-someone');
    writeFileSync(lock, '');
    let done = false;
    const written = write(folder, FRESH, RESULT_FILES).then((problems) => {
      done = true;
      return problems;
    });
    await new Promise((resolve) => setTimeout(resolve, 100));
    expect(done).toBe(false);
    expect(ours(folder)).toEqual(OLD);
    utimesSync(lock, Date.now() / 1000 - 60, Date.now() / 1000 - 60);
    expect(await written).toEqual([]);
    expect(ours(folder)).toEqual(FRESH);
    expect(hidden(folder)).toEqual([]);
  });

  test('a report is not moved in beside the record of another run that has come meanwhile', async () => {
    const folder = folderWith({ 'record.json': record('old') });
    const lock = join(folder, '.plumbrule-lock-someone');
    writeFileSync(lock, '');
    const rendered = plumbrule('render', join(folder, 'record.json'));
    // It has read the record and made the report when its hidden folder is there.
    await vi.waitFor(() => expect(hidden(folder).length).toBeGreaterThan(1), { timeout: 20_000 });
    writeFileSync(join(folder, 'record.json'), record('new'));
    rmSync(lock);
    const { status, err } = await rendered;
    expect(status).toBe(2);
    expect(err).toContain('another run has replaced the record in this folder meanwhile');
    expect(ours(folder)).toEqual({ 'record.json': record('new') });
    expect(hidden(folder)).toEqual([]);
  });

  test('a turn ends with its lock', async () => {
    const folder = folderWith({});
    const turn = await takeTurn(folder);
    expect(hidden(folder)).toHaveLength(1);
    turn.end();
    expect(hidden(folder)).toEqual([]);
  });
});
