import { expect, test } from 'vitest';
import { averaged, unconditional } from '../../src/select/average.ts';
import { choose } from '../../src/select/choose.ts';
import { coefficientFigures } from '../../src/select/coefficients.ts';
import { variable } from '../engine/models.ts';
import { makeGround, numbers } from './make-ground.ts';
import { studyWith } from './study-with.ts';

test('averages are weights of evidence times estimates, written out (Burnham & Anderson 2002, 4.3)', () => {
  const next = numbers(9);
  const n = 40;
  const a = Array.from({ length: n }, () => next());
  const b = Array.from({ length: n }, () => next() + 0.1);
  const data = { y: a.map((v, i) => 2 + v + 0.5 * b[i]! + next()), a, b };
  const { fitted } = makeGround(data, ['a', 'b'].map(variable), [[0], [0, 1], [0, 1, 2], [0, 2]]);
  const study = studyWith({ rankBy: 'aicc', admit: { signs: new Map([['b', 'positive']]) } });
  const choice = choose(study, fitted, () => {});
  const found = averaged(study.selection, fitted, choice.ranking, choice.admissions, 0.9)!;
  const values = new Map(choice.ranking.map(({ candidate, value }) => [candidate, value!]));
  const admitted = [0, 1, 2, 3].filter((k) => choice.admissions[k]!.admitted);
  const least = Math.min(...admitted.map((k) => values.get(k)!));
  const raw = admitted.map((k) => Math.exp(-(values.get(k)! - least) / 2));
  const whole = raw.reduce((x, y) => x + y, 0);
  const weights = new Map(admitted.map((k, i) => [k, raw[i]! / whole]));
  expect(found.candidates.reduce((sum, { weight }) => sum + weight, 0)).toBeCloseTo(1, 14);
  for (const { candidate, weight } of found.candidates)
    expect(weight).toBeCloseTo(weights.get(candidate)!, 12);

  for (const [column, name] of [
    [0, 'intercept'],
    [1, 'a'],
    [2, 'b'],
  ] as const) {
    const one = found.coefficients.find((each) => each.column === column)!;
    const figures = admitted.map((k) => {
      const own = coefficientFigures(fitted.fits[k]!, fitted.columnNames, 0.9).find(
        (each) => each.name === name,
      );
      return {
        w: weights.get(k)!,
        has: own !== undefined,
        b: own?.estimate ?? 0,
        se: own?.standard_error ?? 0,
      };
    });
    const mean = figures.reduce((sum, { w, b: estimate }) => sum + w * estimate, 0);
    const error = figures.reduce(
      (sum, { w, b: estimate, se }) => sum + w * Math.sqrt(se ** 2 + (estimate - mean) ** 2),
      0,
    );
    expect(one.estimate).toBeCloseTo(mean, 12);
    expect(one.standardError).toBeCloseTo(error, 12);
    expect(one.weight).toBeCloseTo(
      figures.reduce((sum, { w, has }) => sum + (has ? w : 0), 0),
      12,
    );
    // 1.6448536… is the normal quantile at 0.95.
    expect(one.upper - one.estimate).toBeCloseTo(1.6448536269514722 * error, 10);
    const within = figures.filter(({ has }) => has);
    const share = within.reduce((sum, { w }) => sum + w, 0);
    expect(one.whereIncluded.estimate).toBeCloseTo(
      within.reduce((sum, { w, b: estimate }) => sum + (w / share) * estimate, 0),
      12,
    );
  }
});

test('one candidate alone keeps its estimate and error; none admitted gives nothing', () => {
  expect(unconditional([{ weight: 1, estimate: 3, error: 0.5 }])).toEqual({
    estimate: 3,
    standardError: 0.5,
  });
  const { fitted } = makeGround({ y: [1, 2, 4, 3, 6], a: [1, 2, 3, 4, 5] }, [variable('a')], [[0, 1]]);
  const study = studyWith({ rankBy: 'aic', admit: { signs: new Map([['a', 'negative']]) } });
  const choice = choose(study, fitted, () => {});
  expect(averaged(study.selection, fitted, choice.ranking, choice.admissions, 0.9)).toBeNull();
});
