import { count, NONE, share } from '../report/numbers.ts';
import {
  mostMovedFirst,
  OUTCOMES,
  type Overview,
  type OverviewEntry,
  worstFirst,
} from '../report/overview.ts';
import { counted } from '../report/words/lexicon.ts';
import {
  changeParagraphs,
  choiceText,
  GONE,
  goneChoice,
  insideText,
  movedText,
  moveText,
  outcomeSentence,
} from '../report/words/overview.ts';
import { type Paragraph, plumbLine } from './plumb-line.ts';
import type { Terminal } from './terminal.ts';

/** A line for each run, those first that are not done, and the totals. `places` says where the overview lies. */
export function overviewSummary(overview: Overview, places: readonly string[], terminal: Terminal): string {
  return plumbLine(
    [
      { label: 'asked', paragraphs: [overview.title] },
      { label: 'runs', paragraphs: [overview.compared ? changesTable(overview) : runsTable(overview.runs)] },
      { label: 'all', paragraphs: totals(overview) },
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

/** Runs against their earlier records, and what is no longer there. */
function changesTable({ runs, gone }: Overview): Paragraph {
  return {
    columns: [
      { heading: 'run', align: 'left', shrinks: true },
      { heading: 'outcome', align: 'left' },
      { heading: 'choice', align: 'left', shrinks: true },
      { heading: 'moved most', align: 'left', shrinks: true },
      { heading: 'in errors', align: 'right' },
      { heading: 'new inside', align: 'right' },
    ],
    rows: [
      ...mostMovedFirst(runs).map((entry) => [
        entry.name,
        entry.outcome,
        choiceText(entry),
        entry.change === null ? NONE : movedText(entry.change),
        entry.change === null ? NONE : moveText(entry.change),
        entry.change === null ? NONE : insideText(entry.change),
      ]),
      ...gone.map((each) => [each.name, GONE, goneChoice(each), NONE, NONE, NONE]),
    ],
  };
}

function totals(overview: Overview): string[] {
  const entries = overview.runs;
  const rows = entries.reduce((sum, { rowsUsed }) => sum + (rowsUsed ?? 0), 0);
  const concerned = entries.filter(({ concerns }) => (concerns ?? 0) > 0).length;
  const written = entries.filter(({ outcome }) => outcome !== OUTCOMES[0]).length;
  return [
    outcomeSentence(entries),
    ...changeParagraphs(overview),
    ...(written === 0
      ? []
      : [
          `${counted(rows, 'row', 'rows', count)} used in all; ${counted(concerned, 'model has', 'models have', count)} something to look at.`,
        ]),
  ];
}
