import { isFamily } from './family-keys.ts';
import type { Names } from './names.ts';
import { lookUpOfType, TYPE_WORDS } from './names.ts';
import { type Path, showPath } from './path.ts';
import { fault, type Loose, type Reading } from './reading.ts';
import { checkText, parseText, untypedUses } from './resolve-expression.ts';
import type {
  FoldPlan,
  HoldOutPlan,
  RankBy,
  SelectionPlan,
  SplitSamplePlan,
  StabilityPlan,
} from './study.ts';
import { STUDY_DEFAULTS } from './study-defaults.generated.ts';
import type { StudyFile } from './study-file.generated.ts';

type Written = NonNullable<Loose<StudyFile>['selection']>;
type FoldsInFile = NonNullable<Written['validation']>;

const SEED = 1;
const REPETITIONS = 500;
const INFORMATION: readonly RankBy[] = ['aic', 'aicc', 'bic'];

type ValidationPlans = Pick<
  SelectionPlan,
  'oneStandardError' | 'validation' | 'honestError' | 'holdOut' | 'splitSample' | 'stability' | 'average'
>;

/** What the study asks for about how far the choice can be trusted; rules that contradict one another are reported. */
export function resolveValidation(
  reading: Reading,
  names: Names,
  rankBy: RankBy,
  scaleCount: number,
): ValidationPlans {
  const written = reading.file.selection;
  const path = ['selection'];
  const declared = written?.validation ?? (rankBy === 'cross_validation' ? {} : null);
  const plans: ValidationPlans = {
    oneStandardError: written?.one_standard_error ?? STUDY_DEFAULTS['selection.one_standard_error'],
    validation: resolveFolds(reading, names, declared, [...path, 'validation']),
    honestError: resolveFolds(reading, names, written?.honest_error ?? null, [...path, 'honest_error']),
    holdOut: resolveHoldOut(reading, names),
    splitSample: resolveSplitSample(written?.split_sample ?? null),
    stability: resolveStability(reading, names),
    average: written?.average ?? STUDY_DEFAULTS['selection.average'],
  };
  checkTogether(reading, plans, rankBy, scaleCount);
  return plans;
}

function resolveFolds(
  reading: Reading,
  names: Names,
  written: FoldsInFile | null,
  path: Path,
): FoldPlan | null {
  if (written === null) return null;
  const by = written.by ?? 'rows';
  const only = (
    key: 'folds' | 'repeats' | 'seed' | 'group' | 'start' | 'horizon',
    when: readonly string[],
  ) => {
    if (written[key] === undefined || when.includes(by)) return;
    const message = `${showPath([...path, key])} is given, but by is ${by}.`;
    fault(reading, 'rules_contradict', [...path, key], message, `Write by: ${when.at(-1)}, or remove it.`);
  };
  for (const key of ['folds', 'repeats', 'seed'] as const) only(key, ['group', 'rows']);
  only('group', ['group']);
  for (const key of ['start', 'horizon'] as const) only(key, ['time']);
  if (by === 'time') needTime(reading, [...path, 'by'], 'a rolling origin needs rows in time order');
  return {
    by,
    folds: written.folds ?? null,
    repeats: written.repeats ?? 1,
    seed: written.seed ?? SEED,
    group: by === 'group' ? resolveGroup(reading, names, written.group, path) : null,
    start: written.start ?? null,
    horizon: written.horizon ?? 1,
    path,
  };
}

function needTime(reading: Reading, path: Path, why: string): void {
  if ((reading.file.data?.time ?? null) !== null) return;
  const message = `${showPath(path)} is ${String(valueAt(reading, path))}, but ${why}, and data.time is not declared.`;
  fault(reading, 'key_missing', path, message, 'Declare under data.time the variable that orders the rows.');
}

function valueAt(reading: Reading, path: Path): unknown {
  return reading.written.textAt(path) ?? '';
}

function resolveGroup(reading: Reading, names: Names, group: string | undefined, path: Path): string | null {
  if (group === undefined) {
    const message = `${showPath([...path, 'by'])} is group, but no group is named.`;
    fault(
      reading,
      'key_missing',
      [...path, 'by'],
      message,
      'Write group: and the variable that groups rows.',
    );
    return null;
  }
  const suited = ['category', 'identifier', 'text', 'integer', 'flag', 'date'] as const;
  const purpose = 'rows are grouped by a category, an identifier, a text, an integer, a flag or a date';
  return lookUpOfType(reading, names, group, [...path, 'group'], suited, purpose)?.name ?? null;
}

function resolveHoldOut(reading: Reading, names: Names): HoldOutPlan | null {
  const written = reading.file.selection?.hold_out ?? null;
  if (written === null) return null;
  const path = ['selection', 'hold_out'];
  const ways = (['share', 'last', 'where'] as const).filter((key) => written[key] !== undefined);
  if (ways.length !== 1) {
    const message =
      ways.length === 0
        ? 'selection.hold_out does not say which rows to set aside.'
        : `selection.hold_out has ${ways.join(' and ')}, but rows are set aside in one way only.`;
    fault(reading, 'rules_contradict', path, message, 'Write one of share, last and where.');
  }
  if (written.seed !== undefined && written.share === undefined) {
    const message = 'selection.hold_out.seed is given, but nothing is drawn.';
    fault(reading, 'rules_contradict', [...path, 'seed'], message, 'Write share, or remove it.');
  }
  if (written.share !== undefined) return { kind: 'share', share: written.share, seed: written.seed ?? SEED };
  if (written.last !== undefined) {
    needTime(reading, [...path, 'last'], 'the latest rows can be told only where rows are in time order');
    return { kind: 'last', rows: written.last };
  }
  if (written.where === undefined) return null;
  const at = [...path, 'where'];
  const where = parseText(reading, written.where, at);
  if (where === null) return null;
  const { type } = checkText(reading, where, at, names, untypedUses(where, names));
  if (type !== null && type !== 'flag') {
    const message = `${showPath(at)} yields ${TYPE_WORDS[type]}, but must be a condition.`;
    fault(reading, 'expression_type', at, message, 'Compare it with something: ==, !=, <, <=, > or >=.');
  }
  return { kind: 'where', where, text: written.where };
}

function resolveSplitSample(written: Exclude<Written['split_sample'], undefined>): SplitSamplePlan | null {
  return written === null ? null : { share: written.share ?? 0.5, seed: written.seed ?? SEED };
}

function resolveStability(reading: Reading, names: Names): StabilityPlan | null {
  const written = reading.file.selection?.stability ?? null;
  if (written === null) return null;
  const path = ['selection', 'stability'];
  const by = written.by ?? 'rows';
  for (const [key, when] of [
    ['group', 'group'],
    ['block_length', 'blocks'],
  ] as const) {
    if (written[key] === undefined || by === when) continue;
    const message = `${showPath([...path, key])} is given, but by is ${by}.`;
    fault(reading, 'rules_contradict', [...path, key], message, `Write by: ${when}, or remove it.`);
  }
  if (by === 'blocks') needTime(reading, [...path, 'by'], 'blocks are of rows in time order');
  return {
    repetitions: written.repetitions ?? REPETITIONS,
    seed: written.seed ?? SEED,
    by,
    group: by === 'group' ? resolveGroup(reading, names, written.group, path) : null,
    blockLength: written.block_length ?? null,
  };
}

/** Rules that cannot hold together, and rules about a choice where there is none. */
function checkTogether(reading: Reading, plans: ValidationPlans, rankBy: RankBy, scaleCount: number): void {
  const written = reading.file.selection;
  const contradict = (key: string, message: string, hint: string) =>
    fault(reading, 'rules_contradict', ['selection', key], `selection.${key} ${message}`, hint);
  if (plans.oneStandardError) {
    if (rankBy !== 'cross_validation') {
      contradict(
        'one_standard_error',
        `needs a cross-validated error, but rank_by is ${rankBy}.`,
        'Rank by cross_validation, or use prefer_smaller_within.',
      );
    } else if ((written?.prefer_smaller_within ?? 0) > 0) {
      contradict(
        'one_standard_error',
        'and prefer_smaller_within are two rules for the same thing.',
        'Keep one of them.',
      );
    }
  }
  if (plans.average && !INFORMATION.includes(rankBy)) {
    contradict(
      'average',
      `needs weights of evidence, but rank_by is ${rankBy}.`,
      'Rank by aic, aicc or bic, or remove it.',
    );
  } else if (plans.average && scaleCount > 1) {
    const message =
      'selection.average cannot be had where candidates are on different response scales: their coefficients do not measure the same.';
    fault(
      reading,
      'criterion_across_scales',
      ['selection', 'average'],
      message,
      'Give all candidates one scale.',
    );
  }
  if (!isChoice(reading)) {
    for (const [key, asked] of [
      ['honest_error', plans.honestError !== null],
      ['stability', plans.stability !== null],
      ['split_sample', plans.splitSample !== null],
      ['average', plans.average],
    ] as const) {
      if (!asked) continue;
      contradict(
        key,
        'is about the choice among candidates, but there is only one.',
        key === 'honest_error'
          ? 'Of one candidate, selection.validation gives the honest error.'
          : 'Declare another candidate, or remove it.',
      );
    }
  }
}

/** Whether more than one model can come out: several candidates, or one that is a family. */
function isChoice(reading: Reading): boolean {
  const candidates = reading.file.candidates ?? [];
  return candidates.length > 1 || candidates.some((one) => one !== undefined && isFamily(one));
}
