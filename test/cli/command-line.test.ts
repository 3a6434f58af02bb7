import { execFile } from 'node:child_process';
import { mkdir, mkdtemp, readdir, readFile, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { promisify } from 'node:util';
import { afterAll, afterEach, beforeAll, describe, expect, test, vi } from 'vitest';
import { runCommandLine } from '../../src/cli/command-line.ts';
import { collecting } from './collect.ts';

/** y = 3 + 2x and a little, twelve rows; invented. */
const DATA = `x,z,y\n${Array.from({ length: 12 }, (_, i) => `${i},${(i * 7) % 5},${3 + 2 * i + ((i * 5) % 3) / 10}`).join('\n')}\n`;

const STUDY = `plumbrule: 1
title: A small study
question: How does y go with x?
data:
  file: small.csv
  variables:
    x: { type: number, unit: t }
    z: { type: number }
    y: { type: number, unit: L }
response: y
candidates:
  - name: Straight
    terms: [x]
  - name: Both
    terms: [x, z]
`;

let folder: string;
let count = 0;
beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'plumbrule-cli-'));
});
afterAll(() => rm(folder, { recursive: true }));
afterEach(() => vi.unstubAllEnvs());

async function plumbrule(...args: string[]) {
  const { terminal, printed } = collecting();
  const status = await runCommandLine(args, terminal);
  return { status, ...printed };
}

/** A folder of its own with the small study, changed as told. */
async function study(more = '', data = DATA, text = STUDY) {
  const home = join(folder, String(count++));
  await mkdir(home);
  await writeFile(join(home, 'small.csv'), data);
  const path = join(home, 'small.study.yaml');
  await writeFile(path, text + more);
  return { home, path, out: join(home, 'out') };
}

describe('the command line', () => {
  test('--version and --help', async () => {
    const { version } = JSON.parse(await readFile(new URL('../../package.json', import.meta.url), 'utf8'));
    expect(await plumbrule('--version')).toEqual({ status: 0, out: `${version}\n`, err: '' });
    const help = await plumbrule('--help');
    expect(help).toMatchObject({ status: 0, err: '' });
    for (const word of ['check', 'fit', 'render', 'Exit status']) expect(help.out).toContain(word);
    expect((await plumbrule('fit', '--help')).out).toContain('--out <folder>');
  });

  test.each<[string[], string]>([
    [['fti', 'x'], "Unknown command 'fti'. Did you mean fit?"],
    [['fit'], "Missing required argument 'study'. See plumbrule fit --help."],
    [['fit', 'a', '--oot', 'b'], "Unknown option '--oot'. Did you mean --out?"],
    [['check', 'a', 'b'], "Too many arguments for 'check'. Expected 1 argument but got 2"],
    [['check', 'a', '--problems', 'xml'], "'xml' is invalid. Allowed choices are text, json."],
    [['render', 'a', '--format', 'pdf'], "'pdf' is invalid. Allowed choices are html, markdown."],
    [['--nonsense'], "Unknown option '--nonsense'. See plumbrule --help."],
  ])('%j cannot be used', async (args, message) => {
    const { status, out, err } = await plumbrule(...args);
    expect(status).toBe(2);
    expect(out).toBe('');
    expect(err).toContain(message);
  });

  test('no command prints the help, where problems go', async () => {
    const { status, out, err } = await plumbrule();
    expect([status, out]).toEqual([2, '']);
    expect(err).toContain('Usage: plumbrule');
  });

  test('a misused command line as JSON', async () => {
    for (const form of [['--problems', 'json'], ['--problems=json']]) {
      const { status, out, err } = await plumbrule('fit', 'a', '--oot', ...form);
      expect([status, err]).toEqual([2, '']);
      expect(JSON.parse(out).problems[0]).toMatchObject({
        code: 'command_unusable',
        severity: 'error',
        place: { kind: 'command' },
        hint: 'Did you mean --out?',
      });
    }
  });

  test('a fault of the program’s own is said as such, with its place only where asked for', async () => {
    const { terminal, printed } = collecting();
    const broken = {
      ...terminal,
      out: () => {
        throw new TypeError('the terminal burst');
      },
    };
    expect(await runCommandLine(['--version'], broken)).toBe(3);
    expect(printed.err).toContain('a fault of its own');
    expect(printed.err).toContain('TypeError: the terminal burst');
    expect(printed.err).not.toContain('command-line');
    vi.stubEnv('PLUMBRULE_DEBUG', '1');
    await runCommandLine(['--version'], broken);
    expect(printed.err).toMatch(/at .*command-line/);
  });
});

describe('check', () => {
  test('says what is declared, what was found and how many rows are left', async () => {
    const { path, home } = await study('', `${DATA}12,,20\n`);
    const { status, out, err } = await plumbrule('check', path);
    expect(status, err).toBe(0);
    expect(err).toBe('');
    expect(out).toContain('How does y go with x?');
    expect(out).toMatch(/2.candidates for y, ranked by aicc/);
    expect(out).toContain('12 of 13');
    expect(out).toMatch(/x +number +none +0 to 12/);
    expect(out).toContain('Nothing is wrong.');
    expect((await readdir(home)).sort()).toEqual(['small.csv', 'small.study.yaml']);
  });

  test('every fault with its place; status 2', async () => {
    const { path } = await study('selektion: {}\n', DATA, STUDY.replace('[x, z]', '[x, zz]'));
    const { status, err } = await plumbrule('check', path);
    expect(status).toBe(2);
    expect(err).toContain(`${path}:15:16 `);
    expect(err).toContain('selektion');
    expect(err).toContain('Did you mean selection?');
    expect(err).toMatch(/\nThe data has not been read yet: that comes once the study has no error\.\n$/);
    const json = await plumbrule('check', path, '--problems', 'json');
    expect(json.status).toBe(2);
    expect(JSON.parse(json.out).errors).toBeGreaterThan(0);
    expect(json.err).toBe('');
  });

  test('a terminal shows fifty problems and says how many more there are; JSON has all', async () => {
    const keys = Array.from({ length: 60 }, (_, i) => `unknown_key_${i}: 1\n`).join('');
    const { path } = await study(keys);
    const { status, err } = await plumbrule('check', path);
    expect(status).toBe(2);
    expect(err.match(/is not a key here/g)).toHaveLength(50);
    expect(err).toContain('10 more problems are not shown; --problems json lists them all.');
    expect(JSON.parse((await plumbrule('check', path, '--problems', 'json')).out).problems).toHaveLength(60);
  });

  test('--quiet and JSON print no summary', async () => {
    const { path } = await study();
    expect(await plumbrule('check', path, '--quiet')).toEqual({ status: 0, out: '', err: '' });
    const { out } = await plumbrule('check', path, '--problems', 'json');
    expect(JSON.parse(out)).toEqual({ errors: 0, warnings: 0, problems: [] });
  });
});

describe('fit', () => {
  test('writes its files and tells what it found in the order in which a reader asks', async () => {
    const { path, out: folderOut } = await study(
      'predict: { rows: [{ label: One, x: 4, z: 1 }], total: true }\n',
    );
    const { status, out, err } = await plumbrule('fit', path, '--out', folderOut);
    expect(status, err).toBe(0);
    const labels = [...out.matchAll(/^ *([a-z]+) [│▼]/gm)].map((match) => match[1]);
    expect(labels).toEqual(['asked', 'data', 'tried', 'says', 'trust', 'predicts', 'careful', 'written']);
    for (const line of out.split('\n')) expect([...line].length, line).toBeLessThanOrEqual(100);
    expect(out).toContain(join(folderOut, 'report.html'));
    expect(out).not.toContain('\u001b');
    const files = (await readdir(folderOut, { recursive: true })).sort();
    expect(files).toEqual([
      'record.json',
      'report.html',
      'report.md',
      'sample.csv.gz',
      'tables',
      'tables/candidates.csv',
      'tables/coefficients.csv',
      'tables/predictions.csv',
      'tables/residuals.csv',
    ]);
  });

  test('the same inputs give the same bytes', async () => {
    const { path, home } = await study();
    const texts: string[][] = [];
    for (const out of ['one', 'two']) {
      await plumbrule('fit', path, '--out', join(home, out), '--quiet');
      const names = ['record.json', 'report.html', 'report.md', 'tables/residuals.csv'];
      texts.push(await Promise.all(names.map((name) => readFile(join(home, out, name), 'utf8'))));
    }
    expect(texts[1]).toEqual(texts[0]);
    for (const text of texts[0] ?? []) expect(text).not.toContain(home);
  });

  test('status 1 where a criterion is missed, and the files are there all the same', async () => {
    const { path, out: folderOut } = await study(
      'acceptance: { residual_standard_error: { at_most: 0.001 } }\n',
    );
    const { status, out } = await plumbrule('fit', path, '--out', folderOut);
    expect(status).toBe(1);
    expect(out).toMatch(/accepted │ The acceptance criterion is missed: residual standard error\./);
    expect(out).toMatch(/│ · Residual standard error is 0\.0\d+.L; the study asks for at most 0\.001\./);
    expect(await readdir(folderOut)).toContain('record.json');
  });

  test('status 1 where no candidate is admitted, with the reasons', async () => {
    const { path, out: folderOut } = await study('selection: { admit: { signs: { x: negative } } }\n');
    const { status, out, err } = await plumbrule('fit', path, '--out', folderOut);
    expect(status, err).toBe(1);
    expect(out).toContain('refused');
    // Told once, where the choice says that none was admitted.
    expect(out.match(/Straight: The coefficient/g)).toHaveLength(1);
    const record = JSON.parse(await readFile(join(folderOut, 'record.json'), 'utf8'));
    expect(record).toMatchObject({ model: null, examination: null, selection: { chosen: null } });
    expect(await readdir(join(folderOut, 'tables'))).not.toContain('residuals.csv');
  });

  test('a refused candidate below the winner has its reason too', async () => {
    const { path, out: folderOut } = await study('selection: { admit: { p_value: { at_most: 0.05 } } }\n');
    const { out } = await plumbrule('fit', path, '--out', folderOut);
    expect(out).toMatch(/2 {2}Both .* refused\n/);
    expect(out).toMatch(/│ · Both was refused\. The p-value of z is 0\.\d+, above 0\.05\./);
  });

  test('data that is missing is no fault of the study', async () => {
    const { path, home } = await study();
    await rm(join(home, 'small.csv'));
    const { status, err } = await plumbrule('fit', path);
    expect(status).toBe(2);
    expect(err).toContain('small.csv');
    expect(err).not.toContain('not been read yet');
    expect((await plumbrule('fit', join(home, 'none.yaml'))).err).not.toContain('not been read yet');
  });

  test('status 2 leaves earlier results untouched', async () => {
    const { path, home, out } = await study();
    await plumbrule('fit', path, '--out', out, '--quiet');
    const before = await readFile(join(out, 'record.json'), 'utf8');
    await writeFile(join(home, 'small.csv'), DATA.replace('3,1,', '3,1,"1,234.5'));
    const { status, err } = await plumbrule('fit', path, '--out', out);
    expect(status).toBe(2);
    expect(err).not.toBe('');
    expect(await readFile(join(out, 'record.json'), 'utf8')).toBe(before);
  });

  test('status 2 where the folder cannot be written', async () => {
    const { path, home } = await study();
    const { status, err } = await plumbrule('fit', path, '--out', join(home, 'small.csv'));
    expect(status).toBe(2);
    expect(err).toContain('a part of this path is a file');
  });

  test('a template of one’s own; one that is missing, not text, or broken', async () => {
    const { path, home, out } = await study(
      'report: { formats: [markdown], templates: { markdown: own.hbs } }\n',
    );
    const missing = await plumbrule('fit', path, '--out', out);
    expect(missing.status).toBe(2);
    expect(missing.err).toContain('The template cannot be read: there is no such file.');
    await writeFile(join(home, 'own.hbs'), Uint8Array.of(0xff, 0xfe));
    expect((await plumbrule('fit', path, '--out', out)).err).toContain('it is not UTF-8 text');
    await writeFile(join(home, 'own.hbs'), 'Title\n{{#if}}');
    const broken = await plumbrule('fit', path, '--out', out);
    expect(broken.status).toBe(2);
    expect(broken.err).toMatch(/own\.hbs:2:\d+ .*\n +2 \| \{\{#if\}\}/);
    expect(await readdir(home)).not.toContain('out');
    await writeFile(join(home, 'own.hbs'), 'Title\n{{#each rows}}');
    const open = await plumbrule('fit', path, '--out', out);
    expect(open.err).toContain(
      'The template cannot be read: it ends inside braces or a block that are not closed.',
    );
    await writeFile(join(home, 'own.hbs'), 'Mine: {{title}}');
    expect((await plumbrule('fit', path, '--out', out)).status).toBe(0);
    // One that the command line names is known by its path, and not by the name of the study's own.
    const given = join(home, 'given.hbs');
    await writeFile(given, '{{> nothing}}');
    const record = join(out, 'record.json');
    for (const args of [
      ['render', record],
      ['compare', record, record],
    ]) {
      const ran = await plumbrule(...args, '--format', 'markdown', '--template', given);
      expect([ran.status, ran.err]).toEqual([2, expect.stringContaining(`${given}:1:1 `)]);
      expect(ran.err).toContain('1 | {{> nothing}}');
    }
    expect(await readFile(join(out, 'report.md'), 'utf8')).toBe('Mine: A small study\n');
  });

  test('--problems json prints that and nothing else', async () => {
    const { path, out: folderOut } = await study();
    const { status, out, err } = await plumbrule('fit', path, '--out', folderOut, '--problems', 'json');
    expect([status, err]).toEqual([0, '']);
    expect(JSON.parse(out)).toMatchObject({ errors: 0 });
  });

  test('without --out, the folder is named after the study', { timeout: 30_000 }, async () => {
    const { home } = await study();
    await mkdir(join(home, 'monthly'));
    await writeFile(join(home, 'monthly/study.yaml'), STUDY.replace('small.csv', '../small.csv'));
    const main = fileURLToPath(new URL('../../src/cli/main.ts', import.meta.url));
    for (const file of ['small.study.yaml', 'monthly/study.yaml']) {
      await promisify(execFile)(
        process.execPath,
        ['--import', import.meta.resolve('tsx'), main, 'fit', file],
        {
          cwd: home,
        },
      );
    }
    expect((await readdir(join(home, 'results'))).sort()).toEqual(['monthly', 'small']);
  });
});

describe('render', () => {
  async function fitted(more = '') {
    const { path, home, out } = await study(more);
    await plumbrule('fit', path, '--out', out, '--quiet');
    return { home, out, record: join(out, 'record.json') };
  }

  test('writes the same reports again from the record alone, and touches nothing else', async () => {
    const { home, out, record } = await fitted();
    const names = ['report.html', 'report.md'];
    const read = () => Promise.all(names.map((name) => readFile(join(out, name), 'utf8')));
    const before = await read();
    await Promise.all([...names.map((name) => rm(join(out, name))), rm(join(home, 'small.csv'))]);
    const { status, out: printed, err } = await plumbrule('render', record);
    expect([status, err]).toEqual([0, '']);
    expect(printed).toBe(names.map((name) => `${join(out, name)}\n`).join(''));
    expect(await read()).toEqual(before);
    expect(await readdir(out)).toContain('tables');
  });

  test('one format, elsewhere, with a template of one’s own', async () => {
    const { home, record } = await fitted();
    await writeFile(join(home, 'own.hbs'), '{{title}}!');
    const out = join(home, 'elsewhere');
    const args = ['render', record, '--out', out, '--template', join(home, 'own.hbs')];
    const unclear = await plumbrule(...args);
    expect(unclear.status).toBe(2);
    expect(unclear.err).toContain('Say which with --format.');
    expect((await plumbrule(...args, '--format', 'markdown')).status).toBe(0);
    expect(await readdir(out)).toEqual(['report.md']);
    expect(await readFile(join(out, 'report.md'), 'utf8')).toBe('A small study!\n');
  });

  test('says that the study’s own template is not used', async () => {
    const { path, home, out } = await study(
      'report: { formats: [markdown], templates: { markdown: own.hbs } }\n',
    );
    await writeFile(join(home, 'own.hbs'), '{{title}}');
    await plumbrule('fit', path, '--out', out, '--quiet');
    const { status, err } = await plumbrule('render', join(out, 'record.json'));
    expect(status).toBe(0);
    expect(err).toContain("Warning: The study's own template for markdown is not used");
    expect(await readFile(join(out, 'report.md'), 'utf8')).toMatch(/^# A small study/);
  });

  test('what is no record is not rendered', async () => {
    const { path } = await study();
    const { status, err } = await plumbrule('render', path);
    expect(status).toBe(2);
    expect(err).toContain('This is a study, not a record. plumbrule fit runs it');
  });
});
