import { execFileSync } from 'node:child_process';
import { mkdtempSync, readdirSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { describe, expect, test } from 'vitest';

const root = fileURLToPath(new URL('../../', import.meta.url));
const pipelines = join(root, 'pipelines');
const folders = readdirSync(pipelines, { withFileTypes: true }).filter((each) => each.isDirectory());

describe('the data of the shipped studies', () => {
  const files = folders.flatMap(({ name }) =>
    readdirSync(join(pipelines, name))
      .filter((file) => file.endsWith('.csv'))
      .map((file) => [name, file] as const),
  );

  test('there is a first and a later file of each', () => {
    expect(files).toHaveLength(2 * folders.length);
  });

  test.each(files)('%s: the kept script makes the kept %s', (name, kept) => {
    const folder = join(pipelines, name);
    const scratch = mkdtempSync(join(tmpdir(), 'invented-'));
    try {
      const made = join(scratch, kept);
      execFileSync(
        process.execPath,
        [
          join(root, 'node_modules/tsx/dist/cli.mjs'),
          join(folder, 'make-data.ts'),
          ...(kept.endsWith('-later.csv') ? ['--later'] : []),
          made,
        ],
        { cwd: root },
      );
      expect(readFileSync(made, 'utf8')).toBe(readFileSync(join(folder, kept), 'utf8'));
    } finally {
      rmSync(scratch, { recursive: true });
    }
  });

  test.each(folders.map((each) => each.name))('%s says that it is invented', (name) => {
    for (const file of ['README.md', 'study.yaml', 'make-data.ts']) {
      expect(readFileSync(join(pipelines, name, file), 'utf8')).toMatch(/invented/);
    }
  });
});
