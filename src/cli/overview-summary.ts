import { count, NONE, share } from '../report/numbers.ts';
import { OUTCOMES, type OverviewEntry, worstFirst } from '../report/overview.ts';
import { counted } from '../report/words/lexicon.ts';
import { outcomeSentence } from '../report/words/overview.ts';
import { type Paragraph, plumbLine } from './plumb-line.ts';
import type { Terminal } from './terminal.ts';

/** A line for each run, those first that are not done, and the totals. `places` says where the overview lies. */
export function overviewSummary(
  title: string,
  entries: readonly OverviewEntry[],
  places: readonly string[],
  terminal: Terminal,
): string {
  return plumbLine(
    [
      { label: 'asked', paragraphs: [title] },
      { label: 'runs', paragraphs: [runsTable(entries)] },
      { label: 'all', paragraphs: totals(entries) },
      ...(places.length === 0
        ? []
        : [{ label: 'written', paragraphs: places.map((line): Paragraph => ({ line })) }]),
    ],
    terminal,
  );
}

function runsTable(entries: readonly OverviewEntry[]): Paragraph {
  return {
    columns: [
      { heading: 'run', align: 'left', shrinks: true },
      { heading: 'outcome', align: 'left' },
      { heading: 'chosen', align: 'left' },
      { heading: 'rows', align: 'right' },
      { heading: 'adjusted R²', align: 'right' },
      { heading: 'concerns', align: 'right' },
    ],
    rows: worstFirst(entries).map((entry) => [
      entry.name,
      entry.outcome,
      entry.chosen ?? NONE,
      entry.rowsUsed === null ? NONE : count(entry.rowsUsed),
      share(entry.adjustedRSquared),
      entry.concerns === null ? NONE : count(entry.concerns),
    ]),
  };
}

function totals(entries: readonly OverviewEntry[]): string[] {
  const rows = entries.reduce((sum, { rowsUsed }) => sum + (rowsUsed ?? 0), 0);
  const concerned = entries.filter(({ concerns }) => (concerns ?? 0) > 0).length;
  const written = entries.filter(({ outcome }) => outcome !== OUTCOMES[0]).length;
  return [
    outcomeSentence(entries),
    ...(written === 0
      ? []
      : [
          `${counted(rows, 'row', 'rows', count)} used in all; ${counted(concerned, 'model has', 'models have', count)} something to look at.`,
        ]),
  ];
}
