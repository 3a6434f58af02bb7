import { scaleLinear } from 'd3-scale';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { placesAlong, roomy, ticksOf } from '../../src/report/chart/axes.ts';
import { candidatesChart } from '../../src/report/chart/candidates.ts';
import { fittedObservedChart } from '../../src/report/chart/fitted-observed.ts';
import { influenceChart } from '../../src/report/chart/influence.ts';
import { ladderChart } from '../../src/report/chart/ladder.ts';
import { levelsChart } from '../../src/report/chart/levels.ts';
import { curveAt, partialChart } from '../../src/report/chart/partial.ts';
import { predictionsChart } from '../../src/report/chart/predictions.ts';
import {
  residualsFittedChart,
  residualsPredictorChart,
  residualsTimeChart,
} from '../../src/report/chart/residuals.ts';
import { correlation, ranks, shareBetween, spreadAlong, twoThirds } from '../../src/report/chart/summary.ts';
import { at, clipped, dots, escaped } from '../../src/report/chart/svg.ts';
import type { RecordExamination, StudyRecord } from '../../src/report/record-type.ts';
import { lexiconOf } from '../../src/report/words/lexicon.ts';
import { NASTY, sampleRecord } from './sample-record.ts';
import { sound } from './sound.ts';

const record = sampleRecord();
const lexicon = lexiconOf(record);

const wild = fc.oneof(
  fc.double({ min: -1e6, max: 1e6, noNaN: true }),
  fc.double({ noNaN: true, noDefaultInfinity: true, min: -1e200, max: 1e200 }),
  fc.constantFrom(0, -0, 1e-300, 1, 1e9),
);

const points = fc
  .array(
    fc.tuple(
      wild,
      wild,
      fc.option(fc.double({ min: 0, max: 1e5, noNaN: true })),
      fc.constantFrom('a', 'b', '<c>'),
    ),
    { minLength: 1, maxLength: 60 },
  )
  .map((rows): RecordExamination['points'] => ({
    thinned: false,
    row: rows.map((_, i) => i + 2),
    id: rows.map((_, i) => (i % 2 ? null : `<${i}>`)),
    fitted: rows.map((r) => r[0]),
    observed: rows.map((r) => r[1]),
    residual: rows.map((r) => r[1] - r[0]),
    standardised_residual: rows.map(() => null),
    leverage: rows.map(() => 0.5),
    cooks_distance: rows.map((r) => r[2]),
    time_position: rows.map((_, i) => rows.length - i),
    values: [
      { variable: 'cargo', numbers: rows.map((r) => r[1] / 2), texts: null },
      { variable: 'vessel', numbers: null, texts: rows.map((r) => r[3]) },
    ],
  }));

describe('charts of any data', () => {
  it('of rows are sound', () => {
    fc.assert(
      fc.property(points, (p) => {
        sound(fittedObservedChart(lexicon, p, record.model!));
        sound(residualsFittedChart(lexicon, p));
        sound(residualsTimeChart(lexicon, p));
        sound(residualsPredictorChart(lexicon, p));
        sound(residualsPredictorChart(lexicon, { ...p, values: [p.values[1]!] }));
        sound(influenceChart({ ...record.examination!, points: p }));
        const x = [...new Set(p.fitted)].sort((a, b) => a - b);
        sound(
          partialChart(
            lexicon,
            'term-1',
            {
              variable: 'cargo',
              x,
              y: x.map((v) => v / 3),
              lower: x.map(() => null),
              upper: x.map((v) => v),
            },
            p,
            'A caption.',
          ),
        );
      }),
      { numRuns: 60 },
    );
  });
  it('of estimates are sound on every scale', () => {
    const estimate = fc.record({
      estimate: fc.double({ min: -50, max: 50, noNaN: true }),
      half: fc.option(fc.double({ min: 0, max: 40, noNaN: true })),
    });
    fc.assert(
      fc.property(
        fc.array(estimate, { minLength: 1, maxLength: 30 }),
        fc.constantFrom('natural', 'log', 'sqrt', 'reciprocal', 'box_cox'),
        (list, scale) => {
          const own = { ...lexicon, response: { ...lexicon.response, scale } };
          const steps = list.map((e, i) => ({
            from: 'a',
            to: `b${i}`,
            from_value: null,
            to_value: null,
            estimate: e.estimate,
            lower: e.half === null ? null : e.estimate - e.half,
            upper: e.half === null ? null : e.estimate + e.half,
          }));
          sound(ladderChart(own, [{ ...record.model!.terms[0]!, typical_steps: steps }]));
          sound(
            levelsChart(
              own,
              'term-2',
              'Levels',
              [{ name: 'a', difference: null }, ...steps.map((s) => ({ name: s.to, difference: s }))],
              'A caption.',
            ),
          );
          sound(
            predictionsChart(
              own,
              steps.map((s) => ({
                label: s.to,
                values: [],
                estimate: s.estimate,
                lower: s.lower ?? s.estimate,
                upper: s.upper ?? s.estimate,
                mean_lower: s.estimate,
                mean_upper: s.estimate,
                mean: null,
                leverage: 0.1,
                outside: [],
              })),
            ),
          );
        },
      ),
      { numRuns: 60 },
    );
  });
  it('of candidates are sound, whatever their distances', () => {
    const one = fc.tuple(
      fc.option(fc.double({ min: 0, max: 1e6, noNaN: true })),
      fc.integer({ min: 1, max: 40 }),
    );
    fc.assert(
      fc.property(
        fc.array(one, { minLength: 1, maxLength: 40 }),
        fc.constantFrom(0, 2, 1e-3),
        (list, within) => {
          const names = list.map((_, i) => `Candidate <${i}>`);
          const own: StudyRecord = {
            ...record,
            candidates: list.map(([, size], i) => ({
              ...record.candidates[0]!,
              name: names[i]!,
              coefficient_count: size,
            })),
            selection: {
              ...record.selection,
              prefer_smaller_within: within,
              chosen: names[0]!,
              ranking: list.map(([difference], i) => ({
                rank: i + 1,
                candidate: names[i]!,
                value: difference,
                difference,
              })),
            },
          };
          sound(candidatesChart(own));
        },
      ),
      { numRuns: 60 },
    );
  });
});

describe('charts of the sample', () => {
  it('draw every row, thousands of them in little space', () => {
    const many = sampleRecord({ rows: 3000 });
    const { points: p } = many.examination!;
    const figure = fittedObservedChart(lexiconOf(many), p, many.model!);
    const drawn = figure.svg.match(/h0/g)!.length;
    expect(drawn).toBeGreaterThan(0.9 * p.row.length);
    expect(drawn).toBeLessThanOrEqual(p.row.length);
    expect(figure.svg.length).toBeLessThan(40_000);
  });
  it('are left out where there is nothing to draw', () => {
    expect(residualsTimeChart(lexicon, { ...record.examination!.points, time_position: null })).toBeNull();
    expect(ladderChart(lexicon, [])).toBeNull();
    expect(predictionsChart(lexicon, [])).toBeNull();
    expect(candidatesChart(sampleRecord({ candidates: 1 }))).toBeNull();
    expect(
      influenceChart({
        ...record.examination!,
        points: {
          ...record.examination!.points,
          cooks_distance: record.examination!.points.row.map(() => null),
        },
      }),
    ).toBeNull();
    expect(residualsPredictorChart(lexicon, { ...record.examination!.points, values: [] })).toBeNull();
  });
  it('say what they show: the spread that grows, neighbours that resemble each other', () => {
    const p = record.examination!.points;
    const grows = { ...p, residual: p.fitted.map((f, i) => (i % 2 ? 1 : -1) * (f - 200)) };
    expect(residualsFittedChart(lexicon, grows).caption).toMatch(/^The spread grows with the fitted value/);
    const alike = { ...p, residual: p.time_position!.map((t) => Math.sin(t / 20)) };
    expect(residualsTimeChart(lexicon, alike)!.caption).toMatch(/^Neighbours in time resemble each other/);
    const byCargo = {
      ...p,
      residual: p.values.find((v) => v.variable === 'cargo')!.numbers!.map((c, i) => (i % 2 ? c : -c)),
    };
    expect(residualsPredictorChart(lexicon, byCargo)!.caption).toMatch(
      /cargo goes most .* \(rank correlation 1\.00\): they are larger where it is high\.$/,
    );
  });
  it('make no statement about the spread of rows that were thinned towards the extremes', () => {
    const thinned = { ...record.examination!.points, thinned: true };
    expect(residualsFittedChart(lexicon, thinned).caption).not.toMatch(/\d/);
    expect(residualsTimeChart(lexicon, thinned)!.caption).not.toContain('correlation');
  });
  it('escape names', () => {
    const nasty = sampleRecord({ vessels: NASTY });
    const figure = levelsChart(
      lexiconOf(nasty),
      'x',
      NASTY[0],
      NASTY.map((name) => ({ name, difference: { estimate: 1, lower: 0, upper: 2 } })),
      'A caption.',
    )!;
    sound(figure);
    expect(figure.svg).not.toContain('<script');
    expect(figure.svg).toContain('&lt;script&gt;');
  });
});

describe('drawing helpers', () => {
  it('write coordinates short and refuse what is not a number', () => {
    expect([1, 1.25, -0.04, 10.04].map(at)).toEqual(['1', '1.3', '0', '10']);
    expect(() => at(Number.NaN)).toThrow('not a number');
  });
  it('leave out dots that are not finite and draw equal ones once', () => {
    expect(dots([1, 1, Number.NaN], [2, 2, 1], 'd')).toBe('<path class="d" d="M1 2h0"/>');
    expect(dots([], [], 'd')).toBe('');
  });
  it('place many values where the scale puts each', () => {
    const scale = roomy([-3, 1e6], [400, 12]);
    const values = [-3, 0, 0.1, 77.7, 1e6, 2e6];
    expect([...placesAlong(scale, values)]).toEqual(values.map((value) => scale(value)));
  });
  it('clip by letters, not by halves of them', () => {
    expect(clipped('😀😀😀', 2)).toBe('😀…');
    expect(clipped('short', 9)).toBe('short');
    expect(escaped(`<a b="c">'\u0001&`)).toBe('&lt;a b=&quot;c&quot;&gt;&#39;&amp;');
  });
  it('give ticks as many decimals as their step', () => {
    const texts = (a: number, b: number): string[] =>
      ticksOf(scaleLinear().domain([a, b]), 4).map((t) => t.text);
    expect(texts(0, 1)).toEqual(['0.0', '0.2', '0.4', '0.6', '0.8', '1.0']);
    expect(texts(0, 4e8)[1]).toMatch(/^1.×.10⁸$/);
  });
  it('read a curve between its points and hold its ends', () => {
    const curve = { x: [0, 1, 2], y: [0, 10, 40] };
    expect(curveAt(curve, 1.5)).toBe(25);
    expect(curveAt(curve, 2)).toBe(40);
    expect(curveAt(curve, 0)).toBe(0);
    expect(curveAt({ x: [], y: [] }, 0)).toBeNaN();
  });
  it('summarise', () => {
    expect(twoThirds([-3, 1, 2, 3])).toBe(3);
    expect(twoThirds([0, -3, 6, 1000])).toBe(6);
    expect(twoThirds([])).toBeNull();
    expect(correlation([1, 2, 3], [2, 4, 6])).toBeCloseTo(1, 14);
    expect(correlation([1, 1, 1], [1, 2, 3])).toBeNull();
    expect(correlation([1], [1])).toBeNull();
    // Ties share their mean rank: by hand.
    expect(ranks([10, 20, 20, 5])).toEqual([2, 3.5, 3.5, 1]);
    expect(correlation(ranks([1, 2, 3, 4]), ranks([1, 4, 9, 16]))).toBeCloseTo(1, 14);
    expect(shareBetween([1, 1, 3, 3], ['a', 'a', 'b', 'b'])).toBe(1);
    expect(shareBetween([1, 1], ['a', 'b'])).toBeNull();
    expect(spreadAlong([3, 1, 2, 4, 5, 6], [3, 3, 3, 4, 4, 4], 2)).toEqual([
      { middle: 2, spread: 3 },
      { middle: 5, spread: 4 },
    ]);
  });
});
