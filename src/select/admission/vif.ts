import type { AdmissionRule } from '../admission-rule.ts';
import { generalisedVif } from '../terms.ts';
import { beside, limitText, listedUpTo } from '../words.ts';

/**
 * Of a term of several columns the generalised factor is taken to the power 1/columns, which is the square of
 * Fox & Monette's (1992) comparable figure GVIF^(1/(2 · columns)) and equals the VIF for one column: the
 * columns of a category or a polynomial are collinear among themselves by construction, which harms nothing.
 */
export const vif: AdmissionRule = {
  name: 'vif',
  sentences: ({ vif: limit }) =>
    limit === null
      ? []
      : [
          `The VIF of every term must be at most ${limitText(limit.atMost)}; of a term with several columns, the generalised VIF to the power 1/columns.`,
        ],
  refusals: ({ vif: limit }, index, { fits }) => {
    if (limit === null) return [];
    const fit = fits[index]!;
    const above = fit.candidate.terms
      .map((term) => {
        const factor = generalisedVif(fit, term);
        return { name: term.name, value: factor === null ? 1 : factor.perColumn ** 2 };
      })
      .filter(({ value }) => value > limit.atMost)
      .sort((a, b) => b.value - a.value)
      .map(({ name, value }) => ({ name, value: beside(value, limit.atMost) }));
    if (above.length === 0) return [];
    const figures = above.map(({ name, value }, k) =>
      k === 0 ? `${name} is ${value}` : `of ${name} ${value}`,
    );
    return [`VIF of ${listedUpTo(figures, 3)}, above ${limitText(limit.atMost)}.`];
  },
};
