import { count, NONE, pPhrase, significant, value } from '../numbers.ts';
import type { RecordFinding } from '../record-type.ts';

const CONCERN = ['Nothing to see', 'Worth a look', 'Take care'] as const;

/** A finding's concern in words. */
export function concernWord(concern: RecordFinding['concern']): string {
  return CONCERN[concern];
}

/**
 * "Durbin–Watson statistic: 1.98, p = 0.41." with the figures beside it; null without a statistic.
 * @param brief without those figures
 */
export function evidence(finding: RecordFinding, brief = false): string | null {
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
  return `${name[0]!.toUpperCase()}${name.slice(1)}: ${figureText(name, finding.statistic)}${freedom}${p}${mark}.${brief ? '' : further(finding)}`;
}

/** The figures beside the statistic, behind a full stop: " Also: skewness 4.70; excess kurtosis 46.1." */
function further({ figures = [] }: RecordFinding): string {
  const said = figures.flatMap(({ name, value: figure }) =>
    figure === null ? [] : [`${name} ${figureText(name, figure)}`],
  );
  return said.length === 0 ? '' : ` Also: ${said.join('; ')}.`;
}

/** A count of rows or a place in whole numbers, else three digits. */
function figureText(name: string, figure: number): string {
  const whole = /^(rows|position)\b/.test(name) && Number.isInteger(figure);
  return whole ? count(figure) : significant(figure, 3);
}
