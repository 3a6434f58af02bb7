import { expect, test } from 'vitest';
import { progressOn } from '../../src/cli/progress.ts';
import { collecting } from './collect.ts';

function progress(settings: Parameters<typeof collecting>[0], quiet = false) {
  let now = 0;
  const { terminal, printed } = collecting(settings);
  const line = progressOn(terminal, quiet, () => now);
  return {
    printed,
    clear: line.clear,
    at: (time: number, stage: string, done: number, total: number | null) => {
      now = time;
      line.show(stage, done, total);
    },
  };
}

test('shows long work only, not too often, and takes the line away', () => {
  const line = progress({ errIsTerminal: true });
  line.at(100, 'reading rows', 5, null);
  expect(line.printed.err).toBe('');
  line.at(1000, 'reading rows', 12_345, null);
  line.at(1050, 'reading rows', 13_000, null);
  line.at(2000, 'fitting candidates', 1, 3);
  expect(line.printed.err).toBe('\r\u001b[Kreading rows … 12,345\r\u001b[Kfitting candidates … 33 %');
  line.clear();
  line.clear();
  expect(line.printed.err.endsWith('33 %\r\u001b[K')).toBe(true);
  expect(line.printed.out).toBe('');
});

test('nothing where standard error is no terminal, or with --quiet, or where all was quick', () => {
  for (const line of [progress({}), progress({ errIsTerminal: true }, true)]) {
    line.at(5000, 'fitting candidates', 1, 2);
    line.clear();
    expect(line.printed.err).toBe('');
  }
  const quick = progress({ errIsTerminal: true });
  quick.at(10, 'fitting candidates', 1, 2);
  quick.clear();
  expect(quick.printed.err).toBe('');
});
