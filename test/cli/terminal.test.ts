import { afterEach, expect, test, vi } from 'vitest';
import { processTerminal } from '../../src/cli/terminal.ts';

const streams = { out: process.stdout.isTTY, err: process.stderr.isTTY, columns: process.stdout.columns };

function shown(isTerminal: boolean, columns: number, env: { [name: string]: string }) {
  process.stdout.isTTY = isTerminal;
  process.stderr.isTTY = isTerminal;
  process.stdout.columns = columns;
  for (const name of ['NO_COLOR', 'TERM']) vi.stubEnv(name, env[name] ?? (name === 'TERM' ? 'xterm' : ''));
  return processTerminal();
}

afterEach(() => {
  vi.unstubAllEnvs();
  process.stdout.isTTY = streams.out;
  process.stderr.isTTY = streams.err;
  process.stdout.columns = streams.columns;
});

test('colour only on a terminal, and not with NO_COLOR or a dumb terminal', () => {
  expect(shown(true, 80, {}).colour).toBe(true);
  expect(shown(true, 80, { NO_COLOR: '1' }).colour).toBe(false);
  expect(shown(true, 80, { TERM: 'dumb' }).colour).toBe(false);
  expect(shown(false, 80, {}).colour).toBe(false);
});

test('a progress line only where it can be drawn over itself', () => {
  expect(shown(true, 80, {}).errIsTerminal).toBe(true);
  expect(shown(true, 80, { TERM: 'dumb' }).errIsTerminal).toBe(false);
  expect(shown(false, 80, {}).errIsTerminal).toBe(false);
});

test('as wide as the terminal, within reason', () => {
  expect(shown(true, 72, {}).width).toBe(72);
  expect(shown(true, 300, {}).width).toBe(100);
  expect(shown(true, 20, {}).width).toBe(48);
  expect(shown(false, 72, {}).width).toBe(100);
});
