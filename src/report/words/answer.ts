import { count, percent, share } from '../numbers.ts';
import type { RecordCandidate, RecordTerm, StudyRecord } from '../record-type.ts';
import { briefEffect } from './effect.ts';
import { type Lexicon, labelOf, listed, lowered, named, raised } from './lexicon.ts';
import { typicalMiss } from './miss.ts';
import { type ModelsLookedAt, modelsPhrase } from './models.ts';
import { predictionSentence } from './prediction.ts';
import { fittedQuantity } from './scale.ts';
import { stepPhrase } from './term.ts';

/** A typical step of a term with the term that it belongs to. */
export interface Rung {
  readonly term: RecordTerm;
  readonly step: RecordTerm['typical_steps'][number];
}

/** One rung per variable, the largest step of each, largest first: what goes with the response most. */
export function largestRungs(terms: readonly RecordTerm[]): Rung[] {
  const byVariable = new Map<string, Rung>();
  for (const term of terms) {
    for (const step of term.typical_steps) {
      const key = term.variables[0] ?? term.name;
      const known = byVariable.get(key);
      if (known === undefined || Math.abs(step.estimate) > Math.abs(known.step.estimate))
        byVariable.set(key, { term, step });
    }
  }
  return [...byVariable.values()].sort((a, b) => Math.abs(b.step.estimate) - Math.abs(a.step.estimate));
}

/** The answer on the first screen, in one to three sentences. */
export function answerSentences(record: StudyRecord, lexicon: Lexicon): string[] {
  const { model } = record;
  if (model === null) return noneAdmitted(record);
  const asked = predictionSentence(lexicon, record.predictions, record.prediction_total);
  return [...(asked === null ? [] : [asked]), ...driverSentence(lexicon, model.terms)];
}

/** "What fuel burned goes with most: speed (from 9.1 to 10.9 kn, 112 L more …), then cargo (…)." */
function driverSentence(lexicon: Lexicon, terms: readonly RecordTerm[]): string[] {
  const rungs = largestRungs(terms).slice(0, 2);
  const said = rungs.map(({ term, step }) => {
    const variable = term.variables[0] ?? term.name;
    const where = stepPhrase(lexicon, variable, step);
    return `${labelOf(lexicon, variable)} (${where}: ${briefEffect(lexicon, step)})`;
  });
  const [first, second] = said;
  if (first === undefined) return [];
  const held = terms.length > 1 ? ', the other terms held' : '';
  return [
    second === undefined
      ? `${raised(lexicon.response.label)} goes with ${first}${held}.`
      : `Of the terms in the model, ${lexicon.response.label} goes most with ${first}, then with ${second}${held}.`,
  ];
}

function noneAdmitted(record: StudyRecord): string[] {
  const n = record.candidates.length;
  const which =
    n === 1 ? 'The one candidate was not admitted' : `None of the ${count(n)} candidates was admitted`;
  const best = record.selection.ranking[0];
  const reasons = record.candidates.find((c) => c.name === best?.candidate)?.refused_because ?? [];
  const nearest =
    best === undefined || reasons.length === 0
      ? ''
      : ` The best ranked, ${named(best.candidate)}, was refused: ${listed(reasons.map((r) => lowered(r.replace(/\.$/, ''))))}.`;
  return [`${which} under the rules that the study declares, so there is no model to answer with.${nearest}`];
}

/** How well the chosen model follows the data: "It accounts for …, typically missing by 24 L." */
export function fitSentence(lexicon: Lexicon, candidate: RecordCandidate, looked: ModelsLookedAt): string {
  const from =
    looked.count === 1
      ? `The one candidate, ${named(candidate.name)},`
      : `${named(candidate.name)}, chosen of ${modelsPhrase(looked)},`;
  if (candidate.r_squared === null) return `${from} has no defined R².`;
  const adjusted =
    candidate.adjusted_r_squared === null ? '' : ` (adjusted R² ${share(candidate.adjusted_r_squared)})`;
  return `${from} accounts for ${percent(candidate.r_squared)} of the variation in ${fittedQuantity(lexicon.response)}${adjusted}${missPhrase(lexicon, candidate)}.`;
}

function missPhrase(lexicon: Lexicon, candidate: RecordCandidate): string {
  // A fit without standard errors is exact: what it misses by is rounding.
  if (candidate.coefficients.every(({ standard_error: error }) => error === null))
    return '; it fits these rows exactly';
  const miss = typicalMiss(lexicon, candidate.residual_standard_error);
  return miss === null ? '' : `; it typically misses by ${miss}`;
}
