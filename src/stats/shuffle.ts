import type { Random } from './random.ts';

/** Puts the values into a random order, in place: every order is as likely as any other (Fisher & Yates 1938; Durstenfeld 1964). */
export function shuffle(values: Int32Array, random: Random): Int32Array {
  for (let i = values.length - 1; i > 0; i--) {
    const j = random.below(i + 1);
    const value = values[i]!;
    values[i] = values[j]!;
    values[j] = value;
  }
  return values;
}
