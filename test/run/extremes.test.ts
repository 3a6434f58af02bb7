/**
 * Input at the edge of what can be fitted, predicted and said: exact fits, models of the mean alone, no intercept,
 * very large and very small numbers, other scales, repeated times, weights of zero, wide files and long names.
 */
import { describe, expect, test } from 'vitest';
import { data, dataWith, pointed, type SmallRow, study } from './small-study.ts';
import { type Files, type Outcome, wholeRun } from './whole-run.ts';

async function run(studyText: string, dataText: string, others: NonNullable<Files['others']> = {}) {
  const outcome = await wholeRun({ study: studyText, data: dataText, others });
  expect(outcome.faults).toEqual([]);
  return outcome;
}

function messages(outcome: Outcome): string[] {
  return outcome.problems.map(({ message }) => message);
}

const BY_R_SQUARED = 'selection: { rank_by: adjusted_r_squared }\n';
const onScale = (scale: string) => ({ 'response: y': `response: { variable: y, scale: ${scale} }` });
const exact = (row: SmallRow) => {
  row.y = 3 + 2 * Number(row.x);
};

describe('exact fits', () => {
  const predict =
    'predict: { total: true, rows: [{ label: Four, x: 4, z: 1 }, { label: Five, x: 5, z: 1 }] }\n';

  test('are chosen by adjusted R², said to be exact, and predicted without intervals', async () => {
    const { study: text, marks } = pointed(
      study({ '- name: Straight': '- «name: Straight»' }, BY_R_SQUARED + predict),
      ['(fit_exact @1)'],
    );
    const outcome = await run(text, data(exact));
    expect([outcome.status, outcome.marks]).toEqual([0, marks]);
    expect(messages(outcome)).toEqual([
      'But for rounding, y is fitted exactly in all 16 rows used by Straight, Both: nothing can be tested there, and there are no intervals.',
    ]);
    const { record } = outcome;
    expect(record!.selection.chosen).toBe('Straight');
    expect(record!.candidates[0]).toMatchObject({ r_squared: 1, adjusted_r_squared: 1, aic: null });
    expect(record!.candidates[0]!.coefficients).toMatchObject([
      { name: 'intercept', standard_error: null, p_value: null, lower: null },
      { name: 'x', standard_error: null, p_value: null, upper: null },
    ]);
    expect(record!.candidates[0]!.coefficients[1]!.estimate).toBeCloseTo(2, 12);
    expect(record!.model!.residual_standard_error).toBeNull();
    expect(record!.predictions).toMatchObject([
      { lower: null, upper: null, mean_lower: null, mean_upper: null },
      { lower: null, upper: null },
    ]);
    expect(record!.predictions[0]!.estimate).toBeCloseTo(11, 10);
    expect(record!.prediction_total).toMatchObject({ rows: 2, lower: null, upper: null });
    for (const finding of record!.examination!.findings) {
      if (finding.name !== 'enough_rows') expect(finding.statistic, finding.name).toBeNull();
    }
    const report = outcome.results.get('report.md')!;
    expect(report).toContain('fits these rows exactly');
    expect(report).not.toMatch(/typically misses|interval [^|\n]*11/);
    expect(outcome.out).toContain('it fits these rows exactly');
  });

  test('cannot be ranked by a likelihood, which has no bound', async () => {
    const outcome = await run(study(), data(exact));
    expect([outcome.status, outcome.marks]).toEqual([
      2,
      ['(fit_exact 13:5+14)', 'criterion_undefined 1:1+12'],
    ]);
    expect(outcome.problems[1]!.message).toContain('it fits these rows exactly');
    expect(outcome.problems[1]!.hint).toContain('adjusted_r_squared');
  });

  test('are refused by partial F, with the reason; status 1', async () => {
    const { status, record } = await run(study({}, 'selection: { rank_by: partial_f }\n'), data(exact));
    expect(status).toBe(1);
    expect(record!.selection.chosen).toBeNull();
    expect(record!.candidates[0]!.refused_because.join()).toContain('exactly');
  });

  test.each([
    ['log', (x: number) => Math.exp(x / 2), Math.exp(2)],
    ['sqrt', (x: number) => (x + 1) ** 2, 25],
    ['reciprocal', (x: number) => 1 / (x + 1), 1 / 5],
    ['{ box_cox: 2 }', (x: number) => Math.sqrt(x + 1), Math.sqrt(5)],
  ])('on the scale %s', async (scale, of, wanted) => {
    const text = study(onScale(scale), `${BY_R_SQUARED}predict: { rows: [{ label: Four, x: 4, z: 1 }] }\n`);
    const outcome = await run(
      text,
      data((row) => {
        row.y = of(Number(row.x));
      }),
    );
    expect([outcome.status, outcome.marks]).toEqual([0, ['(fit_exact 13:5+14)']]);
    expect(outcome.record!.predictions[0]!.estimate).toBeCloseTo(wanted, 10);
    expect(outcome.record!.predictions[0]!.lower).toBeNull();
  });

  test('beside candidates that are not exact', async () => {
    const text = study({ '[x, z]': '[z]' }, BY_R_SQUARED);
    const outcome = await run(text, data(exact));
    expect([outcome.status, outcome.marks]).toEqual([0, ['(fit_exact 13:5+14)']]);
    expect(outcome.record!.selection.chosen).toBe('Straight');
  });
});

describe('models of little', () => {
  test('the mean alone, as the only candidate', async () => {
    const text = study(
      { '[x]\n  - name: Both\n    terms: [x, z]': '[]' },
      'predict: { rows: [{ label: One }], total: true }\n',
    );
    const { status, marks, record, results } = await run(text, data());
    expect([status, marks]).toEqual([0, []]);
    const ys = data()
      .trim()
      .split('\n')
      .slice(1)
      .map((line) => Number(line.split(',')[0]));
    const mean = ys.reduce((sum, y) => sum + y) / ys.length;
    expect(record!.candidates[0]).toMatchObject({
      coefficient_count: 1,
      r_squared: 0,
      overall_f: null,
      terms: [],
    });
    expect(record!.candidates[0]!.coefficients[0]!.estimate).toBeCloseTo(mean, 12);
    expect(record!.predictions[0]!.estimate).toBeCloseTo(mean, 12);
    expect(results.get('report.html')).toContain('One');
  });

  test('the mean alone, chosen before a term that says nothing', async () => {
    const text = study({ '[x]': '[]', '[x, z]': '[z]' });
    const { status, marks, record } = await run(
      text,
      data((row, i) => {
        row.y = 10 + ((i * i * 5) % 7);
      }),
    );
    expect([status, marks]).toEqual([0, []]);
    expect(record!.selection.chosen).toBe('Straight');
    expect(record!.partial_f).toMatchObject([{ smaller: 'Straight', larger: 'Both', df1: 1 }]);
  });

  test('neither a term nor an intercept', async () => {
    const { study: text, marks } = pointed(study({ '[x]\n': '«[]»\n    intercept: false\n' }), []);
    const outcome = await run(text.replaceAll(/[«»]/g, ''), data());
    expect(marks).toEqual([]);
    expect([outcome.status, outcome.marks]).toEqual([2, ['limit_nonsense 14:5+5']]);
  });

  test('no intercept', async () => {
    const text = study(
      { '[x]\n': '[x]\n    intercept: false\n' },
      `${BY_R_SQUARED}predict: { rows: [{ label: Zero, x: 0, z: 0 }] }\n`,
    );
    const { status, marks, record } = await run(
      text.replace('  - name: Both\n    terms: [x, z]\n', '').replace(', z: 0', ''),
      data(),
    );
    expect([status, marks]).toEqual([0, []]);
    expect(record!.candidates[0]).toMatchObject({
      intercept: false,
      coefficient_count: 1,
      overall_f: { df1: 1, df2: 15 },
    });
    expect(record!.predictions[0]).toMatchObject({ estimate: 0, leverage: 0, mean_lower: 0, mean_upper: 0 });
    expect(record!.predictions[0]!.upper).toBeGreaterThan(0);
  });

  test('no intercept, and a term that is 0 in every row', async () => {
    const { study: text, marks } = pointed(
      study({ '- name: Both\n    terms: [x, z]': '- «name: Both»\n    terms: [z]\n    intercept: false' }),
      ['predictor_constant @1', '(predictor_constant 16:13+1)'],
    );
    const outcome = await run(
      text,
      data((row) => {
        row.z = 0;
      }),
    );
    expect([outcome.status, outcome.marks]).toEqual([2, marks]);
    expect(messages(outcome)[0]).toBe(
      'Both has no intercept, and its terms are 0 in all 16 rows used, so there is nothing to fit.',
    );
  });

  test('all rows left out, and all but one', async () => {
    const all = await run(study({}, 'leave_out: [{ where: x >= 0, because: All of them }]\n'), data());
    expect([all.status, all.marks]).toEqual([2, ['nothing_left data.csv']]);
    expect(messages(all)).toEqual([
      'No row is left to fit. 16 rows were read, and all are lost: 16 for "All of them".',
    ]);
    const one = await run(study({}, 'leave_out: [{ where: x > 0, because: Most }]\n'), data());
    expect([one.status, one.marks]).toEqual([2, ['rows_too_few 13:5+14', 'rows_too_few 15:5+10']]);
  });

  test('a polynomial of a constant', async () => {
    const { study: text, marks } = pointed(study({ '[x, z]': '[x, «{ polynomial: z, degree: 3 }»]' }), [
      '(predictor_constant @1)',
      '(predictor_constant @1)',
      '(predictor_constant @1)',
    ]);
    const outcome = await run(
      text,
      data((row) => {
        row.z = 2;
      }),
    );
    expect([outcome.status, outcome.marks]).toEqual([0, marks]);
    expect(messages(outcome)[2]).toBe('z³ is 8 in every row used, so z³ is left out of Both.');
  });

  test('a polynomial of a variable with two values', async () => {
    const { study: text, marks } = pointed(study({ '[x, z]': '[«{ polynomial: z, degree: 3 }»]' }), [
      '(columns_dependent @1)',
      '(columns_dependent @1)',
    ]);
    const outcome = await run(
      text,
      data((row, i) => {
        row.z = i % 2;
      }),
    );
    expect([outcome.status, outcome.marks]).toEqual([0, marks]);
    expect(messages(outcome)[0]).toBe('z² equals z in these rows, so z² is left out of Both.');
  });
});

describe('very large and very small numbers', () => {
  const scaled = (which: 'y' | 'x' | 'z', factor: number) =>
    data((row) => {
      row[which] = (Number(row[which]) + 1) * factor;
    });

  test.each([
    ['y', 1e200, 'y is about 3.45e+201 there, too large for its squares to be computed with.'],
    ['x', 1e200, 'x is about 1.6e+201 there, too large for its squares to be computed with.'],
    ['z', 1e200, 'z is about 5e+200 there, too large for its squares to be computed with.'],
    ['y', 1e-200, 'y is about 3.45e-199 there, too small for its squares to be computed with.'],
    ['x', 1e-200, 'x is about 1.6e-199 there, too small for its squares to be computed with.'],
    ['x', 1e-310, 'x is about 1.6e-309 there, too small for its squares to be computed with.'],
  ] as const)('%s times %s', async (which, factor, message) => {
    const outcome = await run(study(), scaled(which, factor));
    expect(outcome.status).toBe(2);
    expect(outcome.marks).toHaveLength(1);
    expect(outcome.marks[0]).toMatch(new RegExp(`^value_not_finite row \\d+ ${which}$`));
    expect(messages(outcome)).toEqual([message]);
  });

  test.each([1e30, 1e-30])('y and z times %s, and x divided by it', async (factor) => {
    const both = (one: number, other: number) =>
      data((row) => {
        row.y = Number(row.y) * one;
        row.z = Number(row.z) * one;
        row.x = Number(row.x) * other;
      });
    const text = study(
      { '[x, z]': '[x, z, { interaction: [x, z] }]', '[x]': '[{ polynomial: x, degree: 2 }]' },
      'predict: { rows: [{ label: At 0, x: 0, z: 0 }], total: true }\n',
    );
    const plain = await run(text, both(1, 1));
    const far = await run(text, both(factor, 1 / factor));
    expect([far.status, far.marks]).toEqual([0, []]);
    const [a, b] = [plain.record!, far.record!];
    expect(b.selection.chosen).toBe(a.selection.chosen);
    a.candidates.forEach((candidate, i) => {
      const other = b.candidates[i]!;
      expect(other.r_squared).toBeCloseTo(candidate.r_squared!, 10);
      expect(other.overall_f!.statistic! / candidate.overall_f!.statistic!).toBeCloseTo(1, 8);
      candidate.coefficients.forEach((coefficient, j) => {
        expect(other.coefficients[j]!.t! / coefficient.t!).toBeCloseTo(1, 8);
      });
    });
    expect(b.predictions[0]!.upper! / (a.predictions[0]!.upper! * factor)).toBeCloseTo(1, 8);
    const effects = ({ model }: typeof a) =>
      model!.terms.flatMap((term) => [...term.slopes, ...term.typical_steps].map(({ estimate }) => estimate));
    const curves = ({ model }: typeof a) => model!.terms.flatMap((term) => term.curve?.y ?? []);
    expect(effects(b)).toHaveLength(effects(a).length);
    expect(effects(a).length + curves(a).length).toBeGreaterThan(10);
    effects(a).forEach((estimate, i) => {
      expect(effects(b)[i]! / (estimate * factor)).toBeCloseTo(1, 8);
    });
    curves(a).forEach((y, i) => {
      expect(curves(b)[i]! / factor).toBeCloseTo(y, 8);
    });
    a.examination!.findings.forEach((finding, i) => {
      if (finding.statistic === null) return;
      expect(b.examination!.findings[i]!.statistic! / finding.statistic, finding.name).toBeCloseTo(1, 6);
    });
  });

  test('beyond all squares in a variable that no candidate uses', async () => {
    const outcome = await run(
      study(),
      data((row, i) => {
        row.w = i % 2 === 0 ? 1.7e308 : -1.7e308;
      }),
    );
    expect([outcome.status, outcome.marks]).toEqual([0, []]);
    const one = outcome.record!.data.variables.find(({ name }) => name === 'w')!;
    expect(one).toMatchObject({ used_as: ['declared only'], smallest: null });
  });

  test('beyond all squares in a variable that is only derived from', async () => {
    const text = study({ '[x, z]': '[x, lw]' }, 'derive: { lw: { expression: log10(w) } }\n');
    const outcome = await run(
      text,
      data((row, i) => {
        row.w = 10 ** (290 + ((i * i) % 7));
      }),
    );
    expect([outcome.status, outcome.marks]).toEqual([0, []]);
    const w = outcome.record!.data.variables.find(({ name }) => name === 'w')!;
    expect(w.largest).toBeCloseTo(1e294, -280);
    expect(w.standard_deviation! / 1e293).toBeGreaterThan(1);
    expect(w.standard_deviation! / 1e294).toBeLessThan(1);
  });

  test('a product of variables that are each small enough', async () => {
    const { status, marks } = await run(
      study({ '[x, z]': '[x, z, { interaction: [x, z] }]' }),
      data((row) => {
        row.x = (Number(row.x) + 1) * 1e50;
        row.z = (Number(row.z) + 1) * 1e50;
      }),
    );
    expect([status, marks]).toEqual([2, ['value_not_finite row 14 x']]);
  });

  test('a product of variables that are large in different rows', async () => {
    const outcome = await run(
      study({ '[x, z]': '[x, z, { interaction: [x, z] }]' }),
      data((row, i) => {
        row.x = i % 2 === 0 ? (i + 1) * 1e50 : i * 1e-50;
        row.z = i % 2 === 0 ? 1e-50 : ((i * 7) % 5) * 1e50;
      }),
    );
    expect([outcome.status, outcome.marks]).toEqual([2, ['value_not_finite row 9 x']]);
    expect(messages(outcome)[0]).toBe(
      'x × z, with each of its variables at the largest, is about 6e+101 there, too large for its squares to be computed with.',
    );
  });

  test('weights that are extreme', async () => {
    for (const w of ['1e300', '1e-300']) {
      const { status, marks } = await run(
        study({}, 'weights: w\n'),
        data((row) => {
          row.w = w;
        }),
      );
      expect([status, marks]).toEqual([2, ['value_not_finite row 2 w']]);
    }
    const { status, marks } = await run(study({}, 'weights: w\n'), dataWith(5, { w: '1e-200' }));
    expect([status, marks]).toEqual([2, ['value_not_finite row 7 w']]);
  });

  test('an offset that hides the variation of all but the last digits', async () => {
    const { status, record } = await run(
      study({ '[x, z]': '[x, z, { interaction: [x, z] }]' }, BY_R_SQUARED),
      data((row) => {
        row.x = 2 ** 40 + Number(row.x);
      }),
    );
    expect(status).toBe(0);
    const slope = record!.candidates[0]!.coefficients[1]!;
    const plain = (await run(study({}, BY_R_SQUARED), data())).record!.candidates[0]!.coefficients[1]!;
    expect(slope.estimate / plain.estimate).toBeCloseTo(1, 9);
  });
});

describe('weights', () => {
  test('of zero take the row out, and are counted', async () => {
    const { status, marks, record } = await run(
      study({}, 'weights: w\n'),
      data((row, i) => {
        if (i % 4 === 0) row.w = 0;
      }),
    );
    expect([status, marks]).toEqual([0, []]);
    expect(record!.data.left_out).toMatchObject([{ because: 'weight is zero', rows: 4, variable: 'w' }]);
    expect(record!.data.rows_used).toBe(12);
  });

  test.each([
    ['negative in one row', (i: number) => (i === 3 ? -1 : 1), 'weight_negative row 5 w'],
    ['zero in all rows', () => 0, 'weight_negative w'],
  ])('%s', async (_, weight, expected) => {
    const { status, marks } = await run(
      study({}, 'weights: w\n'),
      data((row, i) => {
        row.w = weight(i);
      }),
    );
    expect([status, marks]).toEqual([2, [expected]]);
  });

  test('missing in one row', async () => {
    const { status, record } = await run(study({}, 'weights: w\n'), dataWith(3, { w: '' }));
    expect(status).toBe(0);
    expect(record!.data.left_out).toMatchObject([{ kind: 'missing', rows: 1, variable: 'w' }]);
  });
});

describe('predictions', () => {
  const rows = (text: string) => `predict: { rows: [{ label: One, ${text} }] }\n`;

  test.each([
    ['a value of 1e300', {}, 'x: 1e300, z: 1'],
    ['the log scale beyond the largest number', onScale('log'), 'x: 100000, z: 1'],
  ])('too large to be computed: %s', async (_, changes, values) => {
    const { study: text, marks } = pointed(
      study(changes, `predict: { rows: [«{ label: One, ${values} }»] }\n`),
      ['value_not_finite @1'],
    );
    const outcome = await run(text, data());
    expect([outcome.status, outcome.marks]).toEqual([2, marks]);
    expect(messages(outcome)).toEqual([
      'The row "One" cannot be predicted: what the model leads to there is too large to be computed with.',
    ]);
  });

  test.each([
    ['sqrt', 'sqrt', -40],
    ['reciprocal', 'reciprocal', 40],
    ['{ box_cox: 0.5 }', 'box_cox 0.5', -40],
    ['{ box_cox: -1 }', 'box_cox -1', 40],
  ])('where no value of the response lies on the scale %s', async (scale, name, x) => {
    const { study: text, marks } = pointed(
      study(
        { ...onScale(scale), '  - name: Both\n    terms: [x, z]\n': '' },
        `predict: { rows: [«{ label: One, x: ${x} }»] }\n`,
      ),
      ['prediction_outside @1'],
    );
    const outcome = await run(text, data());
    expect([outcome.status, outcome.marks]).toEqual([2, marks]);
    expect(messages(outcome)[0]).toMatch(
      new RegExp(
        `^The row "One" cannot be predicted: the model leads to -?[\\d.]+ on the ${name} scale, where no y lies\\.$`,
      ),
    );
  });

  test('an interval on the reciprocal scale that crosses zero has no upper end', async () => {
    const text = study(
      { ...onScale('reciprocal'), '  - name: Both\n    terms: [x, z]\n': '' },
      `predict: { rows: [{ label: Far, x: 7 }, { label: Near, x: 1 }] }\n`,
    );
    const { status, marks, record, results, out } = await run(
      text,
      data((row, i) => {
        row.y = 1 / (0.55 - i / 30 + ((i * i * 5) % 7) / 50);
      }),
    );
    expect([status, marks]).toEqual([0, []]);
    const [far, near] = record!.predictions;
    expect(far!.upper).toBeGreaterThan(far!.estimate);
    expect(near!.upper).toBeGreaterThan(near!.estimate);
    const wide = await run(
      text.replace('x: 7', 'x: 17'),
      data((row, i) => {
        row.y = 1 / (0.55 - i / 30 + ((i * i * 5) % 7) / 50);
      }),
    );
    const end = wide.record!.predictions[0]!;
    expect(end.upper).toBeNull();
    expect(end.lower).toBeGreaterThan(0);
    expect(end.lower).toBeLessThan(end.estimate);
    expect(wide.results.get('report.md')).toMatch(/\d or more/);
    expect(wide.out).toMatch(/\d or more/);
    expect(wide.results.get('tables/predictions.csv')!.split('\n')[1]!.split(',')[3]).toBe('');
    expect([results.get('report.md'), out].join()).not.toMatch(/\d or more/);
  });

  test('an interval on the square-root scale ends at zero', async () => {
    const text = study({ ...onScale('sqrt'), '  - name: Both\n    terms: [x, z]\n': '' }, rows('x: 0'));
    const { status, record } = await run(
      text,
      data((row, i) => {
        row.y = (0.1 + i / 20 + ((i * i * 5) % 7) / 5) ** 2;
      }),
    );
    expect(status).toBe(0);
    const [one] = record!.predictions;
    expect(one!.lower).toBe(0);
    expect(one!.upper).toBeGreaterThan(one!.estimate);
  });

  test('of stated rows with a level that no row has', async () => {
    const { study: text, marks } = pointed(
      study(
        { '[x, z]': '[x, k]', '[x]': '[]' },
        'predict:\n  rows:\n    - «{ label: One, x: 1, k: q }»\n    - { label: Two, x: 1, k: a }\n',
      ),
      ['prediction_level_unknown @1'],
    );
    const outcome = await run(text, data());
    expect(outcome.status).toBe(2);
    expect(outcome.marks).toEqual(marks);
  });

  describe('of a file', () => {
    const text = study(
      { '[x]\n  - name: Both\n    terms: [x, z]': '[x, k]' },
      'predict: { file: new.csv }\n',
    );

    test.each<[string, string | null, string[]]>([
      ['that is missing', null, ['data_unreadable new.csv']],
      ['that is empty', '', ['data_empty new.csv']],
      ['without rows', 'x,k\n', ['data_no_rows new.csv']],
      ['without a column', 'x,z\n1,2\n', ['column_missing new.csv row 1 k']],
      ['with a cell that is no number', 'x,k\nten,a\n', ['cell_not_number new.csv row 2 x']],
      ['with ragged rows', 'x,k\n1\n', ['row_ragged new.csv row 2']],
    ])('%s', async (_, content, marks) => {
      const outcome = await run(text, data(), content === null ? {} : { 'new.csv': content });
      expect([outcome.status, outcome.marks]).toEqual([2, marks]);
    });

    test('with unknown levels, missing values and numbers beyond all use: the other rows are predicted', async () => {
      const { status, marks, record } = await run(text, data(), {
        'new.csv': 'x,k\n1,a\n2,q\n,a\n4,\n1e308,b\n6,b\n',
      });
      expect([status, marks]).toEqual([
        0,
        [
          '(prediction_level_unknown new.csv row 3)',
          '(prediction_value_missing new.csv row 4)',
          '(prediction_value_missing new.csv row 5)',
          '(value_not_finite new.csv row 6)',
        ],
      ]);
      expect(record!.predictions.map(({ label }) => label)).toEqual(['line 2', 'line 7']);
      expect(record!.warnings).toHaveLength(4);
    });
  });
});

describe('time order', () => {
  const timed = study(
    { 'file: data.csv': 'file: data.csv\n  time: t', '    w: {': '    t: { type: date }\n    w: {' },
    BY_R_SQUARED,
  );
  /** The small data with a column of times before the last. */
  const withTimes = (time: (i: number) => string) =>
    data()
      .trim()
      .split('\n')
      .map((line, i) => `${line},${i === 0 ? 't' : time(i - 1)}`)
      .join('\n');
  const day = (i: number) => `2026-03-${String(i + 1).padStart(2, '0')}`;
  const independence = ({ record }: Outcome) =>
    record!.examination!.findings.find(({ name }) => name === 'independence')!;

  test('rows out of time order are put in order', async () => {
    const ordered = await run(timed, withTimes(day));
    const [header, ...lines] = withTimes(day).split('\n');
    const shuffled = await run(timed, [header, ...lines.reverse()].join('\n'));
    expect([shuffled.status, shuffled.marks]).toEqual([0, []]);
    expect(independence(shuffled).statistic).toBeCloseTo(independence(ordered).statistic!, 10);
    expect(shuffled.record!.data.time).toEqual({ variable: 't', first: '2026-03-01', last: '2026-03-16' });
  });

  test('repeated times are taken in file order, and said to be', async () => {
    const outcome = await run(
      timed,
      withTimes((i) => day(Math.floor(i / 2))),
    );
    expect([outcome.status, outcome.marks]).toEqual([0, []]);
    expect(JSON.stringify(outcome.record!.examination!.findings)).toContain('share their time');
  });

  test('one time for all rows', async () => {
    const outcome = await run(
      timed,
      withTimes(() => day(0)),
    );
    expect([outcome.status, outcome.marks]).toEqual([0, []]);
  });

  test('a missing time', async () => {
    const outcome = await run(
      timed,
      withTimes((i) => (i === 5 ? '' : day(i))),
    );
    expect(outcome.status).toBe(0);
    expect(outcome.record!.data.left_out).toMatchObject([{ kind: 'missing', variable: 't', rows: 1 }]);
  });
});

describe('names and levels', () => {
  test('levels that differ only in letter case or spaces', async () => {
    const levels = ['Tern', 'tern', 'New  York', 'New York', 'Holm'];
    const outcome = await run(
      study({ '[x, z]': '[x, k]' }),
      data((row, i) => {
        row.k = levels[i % 5]!;
      }, 30),
    );
    expect([outcome.status, outcome.marks]).toEqual([0, ['(levels_alike k)']]);
    expect(messages(outcome)).toEqual([
      'Levels of k differ only in letter case or spaces: "New  York", "New York"; "Tern", "tern".',
    ]);
    const declared = await run(
      study({
        'k: { type: category }': `k: { type: category, levels: [${levels.join(', ')}] }`,
        '[x, z]': '[x, k]',
      }),
      data((row, i) => {
        row.k = levels[i % 5]!;
      }, 30),
    );
    expect([declared.status, declared.marks]).toEqual([0, []]);
    const spelt = await run(
      study({ 'k: { type: category }': 'k: { type: category, levels: [a, b, c] }' }),
      dataWith(2, { k: 'A' }),
    );
    expect([spelt.status, spelt.marks]).toEqual([2, ['cell_level_undeclared row 4 k']]);
    expect(spelt.problems[0]!.hint).toBe('Did you mean a?');
  });

  test('very long level names', async () => {
    const outcome = await run(
      study({ '[x, z]': '[x, k]' }, BY_R_SQUARED),
      data((row, i) => {
        row.k = `${'long '.repeat(2000)}${i % 3}`;
        row.y = Number(row.y) + 9 * (i % 3);
      }),
    );
    expect([outcome.status, outcome.marks]).toEqual([0, []]);
    expect(outcome.record!.selection.chosen).toBe('Both');
  });

  test('identical candidates in another order of terms', async () => {
    const { study: text, marks } = pointed(
      study({ '- name: Straight\n    terms: [x]': '- «name: Straight»\n    terms: [z, x]' }),
      ['candidate_twice 15:5+10'],
    );
    const outcome = await run(text, data());
    expect([outcome.status, outcome.marks]).toEqual([2, marks]);
    const { status, record } = await run(
      study({
        '[x]': '[z, x, { interaction: [z, x] }]',
        '[x, z]': '[x, { polynomial: z, degree: 2 }, { interaction: [x, z] }]',
      }),
      data(),
    );
    expect(status).toBe(0);
    expect(record!.partial_f).toMatchObject([{ smaller: 'Straight', larger: 'Both' }]);
  });

  test('a file of five hundred columns of which two are used, and all of them', async () => {
    const wide = 500;
    const names = Array.from({ length: wide }, (_, j) => `c${j}`);
    const csv = [
      [...names, 'y'].join(','),
      ...Array.from({ length: 30 }, (_, i) =>
        [...names.map((_name, j) => (i * i * (j + 3) + j * 7) % 101), (i * i) % 13].join(','),
      ),
    ].join('\n');
    const few = `plumbrule: 1\ntitle: Wide\ndata: { file: data.csv, variables: { y: { type: number }, c3: { type: number } } }\nresponse: y\ncandidates:\n  - { name: A, terms: [c3] }\n`;
    const two = await run(few, csv);
    expect([two.status, two.marks]).toEqual([0, []]);
    expect(two.record!.data.columns_ignored).toHaveLength(wide - 1);
    const declared = names.map((name) => `${name}: { type: number }`).join(', ');
    const all = await run(
      `${few.replace('c3: { type: number }', declared)}  - { name: B, terms: [${names.join(', ')}] }\n`,
      csv,
    );
    expect([all.status, all.marks]).toEqual([0, ['(rows_too_few 7:5+2910)']]);
    expect(messages(all)).toEqual([
      'B has 501 coefficients for 30 rows: there is no one answer, and nothing can be tested.',
    ]);
    expect(all.record!.selection.chosen).toBe('A');
  });
});

describe('templates of the analyst’s own', () => {
  const text = study({}, 'report: { formats: [markdown], templates: { markdown: own.hbs } }\n');

  test.each([
    ['that is not closed', 'Title\n{{#if model}}', /own\.hbs:2:\d+ /],
    ['that closes something else', '{{#each rows}}{{/if}}', /own\.hbs:1:\d+ /],
    ['that names no helper', '{{shout title 1}}', /own\.hbs.*shout/],
    ['that names no partial', '{{> nowhere}}', /own\.hbs.*nowhere/],
    ['that includes itself', '{{#*inline "me"}}{{> me}}{{/inline}}{{> me}}', /own\.hbs/],
    ['that reaches for the engine', '{{constructor.constructor "return process"}}', /own\.hbs/],
  ])('%s', async (_, template, said) => {
    const { status, err } = await run(text, data(), { 'own.hbs': template });
    expect(status).toBe(2);
    expect(err).toMatch(said);
  });

  test('that is missing', async () => {
    const { status, err } = await run(text, data());
    expect(status).toBe(2);
    expect(err).toContain('The template cannot be read: there is no such file.');
  });

  test('that asks for what objects inherit gets nothing', async () => {
    const template = '[{{lookup this "__proto__"}}][{{lookup this "constructor"}}][{{title}}]';
    const { status, results } = await run(text, data(), { 'own.hbs': template });
    expect(status).toBe(0);
    expect(results.get('report.md')).toBe('[][][A small study]\n');
  });
});
