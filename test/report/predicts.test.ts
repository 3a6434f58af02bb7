import { expect, test } from 'vitest';
import { predictsView } from '../../src/report/view/predicts.ts';
import { lexiconOf } from '../../src/report/words/lexicon.ts';
import { sampleRecord } from './sample-record.ts';

test('a flag is shown by its declared values, a derived one by yes and no', () => {
  const record = sampleRecord();
  const [first] = record.predictions;
  const values = [
    { variable: 'urgency', value: true },
    { variable: 'late', value: false },
  ];
  const urgency = {
    ...record.data.variables[0]!,
    name: 'urgency',
    type: 'flag' as const,
    levels: [
      { level: 'planned', rows: 3 },
      { level: 'urgent', rows: 2 },
    ],
  };
  const flagged = {
    ...record,
    data: { ...record.data, variables: [...record.data.variables, urgency] },
    predictions: [{ ...first!, values }],
  };
  expect(predictsView(flagged, lexiconOf(flagged))!.rows[0]!.values).toBe(
    'urgency\u00a0urgent, late\u00a0no',
  );
});
