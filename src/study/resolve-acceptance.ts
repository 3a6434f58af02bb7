import { isoDays } from '../expression/iso-date.ts';
import { isFoundName } from './family-keys.ts';
import { didYouMean, type Names } from './names.ts';
import { type Path, quote, showPath } from './path.ts';
import { entriesInOrder, fault, type Loose, type Reading } from './reading.ts';
import { checkRange } from './resolve-variables.ts';
import type { AcceptanceFigure, AcceptancePlan, FamilyPlan } from './study.ts';
import type { LimitsInFile } from './study-file.generated.ts';

interface Reach {
  readonly least: number | null;
  readonly most: number | null;
}

/** The values that a figure can take; a limit outside can never be missed or never be met. */
const FIGURES: Readonly<Record<AcceptanceFigure, Reach>> = {
  r_squared: { least: null, most: 1 },
  adjusted_r_squared: { least: null, most: 1 },
  predicted_r_squared: { least: null, most: 1 },
  residual_standard_error: { least: 0, most: null },
  largest_vif: { least: 1, most: null },
  condition_number: { least: 1, most: null },
  rows_used: { least: 1, most: null },
  rows_lost_share: { least: 0, most: 1 },
  rows_per_coefficient: { least: 0, most: null },
  cv_rmse: { least: null, most: null },
  bias: { least: null, most: null },
  prediction_interval_width: { least: 0, most: null },
  relative_interval_width: { least: 0, most: null },
};

const PROBABILITY: Reach = { least: 0, most: 1 };
const ANY: Reach = { least: null, most: null };

/** What acceptance needs to know of the rest of the study. */
export interface AcceptanceNeeds {
  /** Names of candidates and of families. */
  readonly candidates: readonly string[];
  readonly families: readonly FamilyPlan[];
  readonly names: Names;
  readonly time: string | null;
}

/** The acceptance criteria in the order written. */
export function resolveAcceptance(reading: Reading, needs: AcceptanceNeeds): readonly AcceptancePlan[] {
  return reading.written.keysAt(['acceptance']).flatMap((criterion) => plansOf(reading, criterion, needs));
}

function plansOf(reading: Reading, criterion: string, needs: AcceptanceNeeds): readonly AcceptancePlan[] {
  const written = reading.file.acceptance ?? {};
  const path = ['acceptance', criterion];
  switch (criterion) {
    case 'chosen': {
      checkChosen(reading, needs);
      const names = written.chosen?.filter((name) => name !== undefined) ?? [];
      return names.length === 0 ? [] : [{ criterion, names }];
    }
    case 'p_value':
    case 'coefficients':
      return entriesInOrder(reading, written[criterion], path).flatMap(([of, limits]): AcceptancePlan[] => {
        if (limits === undefined) return [];
        checkLimits(reading, [...path, of], limits, criterion === 'p_value' ? PROBABILITY : ANY);
        return [{ criterion: criterion === 'p_value' ? criterion : 'coefficient', of, ...ends(limits) }];
      });
    case 'signs':
      return entriesInOrder(reading, written.signs, path).flatMap(([of, sign]): AcceptancePlan[] =>
        sign === undefined ? [] : [{ criterion: 'sign', of, sign }],
      );
    case 'age_of_newest_row':
      return resolveAge(reading, needs);
    case 'coefficient_change':
      return resolveChange(reading);
    case 'new_rows_inside': {
      const limits = written.new_rows_inside;
      if (limits === undefined) return [];
      checkLimits(reading, path, limits, PROBABILITY);
      return [{ criterion, of: null, ...ends(limits) }];
    }
    default: {
      if (!Object.hasOwn(FIGURES, criterion)) return [];
      const figure = criterion as AcceptanceFigure;
      const limits = written[figure];
      if (limits === undefined) return [];
      checkLimits(reading, path, limits, FIGURES[figure]);
      checkPredicts(reading, figure, path);
      return [{ criterion: figure, ...ends(limits) }];
    }
  }
}

function ends(limits: Loose<LimitsInFile>): {
  readonly atLeast: number | null;
  readonly atMost: number | null;
} {
  return { atLeast: limits.at_least ?? null, atMost: limits.at_most ?? null };
}

function resolveChange(reading: Reading): readonly AcceptancePlan[] {
  const written = reading.file.acceptance?.coefficient_change;
  const plan = (of: string | null, atMost: number): AcceptancePlan => ({
    criterion: 'coefficient_change',
    of,
    atLeast: null,
    atMost,
  });
  const path = ['acceptance', 'coefficient_change', 'of'];
  return [
    ...(written?.at_most === undefined ? [] : [plan(null, written.at_most)]),
    ...entriesInOrder(reading, written?.of, path).flatMap(([name, limit]) =>
      limit?.at_most === undefined ? [] : [plan(name, limit.at_most)],
    ),
  ];
}

function resolveAge(reading: Reading, { names, time }: AcceptanceNeeds): readonly AcceptancePlan[] {
  const written = reading.file.acceptance?.age_of_newest_row;
  const path = ['acceptance', 'age_of_newest_row'];
  if (time === null || (names.get(time)?.type ?? 'date') !== 'date') {
    const message = `${showPath(path)} needs data.time to name a date.`;
    fault(reading, 'type_unsuited', path, message);
  }
  if (written?.on === undefined || written.at_most === undefined) return [];
  const on = isoDays(written.on);
  if (on === null) {
    const message = `${showPath([...path, 'on'])} is ${quote(written.on)}, which is not a day.`;
    fault(reading, 'value_not_allowed', [...path, 'on'], message, 'A date here is written as 2024-03-01.');
    return [];
  }
  return [{ criterion: 'age_of_newest_row', on, onText: written.on, atMost: written.at_most }];
}

function checkPredicts(reading: Reading, figure: AcceptanceFigure, path: Path): void {
  if (!figure.endsWith('_width')) return;
  const { predict } = reading.file;
  if ((predict?.rows?.length ?? 0) > 0 || (predict?.file ?? null) !== null) return;
  const message = `${showPath(path)} limits the intervals of predictions, and the study predicts nothing.`;
  fault(reading, 'limit_nonsense', path, message, 'State rows under predict.');
}

function checkChosen(reading: Reading, { candidates, families }: AcceptanceNeeds): void {
  const chosen = reading.file.acceptance?.chosen;
  chosen?.forEach((name, index) => {
    if (name === undefined || candidates.includes(name)) return;
    if (families.some((family) => isFoundName(family, name))) return;
    const path = ['acceptance', 'chosen', index];
    const message = `${showPath(path)} names ${quote(name)}, which is not a candidate.`;
    fault(reading, 'name_unknown', path, message, didYouMean(name, candidates));
  });
}

function checkLimits(
  reading: Reading,
  path: Path,
  limits: Loose<LimitsInFile>,
  { least, most }: Reach,
): void {
  checkRange(reading, limits.at_least ?? null, limits.at_most ?? null, path);
  const name = showPath(path.slice(1));
  if (most !== null && limits.at_least !== undefined && limits.at_least > most) {
    const message = `${showPath([...path, 'at_least'])} is ${limits.at_least}, but ${name} is never above ${most}.`;
    fault(reading, 'limit_nonsense', [...path, 'at_least'], message);
  }
  if (least !== null && limits.at_most !== undefined && limits.at_most < least) {
    const message = `${showPath([...path, 'at_most'])} is ${limits.at_most}, but ${name} is never below ${least}.`;
    fault(reading, 'limit_nonsense', [...path, 'at_most'], message);
  }
}
