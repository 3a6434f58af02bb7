import { ladderChart } from '../chart/ladder.ts';
import {
  count,
  NONE,
  percent,
  pPhrase,
  pValue,
  range,
  rounded,
  roundingFor,
  significant,
} from '../numbers.ts';
import type { RecordCandidate, RecordCoefficient, RecordModel, StudyRecord } from '../record-type.ts';
import type { CoefficientView, SaysView } from '../view.ts';
import { fitSentence } from '../words/answer.ts';
import { equationOf } from '../words/equation.ts';
import { estimatedCandidate } from '../words/estimated.ts';
import { hypothesisEvidence } from '../words/hypothesis.ts';
import { type Lexicon, stopped } from '../words/lexicon.ts';
import { lookedSentence } from '../words/looked.ts';
import { modelsLookedAt } from '../words/models.ts';
import { fittedQuantity, fittedUnit, scaleSentence } from '../words/scale.ts';
import { averagedView } from './averaged.ts';
import { moreView } from './more.ts';
import { termViews } from './terms.ts';

export function saysView(record: StudyRecord, lexicon: Lexicon): SaysView | null {
  const { model } = record;
  if (model === null) return null;
  const candidate = estimatedCandidate(record);
  const coefficients = candidate?.coefficients ?? [];
  const unit = fittedUnit(lexicon.response);
  return {
    candidate: model.candidate,
    fit: candidate === undefined ? '' : fitSentence(lexicon, candidate, modelsLookedAt(record)),
    scaleNote: scaleSentence(lexicon),
    equation: equationOf(lexicon, model, coefficients),
    overall: candidate === undefined ? null : overallSentence(candidate),
    ladder: ladderChart(lexicon, model.terms),
    terms: termViews(lexicon, model, coefficients, record.examination?.points ?? null),
    coefficients: coefficients.map((c) =>
      coefficientView(c, model.columns.find((column) => column.name === c.name)?.unit ?? null),
    ),
    errors: standardErrors(model),
    looked: lookedSentence(record),
    hypotheses: (model.inference?.hypotheses ?? []).map((one) => ({
      name: one.name,
      verdict: stopped(one.verdict),
      evidence: hypothesisEvidence(one),
    })),
    more: moreView(record, coefficients),
    averaged: averagedView(record, lexicon),
    confidence: percent(record.study.confidence),
    quantity:
      unit === null ? fittedQuantity(lexicon.response) : `${fittedQuantity(lexicon.response)} in ${unit}`,
  };
}

/** Which standard errors the figures rest on; null for a record of a version before it. */
function standardErrors({ standard_errors: errors }: RecordModel): string | null {
  return errors === undefined ? null : stopped(errors.sentence);
}

function overallSentence({ overall_f: f, intercept }: RecordCandidate): string | null {
  if (f === null || f.statistic === null || f.p_value === null) return null;
  const against = intercept ? 'the mean alone' : 'a model that says zero';
  return `All terms together against ${against}: F\u00a0=\u00a0${significant(f.statistic, 3)} on ${count(f.df1)} and ${count(f.df2)}\u00a0degrees of freedom, ${pPhrase(f.p_value)}.`;
}

function coefficientView(c: RecordCoefficient, unit: string | null): CoefficientView {
  const rounding = roundingFor(c.estimate, c.standard_error);
  return {
    name: c.name,
    unit: unit === null ? '' : `per ${unit}`,
    estimate: rounded(c.estimate, rounding),
    standardError: rounded(c.standard_error, rounding),
    interval: range(c.lower, c.upper, rounding),
    pValue: pValue(c.p_value),
    vif: c.vif === null ? NONE : significant(c.vif, 3),
  };
}
