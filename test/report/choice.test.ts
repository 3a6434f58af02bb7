import { describe, expect, it } from 'vitest';
import { summary } from '../../src/cli/summary.ts';
import { errorsChart } from '../../src/report/chart/errors.ts';
import { sharesChart } from '../../src/report/chart/shares.ts';
import { sizesChart } from '../../src/report/chart/sizes.ts';
import type { RecordFamily, StudyRecord } from '../../src/report/record-type.ts';
import { render } from '../../src/report/render.ts';
import { buildView } from '../../src/report/view/build-view.ts';
import { bewareLines } from '../../src/report/words/beware.ts';
import { cautions } from '../../src/report/words/caution.ts';
import { familySentences, stepEvidence } from '../../src/report/words/family.ts';
import { lexiconOf } from '../../src/report/words/lexicon.ts';
import { lookedSentence } from '../../src/report/words/looked.ts';
import { modelsLookedAt, modelsPhrase } from '../../src/report/words/models.ts';
import { ruleSentences } from '../../src/report/words/selection.ts';
import { stabilitySentences, unsettled } from '../../src/report/words/stability.ts';
import { intervalsTooShort, noBetterThanMean, unseenSentences } from '../../src/report/words/unseen.ts';
import { partsPhrase, validationSentences } from '../../src/report/words/validation.ts';
import { normalQuantile } from '../../src/stats/distributions.ts';
import { randomFrom } from '../../src/stats/random.ts';
import { runText } from '../run/run-text.ts';
import { declaredRecord, SEARCHED, SPLIT, TESTED } from './declared-record.ts';
import { sampleRecord } from './sample-record.ts';
import { sound } from './sound.ts';

const plain = (text: string): string => text.replace(/[\u00a0\u202f]/g, ' ');
const tested = await declaredRecord(TESTED);
const searched = await declaredRecord(SEARCHED);
const split = await declaredRecord(SPLIT);
const lexicon = lexiconOf(tested);
const markdown = (record: StudyRecord): string =>
  render(record, { formats: ['markdown'] }, () => {}).markdown!;
const html = (record: StudyRecord): string => render(record, { formats: ['html'] }, () => {}).html!;

describe('candidates held against rows that they have not seen', () => {
  const { validation } = tested.selection;
  it('say how, and carry their error and weight of evidence', () => {
    expect(plain(validationSentences(tested.selection)[0]!)).toMatch(
      /^Each candidate was also fitted without each of 5 parts of the rows, drawn at random 2 times \(seed 1\), and/,
    );
    expect(validationSentences(sampleRecord().selection)).toEqual([]);
    const { tried } = buildView(tested);
    expect([tried.hasError, tried.hasEvidence]).toEqual([true, true]);
    const best = tried.candidates[0]!;
    const own = tested.candidates.find(({ name }) => name === best.name)!;
    expect(Number.parseFloat(best.error)).toBeCloseTo(own.validation!.root_mean_squared_error, 0);
    expect(plain(best.error)).toMatch(/ L$/);
    expect(plain(best.evidence)).toMatch(/^(over )?[\d.]+ %$/);
    expect(markdown(tested)).toContain('| error on rows held out |');
    const none = buildView(sampleRecord()).tried;
    expect([none.hasError, none.hasEvidence]).toEqual([false, false]);
    expect(html(sampleRecord())).not.toContain('error on rows held out');
  });
  it.each([
    [{ by: 'leave_one_out', folds: 30, seed: null }, 'each of the 30 rows'],
    [
      { by: 'group', folds: 3, seed: 4, group: 'vessel' },
      'each of 3 parts, groups by vessel kept together (seed 4)',
    ],
    [
      { by: 'time', folds: 8, seed: null, start: 12, horizon: 1 },
      'the time that follows each of 8 origins, predicted from all before, the first 12 never held out',
    ],
    [
      { by: 'time', folds: 8, seed: null, start: 12, horizon: 3 },
      'the 3 times that follow each of 8 origins, predicted from all before, the first 12 never held out',
    ],
  ] as const)('say what was held out: %j', (parts, text) => {
    expect(plain(partsPhrase({ repeats: 1, group: null, start: null, horizon: null, ...parts }))).toBe(text);
  });
  it('tell what could not be estimated without a part, and the rule of one standard error', () => {
    const said = validationSentences({
      ...tested.selection,
      one_standard_error: true,
      validation: {
        ...validation!,
        rows_left_out: 1,
        losses: [
          { coefficient: 'vessel Holm', folds: ['2', '3'], rows: 7, candidates: ['By vessel', 'Both'] },
        ],
      },
    }).map(plain);
    expect(said).toContain('1 held-out row could not be predicted and counts for no candidate.');
    expect(said).toContain(
      'vessel Holm cannot be estimated without 2 parts, which takes 7 rows from By vessel and Both.',
    );
    expect(said.join(' ')).toContain('within one standard error of the best');
  });
});

describe('rows not seen', () => {
  const honest = tested.selection.honest_error!;
  const held = tested.selection.hold_out!;
  const said = (selection: Partial<StudyRecord['selection']>): string[] =>
    unseenSentences({ ...tested, selection: { ...tested.selection, ...selection } }, lexicon).map(plain);
  it('give the error of the whole procedure beside that of the mean', () => {
    const [finding, how] = said({});
    expect(finding).toMatch(
      /^On rows that it has not seen, the whole procedure misses by [\d.]+ L, the mean alone by [\d.]+ L\.$/,
    );
    expect(how).toContain('without each of 5 parts of the rows, drawn at random (seed 1)');
    expect(how).toMatch(/All 5 choices fell on|Of 5 choices, \d on/);
    expect(buildView(tested).trust!.unseen!.finding).toBe(unseenSentences(tested, lexicon)[0]);
    expect(unseenSentences(sampleRecord(), lexicon)).toEqual([]);
    expect(buildView(sampleRecord()).trust!.unseen).toBeNull();
    expect(plain(markdown(tested))).toContain('the whole procedure misses by');
  });
  it('say when the procedure is no better than the mean', () => {
    const poor = { ...honest, gain: { value: 3, standard_error: 4 } };
    expect([honest, poor].map(noBetterThanMean)).toEqual([false, true]);
    expect(noBetterThanMean({ ...honest, gain: { value: -1, standard_error: null } })).toBe(true);
    expect(said({ honest_error: poor })[0]).toMatch(
      /: choosing and fitting a model is no better than saying the mean\.$/,
    );
  });
  it('count what the choices made anew fell on', () => {
    const choices = (list: readonly (readonly [string | null, number])[]): string =>
      said({
        honest_error: { ...honest, choices: list.map(([candidate, folds]) => ({ candidate, folds })) },
      })[1]!;
    expect(
      choices([
        ['A', 7],
        ['B', 2],
        [null, 1],
      ]),
    ).toContain('Of 10 choices, 7 on A, 2 on B and 1 on the mean, no candidate being admitted.');
    expect(
      choices([
        ['A', 4],
        ['B', 3],
        ['C', 2],
        ['D', 1],
      ]),
    ).toContain('2 on C and the rest on 1 other.');
    expect(choices([[null, 5]])).toContain('In none of the 5 choices was a candidate admitted.');
  });
  it('tell how the rows set aside came out', () => {
    const aside = said({ honest_error: undefined as never });
    expect(aside[0]).toMatch(
      /^20 rows were set aside before anything was fitted \(the last 20 in time\)\. On them the model misses by [\d.]+ L, on average [\d.]+ L too (low|high) \(CV\(RMSE\) [\d.]+ %, normalised mean bias −?[\d.]+ %\)\.$/,
    );
    expect(aside[1]).toMatch(
      /^\d+ of 20 lie inside their 90 % intervals; .* between [\d.]+ % and [\d.]+ %\.$/,
    );
    expect(intervalsTooShort(held)).toBe(false);
    const short = { ...held, inside: 10, inside_lower: 0.3, inside_upper: 0.7 };
    expect(intervalsTooShort(short)).toBe(true);
    expect(said({ hold_out: short }).at(-1)).toMatch(/so the intervals are too short\.$/);
    const lines = bewareLines(
      { ...tested, acceptance: [], selection: { ...tested.selection, hold_out: short } },
      lexicon,
    );
    expect(plain(lines[0]!)).toBe(
      'Of the rows set aside, only 10 of 20 lie inside their 90 % intervals: the intervals are too short.',
    );
    expect(said({ hold_out: { ...held, root_mean_squared_error: null } }).at(-1)).toMatch(
      /none of them could be predicted\.$/,
    );
  });
  it('are drawn, at least two', () => {
    sound(buildView(tested).trust!.unseen!.chart);
    expect(buildView(tested).trust!.unseen!.chart!.svg.match(/<circle/g)).toHaveLength(4);
    expect(
      errorsChart([{ name: 'a', error: 1, low: null, high: null, strong: true }], 'x', 'A caption.'),
    ).toBeNull();
  });
  it('stand in the terminal’s summary', () => {
    const text = summary(tested, [], { width: 100, color: false } as never);
    expect(
      plain(text)
        .replace(/\s*│\s*/g, ' ')
        .replace(/\n/g, ' '),
    ).toContain('the whole procedure misses by');
  });
});

describe('the stability of a choice', () => {
  const stability = tested.selection.stability!;
  it('is how often it would be made again', () => {
    const [finding, method] = stabilitySentences(stability, tested.selection.chosen).map(plain);
    expect(finding).toMatch(/^From rows drawn anew, With wind would be chosen in [\d.]+ % of the cases/);
    expect(method).toBe(
      '130 rows were drawn with replacement 30 times (seed 1), and each time the declared rule chose again.',
    );
    const made = (change: Partial<typeof stability>, chosen: string | null = 'A'): string[] =>
      stabilitySentences(
        {
          ...stability,
          candidates: [
            { candidate: 'B', chosen: 18, share: 0.6 },
            { candidate: 'A', chosen: 9, share: 0.3 },
          ],
          ...change,
        },
        chosen,
      ).map(plain);
    expect(made({ none_admitted: 3 })[0]).toBe(
      'From rows drawn anew, A would be chosen in 30 % of the cases; next comes B, in 60 %. In 10 % no candidate was admitted.',
    );
    expect(made({}, null)[0]).toBe(
      'From rows drawn anew, B would be chosen most often, in 60 % of the cases.',
    );
    expect(made({ candidates: [] }, null)[0]).toContain('no candidate would be admitted either');
    expect(made({ by: 'group', group: 'vessel', units: 3 })[1]).toMatch(/^3 groups by vessel were drawn/);
    expect(made({ by: 'blocks', block_length: 6 })[1]).toMatch(
      /^Blocks of 6 rows that follow one another in time were/,
    );
  });
  it('is a line on the first screen where another would be chosen more often than not', () => {
    const loose = { ...stability, candidates: [{ candidate: 'With wind', chosen: 9, share: 0.3 }] };
    expect([unsettled(loose, 'With wind'), unsettled(loose, null), unsettled(stability, 'nobody')]).toEqual([
      true,
      false,
      true,
    ]);
    const own = { ...tested, acceptance: [], selection: { ...tested.selection, stability: loose } };
    expect(plain(bewareLines(own, lexicon)[0]!)).toMatch(
      /in 30 % of the cases\. The choice is not settled by these rows\.$/,
    );
  });
  it('is drawn where more than one candidate was chosen', () => {
    const view = buildView(searched).tried.stability!;
    expect(searched.selection.stability!.candidates.length).toBeGreaterThan(1);
    sound(view.candidates);
    sound(view.terms);
    expect(sharesChart([], 'x', 'X', 'x', 'A caption.')).toBeNull();
    const sure = { ...stability, candidates: stability.candidates.slice(0, 1) };
    const settled = buildView({ ...tested, selection: { ...tested.selection, stability: sure } }).tried
      .stability!;
    expect([settled.candidates, settled.terms]).toEqual([null, null]);
  });
});

describe('inference averaged over candidates', () => {
  it('is folded away with its weights, coefficients and predictions', () => {
    const view = buildView(tested).says!.averaged!;
    const { averaged } = tested.selection;
    expect(view.coefficients.map(({ name }) => name)).toEqual(averaged!.coefficients.map(({ name }) => name));
    expect(view.predictions).toHaveLength(3);
    expect(plain(view.sentence)).toMatch(
      /counts by its weight of evidence: With wind [\d.]+ %|With wind over/,
    );
    expect(html(tested)).toContain('<summary>Averaged over the candidates</summary>');
    expect(buildView(searched).says!.averaged).toBeNull();
  });
});

describe('searched families', () => {
  const [any, back] = searched.families!;
  it('count every model looked at, beside the p-values and wherever the number is told', () => {
    const looked = modelsLookedAt(searched);
    // One named candidate, the 2⁶ subsets, and the models of the elimination.
    expect(looked).toEqual({ count: 1 + 64 + back!.searched, exact: true, searched: true });
    const number = `${looked.count}\u00a0models`;
    expect(lookedSentence(searched)).toContain(`${number} were looked at`);
    expect(buildView(searched).head.fit).toContain(`chosen of ${number}`);
    expect(cautions(searched).find(({ heading }) => heading === 'Selection')!.text).toContain(number);
    expect(html(searched)).toContain(`${number} were looked at and this one was chosen`);
    expect(plain(modelsPhrase({ count: 2 ** 50, exact: false, searched: true }))).toBe(
      'up to 1.1 × 10¹⁵ models',
    );
    expect(modelsPhrase(modelsLookedAt(sampleRecord()))).toBe('6\u00a0candidates');
    expect(plain(ruleSentences(searched)[0]!)).toMatch(
      /^\d+ candidates were fitted on the same rows, all of them found by searching 2 families\.$/,
    );
    expect(
      plain(ruleSentences({ selection: searched.selection, candidates: searched.candidates })[0]!),
    ).toMatch(/^\d+ candidates were declared, all/);
  });
  it('show the best ranked candidates and count the rest', () => {
    const { candidates, candidatesMore } = buildView(searched).tried;
    expect(searched.candidates.length).toBeGreaterThan(16);
    expect(candidates.length).toBeLessThanOrEqual(11);
    expect(candidates.some(({ chosen }) => chosen)).toBe(true);
    expect(plain(candidatesMore!)).toBe(
      `${searched.candidates.length - candidates.length} further candidates are in tables/candidates.csv.`,
    );
    expect(markdown(searched)).toContain('in tables/candidates.csv');
    expect(buildView(sampleRecord()).tried.candidatesMore).toBeNull();
  });
  it('tell what was searched and how exactly', () => {
    expect(plain(familySentences(any!)[0]!)).toMatch(
      /^All subsets of 6 terms were searched, 64 models, and the best 3 of each number of coefficients kept\. The best of every size is exact \(by bounds, with \d+ places of the search looked at\)\. No interaction or higher power stands without what it contains\.$/,
    );
    const changed = (change: Partial<RecordFamily>): string =>
      familySentences({ ...any!, ...change })
        .map(plain)
        .join(' ');
    expect(changed({ at_least: 2, at_most: 4 })).toContain('subsets of 6 terms (2 to 4 at a time)');
    expect(changed({ at_least: 2, at_most: 6 })).toContain('(at least 2 at a time)');
    expect(changed({ at_least: 0, at_most: 4 })).toContain('(at most 4 at a time)');
    expect(changed({ exact_for: 'the choice' })).toContain('sizes that could not be were left aside');
    expect(changed({ hierarchy: false, keep: 1 })).toMatch(
      /the best one of each .* may stand without what they contain/,
    );
    expect(changed({ idle_terms: ['a', 'b'], note: 'A note' })).toMatch(
      /a and b are in no model: .* they need\. A note\.$/,
    );
    expect(changed({ terms: any!.terms.map((term, i) => ({ ...term, always: i === 0 })) })).toContain(
      `All subsets of 5 terms were searched, 64 models, and the best 3 of each number of coefficients kept; every model has cargo.`,
    );
    expect(plain(familySentences(back!).join(' '))).toMatch(
      /^From all 6 terms, the one with the largest p-value left, as long as that was above 0\.05\. .*No p-value/,
    );
    expect(plain(familySentences({ ...back!, enter_at: 0.02 })[0]!)).toContain(
      '; one that had left returned where its p-value was at most 0.02',
    );
    expect(plain(familySentences({ ...back!, kind: 'forward', enter_at: 0.05, leave_at: 0.1 })[0]!)).toBe(
      'Of 6 terms, the one with the smallest p-value entered, as long as that was at most 0.05; one that had entered left again where its p-value was above 0.1. No interaction or higher power stands without what it contains.',
    );
  });
  it('list the steps of a path', () => {
    const { path } = buildView(searched).tried.families[1]!;
    expect(path.length).toBeGreaterThan(0);
    expect(path[0]).toMatchObject({ step: '1', action: 'leaves', term: back!.path[0]!.term });
    expect(plain(path[0]!.evidence)).toMatch(/^F = [\d.]+ on 1 and \d+, p = /);
    expect(stepEvidence({ ...back!.path[0]!, statistic: null })).toBe('no column beside the others');
    expect(html(searched)).toContain('aria-label="Back: steps"');
  });
  it('draw how the best value falls with size, in place of the distances', () => {
    const { families, chart } = buildView(searched).tried;
    sound(families[0]!.chart);
    expect(families[0]!.chart!.svg.match(/<circle/g)).toHaveLength(any!.best_by_size.length);
    expect(plain(families[0]!.chart!.caption)).toMatch(
      /^The best AICc goes from [\d .]+ with 1 coefficient to [\d .]+ with \d+ coefficients/,
    );
    expect(families[1]!.chart).toBeNull();
    expect(chart).toBeNull();
    const { selection } = searched;
    expect(sizesChart({ ...any!, best_by_size: any!.best_by_size.slice(0, 1) }, selection, 'x')).toBeNull();
    const rising = any!.best_by_size.map((one, i) => ({ ...one, value: i, admitted: i > 0 }));
    expect(plain(sizesChart({ ...any!, best_by_size: rising }, selection, 'x')!.caption)).toBe(
      'The best AICc is that of the smallest size, 1 coefficient. Hollow: not admitted.',
    );
    expect(
      sizesChart({ ...any!, best_by_size: rising }, { ...selection, rank_by: 'adjusted_r_squared' }, 'x')!
        .caption,
    ).toContain('the largest size');
  });
});

describe('a refused candidate', () => {
  it('is told with its first reasons, the others counted', () => {
    const record = sampleRecord();
    record.candidates[0]!.admitted = false;
    record.candidates[0]!.refused_because = ['One.', 'Two', 'Three.', 'Four.'];
    const shown = buildView(record).tried.candidates.find(({ name }) => name === record.candidates[0]!.name)!;
    expect(plain(shown.verdict)).toBe('One. Two. 2 more reasons are in the tables.');
  });
});

describe('a split sample', () => {
  it('reports the figures of the rows that had no part in the choice, and says so', () => {
    const { estimated } = split.selection.split_sample!;
    const shown = buildView(split).says!;
    expect(shown.looked).toContain('had no part in the choice, so they owe nothing to it');
    expect(shown.coefficients.map(({ name }) => name)).toEqual(
      estimated!.coefficients.map(({ name }) => name),
    );
    expect(cautions(split).find(({ heading }) => heading === 'Selection')!.text).toContain(
      'owe nothing to the choice',
    );
    const calm = {
      ...split,
      acceptance: [],
      warnings: [],
      examination: { ...split.examination!, findings: [], before_you_rely: [] },
    };
    expect(bewareLines(calm, lexiconOf(split)).join(' ')).toContain('owe nothing to the choice');
  });
});

describe('noise and nothing else', () => {
  it('is told to be no better than the mean, on the first screen too (after Freedman 1983)', async () => {
    const random = randomFrom(1983);
    const names = Array.from({ length: 50 }, (_, j) => `x${j + 1}`);
    const normal = (): number => normalQuantile(Math.max(random.next(), 1e-9));
    const rows = Array.from({ length: 100 }, () => [normal(), ...names.map(normal)].map((v) => v.toFixed(4)));
    const { record } = await runText(
      `plumbrule: 1
title: Noise
data:
  file: data.csv
  variables:
    y: { type: number }
${names.map((name) => `    ${name}: { type: number }`).join('\n')}
response: y
candidates:
  - name: Forth
    add_from: [${names.join(', ')}]
    enter_at: 0.25
selection: { honest_error: { folds: 5 } }
`,
      { 'data.csv': `y,${names.join(',')}\n${rows.map((row) => row.join(',')).join('\n')}\n` },
    );
    expect(record!.model).not.toBeNull();
    // The chosen model's own figures look like a finding.
    expect(record!.candidates[0]!.overall_f!.p_value).toBeLessThan(0.01);
    expect(noBetterThanMean(record!.selection.honest_error!)).toBe(true);
    const view = buildView(record!);
    expect(view.trust!.unseen!.finding).toMatch(/no better than saying the mean\.$/);
    expect(view.head.beware.join(' ')).toMatch(/the mean/);
    expect(markdown(record!)).toContain('no better than saying the mean');
  });
});
