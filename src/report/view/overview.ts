import { count, NONE, percent, rounded, roundingFor, share, significant, withUnit } from '../numbers.ts';
import {
  type GoneRun,
  mostMovedFirst,
  OUTCOMES,
  type Overview,
  type OverviewChange,
  type OverviewEntry,
  type SharedCoefficients,
  sharedCoefficients,
  worstFirst,
} from '../overview.ts';
import type { OverviewView } from '../overview-view.ts';
import { counted, listed, named } from '../words/lexicon.ts';
import {
  changeParagraphs,
  choiceText,
  GONE,
  goneChoice,
  insideText,
  movedText,
  moveText,
  outcomeSentence,
} from '../words/overview.ts';

/** Coefficients side by side on a page; the table in CSV has all. */
const MOST_COEFFICIENTS = 6;

/** Changed choices and runs no longer there that are named before the table, which has all. */
const MOST_TOLD = 8;

/** Runs beside one another as people read them. */
export function overviewView(tool: string, overview: Overview): OverviewView {
  const { title, runs: entries } = overview;
  return {
    title,
    tool,
    answer: [outcomeSentence(entries), ...changeParagraphs(overview), ...chosenSentence(entries)],
    failures: [
      ...worstFirst(entries).flatMap(({ name, outcome, why, hasEarlier, change }) => {
        if (outcome === OUTCOMES[3]) return [];
        const was = hasEarlier === true && change === null ? ' It has an earlier record.' : '';
        return [{ name, outcome, why: `${why ?? ''}${was}` }];
      }),
      ...told(overview),
    ],
    changes: overview.compared ? changesView(overview) : null,
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

/** Changed choices and earlier runs no longer there. */
function told({ runs, gone }: Overview): OverviewView['failures'] {
  const changed = mostMovedFirst(runs).flatMap(({ name, outcome, change }) =>
    outcome !== OUTCOMES[3] || change === null || !change.choice.changed
      ? []
      : [
          {
            name,
            outcome: 'another choice',
            why: `${change.choice.to === null ? 'No candidate' : named(change.choice.to)} is chosen; before, ${change.choice.from === null ? 'no candidate' : named(change.choice.from)} was.`,
          },
        ],
  );
  const lost = gone.map(({ name, ...was }) => ({
    name,
    outcome: GONE,
    why: beforeSentence(was),
  }));
  return [...changed.slice(0, MOST_TOLD), ...lost.slice(0, MOST_TOLD)];
}

function beforeSentence({ chosen, rowsUsed }: Pick<GoneRun, 'chosen' | 'rowsUsed'>): string {
  if (rowsUsed === null) return 'There is an earlier record and no run now.';
  return `There is an earlier record of ${counted(rowsUsed, 'row', 'rows', count)}, with ${chosen === null ? 'no candidate' : named(chosen)} chosen, and no run now.`;
}

function changesView({ runs, gone }: Overview): NonNullable<OverviewView['changes']> {
  const confidences = new Set(runs.flatMap(({ change }) => change?.inside?.confidence ?? []));
  const [confidence] = confidences;
  const inside =
    confidences.size === 1 && confidence !== undefined
      ? `in the ${percent(confidence)} prediction interval that the earlier model gives for them; about that share ought to`
      : 'in the prediction interval that the earlier model gives for them';
  return {
    rows: [
      ...mostMovedFirst(runs).map((entry) => {
        const { name, outcome, change } = entry;
        return {
          name,
          link: change?.link ?? null,
          outcome,
          done: outcome === OUTCOMES[3],
          choice: choiceText(entry),
          marked: change === null || change.choice.changed,
          moved: change === null ? NONE : movedText(change),
          errors: change === null ? NONE : moveText(change),
          inside: change === null ? NONE : insideText(change),
          criteria: change === null ? NONE : criteriaText(change),
        };
      }),
      ...gone.map((each) => ({
        name: each.name,
        link: null,
        outcome: GONE,
        done: false,
        choice: goneChoice(each),
        marked: true,
        moved: NONE,
        errors: NONE,
        inside: NONE,
        criteria: NONE,
      })),
    ],
    note: `A move is the difference of a coefficient of the model chosen now, fitted to the earlier and to the present rows, divided by its earlier standard error. New rows inside are those whose response lies ${inside}. Criteria here are those that only an earlier record can judge.`,
  };
}

function criteriaText({ criteria, criteriaMet, criteriaIdle }: OverviewChange): string {
  if (criteria === 0) return NONE;
  const idle = criteriaIdle === 0 ? '' : `, ${count(criteriaIdle)} not judged`;
  return `${criteriaMet} of ${criteria - criteriaIdle}${idle}`;
}

/** Which candidates were chosen how often; nothing where no two runs have the same, as different studies do not. */
function chosenSentence(entries: readonly OverviewEntry[]): string[] {
  const counts = new Map<string, number>();
  for (const { chosen } of entries) if (chosen !== null) counts.set(chosen, (counts.get(chosen) ?? 0) + 1);
  const [first, ...others] = [...counts].sort(([, a], [, b]) => b - a);
  if (first === undefined || first[1] < 2) return [];
  const [name, runs] = first;
  if (others.length === 0) return [`Wherever a candidate was chosen it is ${named(name)}.`];
  const told = others.slice(0, MOST_CHOSEN).map(([other, times]) => `${named(other)} in ${count(times)}`);
  const more = others.length - told.length;
  const rest = more > 0 ? [counted(more, 'other candidate', 'other candidates', count)] : [];
  return [`${named(name)} was chosen in ${count(runs)} of the runs, ${listed([...told, ...rest])}.`];
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
