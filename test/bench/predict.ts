/** 200,000 rows predicted from a record with 20 coefficients, beside reading the same file. */
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { runCommandLine } from '../../src/cli/command-line.ts';
import { readTable } from '../../src/data/read-table.ts';
import { numbersPlan } from '../data/plans.ts';
import { invented, line, ratio } from './measure.ts';

const ROWS = 200_000;
const NAMES = Array.from({ length: 19 }, (_, j) => `x${j + 1}`);

export async function benchPredict(): Promise<void> {
  const folder = mkdtempSync(join(tmpdir(), 'plumbrule-bench-'));
  const at = (name: string) => join(folder, name);
  try {
    writeFileSync(at('rows.csv'), rowsText(2_000, 5, true));
    writeFileSync(at('next.csv'), rowsText(ROWS, 7, false));
    writeFileSync(at('study.yaml'), STUDY);
    await done(['fit', at('study.yaml'), '--out', at('out'), '--quiet']);
    const predict = [
      'predict',
      at('out/record.json'),
      at('next.csv'),
      '--out',
      at('predicted.csv'),
      '--quiet',
    ];
    const reading = await seconds(() => readTable(numbersPlan('next.csv', NAMES), folder, fail));
    line('200,000 rows × 19 columns read', `${reading.toFixed(3)} s of processor time`);
    for (const format of ['csv', 'json']) {
      const predicting = await seconds(() => done([...predict, '--format', format]));
      line(`read, predicted and written as ${format}`, `${predicting.toFixed(3)} s of processor time`);
      line('  rows in a second of it', String(Math.round(ROWS / predicting)));
      ratio('  that beside the 200,000 wanted', ROWS / predicting, 200_000);
      ratio('  predicting beside reading', predicting, reading);
    }
  } finally {
    rmSync(folder, { recursive: true });
  }
}

/** Processor time of the best of four runs. */
async function seconds(work: () => Promise<unknown>): Promise<number> {
  let best = Number.POSITIVE_INFINITY;
  for (let k = 0; k < 4; k++) {
    const before = process.cpuUsage();
    await work();
    best = Math.min(best, process.cpuUsage(before).user / 1e6);
  }
  return best;
}

async function done(args: readonly string[]): Promise<void> {
  let said = '';
  const err = (text: string) => {
    said += text;
  };
  const status = await runCommandLine([...args], {
    out: () => {},
    err,
    colour: false,
    errIsTerminal: false,
    width: 80,
  });
  if (status !== 0) throw new Error(`${args[0]} ended with status ${status}: ${said}`);
}

function fail({ message }: { readonly message: string }): void {
  throw new Error(message);
}

function rowsText(count: number, seed: number, withResponse: boolean): string {
  const values = invented(count * 20, seed);
  const lines = Array.from({ length: count }, (_, i) => {
    const x = NAMES.map((_, j) => values[i * 20 + j]! * 100);
    const y = x.reduce((sum, each, j) => sum + each * ((j % 5) - 2), 10) + values[i * 20 + 19]! * 50;
    return (withResponse ? [...x, y] : x).map((each) => each.toFixed(3)).join(',');
  });
  return `${[[...NAMES, ...(withResponse ? ['y'] : [])].join(','), ...lines].join('\n')}\n`;
}

const STUDY = [
  'plumbrule: 1',
  'title: Many rows',
  'data:',
  '  file: rows.csv',
  '  variables:',
  ...[...NAMES, 'y'].map((name) => `    ${name}: { type: number }`),
  'response: y',
  'candidates:',
  `  - { name: All, terms: [${NAMES.join(', ')}] }`,
  'selection: { rank_by: bic }',
  '',
].join('\n');
