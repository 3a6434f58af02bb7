import type { Problem } from '../problem.ts';
import type { Comparison } from './comparison-type.ts';
import type { StudyRecord } from './record-type.ts';
import { comparedCriterionSentence, missedSentences } from './words/acceptance.ts';
import { estimatedCandidate } from './words/estimated.ts';
import { lexiconOf } from './words/lexicon.ts';
import { fittedQuantity, fittedUnit } from './words/scale.ts';

/** One run of many, as the overview is given it. */
export interface OverviewRun {
  /** What it is called among the others: the study's name, the level. */
  readonly name: string;
  /** The folder of its results, relative to that of the overview, with forward slashes. */
  readonly folder: string;
  /** The study file as it was named, with the level where there is one. */
  readonly study: string;
  /** Null where the run stopped on an error. */
  readonly record: StudyRecord | null;
  /** Names of the files in its folder. */
  readonly files: readonly string[];
  readonly problems: readonly Problem[];
  /** The run's exit status. */
  readonly status: number;
  /** Whether it has an earlier record; null where runs are not compared, or this one could not be looked for. */
  readonly hasEarlier: boolean | null;
  /** What is different from its earlier record; null where it was not compared. */
  readonly comparison: Comparison | null;
}

/** An overview of many runs. */
export interface Overview {
  readonly title: string;
  /** Whether the runs were held against earlier records. */
  readonly compared: boolean;
  /** In the order in which they were asked for. */
  readonly runs: readonly OverviewEntry[];
  /** Earlier records that no run stands for any more. */
  readonly gone: readonly GoneRun[];
}

/** An earlier record with no run now. */
export interface GoneRun {
  readonly name: string;
  /** The folder of its results, relative to that of the earlier runs, with forward slashes. */
  readonly folder: string;
  /** What it had chosen; null where nothing was, or its record cannot be read. */
  readonly chosen: string | null;
  /** Null where its record cannot be read. */
  readonly rowsUsed: number | null;
}

/** How a run lies to its earlier record, in the figures that runs are compared by. */
export interface OverviewChange {
  readonly choice: { readonly changed: boolean; readonly from: string | null; readonly to: string | null };
  /**
   * The coefficient of the model chosen now that moved most, in its earlier standard errors, with its sign; null where
   * that cannot be told.
   */
  readonly largest: { readonly name: string; readonly inStandardErrors: number } | null;
  /** Rows that are new; null where the rows of one record were not kept. */
  readonly newRows: number | null;
  /** Of the new rows that the earlier model could predict, those inside its intervals; null where there are none. */
  readonly inside: { readonly rows: number; readonly of: number; readonly confidence: number } | null;
  /** Acceptance criteria that only an earlier record can judge. */
  readonly criteria: number;
  readonly criteriaMet: number;
  /** Those for which there was nothing to judge. */
  readonly criteriaIdle: number;
  /** Its page, relative to the overview; null where none was written. */
  readonly link: string | null;
}

/** Worst first. */
export const OUTCOMES = ['failed', 'no candidate admitted', 'criteria missed', 'done'] as const;

export type Outcome = (typeof OUTCOMES)[number];

/** A run in the figures that runs are compared by. */
export interface OverviewEntry {
  readonly name: string;
  readonly outcome: Outcome;
  /** Why it is not done; null where it is. */
  readonly why: string | null;
  /** Its report or, without one, its record, relative to the overview; null where nothing was written. */
  readonly link: string | null;
  readonly chosen: string | null;
  readonly rowsRead: number | null;
  readonly rowsUsed: number | null;
  readonly adjustedRSquared: number | null;
  readonly residualStandardError: number | null;
  /** Of the residual standard error. */
  readonly unit: string | null;
  readonly criteria: number;
  readonly criteriaMet: number;
  /** Questions about the chosen model that found something; null where none was examined. */
  readonly concerns: number | null;
  /** What the coefficients are for: "fuel burned"; runs with the same one can be held side by side. */
  readonly quantity: string | null;
  readonly coefficients: readonly {
    readonly name: string;
    readonly estimate: number;
    readonly standardError: number | null;
  }[];
  /** Whether it has an earlier record; null where runs are not compared, or this one could not be looked for. */
  readonly hasEarlier: boolean | null;
  /** Null where it was not compared with an earlier record. */
  readonly change: OverviewChange | null;
}

export function overviewEntry(run: OverviewRun): OverviewEntry {
  const { name, record, problems, status, comparison, hasEarlier } = run;
  const base = { name, hasEarlier };
  if (record === null) {
    const errors = problems.filter(({ severity }) => severity === 'error');
    return {
      ...base,
      outcome: 'failed',
      why: errors[0]?.message ?? 'The run stopped.',
      link: null,
      chosen: null,
      rowsRead: null,
      rowsUsed: null,
      adjustedRSquared: null,
      residualStandardError: null,
      unit: null,
      criteria: 0,
      criteriaMet: 0,
      concerns: null,
      quantity: null,
      coefficients: [],
      change: null,
    };
  }
  const { acceptance, selection } = record;
  const candidate = estimatedCandidate(record);
  const { response } = lexiconOf(record);
  const met = acceptance.filter((criterion) => criterion.passed).length;
  const outcome =
    selection.chosen === null
      ? 'no candidate admitted'
      : met < acceptance.length || status !== 0
        ? 'criteria missed'
        : 'done';
  const unit = fittedUnit(response);
  return {
    ...base,
    outcome,
    why:
      outcome === 'done'
        ? null
        : selection.chosen === null
          ? selection.because
          : missedText(acceptance, unit, comparison?.acceptance ?? []),
    link: linkTo(run, ['report.html', 'report.md', 'record.json']),
    chosen: selection.chosen,
    rowsRead: record.data.rows_read,
    rowsUsed: record.data.rows_used,
    adjustedRSquared: candidate?.adjusted_r_squared ?? null,
    residualStandardError: candidate?.residual_standard_error ?? null,
    unit,
    criteria: acceptance.length,
    criteriaMet: met,
    concerns: record.examination?.findings.filter((finding) => finding.concern > 0).length ?? null,
    quantity:
      candidate === undefined ? null : `${fittedQuantity(response)}${unit === null ? '' : ` in ${unit}`}`,
    coefficients: (candidate?.coefficients ?? []).map((each) => ({
      name: each.name,
      estimate: each.estimate,
      standardError: each.standard_error,
    })),
    change: comparison === null ? null : changeOf(comparison, run),
  };
}

function missedText(
  acceptance: StudyRecord['acceptance'],
  unit: string | null,
  against: readonly Comparison['acceptance'][number][],
): string {
  const missed = against.filter(({ passed }) => passed === false).map(comparedCriterionSentence);
  return [...missedSentences(acceptance, unit), ...missed].join(' ') || 'A criterion was missed.';
}

/** The address of the first of these files that the run has; null where it has none. */
function linkTo({ folder, files }: OverviewRun, names: readonly string[]): string | null {
  const shown = names.find((file) => files.includes(file));
  return shown === undefined ? null : [...folder.split('/'), shown].map(encodeURIComponent).join('/');
}

function changeOf(comparison: Comparison, run: OverviewRun): OverviewChange {
  const { earlier, later, choice, models, rows, new_rows: fresh, acceptance } = comparison;
  const largest = models.find(({ chosen }) => chosen !== 'earlier')?.largest_change ?? null;
  return {
    choice: { changed: choice.changed, from: earlier.chosen, to: later.chosen },
    largest: largest === null ? null : { name: largest.name, inStandardErrors: largest.in_standard_errors },
    newRows: rows?.added ?? null,
    inside:
      fresh === null || fresh.inside === null || fresh.scored === 0
        ? null
        : { rows: fresh.inside, of: fresh.scored, confidence: fresh.interval },
    criteria: acceptance.length,
    criteriaMet: acceptance.filter(({ passed }) => passed === true).length,
    criteriaIdle: acceptance.filter(({ passed }) => passed === null).length,
    link: linkTo(run, ['comparison.html', 'comparison.md', 'comparison.json']),
  };
}

/** The worst first, each kind in the order of the runs. */
export function worstFirst(entries: readonly OverviewEntry[]): OverviewEntry[] {
  return OUTCOMES.flatMap((outcome) => entries.filter((entry) => entry.outcome === outcome));
}

/**
 * In the order in which a reader of what changed asks: those that are not done, worst first; changed choices; then by the
 * largest move of a coefficient, one that cannot be told after those that can; and those without an earlier record.
 */
export function mostMovedFirst(entries: readonly OverviewEntry[]): OverviewEntry[] {
  const rank = ({ outcome, change }: OverviewEntry) =>
    outcome !== 'done' ? OUTCOMES.indexOf(outcome) : change === null ? 5 : change.choice.changed ? 3 : 4;
  const size = ({ change }: OverviewEntry) =>
    change === null || change.largest === null ? -1 : Math.abs(change.largest.inStandardErrors);
  return [...entries].sort((a, b) => rank(a) - rank(b) || (rank(a) < 3 ? 0 : size(b) - size(a)));
}

/** Runs whose coefficients are for the same quantity, with the coefficients that at least two of them share. */
export interface SharedCoefficients {
  readonly quantity: string;
  /** Those of most runs first, then in the order in which they are met. */
  readonly names: readonly string[];
  readonly entries: readonly OverviewEntry[];
}

export function sharedCoefficients(entries: readonly OverviewEntry[]): SharedCoefficients[] {
  const byQuantity = new Map<string, OverviewEntry[]>();
  for (const entry of entries) {
    if (entry.quantity === null) continue;
    byQuantity.set(entry.quantity, [...(byQuantity.get(entry.quantity) ?? []), entry]);
  }
  return [...byQuantity].flatMap(([quantity, group]) => {
    const counts = new Map<string, number>();
    for (const { coefficients } of group) {
      for (const { name } of coefficients) counts.set(name, (counts.get(name) ?? 0) + 1);
    }
    const shared = [...counts].filter(([, runs]) => runs > 1).sort(([, a], [, b]) => b - a);
    return shared.length === 0 ? [] : [{ quantity, names: shared.map(([name]) => name), entries: group }];
  });
}
