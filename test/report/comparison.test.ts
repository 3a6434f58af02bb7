import { describe, expect, test } from 'vitest';
import type {
  Comparison,
  ContractChange,
  DeclarationChange,
  NewRows,
} from '../../src/report/comparison-type.ts';
import type { OverviewEntry } from '../../src/report/overview.ts';
import { comparisonView } from '../../src/report/view/comparison.ts';
import {
  attentionLines,
  choiceSentences,
  contractChangeSentence,
  declarationChangeSentence,
  largestChangeSentence,
  newRowsSentences,
  revisedSentence,
  rowsSentences,
  studySentence,
} from '../../src/report/words/comparison.ts';
import { lexiconOf } from '../../src/report/words/lexicon.ts';
import { choiceText } from '../../src/report/words/overview.ts';
import { sampleRecord } from './sample-record.ts';

const record = sampleRecord();
const lexicon = lexiconOf(record);
const unbroken = (text: string) => text.replace(/[\u00a0\u202f]/g, ' ');

const side = {
  title: 'T',
  record_sha256: 'c'.repeat(64),
  study_file: 's.yaml',
  study_sha256: 'a'.repeat(64),
  data_file: 'd.csv',
  data_sha256: 'b'.repeat(64),
  rows_read: 12,
  rows_used: 10,
  first: null,
  last: null,
  chosen: 'A',
};

const contender: NonNullable<Comparison['choice']['earlier']> = {
  name: 'A',
  value: 100,
  coefficient_count: 3,
  found: 'record',
  admitted: true,
  refused_because: [],
  reason: null,
};

const nothing: Comparison = {
  format: 'plumbrule-comparison/1',
  tool: { name: 'plumbrule', version: '0' },
  earlier: side,
  later: { ...side, rows_used: 11 },
  cannot_tell: [],
  rows: null,
  contract: [],
  declaration: { study_changed: false, changes: [] },
  choice: {
    changed: false,
    rank_by: 'aicc',
    rule_changed: false,
    earlier: contender,
    later: contender,
    difference: 0,
    prefer_smaller_within: 2,
  },
  models: [],
  new_rows: null,
  acceptance: [],
};

describe('rows', () => {
  test('counted, with and without the rows kept', () => {
    expect(rowsSentences(nothing).map(unbroken)).toEqual(['10 rows were used before, 11 are used now.']);
    const rows = {
      matched_by: 'row_id' as const,
      kept: 7,
      revised: 2,
      added: 1,
      removed: 1,
      revised_cells: [{ variable: 'fuel', rows: 2 }],
      revisions: [],
      revision_count: 2,
      added_rows: [],
      removed_rows: [],
    };
    expect(rowsSentences({ ...nothing, rows }).map(unbroken)).toEqual([
      'Of the 10 rows used before, 7 are unchanged, 2 revised and 1 gone.',
      '1 row is new; 11 are used now.',
    ]);
    expect(unbroken(rowsSentences({ ...nothing, rows: { ...rows, kept: 0, revised: 9 } })[0]!)).toBe(
      'Of the 10 rows used before, 9 are revised and 1 gone.',
    );
    expect(unbroken(revisedSentence({ ...nothing, rows })!)).toBe('Revised: fuel in 2 rows.');
    expect(revisedSentence(nothing)).toBeNull();
    const cells = (count: number) =>
      Array.from({ length: count }, (_, i) => ({
        id: `R${i}`,
        row: i,
        variable: 'fuel',
        earlier: i,
        later: i + 1,
      }));
    const view = (listed: number, count: number) =>
      comparisonView(
        { ...nothing, rows: { ...rows, revisions: cells(listed), revision_count: count } },
        record,
      ).rows;
    expect([view(2, 2).revisions.length, view(2, 2).revisionsMore]).toEqual([2, null]);
    expect(view(13, 13).revisions).toHaveLength(12);
    expect(unbroken(view(13, 13).revisionsMore!)).toBe(
      '1 more cell was revised; comparison.json lists all of them.',
    );
    expect(unbroken(view(50, 70).revisionsMore!)).toBe(
      '58 more cells were revised; comparison.json lists the first 50.',
    );
  });
});

describe('every kind of change has its sentence', () => {
  const change = (kind: ContractChange['kind'], rest: Partial<ContractChange> = {}): ContractChange => ({
    kind,
    variable: 'v',
    name: 'n',
    likely: null,
    because: null,
    earlier: [1, 2],
    later: [3, 4],
    ...rest,
  });

  test.each<[ContractChange, string]>([
    [change('level_new', { later: [3] }), 'The level “n” of v is new, with 3 rows.'],
    [change('level_gone'), 'The level “n” of v, with 1 row before, has none now.'],
    [
      change('level_gone', { likely: 'm', because: 'rows' }),
      'The level “n” of v, with 1 row before, has none now. It is called “m” now: every row that had “n” and is still there has that.',
    ],
    [
      change('level_gone', { likely: 'm', because: 'spelling' }),
      'The level “n” of v, with 1 row before, has none now. Is it spelt “m” now?',
    ],
    [
      change('level_gone', { likely: 'm', because: 'contract' }),
      'The level “n” of v, with 1 row before, has none now. In its variable most cells that break the contract say “m”: is that its new name? Then declare it.',
    ],
    [
      change('level_undeclared'),
      'Cells of v say “n”, which is no declared level: is it a new one? Then declare it.',
    ],
    [
      change('rescaled', { later: [27, 27, 0, 0.1] }),
      'All 27 revised values of v are 0.1 × what they were: has its unit changed?',
    ],
    [
      change('rescaled', { later: [26, 27, -273.15, 1] }),
      '26 of 27 revised values of v are 273.15 below what they were: has its unit changed?',
    ],
    [
      change('rescaled', { later: [27, 27, 32, 1.8] }),
      'All 27 revised values of v are 1.8 × what they were + 32: has its unit changed?',
    ],
    [change('range'), 'v runs from 3 to 4; before it ran from 1 to 2.'],
    [
      change('middle'),
      'The middle of v has moved: its median is 3, outside 1 to 2, the middle half of its values before.',
    ],
    [
      change('missing', { earlier: [0], later: [0.125] }),
      'v is missing more often: in 12.5 % of the rows read, 0 % before.',
    ],
    [change('bad_values', { variable: null }), '3 cells break the contract, 1 before.'],
    [
      change('rows_lost', { variable: null, earlier: [0.01], later: [0.5] }),
      '50 % of the rows read are not used, 1 % before.',
    ],
    [change('variable_gone', { likely: 'w' }), 'The variable v is no longer declared. Is it w now?'],
    [change('variable_new'), 'The variable v is newly declared.'],
    [
      change('column_gone', { likely: 'w' }),
      'The column “n”, which the study does not use, is gone. Is it “w” now?',
    ],
    [change('column_new'), 'The column “n” is new; the study does not use it.'],
    [
      change('unit', { earlier: 'm', later: 'ft' }),
      'The unit of v is declared as ft, before as m: unless that is another name of the same unit, values of before and now are not to be compared, nor is what comes of them.',
    ],
    [change('type', { earlier: 'text', later: 'number' }), 'v is declared as number, before as text.'],
  ])('$0.kind', (given, sentence) => {
    expect(unbroken(contractChangeSentence(lexicon, given, [given]))).toBe(sentence);
  });

  test('values in another unit whose declaration changed as well', () => {
    const line = change('rescaled', { later: [27, 27, 0, 0.1] });
    const unit = change('unit', { earlier: 'mm', later: 'cm' });
    expect(unbroken(contractChangeSentence(lexicon, line, [unit, line]))).toBe(
      'All 27 revised values of v are 0.1 × what they were, and its declared unit is another.',
    );
  });

  test('values of before are in the unit of before', () => {
    const said = (kind: ContractChange['kind'], earlier: string) =>
      unbroken(contractChangeSentence(lexicon, change(kind), [change('unit', { earlier, later: 'none' })]));
    expect(said('range', 'ft')).toBe('v runs from 3 to 4; before it ran from 1 to 2 ft.');
    expect(said('middle', 'ft')).toContain('its median is 3, outside 1 to 2 ft,');
    expect(said('range', 'none')).toBe('v runs from 3 to 4; before it ran from 1 to 2.');
  });

  const kinds: [DeclarationChange['kind'], string | null, string | null, string][] = [
    ['candidate_added', null, 'a, b', 'New candidate x: a, b.'],
    ['candidate_removed', 'a', null, 'x is no candidate any more (a).'],
    ['candidate_changed', 'a', 'b', 'The candidate x is another: b; before a.'],
    ['derivation', 'a', 'b', 'x is derived by b, before by a.'],
    ['derivation', null, 'b', 'x is newly derived: b.'],
    ['derivation', 'a', null, 'x is no longer derived (it was a).'],
    ['exclusion', null, 'Trials', 'Rows are newly left out because: Trials.'],
    ['exclusion', 'Trials', null, 'Rows are no longer left out because: Trials.'],
    [
      'response_scale',
      'natural',
      'log',
      'The response is fitted on the log scale, before on the natural scale.',
    ],
    ['weights', null, 'days', 'Rows are weighted by days, before by nothing.'],
    ['admission', null, 'VIF at most 10.', 'A new rule of admission: VIF at most 10.'],
    ['admission', 'VIF at most 10.', null, 'A rule of admission is gone: VIF at most 10.'],
    ['setting', '0.95', '0.9', 'x is now 0.9, before 0.95.'],
    ['parameter', 'a', 'b', 'The parameter x is now b, before a.'],
  ];
  test.each(kinds)('%s from %s to %s', (kind, earlier, later, sentence) => {
    expect(declarationChangeSentence({ kind, name: 'x', earlier, later })).toBe(sentence);
  });

  test('the study: the same, another in silence, another with changes', () => {
    const parameter: DeclarationChange = { kind: 'parameter', name: 'f', earlier: 'a', later: 'b' };
    const setting: DeclarationChange = { ...parameter, kind: 'setting' };
    const said = (study_changed: boolean, ...changes: DeclarationChange[]) =>
      studySentence({ ...nothing, declaration: { study_changed, changes } });
    expect(said(false)).toBe('The study file is the same, to the byte.');
    expect(said(true, parameter)).toMatch(/in nothing that a record tells of/);
    expect(said(true, setting)).toBe('The study file is another:');
  });
});

describe('the choice', () => {
  const said = (choice: Partial<Comparison['choice']>) =>
    choiceSentences({ ...nothing, choice: { ...nothing.choice, ...choice } }, record.selection).map(unbroken);
  const other = { ...contender, name: 'B', value: 90 };

  test('the same, another, none', () => {
    expect(said({})).toEqual(['A is chosen again.']);
    expect(said({ earlier: null, later: null })).toEqual(['No candidate is chosen, as before.']);
    expect(said({ later: null })).toEqual(['No candidate is chosen; before, A was.']);
    expect(said({ earlier: null })).toEqual(['A is chosen; before, no candidate was.']);
    expect(said({ changed: true, later: other, difference: 10, rule_changed: true })).toEqual([
      'B is chosen; before, A was.',
      'The rule of the choice is another than before.',
      'On the rows of now A comes out 10.0 worse in AICc.',
    ]);
  });

  test('a name with a comma of its own stands in quotation marks', () => {
    const [earlier, later] = ['Load, heat and kiln', 'Load and heat'].map((name) => ({ ...other, name }));
    expect(said({ changed: true, earlier: earlier!, later: later! })[0]).toBe(
      'Load and heat is chosen; before, “Load, heat and kiln” was.',
    );
    const change = { choice: { changed: true, from: earlier!.name, to: later!.name } };
    const entry = { hasEarlier: true, chosen: later!.name, change } as unknown as OverviewEntry;
    expect(choiceText(entry)).toBe('changed: “Load, heat and kiln” to Load and heat');
  });

  test('within what the rule counts as equal; better, but refused; without a value', () => {
    expect(said({ changed: true, later: other, difference: 1.5 })[1]).toBe(
      'On the rows of now A comes out 1.5 worse in AICc, which the rule counts as equal.',
    );
    const refused = { ...contender, admitted: false, refused_because: ['Its VIF is 12'] };
    expect(said({ changed: true, later: other, difference: -4, earlier: refused })).toEqual([
      'B is chosen; before, A was.',
      'On the rows of now A comes out 4.0 better in AICc.',
      'It is refused now. Its VIF is 12.',
    ]);
    const unknown = { ...contender, value: null, reason: 'It cannot be fitted.' };
    expect(said({ changed: true, later: other, difference: null, earlier: unknown })[1]).toBe(
      'How far apart the two are now cannot be said in AICc. It cannot be fitted.',
    );
  });
});

describe('coefficients', () => {
  const model = (parts: { removed: number; revised: number; added: number; declaration: number }) => ({
    candidate: 'A',
    chosen: 'both' as const,
    rows_before: 10,
    rows_after: 11,
    residual_standard_error: { before: 1, after: 1 },
    note: null,
    coefficients: [
      {
        name: 'cargo',
        unit: 't',
        before: 2,
        before_standard_error: 0.1,
        after: 2.5,
        after_standard_error: 0.1,
        difference: 0.5,
        parts,
        in_standard_errors: 5,
      },
    ],
    largest_change: { name: 'cargo', in_standard_errors: 5 },
  });

  test('which moved most, and by what', () => {
    const said = (removed: number, revised: number, added: number, declaration = 0) =>
      largestChangeSentence(model({ removed, revised, added, declaration }));
    const start =
      'The coefficient that moved most is cargo, from 2.00 to 2.50: 5.0 of its earlier standard errors';
    expect(said(0, 0, 0.5)).toBe(`${start}, all of it by rows added.`);
    expect(said(0.4, 0, 0.1)).toBe(`${start}, most of it by rows removed.`);
    expect(said(0, 0.1, 0.1, 0.3)).toBe(`${start}, most of it by the changed declaration.`);
    expect(said(0.2, 0.2, 0.1)).toBe(`${start}.`);
    expect(
      largestChangeSentence({
        ...model({ removed: 0, revised: 0, added: 0, declaration: 0 }),
        largest_change: null,
      }),
    ).toBeNull();
  });

  test('a large one is pointed out first', () => {
    const lines = (comparison: Partial<Comparison>) =>
      attentionLines(lexicon, { ...nothing, ...comparison }, record.selection);
    expect(lines({})).toEqual([]);
    expect(lines({ models: [model({ removed: 0, revised: 0, added: 0.5, declaration: 0 })] })).toHaveLength(
      1,
    );
    const parameter: DeclarationChange = { kind: 'parameter', name: 'f', earlier: 'a', later: 'b' };
    expect(lines({ declaration: { study_changed: true, changes: [parameter] } })).toEqual([]);
    expect(lines({ cannot_tell: ['Nothing was kept.'] })).toEqual(['Nothing was kept.']);
    // Another unit, which may explain all the rest, before it.
    const unit: ContractChange = {
      kind: 'unit',
      variable: 'v',
      name: null,
      likely: null,
      because: null,
      earlier: 'g',
      later: 'kg',
    };
    const both = lines({
      contract: [unit],
      models: [model({ removed: 0, revised: 0.5, added: 0, declaration: 0 })],
    });
    expect(both.map((line) => line.slice(0, 15))).toEqual(['The unit of v i', 'The coefficient']);
  });
});

describe('new rows', () => {
  type Errors = NonNullable<typeof record.model>['standard_errors'];
  const rows: NewRows = {
    candidate: 'A',
    rows: 12,
    scored: 10,
    not_scored: [{ because: 'v is missing or undefined', rows: 2 }],
    unit: 'L',
    bias: -3,
    root_mean_squared_error: 20,
    interval: 0.9,
    inside: 5,
    share_inside: 0.5,
    share_confidence: 0.95,
    share_lower: 0.187,
    share_upper: 0.813,
    same_surface: { statistic: 9, df1: 2, df2: 20, p_value: 0.0016 },
    predictive: { statistic: 1, df1: 10, df2: 12, p_value: 0.49 },
  };
  const said = (changed: Partial<NewRows>, kind: NonNullable<Errors>['kind'] = 'classical') =>
    newRowsSentences(
      lexicon,
      { ...rows, ...changed },
      {
        ...record.model!,
        standard_errors: { ...record.model!.standard_errors!, kind },
      },
    ).map(unbroken);

  // What Chow's F and a binomial interval assume is in any textbook: independent errors, and for F of one spread.
  test('what the tests take for granted and the declared standard errors do not', () => {
    const caution = (kind: NonNullable<Errors>['kind'], changed: Partial<NewRows> = {}) =>
      said(changed, kind).filter((sentence) => sentence.includes('classical'));
    expect(caution('classical')).toEqual([]);
    for (const kind of ['hac', 'clustered'] as const) {
      expect(caution(kind)).toEqual([
        'Chow’s tests and the interval for that share are the classical ones: they count rows as independent, which the declared standard errors do not.',
      ]);
    }
    expect(caution('hc3')).toEqual([
      'Chow’s tests are the classical ones: they take errors to spread evenly, which the declared standard errors do not.',
    ]);
    expect(caution('hc3', { same_surface: null, predictive: null })).toEqual([]);
  });

  test('errors, share inside, Chow’s tests and what could not be predicted', () => {
    const sentences = said({});
    expect(sentences[0]).toMatch(
      /^In the 10 new rows .* lies 3\.0 L below what A predicted before, on average; the typical error \(root mean square\) is 20\.0 L\.$/,
    );
    expect(sentences[1]).toBe(
      '5 of 10 lie inside the 90 % prediction intervals of before (50 %, 95 % interval for that share 18.7 % to 81.3 %); fewer than the 90 % that ought to.',
    );
    expect(sentences[2]).toBe(
      'The new rows ask for coefficients of their own: one set for earlier and new rows against one for each (Chow’s first test), F = 9.00 on 2 and 20 degrees of freedom, p = 0.0016.',
    );
    expect(sentences[3]).toMatch(/^Taken together they lie as near to the earlier fit/);
    expect(sentences[4]).toBe('2 new rows cannot be predicted: v is missing or undefined.');
  });

  test('as many as ought to be, and more', () => {
    expect(said({ share_lower: 0.8, share_upper: 0.99 })[1]).toMatch(/; 90\s%\sis within that interval\.$/u);
    expect(said({ share_lower: 0.92, share_upper: 1 })[1]).toMatch(/; more than the 90\s% that ought to\.$/u);
  });

  test('what is not defined is not said', () => {
    expect(said({ bias: null, inside: null, same_surface: null, predictive: null })).toHaveLength(1);
    expect(said({ scored: 0 })).toEqual(['2 new rows cannot be predicted: v is missing or undefined.']);
  });
});
