import type { Report } from '../problem.ts';
import type { DataPlan } from '../study/study.ts';
import type { Filled } from './fill-columns.ts';

/** Groups of like levels told of one variable. */
const MOST_TOLD = 3;

/**
 * Warns of levels taken from the data that differ only in letter case, in spaces, or in how their characters are
 * composed (NFKC, Unicode Standard Annex 15): likely one level spelt in several ways. Declared levels are meant so.
 */
export function warnOfLikeLevels(plan: DataPlan, { variable, column }: Filled, report: Report): void {
  if (column.kind !== 'category' || variable.levels !== null) return;
  const groups = new Map<string, string[]>();
  for (const level of column.levels) {
    const key = level.normalize('NFKC').toLowerCase().replace(/\s+/gu, ' ').trim();
    groups.set(key, [...(groups.get(key) ?? []), level]);
  }
  const alike = [...groups.values()].filter((group) => group.length > 1);
  if (alike.length === 0) return;
  const told = alike.slice(0, MOST_TOLD).map((group) => group.map((level) => `"${level}"`).join(', '));
  const more = alike.length > told.length ? `, and ${alike.length - told.length} more such groups` : '';
  report({
    code: 'levels_alike',
    severity: 'warning',
    place: { kind: 'cell', file: plan.file, variable: variable.name },
    message: `Levels of ${variable.name} differ only in letter case or spaces: ${told.join('; ')}${more}.`,
    hint: 'If they are meant to be one, correct the data; if not, declare the levels.',
  });
}
