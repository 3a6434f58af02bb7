import { NONE, pPhrase, significant, value } from '../numbers.ts';
import type { RecordFinding } from '../record-type.ts';

const CONCERN = ['Nothing to see', 'Worth a look', 'Take care'] as const;

/** A finding's concern in words. */
export function concernWord(concern: RecordFinding['concern']): string {
  return CONCERN[concern];
}

/** "Durbin–Watson statistic 1.98; held against: near 2 for unrelated neighbours." Null without a statistic. */
export function evidence(finding: RecordFinding): string | null {
  if (finding.statistic === null) return null;
  const [first, second] = finding.df;
  const freedom =
    first === undefined
      ? ''
      : second === undefined
        ? ` on ${value(first)}\u00a0degree${first === 1 ? '' : 's'} of freedom`
        : ` on ${value(first)} and ${value(second)}\u00a0degrees of freedom`;
  const p = finding.p_value === null ? '' : `, ${pPhrase(finding.p_value)}`;
  const mark = finding.mark === null ? '' : `; customary mark: ${finding.mark}`;
  const name = finding.statistic_name || NONE;
  return `${name[0]!.toUpperCase()}${name.slice(1)}: ${significant(finding.statistic, 3)}${freedom}${p}${mark}.`;
}
