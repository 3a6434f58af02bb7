/** Words longer than this are compared for equality only: nobody mistypes by a third of that. */
const LONGEST_COMPARED = 100;

/**
 * The name in `among` that `word` was most likely meant to be, or null where none is near. Nearness is the
 * number of letters to insert, delete, replace or swap with their neighbour, letter case apart; at most a
 * third of the longer word's letters (one for words of three to five) may differ. Of equally near names the
 * one that also agrees in letter case comes first, then the one that stands first in `among`. Where none is
 * near, the shortest name that begins with the word, if that has three letters or more: "precip" of
 * "precipitation", also "Beak_Length" of "Beak Length (mm)"; else one of whose parts it is one: "vif" of
 * "largest_vif"; else the longest that begins the word: "logarithm" for "log".
 */
export function nearest(word: string, among: Iterable<string>): string | null {
  const lower = word.toLowerCase();
  let best: string | null = null;
  let bestDistance = Number.POSITIVE_INFINITY;
  let bestExact = Number.POSITIVE_INFINITY;
  for (const name of among) {
    const distance = editDistance(lower, name.toLowerCase());
    if (distance > bestDistance || distance > allowance(word, name)) continue;
    const exact = editDistance(word, name);
    if (distance === bestDistance && exact >= bestExact) continue;
    best = name;
    bestDistance = distance;
    bestExact = exact;
  }
  return best ?? partly(word, [...among]);
}

/** A name that begins with the word, has it as a part, or begins it. */
function partly(word: string, among: readonly string[]): string | null {
  const letters = bare(word);
  if (letters.length < 3 || word.length > LONGEST_COMPARED) return null;
  const byLength = [...among].sort((a, b) => a.length - b.length);
  return (
    byLength.find((name) => bare(name).startsWith(letters)) ??
    byLength.find((name) =>
      name
        .toLowerCase()
        .split(/[^\p{L}\p{N}]+/u)
        .includes(word.toLowerCase()),
    ) ??
    byLength.findLast((name) => bare(name).length >= 3 && letters.startsWith(bare(name))) ??
    null
  );
}

/** Letter case and the marks between words apart. */
function bare(text: string): string {
  return text.toLowerCase().replace(/[\s_.-]/g, '');
}

function allowance(word: string, name: string): number {
  const length = Math.max(word.length, name.length);
  return length < 3 ? 0 : Math.max(1, Math.floor(length / 3));
}

/**
 * Damerau–Levenshtein distance in its optimal-string-alignment form (Damerau 1964; Wagner & Fischer 1974 for
 * the recurrence): no stretch of letters is edited twice. Infinity where the words are too long to compare.
 */
function editDistance(a: string, b: string): number {
  if (a === b) return 0;
  if (a.length > LONGEST_COMPARED || b.length > LONGEST_COMPARED) return Number.POSITIVE_INFINITY;
  const width = b.length + 1;
  let beforeLast = new Uint16Array(width);
  let last = Uint16Array.from({ length: width }, (_, j) => j);
  for (let i = 1; i <= a.length; i++) {
    const current = new Uint16Array(width);
    current[0] = i;
    for (let j = 1; j <= b.length; j++) {
      const same = a[i - 1] === b[j - 1] ? 0 : 1;
      let distance = Math.min(last[j]! + 1, current[j - 1]! + 1, last[j - 1]! + same);
      if (i > 1 && j > 1 && a[i - 1] === b[j - 2] && a[i - 2] === b[j - 1]) {
        distance = Math.min(distance, beforeLast[j - 2]! + 1);
      }
      current[j] = distance;
    }
    beforeLast = last;
    last = current;
  }
  return last[b.length]!;
}
