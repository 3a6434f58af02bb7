import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { bootstrapChart, twoIntervals } from '../../src/report/chart/bootstrap.ts';
import { dependenciesChart } from '../../src/report/chart/dependencies.ts';
import { quantilesChart } from '../../src/report/chart/quantiles.ts';
import { middlesAlong, residualsEachChart } from '../../src/report/chart/residuals-each.ts';
import { responsePowerChart } from '../../src/report/chart/response-power.ts';
import type { RecordTerm, StudyRecord } from '../../src/report/record-type.ts';
import { render } from '../../src/report/render.ts';
import { buildView } from '../../src/report/view/build-view.ts';
import { bootstrapFinding, bootstrapMethod } from '../../src/report/words/bootstrap.ts';
import { hypothesisEvidence } from '../../src/report/words/hypothesis.ts';
import { choiceWithout, movesMost } from '../../src/report/words/influence.ts';
import { type Lexicon, lexiconOf } from '../../src/report/words/lexicon.ts';
import { lookedSentence } from '../../src/report/words/looked.ts';
import { ownScaleSentences } from '../../src/report/words/own-scale.ts';
import { pairsSentence } from '../../src/report/words/pairs.ts';
import { slopesAlongSentences } from '../../src/report/words/slopes.ts';
import { declaredRecord, EXAMINED, TANGLED } from './declared-record.ts';
import { sampleRecord } from './sample-record.ts';
import { sound } from './sound.ts';

const plain = (text: string): string => text.replace(/[\u00a0\u202f]/g, ' ');
const record = await declaredRecord(EXAMINED);
const tangled = await declaredRecord(TANGLED);
const lexicon = lexiconOf(record);
const view = buildView(record);
const model = record.model!;
const term = (name: string): RecordTerm => model.terms.find((one) => one.name === name)!;
const coefficients = record.candidates.find(({ name }) => name === model.candidate)!.coefficients;

describe('a study that declares everything about its model', () => {
  const html = render(record, { formats: ['html'] }, () => {}).html!;
  it('chose the candidate that the rest of this file speaks of', () => {
    expect(record.selection.chosen).toBe('With wind');
  });
  it('says which standard errors, and how many models were looked at, beside the coefficients', () => {
    const [errors, table, looked] = [
      'HC3: MacKinnon',
      'aria-label="Coefficients"',
      'candidates were looked at',
    ].map((text) => html.indexOf(text));
    expect(errors).toBeGreaterThan(0);
    expect(errors!).toBeLessThan(table!);
    expect(table!).toBeLessThan(looked!);
    expect(plain(lookedSentence(record)!)).toMatch(
      /^3 candidates were looked at and this one was chosen on the same rows/,
    );
    expect(lookedSentence({ ...record, candidates: record.candidates.slice(0, 1) })).toBeNull();
  });
  it('answers what is asked of the coefficients', () => {
    expect(view.says!.hypotheses.map(({ name }) => name)).toEqual([
      'Tern burns like Skerry',
      'Both burn like Skerry',
    ]);
    const [one, both] = model.inference!.hypotheses;
    expect(plain(hypothesisEvidence(one!))).toMatch(
      /^vessel Tern = 0; F = [\d.]+ on 1 and \d+ degrees of freedom, p = /,
    );
    expect(plain(hypothesisEvidence(both!))).toMatch(
      /^vessel Tern = 0 \(estimate [\d.−]+, standard error [\d.]+\) and vessel Holm = 0 \(estimate .*\); F = [\d.]+ on 2 and/,
    );
    expect(hypothesisEvidence({ ...one!, test: null })).toBe('vessel Tern = 0.');
  });
  it('has a further table of each coefficient with the columns that were asked for', () => {
    const more = view.says!.more!;
    expect(more.simultaneous).toContain('Bonferroni');
    expect(more.hasDrawn).toBe(true);
    expect(more.coefficients.map(({ name }) => name)).toEqual(coefficients.map(({ name }) => name));
    expect(more.coefficients[0]).toMatchObject({ standardised: '–', partial: '–', lost: '–' });
    const cargo = model.inference!.coefficients.find(({ name }) => name === 'cargo')!;
    const row = more.coefficients.find(({ name }) => name === 'cargo')!;
    expect(row.lost).toBe((cargo.semi_partial_correlation! ** 2).toFixed(3));
    const less = buildView(tangled).says!.more!;
    expect([less.simultaneous, less.hasDrawn]).toEqual([null, false]);
    expect(html).toContain('simultaneous 95\u202f% interval</th>');
    expect(html).toContain('interval drawn from the rows</th>');
  });
  it('gives slopes at the declared places with intervals, more than four in a table, quartiles in brief', () => {
    const [slopes] = slopesAlongSentences(lexicon, term('speed³'), model);
    expect(plain(slopes!)).toMatch(
      /^Near 8 kn, one more knot of speed goes with [\d.]+ L more fuel burned \(95 % interval .*\); near 10 kn, with [\d.]+ L more, 95 % interval .*; near 12 kn, with .*\.$/,
    );
    expect(plain(slopesAlongSentences(lexicon, term('headwind, degree 2'), model)[0]!)).toMatch(
      /^One more metre per second of headwind goes with [\d.]+ L more near −5 m\/s and [\d.]+ L more near 8 m\/s\.$/,
    );
    const rows = view.says!.terms.find(({ heading }) => heading === 'Headwind, degree 2')!.rows;
    expect(rows.map(({ name }) => plain(name))).toEqual(['−5 m/s', '0 m/s', '2 m/s', '5 m/s', '8 m/s']);
    expect(slopesAlongSentences(lexicon, term('cargo'), model)).toEqual([]);
    expect(
      slopesAlongSentences(lexicon, { ...term('cargo'), slopes_along: undefined } as never, model),
    ).toEqual([]);
  });
  it('gives level means and pairs, folded away, and what the pairs come to', () => {
    const levels = view.says!.terms.find(({ heading }) => heading === 'Vessel')!.levels!;
    expect(levels.means.map(({ level }) => level)).toEqual(['Skerry', 'Tern', 'Holm']);
    expect(levels.pairs).toHaveLength(3);
    expect(levels.method).toContain('Tukey–Kramer');
    expect(html).toMatch(/<details[^>]*>\s*<summary>Vessel: each level, and each pair of levels/);
    const vessel = term('vessel');
    expect(plain(pairsSentence(lexicon, vessel)!)).toMatch(
      /^Compared all together, .* of the 3 pairs of levels|all 3 pairs/,
    );
    const means = vessel.level_means!;
    const with3 = (p: number): RecordTerm => ({
      ...vessel,
      level_means: {
        ...means,
        comparisons: {
          ...means.comparisons!,
          pairs: means.comparisons!.pairs.map((pair) => ({ ...pair, adjusted_p_value: p })),
        },
      },
    });
    expect(plain(pairsSentence(lexicon, with3(0.2))!)).toBe(
      'Compared all together, none of the 3 pairs of levels can be told apart (at 5 %).',
    );
    expect(plain(pairsSentence({ ...lexicon, confidence: 0.9 }, with3(0.08))!)).toMatch(
      /all 3 pairs of levels can be told apart \(at 10 %\)/,
    );
    expect(plain(pairsSentence(lexicon, with3(0.01))!)).toMatch(
      /^Compared all together, all 3 pairs of levels can/,
    );
    expect(pairsSentence(lexicon, term('cargo'))).toBeNull();
  });
  it('shows predictions’ intervals drawn from the rows beside the others', () => {
    expect(view.predicts!.hasDrawn).toBe(true);
    expect(plain(view.predicts!.rows[0]!.drawnInterval)).toMatch(/^\d+ to \d+ L$/);
    expect(buildView(tangled).predicts!.hasDrawn).toBe(false);
  });
});

describe('effects on the response’s own scale', () => {
  const effect = { of: 'cargo', estimate: 0.82, lower: 0.6, upper: 1.04 };
  const own = (kind: 'percent' | 'elasticity' | 'per_doubling' | 'difference', scale: string): string[] => {
    const on: Lexicon = { ...lexicon, response: { ...lexicon.response, scale } };
    return ownScaleSentences(on, {
      ...term('cargo'),
      own_scale: { kind, sentence: '', effects: [effect] },
    }).map(plain);
  };
  it('are told where the sentences about the coefficient do not tell them', () => {
    expect(own('elasticity', 'log')).toEqual([
      'In per cent of both: 1 % more cargo goes with 0.82 % more (95 % interval 0.60 to 1.04 %).',
    ]);
    expect(own('percent', 'log')).toEqual([]);
    expect(own('percent', 'natural')[0]).toMatch(
      /0\.82 % more \(95 % interval 0\.60 to 1\.04 %\) for cargo\.$/,
    );
    expect(own('difference', 'sqrt')).toEqual([
      'On the scale of the data: 0.82 L more fuel burned (95 % interval 0.60 to 1.04 L) for cargo, the other variables at their averages.',
    ]);
    expect(own('per_doubling', 'natural')).toEqual([]);
    expect(ownScaleSentences(lexicon, { ...term('cargo'), own_scale: null })).toEqual([]);
  });
});

describe('the examination', () => {
  it('shows in full what was found, weightiest first, and in brief what was not', () => {
    const { findings, quiet } = view.trust!;
    expect(findings.length + quiet.length).toBe(record.examination!.findings.length);
    expect(findings.map(({ concern }) => concern)).toEqual(
      findings.map(({ concern }) => concern).sort((a, b) => b - a),
    );
    expect(findings.every(({ concern }) => concern > 0)).toBe(true);
    const outlying = findings.find(({ name }) => name === 'outlying_rows')!;
    expect(outlying.evidence).toContain('deleted residual');
  });
  it('draws each picture once: beside the question, or folded away', () => {
    const drawn = [...view.trust!.findings.flatMap(({ charts }) => charts), ...view.trust!.pictures];
    for (const figure of drawn) sound(figure);
    const names = drawn.map(({ svg }) => /aria-labelledby="([\w-]+)-t/.exec(svg)![1]);
    expect(new Set(names).size).toBe(names.length);
    for (const name of ['residuals-each', 'residuals-fitted', 'residuals-time', 'quantiles', 'influence'])
      expect(names).toContain(name);
    const calm = buildView({
      ...record,
      examination: {
        ...record.examination!,
        findings: record.examination!.findings.map((finding) => ({ ...finding, concern: 0 as const })),
      },
    }).trust!;
    expect(calm.findings).toEqual([]);
    expect(calm.summary).toMatch(/none calls for care/);
    expect(calm.pictures.map(({ svg }) => /aria-labelledby="([\w-]+)-t/.exec(svg)![1])).toEqual([
      'residuals-each',
      'residuals-fitted',
      'residuals-time',
      'quantiles',
      'influence',
    ]);
  });
  it('tells what each influential row moves, and what the choice would be without it', () => {
    const [row] = record.examination!.influential_rows;
    expect(plain(movesMost(row!, coefficients)!)).toMatch(
      /^.+ from [\d.−]+ to [\d.−]+, [\d.]+ standard errors$/,
    );
    const { without: _, ...old } = row!;
    expect(movesMost(old, coefficients)).toBeNull();
    const asked: StudyRecord = {
      ...record,
      examination: { ...record.examination!, choice_omitted: null },
    };
    const told = (chosen: string | null): string =>
      choiceWithout(asked, [{ ...row!, without: { coefficients: [], chosen } }])!;
    expect(told('With wind')).toBe('Without it, the rule would make the same choice.');
    expect(told('Load and speed')).toBe(
      `The choice rests on single rows: without ${row!.id}, it would choose Load and speed.`,
    );
    expect(told(null)).toContain('none of the candidates');
    expect(
      choiceWithout({ ...asked, examination: { ...asked.examination!, choice_omitted: 'No.' } }, [row!]),
    ).toBeNull();
    expect(choiceWithout(sampleRecord(), [old])).toBeNull();
  });
  it('says that observed and fitted values of influential rows are on another scale than the response’s own', () => {
    const page = (scale: 'natural' | 'log'): string =>
      render(sampleRecord({ scale }), { formats: ['html'] }, () => {}).html!;
    const said = 'Observed and fitted values are on the log scale';
    expect(page('log')).toContain(said);
    expect(page('natural')).not.toContain('Observed and fitted values are on');
    expect(buildView(sampleRecord()).trust!.rowsScale).toBeNull();
  });
  it('compares the bootstrap’s intervals with the declared ones', () => {
    const bootstrap = record.examination!.bootstrap!;
    const intervals = twoIntervals(bootstrap, coefficients);
    expect(intervals).toHaveLength(coefficients.length);
    sound(bootstrapChart(intervals, 'A caption.'));
    expect(bootstrapChart([], 'A caption.')).toBeNull();
    const ratios = (list: readonly number[]): string =>
      plain(
        bootstrapFinding(
          list.map((ratio, i) => ({ name: `b${i}`, declared: [-2, 2], drawn: [-2, 2], ratio })),
        ),
      );
    expect(ratios([1.05, 0.95])).toContain('as wide as the declared ones');
    expect(ratios([0.8, 1.5])).toBe(
      'Drawn from the rows again, intervals are between 0.80 times as wide as the declared ones (b0) and 1.5 times as wide (b1).',
    );
    expect(ratios([1.5])).toBe('Drawn from the rows again, the interval of b0 is 1.5 times as wide.');
    expect(ratios([])).toMatch(/^No intervals/);
    expect(plain(bootstrapMethod(bootstrap))).toMatch(
      /^Rows were drawn with replacement 199 times \(seed 1\); an interval holds the middle 95 % of the estimates/,
    );
    expect(
      plain(bootstrapMethod({ ...bootstrap, by: 'blocks', block_length: 6, used: 190, note: 'A note' })),
    ).toMatch(
      /^Blocks of 6 rows that follow .* 199 times \(seed 1\); 9 of them could not be used; .* A note\.$/,
    );
  });
  it('maps columns that depend on one another, and what they become without their partners', () => {
    const { collinearity } = tangled.examination!;
    const first = collinearity!.dependencies.find(({ columns }) =>
      columns.some(({ name }) => name === 'axle_load'),
    );
    expect(first).toBeDefined();
    const found = buildView(tangled).trust!.dependencies!;
    expect(found.sentences.join(' ')).toContain('axle_load');
    expect(found.rows.map(({ leftOut, name }) => `${name} without ${leftOut}`)).toEqual(
      expect.arrayContaining(['axle_load without cargo', 'cargo without axle_load']),
    );
    // Two columns of one dependency are said in the sentence; more are mapped.
    expect(dependenciesChart(collinearity!)).toBeNull();
    const wide = collinearity!.columns.map(() => 0.6);
    const figure = dependenciesChart({
      ...collinearity!,
      proportions: collinearity!.indices.map(() => wide),
      dependencies: [first!],
    })!;
    sound(figure);
    expect(figure.svg.match(/class="mark chosen"/g)).toHaveLength(wide.length);
    expect(figure.caption).toMatch(/carry the strongest dependency \(condition index \d+\)/);
    expect(dependenciesChart({ ...collinearity!, dependencies: [] })).toBeNull();
    expect(buildView(record).trust!.dependencies).toBeNull();
  });
});

describe('charts of the residuals', () => {
  it('hold residuals in order against the band of normal errors, the farthest named', () => {
    const figure = quantilesChart(record.examination!)!;
    sound(figure);
    expect(plain(figure.caption)).toMatch(
      /^\d+ of the 150 residuals drawn \([\d.]+ %\) lies? outside the band/,
    );
    const { points, normal_quantiles: found } = record.examination!;
    const far = found!.residual.reduce((a, b) => (Math.abs(b) > Math.abs(a) ? b : a));
    expect(figure.svg).toContain(`>${points.id[points.standardised_residual.indexOf(far)]}<`);
    const examination = record.examination!;
    const with_ = (change: Partial<NonNullable<typeof found>>): string => {
      const changed = quantilesChart({ ...examination, normal_quantiles: { ...found!, ...change } })!;
      sound(changed);
      return changed.caption;
    };
    expect(with_({ residual: found!.lower!.map((low, i) => (low + found!.upper![i]!) / 2) })).toMatch(
      /^All residuals lie/,
    );
    expect(with_({ lower: null, upper: null, simulations: 0 })).toMatch(/^On the line/);
    expect(quantilesChart({ ...examination, normal_quantiles: null })).toBeNull();
    expect(quantilesChart(sampleRecord().examination!)).toBeNull();
  });
  it('have a panel for each numeric variable, and say along which they stray', () => {
    const figure = residualsEachChart(lexicon, record.examination!.points)!;
    sound(figure);
    expect(figure.svg.match(/class="dots fine"/g)).toHaveLength(3);
    expect(plain(figure.caption)).toMatch(/strays most along (cargo|speed|headwind), by up to [\d.]+ L/);
    const { points } = record.examination!;
    expect(residualsEachChart(lexicon, { ...points, values: points.values.slice(0, 1) })).toBeNull();
    const bent = {
      ...points,
      residual: points.values
        .find(({ variable }) => variable === 'headwind')!
        .numbers!.map((v) => (v - 3) ** 2),
    };
    expect(residualsEachChart(lexicon, bent)!.caption).toContain('strays most along headwind');
    expect(residualsEachChart(lexicon, { ...points, thinned: true })!.caption).not.toMatch(/\d/);
    // Twelve to a bin: two bins of 24 rows, medians by hand.
    const x = Array.from({ length: 24 }, (_, i) => i);
    expect(
      middlesAlong(
        x,
        x.map((v) => 2 * v),
      ),
    ).toEqual([
      { x: 5.5, y: 11 },
      { x: 17.5, y: 35 },
    ]);
  });
  it('draw the powers of the response that suit the rows', () => {
    const finding = record.examination!.findings.find(({ name }) => name === 'response_scale')!;
    const figure = responsePowerChart(finding)!;
    sound(figure);
    expect(figure.caption).toMatch(/^Powers between .* best; the declared scale \(hollow\) is 1\.$/);
    expect(responsePowerChart({ ...finding, figures: [] })).toBeNull();
    expect(responsePowerChart({ ...finding, statistic: null })).toBeNull();
  });
});

describe('the page', () => {
  const html = render(record, { formats: ['html'] }, () => {}).html!;
  it('folds details away with a summary, and unfolds them on paper', () => {
    expect(html.match(/<details/g)!.length).toBe(html.match(/<summary>\S/g)!.length);
    const style = readFileSync(new URL('../../templates/partials/style.hbs', import.meta.url), 'utf8');
    expect(style.slice(style.indexOf('@media print'))).toContain(
      'details::details-content{content-visibility:visible',
    );
  });
  it('is small', () => {
    expect(Buffer.byteLength(html)).toBeLessThan(400_000);
  });
});
