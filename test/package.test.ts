import { execFile } from 'node:child_process';
import { mkdir, mkdtemp, readdir, readFile, rm, symlink, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { promisify } from 'node:util';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';

const run = promisify(execFile);
const root = fileURLToPath(new URL('../', import.meta.url));

let folder: string;
let files: string[];

/** Builds and packs the project and installs it in an empty folder. */
beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'plumbrule-package-'));
  await run('npm', ['run', 'build'], { cwd: root });
  const { stdout } = await run('npm', ['pack', '--ignore-scripts', '--json', '--pack-destination', folder], {
    cwd: root,
  });
  const [packed] = JSON.parse(stdout) as { filename: string; files: { path: string }[] }[];
  files = packed?.files.map((file) => file.path) ?? [];
  const archive = join(folder, packed?.filename ?? '');
  await writeFile(join(folder, 'package.json'), '{ "name": "someone", "private": true, "type": "module" }\n');
  try {
    await run(
      'npm',
      [
        'install',
        archive,
        '--no-audit',
        '--no-fund',
        '--prefer-offline',
        '--fetch-retries=0',
        '--fetch-timeout=20000',
      ],
      { cwd: folder, timeout: 90_000 },
    );
  } catch {
    await installOffline(archive);
  }
}, 240_000);

afterAll(() => rm(folder, { recursive: true, force: true }));

/** Where no registry can be reached: the archive unpacked by hand, its dependencies those of the project. */
async function installOffline(archive: string) {
  const modules = join(folder, 'node_modules');
  await rm(modules, { recursive: true, force: true });
  await mkdir(join(modules, 'plumbrule'), { recursive: true });
  await run('tar', ['-xzf', archive, '--strip-components=1', '-C', join(modules, 'plumbrule')]);
  for (const name of await readdir(join(root, 'node_modules'))) {
    if (!name.startsWith('.')) await symlink(join(root, 'node_modules', name), join(modules, name));
  }
  await mkdir(join(modules, '.bin'));
  await symlink('../plumbrule/dist/cli/main.js', join(modules, '.bin/plumbrule'));
}

describe('the package', () => {
  test('holds what a user needs and nothing else', () => {
    for (const needed of [
      'README.md',
      'LICENSE',
      'dist/cli/main.js',
      'dist/index.js',
      'dist/index.d.ts',
      'schemas/study.schema.json',
      'schemas/record.schema.json',
      'schemas/study-keys.md',
      'templates/report.html.hbs',
      'pipelines/ferry-fuel/study.yaml',
    ]) {
      expect(files).toContain(needed);
    }
    expect(files.filter((file) => /^(?:src|test)\/|results\/|\.tgz$|^\./.test(file))).toEqual([]);
  });

  test('fits a study in an empty folder', { timeout: 60_000 }, async () => {
    const study = 'node_modules/plumbrule/pipelines/ferry-fuel/study.yaml';
    const { stdout } = await run('npx', ['--no-install', 'plumbrule', 'fit', study], { cwd: folder });
    expect(stdout).toContain(join('results', 'ferry-fuel', 'report.html'));
    const record = JSON.parse(await readFile(join(folder, 'results/ferry-fuel/record.json'), 'utf8'));
    expect(record.format).toBe('plumbrule-record/1');
    const { version } = JSON.parse(await readFile(join(root, 'package.json'), 'utf8'));
    expect(record.tool).toEqual({ name: 'plumbrule', version });
    expect((await run('npx', ['--no-install', 'plumbrule', '--version'], { cwd: folder })).stdout).toBe(
      `${version}\n`,
    );
  });

  test('is a library with types, closed but for what it exports', { timeout: 60_000 }, async () => {
    await writeFile(
      join(folder, 'use.ts'),
      [
        "import { runStudy, type StudyRecord } from 'plumbrule';",
        "const { record } = await runStudy('node_modules/plumbrule/pipelines/ferry-fuel/study.yaml');",
        'const chosen: string | null = (record as StudyRecord).selection.chosen;',
        '// @ts-expect-error: a number is no name',
        'const wrong: number = chosen;',
        'export { chosen, wrong };',
        '',
      ].join('\n'),
    );
    const settings = ['--noEmit', '--strict', '--target', 'es2022', '--module', 'nodenext', '--ignoreConfig'];
    const tsc = join(root, 'node_modules/.bin/tsc');
    const { stdout } = await run(tsc, [...settings, '--types', '', 'use.ts'], { cwd: folder }).catch(
      (fault: { stdout: string }) => fault,
    );
    expect(stdout).toBe('');
    const deep = `import('plumbrule/dist/run.js').then(() => 'open', (fault) => fault.code).then(console.log)`;
    const { stdout: code } = await run(process.execPath, ['-e', deep], { cwd: folder });
    expect(code.trim()).toBe('ERR_PACKAGE_PATH_NOT_EXPORTED');
    const schema = `console.log(require.resolve('plumbrule/schemas/study.schema.json'))`;
    expect((await run(process.execPath, ['-e', schema], { cwd: folder })).stdout).toContain(
      'study.schema.json',
    );
  });
});
