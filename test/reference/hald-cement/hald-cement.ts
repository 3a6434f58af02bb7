/** Hald 1952; Draper & Smith. See README.md beside this file. */
export const HALD = {
  columns: {
    x1: [7, 1, 11, 11, 7, 11, 3, 1, 2, 21, 1, 11, 10],
    x2: [26, 29, 56, 31, 52, 55, 71, 31, 54, 47, 40, 66, 68],
    x3: [6, 15, 8, 8, 6, 9, 17, 22, 18, 4, 23, 9, 8],
    x4: [60, 52, 20, 47, 33, 22, 6, 44, 22, 26, 34, 12, 12],
  },
  y: [78.5, 74.3, 104.3, 87.6, 95.9, 109.2, 102.7, 72.5, 93.1, 115.9, 83.8, 113.3, 109.4],
} as const;

export const FULL_MODEL = {
  estimates: [62.40537, 1.5511, 0.51017, 0.10191, -0.14406],
  standardErrors: [70.07096, 0.74477, 0.72379, 0.75471, 0.70905],
  s: 2.44601,
  rSquared: 0.982376,
  f: 111.479,
  rss: 47.86364,
  vif: [38.496, 254.423, 46.868, 282.513],
} as const;

export const SUBSETS = [
  { terms: ['x1', 'x2'], mallowsCp: 2.67824, shortAic: 25.41999, press: 93.8825 },
  { terms: ['x1', 'x2', 'x4'], mallowsCp: 3.01823, shortAic: 24.97388, press: 85.3511 },
  { terms: ['x1', 'x2', 'x3'], mallowsCp: 3.04128, shortAic: 25.0112, press: 90.0 },
  { terms: ['x1', 'x4'], mallowsCp: 5.49585, shortAic: 28.7417, press: 121.2244 },
  { terms: ['x1', 'x2', 'x3', 'x4'], mallowsCp: 5, shortAic: 26.94429, press: 110.3466 },
] as const;

export const PUBLISHED_SHARES = [
  { terms: ['x2'], rSquared: 66.6, adjusted: 63.6 },
  { terms: ['x4'], rSquared: 67.5, adjusted: 64.5 },
  { terms: ['x2', 'x4'], rSquared: 68.0, adjusted: 61.6 },
] as const;
