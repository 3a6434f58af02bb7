/**
 * Whole runs of the built program as its user sees them: the demo study beside bare Node, and a million rows
 * of a CSV file down to the record. Needs `npm run build`.
 */
import { spawnSync } from 'node:child_process';
import {
  closeSync,
  existsSync,
  mkdtempSync,
  openSync,
  rmSync,
  statSync,
  writeFileSync,
  writeSync,
} from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { line } from './measure.ts';

const MAIN = fileURLToPath(new URL('../../dist/cli/main.js', import.meta.url));
const DEMO = fileURLToPath(new URL('../../pipelines/ferry-fuel/study.yaml', import.meta.url));

/** Has a process say at its end what it used: processor seconds and largest resident size. */
const ACCOUNT = `data:text/javascript,${encodeURIComponent(
  `process.on('exit', () => {
    const { userCPUTime, systemCPUTime, maxRSS } = process.resourceUsage();
    process.stderr.write('\\nUSED ' + (userCPUTime + systemCPUTime) / 1e6 + ' ' + maxRSS);
  });`,
)}`;

interface Use {
  /** Processor seconds, all threads. */
  readonly processor: number;
  /** Seconds by the clock. */
  readonly elapsed: number;
  /** Largest resident size in megabytes. */
  readonly megabytes: number;
}

function used(args: readonly string[], repeats: number): Use {
  const runs = Array.from({ length: repeats }, () => {
    const start = performance.now();
    const { stderr, status } = spawnSync(process.execPath, ['--import', ACCOUNT, ...args], {
      encoding: 'utf8',
    });
    const elapsed = (performance.now() - start) / 1000;
    const found = /USED (\S+) (\S+)$/.exec(stderr);
    if (status !== 0 || found === null) throw new Error(`${args.join(' ')} ended with ${status}: ${stderr}`);
    return { processor: Number(found[1]), elapsed, megabytes: Number(found[2]) / 1024 };
  });
  return runs.reduce((best, run) => (run.processor < best.processor ? run : best));
}

export function benchWholeRun(): void {
  if (!existsSync(MAIN)) throw new Error('The program is not built: npm run build');
  const folder = mkdtempSync(join(tmpdir(), 'plumbrule-bench-'));
  try {
    const bare = used(['-e', '0'], 5);
    const demo = used([MAIN, 'fit', DEMO, '--out', join(folder, 'demo')], 5);
    line('bare node', `${bare.processor.toFixed(2)} s of processor time`);
    line('demo study, whole run', `${demo.processor.toFixed(2)} s of processor time`);
    line(
      'demo study beyond bare node',
      `${(demo.processor - bare.processor).toFixed(2)} s of processor time`,
    );

    const study = millionRows(folder);
    const large = used([MAIN, 'fit', study, '--out', join(folder, 'large'), '--quiet'], 1);
    line(
      `1,000,000 × 21 CSV (${(statSync(join(folder, 'rows.csv')).size / 1e6).toFixed(0)} MB) to record, reports and tables`,
      `${large.elapsed.toFixed(2)} s, ${large.processor.toFixed(2)} s of processor time, ${large.megabytes.toFixed(0)} MB`,
    );
  } finally {
    rmSync(folder, { recursive: true });
  }
}

/** A study of 20 predictors and a response on a million invented rows; gives its path. */
function millionRows(folder: string): string {
  const names = Array.from({ length: 20 }, (_, j) => `x${j + 1}`);
  const file = openSync(join(folder, 'rows.csv'), 'w');
  let state = 1;
  const next = () => {
    state = (Math.imul(state, 1_664_525) + 1_013_904_223) >>> 0;
    return state / 2 ** 32 - 0.5;
  };
  let text = `${names.join(',')},y\n`;
  for (let i = 0; i < 1_000_000; i++) {
    const row = names.map(() => next() * 200);
    const y = row.reduce((sum, x, j) => sum + x * ((j % 5) - 2), 10) + next() * 50;
    text += `${row.map((x) => x.toFixed(3)).join(',')},${y.toFixed(3)}\n`;
    if (text.length > 1 << 20) {
      writeSync(file, text);
      text = '';
    }
  }
  writeSync(file, text);
  closeSync(file);
  const study = [
    'plumbrule: 1',
    'title: A million rows',
    'data:',
    '  file: rows.csv',
    '  variables:',
    ...[...names, 'y'].map((name) => `    ${name}: { type: number }`),
    'response: y',
    'candidates:',
    `  - { name: All, terms: [${names.join(', ')}] }`,
    `  - { name: Half, terms: [${names.slice(0, 10).join(', ')}] }`,
    '',
  ].join('\n');
  writeFileSync(join(folder, 'million.study.yaml'), study);
  return join(folder, 'million.study.yaml');
}
