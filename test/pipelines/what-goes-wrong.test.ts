/** Every shipped study runs and meets its own limits, and shows what its README says that it shows. */
import { cpSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { afterAll, describe, expect, test } from 'vitest';
import { type Document, parseDocument } from 'yaml';
import type { StudyRecord } from '../../src/record/record.ts';
import { runStudy } from '../../src/run/run-study.ts';

const pipelines = fileURLToPath(new URL('../../pipelines/', import.meta.url));
const scratch = mkdtempSync(join(tmpdir(), 'careless-'));
afterAll(() => rmSync(scratch, { recursive: true }));

async function run(study: string): Promise<StudyRecord> {
  const { record, problems } = await runStudy(study);
  expect(problems.filter((problem) => problem.severity === 'error')).toEqual([]);
  return record!;
}

const shipped = (name: string) => run(join(pipelines, name, 'study.yaml'));

/** The shipped study as a careless analyst would have it. */
function careless(name: string, change: (study: Document) => void): Promise<StudyRecord> {
  const folder = join(scratch, name);
  cpSync(join(pipelines, name), folder, { recursive: true });
  const study = parseDocument(readFileSync(join(folder, 'study.yaml'), 'utf8'));
  change(study);
  writeFileSync(join(folder, 'study.yaml'), study.toString());
  return run(join(folder, 'study.yaml'));
}

/** Without rules of admission, and with only the candidate of this name. */
const only = (candidate: string) => (study: Document) => {
  const all = study.toJS().candidates as { name: string }[];
  study.set(
    'candidates',
    all.filter((each) => each.name === candidate),
  );
  study.deleteIn(['selection', 'admit']);
  study.delete('acceptance');
};

const candidate = (record: StudyRecord, name: string) =>
  record.candidates.find((each) => each.name === name)!;
const coefficient = (record: StudyRecord, name: string, column: string) =>
  candidate(record, name).coefficients.find((each) => each.name === column)!;
const best = (record: StudyRecord, figure: 'r_squared' | 'adjusted_r_squared') =>
  [...record.candidates]
    .filter((each) => each.scale === record.candidates.at(-1)!.scale)
    .sort((a, b) => b[figure]! - a[figure]!)[0]!.name;
const prediction = (record: StudyRecord, label: string) =>
  record.predictions.find((each) => each.label.startsWith(label))!;

describe('ferry-fuel', () => {
  test('meets its limits; the candidate with every load measure fits best and is refused', async () => {
    const record = await shipped('ferry-fuel');
    expect(record.acceptance.filter((each) => !each.passed)).toEqual([]);
    expect(record.selection.chosen).toBe('By vessel');
    expect(best(record, 'r_squared')).toBe('Every load measure');
    expect(best(record, 'adjusted_r_squared')).toBe('Every load measure');
    expect(coefficient(record, 'Every load measure', 'booked_cargo').estimate).toBeLessThan(-1);
    expect(candidate(record, 'Every load measure').largest_vif).toBeGreaterThan(30);
    expect(candidate(record, 'Every load measure').admitted).toBe(false);
    expect(record.data.left_out.find((each) => each.kind === 'left_out')?.rows).toBe(9);
    expect(record.examination!.influential_rows[0]!.id).toBe('X0171');
    expect(prediction(record, '21.00').outside).not.toEqual([]);
    expect(record.predictions.filter((each) => each.outside.length > 0)).toHaveLength(1);
  });

  test('with the trials kept, load counts double and a straight line in speed ranks first', async () => {
    const kept = await careless('ferry-fuel', (study) => {
      study.delete('leave_out');
      study.delete('acceptance');
    });
    const weight = (record: StudyRecord) => coefficient(record, 'By vessel', 'deck_weight').estimate;
    expect(weight(kept) / weight(await shipped('ferry-fuel'))).toBeGreaterThan(2);
    expect(kept.selection.ranking[0]!.candidate).toBe('By vessel, speed as a straight line');
  });
});

describe('cold-store-electricity', () => {
  test('meets its limits; the curve fits best, says that doors save electricity, and is refused', async () => {
    const record = await shipped('cold-store-electricity');
    expect(record.acceptance.filter((each) => !each.passed)).toEqual([]);
    expect(record.selection.chosen).toBe('Bend at 12 °C');
    expect(best(record, 'adjusted_r_squared')).toBe('Curve and everything else');
    expect(coefficient(record, 'Curve and everything else', 'openings_per_day').estimate).toBeLessThan(0);
    expect(candidate(record, 'Curve and everything else').admitted).toBe(false);
    const durbinWatson = record.examination!.findings.find((each) => each.name === 'independence')!;
    expect(durbinWatson.statistic).toBeCloseTo(1.04, 2);
    expect(durbinWatson.concern).toBeGreaterThan(0);
    expect(prediction(record, 'A July hotter').outside).not.toEqual([]);
  });

  test('a straight line falls about 400 kWh a day short in a hot July', async () => {
    const straight = await careless('cold-store-electricity', only('Straight line and intake'));
    const bent = await shipped('cold-store-electricity');
    const short = prediction(bent, 'A July hotter').estimate - prediction(straight, 'A July hotter').estimate;
    expect(straight.candidates[0]!.r_squared).toBeGreaterThan(0.85);
    expect(short).toBeGreaterThan(380);
    expect(short).toBeLessThan(430);
  });
});

describe('workshop-repairs', () => {
  test('meets its limits; scales rank together and the log is chosen', async () => {
    const record = await shipped('workshop-repairs');
    expect(record.acceptance.filter((each) => !each.passed)).toEqual([]);
    expect(record.selection.chosen).toBe('Hours multiply');
    expect(new Set(record.candidates.map((each) => each.scale))).toEqual(new Set(['natural', 'log', 'sqrt']));
    expect(coefficient(record, 'Hours add up', 'urgency').p_value).toBeGreaterThan(0.2);
    expect(coefficient(record, 'Hours multiply', 'urgency').p_value).toBeLessThan(0.001);
    expect(record.data.bad_value_count).toBe(3);
    expect(record.examination!.influential_rows.slice(0, 2).map((each) => each.id)).toEqual([
      'R-4303',
      'R-4368',
    ]);
    for (const each of record.predictions) {
      expect(each.lower).toBeGreaterThan(0);
      expect(each.mean).toBeGreaterThan(each.estimate);
    }
  });

  test('hours that add up are quoted below zero', async () => {
    const cab = prediction(await careless('workshop-repairs', only('Hours add up')), 'Cab job');
    expect(cab.estimate).toBeLessThan(0);
    expect(cab.lower).toBeLessThan(-6);
  });
});
