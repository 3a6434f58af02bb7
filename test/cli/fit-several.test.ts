import { mkdtemp, readdir, readFile, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import fc from 'fast-check';
import { describe, expect, test, vi } from 'vitest';
import { findStudies } from '../../src/cli/find-studies.ts';
import { fitMany } from '../../src/cli/fit-many.ts';
import { doJob, type Job } from '../../src/cli/level-job.ts';
import { inThreads, secondsOfARun, threadsFor, threadsThatPay } from '../../src/cli/level-threads.ts';
import { safeNames } from '../../src/cli/safe-names.ts';
import { readStudyAndData } from '../../src/run/read-study-and-data.ts';
import { data, study } from '../run/small-study.ts';
import { inFolder, plumbrule } from './in-folder.ts';

/** The program itself, but for studies with "fault" in the names of their files, by which it is broken. */
vi.mock('../../src/run/read-study-and-data.ts', async (original) => {
  const run = await original<typeof import('../../src/run/read-study-and-data.ts')>();
  return {
    ...run,
    readStudyAndData: (path: string, options: Parameters<typeof run.readStudyAndData>[1]) => {
      if (path.includes('fault.study')) throw new TypeError('x is not a function');
      return run.readStudyAndData(path, options);
    },
  };
});

const KEEP = 'report: { formats: [html] }\n';
/** Repeats for k, which has the levels a, b and c. */
const repeated = study({}, `repeat_for: k\n${KEEP}`);

describe('several studies', () => {
  const files = {
    'b/study.yaml': study({ 'A small study': 'The good one' }),
    'b/data.csv': data(),
    'a/missed.study.yaml': study(
      { 'A small study': 'The one that misses' },
      'acceptance: { rows_used: { at_least: 99 } }\n',
    ),
    'a/broken.study.yaml': study({ 'response: y': 'response: q' }),
    'a/data.csv': data(),
    'a/node_modules/x/study.yaml': 'nonsense',
    'a/results/study.yaml': 'nonsense',
    'a/.git/study.yaml': 'nonsense',
    'a/studies.yaml': 'nonsense',
  };

  test('of a folder are found in order, what is no study passed over', async () => {
    await inFolder(files, async (folder) => {
      const found = await findStudies([join(folder, 'b', 'study.yaml'), folder], () => {});
      expect(found.map((path) => path.slice(folder.length + 1))).toEqual([
        'b/study.yaml',
        'a/broken.study.yaml',
        'a/missed.study.yaml',
      ]);
    });
  });

  test('go into folders of their own; none stops the others, and the worst status counts', async () => {
    await inFolder(files, async (folder) => {
      const out = join(folder, 'out');
      const junit = join(folder, 'junit.xml');
      const ran = await plumbrule('fit', folder, '--out', out, '--junit', junit);
      expect(ran.status).toBe(2);
      expect(ran.err).toContain('response names "q"');
      expect((await readdir(out)).sort()).toEqual([
        'b',
        'missed',
        'overview.csv',
        'overview.html',
        'overview.md',
      ]);
      expect(ran.out).toMatch(/Of 3\s+runs, 1 is done, 1 missed acceptance criteria and 1 failed\./);
      expect(ran.out.indexOf('broken ')).toBeLessThan(ran.out.indexOf('missed '));
      const xml = await readFile(junit, 'utf8');
      expect(xml.match(/<testsuite /g)).toHaveLength(3);
      expect(xml).toContain('tests="6" failures="1" errors="1"');

      const html = await readFile(join(out, 'overview.html'), 'utf8');
      expect(html).toContain('<a href="missed/report.html">missed</a>');
      expect(html).toContain('Wherever a candidate was chosen it is ');
      expect(html).toMatch(
        /<strong>missed<\/strong>: criteria missed\. [^<]+ is [^<]+; the study asks for at \w+ /,
      );
      expect(html.indexOf('<strong>broken</strong>')).toBeLessThan(html.indexOf('<strong>missed</strong>'));
      const markdown = await readFile(join(out, 'overview.md'), 'utf8');
      expect(markdown).toMatch(/^\| \[b\]\(b\/report\.html\) \| done \| \S+ \| 16 \|/m);
      const [header, ...rows] = (await readFile(join(out, 'overview.csv'), 'utf8')).trim().split('\n');
      expect(header).toContain(',estimate of x,standard error of x,');
      expect(rows.map((row) => row.split(',').slice(0, 2))).toEqual([
        ['broken', 'failed'],
        ['missed', 'criteria missed'],
        ['b', 'done'],
      ]);
      // The figures are those of the records.
      const record = JSON.parse(await readFile(join(out, 'b', 'record.json'), 'utf8'));
      const chosen = record.candidates.find(
        (each: { name: string }) => each.name === record.selection.chosen,
      );
      expect(rows[2]).toContain(`,${chosen.adjusted_r_squared},${chosen.residual_standard_error},`);

      expect((await plumbrule('fit', join(folder, 'b'), '--out', out, '--quiet')).status).toBe(0);
      const missed = join(folder, 'a', 'missed.study.yaml');
      const both = await plumbrule('fit', missed, join(folder, 'b', 'study.yaml'), '--out', out);
      expect(both.status).toBe(1);
    });
  });

  test('go on after a fault of the program', async () => {
    const more = { 'a.fault.study.yaml': study(), 'z.study.yaml': study(), 'data.csv': data() };
    await inFolder(more, async (folder) => {
      const out = join(folder, 'out');
      const ran = await plumbrule('fit', folder, '--out', out);
      expect(ran.status).toBe(3);
      expect(ran.err).toContain('x is not a function');
      expect(await readdir(out)).toContain('z');
      const runs = await fitMany([join(folder, 'a.fault.study.yaml')], out, { parameters: new Map() });
      expect(runs[0]!.problems.map(({ code }) => code)).toEqual(['run_failed']);
    });
  });

  test('a folder without one is told', async () => {
    await inFolder({ 'x.txt': '' }, async (folder) => {
      const none = await plumbrule('fit', folder);
      expect(none).toMatchObject({ status: 2, out: '' });
      expect(none.err).toContain('There is no study in the folder');
    });
  });
});

describe('a study that repeats', () => {
  const files = { 's.study.yaml': repeated, 'data.csv': data(() => {}, 60) };

  test('runs once for each level, in folders of their own, and its records come back', async () => {
    await inFolder(files, async (folder) => {
      const out = join(folder, 'out');
      const ran = await plumbrule('fit', join(folder, 's.study.yaml'), '--out', out);
      expect(ran).toMatchObject({ status: 0, err: '' });
      expect(ran.out).toContain('All 2 runs are done.');
      expect((await readdir(out)).sort()).toEqual(['a', 'b', 'overview.csv', 'overview.html', 'overview.md']);
      const record = JSON.parse(await readFile(join(out, 'b', 'record.json'), 'utf8'));
      expect(record.data.repeat).toEqual({ variable: 'k', level: 'b' });
      expect(record.study.title).toBe('A small study: k b');
      const verified = await plumbrule('verify', join(out, 'b', 'record.json'));
      expect(verified).toMatchObject({ status: 0, err: '' });
      const checked = await plumbrule('check', join(folder, 's.study.yaml'));
      expect(checked).toMatchObject({ status: 0, err: '' });
    });
  });

  test('a level that cannot be fitted stops no other', async () => {
    const spoilt = data((row, i) => {
      if (i === 0) Object.assign(row, { k: 'alone', z: '' });
    }, 60);
    await inFolder({ ...files, 'data.csv': spoilt }, async (folder) => {
      const out = join(folder, 'out');
      const ran = await plumbrule('fit', join(folder, 's.study.yaml'), '--out', out);
      expect(ran.status).toBe(2);
      expect(ran.err).toContain('alone: ');
      expect(await readdir(out)).toEqual(expect.arrayContaining(['a', 'b']));
      expect(await readdir(out)).not.toContain('alone');
      expect((await plumbrule('check', join(folder, 's.study.yaml'))).status).toBe(2);
    });
  });

  test('gives the same bytes in threads as in turn, and a thread that dies costs one run', async () => {
    const many = data((row, i) => {
      row.k = 'abcd'[i % 4]!;
    }, 80);
    await inFolder({ ...files, 'data.csv': many }, async (folder) => {
      const path = join(folder, 's.study.yaml');
      const read = await readStudyAndData(path);
      const jobs = (out: string): Job[] =>
        read.levels!.map(({ level }) => ({
          name: level,
          folder: level,
          study: path,
          level,
          out: join(folder, out, level),
          hasEarlier: out === 'died' ? null : true,
          earlier: out === 'died' ? null : join(folder, 'earlier', level),
        }));
      await plumbrule('fit', path, '--out', join(folder, 'earlier'));
      const inTurn = [];
      for (const job of jobs('turn')) inTurn.push(await doJob(path, read, job, { parameters: new Map() }));
      let done = 0;
      const script = {
        url: new URL('../../src/cli/level-worker.ts', import.meta.url),
        execArgv: ['--import', import.meta.resolve('tsx')],
      };
      const results = await inThreads(path, read, jobs('threads'), new Map(), 2, () => done++, script);
      expect(done).toBe(4);
      expect(results).toEqual(inTurn);
      expect(results.map(({ entry }) => [entry.name, entry.outcome, entry.change?.choice.changed])).toEqual(
        ['a', 'b', 'c', 'd'].map((level) => [level, 'done', false]),
      );
      for (const { name: level } of jobs('')) {
        for (const file of ['record.json', 'report.html', 'comparison.json', 'tables/residuals.csv']) {
          const [one, other] = await Promise.all(
            ['turn', 'threads'].map((out) => readFile(join(folder, out, level, file), 'utf8')),
          );
          expect(other).toBe(one);
        }
      }
      const deadly = new URL(
        `data:text/javascript,${encodeURIComponent(`import { parentPort } from 'node:worker_threads';
          parentPort.on('message', () => { throw new Error('no memory'); }); parentPort.postMessage('ready');`)}`,
      );
      const died = await inThreads(path, read, jobs('died'), new Map(), 1, () => {}, { url: deadly });
      expect(died.map(({ entry, fault }) => [entry.outcome, fault])).toEqual([
        ['failed', 'Error: no memory'],
        ['done', null],
        ['done', null],
        ['done', null],
      ]);
    });
  });

  test('takes as many threads as pay: of many light runs, or of a few heavy ones', async () => {
    // Runs, seconds of each, cores.
    expect(threadsThatPay(40, 0.03, 8)).toBe(1);
    expect(threadsThatPay(200, 0.03, 2)).toBe(2);
    expect(threadsThatPay(1000, 0.03, 8)).toBe(8);
    expect(threadsThatPay(5, 20, 8)).toBe(5);
    expect(threadsThatPay(0, 1, 8)).toBe(1);
    await inFolder(
      {
        ...files,
        'drawn.study.yaml': `${repeated}examination: { bootstrap: { repetitions: 2000, seed: 1 } }\n`,
      },
      async (folder) => {
        const [light, heavy] = await Promise.all(
          ['s', 'drawn'].map((name) => readStudyAndData(join(folder, `${name}.study.yaml`))),
        );
        expect(secondsOfARun(light!.study!, 500)).toBeLessThan(0.05);
        expect(secondsOfARun(light!.study!, 1e6)).toBeGreaterThan(5);
        expect(secondsOfARun(heavy!.study!, 50_000)).toBeGreaterThan(10);
        // Threads need the built program.
        expect(threadsFor(heavy!.study!, 1000, 1e6, 8)).toBe(1);
      },
    );
  });
});

describe('names of folders', () => {
  test('are safe and unique', () => {
    expect(
      safeNames(['a/b', 'a_b', 'Tern', 'tern', '..', 'CON', 'nul.txt', '', 'x. ', 'Overview.html', 'tables']),
    ).toEqual([
      'a_b-2',
      'a_b',
      'Tern',
      'tern-2',
      '_',
      '_CON',
      '_nul.txt',
      '_-2',
      'x_',
      '_Overview.html',
      '_tables',
    ]);
  });

  test('whatever the texts', async () => {
    const folder = await mkdtemp(join(tmpdir(), 'plumbrule-'));
    try {
      fc.assert(
        fc.property(
          fc.array(
            fc.oneof(fc.string({ unit: 'binary' }), fc.constantFrom('a', 'A', 'a-2', '.', 'ä', 'a\u0308')),
          ),
          (texts) => {
            const names = safeNames(texts);
            expect(names).toHaveLength(texts.length);
            expect(new Set(names.map((name) => name.normalize('NFKC').toLowerCase())).size).toBe(
              texts.length,
            );
            for (const name of names) {
              expect(name).not.toMatch(/[/\\:\0]|^\.|[. ]$|^$/);
              expect(Buffer.byteLength(name)).toBeLessThan(150);
              expect(join(folder, name, '..')).toBe(folder);
            }
          },
        ),
      );
    } finally {
      await rm(folder, { recursive: true });
    }
  });
});
