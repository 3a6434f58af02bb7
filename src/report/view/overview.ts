import { count, NONE, rounded, roundingFor, share, significant, withUnit } from '../numbers.ts';
import {
  OUTCOMES,
  type OverviewEntry,
  type SharedCoefficients,
  sharedCoefficients,
  worstFirst,
} from '../overview.ts';
import type { OverviewView } from '../overview-view.ts';
import { counted, listed } from '../words/lexicon.ts';
import { outcomeSentence } from '../words/overview.ts';

/** Coefficients side by side on a page; the table in CSV has all. */
const MOST_COEFFICIENTS = 6;

/** Runs beside one another as people read them. */
export function overviewView(title: string, tool: string, entries: readonly OverviewEntry[]): OverviewView {
  return {
    title,
    tool,
    answer: [outcomeSentence(entries), ...chosenSentence(entries)],
    failures: worstFirst(entries).flatMap(({ name, outcome, why }) =>
      outcome === OUTCOMES[3] ? [] : [{ name, outcome, why: why ?? '' }],
    ),
    runs: entries.map((entry) => ({
      name: entry.name,
      link: entry.link,
      outcome: entry.outcome,
      done: entry.outcome === OUTCOMES[3],
      chosen: entry.chosen ?? NONE,
      rows: entry.rowsUsed === null ? NONE : count(entry.rowsUsed),
      adjusted: share(entry.adjustedRSquared),
      error: withUnit(significant(entry.residualStandardError, 4), entry.unit),
      criteria: entry.criteria === 0 ? NONE : `${entry.criteriaMet} of ${entry.criteria}`,
      concerns: entry.concerns === null ? NONE : count(entry.concerns),
    })),
    coefficients: sharedCoefficients(entries).map(coefficientsView),
  };
}

/** Which candidates were chosen how often; nothing where no two runs have the same, as different studies do not. */
function chosenSentence(entries: readonly OverviewEntry[]): string[] {
  const counts = new Map<string, number>();
  for (const { chosen } of entries) if (chosen !== null) counts.set(chosen, (counts.get(chosen) ?? 0) + 1);
  const [first, ...others] = [...counts].sort(([, a], [, b]) => b - a);
  if (first === undefined || first[1] < 2) return [];
  const [name, runs] = first;
  if (others.length === 0) return [`Wherever a candidate was chosen it is ${name}.`];
  const told = others.slice(0, MOST_CHOSEN).map(([other, times]) => `${other} in ${count(times)}`);
  const more = others.length - told.length;
  const rest = more > 0 ? [counted(more, 'other candidate', 'other candidates', count)] : [];
  return [`${name} was chosen in ${count(runs)} of the runs, ${listed([...told, ...rest])}.`];
}

/** Candidates beside the most frequent one that a sentence names. */
const MOST_CHOSEN = 3;

function coefficientsView({
  quantity,
  names,
  entries,
}: SharedCoefficients): OverviewView['coefficients'][number] {
  const shown = names.slice(0, MOST_COEFFICIENTS);
  const more = names.length - shown.length;
  return {
    quantity,
    names: shown,
    runs: entries.map((entry) => ({
      name: entry.name,
      cells: shown.map((name) => {
        const found = entry.coefficients.find((each) => each.name === name);
        if (found === undefined) return { estimate: NONE, error: '' };
        const rounding = roundingFor(found.estimate, found.standardError);
        return {
          estimate: rounded(found.estimate, rounding),
          error: found.standardError === null ? '' : rounded(found.standardError, rounding),
        };
      }),
    })),
    more: more > 0 ? `${counted(more, 'more is', 'more are', count)} in overview.csv.` : null,
  };
}
