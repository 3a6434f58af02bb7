import { packageVersion } from '../package-file.ts';
import type { Report } from '../problem.ts';
import type { KeptRows } from '../record/read-sample.ts';
import type { StudyRecord } from '../record/record.ts';
import { recordSha256 } from '../record/record-text.ts';
import { acceptanceAgainst } from './acceptance.ts';
import { compareModel, givesRecord, type ModelPair, type Side } from './attribute.ts';
import { compareChoice } from './choice.ts';
import type { ComparedModel, ComparedRecord, Comparison, NewRows } from './comparison.ts';
import { contractChanges } from './contract-changes.ts';
import { declarationOf, definitionOf } from './declaration.ts';
import { declarationChanges } from './declaration-changes.ts';
import { describeRows, matchRows, repeatedId } from './match-rows.ts';
import { scoreNewRows } from './new-rows.ts';
import type { Refit } from './refit.ts';

/** A record with the rows that it was made from, as they lie side by side in a folder of results. */
export interface ComparedSide {
  readonly record: StudyRecord;
  /** Null where they were not kept. */
  readonly rows: KeptRows | null;
  /** For problems: where the record is. */
  readonly file: string;
}

/**
 * What is different between two records of one study. Null, with an error reported, where they cannot be compared:
 * responses are not the same (`records_unlike`), an identity stands for two rows, or kept rows and record contradict
 * each other.
 */
export function compareRecords(
  earlier: ComparedSide,
  later: ComparedSide,
  report: Report,
): Comparison | null {
  if (!comparable(earlier, later, report)) return null;
  const [before, now] = [earlier.record, later.record];
  const rows = compareRows(earlier, later, report);
  if (rows === undefined) return null;
  const first = definitionOf(before);
  const found = {
    rows: rows?.described ?? null,
    models: rows?.models ?? [],
    new_rows: rows?.newRows ?? null,
  };
  return {
    format: 'plumbrule-comparison/1',
    tool: { name: 'plumbrule', version: packageVersion() },
    earlier: sideOf(before),
    later: sideOf(now),
    cannot_tell: cannotTell(earlier, later, rows === null ? null : rows.matched.by),
    rows: found.rows,
    contract: contractChanges(
      before,
      now,
      rows === null ? null : { earlier: earlier.rows!, later: later.rows!, matched: rows.matched },
    ),
    declaration: {
      study_changed: before.study.sha256 !== now.study.sha256,
      changes: declarationChanges(before, now),
    },
    choice: compareChoice(before, now, first, later.rows === null ? null : sided(later)),
    models: found.models,
    new_rows: found.new_rows,
    acceptance: acceptanceAgainst(now, found),
  };
}

function comparable(earlier: ComparedSide, later: ComparedSide, report: Report): boolean {
  const [a, b] = [earlier.record.response.variable, later.record.response.variable];
  if (a !== b) {
    report({
      code: 'records_unlike',
      severity: 'error',
      place: { kind: 'file', file: earlier.file },
      message: `The later record explains ${b}, the earlier one ${a}: they are of different studies.`,
      hint: 'Compare two records of the same response.',
    });
    return false;
  }
  let sound = true;
  for (const { rows, file } of [earlier, later]) {
    const id = rows === null ? null : repeatedId(rows);
    if (id === null) continue;
    sound = false;
    report({
      code: 'row_id_twice',
      severity: 'error',
      place: { kind: 'file', file },
      message: `The rows kept with this record have the identity "${id}" more than once, so that they cannot be matched.`,
      hint: 'Declare a row_id whose values are all different.',
    });
  }
  return sound;
}

interface RowsCompared {
  readonly matched: ReturnType<typeof matchRows>;
  readonly described: NonNullable<Comparison['rows']>;
  readonly models: ComparedModel[];
  readonly newRows: NewRows | null;
}

/** Null where rows of one side are not there; undefined where they contradict their record. */
function compareRows(
  earlier: ComparedSide,
  later: ComparedSide,
  report: Report,
): RowsCompared | null | undefined {
  if (earlier.rows === null || later.rows === null) return null;
  const matched = matchRows(earlier.rows, later.rows);
  const described = describeRows(earlier.rows, later.rows, matched);
  const [a, b] = [sided(earlier), sided(later)];
  const compared = pairsOf(earlier.record, later.record).map((pair) => ({
    pair,
    ...compareModel(pair, a, b, matched),
  }));
  const own = compared.find(({ pair }) => pair.chosen !== 'later')?.before ?? null;
  if (own !== null && !estimatedFromPart(earlier) && !givesRecord(own, earlier.record)) {
    report({
      code: 'record_unreadable',
      severity: 'error',
      place: { kind: 'file', file: earlier.file },
      message:
        'The rows kept with this record do not give its chosen model again: one of the two was edited.',
      hint: 'Fit the study again, or bring back the results as they were written.',
    });
    return undefined;
  }
  const newRows =
    own === null || matched.added.length === 0 ? null : scored(own, earlier.record, a, b, matched.added);
  return { matched, described, models: compared.map(({ model }) => model), newRows };
}

/** A study may choose on one part of its rows and estimate from the other: the kept rows are those of both. */
function estimatedFromPart({ record }: ComparedSide): boolean {
  return record.model !== null && record.model.rows !== record.data.rows_used;
}

function scored(own: Refit, record: StudyRecord, a: Side, b: Side, added: Int32Array): NewRows | null {
  return record.model === null ? null : scoreNewRows(own, record.model, a, b, added);
}

/** The later choice, then the earlier one where it is another; a definition that one record lacks is the other's. */
function pairsOf(before: StudyRecord, now: StudyRecord): ModelPair[] {
  const [first, second] = [definitionOf(before), definitionOf(now)];
  if (first !== null && second !== null && first.name === second.name) {
    return [{ chosen: 'both', earlier: first, later: second }];
  }
  return [
    ...(second === null ? [] : [{ chosen: 'later' as const, earlier: second, later: second }]),
    ...(first === null ? [] : [{ chosen: 'earlier' as const, earlier: first, later: first }]),
  ];
}

function sided({ record, rows }: ComparedSide): Side {
  return { record, declaration: declarationOf(record), base: rows! };
}

function sideOf(record: StudyRecord): ComparedRecord {
  const { study, data, selection } = record;
  return {
    title: study.title,
    record_sha256: recordSha256(record),
    study_file: study.file,
    study_sha256: study.sha256,
    data_file: data.file,
    data_sha256: data.sha256,
    rows_read: data.rows_read,
    rows_used: data.rows_used,
    first: data.time?.first ?? null,
    last: data.time?.last ?? null,
    chosen: selection.chosen,
  };
}

function cannotTell(earlier: ComparedSide, later: ComparedSide, by: 'row_id' | 'content' | null): string[] {
  const absent = [...(earlier.rows === null ? ['earlier'] : []), ...(later.rows === null ? ['later'] : [])];
  return [
    ...(absent.length === 0
      ? []
      : [
          `The rows of the ${absent.join(' and the ')} record were not kept, so that it cannot be told which rows are new, revised or gone, what moved each coefficient, or how new rows lie to the earlier model.`,
        ]),
    ...[earlier, later].flatMap((side, index) =>
      side.rows !== null && estimatedFromPart(side)
        ? [
            `The ${index === 0 ? 'earlier' : 'later'} record estimates its model from a part of its rows; the coefficients compared here are those of fits to all of them.`,
          ]
        : [],
    ),
    ...(by === 'content'
      ? [
          'Rows have no identity in both records, so that they are matched by everything in them: a row with a revised value counts as one removed and one added.',
        ]
      : []),
  ];
}
