import { count } from '../numbers.ts';
import { OUTCOMES, type OverviewEntry } from '../overview.ts';
import { counted, listed } from './lexicon.ts';

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
