import { describe, expect, it } from 'vitest';
import type {
  RecordCoefficient,
  RecordModel,
  RecordTerm,
  StudyRecord,
} from '../../src/report/record-type.ts';
import { acceptanceSentence, acceptanceValue, missedSentences } from '../../src/report/words/acceptance.ts';
import { answerSentences, fitSentence, largestRungs } from '../../src/report/words/answer.ts';
import { bewareLines } from '../../src/report/words/beware.ts';
import { cautions } from '../../src/report/words/caution.ts';
import {
  contractSentence,
  ignoredSentence,
  lossReason,
  rowsSentence,
  studyLine,
} from '../../src/report/words/data.ts';
import { effectPhrase, openSentence, shortEffect } from '../../src/report/words/effect.ts';
import { equationOf } from '../../src/report/words/equation.ts';
import { evidence } from '../../src/report/words/finding.ts';
import {
  type Lexicon,
  lexiconOf,
  listed,
  lowered,
  raised,
  termLabel,
} from '../../src/report/words/lexicon.ts';
import { typicalMiss } from '../../src/report/words/miss.ts';
import { modelsLookedAt } from '../../src/report/words/models.ts';
import { intervalCaption, predictionSentence } from '../../src/report/words/prediction.ts';
import { scaleSentence } from '../../src/report/words/scale.ts';
import { distanceCaption, ruleSentences } from '../../src/report/words/selection.ts';
import { placeText, termSentences } from '../../src/report/words/term.ts';
import { oneMore } from '../../src/report/words/units.ts';
import { sampleRecord } from './sample-record.ts';

const plain = (text: string): string => text.replace(/[\u00a0\u202f]/g, ' ');
const record = sampleRecord();
const lexicon = lexiconOf(record);
const onScale = (scale: string, lambda: number | null = null): Lexicon => ({
  ...lexicon,
  response: { ...lexicon.response, scale, lambda },
});

describe('one more', () => {
  it.each([
    ['cargo', 't', 'one more tonne of cargo'],
    ['headwind', 'm/s', 'one more metre per second of headwind'],
    ['days since hull cleaning', 'd', 'one more day since hull cleaning'],
    ['speed cubed', 'kn³', 'one more kn³ of speed cubed'],
    ['crew', null, 'a rise of 1 in crew'],
    ['age', '__proto__', 'one more __proto__ of age'],
  ])('%s in %s', (label, unit, text) => {
    expect(oneMore(label, unit)).toBe(text);
  });
});

describe('labels', () => {
  it('lowers what starts a sentence and leaves abbreviations alone', () => {
    expect(lowered('Fuel burned')).toBe('fuel burned');
    expect(lowered('HDD')).toBe('HDD');
    expect(lowered('')).toBe('');
    expect(raised('élan')).toBe('Élan');
  });
  it('lists', () => {
    expect(listed([])).toBe('');
    expect(listed(['a', 'b'])).toBe('a and b');
    expect(listed(['a', 'b', 'c'], 'or')).toBe('a, b or c');
  });
  it('names terms by labels', () => {
    expect(termLabel(lexicon, { name: 'hull_days², x', kind: 'power', variables: ['hull_days'] })).toBe(
      'days since hull cleaning², x',
    );
    expect(
      termLabel(lexicon, { name: 'cargo × vessel', kind: 'interaction', variables: ['cargo', 'vessel'] }),
    ).toBe('cargo × vessel');
  });
  it('tells places of slopes with labels, rounded numbers and units', () => {
    expect(plain(placeText(lexicon, 'hull_days 43.7499999'))).toBe('days since hull cleaning 43.7 d');
    expect(placeText(lexicon, 'vessel 12')).toBe('vessel 12');
    expect(placeText(lexicon, 'nowhere')).toBe('nowhere');
  });
});

describe('effects', () => {
  const difference = { estimate: 1.93, lower: 1.64, upper: 2.22 };
  it('says unit, direction and interval', () => {
    expect(plain(effectPhrase(lexicon, difference))).toBe(
      '1.93 L more fuel burned (95 % interval 1.64 to 2.22 L)',
    );
    expect(plain(effectPhrase(lexicon, { estimate: -5.2, lower: -7.3, upper: -3.1 }))).toBe(
      '5.2 L less fuel burned (95 % interval 3.1 to 7.3 L)',
    );
  });
  it('says where the direction is open', () => {
    const open = { estimate: 0.7, lower: -0.1, upper: 1.5 };
    expect(plain(effectPhrase(lexicon, open))).toBe(
      '0.70 L more fuel burned (95 % interval 0.10 L less to 1.50 L more)',
    );
    expect(openSentence(open)).toContain('not settled');
    expect(openSentence(difference)).toBe('');
  });
  it('does without an interval', () => {
    expect(plain(effectPhrase(lexicon, { estimate: 2, lower: null, upper: null }))).toBe(
      '2.000 L more fuel burned',
    );
  });
  it('says per cent on a log scale: (e^b − 1)·100', () => {
    const text = plain(
      effectPhrase(onScale('log'), { estimate: Math.log(1.1), lower: Math.log(1.05), upper: Math.log(1.16) }),
    );
    expect(text).toBe('10.0 % more fuel burned (95 % interval 5.0 to 16.0 %)');
  });
  it('says multiples where per cent would be past picturing', () => {
    const large = { estimate: Math.log(7), lower: Math.log(5), upper: Math.log(9) };
    expect(plain(effectPhrase(onScale('log'), large))).toBe(
      '7.0 times the fuel burned (95 % interval 5.0 to 9.0 times)',
    );
    expect(plain(shortEffect(onScale('log'), large))).toBe('7.0 times');
  });
  it('names other scales plainly', () => {
    expect(plain(effectPhrase(onScale('sqrt'), difference))).toContain(
      '1.93 √L more in the square root of fuel burned',
    );
    expect(plain(effectPhrase(onScale('reciprocal'), difference))).toContain('more in 1/fuel burned');
    expect(plain(effectPhrase(onScale('box_cox', 0.25), difference))).toContain(
      'on the Box–Cox scale with λ = 0.25',
    );
    expect(scaleSentence(lexicon)).toBeNull();
    expect(scaleSentence(onScale('reciprocal'))).toContain('what raises it lowers fuel burned');
  });
});

function term(patch: Partial<RecordTerm>): RecordTerm {
  return {
    name: 'cargo',
    kind: 'number',
    variables: ['cargo'],
    columns: ['cargo'],
    joint_f: null,
    generalised_vif: null,
    generalised_vif_per_column: null,
    typical_steps: [],
    curve: null,
    slopes: [],
    slopes_omitted: 0,
    ...patch,
  };
}

function coefficient(name: string, estimate: number): RecordCoefficient {
  return {
    name,
    term: name,
    estimate,
    standard_error: 0.15,
    t: null,
    p_value: null,
    lower: estimate - 0.3,
    upper: estimate + 0.3,
    vif: null,
  };
}

const modelOf = (terms: RecordTerm[], columns: RecordModel['columns'] = []): RecordModel => ({
  ...record.model!,
  terms,
  columns,
});

describe('terms in words', () => {
  it('tells a number per unit, the other terms held', () => {
    const alone = term({});
    const sentences = termSentences(
      lexicon,
      alone,
      modelOf([alone, term({ name: 'speed', variables: ['speed'] })]),
      [coefficient('cargo', 1.93)],
    );
    expect(plain(sentences[0]!)).toBe(
      'One more tonne of cargo goes with 1.93 L more fuel burned (95 % interval 1.63 to 2.23 L), the other terms held.',
    );
  });
  it('does not speak of other terms where there are none', () => {
    const alone = term({});
    expect(termSentences(lexicon, alone, modelOf([alone]), [coefficient('cargo', 1.93)])[0]).not.toContain(
      'held',
    );
  });
  it('tells a doubling where the variable is a logarithm', () => {
    const variables = new Map(lexicon.variables);
    variables.set('log_cargo', {
      ...variables.get('cargo')!,
      name: 'log_cargo',
      label: 'log_cargo',
      derived_from: 'log(cargo)',
    });
    const logged = term({ name: 'log_cargo', variables: ['log_cargo'] });
    const sentences = termSentences({ ...onScale('log'), variables }, logged, modelOf([logged]), [
      coefficient('log_cargo', 0.5),
    ]);
    // 2^0.5 − 1 = 41.4 %
    expect(plain(sentences[0]!)).toMatch(/^Doubling cargo goes with 41 % more fuel burned/);
  });
  it('compares levels with the baseline, and lists slopes of an interaction by level', () => {
    const category = term({
      name: 'vessel',
      kind: 'category',
      variables: ['vessel'],
      typical_steps: [
        { from: 'Skerry', to: 'Tern', from_value: null, to_value: null, estimate: 45, lower: 30, upper: 60 },
      ],
    });
    const interaction = term({
      name: 'cargo × vessel',
      kind: 'interaction',
      variables: ['cargo', 'vessel'],
      slopes: [{ at: 'vessel Tern', of: 'cargo', per: '1', estimate: 2.2, lower: 2, upper: 2.4 }],
    });
    const model = modelOf([term({}), category, interaction]);
    expect(plain(termSentences(lexicon, category, model, [])[0]!)).toMatch(
      /^Vessel Tern rather than Skerry goes with 45\.0 L more fuel burned .*where cargo is at its mean of 78 t, the other terms held\.$/,
    );
    expect(plain(termSentences(lexicon, interaction, model, [])[0]!)).toBe(
      'Where vessel is Tern, one more tonne of cargo goes with 2.20 L more fuel burned (95 % interval 2.00 to 2.40 L).',
    );
    // With the interaction in the model the single coefficient is not told as if it held everywhere.
    expect(termSentences(lexicon, term({}), model, [coefficient('cargo', 1.9)])).toEqual([]);
  });
  it('gathers many slopes into their extremes, says what moves, and how many were not worked out', () => {
    const slopes = ['Skerry', 'Holm', 'Sund'].flatMap((place) =>
      ['Tern', 'Auk', 'Gull'].map((to, k) => ({
        at: `port ${place}`,
        of: `vessel ${to} rather than Skerry`,
        per: null,
        estimate: k - place.length / 10,
        lower: -4,
        upper: 4,
      })),
    );
    const interaction = term({
      name: 'vessel × port',
      kind: 'interaction',
      variables: ['vessel', 'port'],
      slopes,
      slopes_omitted: 14,
    });
    expect(termSentences(lexicon, interaction, modelOf([interaction]), []).map(plain)).toEqual([
      'The 9 differences from Skerry lie between 0.6 L less (Tern at port Skerry) and 1.6 L more (Gull at port Sund), the other terms held. A further 14 are not worked out.',
    ]);
  });
  it('sets the values of a flag that moves in brackets', () => {
    const variables = new Map(lexicon.variables);
    const levels = [
      { level: 'no', rows: 5 },
      { level: 'yes', rows: 3 },
    ];
    variables.set('towed', {
      ...variables.get('vessel')!,
      name: 'towed',
      type: 'flag',
      label: 'Under tow',
      levels,
    });
    const flagged = { ...lexicon, variables };
    const interaction = term({
      name: 'towed × vessel',
      kind: 'interaction',
      variables: ['towed', 'vessel'],
      slopes: [{ at: 'vessel Tern', of: 'towed yes', per: null, estimate: 3, lower: 2, upper: 4 }],
    });
    expect(plain(termSentences(flagged, interaction, modelOf([interaction]), [])[0]!)).toMatch(
      /^Where vessel is Tern, under tow \(yes rather than no\) goes with 3\.00 L more/,
    );
  });
  it('gathers many levels into their extremes', () => {
    const steps = Array.from({ length: 9 }, (_, i) => ({
      from: 'a',
      to: `level ${i}`,
      from_value: null,
      to_value: null,
      estimate: i - 3,
      lower: i - 4,
      upper: i - 2,
    }));
    const many = term({ name: 'vessel', kind: 'category', variables: ['vessel'], typical_steps: steps });
    const [sentence] = termSentences(lexicon, many, modelOf([many]), []);
    expect(plain(sentence!)).toBe(
      'Vessel has 10 levels, each compared with a: from 3.00 L less (level 0) to 5.00 L more (level 8).',
    );
  });
  it('tells a flag by its values, also in the answer', () => {
    const variables = new Map(lexicon.variables);
    variables.set('night', { ...variables.get('vessel')!, name: 'night', label: 'Night', type: 'flag' });
    const flag = term({
      name: 'night',
      kind: 'flag',
      variables: ['night'],
      typical_steps: [
        { from: 'no', to: 'yes', from_value: 0, to_value: 1, estimate: 12, lower: 8, upper: 16 },
      ],
    });
    const own = { ...lexicon, variables };
    expect(plain(termSentences(own, flag, modelOf([flag]), [])[0]!)).toBe(
      'Night (yes rather than no) goes with 12.0 L more fuel burned (95 % interval 8.0 to 16.0 L).',
    );
    const answer = answerSentences(
      { ...record, model: modelOf([flag]), predictions: [], prediction_total: null },
      own,
    );
    expect(answer[0]).toContain('night (yes rather than no:');
  });
  it('says where a curve turns, and what a bend adds', () => {
    const x = [0, 1, 2, 3, 4, 5, 6];
    const curved = term({
      name: 'headwind, degree 2',
      kind: 'polynomial',
      variables: ['headwind'],
      typical_steps: [
        { from: '1', to: '5.7', from_value: 1, to_value: 5.7, estimate: 14, lower: 12, upper: 16 },
      ],
      curve: {
        variable: 'headwind',
        x,
        y: x.map((v) => (v - 3) ** 2),
        lower: x.map(() => null),
        upper: x.map(() => null),
      },
    });
    expect(termSentences(lexicon, curved, modelOf([curved]), []).map(plain)).toEqual([
      'Headwind from 1 to 5.7 m/s, the middle half of its values, goes with 14.0 L more fuel burned (95 % interval 12.0 to 16.0 L).',
      'The curve is lowest near 3 m/s.',
    ]);
    const bend = term({ name: 'cargo above 80', kind: 'bend' });
    const column = {
      name: 'cargo above 80',
      term: 'cargo above 80',
      unit: 't',
      pieces: [{ kind: 'bend' as const, variable: 'cargo', at: 80, side: 'above' as const }],
      estimate: 2,
      mean: 1,
    };
    const alone = termSentences(lexicon, bend, modelOf([bend], [column]), [coefficient('cargo above 80', 2)]);
    expect(plain(alone[0]!)).toMatch(/^Each tonne of cargo above 80 t goes with 2\.00 L more fuel burned/);
    const beside = termSentences(lexicon, bend, modelOf([bend, term({})], [column]), [
      coefficient('cargo above 80', 2),
    ]);
    expect(plain(beside[0]!)).toContain('in addition to the straight relationship');
  });
});

describe('the equation', () => {
  it('has every column, signs apart from numbers, and explains its brackets', () => {
    const equation = equationOf(
      lexicon,
      record.model!,
      record.candidates.find((c) => c.name === record.model!.candidate)!.coefficients,
    );
    expect(equation.summands).toHaveLength(record.model!.columns.length);
    expect(equation.text).toMatch(/^fuel \(L\) = [\d.]+ \+ [\d.]+ × cargo \(t\)/);
    expect(equation.text).toContain('[vessel is Tern]');
    expect(equation.note).toContain('1 where it holds');
    expect(equation.summands.every((s) => !s.number.includes('−'))).toBe(true);
  });
  it('writes bends as what they are', () => {
    const column = {
      name: 'b',
      term: 'b',
      unit: null,
      pieces: [{ kind: 'bend' as const, variable: 'cargo', at: -5, side: 'below' as const }],
      estimate: -2,
      mean: 1,
    };
    expect(plain(equationOf(onScale('log'), modelOf([], [column]), []).text)).toBe(
      'log fuel (L) = −2.000 × max(0, −5 t − cargo)',
    );
  });
});

describe('the first screen', () => {
  it('answers with the total, the largest typical steps, units and intervals', () => {
    const [total, drivers] = answerSentences(record, lexicon).map(plain);
    expect(total).toMatch(
      /^The 3 rows asked for come to [\d ]+ L \(90 % interval [\d ]+ to [\d ]+ L\) of fuel burned in total\.$/,
    );
    expect(drivers).toMatch(
      /^Of the terms in the model, fuel burned goes most with .* then with .*, the other terms held\.$/,
    );
    const rungs = largestRungs(record.model!.terms);
    expect(Math.abs(rungs[0]!.step.estimate)).toBeGreaterThanOrEqual(Math.abs(rungs[1]!.step.estimate));
  });
  it('answers "none" with the reasons of the best ranked', () => {
    const none = sampleRecord({ admit: false });
    expect(answerSentences(none, lexiconOf(none))[0]).toMatch(
      /^None of the 6 candidates was admitted .* was refused: the sign/,
    );
  });
  it('never says cause, and never significant alone', () => {
    for (const wish of [{}, { scale: 'log' as const }, { admit: false }]) {
      const r = sampleRecord(wish);
      const text = [...answerSentences(r, lexiconOf(r)), ...bewareLines(r, lexiconOf(r))].join(' ');
      expect(text).not.toMatch(/\bcauses?\b|significant/);
    }
  });
  it('lists three to five lines, missed criteria and what calls for care before the rest', () => {
    const lines = bewareLines(record, lexicon);
    expect(lines.length).toBeGreaterThanOrEqual(3);
    expect(lines.length).toBeLessThanOrEqual(5);
    expect(lines[0]).toContain('the study asks for');
    expect(lines[1]).toContain('outside the data');
  });
  it('still has three lines where nothing was found, and says how many it leaves out where much was', () => {
    const calm: StudyRecord = {
      ...record,
      acceptance: [],
      warnings: [],
      predictions: [],
      examination: { ...record.examination!, findings: [], before_you_rely: [] },
    };
    expect(bewareLines(calm, lexicon)).toHaveLength(3);
    const loud: StudyRecord = {
      ...record,
      warnings: Array.from({ length: 9 }, (_, i) => ({ about: 'x', text: `Warning ${i}.` })),
    };
    const lines = bewareLines(loud, lexicon);
    expect(lines).toHaveLength(5);
    expect(lines[4]).toMatch(/\d+ more/);
  });
  it('shows what the examination lists in its order: what weighs most before the warnings, the rest after', () => {
    const { before_you_rely: list, ...examination } = record.examination!;
    const one = { about: 'shape', finding: 'shape', concern: 2 } as const;
    const told: StudyRecord = {
      ...record,
      acceptance: [],
      warnings: [{ about: 'x', text: 'A warning.' }],
      examination: {
        ...examination,
        before_you_rely: [
          { ...one, text: 'Grave.', weight: 0.9 },
          { ...one, text: 'Slight.', weight: 0.3 },
        ],
      },
    };
    expect(list!.length).toBeGreaterThan(0);
    expect(bewareLines(told, lexicon).slice(0, 3)).toEqual(['Grave.', 'A warning.', 'Slight.']);
    // A record of a version before the list: the findings, by concern.
    const old: StudyRecord = { ...told, examination };
    const lines = bewareLines(old, lexicon);
    const care = examination.findings.filter(({ concern }) => concern === 2);
    expect(lines.indexOf('A warning.')).toBe(care.length);
    expect(lines.at(care.length + 1)).toContain(
      examination.findings.find(({ concern }) => concern === 1)!.verdict,
    );
  });
  it('tells how closely the model follows, with weights by the mean weight', () => {
    const candidate = record.candidates.find((c) => c.name === record.model!.candidate)!;
    expect(plain(fitSentence(lexicon, candidate, modelsLookedAt(record)))).toMatch(
      /chosen of 6 candidates, accounts for 9\d\.\d % .* it typically misses by \d+ L\.$/,
    );
    const variables = new Map(lexicon.variables);
    variables.set('days', {
      ...variables.get('cargo')!,
      name: 'days',
      label: 'Days',
      unit: null,
      used_as: ['weights'],
      mean: 25,
    });
    expect(plain(typicalMiss({ ...lexicon, variables }, 100)!)).toBe('20 L at the mean weight (days 25)');
    expect(typicalMiss(lexicon, null)).toBeNull();
    const log = { ...lexicon, response: { ...lexicon.response, scale: 'log' } };
    expect(plain(typicalMiss(log, Math.log(1.44))!)).toBe('44 %');
    expect(plain(typicalMiss(log, 1)!)).toBe('a factor of 2.7');
    expect(
      fitSentence(lexicon, { ...candidate, r_squared: null }, { count: 1, exact: true, searched: false }),
    ).toContain('no defined R²');
  });
  it('says what acceptance asked for', () => {
    const met = { criterion: 'adjusted_r_squared', limit: 'at least 0.75', value: 0.8234, passed: true };
    expect(acceptanceSentence([])).toBeNull();
    expect(acceptanceSentence([met])).toBe('The acceptance criterion is met.');
    expect(acceptanceSentence([met, met])).toBe('All 2 acceptance criteria are met.');
    const missed = { ...met, passed: false };
    expect(acceptanceSentence([missed])).toBe('The acceptance criterion is missed: adjusted R².');
    expect(acceptanceSentence([missed, { ...missed, criterion: 'rows_used' }])).toBe(
      'All 2 acceptance criteria are missed: adjusted R² and number of rows used.',
    );
    expect(missedSentences([met, missed, { ...missed, criterion: 'chosen', value: null }], null)).toEqual([
      `Adjusted R² is 0.823; the study asks for ${met.limit}.`,
      `Candidate chosen is none; the study asks for ${met.limit}.`,
    ]);
    expect(plain(acceptanceSentence([met, missed])!)).toBe(
      '1 of 2 acceptance criteria is missed: adjusted R².',
    );
    expect(acceptanceValue(met, 'L')).toBe('0.823');
    expect(plain(acceptanceValue({ ...met, criterion: 'residual_standard_error', value: 44.5 }, 'L'))).toBe(
      '44.5 L',
    );
    expect(acceptanceValue({ ...met, value: null }, null)).toBe('–');
    // A figure is never rounded onto the limit that it misses.
    expect(acceptanceValue({ ...met, value: 0.74998, passed: false }, null)).toBe('0.74998');
    expect(
      acceptanceValue({ criterion: 'largest_vif', limit: 'at most 5', value: 5.00003, passed: false }, null),
    ).toBe('5.00003');
  });
  it('gives study, data and dates in one line', () => {
    expect(plain(studyLine(record))).toBe(
      'Study crossings.yaml · data crossings.csv · 240 of 259 rows · 4 January 2023 to 27 February 2024',
    );
  });
});

describe('data in words', () => {
  it('counts rows and reasons', () => {
    expect(rowsSentence({ ...record.data, rows_read: 240 })).toMatch(/^All 240.rows read were used\.$/);
    expect(plain(rowsSentence(record.data))).toContain('the other 19 (7.3 %) are counted below');
    expect(plain(rowsSentence({ ...record.data, rows_read: 36, rows_used: 35 }))).toBe(
      '35 of the 36 rows read were used; the other one (2.8 %) is counted below, under its reason.',
    );
    expect(lossReason(record.data.left_out[1]!)).toContain(
      '(9 with those that lack something else as well and are counted above)',
    );
    expect(contractSentence({ ...record.data, bad_value_count: 0, bad_values: [] })).toBe(
      'No value broke the declared contract.',
    );
    expect(contractSentence({ ...record.data, bad_value_count: 900 })).toContain('; 1 of them is listed');
    expect(ignoredSentence({ ...record.data, columns_ignored: [] })).toBeNull();
    expect(
      ignoredSentence({ ...record.data, columns_ignored: Array.from({ length: 15 }, (_, i) => `c${i}`) }),
    ).toContain('and 3 more');
  });
});

describe('selection, predictions and findings in words', () => {
  it('says the rule for every criterion', () => {
    for (const rank_by of [
      'adjusted_r_squared',
      'aic',
      'aicc',
      'bic',
      'mallows_cp',
      'press',
      'partial_f',
    ] as const) {
      const sentences = ruleSentences({ ...record, selection: { ...record.selection, rank_by } });
      expect(sentences[1]).toMatch(
        rank_by === 'partial_f' ? /significance of 0\.05, by partial F/ : /is better/,
      );
    }
    expect(
      ruleSentences({ ...record, selection: { ...record.selection, prefer_smaller_within: 0 } })[1],
    ).not.toContain('within');
  });
  it('captions the distances: best, not best, none', () => {
    expect(distanceCaption(record.selection, record.candidates)).toMatch(/has the best AICc/);
    expect(plain(distanceCaption({ ...record.selection, chosen: 'By vessel' }, record.candidates))).toMatch(
      /^By vessel, chosen, lies [\d.]+ from the best AICc, with 8 coefficients; Hull as well has 9 coefficients\.$/,
    );
    expect(distanceCaption({ ...record.selection, chosen: null }, record.candidates)).toContain(
      'no candidate was admitted',
    );
  });
  it('predicts in a sentence for none, few, many', () => {
    expect(predictionSentence(lexicon, [], null)).toBeNull();
    const two = record.predictions.slice(0, 2);
    expect(plain(predictionSentence(lexicon, two, null)!)).toMatch(
      /^Predicted fuel burned: \d+ L \(90 % interval .*\) for Loaded, slow and .* for Light, fast\.$/,
    );
    expect(plain(predictionSentence(lexicon, [...two, ...two], null)!)).toMatch(
      /^The 4 predictions of fuel burned lie between/,
    );
    expect(intervalCaption(lexicon, record.predictions)).toContain('lies outside the data');
    expect(intervalCaption(lexicon, [])).toBe('');
    // exp(17.7 ± 2.7): an interval from another scale has its lower end above 0, and says so.
    const wide = {
      ...record.predictions[0]!,
      label: 'A',
      estimate: 48844490,
      lower: 3337933,
      upper: 714748884,
    };
    expect(plain(predictionSentence(lexicon, [wide], null)!)).toMatch(
      /48 800 000 L \(\d+ % interval 3 300 000 to 714 700 000 L\)/,
    );
  });
  it('gives the evidence of a finding', () => {
    const finding = record.examination!.findings[0]!;
    expect(plain(evidence({ ...finding, statistic: 9.372, df: [8], p_value: 0.31 })!)).toBe(
      'Koenker’s form of the Breusch–Pagan statistic: 9.37 on 8 degrees of freedom, p = 0.31.',
    );
    expect(plain(evidence({ ...finding, statistic: 4, df: [1, 20], p_value: null, mark: 'about 2' })!)).toBe(
      'Koenker’s form of the Breusch–Pagan statistic: 4.00 on 1 and 20 degrees of freedom; customary mark: about 2.',
    );
    expect(evidence({ ...finding, statistic: null })).toBeNull();
  });
  it('gives the figures beside a statistic, rows in whole numbers, none where it is to be brief', () => {
    const finding = {
      ...record.examination!.findings[0]!,
      statistic: 12,
      statistic_name: 'rows that do',
      df: [],
      p_value: null,
      mark: null,
      figures: [
        { name: 'skewness', value: 4 },
        { name: 'rows back', value: 1200 },
        { name: 'nothing', value: null },
      ],
    };
    expect(plain(evidence(finding)!)).toBe('Rows that do: 12. Also: skewness 4.00; rows back 1 200.');
    expect(evidence(finding, true)).toBe('Rows that do: 12.');
  });
  it('says on the first screen what was found, not what to do about it', () => {
    const finding = { ...record.examination!.findings[0]!, verdict: 'It bends.', advice: 'Straighten it.' };
    const told: StudyRecord = {
      ...record,
      acceptance: [],
      examination: {
        ...record.examination!,
        findings: [finding],
        before_you_rely: [
          { text: 'It bends. Straighten it.', about: 'shape', finding: finding.name, concern: 2, weight: 1 },
        ],
      },
    };
    expect(bewareLines(told, lexicon)[0]).toBe('It bends.');
  });
  it('always warns of association, selection, extrapolation and review, the study’s own caution first', () => {
    const headings = cautions(record).map((c) => c.heading);
    expect(headings[0]).toBe('From the study');
    expect(headings).toEqual(expect.arrayContaining(['Association', 'Selection', 'Extrapolation', 'Review']));
    expect(cautions(record).find((c) => c.heading === 'Selection')!.text).toMatch(/^6\u00a0candidates/);
    expect(cautions({ ...record, study: { ...record.study, caution: null } })[0]!.heading).toBe(
      'Association',
    );
  });
});
