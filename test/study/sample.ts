import type { Problem } from '../../src/problem.ts';
import { parseStudy } from '../../src/study/parse-study.ts';
import type { Study } from '../../src/study/study.ts';

/** A study that uses every key at least once and has nothing wrong with it. The crossings are invented. */
export const SOUND = `plumbrule: 1
title: Fuel burned per crossing
question: How much gas oil will the spring timetable burn?
data:
  file: crossings.csv
  format: { delimiter: ",", decimal_mark: ".", encoding: utf-8 }
  missing: ["", "n/a"]
  row_id: crossing
  time: departed
  variables:
    crossing: { type: identifier }
    departed: { type: date, pattern: DD.MM.YYYY }
    fuel: { type: number, unit: L, at_least: 50, at_most: 2500, label: Fuel burned }
    cargo: { type: number, unit: t, at_least: 0, missing: [-999] }
    speed: { type: number, unit: kn, column: Speed (kn) }
    headwind: { type: number, unit: m/s }
    hull_days: { type: integer, unit: d }
    vessel: { type: category, levels: [Skerry, Tern, Holm], baseline: Tern }
    deck: { type: category, levels: [1, 2] }
    night: { type: flag, values: [day, night] }
    status: { type: category, levels: [revenue, trial] }
    remark: { type: text }
    share: { type: number }
  on_bad_value: leave_out_row
derive:
  speed_cubed: { expression: speed ^ 3, unit: kn³, label: Speed cubed }
  work: { expression: speed_cubed * cargo }
leave_out:
  - where: status == "trial"
    because: Sea trials carry no cargo
response: { variable: fuel, scale: natural }
weights: share
candidates:
  - name: Load and speed
    terms: [cargo, speed_cubed]
  - name: By vessel
    terms: [cargo, work, vessel, night, { interaction: [cargo, vessel] }]
  - name: Curved
    terms:
      - { polynomial: headwind, degree: 2 }
      - { power: speed, to: 3 }
      - { bend: cargo, at: 40, side: below }
      - { spline: hull_days, knots: [10, 60, 120] }
    scale: { box_cox: 0.5 }
    intercept: false
selection:
  rank_by: bic
  prefer_smaller_within: 2
  significance: 0.01
  admit:
    vif: { at_most: 10 }
    p_value: { at_most: 0.1 }
    signs: { cargo: positive }
    rows_per_coefficient: { at_least: 10 }
    adjusted_r_squared: { at_least: 0.5 }
inference:
  confidence: 0.9
  dependent_columns: stop
  standard_errors: { clustered_by: vessel }
  hypotheses:
    - name: Tern carries as cheaply
      combination: { "cargo × vessel Tern": 1 }
    - name: Ships alike
      all_of:
        - { combination: { vessel Skerry: 1, vessel Holm: -1 }, equals: 2.5 }
        - { combination: { vessel Holm: 1 } }
  level_comparisons: tukey_kramer
  simultaneous: scheffe
  slopes_at: { headwind: [5, -5, 0, 5] }
examination:
  lags: 3
  split_at: { variable: departed, value: 2024-03-01 }
  bootstrap: { repetitions: 499, seed: 7, by: blocks, block_length: 12 }
predict:
  rows:
    - { label: "Loaded, slow", cargo: 80, speed: 9, headwind: 4, hull_days: 30, vessel: Tern, night: day }
  file: timetable.csv
  interval: 0.8
  total: true
acceptance:
  adjusted_r_squared: { at_least: 0.75 }
  chosen: [By vessel]
report:
  formats: [html]
  templates: { html: own.hbs }
  caution: The harbour master reviews this.
`;

/** The least that a study can be. */
export const SMALL = `plumbrule: 1
title: Small
data:
  file: a.csv
  variables:
    y: { type: number }
    x: { type: number }
    k: { type: category, levels: [low, high] }
    d: { type: date }
    f: { type: flag }
    t: { type: text }
    i: { type: identifier }
response: y
candidates:
  - name: A
    terms: [x]
`;

export interface Outcome {
  readonly study: Study | null;
  readonly problems: readonly Problem[];
  /** "line:column+length code" of each problem. */
  readonly places: readonly string[];
}

export function read(text: string): Outcome {
  const problems: Problem[] = [];
  const study = parseStudy(text, 'studies/ferry.yaml', '/somewhere/studies', 'abc', (problem) =>
    problems.push(problem),
  );
  return { study, problems, places: problems.map(placeText) };
}

export function placeText({ place, code }: Problem): string {
  return place.kind === 'source'
    ? `${place.line}:${place.column}+${place.length} ${code}`
    : `${place.kind} ${code}`;
}

/** Replaces text that must be there exactly once. */
export function changed(text: string, from: string, to: string): string {
  if (text.split(from).length !== 2) throw new Error(`"${from}" is not there exactly once.`);
  return text.replace(from, () => to);
}

/**
 * Takes «marks» out of a text and gives the places that they stood around, as `placeText` shows them without code.
 * They say independently of the reader where a problem must point.
 */
export function marked(text: string): { readonly text: string; readonly places: readonly string[] } {
  const places: string[] = [];
  const clean = text.split('\n').map((line, index) => {
    let rest = line;
    for (let open = rest.indexOf('«'); open >= 0; open = rest.indexOf('«')) {
      const close = rest.indexOf('»');
      places.push(`${index + 1}:${open + 1}+${close - open - 1}`);
      rest = rest.slice(0, open) + rest.slice(open + 1, close) + rest.slice(close + 1);
    }
    return rest;
  });
  return { text: clean.join('\n'), places };
}
