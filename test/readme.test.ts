import { execFile } from 'node:child_process';
import { mkdir, mkdtemp, readFile, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath, pathToFileURL } from 'node:url';
import { promisify } from 'node:util';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';

const run = promisify(execFile);
const root = new URL('../', import.meta.url);
const path = (name: string) => fileURLToPath(new URL(name, root));

interface Block {
  readonly language: string;
  readonly text: string;
  /** The last file named before the block. */
  readonly file: string | null;
}

const readme = await readFile(path('README.md'), 'utf8');
const blocks: Block[] = [...readme.matchAll(/^```(\w+)\n([\s\S]*?)^```$/gm)].map((match) => ({
  language: match[1] as string,
  text: match[2] as string,
  file: [...readme.slice(0, match.index).matchAll(/`([\w.-]+\.(?:csv|yaml))`/g)].at(-1)?.[1] ?? null,
}));

let folder: string;
beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'plumbrule-readme-'));
  for (const { language, text, file } of blocks) {
    if (language === 'csv' || language === 'yaml') await writeFile(join(folder, file ?? ''), text);
  }
});
afterAll(() => rm(folder, { recursive: true }));

/** Runs TypeScript as a reader's own process would run it. */
function node(...args: string[]) {
  return run(process.execPath, ['--import', import.meta.resolve('tsx'), ...args], { cwd: folder });
}

describe('README', () => {
  test('every block is of a kind that is run here', () => {
    expect(blocks.length).toBeGreaterThan(5);
    expect(blocks.filter(({ language }) => !['sh', 'bash', 'csv', 'yaml', 'ts'].includes(language))).toEqual(
      [],
    );
    expect(blocks.filter(({ language }) => language === 'csv').map(({ file }) => file)).toEqual([
      'firings.csv',
      'firings-next.csv',
    ]);
    expect(blocks.filter(({ language }) => language === 'yaml').map(({ file }) => file)).toEqual([
      'firings.study.yaml',
    ]);
  });

  test('the commands do what the text says', { timeout: 60_000 }, async () => {
    const commands = blocks
      .filter(({ language }) => language === 'sh')
      .flatMap(({ text }) => text.trim().split(/\n|&&/))
      .map((line) => line.trim());
    const own = commands.filter((line) => line.startsWith('npx plumbrule '));
    expect(own).toHaveLength(5);
    for (const line of own) {
      const { stdout, stderr } = await node(path('src/cli/main.ts'), ...line.split(' ').slice(2));
      // The one example with a row that cannot be predicted says so.
      if (line.includes(' predict ')) expect(stderr).toContain('no row fitted has kiln "C"');
      else expect(stderr, line).toBe('');
      expect(stdout.length, line).toBeGreaterThan(60);
    }
    // `npm ci` and the scripts are run by continuous integration on a fresh clone; here they must exist.
    const { scripts } = JSON.parse(await readFile(path('package.json'), 'utf8')) as { scripts: object };
    for (const line of commands.filter((each) => !own.includes(each))) {
      const script = line.replace(/^npm (?:run )?/, '');
      expect(script === 'ci' || Object.hasOwn(scripts, script), line).toBe(true);
    }
  });

  test('the files named there are written', async () => {
    const results = join(folder, 'results/firings');
    const named = [
      'report.html',
      'record.json',
      'candidates.csv',
      'coefficients.csv',
      'residuals.csv',
      'predictions.csv',
    ];
    for (const name of named) {
      expect(readme).toContain(`\`${name}\``);
      const place = name.endsWith('.csv') ? join(results, 'tables', name) : join(results, name);
      expect((await readFile(place, 'utf8')).length, name).toBeGreaterThan(50);
    }
  });

  test('the job for continuous integration runs, and writes what it says', { timeout: 60_000 }, async () => {
    const bin = join(folder, 'bin');
    await mkdir(bin);
    const main = `"${process.execPath}" --import "${import.meta.resolve('tsx')}" "${path('src/cli/main.ts')}"`;
    await writeFile(join(bin, 'npx'), `#!/bin/sh\nshift\nexec ${main} "$@"\n`, { mode: 0o755 });
    const [job, ...more] = blocks.filter(({ language }) => language === 'bash');
    expect(more).toEqual([]);
    await writeFile(join(folder, 'job.sh'), job?.text ?? '');
    const env = { ...process.env, PATH: `${bin}:${process.env.PATH}` };
    const { stderr } = await run('/bin/sh', ['job.sh'], { cwd: folder, env });
    expect(stderr).toBe('');
    expect(await readFile(join(folder, 'ci/junit.xml'), 'utf8')).toContain(
      'name="Adjusted R²: at least 0.75"/>',
    );
    expect((await readFile(join(folder, 'ci/summary.md'), 'utf8')).length).toBeLessThan(65_536);
  });

  test('the library example runs', { timeout: 60_000 }, async () => {
    for (const [index, { text }] of blocks.filter(({ language }) => language === 'ts').entries()) {
      const file = join(folder, `example-${index}.mts`);
      await writeFile(file, text.replace("'plumbrule'", `'${pathToFileURL(path('src/index.ts')).href}'`));
      const { stdout, stderr } = await node(file);
      expect(stderr).toBe('');
      expect(stdout).toMatch(/^Chosen: Each kiln for itself\n# /);
    }
  });

  test('every link leads to something', async () => {
    const links = [...readme.matchAll(/\]\(([^)#]+)\)/g)].map((match) => match[1] as string);
    expect(links.length).toBeGreaterThan(3);
    for (const link of links.filter((each) => !/^https?:/.test(each))) {
      await expect(
        import('node:fs/promises').then((fs) => fs.stat(path(link))),
        link,
      ).resolves.toBeDefined();
    }
  });

  test('the options and commands described are those there are', async () => {
    for (const command of ['draft', 'check', 'fit', 'compare', 'predict', 'verify', 'render']) {
      const { stdout } = await node(path('src/cli/main.ts'), command, '--help');
      for (const [option] of stdout.matchAll(/--(?!help)[a-z-]+/g)) expect(readme).toContain(`\`${option}`);
      expect(readme).toContain(`\`plumbrule ${command} `);
    }
  });
});
