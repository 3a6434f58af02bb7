/** Two records of 100,000 rows and twenty columns: reading them with their rows, and comparing. */
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { runCommandLine } from '../../src/cli/command-line.ts';
import { compareRecords } from '../../src/compare/compare.ts';
import { readCompared } from '../../src/compare/read-compared.ts';
import { invented, line, ratio } from './measure.ts';

const ROWS = 100_000;
const COLUMNS = 20;

export async function benchCompare(): Promise<void> {
  const folder = mkdtempSync(join(tmpdir(), 'plumbrule-bench-'));
  try {
    for (const [name, from, seed] of [
      ['earlier', 0, 3],
      ['later', 5_000, 3],
    ] as const) {
      writeFileSync(join(folder, 'rows.csv'), rowsFrom(from, seed, name === 'later'));
      writeFileSync(join(folder, 'study.yaml'), study());
      const args = ['fit', join(folder, 'study.yaml'), '--out', join(folder, name), '--quiet'];
      await runCommandLine(args, { ...silent });
    }
    const fail = ({ message }: { readonly message: string }) => {
      throw new Error(message);
    };
    const started = performance.now();
    const earlier = await readCompared(join(folder, 'earlier'), fail);
    const later = await readCompared(join(folder, 'later'), fail);
    const read = performance.now();
    const comparison = compareRecords(earlier!, later!, fail);
    const done = performance.now();
    line('two records of 100,000 rows × 20 columns read', `${((read - started) / 1000).toFixed(3)} s`);
    line('compared', `${((done - read) / 1000).toFixed(3)} s`);
    line('both', `${((done - started) / 1000).toFixed(3)} s`);
    ratio('comparing beside reading', done - read, read - started);
    const { rows } = comparison!;
    line(
      'rows kept, revised, added, removed',
      [rows!.kept, rows!.revised, rows!.added, rows!.removed].join(', '),
    );
  } finally {
    rmSync(folder, { recursive: true });
  }
}

const silent = { out: () => {}, err: () => {}, colour: false, errIsTerminal: false, width: 80 };

const NAMES = Array.from({ length: COLUMNS }, (_, j) => `x${j + 1}`);

/** Rows `from` … `from` + 100,000 of one endless table, of which the later has every hundredth revised. */
function rowsFrom(from: number, seed: number, revised: boolean): string {
  const values = invented((from + ROWS) * (COLUMNS + 1), seed);
  const lines = [`id,${NAMES.join(',')},y`];
  for (let i = from; i < from + ROWS; i++) {
    const x = NAMES.map((_, j) => values[i * (COLUMNS + 1) + j]! * 100);
    if (revised && i % 100 === 0) x[0]! += 1;
    const y =
      x.reduce((sum, each, j) => sum + each * ((j % 5) - 2), 10) + values[i * (COLUMNS + 1) + COLUMNS]! * 50;
    lines.push(`r${i},${x.map((each) => each.toFixed(3)).join(',')},${y.toFixed(3)}`);
  }
  return `${lines.join('\n')}\n`;
}

function study(): string {
  return [
    'plumbrule: 1',
    'title: Many rows',
    'data:',
    '  file: rows.csv',
    '  row_id: id',
    '  variables:',
    '    id: { type: identifier }',
    ...[...NAMES, 'y'].map((name) => `    ${name}: { type: number }`),
    'response: y',
    'candidates:',
    `  - { name: All, terms: [${NAMES.join(', ')}] }`,
    'selection: { rank_by: bic }',
    '',
  ].join('\n');
}
