import { count, fixed, NONE } from '../numbers.ts';
import {
  type GoneRun,
  OUTCOMES,
  type Overview,
  type OverviewChange,
  type OverviewEntry,
} from '../overview.ts';
import { counted, listed, named } from './lexicon.ts';

/** "Of 12 runs, 10 are done, 1 missed criteria and 1 failed." */
export function outcomeSentence(entries: readonly OverviewEntry[]): string {
  const of = (outcome: string) => entries.filter((entry) => entry.outcome === outcome).length;
  const [failed, refused, missed, done] = OUTCOMES.map(of) as [number, number, number, number];
  if (done === entries.length) {
    return done === 1 ? 'The one run is done.' : `All ${count(done)} runs are done.`;
  }
  const parts = [
    ...(done > 0 ? [`${count(done)} ${done === 1 ? 'is' : 'are'} done`] : []),
    ...(missed > 0 ? [`${count(missed)} missed acceptance criteria`] : []),
    ...(refused > 0 ? [`${count(refused)} admitted no candidate`] : []),
    ...(failed > 0 ? [`${count(failed)} failed`] : []),
  ];
  return `Of ${counted(entries.length, 'run', 'runs', count)}, ${listed(parts)}.`;
}

/** What became of the runs since their earlier records, in two paragraphs: choices; moves and new rows. None where not compared. */
export function changeParagraphs({ compared, runs, gone }: Overview): string[] {
  if (!compared) return [];
  const changes = runs.flatMap(({ change }) => (change === null ? [] : [change]));
  const changed = changes.filter(({ choice }) => choice.changed).length;
  const kept = changes.length - changed;
  const fresh = runs.filter(({ hasEarlier }) => hasEarlier === false).length;
  const parts = [
    ...(kept > 0 ? [`${count(kept)} ${kept === 1 ? 'keeps its choice' : 'keep their choice'}`] : []),
    ...(changed > 0 ? [`${count(changed)} ${changed === 1 ? 'chooses' : 'choose'} another candidate`] : []),
    ...(fresh > 0 ? [`${count(fresh)} ${fresh === 1 ? 'is' : 'are'} new`] : []),
  ];
  const lost =
    gone.length === 0
      ? []
      : [`${counted(gone.length, 'earlier record has', 'earlier records have', count)} no run now.`];
  const against = parts.length === 0 ? [] : [`Against the earlier records, ${listed(parts)}.`];
  const paragraphs = [
    [...against, ...lost],
    [...largestSentence(runs), ...insideSentence(changes), ...withoutRowsSentence(changes)],
  ];
  return paragraphs.flatMap((sentences) => (sentences.length === 0 ? [] : [sentences.join(' ')]));
}

function largestSentence(runs: readonly OverviewEntry[]): string[] {
  const moved = runs.filter(({ change }) => change !== null && change.largest !== null);
  const size = ({ change }: OverviewEntry) => Math.abs(change!.largest!.inStandardErrors);
  const [most] = [...moved].sort((a, b) => size(b) - size(a));
  if (most === undefined) return [];
  if (size(most) === 0) return ['No coefficient has moved.'];
  return [
    `The largest move of a coefficient is that of ${most.change!.largest!.name} in ${most.name}: ${moveText(most.change!)} of its earlier standard errors.`,
  ];
}

function insideSentence(changes: readonly OverviewChange[]): string[] {
  const judged = changes.flatMap(({ inside }) => (inside === null ? [] : [inside]));
  if (judged.length === 0) return [];
  const sum = (of: (each: (typeof judged)[number]) => number) =>
    judged.reduce((all, each) => all + of(each), 0);
  return [
    `Of ${counted(
      sum((each) => each.of),
      'new row',
      'new rows',
      count,
    )}, ${count(sum(({ rows }) => rows))} lie inside the prediction intervals of before.`,
  ];
}

function withoutRowsSentence(changes: readonly OverviewChange[]): string[] {
  const runs = changes.filter(({ newRows }) => newRows === null).length;
  if (runs === 0) return [];
  return [
    `In ${counted(runs, 'run', 'runs', count)} rows were not kept, so that moves and new rows cannot be told.`,
  ];
}

/** The outcome of an earlier record that no run stands for any more. */
export const GONE = 'no longer there';

/** "before: By vessel": what it had chosen. */
export function goneChoice({ chosen }: Pick<GoneRun, 'chosen'>): string {
  return `before: ${chosen ?? 'none'}`;
}

/** The coefficient that moved most, where one did. */
export function movedText({ largest }: OverviewChange): string {
  if (largest === null) return NONE;
  return largest.inStandardErrors === 0 ? 'none' : largest.name;
}

/** "3.2": the largest move in earlier standard errors, without its sign. */
export function moveText({ largest }: OverviewChange): string {
  if (largest === null) return NONE;
  const size = Math.abs(largest.inStandardErrors);
  if (size === 0) return '0';
  return fixed(size, size < 10 ? 1 : 0);
}

/** "19 of 20" */
export function insideText({ inside, newRows }: OverviewChange): string {
  if (inside === null) return newRows === 0 ? 'none new' : NONE;
  return `${count(inside.rows)} of ${count(inside.of)}`;
}

/** "kept: Both", "changed: Straight to Both", "new: Both", or that it was not compared. */
export function choiceText({ change, hasEarlier, chosen }: OverviewEntry): string {
  if (hasEarlier === false) return chosen === null ? 'new' : `new: ${chosen}`;
  if (change === null) return 'not compared';
  const { changed, from, to } = change.choice;
  return changed
    ? `changed: ${from === null ? 'none' : named(from)} to ${to === null ? 'none' : named(to)}`
    : `kept: ${to ?? 'none'}`;
}
