/** Slopes and effects on the response's own scale, against differences and closed forms. */
import { describe, expect, test } from 'vitest';
import type { RecordTerm } from '../../src/record/record.ts';
import { csv, modelOf, runText, studyOf } from './run-text.ts';

const n = 60;
const jitter = (i: number, k: number) => (((i * k) % 97) - 48) / 48;
const x = Array.from({ length: n }, (_, i) => 20 + i + jitter(i, 7919));
const g = Array.from({ length: n }, (_, i) => ['a', 'b', 'c'][i % 3]!);
const y = x.map((each, i) => 40 + each / 2 + each ** 2 / 90 + 3 * jitter(i, 104729) + (g[i] === 'b' ? 6 : 0));
const data = { y, x, g };

function termNamed(terms: readonly RecordTerm[], name: string): RecordTerm {
  const found = terms.find((each) => each.name === name);
  if (found === undefined) throw new Error(terms.map((each) => each.name).join(', '));
  return found;
}

async function terms(list: string, rest = '', columns: Record<string, readonly (number | string)[]> = data) {
  const ran = await runText(studyOf(columns, rest, list), csv(columns));
  return {
    terms: modelOf(ran).terms,
    coefficients: ran.record!.candidates[0]!.coefficients,
    model: modelOf(ran),
  };
}

/** Predictions at x: the curve itself, by the program's other way. */
async function heights(list: string, at: readonly number[]): Promise<number[]> {
  const rows = at.map((value, k) => `    - { label: "${k}", x: ${value}, g: a }`).join('\n');
  const ran = await runText(studyOf(data, `predict:\n  rows:\n${rows}`, list), csv(data));
  return ran.record!.predictions.map(({ estimate }) => estimate!);
}

describe('slopes along a curve', () => {
  test.each([
    ['{ polynomial: x, degree: 3 }, g', 'x, degree 3'],
    ['{ power: x, to: 2 }, g', 'x²'],
    ['x, { bend: x, at: 45 }, g', 'x above 45'],
    ['x, { bend: x, at: 45, side: below }, g', 'x below 45'],
    ['{ spline: x, knots: [22, 35, 50, 75] }, g', 'x, spline'],
  ])('%s: the difference quotient of predictions', async (list, name) => {
    const places = [25, 41.5, 60, 90];
    const found = termNamed((await terms(list, `inference: { slopes_at: { x: [${places}] } }`)).terms, name);
    expect(found.slopes_along).toMatchObject({ variable: 'x', declared: true });
    expect(found.slopes_along!.places.map(({ at }) => at)).toEqual(places);
    const step = 1e-3;
    const around = await heights(
      list,
      places.flatMap((at) => [at - step, at + step]),
    );
    found.slopes_along!.places.forEach(({ estimate, percent }, k) => {
      const quotient = (around[2 * k + 1]! - around[2 * k]!) / (2 * step);
      expect(estimate).toBeCloseTo(quotient, 6);
      expect(percent).toBeNull();
    });
  });

  test('at the quartiles where no places are declared, and in per cent of a logarithm', async () => {
    const study = studyOf(data, '', '{ polynomial: x, degree: 2 }').replace(
      'response: y',
      'response: { variable: y, scale: log }',
    );
    const model = modelOf(await runText(study, csv(data)));
    const [term] = model.terms;
    expect(term!.slopes_along!.declared).toBe(false);
    expect(term!.slopes_along!.places.length).toBe(3);
    const [, b1, b2] = model.columns.map(({ estimate }) => estimate);
    for (const { at, estimate, lower, percent } of term!.slopes_along!.places) {
      expect(estimate).toBeCloseTo(b1! + 2 * b2! * at, 10);
      expect(percent!.estimate).toBeCloseTo(100 * (Math.exp(estimate) - 1), 10);
      expect(percent!.lower).toBeCloseTo(100 * (Math.exp(lower!) - 1), 10);
    }
  });

  test('none along straight lines, flags and categories', async () => {
    const found = await terms('x, g');
    expect(found.terms.map((each) => each.slopes_along)).toEqual([null, null]);
  });
});

describe('slopes of interactions', () => {
  test('at the declared places of a number', async () => {
    const z = Array.from({ length: n }, (_, i) => 10 + 5 * jitter(i, 31337));
    const { terms: found, coefficients } = await terms(
      'x, z, { interaction: [x, z] }',
      'inference: { slopes_at: { z: [0, 12] } }',
      { y, x, z },
    );
    const { slopes } = termNamed(found, 'x × z');
    const b = new Map(coefficients.map(({ name, estimate }) => [name, estimate]));
    expect(slopes.map(({ at, of }) => [at, of])).toEqual([
      ['z 0', 'x'],
      ['z 12', 'x'],
    ]);
    expect(slopes[0]!.estimate).toBeCloseTo(b.get('x')!, 10);
    expect(slopes[1]!.estimate).toBeCloseTo(b.get('x')! + 12 * b.get('x × z')!, 10);
    expect(slopes.map(({ percent }) => percent)).toEqual([null, null]);
  });
});

describe('effects on the own scale', () => {
  test('natural: the coefficient says it', async () => {
    expect((await terms('x, g')).terms.map((each) => each.own_scale)).toEqual([null, null]);
  });

  test('logarithm: per cent for a step of one, and for levels', async () => {
    const study = studyOf(data, '', 'x, g').replace('response: y', 'response: { variable: y, scale: log }');
    const ran = await runText(study, csv(data));
    const [ofX, ofG] = modelOf(ran).terms.map((each) => each.own_scale!);
    const b = new Map(ran.record!.candidates[0]!.coefficients.map((each) => [each.name, each]));
    expect(ofX!.kind).toBe('percent');
    expect(ofX!.effects[0]!.of).toBe('a step of 1 in x');
    expect(ofX!.effects[0]!.estimate).toBeCloseTo(100 * Math.expm1(b.get('x')!.estimate), 10);
    expect(ofX!.effects[0]!.upper).toBeCloseTo(100 * Math.expm1(b.get('x')!.upper!), 9);
    expect(ofG!.effects.map(({ of }) => of)).toEqual(['b rather than a', 'c rather than a']);
    expect(ofG!.effects[0]!.estimate).toBeCloseTo(100 * Math.expm1(b.get('g b')!.estimate), 10);
  });

  test('both logarithms: an elasticity; the variable alone: per doubling', async () => {
    const derived = (response: string) =>
      studyOf(data, '', 'log_x, g').replace(
        'response: y',
        `derive:\n  log_x: { expression: log(x) }\n  ten_y: { expression: log10(y) }\nresponse: ${response}`,
      );
    const run = async (response: string) => {
      const ran = await runText(derived(response), csv(data));
      const b = ran.record!.candidates[0]!.coefficients.find(({ name }) => name === 'log_x')!;
      return { own: modelOf(ran).terms[0]!.own_scale!, b };
    };
    const scale = await run('{ variable: y, scale: log }');
    expect(scale.own).toMatchObject({ kind: 'elasticity', effects: [{ of: 'x' }] });
    expect(scale.own.effects[0]!.estimate).toBeCloseTo(scale.b.estimate, 10);
    // The response as a logarithm to base 10 by its own expression: the same elasticity.
    const ten = await run('ten_y');
    expect(ten.own.kind).toBe('elasticity');
    expect(ten.own.effects[0]!.estimate).toBeCloseTo(scale.b.estimate, 10);
    expect(ten.own.effects[0]!.lower).toBeCloseTo(scale.b.lower!, 9);
    const natural = await run('y');
    expect(natural.own.kind).toBe('per_doubling');
    expect(natural.own.effects[0]!.estimate).toBeCloseTo(natural.b.estimate * Math.LN2, 10);
  });

  test.each(['sqrt', 'reciprocal', '{ box_cox: 0.5 }'])(
    '%s: the difference between predictions at both ends of a step',
    async (scale) => {
      const mean = x.reduce((sum, each) => sum + each, 0) / n;
      const study = (rest: string) =>
        studyOf(data, rest, 'x, g').replace('response: y', `response: { variable: y, scale: ${scale} }`);
      const model = modelOf(await runText(study(''), csv(data)));
      const [ofX, ofG] = model.terms.map((each) => each.own_scale!);
      const [step] = model.terms[0]!.typical_steps;
      const rows = `predict:
  rows:
    - { label: from, x: ${step!.from_value}, g: a }
    - { label: to, x: ${step!.to_value}, g: a }
    - { label: a, x: ${mean}, g: a }
    - { label: b, x: ${mean}, g: b }`;
      const { record } = await runText(study(rows), csv(data));
      const at = new Map(record!.predictions.map(({ label, estimate }) => [label, estimate!]));
      expect(ofX!.kind).toBe('difference');
      expect(ofX!.effects[0]!.estimate).toBeCloseTo(at.get('to')! - at.get('from')!, 8);
      expect(ofG!.effects[0]!.estimate).toBeCloseTo(at.get('b')! - at.get('a')!, 8);
      const { estimate, lower, upper } = ofX!.effects[0]!;
      expect(lower!).toBeLessThan(estimate);
      expect(upper! - estimate).toBeCloseTo(estimate - lower!, 8);
    },
  );

  test('the interval of a difference is the first-order one', async () => {
    const study = studyOf(data, '', 'x').replace('response: y', 'response: { variable: y, scale: sqrt }');
    const ran = await runText(study, csv(data));
    const model = modelOf(ran);
    const { effects } = model.terms[0]!.own_scale!;
    const [step] = model.terms[0]!.typical_steps;
    const v = model.covariance!;
    const b = model.columns.map(({ estimate }) => estimate);
    // D = z₁² − z₀² with z = b₀ + b₁x; gradient 2z₁(1, x₁) − 2z₀(1, x₀).
    const [x0, x1] = [step!.from_value!, step!.to_value!];
    const [z0, z1] = [b[0]! + b[1]! * x0, b[0]! + b[1]! * x1];
    const d = [2 * z1 - 2 * z0, 2 * z1 * x1 - 2 * z0 * x0];
    const variance = d[0]! ** 2 * v[0]![0]! + 2 * d[0]! * d[1]! * v[0]![1]! + d[1]! ** 2 * v[1]![1]!;
    const c = ran.record!.candidates[0]!.coefficients[0]!;
    const t = (c.upper! - c.estimate) / c.standard_error!;
    expect(effects[0]!.upper! - effects[0]!.estimate).toBeCloseTo(t * Math.sqrt(variance), 8);
  });
});
