import { named } from '../../select/words.ts';
import { rowName } from '../chosen.ts';
import { type Diagnostic, notPossible } from '../diagnostic.ts';

/** Rows and candidates named in a sentence at most. */
const MOST_TOLD = 3;

/** Whether the declared rule would choose another candidate without one of the most influential rows. */
export const choiceWithoutARow: Diagnostic = {
  name: 'choice_without_a_row',
  topic: 'influence',
  question: 'Would another model be chosen without one row?',
  statisticName: 'rows without which another candidate would be chosen',
  source: 'after Cook 1977; deletion formulas of Belsley, Kuh & Welsch 1980',
  find(chosen, _second, without) {
    if (without === null || without.candidates.length < 2) return null;
    const { rows, choiceOmitted, candidates } = without;
    if (choiceOmitted !== null) return notPossible(choiceOmitted);
    if (rows.length === 0)
      return notPossible('No row can be left out: nothing would be left to judge the model by.');
    const own = candidates.indexOf(chosen.fit.candidate.name);
    const others = rows.filter((row) => row.chosen !== own);
    const told = others
      .slice(0, MOST_TOLD)
      .map(({ row, chosen: instead }) => {
        const name = rowName(chosen.sample, row);
        return instead === null || instead === undefined
          ? `without ${name} no candidate would be admitted`
          : `without ${name} it would be ${named(candidates[instead]!)}`;
      })
      .join('; ');
    const more = others.length > MOST_TOLD ? `; and ${others.length - MOST_TOLD} more rows change it` : '';
    const looked =
      rows.length === 1 ? 'the most influential row' : `any one of the ${rows.length} most influential rows`;
    return {
      statistic: others.length,
      df: [],
      p_value: null,
      mark: 'none (common practice)',
      verdict:
        others.length === 0
          ? `The same candidate would be chosen without ${looked}.`
          : `The choice hangs on single rows: ${told}${more}.`,
      // That the choice hangs on the most influential row, or on many, weighs more than a tie that any row tips.
      concern: others.length === 0 ? 0 : rows[0]!.chosen !== own || others.length * 2 >= rows.length ? 2 : 1,
      advice:
        others.length === 0
          ? null
          : 'Check these rows at their source, and compare what the candidates predict where it matters before settling on one.',
    };
  },
};
