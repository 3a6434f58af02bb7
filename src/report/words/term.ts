import { value, withUnit } from '../numbers.ts';
import type { RecordCoefficient, RecordModel, RecordTerm } from '../record-type.ts';
import { effectPhrase, openSentence, shortEffect } from './effect.ts';
import { type Lexicon, labelOf, listed, raised, unitOf, variableNamed } from './lexicon.ts';
import { scaleKind } from './scale.ts';
import { eachUnit, oneMore } from './units.ts';

type Step = RecordTerm['typical_steps'][number];
type Slope = RecordTerm['slopes'][number];

/** Beyond this many levels a table says more than sentences do. */
const LEVELS_IN_WORDS = 4;

/**
 * What one term of the chosen model says, as sentences. Interactions are told as slopes at each place of
 * their other members; a term whose variable is also in an interaction is told at the others' averages.
 */
export function termSentences(
  lexicon: Lexicon,
  term: RecordTerm,
  model: RecordModel,
  coefficients: readonly RecordCoefficient[],
): string[] {
  switch (term.kind) {
    case 'interaction':
      return interactionSentences(lexicon, term);
    case 'category':
      return categorySentences(lexicon, term, model);
    case 'flag':
      return term.typical_steps.map((step) => levelSentence(lexicon, term, step, model));
    case 'bend':
      return [...bendSentence(lexicon, term, model, coefficients), ...stepSentences(lexicon, term, model)];
    case 'number':
      return [...unitSentence(lexicon, term, model, coefficients), ...stepSentences(lexicon, term, model)];
    default:
      return [...stepSentences(lexicon, term, model), ...turnSentence(lexicon, term)];
  }
}

/** Other variables that the term's variable shares an interaction with. */
export function partners(term: RecordTerm, model: RecordModel): string[] {
  const [variable] = term.variables;
  return [
    ...new Set(
      model.terms
        .filter(
          (other) =>
            other.kind === 'interaction' && variable !== undefined && other.variables.includes(variable),
        )
        .flatMap((other) => other.variables)
        .filter((name) => name !== variable),
    ),
  ];
}

/** Whether another term than this one (interactions apart) is made of the same variable. */
function hasCompanion(term: RecordTerm, model: RecordModel): boolean {
  return model.terms.some(
    (other) => other !== term && other.kind !== 'interaction' && other.variables[0] === term.variables[0],
  );
}

function heldPhrase(lexicon: Lexicon, term: RecordTerm, model: RecordModel): string {
  const others = partners(term, model);
  if (others.length > 0) {
    return `, averaged over the rows’ ${listed(others.map((name) => labelOf(lexicon, name)))}, the other terms held`;
  }
  return model.terms.length > 1 ? ', the other terms held' : '';
}

/** "One more tonne of cargo goes with 1.93 L more fuel burned (…), the other terms held." */
function unitSentence(
  lexicon: Lexicon,
  term: RecordTerm,
  model: RecordModel,
  coefficients: readonly RecordCoefficient[],
): string[] {
  const variable = term.variables[0];
  const coefficient = coefficients.find((c) => c.term === term.name);
  if (variable === undefined || coefficient === undefined || hasCompanion(term, model)) return [];
  // With an interaction the coefficient holds only at the others' zero or baseline; the slopes say the rest.
  if (partners(term, model).length > 0) return [];
  const doubled = doublingSentence(lexicon, term, variable, coefficient, model);
  if (doubled !== null) return [doubled];
  const subject = oneMore(labelOf(lexicon, variable), unitOf(lexicon, variable));
  return [
    `${raised(subject)} goes with ${effectPhrase(lexicon, coefficient)}${heldPhrase(lexicon, term, model)}.${openSentence(coefficient)}`,
  ];
}

/** Where the variable is itself the logarithm of another, a doubling is what a reader can picture. */
function doublingSentence(
  lexicon: Lexicon,
  term: RecordTerm,
  variable: string,
  coefficient: RecordCoefficient,
  model: RecordModel,
): string | null {
  const derived = lexicon.variables.get(variable)?.derived_from ?? '';
  const parts = /^\s*(log|log10)\s*\(\s*([\p{L}_][\p{L}\p{N}_]*)\s*\)\s*$/u.exec(derived);
  if (parts === null) return null;
  const step = parts[1] === 'log10' ? Math.log10(2) : Math.LN2;
  const times = (x: number | null): number | null => (x === null ? null : x * step);
  const doubling = {
    estimate: coefficient.estimate * step,
    lower: times(coefficient.lower),
    upper: times(coefficient.upper),
  };
  return `Doubling ${labelOf(lexicon, parts[2]!)} goes with ${effectPhrase(lexicon, doubling)}${heldPhrase(lexicon, term, model)}.${openSentence(doubling)}`;
}

/** "From 48 to 112 t" for a numeric step. */
export function stepRange(lexicon: Lexicon, variable: string, step: Step): string {
  const unit = unitOf(lexicon, variable);
  const { from_value: from, to_value: to } = step;
  if (from === null || to === null) return `${step.to} rather than ${step.from}`;
  return `${value(from, 3)} to ${withUnit(value(to, 3), unit)}`;
}

function stepSentences(lexicon: Lexicon, term: RecordTerm, model: RecordModel): string[] {
  const [step] = term.typical_steps;
  const variable = term.variables[0];
  if (step === undefined || variable === undefined) return [];
  const span =
    step.from_value === null
      ? stepRange(lexicon, variable, step)
      : `from ${stepRange(lexicon, variable, step)}, the middle half of its values,`;
  const alone = term.kind === 'number' && partners(term, model).length === 0 && !hasCompanion(term, model);
  return [
    alone
      ? `A typical step, ${span} goes with ${effectPhrase(lexicon, step)}.`
      : `${raised(labelOf(lexicon, variable))} ${span} goes with ${effectPhrase(lexicon, step)}${heldPhrase(lexicon, term, model)}.${openSentence(step)}`,
  ];
}

/** Where the curve turns inside the data. */
function turnSentence(lexicon: Lexicon, term: RecordTerm): string[] {
  const { curve } = term;
  const variable = term.variables[0];
  if (curve === null || variable === undefined || curve.y.length < 5) return [];
  const turns = (better: (a: number, b: number) => boolean): number =>
    curve.y.reduce((at, y, i) => (better(y, curve.y[at]!) ? i : at), 0);
  const inside = (i: number): boolean => i > 0 && i < curve.y.length - 1;
  const low = turns((a, b) => a < b);
  const high = turns((a, b) => a > b);
  const near = (i: number): string => withUnit(value(curve.x[i]!, 2), unitOf(lexicon, variable));
  // On the reciprocal scale, low and high would change places on the response's own.
  const what = scaleKind(lexicon.response.scale) === 'reciprocal' ? 'The fitted curve' : 'The curve';
  if (inside(low) && !inside(high)) return [`${what} is lowest near ${near(low)}.`];
  if (inside(high) && !inside(low)) return [`${what} is highest near ${near(high)}.`];
  return [];
}

function bendSentence(
  lexicon: Lexicon,
  term: RecordTerm,
  model: RecordModel,
  coefficients: readonly RecordCoefficient[],
): string[] {
  const coefficient = coefficients.find((c) => c.term === term.name);
  const column = model.columns.find((c) => c.term === term.name);
  const piece = column?.pieces[0];
  if (coefficient === undefined || piece?.at === undefined || partners(term, model).length > 0) return [];
  const unit = unitOf(lexicon, piece.variable);
  const at = withUnit(value(piece.at), unit);
  const label = labelOf(lexicon, piece.variable);
  const side = piece.side ?? 'above';
  const straight = model.terms.some(
    (other) => other.kind === 'number' && other.variables[0] === piece.variable,
  );
  const effect = effectPhrase(lexicon, coefficient);
  const held = heldPhrase(lexicon, term, model);
  return [
    straight
      ? `${raised(side)} ${at}, ${eachUnit(unit)} ${side === 'above' ? 'more' : 'less'} of ${label} goes with ${effect} in addition to the straight relationship${held}.${openSentence(coefficient)}`
      : `${raised(eachUnit(unit))} of ${label} ${side} ${at} goes with ${effect}${held}.${openSentence(coefficient)}`,
  ];
}

function levelSentence(lexicon: Lexicon, term: RecordTerm, step: Step, model: RecordModel): string {
  const label = raised(labelOf(lexicon, term.variables[0] ?? term.name));
  return `${label} ${step.to} rather than ${step.from} goes with ${effectPhrase(lexicon, step)}${heldPhrase(lexicon, term, model)}.${openSentence(step)}`;
}

function categorySentences(lexicon: Lexicon, term: RecordTerm, model: RecordModel): string[] {
  const steps = term.typical_steps;
  if (steps.length <= LEVELS_IN_WORDS) return steps.map((step) => levelSentence(lexicon, term, step, model));
  const sorted = [...steps].sort((a, b) => a.estimate - b.estimate);
  const low = sorted[0]!;
  const high = sorted.at(-1)!;
  const label = raised(labelOf(lexicon, term.variables[0] ?? term.name));
  return [
    `${label} has ${steps.length + 1} levels, each compared with ${low.from}: from ${shortEffect(lexicon, low)} (${low.to}) to ${shortEffect(lexicon, high)} (${high.to})${heldPhrase(lexicon, term, model)}.`,
  ];
}

/** "At vessel Tern, one more tonne of cargo goes with 2.2 L more fuel burned (…)." */
function interactionSentences(lexicon: Lexicon, term: RecordTerm): string[] {
  if (term.slopes.length > LEVELS_IN_WORDS + 2) {
    const sorted = [...term.slopes].sort((a, b) => a.estimate - b.estimate);
    const low = sorted[0]!;
    const high = sorted.at(-1)!;
    return [
      `What ${slopeSubject(lexicon, low)} goes with lies between ${shortEffect(lexicon, low)} (${low.at}) and ${shortEffect(lexicon, high)} (${high.at}), the other terms held.`,
    ];
  }
  return term.slopes.map((slope) => {
    return `At ${slope.at}, ${slopeSubject(lexicon, slope)} goes with ${effectPhrase(lexicon, slope)}.${openSentence(slope)}`;
  });
}

/** What moves in a slope: "one more tonne of cargo"; for a level its name as the record gives it. */
export function slopeSubject(lexicon: Lexicon, slope: Slope): string {
  const variable = variableNamed(lexicon, slope.of);
  if (variable === null || variable.type === 'category' || variable.type === 'flag') return slope.of;
  return oneMore(labelOf(lexicon, variable.name), slope.per);
}
