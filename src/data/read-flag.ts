const PAIRS: readonly (readonly [string, string])[] = [
  ['no', 'yes'],
  ['false', 'true'],
  ['0', '1'],
  ['n', 'y'],
];

const USUAL: ReadonlyMap<string, 0 | 1> = new Map(
  PAIRS.flatMap(([no, yes]): [string, 0 | 1][] => [
    [no, 0],
    [yes, 1],
  ]),
);

/** 0 or 1 for no/yes, false/true, 0/1 or n/y in any letter case; NaN for another text. */
export function readUsualFlag(text: string): number {
  return USUAL.get(text) ?? USUAL.get(text.toLowerCase()) ?? Number.NaN;
}

/**
 * The two texts of a flag as the data spells them, from the spellings seen of 0 and of 1 (the first in code-unit
 * order, so that the order of rows does not matter). A side that was not seen takes the other's partner.
 */
export function flagTexts(zeros: Iterable<string>, ones: Iterable<string>): readonly [string, string] {
  const zero = [...zeros].sort()[0];
  const one = [...ones].sort()[0];
  if (zero !== undefined && one !== undefined) return [zero, one];
  if (zero !== undefined) return [zero, partner(zero)];
  if (one !== undefined) return [partner(one), one];
  return ['no', 'yes'];
}

function partner(text: string): string {
  const lower = text.toLowerCase();
  const pair = PAIRS.find((one) => one.includes(lower));
  const other = (pair?.[0] === lower ? pair[1] : pair?.[0]) ?? '';
  if (text === lower) return other;
  return text === text.toUpperCase() ? other.toUpperCase() : other.charAt(0).toUpperCase() + other.slice(1);
}
