import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { type ReadTableOptions, readTable } from '../../src/data/read-table.ts';
import type { Table } from '../../src/data/table.ts';
import type { Problem } from '../../src/problem.ts';
import type { DataPlan } from '../../src/study/study.ts';

export interface Reading {
  readonly table: Table | null;
  readonly problems: readonly Problem[];
}

/** Reads a text or bytes as the plan's data file, in a temporary folder. */
export async function read(
  content: string | Uint8Array | null,
  plan: DataPlan,
  options: ReadTableOptions = {},
): Promise<Reading> {
  return inFolder(async (folder) => {
    if (content !== null) writeFileSync(join(folder, plan.file), content);
    return readIn(folder, plan, options);
  });
}

export async function readIn(
  folder: string,
  plan: DataPlan,
  options: ReadTableOptions = {},
): Promise<Reading> {
  const problems: Problem[] = [];
  const table = await readTable(plan, folder, (problem) => problems.push(problem), options);
  return { table, problems };
}

export async function inFolder<T>(use: (folder: string) => Promise<T>): Promise<T> {
  const folder = mkdtempSync(join(tmpdir(), 'plumbrule-data-'));
  try {
    return await use(folder);
  } finally {
    rmSync(folder, { recursive: true });
  }
}

/** A column's values as plain things: numbers, level names, texts; null where missing. */
export function values(table: Table | null, name: string): (number | string | null)[] {
  const column = table?.columns.get(name);
  if (column === undefined) throw new Error(`no column ${name}`);
  switch (column.kind) {
    case 'text':
      return [...column.values];
    case 'category':
      return Array.from(column.codes, (code) => (code < 0 ? null : column.levels[code]!));
    default:
      return Array.from(column.values, (value) => (Number.isNaN(value) ? null : value));
  }
}

/** "code row variable" of each problem. */
export function marks(problems: readonly Problem[]): string[] {
  return problems.map(({ code, place }) =>
    place.kind === 'cell'
      ? [code, place.row, place.variable].filter((part) => part !== undefined).join(' ')
      : code,
  );
}
