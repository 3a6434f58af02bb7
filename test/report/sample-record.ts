/**
 * A realistic, invented record for the report's tests, computed so that its numbers agree with one
 * another, and variants of it. Nothing in it was measured anywhere.
 */

import cephes from 'cephes';
import { beforeYouRely } from '../../src/examine/before-you-rely.ts';
import type {
  RecordCandidate,
  RecordCoefficient,
  RecordExamination,
  RecordModel,
  RecordPrediction,
  RecordTerm,
  RecordVariable,
  StudyRecord,
} from '../../src/report/record-type.ts';
import { chiSquaredUpper, fUpper, tTwoSided, tTwoSidedQuantile } from '../../src/stats/distributions.ts';
import { leastSquares, type SmallFit } from './least-squares.ts';
import { drawData, type SampleColumn, type SampleData } from './sample-data.ts';

await (cephes as unknown as { compiled: Promise<void> }).compiled;

export interface Wish {
  readonly rows?: number;
  readonly scale?: 'natural' | 'log';
  readonly timeOrder?: boolean;
  readonly admit?: boolean;
  readonly candidates?: number;
  readonly vessels?: readonly string[];
  readonly title?: string;
  readonly predictions?: boolean;
}

type Piece = RecordModel['columns'][number]['pieces'][number];
interface Column {
  readonly name: string;
  readonly term: string | null;
  readonly unit: string | null;
  readonly pieces: Piece[];
}
interface Term {
  readonly name: string;
  readonly kind: RecordTerm['kind'];
  readonly variables: string[];
}

const CARGO: Term = { name: 'cargo', kind: 'number', variables: ['cargo'] };
const SPEED: Term = { name: 'speed³', kind: 'power', variables: ['speed'] };
const WIND: Term = { name: 'headwind', kind: 'number', variables: ['headwind'] };
const WIND2: Term = { name: 'headwind, degree 2', kind: 'polynomial', variables: ['headwind'] };
const HULL: Term = { name: 'hull_days', kind: 'number', variables: ['hull_days'] };
const AXLE: Term = { name: 'axle_load', kind: 'number', variables: ['axle_load'] };
const VESSEL: Term = { name: 'vessel', kind: 'category', variables: ['vessel'] };
const BOTH: Term = { name: 'cargo × vessel', kind: 'interaction', variables: ['cargo', 'vessel'] };

const PLANS: readonly (readonly [string, readonly Term[]])[] = [
  ['Load and speed', [CARGO, SPEED]],
  ['With wind', [CARGO, SPEED, WIND]],
  ['By vessel', [CARGO, SPEED, WIND, VESSEL, BOTH]],
  ['Curved wind', [CARGO, SPEED, WIND2, VESSEL]],
  ['Hull as well', [CARGO, SPEED, WIND, HULL, VESSEL, BOTH]],
  ['Axle loads', [CARGO, AXLE, SPEED, WIND]],
];

/** The usual record: 240 rows, six candidates, the natural scale, times declared. */
export function sampleRecord(wish: Wish = {}): StudyRecord {
  const n = wish.rows ?? 240;
  const scale = wish.scale ?? 'natural';
  const data = drawData({ n, log: scale === 'log', vessels: wish.vessels ?? ['Skerry', 'Tern', 'Holm'] });
  const y = scale === 'log' ? data.response.map(Math.log) : data.response;
  const plans = PLANS.slice(0, wish.candidates ?? PLANS.length);
  const fits = plans.map(([name, terms]) => fitCandidate(name, terms, data, y, scale));
  const admit = wish.admit ?? true;
  for (const fit of fits) {
    const refusals = [...fit.candidate.refused_because];
    if (!admit) refusals.push('The sign of headwind is positive; the study asks for negative.');
    fit.candidate.refused_because = refusals;
    fit.candidate.admitted = refusals.length === 0;
  }
  const order = [...fits].sort((a, b) => a.candidate.aicc! - b.candidate.aicc!);
  const best = order[0]!.candidate.aicc!;
  const chosen = order.find((f) => f.candidate.admitted) ?? null;
  const examined = chosen ? examine(chosen, data, y, wish.timeOrder ?? true) : null;
  const predictions = chosen && (wish.predictions ?? true) ? predict(chosen, data, scale) : [];
  const s2 = chosen ? chosen.candidate.residual_standard_error! ** 2 : 0;
  return {
    format: 'plumbrule-record/1',
    tool: { name: 'plumbrule', version: '0.1.0' },
    study: {
      title: wish.title ?? 'Fuel burned per crossing',
      question: 'How much gas oil will the spring timetable burn, and what drives it?',
      file: 'crossings.yaml',
      sha256: 'a3f1c27d5be0984412ab77ef90d35c68a1b2c3d4e5f60718293a4b5c6d7e8f90',
      settings: [
        { key: 'selection.rank_by', value: 'aicc', written: true },
        { key: 'selection.prefer_smaller_within', value: '2', written: true },
        { key: 'inference.confidence', value: '0.95', written: false },
        { key: 'predict.interval', value: '0.9', written: true },
      ],
      caution: 'The chief engineer reviews every change of the timetable.',
      confidence: 0.95,
      prediction_interval: 0.9,
      report: { formats: ['html', 'markdown'], templates: { html: null, markdown: null } },
    },
    data: {
      file: 'crossings.csv',
      sha256: '0c9d8e7f6a5b4c3d2e1f00112233445566778899aabbccddeeff001122334455',
      delimiter: ',',
      encoding: 'utf-8',
      rows_read: n + 19,
      rows_used: n,
      left_out: [
        {
          because: 'Sea trials carry no cargo',
          kind: 'left_out',
          rows: 11,
          variable: null,
          missing_any: null,
        },
        { because: 'missing headwind', kind: 'missing', rows: 8, variable: 'headwind', missing_any: 9 },
      ],
      columns_ignored: ['remarks', 'skipper'],
      bad_values: [
        { row: 118, variable: 'speed', text: '9,4', because: 'is not a number with decimal mark "."' },
      ],
      bad_value_count: 1,
      time:
        wish.timeOrder === false ? null : { variable: 'departed', first: '2023-01-04', last: '2024-02-27' },
      variables: [
        describe('fuel', 'Fuel burned', 'L', data.response, ['response']),
        ...[...data.columns.values()].map(describeColumn),
      ],
    },
    response: { variable: 'fuel', scale, unit: 'L', label: 'Fuel burned' },
    candidates: fits.map((f) => f.candidate),
    partial_f: fits.length > 1 ? [partialF(fits[0]!, fits[1]!, data.n)] : [],
    partial_f_omitted: null,
    selection: {
      rank_by: 'aicc',
      prefer_smaller_within: 2,
      significance: 0.05,
      admission: ['No variance inflation factor above 10.', 'headwind must be positive.'],
      ranking: order.map((f, i) => ({
        rank: i + 1,
        candidate: f.candidate.name,
        value: f.candidate.aicc,
        difference: f.candidate.aicc! - best,
      })),
      chosen: chosen?.candidate.name ?? null,
      because: chosen
        ? `${chosen.candidate.name} has the lowest AICc of the admitted candidates.`
        : 'No candidate passes every admission rule.',
    },
    model: chosen ? modelOf(chosen, data, scale) : null,
    examination: examined && {
      ...examined,
      before_you_rely: beforeYouRely(examined.findings, predictions),
    },
    predictions,
    prediction_total: predictions.length > 1 ? total(chosen!, data, scale, s2) : null,
    acceptance: chosen
      ? [
          {
            criterion: 'adjusted_r_squared',
            limit: 'at least 0.75',
            value: chosen.candidate.adjusted_r_squared,
            passed: chosen.candidate.adjusted_r_squared! >= 0.75,
          },
          {
            criterion: 'chosen',
            limit: 'With wind or By vessel',
            value: chosen.candidate.name,
            passed: chosen.candidate.name === 'By vessel',
          },
        ]
      : [],
    warnings: [{ about: 'candidate Axle loads', text: '`axle_load` follows `cargo` closely in these rows.' }],
  };
}

interface Fitted {
  readonly candidate: RecordCandidate;
  readonly terms: readonly Term[];
  readonly columns: readonly Column[];
  readonly x: Float64Array[];
  readonly fit: SmallFit;
}

function columnsOf(terms: readonly Term[], data: SampleData): Column[] {
  const vessels = data.columns.get('vessel')!.levels!.slice(1);
  const columns: Column[] = [{ name: 'intercept', term: null, unit: null, pieces: [] }];
  for (const t of terms) {
    const unit = data.columns.get(t.variables[0]!)!.unit;
    const variable = t.variables[0]!;
    if (t.kind === 'number')
      columns.push({ name: t.name, term: t.name, unit, pieces: [{ kind: 'variable', variable }] });
    if (t.kind === 'power')
      columns.push({
        name: t.name,
        term: t.name,
        unit: `${unit}³`,
        pieces: [{ kind: 'power', variable, to: 3 }],
      });
    if (t.kind === 'polynomial')
      columns.push(
        { name: variable, term: t.name, unit, pieces: [{ kind: 'variable', variable }] },
        { name: `${variable}²`, term: t.name, unit: '(m/s)²', pieces: [{ kind: 'power', variable, to: 2 }] },
      );
    if (t.kind === 'category')
      for (const level of vessels)
        columns.push({
          name: `vessel ${level}`,
          term: t.name,
          unit: null,
          pieces: [{ kind: 'level', variable, level }],
        });
    if (t.kind === 'interaction')
      for (const level of vessels)
        columns.push({
          name: `cargo × vessel ${level}`,
          term: t.name,
          unit: 't',
          pieces: [
            { kind: 'variable', variable: 'cargo' },
            { kind: 'level', variable: 'vessel', level },
          ],
        });
  }
  return columns;
}

function pieceAt(piece: Piece, x: number | string): number {
  if (piece.kind === 'level') return x === piece.level ? 1 : 0;
  return piece.kind === 'power' ? (x as number) ** piece.to! : (x as number);
}

function cell(column: SampleColumn, i: number): number | string {
  return column.numbers ? column.numbers[i]! : column.texts![i]!;
}

function fitCandidate(
  name: string,
  terms: readonly Term[],
  data: SampleData,
  y: Float64Array,
  scale: string,
): Fitted {
  const columns = columnsOf(terms, data);
  const n = data.n;
  const x = columns.map((c) =>
    Float64Array.from({ length: n }, (_, i) =>
      c.pieces.reduce(
        (product, piece) => product * pieceAt(piece, cell(data.columns.get(piece.variable)!, i)),
        1,
      ),
    ),
  );
  const fit = leastSquares(x, y);
  const p = columns.length;
  const df = n - p;
  const s2 = fit.rss / df;
  const quantile = tTwoSidedQuantile(0.05, df);
  const coefficients: RecordCoefficient[] = columns.map((c, j) => {
    const se = Math.sqrt(s2 * fit.inverse[j]![j]!);
    const b = fit.b[j]!;
    const mean = x[j]!.reduce((s, v) => s + v, 0) / n;
    const spread = x[j]!.reduce((s, v) => s + (v - mean) ** 2, 0);
    return {
      name: c.name,
      term: c.term ?? 'intercept',
      estimate: b,
      standard_error: se,
      t: b / se,
      p_value: tTwoSided(b / se, df),
      lower: b - quantile * se,
      upper: b + quantile * se,
      vif: j === 0 ? null : spread * fit.inverse[j]![j]!,
    };
  });
  const jacobian = scale === 'log' ? -y.reduce((s, v) => s + v, 0) : 0;
  const ll = (-n / 2) * (Math.log(2 * Math.PI) + Math.log(fit.rss / n) + 1) + jacobian;
  const k = p + 1;
  const f = (fit.tss - fit.rss) / (p - 1) / s2;
  const largestVif = Math.max(...coefficients.map((c) => c.vif ?? 0));
  return {
    terms,
    columns,
    x,
    fit,
    candidate: {
      name,
      terms: terms.map((t) => t.name),
      scale,
      intercept: true,
      rows: n,
      coefficient_count: p,
      r_squared: 1 - fit.rss / fit.tss,
      adjusted_r_squared: 1 - s2 / (fit.tss / (n - 1)),
      predicted_r_squared: null,
      residual_standard_error: Math.sqrt(s2),
      residual_sum_of_squares: fit.rss,
      degrees_of_freedom: df,
      log_likelihood: ll,
      aic: -2 * ll + 2 * k,
      aicc: -2 * ll + 2 * k + (2 * k * (k + 1)) / (n - k - 1),
      bic: -2 * ll + k * Math.log(n),
      mallows_cp: null,
      press: null,
      overall_f: { statistic: f, df1: p - 1, df2: df, p_value: fUpper(f, p - 1, df) },
      largest_vif: largestVif,
      condition_number: 30.5,
      coefficients,
      dropped: [],
      arithmetic: 'extended',
      admitted: true,
      refused_because:
        name === 'Axle loads'
          ? [
              `The variance inflation factor of axle_load is ${largestVif.toFixed(0)}; the study allows at most 10.`,
            ]
          : [],
    },
  };
}

function partialF(small: Fitted, large: Fitted, n: number): StudyRecord['partial_f'][number] {
  const df1 = large.columns.length - small.columns.length;
  const df2 = n - large.columns.length;
  const statistic = (small.fit.rss - large.fit.rss) / df1 / (large.fit.rss / df2);
  return {
    smaller: small.candidate.name,
    larger: large.candidate.name,
    statistic,
    df1,
    df2,
    p_value: fUpper(statistic, df1, df2),
    decided: false,
  };
}

/** Change of the linear predictor when `variable` goes from one value to another, as a vector over columns. */
function step(
  f: Fitted,
  variable: string,
  from: number | string,
  to: number | string,
  alone: boolean,
): number[] {
  return f.columns.map((c, j) => {
    const own = c.pieces.filter((piece) => piece.variable === variable);
    if (own.length === 0 || (alone && own.length < c.pieces.length)) return 0;
    const at = (x: number | string): number => own.reduce((product, piece) => product * pieceAt(piece, x), 1);
    const others = c.pieces.filter((piece) => piece.variable !== variable);
    const rest = others.length === 0 ? 1 : otherMean(f, j, own);
    return (at(to) - at(from)) * rest;
  });
}

/** Mean of the rest of an interaction column: found from the level's own column, enough for this fixture. */
function otherMean(f: Fitted, j: number, own: readonly Piece[]): number {
  const rest = f.columns[j]!.pieces.find((piece) => piece.variable !== own[0]!.variable)!;
  const k = f.columns.findIndex(
    (c) => c.pieces.length === 1 && JSON.stringify(c.pieces[0]) === JSON.stringify(rest),
  );
  return f.x[k]!.reduce((s, v) => s + v, 0) / f.x[k]!.length;
}

interface Estimate {
  estimate: number;
  lower: number;
  upper: number;
}

function contrast(f: Fitted, vector: readonly number[], p = 0.05, extra = 0): Estimate {
  const df = f.candidate.degrees_of_freedom;
  const s2 = f.candidate.residual_standard_error! ** 2;
  const estimate = vector.reduce((s, v, j) => s + v * f.fit.b[j]!, 0);
  const variance = vector.reduce(
    (s, v, i) => s + v * vector.reduce((q, w, j) => q + f.fit.inverse[i]![j]! * w, 0),
    0,
  );
  const half = tTwoSidedQuantile(p, df) * Math.sqrt(Math.max(0, s2 * (variance + extra)));
  return { estimate, lower: estimate - half, upper: estimate + half };
}

function quantile(sorted: readonly number[], q: number): number {
  const h = (sorted.length - 1) * q;
  const low = Math.floor(h);
  return sorted[low]! + (h - low) * ((sorted[low + 1] ?? sorted[low]!) - sorted[low]!);
}

function describe(
  name: string,
  label: string,
  unit: string | null,
  x: Float64Array,
  used: string[],
): RecordVariable {
  const sorted = [...x].sort((a, b) => a - b);
  const mean = sorted.reduce((s, v) => s + v, 0) / sorted.length;
  return {
    name,
    label,
    unit,
    type: 'number',
    derived_from: null,
    used_as: used,
    missing: name === 'headwind' ? 9 : 0,
    smallest: sorted[0]!,
    lower_quartile: quantile(sorted, 0.25),
    median: quantile(sorted, 0.5),
    mean,
    upper_quartile: quantile(sorted, 0.75),
    largest: sorted.at(-1)!,
    standard_deviation: Math.sqrt(sorted.reduce((s, v) => s + (v - mean) ** 2, 0) / (sorted.length - 1)),
    levels: null,
  };
}

function describeColumn(c: SampleColumn): RecordVariable {
  if (c.numbers) return describe(c.name, c.label, c.unit, c.numbers, ['predictor']);
  return {
    name: c.name,
    label: c.label,
    unit: null,
    type: 'category',
    derived_from: null,
    used_as: ['predictor'],
    missing: 0,
    smallest: null,
    lower_quartile: null,
    median: null,
    mean: null,
    upper_quartile: null,
    largest: null,
    standard_deviation: null,
    levels: c.levels!.map((level) => ({ level, rows: c.texts!.filter((t) => t === level).length })),
  };
}

function termOf(t: Term, f: Fitted, data: SampleData): RecordTerm {
  const columns = f.columns.filter((c) => c.term === t.name).map((c) => c.name);
  const variable = t.variables[0]!;
  const column = data.columns.get(variable)!;
  const sorted = column.numbers ? [...column.numbers].sort((a, b) => a - b) : [];
  const steps =
    t.kind === 'interaction'
      ? []
      : t.kind === 'category'
        ? column.levels!.slice(1).map((level) => ({
            from: column.levels![0]!,
            to: level,
            from_value: null,
            to_value: null,
            ...contrast(f, step(f, variable, column.levels![0]!, level, false)),
          }))
        : [
            {
              from: String(quantile(sorted, 0.25)),
              to: String(quantile(sorted, 0.75)),
              from_value: quantile(sorted, 0.25),
              to_value: quantile(sorted, 0.75),
              ...contrast(f, step(f, variable, quantile(sorted, 0.25), quantile(sorted, 0.75), false)),
            },
          ];
  const xs = sorted.length
    ? Array.from({ length: 61 }, (_, i) => sorted[0]! + ((sorted.at(-1)! - sorted[0]!) * i) / 60)
    : [];
  const mean = sorted.reduce((s, v) => s + v, 0) / sorted.length;
  const curve = xs.map((x) => contrast(f, step(f, variable, mean, x, true)));
  const slopes =
    t.kind !== 'interaction'
      ? []
      : data.columns.get('vessel')!.levels!.map((level) => ({
          at: `vessel ${level}`,
          of: 'cargo',
          per: 't',
          ...contrast(
            f,
            f.columns.map((c) => (c.name === 'cargo' || c.name === `cargo × vessel ${level}` ? 1 : 0)),
          ),
        }));
  const df2 = f.candidate.degrees_of_freedom;
  return {
    name: t.name,
    kind: t.kind,
    variables: [...t.variables],
    columns,
    joint_f: { statistic: 12.5, df1: columns.length, df2, p_value: fUpper(12.5, columns.length, df2) },
    generalised_vif: 1.4,
    generalised_vif_per_column: 1.18,
    typical_steps: steps,
    curve:
      t.kind === 'category' || t.kind === 'interaction'
        ? null
        : {
            variable,
            x: xs,
            y: curve.map((c) => c.estimate),
            lower: curve.map((c) => c.lower),
            upper: curve.map((c) => c.upper),
          },
    slopes,
    slopes_omitted: 0,
  };
}

function modelOf(f: Fitted, data: SampleData, scale: string): RecordModel {
  return {
    candidate: f.candidate.name,
    response: { variable: 'fuel', scale, lambda: null, unit: 'L', label: 'Fuel burned' },
    intercept: true,
    rows: data.n,
    degrees_of_freedom: f.candidate.degrees_of_freedom,
    residual_standard_error: f.candidate.residual_standard_error,
    response_mean: data.response.reduce((s, v) => s + v, 0) / data.n,
    columns: f.columns.map((c, j) => ({
      ...c,
      estimate: f.fit.b[j]!,
      mean: f.x[j]!.reduce((s, v) => s + v, 0) / data.n,
    })),
    inverse: f.fit.inverse,
    smearing: scale === 'natural' ? null : [-0.1, 0, 0.1],
    largest_leverage: Math.max(...f.fit.leverage),
    terms: f.terms.map((t) => termOf(t, f, data)),
  };
}

function examine(f: Fitted, data: SampleData, y: Float64Array, timed: boolean): RecordExamination {
  const s = f.candidate.residual_standard_error!;
  const p = f.columns.length;
  const n = data.n;
  const e = f.fit.residuals;
  const h = f.fit.leverage;
  const z = e.map((v, i) => v / (s * Math.sqrt(1 - h[i]!)));
  const cook = e.map((v, i) => (v * v * h[i]!) / (p * s * s * (1 - h[i]!) ** 2));
  const all = Array.from({ length: n }, (_, i) => i);
  const kept = n > 2000 ? all.filter((i) => i % 2 === 0 || Math.abs(z[i]!) > 3) : all;
  const top = [...all].sort((a, b) => cook[b]! - cook[a]!).slice(0, 5);
  const id = (i: number): string => `C${String(i + 1).padStart(4, '0')}`;
  const square = e.map((v) => v * v);
  const aux = leastSquares(f.x, square);
  const lm = n * (1 - aux.rss / aux.tss);
  const dw = all.slice(1).reduce((sum, i) => sum + (e[i]! - e[i - 1]!) ** 2, 0) / f.fit.rss;
  return {
    findings: [
      {
        name: 'equal_spread',
        question: 'Is the spread even?',
        statistic: lm,
        statistic_name: 'Koenker’s form of the Breusch–Pagan statistic',
        df: [p - 1],
        p_value: chiSquaredUpper(lm, p - 1),
        mark: null,
        verdict:
          'The spread of the residuals changes with the predictors: an even spread would give a statistic this large seldom.',
        concern: chiSquaredUpper(lm, p - 1) < 0.05 ? 2 : 0,
        advice: 'Prefer standard errors that allow for an uneven spread, or a log scale.',
      },
      ...(timed
        ? [
            {
              name: 'independence',
              question: 'Do neighbours in time resemble each other?',
              statistic: dw,
              statistic_name: 'Durbin–Watson statistic',
              df: [],
              p_value: 0.41,
              mark: '2 where neighbours are unrelated',
              verdict: 'Neighbouring residuals are no more alike than chance would make them.',
              concern: 0 as const,
              advice: null,
            },
          ]
        : []),
      {
        name: 'influence',
        question: 'Does one row carry the result?',
        statistic: cook[top[0]!]!,
        statistic_name: 'largest Cook’s distance',
        df: [],
        p_value: null,
        mark: '1',
        verdict: `The largest Cook’s distance is ${cook[top[0]!]!.toFixed(2)} (row ${top[0]! + 2}, ${id(top[0]!)}), below the customary mark of 1.`,
        concern: 1,
        advice: 'Look at that row’s source.',
      },
    ],
    influential_rows: top.map((i) => ({
      row: i + 2,
      id: id(i),
      fitted: f.fit.fitted[i]!,
      observed: y[i]!,
      standardised_residual: z[i]!,
      leverage: h[i]!,
      cooks_distance: cook[i]!,
    })),
    counts: {
      rows: n,
      beyond_2: all.filter((i) => Math.abs(z[i]!) > 2).length,
      beyond_3: all.filter((i) => Math.abs(z[i]!) > 3).length,
      leverage_beyond_2p_over_n: all.filter((i) => h[i]! > (2 * p) / n).length,
      leverage_beyond_3p_over_n: all.filter((i) => h[i]! > (3 * p) / n).length,
    },
    points: {
      thinned: kept.length < n,
      row: kept.map((i) => i + 2),
      id: kept.map(id),
      fitted: kept.map((i) => f.fit.fitted[i]!),
      observed: kept.map((i) => y[i]!),
      residual: kept.map((i) => e[i]!),
      standardised_residual: kept.map((i) => z[i]!),
      leverage: kept.map((i) => h[i]!),
      cooks_distance: kept.map((i) => cook[i]!),
      time_position: timed ? kept.map((i) => i + 1) : null,
      values: [...new Set(f.terms.flatMap((t) => t.variables))].map((variable) => {
        const c = data.columns.get(variable)!;
        return {
          variable,
          numbers: c.numbers ? kept.map((i) => c.numbers![i]!) : null,
          texts: c.texts ? kept.map((i) => c.texts![i]!) : null,
        };
      }),
    },
  };
}

const ASKED = [
  { label: 'Loaded, slow', cargo: 80, speed: 9, headwind: 4, hull_days: 60, vessel: 1 },
  { label: 'Light, fast', cargo: 30, speed: 12, headwind: 2, hull_days: 20, vessel: 0 },
  { label: 'Full in a gale', cargo: 160, speed: 10, headwind: 18, hull_days: 90, vessel: 2 },
] as const;

function askedVector(f: Fitted, data: SampleData, asked: (typeof ASKED)[number]): number[] {
  const level = data.columns.get('vessel')!.levels!;
  const at: Record<string, number | string> = {
    ...asked,
    axle_load: asked.cargo / 6,
    vessel: level[asked.vessel % level.length]!,
  };
  return f.columns.map((c) =>
    c.pieces.reduce((product, piece) => product * pieceAt(piece, at[piece.variable]!), 1),
  );
}

function predict(f: Fitted, data: SampleData, scale: string): RecordPrediction[] {
  const back = (v: number): number => (scale === 'log' ? Math.exp(v) : v);
  return ASKED.map((asked) => {
    const vector = askedVector(f, data, asked);
    const mean = contrast(f, vector, 0.1);
    const fresh = contrast(f, vector, 0.1, 1);
    const variables = [...new Set(f.terms.flatMap((t) => t.variables))];
    const level = data.columns.get('vessel')!.levels!;
    return {
      label: asked.label,
      values: variables.map((variable) => ({
        variable,
        value:
          variable === 'vessel'
            ? level[asked.vessel % level.length]!
            : variable === 'axle_load'
              ? asked.cargo / 6
              : (asked as unknown as Record<string, number>)[variable]!,
      })),
      estimate: back(mean.estimate),
      lower: back(fresh.lower),
      upper: back(fresh.upper),
      mean_lower: back(mean.lower),
      mean_upper: back(mean.upper),
      mean: scale === 'natural' ? null : back(mean.estimate) * 1.003,
      leverage: vector.reduce(
        (s, v, i) => s + v * vector.reduce((q, w, j) => q + f.fit.inverse[i]![j]! * w, 0),
        0,
      ),
      outside:
        asked.label === 'Full in a gale'
          ? [
              'cargo 160 t is above the largest in the data, 140 t.',
              'headwind 18 m/s is above the largest in the data, 13.3 m/s.',
            ]
          : [],
    };
  });
}

function total(f: Fitted, data: SampleData, scale: string, s2: number): StudyRecord['prediction_total'] {
  const back = (v: number): number => (scale === 'log' ? Math.exp(v) : v);
  if (scale === 'log') {
    const sum = ASKED.reduce((s, asked) => s + back(contrast(f, askedVector(f, data, asked)).estimate), 0);
    return { rows: ASKED.length, estimate: sum, lower: sum * 0.9, upper: sum * 1.1, mean: sum * 1.003 };
  }
  const vectors = ASKED.map((asked) => askedVector(f, data, asked));
  const sum = vectors[0]!.map((_, j) => vectors.reduce((s, v) => s + v[j]!, 0));
  return { rows: ASKED.length, ...contrast(f, sum, 0.1, s2 > 0 ? ASKED.length : 0), mean: null };
}

/** Names full of markup for HTML and Markdown. */
export const NASTY = ['<script>alert(1)</script>', 'a|b*_`[x](y)', '"quoted" & <b>bold</b>'] as const;

/** Each variant by name, for tests that hold for every record. */
export const VARIANTS: readonly (readonly [string, Wish])[] = [
  ['usual', {}],
  ['log scale', { scale: 'log' }],
  ['none admitted', { admit: false }],
  ['no time order', { timeOrder: false }],
  ['3,000 rows', { rows: 3000 }],
  ['markup in names', { vessels: NASTY, title: NASTY[0] }],
  ['single candidate', { candidates: 1 }],
  ['many levels', { vessels: Array.from({ length: 24 }, (_, i) => `Vessel no. ${i + 1}`) }],
  ['no predictions', { predictions: false }],
];
