/** One study repeated for 200 groups of 500 rows, down to records, reports, tables and the overview. Needs `npm run build`. */
import { spawnSync } from 'node:child_process';
import { existsSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { invented, line } from './measure.ts';

const MAIN = fileURLToPath(new URL('../../dist/cli/main.js', import.meta.url));
const GROUPS = 200;
const ROWS = 500;

export function benchRepeats(): void {
  if (!existsSync(MAIN)) throw new Error('The program is not built: npm run build');
  const folder = mkdtempSync(join(tmpdir(), 'plumbrule-bench-'));
  try {
    const study = repeatedStudy(folder);
    const start = performance.now();
    const { status, stderr } = spawnSync(
      process.execPath,
      [MAIN, 'fit', study, '--out', join(folder, 'out'), '--quiet'],
      { encoding: 'utf8' },
    );
    if (status !== 0) throw new Error(`The repeats ended with ${status}: ${stderr}`);
    const seconds = (performance.now() - start) / 1000;
    line(
      `repeat_for, ${GROUPS} groups of ${ROWS} rows to records, reports and tables`,
      `${seconds.toFixed(2)} s`,
    );
  } finally {
    rmSync(folder, { recursive: true });
  }
}

/** A study of four predictors on invented rows, repeated for its sites; gives its path. */
export function repeatedStudy(folder: string): string {
  const names = ['a', 'b', 'c', 'd'];
  const lines = ['site,a,b,c,d,y'];
  const numbers = invented(GROUPS * ROWS * 5, 7);
  for (let i = 0; i < GROUPS * ROWS; i++) {
    const site = `site ${String(i % GROUPS).padStart(3, '0')}`;
    const x = names.map((_, j) => numbers[i * 5 + j]! * 100);
    const y = 20 + x[0]! * (1 + (i % GROUPS) / 400) - 0.5 * x[1]! + 0.1 * x[2]! + numbers[i * 5 + 4]! * 30;
    lines.push([site, ...x.map((value) => value.toFixed(3)), y.toFixed(3)].join(','));
  }
  writeFileSync(join(folder, 'rows.csv'), `${lines.join('\n')}\n`);
  const study = [
    'plumbrule: 1',
    'title: Many sites',
    'data:',
    '  file: rows.csv',
    '  variables:',
    '    site: { type: category }',
    ...[...names, 'y'].map((name) => `    ${name}: { type: number }`),
    'repeat_for: site',
    'response: y',
    'candidates:',
    '  - { name: One, terms: [a] }',
    '  - { name: Two, terms: [a, b] }',
    '  - { name: All, terms: [a, b, c, d] }',
    '',
  ].join('\n');
  writeFileSync(join(folder, 'sites.study.yaml'), study);
  return join(folder, 'sites.study.yaml');
}
