import { type Criterion, finiteOrNull } from '../criterion.ts';

export const press: Criterion = {
  name: 'press',
  title: 'PRESS',
  better: 'lower',
  acrossScales: false,
  description:
    'The sum of squared errors of each row predicted from all the others, Σ (e/(1 − h))² with h the leverage.',
  source: 'Allen 1974',
  value: (index, context) => {
    const value = context.press[index] ?? null;
    return value === null ? null : finiteOrNull(value);
  },
  whyUndefined: (index, { fits, pressOmitted }) => {
    if (pressOmitted !== null) return `it was ${pressOmitted}`;
    return fits[index]!.degreesOfFreedom < 1
      ? 'no degrees of freedom are left'
      : 'a row has leverage 1, so it cannot be predicted from the others';
  },
};
