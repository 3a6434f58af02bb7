import { rowsAt } from '../../engine/rows-at.ts';
import { designRows } from '../../model/design-rows.ts';
import { wholeNumber } from '../../numerals.ts';
import { counted } from '../../select/words.ts';
import { fUpper } from '../../stats/distributions.ts';
import { factorOf, regress, rowsWith } from '../auxiliary.ts';
import type { Chosen } from '../chosen.ts';
import { concernOf, type Diagnostic, type Found, notPossible } from '../diagnostic.ts';

/** Share of the residuals' squares that two sets of coefficients save, below which it hardly matters. */
const SLIGHT = 0.01;

/**
 * At the declared split: F of one set of coefficients for each part against one for all; where a part has too few rows for
 * its own, F of its rows against what the other part's coefficients lead one to expect.
 */
export const sameInBothParts: Diagnostic = {
  name: 'same_in_both_parts',
  topic: 'constancy',
  question: 'Does one set of coefficients hold on both sides of the declared split?',
  statisticName: 'Chow F',
  source: 'Chow 1960',
  find(chosen, second) {
    const split = chosen.study.examination.splitAt;
    if (split === null) return null;
    if (second === null)
      return notPossible('The model fits these rows exactly, so its parts cannot be compared.');
    const where = `${split.variable} ${split.text}`;
    const parts = partsOf(chosen);
    if (parts === null)
      return notPossible(`${split.variable} is missing in some of the rows, so they cannot be split.`);
    const { before, after } = parts;
    if (before.length === 0 || after.length === 0)
      return notPossible(
        `${where} lies outside the data: all ${wholeNumber(chosen.sample.rowCount)} rows are ${before.length === 0 ? 'at or above' : 'below'} it.`,
      );
    return compare(chosen, before, after, where);
  },
};

function partsOf({ study, sample }: Chosen): { before: Int32Array; after: Int32Array } | null {
  const { variable, value } = study.examination.splitAt!;
  const column = sample.columns.get(variable)!;
  if (column.kind === 'category' || column.kind === 'text') return null;
  const all = Int32Array.from(column.values, (_, i) => i);
  const before = all.filter((i) => column.values[i]! < value);
  const after = all.filter((i) => column.values[i]! >= value);
  return before.length + after.length === all.length ? { before, after } : null;
}

function compare(chosen: Chosen, before: Int32Array, after: Int32Array, where: string): Found {
  const { fit, sample } = chosen;
  const n = sample.rowCount;
  const total = fit.degreesOfFreedom;
  const first = leftIn(chosen, before);
  const last = leftIn(chosen, after);
  const { variable } = chosen.study.examination.splitAt!;
  const rows =
    sample.columns.get(variable)!.kind === 'flag'
      ? `${counted(before.length, 'row')} where ${variable} does not hold and ${wholeNumber(after.length)} where it does`
      : `${counted(before.length, 'row')} below ${where} and ${wholeNumber(after.length)} from there on`;
  // A part without degrees of freedom of its own is fitted exactly and adds nothing, which is Chow's second test.
  const rss = first.residualSumOfSquares + last.residualSumOfSquares;
  const df2 = Math.max(0, before.length - first.rank) + Math.max(0, after.length - last.rank);
  const df1 = n - fit.columns.length - df2;
  if (df2 < 1 || df1 < 1)
    return notPossible(`There are too few rows for coefficients of each part: ${rows}.`);
  const statistic = (Math.max(0, total - rss) / df1 / rss) * df2;
  if (!Number.isFinite(statistic) || rss <= 1e-20 * total)
    return notPossible(`Each part is fitted exactly by coefficients of its own: ${rows}.`);
  const p = fUpper(statistic, df1, df2);
  const share = Math.max(0, 1 - rss / total);
  const concern = concernOf(p, share < SLIGHT);
  const small = first.rank === before.length || last.rank === after.length;
  const shorter = small
    ? ` The smaller part has too few rows for coefficients of its own; its rows are held against what the others lead one to expect.`
    : '';
  return {
    statistic,
    df: [df1, df2],
    p_value: p,
    mark: null,
    verdict:
      concern === 0
        ? `One set of coefficients does for both parts: ${rows}.${shorter}`
        : `The coefficients are not the same on both sides: ${rows}. What the model says is a mixture of the two.${shorter}`,
    concern,
    advice:
      concern === 0
        ? null
        : 'Say what changed there and bring it in: a flag, an interaction with it, or only the rows that still apply.',
    figures: [
      { name: 'rows below the split', value: before.length },
      { name: 'rows from the split on', value: after.length },
      { name: 'share of the residuals’ squares that two sets of coefficients save', value: share },
    ],
  };
}

/** What the model's columns leave of the residuals (in units of s) in some of the rows. */
function leftIn(chosen: Chosen, part: Int32Array) {
  const { fit, columns, sample, study, residuals } = chosen;
  const rows = designRows(
    fit.columns.map((column) => columns[column]!),
    sample,
    [],
    study.weights,
  );
  const factor = factorOf(
    rowsWith(
      rowsAt(rows, part, null),
      [],
      [
        (from, to, out, at) => {
          for (let t = from; t < to; t++) out[at + t - from] = residuals[part[t]!]! / chosen.s!;
        },
      ],
    ),
  );
  return regress(
    factor,
    fit.columns.map((_, j) => j),
  );
}
