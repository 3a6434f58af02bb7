import { readFile } from 'node:fs/promises';
import { dirname } from 'node:path';
import type { Place, Report } from '../problem.ts';
import { findJsonFault } from './json-fault.ts';
import { finishMoves } from './move-results.ts';
import type { StudyRecord } from './record.ts';
import { recordFaults } from './record-faults.ts';

/** How many faults of one record are listed. */
const LIMIT = 10;

const FORMAT: StudyRecord['format'] = 'plumbrule-record/1';

/**
 * Reads a record from a file, or reports why it cannot be used (`record_unreadable`) and gives null:
 * no such file, not UTF-8, a study, not JSON (with line and column), another format or version, or not as the
 * schema says (each fault, up to ten).
 *
 * Where a run was killed while it moved its results into the record's folder, they are moved in first (see `moveIn`), so
 * that what is read is the whole of one run's.
 */
export async function readRecord(path: string, report: Report): Promise<StudyRecord | null> {
  const refuse = (message: string, hint?: string, place: Place = { kind: 'file', file: path }) => {
    report({
      code: 'record_unreadable',
      severity: 'error',
      place,
      message,
      ...(hint === undefined ? {} : { hint }),
    });
  };

  const stuck = await finishMoves(dirname(path));
  let bytes: Uint8Array;
  try {
    bytes = await readFile(path);
  } catch (fault) {
    if (stuck === null || codeOf(fault) !== 'ENOENT') refuse(`The record cannot be read: ${reason(fault)}.`);
    else
      refuse(`The record cannot be read: ${stuck}.`, 'Mend that and read it again, or fit the study again.');
    return null;
  }

  let text: string;
  try {
    text = new TextDecoder('utf-8', { fatal: true }).decode(bytes);
  } catch {
    refuse('The record is not UTF-8 text.');
    return null;
  }

  let value: unknown;
  try {
    value = JSON.parse(text);
  } catch {
    if (/^plumbrule\s*:/m.test(text)) {
      refuse('This is a study, not a record.', 'plumbrule fit runs it and writes a record, record.json.');
      return null;
    }
    const fault = findJsonFault(text);
    const place: Place =
      fault === null
        ? { kind: 'file', file: path }
        : { kind: 'source', file: path, line: fault.line, column: fault.column, length: 1 };
    refuse(
      `The record is not JSON: ${fault?.message ?? 'the text cannot be read'}.`,
      'A record is written by "plumbrule fit".',
      place,
    );
    return null;
  }

  const format = formatOf(value);
  if (format !== FORMAT) {
    if (format?.startsWith('plumbrule-record/')) {
      refuse(`The record has format "${format}"; this version reads "${FORMAT}".`, 'Fit the study again.');
    } else {
      refuse(
        `This is not a record: it has no "format": "${FORMAT}".`,
        'A record is written by "plumbrule fit".',
      );
    }
    return null;
  }

  const faults = recordFaults(value);
  for (const fault of faults.slice(0, LIMIT)) refuse(fault);
  if (faults.length > LIMIT) refuse(`${faults.length - LIMIT} more faults of this record are not listed.`);
  return faults.length === 0 ? (value as StudyRecord) : null;
}

function formatOf(value: unknown): string | null {
  if (typeof value !== 'object' || value === null || !Object.hasOwn(value, 'format')) return null;
  const { format } = value as { format: unknown };
  return typeof format === 'string' ? format : null;
}

function codeOf(fault: unknown): unknown {
  return (fault as { readonly code?: unknown }).code;
}

function reason(fault: unknown): string {
  const code = codeOf(fault);
  if (code === 'ENOENT') return 'there is no such file';
  if (code === 'EISDIR') return 'it is a folder';
  if (code === 'EACCES' || code === 'EPERM') return 'permission is denied';
  return `the system says ${String(code)}`;
}
