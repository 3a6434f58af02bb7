/**
 * Throughput of the data room: a CSV file of ROWS × COLUMNS invented numbers, made in a temporary folder, read to a
 * Table. Run: npx tsx test/bench/read-table.ts [ROWS] [COLUMNS]
 */
import { closeSync, mkdtempSync, openSync, rmSync, statSync, writeSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { readTable } from '../../src/data/read-table.ts';
import { numbersPlan } from '../data/plans.ts';

const rows = Number(process.argv[2] ?? 1_000_000);
const columns = Number(process.argv[3] ?? 21);
const folder = mkdtempSync(join(tmpdir(), 'plumbrule-bench-'));
try {
  const names = Array.from({ length: columns }, (_, j) => `x${j}`);
  writeNumbers(join(folder, 'rows.csv'), names, rows);
  const megabytes = statSync(join(folder, 'rows.csv')).size / 1e6;
  const before = process.resourceUsage().maxRSS;
  const start = performance.now();
  const table = await readTable(numbersPlan('rows.csv', names), folder, (problem) =>
    console.error(problem.message),
  );
  const seconds = (performance.now() - start) / 1000;
  const after = process.resourceUsage().maxRSS;
  console.log(
    `${table?.rowCount} rows × ${columns} (${megabytes.toFixed(0)} MB) in ${seconds.toFixed(2)} s: ` +
      `${Math.round(rows / seconds)} rows/s, ${(megabytes / seconds).toFixed(0)} MB/s; ` +
      `largest resident size ${Math.round(after / 1024)} MiB (${Math.round(before / 1024)} MiB before)`,
  );
} finally {
  rmSync(folder, { recursive: true });
}

function writeNumbers(path: string, names: readonly string[], count: number): void {
  const file = openSync(path, 'w');
  let seed = 1;
  const next = (): number => {
    seed = (Math.imul(seed, 1_664_525) + 1_013_904_223) >>> 0;
    return seed / 2 ** 32;
  };
  let text = `${names.join(',')}\n`;
  for (let i = 0; i < count; i++) {
    text += `${names.map(() => (next() * 200 - 100).toFixed(3)).join(',')}\n`;
    if (text.length > 1 << 20) {
      writeSync(file, text);
      text = '';
    }
  }
  writeSync(file, text);
  closeSync(file);
}
