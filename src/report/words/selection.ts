import { count, fixed, type Rounding, value } from '../numbers.ts';
import type { StudyRecord } from '../record-type.ts';
import { counted, stopped } from './lexicon.ts';

interface Criterion {
  readonly name: string;
  readonly better: 'lower' | 'higher';
  readonly meaning: string;
}

const CRITERIA: Readonly<Record<StudyRecord['selection']['rank_by'], Criterion>> = {
  adjusted_r_squared: {
    name: 'adjusted R²',
    better: 'higher',
    meaning: 'the share of variation accounted for, less an allowance for each coefficient',
  },
  aic: { name: 'AIC', better: 'lower', meaning: 'Akaike’s information criterion' },
  aicc: {
    name: 'AICc',
    better: 'lower',
    meaning: 'Akaike’s information criterion with its small-sample correction',
  },
  bic: { name: 'BIC', better: 'lower', meaning: 'Schwarz’s Bayesian information criterion' },
  mallows_cp: {
    name: 'Mallows’ Cp',
    better: 'lower',
    meaning: 'the expected error of prediction against that of all terms together',
  },
  press: {
    name: 'PRESS',
    better: 'lower',
    meaning: 'the sum of squared errors of predicting each row from the others',
  },
  cross_validation: {
    name: 'cross-validated error',
    better: 'lower',
    meaning: 'the mean squared error of predicting rows that were held out',
  },
  partial_f: { name: 'partial F', better: 'lower', meaning: 'tests between nested candidates' },
};

export function criterionName(rankBy: StudyRecord['selection']['rank_by']): string {
  return CRITERIA[rankBy].name;
}

/** The declared rule in words. */
export function ruleSentences({
  selection,
  candidates,
  families = [],
}: Pick<StudyRecord, 'selection' | 'candidates' | 'families'>): string[] {
  const criterion = CRITERIA[selection.rank_by];
  const n = candidates.length;
  const all = `${counted(n, 'candidate', 'candidates', count)} ${n === 1 ? 'was' : 'were'}`;
  const searches = counted(families.length, 'family', 'families', count);
  const found = new Set(families.flatMap((family) => family.candidates)).size;
  const first =
    families.length === 0
      ? `${all} declared, all fitted on the same rows.`
      : `${all} fitted on the same rows, ${found === n ? 'all' : count(found)} of them found by searching ${searches}.`;
  if (selection.rank_by === 'partial_f') {
    return [
      first,
      `The rule: among the admitted candidates, the smallest that no admitted candidate containing it improves on at a significance of ${value(selection.significance)}, by partial F tests.`,
    ];
  }
  const smaller =
    selection.prefer_smaller_within > 0
      ? ` Among admitted candidates within ${value(selection.prefer_smaller_within)} of the best, the one with fewest coefficients is taken.`
      : '';
  return [
    first,
    `The rule: rank by ${criterion.name} (${criterion.meaning}; ${criterion.better} is better).${smaller}`,
  ];
}

/** The rounding for a column of criterion values: enough to tell small differences apart. */
export function criterionRounding(selection: StudyRecord['selection']): Rounding {
  if (selection.rank_by === 'adjusted_r_squared') return { decimals: 4, exponent: 0 };
  const sizes = selection.ranking.flatMap((r) => (r.value === null ? [] : [Math.abs(r.value)]));
  const largest = Math.max(0, ...sizes);
  return {
    decimals: largest >= 1e6 ? 0 : selection.rank_by === 'press' && largest >= 1e4 ? 0 : 1,
    exponent: 0,
  };
}

/** A finding about the candidates' distances, for the chart's caption. */
export function distanceCaption(
  selection: StudyRecord['selection'],
  candidates: readonly { readonly name: string; readonly coefficient_count: number }[],
): string {
  const name = criterionName(selection.rank_by);
  const size = (candidate: string): number | null =>
    candidates.find((c) => c.name === candidate)?.coefficient_count ?? null;
  const chosen = selection.ranking.find((r) => r.candidate === selection.chosen);
  const best = selection.ranking.find((r) => r.difference === 0);
  const digits = criterionRounding(selection).decimals;
  if (chosen === undefined) {
    return best === undefined
      ? `No candidate has a defined ${name}.`
      : `${best.candidate} has the best ${name}, but no candidate was admitted.`;
  }
  const coefficients = size(chosen.candidate);
  const carried = coefficients === null ? '' : `, with ${counted(coefficients, 'coefficient')}`;
  if (chosen.difference === 0) {
    const next = selection.ranking.find((r) => r.candidate !== chosen.candidate && r.difference !== null);
    const lead =
      next === undefined ? '' : `; ${next.candidate} comes next, ${fixed(next.difference, digits)} behind`;
    return `${chosen.candidate} has the best ${name}${carried}${lead}.`;
  }
  return stopped(
    `${chosen.candidate}, chosen, lies ${fixed(chosen.difference, digits)} from the best ${name}${carried}; ${best?.candidate ?? 'the best'} has ${best === undefined ? '–' : counted(size(best.candidate) ?? 0, 'coefficient')}`,
  );
}
