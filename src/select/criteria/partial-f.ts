import type { Criterion } from '../criterion.ts';

/** Listed for its words; the choice by pairs is made in choose-by-partial-f.ts. */
export const partialF: Criterion = {
  name: 'partial_f',
  title: 'partial F',
  better: 'lower',
  acrossScales: false,
  description:
    'F tests between candidates whose columns nest, ((RSS of the smaller − RSS of the larger)/(columns added))/(s² of the larger): the smallest candidate that none containing it improves on at the declared significance.',
  source: 'common practice, no single source',
  value: () => null,
  whyUndefined: () => 'partial F compares pairs of candidates and gives none a figure of its own',
};
