import type { Problem } from '../problem.ts';
import type { StudyRecord } from './record-type.ts';
import { acceptanceSentence } from './words/acceptance.ts';
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
}

export function overviewEntry({ name, folder, record, files, problems, status }: OverviewRun): OverviewEntry {
  const base = { name };
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
  const shown = ['report.html', 'report.md', 'record.json'].find((file) => files.includes(file));
  const unit = fittedUnit(response);
  return {
    ...base,
    outcome,
    why:
      outcome === 'done'
        ? null
        : selection.chosen === null
          ? selection.because
          : (acceptanceSentence(acceptance) ?? 'A criterion was missed.'),
    link: shown === undefined ? null : [...folder.split('/'), shown].map(encodeURIComponent).join('/'),
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
  };
}

/** The worst first, each kind in the order of the runs. */
export function worstFirst(entries: readonly OverviewEntry[]): OverviewEntry[] {
  return OUTCOMES.flatMap((outcome) => entries.filter((entry) => entry.outcome === outcome));
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
