import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { Column } from '../../src/data/table.ts';
import { baseVariables, evaluateDerived } from '../../src/prepare/derive.ts';
import { isMissing } from '../../src/prepare/is-missing.ts';
import { lineList } from '../../src/prepare/line-list.ts';
import { neededVariables, sampleVariables } from '../../src/prepare/needed-variables.ts';
import { prepareSample } from '../../src/prepare/prepare-sample.ts';
import type { Scale } from '../../src/study/study.ts';
import { byName, category, flags, numbers, texts } from './columns.ts';
import { gatherer, makeStudy, makeTable, type Written } from './make-study.ts';

function prepare(columns: readonly Column[], written: Written, badRows: readonly number[] | null = null) {
  const { problems, report } = gatherer();
  const sample = prepareSample(makeStudy(columns, written), makeTable(columns, badRows), report);
  return { sample, problems };
}

const valuesOf = (column: Column | undefined): readonly (number | string | null)[] => {
  if (column === undefined) throw new Error('no such column');
  if (column.kind === 'category') return Array.from(column.codes, (code) => column.levels[code] ?? null);
  return [...column.values];
};

describe('losses', () => {
  const y = numbers('y', [1, 2, 3, 4, 5, 6, null, 8, 9, 10]);
  const x = numbers('x', [1, 0, null, 4, 5, 6, null, -8, 9, 10]);
  const status = category('status', ['run', 'run', 'run', 'trial', 'trial', null, 'run', 'run', 'run', 'x']);

  test('each row goes under the first reason that applies, and the rest are gathered', () => {
    const { sample, problems } = prepare(
      [y, x, status],
      {
        derive: { speed_log: 'log(x)' },
        leaveOut: [
          ['status == "trial"', 'Sea trials carry no cargo'],
          ['y > 100', 'Never'],
          ['status == "trial" or status == "x"', 'Odd ones'],
        ],
        response: 'y',
        candidates: [{ terms: ['speed_log'] }, { terms: ['x'] }],
      },
      [0, 3],
    );
    expect(sample!.losses).toEqual([
      { because: 'bad value', kind: 'bad_value', rows: 2, variable: null, missingAny: null },
      { because: 'Sea trials carry no cargo', kind: 'left_out', rows: 1, variable: null, missingAny: null },
      { because: 'Never', kind: 'left_out', rows: 0, variable: null, missingAny: null },
      { because: 'Odd ones', kind: 'left_out', rows: 1, variable: null, missingAny: null },
      { because: 'missing y', kind: 'missing', rows: 1, variable: 'y', missingAny: 1 },
      { because: 'missing x', kind: 'missing', rows: 1, variable: 'x', missingAny: 2 },
      { because: 'missing speed_log', kind: 'missing', rows: 0, variable: 'speed_log', missingAny: 2 },
      { because: 'undefined speed_log', kind: 'undefined', rows: 2, variable: 'speed_log', missingAny: 2 },
    ]);
    // A missing status is no reason to leave row 5 out.
    expect([...sample!.rows]).toEqual([5, 8]);
    expect([...sample!.lines]).toEqual([7, 10]);
    expect(valuesOf(sample!.columns.get('y'))).toEqual([6, 9]);
    expect(valuesOf(sample!.columns.get('speed_log'))).toEqual([Math.log(6), Math.log(9)]);
    expect(problems).toEqual([
      {
        code: 'value_not_finite',
        severity: 'warning',
        place: { kind: 'cell', file: 'data.csv', row: 3, variable: 'speed_log' },
        message: '"speed_log", which is log(x), has no finite value in 2 rows, of which this is the first.',
        hint: 'A logarithm of 0 or less, a root of a negative number, a division by 0 and an overflow have none.',
      },
    ]);
  });

  test('what is undefined through an earlier derived variable is warned of once, at its source', () => {
    const { sample, problems } = prepare([numbers('y', [1, 2, 3]), numbers('x', [0, 1, 2])], {
      derive: { inverse: '1 / x', twice: 'inverse * 2' },
      response: 'y',
      candidates: [{ terms: ['twice'] }],
    });
    expect(sample!.losses).toEqual([
      { because: 'undefined twice', kind: 'undefined', rows: 1, variable: 'twice', missingAny: 1 },
    ]);
    expect(problems.map((problem) => [problem.code, problem.place])).toEqual([
      ['value_not_finite', { kind: 'cell', file: 'data.csv', row: 2, variable: 'inverse' }],
    ]);
  });

  test('rows that are left out with a reason are not warned of', () => {
    const { problems } = prepare([numbers('y', [1, 2, 3]), numbers('x', [0, 1, 2])], {
      derive: { inverse: '1 / x' },
      leaveOut: [['x == 0', 'Engine off']],
      response: 'y',
      candidates: [{ terms: ['inverse'] }],
    });
    expect(problems).toEqual([]);
  });

  test('a condition that is undefined leaves no row out, and that is said', () => {
    const { sample, problems } = prepare([numbers('y', [1, 2, 3]), numbers('x', [0, 1, 2])], {
      leaveOut: [['1 / x > 0.7', 'Slow']],
      response: 'y',
      candidates: [{ terms: ['x'] }],
    });
    expect([...sample!.rows]).toEqual([0, 2]);
    expect(problems).toHaveLength(1);
    expect(problems[0]).toMatchObject({
      code: 'value_not_finite',
      severity: 'warning',
      place: { kind: 'cell', row: 2 },
    });
    expect(problems[0]!.message).toContain('leave_out[0].where, "1 / x > 0.7", has no finite value in 1 row');
  });

  test('a missing base variable counts through the derived one alone, a missing time by itself', () => {
    const columns = [
      numbers('y', [1, 2, 3, 4]),
      numbers('x', [null, 1, 2, 3]),
      numbers('when', [4, 3, null, 1], 'date'),
    ];
    const { sample } = prepare(columns, {
      derive: { square: 'x ^ 2' },
      response: 'y',
      time: 'when',
      candidates: [{ terms: ['square'] }],
    });
    expect(sample!.losses.map((loss) => [loss.because, loss.rows])).toEqual([
      ['missing when', 1],
      ['missing square, as x has no value', 1],
    ]);
    expect([...sample!.columns.keys()].sort()).toEqual(['square', 'when', 'x', 'y']);
    expect([...sample!.timeOrder!]).toEqual([1, 0]);
  });

  test('a derived variable is missing for what is empty under it', () => {
    const columns = [
      numbers('y', [1, 2, 3, 4, 5, 6]),
      numbers('kwh', [null, null, 3, 4, 5, 6]),
      numbers('days', [30, 30, null, 28, 31, 30]),
      numbers('bill', [null, 2, 3, 4, null, 6]),
    ];
    const { sample } = prepare(columns, {
      derive: { per_day: 'kwh / days', cost: 'bill * 2', at_odds: 'per_day * 0' },
      response: 'y',
      candidates: [{ terms: ['per_day', 'cost', 'at_odds'] }],
    });
    expect(sample!.losses.map((loss) => [loss.because, loss.rows, loss.missingAny])).toEqual([
      ['missing per_day, as kwh has no value in 2 and days in 1 of these', 3, 3],
      ['missing cost, as bill has no value', 1, 2],
      ['missing at_odds', 0, 3],
    ]);
  });

  test('with all rows in use the columns are shared, not copied', () => {
    const whole = numbers('y', [1, 2, 3]);
    const { sample } = prepare([whole, numbers('x', [3, 1, 2])], {
      response: 'y',
      candidates: [{ terms: ['x'] }],
    });
    expect(sample!.losses).toEqual([]);
    expect(sample!.columns.get('y')).toBe(whole);
    expect(sample!.timeOrder).toBeNull();
    expect(sample!.ids).toBeNull();
    expect([...sample!.rows]).toEqual([0, 1, 2]);
  });

  test('a category keeps its levels although a level lost its rows, and identities go along', () => {
    const { sample } = prepare(
      [
        texts('id', ['a', 'b', 'c', 'd']),
        numbers('y', [1, null, 3, 4]),
        category('vessel', ['Tern', 'Holm', 'Tern', 'Skerry']),
      ],
      { response: 'y', rowId: 'id', candidates: [{ terms: ['vessel'] }] },
    );
    expect(sample!.ids).toEqual(['a', 'c', 'd']);
    expect(sample!.columns.get('vessel')).toMatchObject({ levels: ['Holm', 'Skerry', 'Tern'] });
    expect(valuesOf(sample!.columns.get('vessel'))).toEqual(['Tern', 'Tern', 'Skerry']);
  });

  test.each<[Column, readonly string[]]>([
    [numbers('id', [10, null, 2.5]), ['10', '', '2.5']],
    [numbers('id', [0, 0.5, null], 'date'), ['1970-01-01', '1970-01-01T12:00', '']],
    [category('id', ['p', null, 'q']), ['p', '', 'q']],
    [{ ...flags('id', [true, false, null]), flagTexts: ['no', 'yes'] }, ['yes', 'no', '']],
    [flags('id', [true, false, null]), ['1', '0', '']],
    [texts('id', ['u', null, '']), ['u', '', '']],
  ])('identities of any type are texts', (id, expected) => {
    const { sample } = prepare([id, numbers('y', [1, 2, 3])], {
      response: 'y',
      rowId: 'id',
      candidates: [{ terms: [] }],
    });
    expect(sample!.ids).toEqual(expected);
  });
});

describe('time order', () => {
  test.each<[Column, readonly number[]]>([
    [numbers('t', [3, 1, 2, 1], 'date'), [1, 3, 2, 0]],
    [numbers('t', [1, 1, 2, 3]), [0, 1, 2, 3]],
    [category('t', ['b', 'a', 'b', 'a'], ['b', 'a']), [0, 2, 1, 3]],
    [texts('t', ['b', 'a', 'b', 'a']), [1, 3, 0, 2]],
  ])('is stable', (t, expected) => {
    const { sample } = prepare([t, numbers('y', [1, 2, 3, 4])], {
      response: 'y',
      time: 't',
      candidates: [{ terms: [] }],
    });
    expect([...sample!.timeOrder!]).toEqual(expected);
  });
});

describe('weights', () => {
  const y = numbers('y', [1, 2, 3, null]);

  test('of zero take the row out; a missing one too', () => {
    const { sample, problems } = prepare([y, numbers('w', [1, 0, null, 0])], {
      response: 'y',
      weights: 'w',
      candidates: [{ terms: [] }],
    });
    expect(sample!.losses).toEqual([
      { because: 'weight is zero', kind: 'left_out', rows: 2, variable: 'w', missingAny: null },
      { because: 'missing w', kind: 'missing', rows: 1, variable: 'w', missingAny: 1 },
    ]);
    expect([...sample!.rows]).toEqual([0]);
    expect(problems).toEqual([]);
  });

  test('below zero are an error with its lines, unless the row is out already', () => {
    const w = numbers('w', [-1, -2, 3, -4]);
    const written: Written = { response: 'y', weights: 'w', candidates: [{ terms: [] }] };
    const { sample, problems } = prepare([y, w], { ...written, leaveOut: [['w == -2', 'Known']] });
    expect(sample).toBeNull();
    expect(problems).toMatchObject([
      {
        code: 'weight_negative',
        severity: 'error',
        place: { kind: 'cell', file: 'data.csv', row: 2, variable: 'w' },
        message: 'The weight "w" is negative in 2 rows: lines 2 and 5.',
      },
    ]);
    expect(prepare([y, w], { ...written, leaveOut: [['w < 0', 'Known']] }).sample!.rowCount).toBe(1);
  });

  test('all zero are an error', () => {
    const { sample, problems } = prepare([y, numbers('w', [0, 0, 0, 0])], {
      response: 'y',
      weights: 'w',
      candidates: [{ terms: [] }],
    });
    expect(sample).toBeNull();
    expect(problems).toMatchObject([{ code: 'weight_negative', severity: 'error' }]);
    expect(problems[0]!.message).toContain('No weight "w" is above 0');
  });
});

describe('nothing to fit', () => {
  test('a needed column without any value is named, and not what rests on it', () => {
    const columns = [numbers('y', [1, 2]), numbers('x', [null, null]), numbers('z', [null, null])];
    const { sample, problems } = prepare(columns, {
      derive: { square: 'x ^ 2', cube: 'z ^ 3' },
      response: 'y',
      candidates: [{ terms: ['x', 'square', 'cube'] }],
    });
    expect(sample).toBeNull();
    expect(problems.map((problem) => [problem.code, problem.severity, problem.message])).toEqual([
      ['column_all_missing', 'error', '"x" has no value in any of the 2 rows read.'],
      ['column_all_missing', 'error', '"cube" has no value in any of the 2 rows read.'],
    ]);
  });

  test('the same where only the rows left out have values; a column that is not needed may be empty', () => {
    const columns = [
      numbers('y', [1, 2, 3]),
      category('vessel', [null, null, 'Tern']),
      texts('note', [null, null, null]),
    ];
    const written: Written = { response: 'y', candidates: [{ terms: ['vessel'] }] };
    const { sample, problems } = prepare(columns, { ...written, leaveOut: [['y == 3', 'Odd']] });
    expect(sample).toBeNull();
    expect(problems.map((problem) => problem.message)).toEqual([
      '"vessel" has no value in any of the 2 rows that are not left out.',
    ]);
    expect(prepare(columns, written).sample!.rowCount).toBe(1);
  });

  test('no row left is an error that lists the losses', () => {
    const columns = [numbers('y', [1, 2, 3, null]), numbers('x', [null, null, 5, 4])];
    const { sample, problems } = prepare(columns, {
      leaveOut: [['y == 3', 'Odd']],
      response: 'y',
      candidates: [{ terms: ['x'] }],
    });
    expect(sample).toBeNull();
    expect(problems).toMatchObject([
      {
        code: 'nothing_left',
        severity: 'error',
        place: { kind: 'file', file: 'data.csv' },
        message:
          'No row is left to fit. 4 rows were read, and all are lost: 1 for "Odd", 1 for "missing y", 2 for "missing x".',
      },
    ]);
  });

  test('the same where everything is left out, or nothing was read', () => {
    const everything = prepare([numbers('y', [1])], {
      leaveOut: [['true', 'All']],
      response: 'y',
      candidates: [{ terms: [] }],
    });
    expect(everything.problems.map((problem) => problem.message)).toEqual([
      'No row is left to fit. 1 row was read, and all are lost: 1 for "All".',
    ]);
    const nothing = prepare([numbers('y', [])], { response: 'y', candidates: [{ terms: [] }] });
    expect(nothing.problems.map((problem) => problem.message)).toEqual([
      'No row is left to fit. 0 rows were read.',
    ]);
  });
});

describe('response scales', () => {
  const y = numbers('y', [2, 0, -1, 3, -4, -5, -6, -7, -8]);
  test.each<[Scale, string | null]>([
    [{ kind: 'natural' }, null],
    [
      { kind: 'log' },
      'The log scale needs values above 0, and "y" is not so in 7 rows: lines 3, 4, 6, 7, 8 and 2 more.',
    ],
    [
      { kind: 'box_cox', lambda: 0.5 },
      'The Box–Cox scale needs values above 0, and "y" is not so in 7 rows: lines 3, 4, 6, 7, 8 and 2 more.',
    ],
    [
      { kind: 'reciprocal' },
      'The reciprocal scale needs values above 0, and "y" is not so in 7 rows: lines 3, 4, 6, 7, 8 and 2 more.',
    ],
    [
      { kind: 'sqrt' },
      'The square-root scale needs values of 0 or above, and "y" is not so in 6 rows: lines 4, 6, 7, 8, 9 and 1 more.',
    ],
  ])('%j', (scale, message) => {
    const written: Written = { response: 'y', candidates: [{ terms: [] }, { terms: [], scale }] };
    const { sample, problems } = prepare([y], written);
    expect(sample === null).toBe(message !== null);
    expect(problems.map((problem) => problem.message)).toEqual(message === null ? [] : [message]);
    if (message !== null) {
      expect(problems[0]).toMatchObject({
        code: 'scale_undefined',
        severity: 'error',
        place: { kind: 'cell', file: 'data.csv', variable: 'y' },
      });
    }
    // Rows that are not fitted do not count.
    const positive = prepare([y], { ...written, leaveOut: [['y <= 0', 'Not positive']] });
    expect(positive.problems).toEqual([]);
    expect(positive.sample!.rowCount).toBe(2);
  });

  test('each scale is told of once', () => {
    const scales: Scale[] = [{ kind: 'log' }, { kind: 'log' }, { kind: 'sqrt' }];
    const { problems } = prepare([y], {
      response: 'y',
      candidates: scales.map((scale) => ({ terms: [], scale })),
    });
    expect(problems.map((problem) => problem.code)).toEqual(['scale_undefined', 'scale_undefined']);
  });
});

describe('which variables', () => {
  const columns = 'abcdefgw'.split('').map((name) => numbers(name, [1, 2]));
  const study = makeStudy(columns, {
    derive: { ab: 'a * b', abc: 'ab + c', lonely: 'g' },
    leaveOut: [['g > 100', 'Never']],
    response: 'f',
    weights: 'w',
    candidates: [
      { terms: [{ kind: 'polynomial', variable: 'e', degree: 2 }] },
      {
        terms: [
          {
            kind: 'interaction',
            of: [
              { kind: 'variable', variable: 'abc' },
              { kind: 'power', variable: 'd', to: 2 },
            ],
          },
        ],
      },
    ],
  });

  test('a row must have, and the sample carries', () => {
    expect(neededVariables(study)).toEqual(['d', 'e', 'f', 'w', 'abc']);
    expect(sampleVariables(study, neededVariables(study))).toEqual([
      'a',
      'b',
      'c',
      'd',
      'e',
      'f',
      'w',
      'abc',
    ]);
    expect([...baseVariables('abc', study.derive)]).toEqual(['a', 'b', 'c']);
    expect([...baseVariables('a', study.derive)]).toEqual(['a']);
  });

  test('derived variables of a few rows to be predicted are computed by the same function', () => {
    const rows = byName([numbers('a', [2, null, 0]), numbers('b', [3, 1, 1]), numbers('c', [1, 1, 1])]);
    const { columns: all, undefinedRows } = evaluateDerived(
      makeStudy(columns, {
        derive: { ab: 'a * b', share: 'c / a', big: 'ab > 5' },
        response: 'f',
        candidates: [],
      }).derive,
      rows,
      3,
    );
    expect([...all.keys()]).toEqual(['a', 'b', 'c', 'ab', 'share', 'big']);
    expect(valuesOf(all.get('ab'))).toEqual([6, Number.NaN, 0]);
    expect(valuesOf(all.get('share'))).toEqual([0.5, Number.NaN, Number.NaN]);
    expect(all.get('big')).toMatchObject({ kind: 'flag', name: 'big' });
    expect(valuesOf(all.get('big'))).toEqual([1, Number.NaN, 0]);
    expect([...undefinedRows.keys()]).toEqual(['share']);
  });
});

describe('losses add up', () => {
  const cell = fc.option(fc.integer({ min: -2, max: 4 }), { freq: 4 });
  const anyRow = fc.record({
    y: cell,
    x: cell,
    z: cell,
    w: fc.option(fc.constantFrom(0, 1, 2), { freq: 4 }),
    status: fc.option(fc.constantFrom('run', 'trial')),
    bad: fc.boolean(),
  });

  test('to the rows read, one reason each, whatever the data', () => {
    let fitted = 0;
    fc.assert(
      fc.property(fc.array(anyRow, { minLength: 1, maxLength: 40 }), (rows) => {
        const columns = [
          numbers(
            'y',
            rows.map((row) => row.y),
          ),
          numbers(
            'x',
            rows.map((row) => row.x),
          ),
          numbers(
            'z',
            rows.map((row) => row.z),
          ),
          numbers(
            'w',
            rows.map((row) => row.w),
          ),
          category(
            'status',
            rows.map((row) => row.status),
            ['run', 'trial'],
          ),
        ];
        const badRows = rows.flatMap((row, index) => (row.bad ? [index] : []));
        const written: Written = {
          derive: { root: 'sqrt(x)', ratio: 'z / root' },
          leaveOut: [
            ['status == "trial"', 'Trials'],
            ['y > 3 and not is_missing(z)', 'High'],
          ],
          response: 'y',
          weights: 'w',
          candidates: [{ terms: ['ratio', 'z'] }],
        };
        const { sample, problems } = prepare(columns, written, badRows);
        if (sample === null) {
          expect(problems.some((problem) => problem.severity === 'error')).toBe(true);
          return;
        }
        fitted++;
        // What a reader would count by hand, row by row.
        const expected = rows.flatMap((row, index) => {
          const high = row.y !== null && row.y > 3 && row.z !== null;
          const out = row.bad || row.status === 'trial' || high || row.w === 0;
          const whole = row.y !== null && row.x !== null && row.x > 0 && row.z !== null && row.w !== null;
          return out || !whole ? [] : [index];
        });
        expect([...sample.rows]).toEqual(expected);
        const lost = sample.losses.reduce((sum, loss) => sum + loss.rows, 0);
        expect(lost).toBe(rows.length - sample.rowCount);
        for (const loss of sample.losses) {
          if (loss.missingAny !== null) expect(loss.missingAny).toBeGreaterThanOrEqual(loss.rows);
        }
        for (const column of sample.columns.values()) {
          for (let row = 0; row < sample.rowCount; row++) expect(isMissing(column, row)).toBe(false);
        }
      }),
      { numRuns: 300 },
    );
    expect(fitted).toBeGreaterThan(50);
  });
});

test('lines are listed up to five', () => {
  expect(lineList([4])).toBe('line 4');
  expect(lineList([4, 9, 12])).toBe('lines 4, 9 and 12');
  expect(lineList([1, 2, 3, 4, 5])).toBe('lines 1, 2, 3, 4 and 5');
  expect(lineList([1, 2, 3, 4, 5, 6])).toBe('lines 1, 2, 3, 4, 5 and 1 more');
});
