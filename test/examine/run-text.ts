import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Problem } from '../../src/problem.ts';
import type { RecordModel, StudyRecord } from '../../src/record/record.ts';
import { runStudy } from '../../src/run/run-study.ts';

export interface Ran {
  readonly record: StudyRecord | null;
  readonly problems: readonly Problem[];
}

/** A whole run of a study over a data file data.csv, both as text, in a folder of its own. */
export async function runText(study: string, data: string): Promise<Ran> {
  const folder = mkdtempSync(join(tmpdir(), 'inference-'));
  try {
    writeFileSync(join(folder, 'study.yaml'), study);
    writeFileSync(join(folder, 'data.csv'), data);
    const { record, problems } = await runStudy(join(folder, 'study.yaml'));
    return { record, problems };
  } finally {
    rmSync(folder, { recursive: true });
  }
}

/** The chosen model of a run that must have one. */
export function modelOf({ record, problems }: Ran): RecordModel {
  if (record === null || record.model === null) throw new Error(JSON.stringify(problems));
  return record.model;
}

export type Columns = Readonly<Record<string, readonly (number | string)[]>>;

export function csv(columns: Columns): string {
  const names = Object.keys(columns);
  const rows = columns[names[0]!]!.map((_, i) => names.map((name) => columns[name]![i]).join(','));
  return `${[names.join(','), ...rows].join('\n')}\n`;
}

/** A study of y on the other columns: numbers, or categories where they are texts. */
export function studyOf(columns: Columns, rest: string, terms?: string): string {
  const names = Object.keys(columns);
  const variables = names.map(
    (name) => `    ${name}: { type: ${typeof columns[name]![0] === 'string' ? 'category' : 'number'} }`,
  );
  return `plumbrule: 1
title: Check
data:
  file: data.csv
  variables:
${variables.join('\n')}
response: y
candidates:
  - name: All
    terms: [${terms ?? names.filter((name) => name !== 'y').join(', ')}]
${rest}
`;
}
