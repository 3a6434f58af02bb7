import { describe, expect, test } from 'vitest';
import { beforeYouRely } from '../../src/examine/before-you-rely.ts';
import type { Finding } from '../../src/examine/diagnostic.ts';
import { DIAGNOSTICS } from '../../src/examine/examine.ts';

const finding = (name: string, concern: 0 | 1 | 2): Finding => ({
  name,
  question: '?',
  statistic_name: '',
  statistic: 1,
  df: [],
  p_value: null,
  mark: null,
  verdict: `${name} ${concern}.`,
  concern,
  advice: concern === 2 ? 'Do something.' : null,
});
const all = (concern: 0 | 1 | 2) => DIAGNOSTICS.map(({ name }) => finding(name, concern));
const inside = [{ label: 'A', outside: [] }];

describe('before you rely on this', () => {
  test('is empty where nothing calls for a word', () => {
    expect(beforeYouRely(all(0), inside)).toEqual([]);
    expect(beforeYouRely([], [])).toEqual([]);
  });

  test('names each thing once, by the finding of most concern, with what to do', () => {
    const list = beforeYouRely([finding('equal_spread', 1), finding('uneven_spread', 2)], inside);
    expect(list).toEqual([
      {
        text: 'uneven_spread 2. Do something.',
        about: 'spread',
        finding: 'uneven_spread',
        concern: 2,
        weight: 0.85,
      },
    ]);
    const topics = beforeYouRely(all(2), inside).map(({ about }) => about);
    expect(new Set(topics).size).toBe(topics.length);
    expect(topics.length).toBe(new Set(DIAGNOSTICS.map(({ topic }) => topic)).size);
  });

  test('is ordered by what matters for the question: collinearity first to explain, last to predict', () => {
    const order = (predictions: typeof inside) =>
      beforeYouRely(all(2), predictions).map(({ about }) => about);
    expect(order([])[0]).toBe('collinearity');
    expect(order([])[1]).toBe('influence');
    expect(order([]).at(-1)).toBe('normality');
    expect(order(inside).at(-1)).toBe('collinearity');
    expect(order(inside).indexOf('spread')).toBeLessThan(order(inside).indexOf('influence'));
    const weights = beforeYouRely([...all(1)], inside).map(({ weight }) => weight);
    expect([...weights].sort((a, b) => b - a)).toEqual(weights);
    expect(weights.every((weight) => weight > 0 && weight < 0.5)).toBe(true);
  });

  test('takes care before worth a look, of things that matter much alike', () => {
    const [first] = beforeYouRely([finding('shape', 1), finding('outlying_rows', 2)], inside);
    expect(first!.about).toBe('outliers');
  });

  test('tells of predictions outside the data first', () => {
    const far = { label: 'B', outside: ['x is above 9, the largest.', 'y is below 1.'] };
    const [first] = beforeYouRely(all(2), [...inside, far]);
    expect(first).toMatchObject({ about: 'outside', finding: null, concern: 2, weight: 1 });
    expect(first!.text).toBe(
      'The prediction for B lies outside the data: x is above 9, the largest and y is below 1.',
    );
    const many = Array.from({ length: 5 }, (_, k) => ({ ...far, label: `B${k}` }));
    expect(beforeYouRely([], [...inside, ...many])[0]!.text).toBe(
      '5 of 6 predictions lie outside the data: B0, B1, B2 and 2 more.',
    );
    expect(beforeYouRely([], many.slice(0, 2))[0]!.text).toBe(
      '2 of 2 predictions lie outside the data: B0 and B1.',
    );
  });
});
