/** A stream of random numbers that is the same on every machine for the same seed. */
export interface Random {
  /** The next number of 53 bits in [0, 1). */
  readonly next: () => number;
  /** The next whole number in 0 … n − 1, n ≤ 2³¹. */
  readonly below: (n: number) => number;
}

/**
 * The generator xoshiro128** (Blackman & Vigna, ACM Transactions on Mathematical Software 47, 2021): shifts 9, rotations 7
 * and 11, multipliers 5 and 9, period 2¹²⁸ − 1. Its four words are filled from seed and stream by steps of the golden ratio,
 * each mixed by the finaliser of MurmurHash3 (Appleby 2011). Different streams of one seed do not repeat each other.
 * @param seed a whole number in 0 … 2³² − 1
 */
export function randomFrom(seed: number, stream = 0): Random {
  let walk = (seed ^ mixed(stream)) | 0;
  const word = () => {
    walk = (walk + 0x9e3779b9) | 0;
    return mixed(walk);
  };
  // Four equal words cannot come out, so the forbidden state of all zeros cannot either.
  const bits = xoshiro(word(), word(), word(), word());
  const next = () => {
    const high = bits() >>> 5;
    return (high * 67108864 + (bits() >>> 6)) / 9007199254740992;
  };
  return { next, below: (n) => Math.floor(next() * n) };
}

/** The generator itself: 32 bits at a time from four words of state, not all zero. */
export function xoshiro(a: number, b: number, c: number, d: number): () => number {
  let s0 = a | 0;
  let s1 = b | 0;
  let s2 = c | 0;
  let s3 = d | 0;
  return () => {
    const result = Math.imul(rotated(Math.imul(s1, 5), 7), 9) >>> 0;
    const t = s1 << 9;
    s2 ^= s0;
    s3 ^= s1;
    s1 ^= s2;
    s0 ^= s3;
    s2 ^= t;
    s3 = rotated(s3, 11);
    return result;
  };
}

function rotated(x: number, by: number): number {
  return (x << by) | (x >>> (32 - by));
}

function mixed(word: number): number {
  let h = word | 0;
  h = Math.imul(h ^ (h >>> 16), 0x85ebca6b);
  h = Math.imul(h ^ (h >>> 13), 0xc2b2ae35);
  return h ^ (h >>> 16);
}
