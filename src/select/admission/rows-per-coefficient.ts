import type { AdmissionRule } from '../admission-rule.ts';
import { beside, counted, limitText } from '../words.ts';

export const rowsPerCoefficient: AdmissionRule = {
  name: 'rows_per_coefficient',
  sentences: ({ rowsPerCoefficient: limit }) =>
    limit === null ? [] : [`There must be at least ${limitText(limit.atLeast)} rows for each coefficient.`],
  refusals: ({ rowsPerCoefficient: limit }, index, { fits }) => {
    if (limit === null) return [];
    const { rowCount: n, columns } = fits[index]!;
    const p = columns.length;
    // Compared as products, so that 30 rows for 3 coefficients are exactly 10.
    if (n >= limit.atLeast * p) return [];
    return [
      `There are ${counted(n, 'row')} for ${counted(p, 'coefficient')}, ${beside(n / p, limit.atLeast)} for each, below ${limitText(limit.atLeast)}.`,
    ];
  },
};
