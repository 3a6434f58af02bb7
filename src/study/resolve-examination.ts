import { isoDays } from '../expression/iso-date.ts';
import { lookUpOfType, type Named, type Names, TYPE_WORDS } from './names.ts';
import { quote } from './path.ts';
import { cellText, fault, type Loose, type Reading } from './reading.ts';
import type { BootstrapPlan, ExaminationPlan, SplitPlan } from './study.ts';
import { STUDY_DEFAULTS } from './study-defaults.generated.ts';
import type { StudyFile } from './study-file.generated.ts';

const REPETITIONS = 999;
const SEED = 1;

type Written = NonNullable<Loose<StudyFile>['examination']>;

export function resolveExamination(reading: Reading, names: Names): ExaminationPlan {
  const written = reading.file.examination;
  return {
    lags: written?.lags === undefined ? STUDY_DEFAULTS['examination.lags'] : written.lags,
    splitAt: resolveSplit(reading, names, written?.split_at ?? null),
    bootstrap: resolveBootstrap(reading, written?.bootstrap ?? null),
  };
}

function resolveSplit(
  reading: Reading,
  names: Names,
  written: Exclude<Written['split_at'], undefined>,
): SplitPlan | null {
  if (written === null || written.variable === undefined) return null;
  const path = ['examination', 'split_at'];
  const suited = ['number', 'integer', 'date', 'flag'] as const;
  const purpose = 'rows are split at a value of a number, a date or a flag';
  const named = lookUpOfType(reading, names, written.variable, [...path, 'variable'], suited, purpose);
  if (named === null || written.value === undefined) return null;
  const text = cellText(reading, written.value, [...path, 'value']);
  const value = splitValue(named, written.value, text);
  if (value === null) {
    const message = `examination.split_at.value is ${quote(text)}, but ${named.name} is ${TYPE_WORDS[named.type!]}.`;
    fault(reading, 'value_not_allowed', [...path, 'value'], message, HINTS[named.type!]);
    return null;
  }
  return { variable: named.name, value, text };
}

const HINTS: Readonly<Record<string, string>> = {
  date: 'A date here is written as 2024-03-01.',
  flag: 'Write true: the rows where it holds are the second part.',
};

function splitValue(named: Named, value: number | string | boolean, text: string): number | null {
  if (named.type === 'date') return isoDays(text);
  if (named.type === 'flag') return value === true || value === 1 ? 1 : null;
  return typeof value === 'number' ? value : null;
}

function resolveBootstrap(
  reading: Reading,
  written: Exclude<Written['bootstrap'], undefined>,
): BootstrapPlan | null {
  if (written === null) return null;
  const by = written.by ?? 'rows';
  const path = ['examination', 'bootstrap'];
  if (by === 'blocks' && (reading.file.data?.time ?? null) === null) {
    const message =
      'examination.bootstrap.by is blocks, but data.time names no variable that orders the rows.';
    fault(reading, 'value_not_allowed', [...path, 'by'], message, 'Declare data.time, or draw rows.');
  }
  if (by !== 'blocks' && written.block_length !== undefined) {
    const message = `examination.bootstrap.block_length is given, but by is ${by}.`;
    fault(
      reading,
      'value_not_allowed',
      [...path, 'block_length'],
      message,
      'Write by: blocks, or remove it.',
    );
  }
  return {
    repetitions: written.repetitions ?? REPETITIONS,
    seed: written.seed ?? SEED,
    by,
    blockLength: by === 'blocks' ? (written.block_length ?? null) : null,
  };
}
