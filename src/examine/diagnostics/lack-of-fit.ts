import { wholeNumber } from '../../numerals.ts';
import { fUpper } from '../../stats/distributions.ts';
import { concernOf, type Diagnostic, notPossible } from '../diagnostic.ts';
import { repeatedRows } from '../repeated-rows.ts';

/** Times the pure error that lack of fit must be before it matters. */
const SLIGHT = 1.5;

/** Where rows repeat the same values of the model's variables: what the model misses against how such rows differ. */
export const lackOfFit: Diagnostic = {
  name: 'lack_of_fit',
  topic: 'shape',
  question: 'Does the model miss more than rows with the same values differ by?',
  statisticName: 'F of lack of fit against pure error',
  source: 'Fisher 1922; Draper & Smith 1998, 1.5 and 2',
  find(chosen, second) {
    if (second === null) return notPossible('The model fits these rows exactly, so there is no lack of fit.');
    const groups = repeatedRows(chosen);
    if (groups === 'too many')
      return notPossible('The rows are too many to look for those with the same values in reasonable time.');
    // Without repeated rows the question does not arise.
    if (groups === null) return null;
    const { fit, sample, residuals } = chosen;
    const n = sample.rowCount;
    const p = fit.columns.length;
    const df1 = groups.count - p;
    const df2 = n - groups.count;
    if (df1 < 1)
      return notPossible(
        'The model has a coefficient for every different set of values, so it cannot lack fit.',
      );
    // Within a group fitted values are equal: residuals differ as responses do. √w e is given.
    const weightOf = weights(chosen);
    const sums = new Float64Array(groups.count);
    const masses = new Float64Array(groups.count);
    for (let i = 0; i < n; i++) {
      const w = weightOf(i);
      sums[groups.of[i]!]! += residuals[i]! * Math.sqrt(w);
      masses[groups.of[i]!]! += w;
    }
    let lack = 0;
    for (let g = 0; g < groups.count; g++) lack += sums[g]! ** 2 / masses[g]!;
    let pure = 0;
    for (let i = 0; i < n; i++) {
      const g = groups.of[i]!;
      pure += (residuals[i]! - (Math.sqrt(weightOf(i)) * sums[g]!) / masses[g]!) ** 2;
    }
    const statistic = lack / df1 / (pure / df2);
    if (!Number.isFinite(statistic) || pure <= 1e-20 * lack)
      return notPossible(
        'Rows with the same values have the same response, so there is no pure error to compare with.',
      );
    const value = fUpper(statistic, df1, df2);
    const concern = concernOf(value, statistic < SLIGHT);
    return {
      statistic,
      df: [df1, df2],
      p_value: value,
      mark: null,
      verdict:
        concern === 0
          ? `The model misses no more than rows with the same values differ by (${wholeNumber(groups.count)} different sets of values in ${wholeNumber(n)} rows).`
          : `The model misses more than rows with the same values differ by: its shape is wrong somewhere, or rows with the same values are not independent.`,
      concern,
      advice:
        concern === 0
          ? null
          : 'Look at the means of repeated rows against the model, and declare a curve or a category.',
      figures: [
        { name: 'mean square of lack of fit', value: lack / df1 },
        { name: 'mean square of pure error', value: pure / df2 },
      ],
    };
  },
};

function weights({ study, sample }: Parameters<Diagnostic['find']>[0]): (row: number) => number {
  const column = study.weights === null ? undefined : sample.columns.get(study.weights);
  if (column === undefined || column.kind === 'category' || column.kind === 'text') return () => 1;
  return (row) => column.values[row]!;
}
