import type { DesignColumn } from '../../model/design.ts';
import { type Diagnostic, notPossible } from '../diagnostic.ts';

/** The largest VIF among the columns, with the condition number beside it. */
export const collinearity: Diagnostic = {
  name: 'collinearity',
  topic: 'collinearity',
  question: 'Can the terms be told apart?',
  statisticName: 'largest variance inflation factor',
  source: 'Marquardt 1970; Belsley, Kuh & Welsch 1980',
  find(chosen) {
    const { fit, columns } = chosen;
    let at = -1;
    for (let j = 0; j < fit.columns.length; j++) {
      if (fit.columns[j] !== 0 && (at < 0 || fit.vif[j]! > fit.vif[at]!)) at = j;
    }
    if (at < 0 || fit.columns.filter((column) => column !== 0).length < 2) {
      return notPossible('There is only one column, so there is nothing to confuse it with.');
    }
    const largest = fit.vif[at]!;
    const name = columns[fit.columns[at]!]!.name;
    const built = fit.columns.some(
      (other) => other !== fit.columns[at] && inflate(columns[other]!, columns[fit.columns[at]!]!),
    );
    const concern = built ? (largest > 1e4 ? 1 : 0) : largest > 10 ? 2 : largest > 5 ? 1 : 0;
    const condition = `condition number ${fit.conditionNumber.toPrecision(3)}`;
    return {
      statistic: largest,
      df: [],
      p_value: null,
      mark: 'worth a look above 5, hard to tell apart above 10 (common practice)',
      verdict: built
        ? `The largest factor is that of ${name}, which shares a variable with other columns and is inflated by construction (${condition}); read the curve or the slopes, not the single coefficient.`
        : concern === 0
          ? `No coefficient’s uncertainty is inflated much by the others; ${name} most (${condition}).`
          : `The column ${name} can largely be predicted from the other columns (${condition}): its coefficient has ${Math.sqrt(largest).toPrecision(2)} times the standard error it would have alone, and may change much when they do.`,
      concern,
      advice:
        concern === 0
          ? null
          : `Predictions inside the data do not suffer; statements about ${name} alone do. Keep one of the measures that move together, or combine them.`,
    };
  },
};

/**
 * Whether two columns inflate each other by construction: powers of one variable, and a product beside its parts or
 * another product of them. Levels of one category alone do not count.
 */
function inflate(one: DesignColumn, other: DesignColumn): boolean {
  const product = one.pieces.length > 1 || other.pieces.length > 1;
  return one.pieces.some((piece) =>
    other.pieces.some(
      (another) => another.variable === piece.variable && (product || another.kind !== 'level'),
    ),
  );
}
