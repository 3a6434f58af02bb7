/** Flow and pressure of some wells (invented numbers), as two states of one file that a study repeats over. */
export interface Well {
  readonly name: string;
  readonly rows: number;
  /** What a step of the second predictor adds to the response. */
  readonly second?: number;
  /** What the last rows have more for each step of the first predictor. */
  readonly turn?: number;
}

/** The study of the wells; more keys at its end. */
export function wellsStudy(more = ''): string {
  return `plumbrule: 1
title: Lift of the wells
data:
  file: wells.csv
  row_id: reading
  variables:
    reading: { type: identifier }
    well: { type: text }
    lift: { type: number, unit: m }
    flow: { type: number, unit: L/s }
    pressure: { type: number, unit: bar }
response: lift
repeat_for: well
candidates:
  - { name: Flow, terms: [flow] }
  - { name: Flow and pressure, terms: [flow, pressure] }
selection: { rank_by: aicc }
${more}`;
}

/** Rows of lift = 3 + 2 flow and a little; a well of 3 rows or fewer cannot be fitted. */
export function wellsData(wells: readonly Well[]): string {
  const lines = wells.flatMap(({ name, rows, second = 0, turn = 0 }) =>
    Array.from({ length: rows }, (_, i) => {
      const [flow, pressure] = [(i * 5) % 17, (i * 7) % 5];
      const little = ((i * i * 7 + 3 * i) % 11) / 10;
      const lift = 3 + 2 * flow + second * pressure + little + (i >= 20 ? turn * flow : 0);
      return `${name}-${i},${name},${lift.toFixed(3)},${flow},${pressure}`;
    }),
  );
  return `reading,well,lift,flow,pressure\n${lines.join('\n')}\n`;
}

/**
 * Later, wells have ten new rows each: Alder as before, Birch with another choice, Cedar and Gorse with a larger and a
 * smaller move; Dogwood can no longer be fitted, Elm is gone, Fir is new.
 */
export const EARLIER: readonly Well[] = [
  { name: 'Alder', rows: 20 },
  { name: 'Birch', rows: 20 },
  { name: 'Cedar', rows: 20 },
  { name: 'Dogwood', rows: 20 },
  { name: 'Elm', rows: 20 },
  { name: 'Gorse', rows: 20 },
];
export const LATER: readonly Well[] = [
  { name: 'Alder', rows: 30 },
  { name: 'Birch', rows: 30, second: 0.4 },
  { name: 'Cedar', rows: 30, turn: 0.5 },
  { name: 'Dogwood', rows: 3 },
  { name: 'Fir', rows: 20 },
  { name: 'Gorse', rows: 30, turn: 0.1 },
];
