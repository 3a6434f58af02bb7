import {
  type Chosen,
  cooksDistance,
  covarianceRatio,
  fittedShift,
  rowName,
  rowNameFirst,
} from '../chosen.ts';
import { type Diagnostic, type Figure, notPossible } from '../diagnostic.ts';
import type { SecondPass } from '../second-pass.ts';

/** The largest Cook’s distance. */
export const influence: Diagnostic = {
  name: 'influence',
  topic: 'influence',
  question: 'Does one row carry the result?',
  statisticName: 'largest Cook’s distance',
  source: 'Cook 1977; Belsley, Kuh & Welsch 1980',
  find(chosen, second) {
    const full: number[] = [];
    let row = -1;
    let largest = -1;
    for (let i = 0; i < chosen.sample.rowCount; i++) {
      const d = cooksDistance(chosen, i);
      if (d === null) {
        if (chosen.s !== null) full.push(i);
      } else if (d > largest) {
        largest = d;
        row = i;
      }
    }
    if (row < 0)
      return notPossible(
        chosen.s === null
          ? 'The model fits these rows exactly, so none of them pulls it from the others.'
          : 'Every row is fitted by a coefficient of its own, so influence cannot be judged.',
      );
    const name = rowName(chosen.sample, row);
    const alone =
      full.length === 0
        ? ''
        : ` ${full
            .slice(0, 5)
            .map((i, k) => (k === 0 ? rowNameFirst : rowName)(chosen.sample, i))
            .join(
              ', ',
            )}${full.length > 5 ? ` and ${full.length - 5} more` : ''}: fitted by a coefficient of its own (leverage 1), so nothing checks it.`;
    const concern = full.length > 0 || largest >= 1 ? 2 : largest >= 0.5 ? 1 : 0;
    return {
      statistic: largest,
      df: [],
      p_value: null,
      mark: 'worth a look above 0.5, a result that hangs on one row above 1 (common practice)',
      verdict:
        (largest >= 0.5
          ? `${rowNameFirst(chosen.sample, row)} moves the coefficients noticeably: without it some of them would be clearly different.`
          : `No single row moves the coefficients much; ${name} moves them most.`) + alone,
      concern,
      advice:
        concern === 0
          ? null
          : 'Check these rows at their source, and say in the study what the result is without them.',
      figures: second === null ? [] : counts(chosen, second),
    };
  },
};

/** How many rows lie beyond the customary marks of the other measures. */
function counts(chosen: Chosen, { shifts }: SecondPass): Figure[] {
  const n = chosen.sample.rowCount;
  const p = chosen.fit.columns.length;
  let fitted = 0;
  let covariance = 0;
  for (let i = 0; i < n; i++) {
    if (Math.abs(fittedShift(chosen, i) ?? 0) > 2 * Math.sqrt(p / n)) fitted++;
    if (Math.abs((covarianceRatio(chosen, i) ?? 1) - 1) > (3 * p) / n) covariance++;
  }
  let at = 0;
  for (let j = 1; j < p; j++) if (Math.abs(shifts.largest[j]!) > Math.abs(shifts.largest[at]!)) at = j;
  const row = shifts.rows[at]!;
  const name = chosen.columns[chosen.fit.columns[at]!]!.name;
  return [
    { name: 'rows whose DFFITS is beyond 2√(p/n)', value: fitted },
    { name: 'rows with a DFBETAS beyond 2/√n', value: shifts.rowsBeyond },
    { name: 'rows whose COVRATIO is beyond 1 ± 3p/n', value: covariance },
    ...(row < 0
      ? []
      : [
          {
            name: `largest DFBETAS, of ${name} at ${rowName(chosen.sample, row)}`,
            value: shifts.largest[at]!,
          },
        ]),
  ];
}
