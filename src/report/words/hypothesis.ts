import { count, pPhrase, rounded, roundingFor, significant } from '../numbers.ts';
import type { RecordModel } from '../record-type.ts';
import { listed, stopped } from './lexicon.ts';

type Hypothesis = NonNullable<RecordModel['inference']>['hypotheses'][number];

/** "vessel Tern = 0; F = 89.1 on 1 and 215 degrees of freedom, p = 6.4 × 10⁻¹⁸." */
export function hypothesisEvidence({ equalities, test }: Hypothesis): string {
  const said = equalities.map(({ combination, equals, estimate, standard_error: error }) => {
    const rounding = roundingFor(estimate ?? equals, error);
    const found =
      // Of a single equality the verdict tells the estimate.
      estimate === null || equalities.length === 1
        ? ''
        : ` (estimate ${rounded(estimate, rounding)}${error === null ? '' : `, standard error ${rounded(error, rounding)}`})`;
    return `${combination} = ${equals === 0 ? '0' : rounded(equals, rounding)}${found}`;
  });
  const f =
    test === null || test.statistic === null || test.p_value === null
      ? ''
      : `; F\u00a0=\u00a0${significant(test.statistic, 3)} on ${count(test.df1)} and ${count(test.df2)}\u00a0degrees of freedom, ${pPhrase(test.p_value)}`;
  return stopped(`${listed(said)}${f}`);
}
