import fc from 'fast-check';
import papaparse from 'papaparse';
import { describe, expect, test } from 'vitest';
import {
  candidatesTable,
  coefficientsTable,
  predictionsTable,
  type ResidualColumns,
  residualsTable,
} from '../../src/record/tables.ts';
import { smallRecord } from './small-record.ts';

function cells(text: string): string[][] {
  const { data, errors } = papaparse.parse<string[]>(text.replace(/\n$/, ''), { delimiter: ',' });
  expect(errors).toEqual([]);
  return data;
}

function residuals(rows: readonly (readonly [id: string, value: number])[]): ResidualColumns {
  const values = Float64Array.from(rows, ([, value]) => value);
  return {
    row: Uint32Array.from(rows, (_, index) => index + 2),
    id: rows.map(([id]) => id),
    observed: values,
    fitted: values,
    residual: values,
    standardised_residual: values,
    leverage: values,
    cooks_distance: values,
  };
}

describe('tables', () => {
  test('candidates in the order of the ranking, the unranked last', () => {
    const record = smallRecord();
    const first = record.candidates[0];
    if (first === undefined) throw new Error('no candidate');
    record.candidates = [
      { ...first, name: 'Unranked', admitted: false, refused_because: ['A rule.', 'Another.'] },
      { ...first, name: 'Second', terms: ['x', 'z'] },
      first,
    ];
    record.selection.ranking.push({ rank: 2, candidate: 'Second', value: 11, difference: 2 });
    const [header, ...rows] = cells(candidatesTable(record));
    const column = (name: string) => rows.map((row) => row[header?.indexOf(name) ?? -1]);
    expect(column('candidate')).toEqual(['Straight', 'Second', 'Unranked']);
    expect(column('rank')).toEqual(['1', '2', '']);
    expect(column('chosen')).toEqual(['true', 'false', 'false']);
    expect(column('difference')).toEqual(['0', '2', '']);
    expect(column('terms')).toEqual(['x', 'x; z', 'x']);
    expect(column('refused_because')).toEqual(['', '', 'A rule. Another.']);
    expect(column('aicc')).toEqual(['', '', '']);
    expect(column('overall_f_p_value')).toEqual(['0.015', '0.015', '0.015']);
  });

  test('coefficients of every candidate', () => {
    expect(coefficientsTable(smallRecord())).toBe(
      [
        'candidate,chosen,term,coefficient,estimate,standard_error,t,p_value,lower,upper,vif',
        'Straight,true,intercept,intercept,1,0.25,4,0.015,0,2,',
        'Straight,true,x,x,2,0.25,8,0.015,1,3,',
        '',
      ].join('\n'),
    );
  });

  test('predictions: texts that look like formulas are neutralised, negative numbers are not touched', () => {
    expect(predictionsTable(smallRecord())).toBe(
      [
        `label,estimate,lower,upper,mean_lower,mean_upper,mean,leverage,outside,x,"'@kind"`,
        `"'=cmd()",-9,-12,-6,-11,-7,,3.5,"x is below its smallest value, 1 t.",-5,"'-5, ""x"""`,
        '',
      ].join('\n'),
    );
  });

  test('no predictions, no candidates: the header alone', () => {
    const record = { ...smallRecord(), predictions: [], candidates: [] };
    expect(cells(predictionsTable(record))).toHaveLength(1);
    expect(cells(coefficientsTable(record))).toHaveLength(1);
    expect(cells(candidatesTable(record))).toHaveLength(1);
  });
});

describe('residualsTable', () => {
  test('any identity and any number come back; what is not finite is an empty cell', () => {
    const row = fc.tuple(
      fc.oneof(
        fc.string(),
        fc.constantFrom('=1+1', '+a', '-b', '@c', '\td', '\re', '=f\n"g"', ' h ', 'é,ü', '\ufeffz'),
      ),
      fc.double(),
    );
    fc.assert(
      fc.property(fc.array(row, { minLength: 1 }), (rows) => {
        const [header, ...found] = cells([...residualsTable(residuals(rows))].join(''));
        expect(header?.slice(0, 3)).toEqual(['row', 'id', 'observed']);
        expect(found).toHaveLength(rows.length);
        found.forEach((cell, index) => {
          const [id, value] = rows[index] as readonly [string, number];
          expect(cell[1]).toBe(/^[=+\-@\t\r]/.test(id) ? `'${id}` : id);
          // CSV has no −0, which is of no consequence here.
          expect(cell[7]).toBe(Number.isFinite(value) ? String(value) : '');
        });
      }),
      { examples: [[[['=1+1', -0]]]] },
    );
  });

  test('all figures finite: the same digits as one by one', () => {
    const numbers = fc.array(fc.double({ noNaN: true, noDefaultInfinity: true }), { minLength: 1 });
    fc.assert(
      fc.property(numbers, (values) => {
        const [, ...found] = cells(
          [...residualsTable(residuals(values.map((value) => ['r', value])))].join(''),
        );
        expect(found.map((row) => row[2])).toEqual(values.map(String));
      }),
    );
  });

  test('blocks join without a seam, without identities where there are none', () => {
    const n = 10_000;
    const zeros = new Float64Array(n);
    const columns = { ...residuals([]), row: Uint32Array.from({ length: n }, (_, i) => i), id: null };
    for (const name of ['observed', 'fitted', 'residual', 'standardised_residual', 'leverage'] as const) {
      Object.assign(columns, { [name]: zeros });
    }
    Object.assign(columns, { cooks_distance: zeros.map((_, i) => (i === 9999 ? Number.NaN : i / 4)) });
    const blocks = [...residualsTable(columns)];
    expect(blocks.length).toBeGreaterThan(2);
    const rows = cells(blocks.join(''));
    expect(rows).toHaveLength(n + 1);
    expect(rows.every((row) => row.length === 7)).toBe(true);
    expect(rows[4097]).toEqual(['4096', '0', '0', '0', '0', '0', '1024']);
    expect(rows[n]?.at(-1)).toBe('');
  });
});
