import { describe, expect, it } from 'vitest';
import { changed, read, SMALL, SOUND } from './sample.ts';

describe('a sound study', () => {
  const { study, problems } = read(SOUND);

  it('has no problems and is not changed by reading', () => {
    expect(problems).toEqual([]);
    expect(study).not.toBeNull();
  });

  it('knows where it comes from', () => {
    expect(study).toMatchObject({ file: 'ferry.yaml', folder: '/somewhere/studies', sha256: 'abc' });
    expect(study).toMatchObject({ title: 'Fuel burned per crossing', weights: 'share' });
  });

  it('resolves the data', () => {
    expect(study!.data).toMatchObject({
      file: 'crossings.csv',
      format: { delimiter: ',', decimalMark: '.', encoding: 'utf-8' },
      missing: ['', 'n/a'],
      rowId: 'crossing',
      time: 'departed',
      onBadValue: 'leave_out_row',
    });
    const by = new Map(study!.data.variables.map((variable) => [variable.name, variable]));
    expect([...by.keys()].slice(0, 4)).toEqual(['crossing', 'departed', 'fuel', 'cargo']);
    expect(by.get('fuel')).toMatchObject({
      atLeast: 50,
      atMost: 2500,
      label: 'Fuel burned',
      unit: 'L',
      column: 'fuel',
    });
    expect(by.get('cargo')?.missing).toEqual(['-999']);
    expect(by.get('speed')?.column).toBe('Speed (kn)');
    expect(by.get('vessel')).toMatchObject({ levels: ['Skerry', 'Tern', 'Holm'], baseline: 'Tern' });
    expect(by.get('deck')).toMatchObject({ levels: ['1', '2'], baseline: null });
    expect(by.get('night')?.flagValues).toEqual(['day', 'night']);
    expect(by.get('departed')?.pattern).toBe('DD.MM.YYYY');
  });

  it('resolves derived variables, conditions, response and candidates', () => {
    expect(study!.derive.map(({ name, type, text, unit }) => [name, type, text, unit])).toEqual([
      ['speed_cubed', 'number', 'speed ^ 3', 'kn³'],
      ['work', 'number', 'speed_cubed * cargo', null],
    ]);
    expect(study!.leaveOut).toMatchObject([
      { text: 'status == "trial"', because: 'Sea trials carry no cargo' },
    ]);
    expect(study!.response).toEqual({ variable: 'fuel', scale: { kind: 'natural' } });
    expect(study!.candidates.map(({ name, intercept, scale }) => [name, intercept, scale.kind])).toEqual([
      ['Load and speed', true, 'natural'],
      ['By vessel', true, 'natural'],
      ['Curved', false, 'box_cox'],
    ]);
    expect(study!.candidates[2]!.terms).toEqual([
      { kind: 'polynomial', variable: 'headwind', degree: 2 },
      { kind: 'power', variable: 'speed', to: 3 },
      { kind: 'bend', variable: 'cargo', at: 40, side: 'below' },
      { kind: 'spline', variable: 'hull_days', knots: [10, 60, 120] },
    ]);
    expect(study!.candidates[1]!.terms.at(-1)).toEqual({
      kind: 'interaction',
      of: [
        { kind: 'variable', variable: 'cargo' },
        { kind: 'variable', variable: 'vessel' },
      ],
    });
  });

  it('resolves the rest', () => {
    expect(study!.selection).toEqual({
      rankBy: 'bic',
      preferSmallerWithin: 2,
      significance: 0.01,
      oneStandardError: false,
      validation: null,
      honestError: null,
      holdOut: null,
      splitSample: null,
      stability: null,
      average: false,
      admit: {
        vif: { atMost: 10 },
        pValue: { atMost: 0.1 },
        signs: new Map([['cargo', 'positive']]),
        rowsPerCoefficient: { atLeast: 10 },
        adjustedRSquared: { atLeast: 0.5 },
      },
    });
    expect(study!.inference).toEqual({
      confidence: 0.9,
      dependentColumns: 'stop',
      standardErrors: { kind: 'clustered', by: 'vessel' },
      hypotheses: [
        {
          name: 'Tern carries as cheaply',
          equalities: [
            {
              combination: new Map([['cargo × vessel Tern', 1]]),
              equals: 0,
              path: ['inference', 'hypotheses', 0],
            },
          ],
        },
        {
          name: 'Ships alike',
          equalities: [
            {
              combination: new Map([
                ['vessel Skerry', 1],
                ['vessel Holm', -1],
              ]),
              equals: 2.5,
              path: ['inference', 'hypotheses', 1, 'all_of', 0],
            },
            {
              combination: new Map([['vessel Holm', 1]]),
              equals: 0,
              path: ['inference', 'hypotheses', 1, 'all_of', 1],
            },
          ],
        },
      ],
      levelComparisons: 'tukey_kramer',
      simultaneous: 'scheffe',
      slopesAt: new Map([['headwind', [-5, 0, 5]]]),
    });
    expect(study!.examination).toEqual({
      lags: 3,
      // Days from 1970-01-01 to 2024-03-01.
      splitAt: { variable: 'departed', value: 19783, text: '2024-03-01' },
      bootstrap: { repetitions: 499, seed: 7, by: 'blocks', blockLength: 12 },
    });
    expect(study!.predict).toMatchObject({ file: 'timetable.csv', interval: 0.8, total: true });
    expect([...study!.predict.rows[0]!.values]).toEqual([
      ['cargo', 80],
      ['speed', 9],
      ['headwind', 4],
      ['hull_days', 30],
      ['vessel', 'Tern'],
      ['night', false],
    ]);
    expect(study!.acceptance).toEqual([
      { criterion: 'adjusted_r_squared', atLeast: 0.75, atMost: null },
      { criterion: 'chosen', names: ['By vessel'] },
    ]);
    expect(study!.report).toEqual({
      formats: ['html'],
      templates: { html: 'own.hbs', markdown: null, comparison: { html: null, markdown: null } },
      keepSample: true,
      caution: 'The harbour master reviews this.',
    });
  });

  it('gives the place of a value, of a key for a mapping, and of the nearest parent for what is absent', () => {
    expect(study!.placeOf(['candidates', 0, 'terms', 1])).toEqual({
      kind: 'source',
      file: 'studies/ferry.yaml',
      line: 35,
      column: 20,
      length: 11,
    });
    expect(study!.placeOf(['data', 'variables', 'fuel'])).toMatchObject({ line: 13, column: 5, length: 4 });
    expect(study!.placeOf(['data', 'variables', 'fuel', 'levels'])).toMatchObject({ line: 13, column: 5 });
    expect(study!.placeOf(['selection', 'rank_by'])).toMatchObject({ line: 47, column: 12, length: 3 });
    expect(study!.placeOf([])).toMatchObject({ line: 1, column: 1 });
  });
});

describe('settings', () => {
  it('lists every setting that has a default, in order, with whether it was written', () => {
    expect(read(SMALL).study!.settings).toEqual(
      (
        [
          ['data.format.delimiter', 'found from the data'],
          ['data.format.decimal_mark', '"."'],
          ['data.format.encoding', 'found from the data'],
          ['data.missing', '"", NA, "n/a"'],
          ['data.row_id', 'none'],
          ['data.time', 'none'],
          ['data.on_bad_value', 'stop'],
          ['response.scale', 'natural'],
          ['weights', 'none'],
          ['selection.rank_by', 'aicc'],
          ['selection.prefer_smaller_within', '0'],
          ['selection.significance', '0.05'],
          ['selection.one_standard_error', 'false'],
          ['selection.validation', 'none'],
          ['selection.honest_error', 'none'],
          ['selection.hold_out', 'none'],
          ['selection.split_sample', 'none'],
          ['selection.stability', 'none'],
          ['selection.average', 'false'],
          ['inference.confidence', '0.95'],
          ['inference.dependent_columns', 'drop'],
          ['inference.standard_errors', 'classical'],
          ['inference.level_comparisons', 'holm'],
          ['inference.simultaneous', 'none'],
          ['examination.lags', 'found from the data'],
          ['examination.split_at', 'none'],
          ['examination.bootstrap', 'none'],
          ['predict.file', 'none'],
          ['predict.interval', '0.9'],
          ['predict.total', 'false'],
          ['report.formats', 'html, markdown'],
          ['report.templates.html', 'none'],
          ['report.templates.markdown', 'none'],
          ['report.templates.comparison.html', 'none'],
          ['report.templates.comparison.markdown', 'none'],
          ['report.keep_sample', 'true'],
          ['report.caution', 'none'],
        ] as const
      ).map(([key, value]) => ({ key, value, written: false })),
    );
  });

  it('knows a written value, also one equal to the default, and a scale with a power', () => {
    const text = changed(
      SMALL,
      'response: y',
      'weights: ~\nresponse: { variable: y, scale: { box_cox: 0.5 } }',
    );
    const settings = new Map(read(text).study!.settings.map((setting) => [setting.key, setting]));
    expect(settings.get('weights')).toEqual({ key: 'weights', value: 'none', written: true });
    expect(settings.get('response.scale')).toEqual({
      key: 'response.scale',
      value: 'box_cox 0.5',
      written: true,
    });
  });

  it('are in force where nothing is written', () => {
    const study = read(SMALL).study!;
    expect(study.data).toMatchObject({
      missing: ['', 'NA', 'n/a'],
      rowId: null,
      time: null,
      onBadValue: 'stop',
    });
    expect(study.data.format).toEqual({ delimiter: null, decimalMark: '.', encoding: null });
    expect(study.selection).toMatchObject({ rankBy: 'aicc', preferSmallerWithin: 0, significance: 0.05 });
    expect(study.inference).toEqual({
      confidence: 0.95,
      dependentColumns: 'drop',
      standardErrors: { kind: 'classical' },
      hypotheses: [],
      levelComparisons: 'holm',
      simultaneous: 'none',
      slopesAt: new Map(),
    });
    expect(study.examination).toEqual({ lags: null, splitAt: null, bootstrap: null });
    expect(study.predict).toEqual({ rows: [], file: null, interval: 0.9, total: false });
    expect(study.report.formats).toEqual(['html', 'markdown']);
  });
});

describe('names that mean something to JavaScript, or look like numbers', () => {
  it('are names like any other', () => {
    const text = changed(
      changed(
        SMALL,
        '    x: { type: number }',
        '    __proto__: { type: number }\n    constructor: { type: flag }\n    "2": { type: number }\n    "1": { type: number }',
      ),
      'terms: [x]',
      'terms: [__proto__, constructor, "2", "1"]',
    );
    const { study, problems } = read(text);
    expect(problems).toEqual([]);
    expect(study!.data.variables.slice(1, 5).map(({ name }) => name)).toEqual([
      '__proto__',
      'constructor',
      '2',
      '1',
    ]);
    expect(study!.candidates[0]!.terms).toHaveLength(4);
    expect(({} as { type?: unknown }).type).toBeUndefined();
  });

  it('keep the order of derivation', () => {
    const text = changed(
      SMALL,
      'response: y',
      'derive:\n  "9": { expression: x + 1 }\n  "1": { expression: "`9` + 1" }\nresponse: y',
    );
    const { study, problems } = read(changed(text, '[x]', '["1"]'));
    expect(problems).toEqual([]);
    expect(study!.derive.map(({ name }) => name)).toEqual(['9', '1']);
  });

  it('do not slip through as keys of fixed mappings', () => {
    const { places } = read(
      changed(SMALL, 'title: Small', 'title: Small\n__proto__: { a: 1 }\nconstructor: 1'),
    );
    expect(places).toEqual(['3:1+9 key_unknown', '4:1+11 key_unknown']);
  });
});
