import { spawn } from 'node:child_process';
import {
  copyFileSync,
  cpSync,
  existsSync,
  mkdtempSync,
  readdirSync,
  readFileSync,
  rmSync,
  symlinkSync,
  utimesSync,
  writeFileSync,
} from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { build } from 'esbuild';
import { afterAll, beforeAll, expect, test } from 'vitest';
import type { Problem } from '../../src/problem.ts';
import { readRecord } from '../../src/record/read-record.ts';
import { randomFrom } from '../../src/stats/random.ts';
import { CARS, carsStudy, csvText } from '../compare/sides.ts';

let home: string;
const at = (...names: string[]) => join(home, ...names);

/** The whole program in one file, which starts fast; the package's own files are where it looks for them. */
beforeAll(async () => {
  home = mkdtempSync(join(tmpdir(), 'plumbrule-killed-'));
  const root = (name: string) => fileURLToPath(new URL(`../../${name}`, import.meta.url));
  await build({
    entryPoints: [root('src/cli/main.ts')],
    outfile: at('dist/main.mjs'),
    bundle: true,
    packages: 'external',
    platform: 'node',
    format: 'esm',
    logLevel: 'silent',
  });
  copyFileSync(root('package.json'), at('package.json'));
  for (const name of ['schemas', 'templates', 'node_modules']) symlinkSync(root(name), at(name));
  for (const [name, rows] of [
    ['old', CARS.slice(0, 200)],
    ['new', CARS.slice(2, 230)],
  ] as const) {
    writeFileSync(at(`${name}.study.yaml`), carsStudy().replaceAll('cars.csv', `${name}.csv`));
    writeFileSync(at(`${name}.csv`), csvText(rows));
    await runOf(name, name, () => null);
  }
}, 60_000);
afterAll(() => rmSync(home, { recursive: true }), 60_000);

/** Runs a study; `kill` is asked every millisecond whether it is to be killed, once the time is known. */
function runOf(study: string, out: string, kill: (elapsed: number) => boolean | null): Promise<number> {
  return new Promise((resolve) => {
    const began = performance.now();
    const child = spawn(
      process.execPath,
      [at('dist/main.mjs'), 'fit', at(`${study}.study.yaml`), '--out', at(out)],
      {
        stdio: 'ignore',
      },
    );
    const asking = setInterval(() => {
      if (kill(performance.now() - began) === true) child.kill('SIGKILL');
    }, 1);
    child.on('exit', () => {
      clearInterval(asking);
      resolve(performance.now() - began);
    });
  });
}

function results(out: string): { readonly [name: string]: string } {
  const found: { [name: string]: string } = {};
  for (const entry of readdirSync(at(out), { recursive: true, withFileTypes: true })) {
    const path = join(entry.parentPath, entry.name);
    if (entry.isFile() && !path.includes('.plumbrule-'))
      found[path.slice(at(out).length)] = readFileSync(path, 'latin1');
  }
  return found;
}

test('a fit that is killed at random moments leaves old results or new ones, and the next reader finds all of them', {
  timeout: 120_000,
}, async () => {
  const [old, fresh] = [results('old'), results('new')];
  expect(Object.keys(old)).toHaveLength(7);
  const random = randomFrom(20_261_201);
  cpSync(at('old'), at('whole'), { recursive: true });
  const whole = await runOf('new', 'whole', () => null);
  expect(results('whole')).toEqual(fresh);
  const one = async (k: number) => {
    const out = `killed-${k}`;
    cpSync(at('old'), at(out), { recursive: true });
    const wait = random.next();
    let begun = Number.POSITIVE_INFINITY;
    await runOf('new', out, (elapsed) => {
      // A third at any time; the others from when the results begin to be written.
      if (k % 3 === 0) return elapsed > whole * (0.2 + wait);
      if (begun > elapsed && hiddenIn(out).length > 0) begun = elapsed;
      return elapsed - begun > 20 * wait;
    });
    const part = results(out);
    const of = [old, fresh].find((files) =>
      Object.entries(part).every(([name, text]) => files[name] === text),
    );
    expect(of, `${k}: files of both: ${Object.keys(part)}`).toBeDefined();
    for (const name of hiddenIn(out)) utimesSync(at(out, name), 0, 0);
    const problems: Problem[] = [];
    expect(await readRecord(at(out, 'record.json'), (problem) => problems.push(problem))).not.toBeNull();
    expect(problems).toEqual([]);
    const after = results(out);
    expect(after).toEqual(after['/record.json'] === old['/record.json'] ? old : fresh);
  };
  for (let k = 0; k < 8; k += 2) await Promise.all([one(k), one(k + 1)]);
  // Whatever was left, the next run goes through.
  await runOf('new', 'killed-0', () => null);
  expect(results('killed-0')).toEqual(fresh);
});

function hiddenIn(out: string): string[] {
  return existsSync(at(out)) ? readdirSync(at(out)).filter((name) => name.startsWith('.plumbrule-')) : [];
}
