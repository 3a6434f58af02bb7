/**
 * Records of whole runs of studies that declare what the report has a place for, over the invented crossings of
 * sample-data.ts: what the hand-made sample record leaves out, in the shape that the program writes today.
 */
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { StudyRecord } from '../../src/report/record-type.ts';
import { runStudy } from '../../src/run/run-study.ts';
import { drawData } from './sample-data.ts';

export interface Declared {
  readonly candidates: string;
  /** More keys at the top of the study. */
  readonly rest: string;
  readonly rows?: number;
  readonly response?: string;
  readonly derive?: string;
}

const ASKED = `predict:
  interval: 0.9
  rows:
    - { label: "Loaded, slow", cargo: 80, axle_load: 13.3, speed: 9, headwind: 4, hull_days: 60, vessel: Tern }
    - { label: Light and fast, cargo: 30, axle_load: 5, speed: 12, headwind: 2, hull_days: 20, vessel: Skerry }
    - { label: Full in a gale, cargo: 160, axle_load: 26.6, speed: 10, headwind: 18, hull_days: 90, vessel: Holm }
`;

/** The record of a whole run; throws where it has none. */
export async function declaredRecord({ candidates, rest, ...wish }: Declared): Promise<StudyRecord> {
  const data = drawData({ n: wish.rows ?? 150, log: false, vessels: ['Skerry', 'Tern', 'Holm'] });
  const columns = [...data.columns.values()];
  const days = (i: number): string =>
    new Date(Date.UTC(2024, 0, 1 + Math.floor(i / 2))).toISOString().slice(0, 10);
  const lines = Array.from({ length: data.n }, (_, i) =>
    [`C${i + 1}`, days(i), data.response[i], ...columns.map((c) => c.numbers?.[i] ?? c.texts?.[i])].join(','),
  );
  const study = `plumbrule: 1
title: Fuel burned per crossing
question: How much gas oil will the spring timetable burn, and what drives it?
data:
  file: crossings.csv
  row_id: crossing
  time: departed
  variables:
    crossing: { type: identifier }
    departed: { type: date }
    fuel: { type: number, unit: L, label: Fuel burned }
${columns
  .map(({ name, label, unit, levels }) =>
    levels === null
      ? `    ${name}: { type: number, unit: ${unit}, label: ${label} }`
      : `    ${name}: { type: category, levels: [${levels.join(', ')}], label: ${label} }`,
  )
  .join('\n')}
${wish.derive ?? ''}
response: ${wish.response ?? 'fuel'}
candidates:
${candidates}
${rest}
${ASKED}`;
  const folder = mkdtempSync(join(tmpdir(), 'plumbrule-report-'));
  try {
    writeFileSync(join(folder, 'study.yaml'), study);
    writeFileSync(
      join(folder, 'crossings.csv'),
      `crossing,departed,fuel,${columns.map(({ name }) => name).join(',')}\n${lines.join('\n')}\n`,
    );
    const { record, problems } = await runStudy(join(folder, 'study.yaml'));
    if (record === null) throw new Error(JSON.stringify(problems));
    return record;
  } finally {
    rmSync(folder, { recursive: true });
  }
}

const NAMED = `  - name: Load and speed
    terms: [cargo, { power: speed, to: 3 }]
  - name: With wind
    terms: [cargo, { power: speed, to: 3 }, { polynomial: headwind, degree: 2 }, vessel]
  - name: Load and hull
    terms: [cargo, hull_days]
`;

/** Everything that the study file offers for inference and examination. */
export const EXAMINED: Declared = {
  candidates: NAMED,
  rest: `inference:
  standard_errors: hc3
  level_comparisons: tukey_kramer
  simultaneous: bonferroni
  slopes_at: { speed: [8, 10, 12], headwind: [-5, 0, 2, 5, 8] }
  hypotheses:
    - name: Tern burns like Skerry
      combination: { vessel Tern: 1 }
    - name: Both burn like Skerry
      all_of:
        - combination: { vessel Tern: 1 }
        - combination: { vessel Holm: 1 }
examination:
  lags: 3
  split_at: { variable: departed, value: 2024-02-10 }
  bootstrap: { repetitions: 199 }
`,
};

/** A model of two measures of one thing. */
export const TANGLED: Declared = {
  candidates: `  - name: Both measures
    terms: [cargo, axle_load, speed, headwind, hull_days, vessel]
`,
  rest: '',
};

/** Everything that the study file offers for telling how far the choice can be trusted. */
export const TESTED: Declared = {
  candidates: NAMED,
  rest: `selection:
  rank_by: aicc
  validation: { by: rows, folds: 5, repeats: 2 }
  honest_error: { by: rows, folds: 5 }
  stability: { repetitions: 30 }
  hold_out: { last: 20 }
  average: true
`,
};

/** Searched families beside one named candidate. */
export const SEARCHED: Declared = {
  candidates: `  - name: Load alone
    terms: [cargo]
  - name: Any
    subsets_of: [cargo, axle_load, speed, headwind, hull_days, vessel]
    keep: 3
  - name: Back
    eliminate_from: [cargo, axle_load, speed, headwind, hull_days, vessel]
    leave_at: 0.05
`,
  rest: `selection:
  rank_by: aicc
  stability: { repetitions: 30 }
`,
};

/** Chosen on one part of the rows, estimated on the other. */
export const SPLIT: Declared = { candidates: NAMED, rest: 'selection: { split_sample: { share: 0.5 } }\n' };
