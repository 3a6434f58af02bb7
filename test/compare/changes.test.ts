/** Every kind of change between two records, made on purpose in the cars. */
import { describe, expect, test } from 'vitest';
import { compareRecords } from '../../src/compare/compare.ts';
import type { Problem } from '../../src/problem.ts';
import { CARS, compared, type Row, sideOf } from './sides.ts';

const SOUND = CARS.filter((row) => row.horsepower !== '' && row.economy !== '');
const EARLIER = SOUND.slice(0, 300);
const earlier = await sideOf(EARLIER);

const changed = (change: (row: Row, index: number) => Row) => EARLIER.map(change);
const afresh = (rows: readonly Row[]) => rows.map((row) => ({ ...row, car: `n${row.car}` }));

describe('rows', () => {
  test('kept, revised, added and removed by identity, whatever their order', async () => {
    const later = [
      ...SOUND.slice(300, 320),
      ...changed((row, i) => (i === 7 ? { ...row, weight: '2000', origin: 'Japan' } : row))
        .filter((_, i) => i % 100 !== 50)
        .reverse(),
    ];
    const { rows } = compared(earlier, await sideOf(later));
    expect(rows).toMatchObject({
      matched_by: 'row_id',
      kept: 296,
      revised: 1,
      added: 20,
      removed: 3,
      revision_count: 2,
      revised_cells: [
        { variable: 'weight', rows: 1 },
        { variable: 'origin', rows: 1 },
      ],
      removed_rows: [50, 150, 250].map((i) => EARLIER[i]!.car),
    });
    const [car, line] = [EARLIER[7]!, later.findIndex(({ car: id }) => id === EARLIER[7]!.car) + 2];
    expect(rows!.revisions).toEqual([
      { id: car.car, row: line, variable: 'weight', earlier: Number(car.weight), later: 2000 },
      { id: car.car, row: line, variable: 'origin', earlier: car.origin, later: 'Japan' },
    ]);
    expect(rows!.added_rows).toEqual(SOUND.slice(300, 320).map(({ car: id }) => id));
  });

  test('dates are listed as dates, and no more than 50 cells one by one', async () => {
    const later = changed((row) => ({
      ...row,
      first_sold: '1975-05-01',
      weight: `${Number(row.weight) + 1}`,
    }));
    const { rows } = compared(earlier, await sideOf(later));
    expect(rows!.revisions).toHaveLength(50);
    expect(rows!.revised).toBe(300);
    expect(rows!.revision_count).toBe(
      300 + EARLIER.filter(({ first_sold: sold }) => sold !== '1975-05-01').length,
    );
    expect(rows!.revisions.find(({ variable }) => variable === 'first_sold')!.later).toBe('1975-05-01');
  });

  test('without an identity by all that is in a row, each with one of its like', async () => {
    const data = `  variables:
    first_sold: { type: date }
    economy: { type: number }
    weight: { type: number }
    horsepower: { type: number }
    origin: { type: category }`;
    const plain = (rows: readonly Row[]) => rows.map(({ car: _, ...rest }) => rest);
    const twice = [...EARLIER, EARLIER[4]!, EARLIER[4]!];
    const before = await sideOf(plain(twice), { data });
    const now = await sideOf(
      plain([EARLIER[4]!, ...changed((row, i) => (i === 9 ? { ...row, weight: '1' } : row)), SOUND[300]!]),
      { data },
    );
    const { rows, cannot_tell: cannotTell } = compared(before, now);
    expect(rows).toMatchObject({ matched_by: 'content', kept: 300, revised: null, added: 2, removed: 2 });
    expect(rows!.revisions).toEqual([]);
    expect(cannotTell).toEqual([
      'Rows have no identity in both records, so that they are matched by everything in them: a row with a revised value counts as one removed and one added.',
    ]);
    expect(rows!.added_rows.at(-1)).toBe('line 303');
  });

  test('where rows were not kept it is said what cannot be told', async () => {
    const later = await sideOf(EARLIER, { more: 'report: { keep_sample: false }' });
    expect(later.record.data.sample).toBeNull();
    const { rows, models, new_rows: newRows, cannot_tell: cannotTell, choice } = compared(earlier, later);
    expect([rows, models, newRows]).toEqual([null, [], null]);
    expect(cannotTell[0]).toMatch(/^The rows of the later record were not kept, so that it cannot be told/);
    expect(choice.difference).toBe(0);
    const both = compared({ ...earlier, rows: null }, later);
    expect(both.cannot_tell[0]).toMatch(/^The rows of the earlier and the later record/);
  });
});

describe('a study that estimates from a part of its rows', () => {
  test('is compared by fits to all of them, and that is said', async () => {
    const study = {
      selection: 'split_sample: { share: 0.5 }',
      candidates: `  - { name: All, terms: [weight, horsepower, model_year, origin] }
  - { name: Power, terms: [horsepower] }`,
    };
    const before = await sideOf(SOUND.slice(0, 250), study);
    const now = await sideOf(EARLIER, study);
    const { cannot_tell: cannotTell, models } = compared(before, now);
    expect(cannotTell).toEqual([
      'The earlier record estimates its model from a part of its rows; the coefficients compared here are those of fits to all of them.',
      'The later record estimates its model from a part of its rows; the coefficients compared here are those of fits to all of them.',
    ]);
    const all = new Map(earlier.record.model!.columns.map((column) => [column.name, column.estimate]));
    for (const { name, after } of models[0]!.coefficients) {
      expect(after! / all.get(name)!).toBeCloseTo(1, 10);
    }
  });
});

describe('the contract', () => {
  const kinds = (comparison: ReturnType<typeof compared>) =>
    comparison.contract.map(({ kind, variable, name, likely, because }) => [
      kind,
      variable,
      name,
      likely,
      because,
    ]);

  test('a level that every kept row has under another name', async () => {
    const later = changed((row) => ({ ...row, origin: row.origin === 'Japan' ? 'Nippon' : row.origin! }));
    expect(kinds(compared(earlier, await sideOf(later)))).toEqual([
      ['level_gone', 'origin', 'Japan', 'Nippon', 'rows'],
      ['level_new', 'origin', 'Nippon', null, null],
    ]);
  });

  test('a level spelt almost so, with no row in common; and one that is only gone', async () => {
    const respelt = changed((row) => ({
      ...row,
      origin: row.origin === 'Europe' ? 'zone 3' : row.origin!,
    }));
    const spelt = changed((row) => ({ ...row, origin: row.origin === 'Europe' ? 'Eurpoe' : row.origin! }));
    const gone = EARLIER.filter(({ origin }) => origin !== 'Europe');
    const levels = async (rows: readonly Row[]) =>
      kinds(compared(earlier, await sideOf(afresh(rows)))).filter(([kind]) =>
        String(kind).startsWith('level'),
      );
    expect(await levels(spelt)).toEqual([
      ['level_gone', 'origin', 'Europe', 'Eurpoe', 'spelling'],
      ['level_new', 'origin', 'Eurpoe', null, null],
    ]);
    expect((await levels(respelt))[0]).toEqual(['level_gone', 'origin', 'Europe', null, null]);
    expect(await levels(gone)).toEqual([['level_gone', 'origin', 'Europe', null, null]]);
  });

  /** Rows that break the contract are left out. */
  const declared = (weight: string) => `  row_id: car
  on_bad_value: leave_out_row
  variables:
    car: { type: identifier }
    first_sold: { type: date }
    economy: { type: number }
    weight: ${weight}
    horsepower: { type: number }
    origin: { type: category, levels: [USA, Europe, Japan] }`;

  test('a level in whose place cells break the contract', async () => {
    const data = declared('{ type: number }');
    const later = changed((row) => ({ ...row, origin: row.origin === 'Japan' ? 'Asia' : row.origin! }));
    const found = kinds(compared(await sideOf(EARLIER, { data }), await sideOf(later, { data })));
    expect(found).toEqual([
      ['level_gone', 'origin', 'Japan', 'Asia', 'contract'],
      ['bad_values', null, null, null, null],
      ['rows_lost', null, null, null, null],
    ]);
  });

  test('another text that breaks the contract, behind more cells than are listed one by one', async () => {
    const data = declared('{ type: number, at_least: 0 }');
    const before = changed((row, i) => (i === 290 ? { ...row, origin: 'Mars' } : row));
    const later = before.map((row, i) => ({
      ...row,
      weight: i < 30 ? '-1' : row.weight!,
      origin: i === 280 ? 'Korea' : row.origin!,
    }));
    const found = kinds(compared(await sideOf(before, { data }), await sideOf(later, { data })));
    // What broke it before already is no news.
    expect(found.filter(([kind]) => kind === 'level_undeclared')).toEqual([
      ['level_undeclared', 'origin', 'Korea', null, null],
    ]);
  });

  // The factor is the international pound of 1959 by definition; °F to °C likewise, worked out by hand.
  test.each<[string, (weight: number) => string, number[] | null]>([
    ['kg instead of lb', (w) => (w * 0.45359237).toFixed(1), [300, 300, 0, 0.45359237]],
    ['an offset', (w) => `${w + 459.67}`, [300, 300, 459.67, 1]],
    ['°C instead of °F', (w) => (((w - 32) * 5) / 9).toFixed(2), [300, 300, -160 / 9, 5 / 9]],
    ['values revised here and there', (w) => `${w + ((w * 7919) % 101) - 50}`, null],
    ['nothing', (w) => `${w}`, null],
  ])('revised values in another unit: %s', async (_, unit, line) => {
    const later = await sideOf(changed((row) => ({ ...row, weight: unit(Number(row.weight)) })));
    const found = compared(earlier, later).contract.find(({ kind }) => kind === 'rescaled');
    if (line === null) expect(found).toBeUndefined();
    else {
      expect(found!.variable).toBe('weight');
      (found!.later as number[]).forEach((figure, k) => {
        expect(Math.abs(figure - line[k]!)).toBeLessThan(k === 2 ? 0.1 : 1e-3);
      });
    }
  });

  test('a range that is wider, a middle that has moved, more missing values', async () => {
    const later = changed((row, i) => ({
      ...row,
      weight: i % 3 === 0 ? row.weight! : `${Number(row.weight) + 4000}`,
      horsepower: i % 20 === 0 ? '' : row.horsepower!,
    }));
    const { contract } = compared(earlier, await sideOf(later));
    expect(contract.map(({ kind, variable }) => `${kind} ${variable}`)).toEqual([
      'rescaled weight',
      'range weight',
      'middle weight',
      'missing horsepower',
      'rows_lost null',
    ]);
    const sizes = EARLIER.map(({ weight }) => Number(weight));
    expect(contract[1]!.earlier).toEqual([Math.min(...sizes), Math.max(...sizes)]);
    expect(contract[3]).toMatchObject({ earlier: [0], later: [0.05] });
  });

  test('variables and columns under other names, units, types', async () => {
    const data = `  row_id: car
  variables:
    car: { type: identifier }
    first_sold: { type: date }
    economy: { type: number, unit: km/L }
    weights: { column: weight, type: integer, unit: lb }
    horsepower: { type: integer, unit: hp }
    origin: { type: category, baseline: USA }`;
    const candidates = '  - { name: All, terms: [weights, horsepower, model_year, origin] }';
    const noted = (name: string, rows: readonly Row[]) => rows.map((row) => ({ ...row, [name]: 'x' }));
    const before = await sideOf(noted('remark', EARLIER));
    const now = await sideOf(noted('remarks', EARLIER), { data, candidates });
    expect(kinds(compared(before, now))).toEqual([
      ['variable_gone', 'weight', null, 'weights', 'spelling'],
      ['variable_new', 'weights', null, null, null],
      ['unit', 'economy', null, null, null],
      ['type', 'horsepower', null, null, null],
      ['column_gone', null, 'remark', 'remarks', 'spelling'],
      ['column_new', null, 'remarks', null, null],
    ]);
  });
});

describe('the declaration', () => {
  test('every kind of change', async () => {
    const before = await sideOf(EARLIER, {
      candidates: `  - { name: All, terms: [weight, horsepower, model_year, origin] }
  - { name: Old, terms: [weight] }
  - { name: Moved, terms: [weight, origin] }`,
      more: `leave_out:
  - { where: weight > 6000, because: Lorries }`,
    });
    const now = await sideOf(EARLIER, {
      derive: 'year(first_sold) - 1900',
      response: 'response: { variable: economy, scale: log }',
      candidates: `  - { name: All, terms: [weight, horsepower, model_year, origin] }
  - { name: New, scale: natural, intercept: false, terms: [weight] }
  - { name: Moved, terms: [weight, horsepower] }`,
      more: `weights: weight
inference: { confidence: 0.9 }
leave_out:
  - { where: horsepower > 500, because: Dragsters }`,
    });
    const { declaration, contract } = compared(before, now);
    expect(contract).toEqual([]);
    expect(declaration.study_changed).toBe(true);
    expect(declaration.changes.map(({ kind, name }) => [kind, name])).toEqual([
      ['candidate_changed', 'All'],
      ['candidate_removed', 'Old'],
      ['candidate_changed', 'Moved'],
      ['candidate_added', 'New'],
      ['derivation', 'model_year'],
      ['exclusion', 'Lorries'],
      ['exclusion', 'Dragsters'],
      ['response_scale', null],
      ['weights', null],
      ['setting', 'inference.confidence'],
    ]);
    expect(declaration.changes.find(({ name }) => name === 'New')!.later).toBe(
      'weight; without an intercept',
    );
  });

  test('rules of admission and parameters', async () => {
    const now = await sideOf(EARLIER, { more: 'parameters: { p: 1 }' });
    const { declaration } = compared(earlier, {
      ...now,
      record: {
        ...now.record,
        selection: { ...now.record.selection, admission: ['Every VIF is at most 10.'] },
      },
    });
    expect(declaration.changes.map(({ kind, name, later }) => [kind, name, later])).toEqual([
      ['admission', 'Every VIF is at most 10.', 'Every VIF is at most 10.'],
      ['parameter', 'p', '1'],
    ]);
  });
});

describe('the choice', () => {
  const candidates = `  - { name: Small, terms: [weight] }
  - { name: All, terms: [weight, horsepower, model_year, origin] }`;
  const small = '  - { name: Small, terms: [weight] }';

  test('the earlier winner among the later candidates: the distance that the record has', async () => {
    const before = await sideOf(SOUND, { candidates: small });
    const now = await sideOf(SOUND, { candidates });
    const { choice, models } = compared(before, now);
    const [first, second] = now.record.selection.ranking;
    expect([first!.candidate, second!.candidate]).toEqual(['All', 'Small']);
    expect(choice).toMatchObject({
      changed: true,
      earlier: { name: 'Small', found: 'record', admitted: true },
    });
    expect(choice.difference).toBe(second!.value! - first!.value!);
    expect(models.map(({ candidate, chosen }) => [candidate, chosen])).toEqual([
      ['All', 'later'],
      ['Small', 'earlier'],
    ]);
    expect(new Map(models[1]!.coefficients.map((c) => [c.name, c.before])).get('weight')).toBe(
      before.record.model!.columns[1]!.estimate,
    );
  });

  test.each(['aic', 'aicc', 'bic', 'adjusted_r_squared', 'mallows_cp'])(
    'one that is no candidate any more is fitted again, as a run would have (%s)',
    async (rankBy) => {
      const rank = (record: { record: { candidates: readonly { name: string }[] } }, name: string) =>
        (record.record.candidates.find((each) => each.name === name) as unknown as Record<string, number>)[
          rankBy
        ]!;
      const more = '';
      const swap = async (parts: { candidates: string }) => {
        const side = await sideOf(SOUND, { ...parts, more });
        return {
          ...side,
          record: {
            ...side.record,
            selection: {
              ...side.record.selection,
              rank_by: rankBy as 'aic',
              ranking: side.record.selection.ranking.map((each) => ({
                ...each,
                value: rank(side, each.candidate),
              })),
            },
          },
        };
      };
      const before = await sideOf(EARLIER, { candidates: small });
      const large = '  - { name: All, terms: [weight, horsepower, model_year, origin] }';
      const now = await swap({ candidates: large });
      const both = await swap({ candidates });
      const { choice } = compared(before, now);
      expect(choice.earlier).toMatchObject({
        name: 'Small',
        found: 'refitted',
        admitted: null,
        reason: null,
      });
      expect(choice.earlier!.value).toBeCloseTo(rank(both, 'Small'), 8);
      const sign = rankBy === 'adjusted_r_squared' ? -1 : 1;
      expect(choice.difference).toBeCloseTo(sign * (rank(both, 'Small') - rank(both, 'All')), 8);
    },
  );

  test('one that cannot be fitted says why', async () => {
    const before = await sideOf(EARLIER, { candidates: '  - { name: Power, terms: [horsepower] }' });
    const now = await sideOf(EARLIER, { candidates: small });
    const { choice, models } = compared(before, now);
    expect(choice.earlier).toMatchObject({
      found: 'none',
      value: null,
      reason: 'It cannot be fitted to the later rows: horsepower is not among what was kept.',
    });
    expect(choice.difference).toBeNull();
    expect(models[1]!.note).toMatch(/horsepower is not among what was kept/);
    const unkept = compared(before, { ...now, rows: null });
    expect(unkept.choice.earlier!.reason).toMatch(/no candidate any more, and the later rows were not kept/);
  });

  test('none chosen on either side', async () => {
    const none = await sideOf(EARLIER, {
      more: '',
      candidates: small,
    });
    const refused = {
      ...none,
      record: {
        ...none.record,
        model: null,
        examination: null,
        selection: { ...none.record.selection, chosen: null },
      },
    };
    expect(compared(refused, refused)).toMatchObject({
      choice: { changed: false, earlier: null, later: null, difference: null },
      models: [],
      new_rows: null,
    });
    expect(compared(refused, none).choice).toMatchObject({ changed: true, earlier: null });
    expect(compared(none, refused).choice).toMatchObject({ changed: true, later: null });
  });
});

describe('what cannot be compared', () => {
  const faultsOf = (
    ...sides: Parameters<typeof compareRecords> extends [infer A, infer B, ...unknown[]] ? [A, B] : never
  ) => {
    const problems: Problem[] = [];
    expect(compareRecords(...sides, (problem) => problems.push(problem))).toBeNull();
    return problems.map(({ code, message }) => [code, message]);
  };

  test('records of different responses', async () => {
    const other = await sideOf(EARLIER, {
      response: 'response: weight',
      candidates: '  - { name: All, terms: [horsepower] }',
    });
    expect(faultsOf(earlier, other)).toEqual([
      [
        'records_unlike',
        'The later record explains weight, the earlier one economy: they are of different studies.',
      ],
    ]);
  });

  test('an identity that stands for two rows', () => {
    const ids = [...earlier.rows!.ids!];
    ids[3] = ids[2]!;
    const twice = { ...earlier, rows: { ...earlier.rows!, ids } };
    expect(faultsOf(earlier, twice)).toEqual([
      [
        'row_id_twice',
        `The rows kept with this record have the identity "${ids[2]}" more than once, so that they cannot be matched.`,
      ],
    ]);
  });

  test('a record whose model its rows do not give', () => {
    const { model } = earlier.record;
    const columns = model!.columns.map((column, j) => (j === 1 ? { ...column, estimate: 1 } : column));
    const edited = { ...earlier, record: { ...earlier.record, model: { ...model!, columns } } };
    expect(faultsOf(edited, earlier)[0]![0]).toBe('record_unreadable');
  });
});
