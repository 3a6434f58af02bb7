import { predictionsChart } from '../chart/predictions.ts';
import { count, NONE, percent, rangeWithUnit, rounded, value, withUnit } from '../numbers.ts';
import type { RecordPrediction, StudyRecord } from '../record-type.ts';
import type { PredictionView, PredictsView } from '../view.ts';
import { type Lexicon, stopped, unitOf } from '../words/lexicon.ts';
import { predictionNotes, predictionRounding } from '../words/prediction.ts';

/** More rows than this are left to the machine-readable table. */
const ROWS = 200;

export function predictsView(record: StudyRecord, lexicon: Lexicon): PredictsView | null {
  const { predictions, prediction_total: total } = record;
  if (record.model === null || predictions.length === 0) return null;
  const { unit } = lexicon.response;
  const drawn = record.examination?.bootstrap?.predictions ?? [];
  const more = predictions.length - ROWS;
  return {
    rows: predictions.slice(0, ROWS).map((p, i) => predictionView(lexicon, p, drawn[i])),
    chart: predictionsChart(lexicon, predictions),
    total:
      total === null
        ? null
        : {
            rows: count(total.rows),
            estimate: withUnit(rounded(total.estimate, predictionRounding(total)), unit),
            interval: rangeWithUnit(total.lower, total.upper, predictionRounding(total), unit),
            mean: total.mean === null ? null : withUnit(rounded(total.mean, predictionRounding(total)), unit),
          },
    notes: [
      ...predictionNotes(lexicon),
      ...(more > 0 ? [`${count(more)} further rows are in the record.`] : []),
    ],
    confidence: percent(record.study.prediction_interval),
    hasMean: predictions.some((p) => p.mean !== null),
    hasDrawn: drawn.length > 0,
  };
}

type Drawn = NonNullable<NonNullable<StudyRecord['examination']>['bootstrap']>['predictions'][number];

function predictionView(lexicon: Lexicon, p: RecordPrediction, drawn: Drawn | undefined): PredictionView {
  const rounding = predictionRounding(p);
  const { unit } = lexicon.response;
  return {
    label: p.label,
    values: p.values.map((v) => `${v.variable}\u00a0${valueText(lexicon, v)}`).join(', '),
    estimate: withUnit(rounded(p.estimate, rounding), unit),
    mean: p.mean === null ? NONE : withUnit(rounded(p.mean, rounding), unit),
    meanInterval: rangeWithUnit(p.mean_lower, p.mean_upper, rounding, unit),
    newInterval: rangeWithUnit(p.lower, p.upper, rounding, unit),
    drawnInterval: drawn === undefined ? NONE : rangeWithUnit(drawn.lower, drawn.upper, rounding, unit),
    inside: p.outside.length === 0,
    place: p.outside.length === 0 ? 'inside the data' : p.outside.map(stopped).join(' '),
  };
}

function valueText(lexicon: Lexicon, { variable, value: v }: RecordPrediction['values'][number]): string {
  if (typeof v === 'boolean') {
    // A declared flag has its own two values ("planned", "urgent"); a derived one has none.
    const values = lexicon.variables.get(variable)?.levels ?? [];
    return (values.length === 2 ? values[v ? 1 : 0]?.level : undefined) ?? (v ? 'yes' : 'no');
  }
  return typeof v === 'number' ? withUnit(value(v, 6), unitOf(lexicon, variable)) : v;
}
