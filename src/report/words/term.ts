import { count, decimalExponent, isoDate, value, withUnit } from '../numbers.ts';
import type { RecordCoefficient, RecordModel, RecordTerm } from '../record-type.ts';
import { effectPhrase, openSentence, shortEffect } from './effect.ts';
import { type Lexicon, labelOf, listed, raised, unitOf, variableNamed } from './lexicon.ts';
import { perDoubling } from './own-scale.ts';
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

/**
 * Where the record holds the other members of an interaction while one moves: categories at their baseline,
 * flags at the value coded 0, numbers at their mean.
 */
export function partnersHeld(lexicon: Lexicon, others: readonly string[]): string {
  const places = others.map((name) => {
    const variable = variableNamed(lexicon, name);
    const label = labelOf(lexicon, name);
    const [baseline] = variable?.levels ?? [];
    if (baseline !== undefined) return `${label} is ${baseline.level}`;
    if (variable === null || variable.mean === null) return `${label} is at its mean`;
    return `${label} is at its mean of ${withUnit(value(variable.mean, 3), variable.unit)}`;
  });
  return `where ${listed(places)}`;
}

function heldPhrase(lexicon: Lexicon, term: RecordTerm, model: RecordModel): string {
  const others = partners(term, model);
  if (others.length > 0) return `, ${partnersHeld(lexicon, others)}, the other terms held`;
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
  const own = perDoubling(term);
  if (own !== null)
    return `Doubling ${labelOf(lexicon, own.of)} goes with ${effectPhrase(lexicon, own)}${heldPhrase(lexicon, term, model)}.${openSentence(own)}`;
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
  const { from_value: from, to_value: to } = step;
  if (from === null || to === null || isJump(lexicon, variable, step))
    return `${step.to} rather than ${step.from}`;
  if (variableNamed(lexicon, variable)?.type === 'date') return `${isoDate(from)} to ${isoDate(to)}`;
  const [low, high] = twoValues(from, to);
  return `${low} to ${withUnit(high, unitOf(lexicon, variable))}`;
}

/** "from 48 to 112 t", "Tern rather than Skerry". */
export function stepPhrase(lexicon: Lexicon, variable: string, step: Step): string {
  const text = stepRange(lexicon, variable, step);
  return isJump(lexicon, variable, step) ? text : `from ${text}`;
}

/** Whether the step goes from one level or value of a flag to another. */
function isJump(lexicon: Lexicon, variable: string, step: Step): boolean {
  return (
    step.from_value === null || step.to_value === null || variableNamed(lexicon, variable)?.type === 'flag'
  );
}

/** Two values with as few digits as tell them apart well. */
function twoValues(from: number, to: number): [string, string] {
  const apart = decimalExponent(Math.max(Math.abs(from), Math.abs(to)), 3) - decimalExponent(to - from, 3);
  // A double has no more than 17; two values that are one are told apart by none.
  const digits = from === to ? 3 : Math.min(17, Math.max(3, apart + 2));
  return [value(from, digits), value(to, digits)];
}

/** "the middle half of its values", or the whole range where the record had to take that. */
function stepName(lexicon: Lexicon, variable: string): string {
  const described = variableNamed(lexicon, variable);
  return described !== null &&
    described.lower_quartile !== null &&
    described.lower_quartile === described.upper_quartile
    ? 'the whole range of its values'
    : 'the middle half of its values';
}

function stepSentences(lexicon: Lexicon, term: RecordTerm, model: RecordModel): string[] {
  const [step] = term.typical_steps;
  const variable = term.variables[0];
  if (step === undefined || variable === undefined) return [];
  const span = isJump(lexicon, variable, step)
    ? stepRange(lexicon, variable, step)
    : `from ${stepRange(lexicon, variable, step)}, ${stepName(lexicon, variable)},`;
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
  const change = `${step.to} rather than ${step.from}`;
  return `${label} ${term.kind === 'flag' ? `(${change})` : change} goes with ${effectPhrase(lexicon, step)}${heldPhrase(lexicon, term, model)}.${openSentence(step)}`;
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

/** "Where vessel is Tern, one more tonne of cargo goes with 2.2 L more fuel burned (…)." */
function interactionSentences(lexicon: Lexicon, term: RecordTerm): string[] {
  const { slopes } = term;
  if (slopes.length <= LEVELS_IN_WORDS + 2) {
    return slopes.map((slope) => {
      return `Where ${placeClause(lexicon, slope.at)}, ${slopeSubject(lexicon, slope)} goes with ${effectPhrase(lexicon, slope)}.${openSentence(slope)}`;
    });
  }
  const sorted = [...slopes].sort((a, b) => a.estimate - b.estimate);
  const low = sorted[0]!;
  const high = sorted.at(-1)!;
  const omitted = omittedSlopes(term);
  const [lowName, highName] = [slopeName(lexicon, low, term), slopeName(lexicon, high, term)];
  const ends = `${shortEffect(lexicon, low)} (${lowName}) and ${shortEffect(lexicon, high)} (${highName}), the other terms held`;
  return [
    movesSeveral(term)
      ? `The ${slopes.length}\u00a0differences from ${baselineMoved(lexicon, low)} lie between ${ends}.${omitted}`
      : `What ${slopeSubject(lexicon, low)} goes with lies between ${ends}.${omitted}`,
  ];
}

/** That not every slope was worked out, behind a full stop; else an empty string. */
function omittedSlopes({ slopes_omitted: omitted }: RecordTerm): string {
  return omitted === 0 ? '' : ` A further ${count(omitted)} ${omitted === 1 ? 'is' : 'are'} not worked out.`;
}

/** Whether the slopes are differences of more than one level of the interaction's first member. */
export function movesSeveral({ slopes }: RecordTerm): boolean {
  return slopes.some((slope) => slope.of !== slopes[0]?.of);
}

/** The level that a difference between levels starts from. */
export function baselineMoved(lexicon: Lexicon, slope: Slope): string {
  const { name } = nameAndRest(lexicon, slope.of);
  return (name === null ? undefined : lexicon.variables.get(name)?.levels?.[0]?.level) ?? 'the baseline';
}

/** One slope among those of its term: "vessel Tern"; where the level that moves varies, "Duluth at year 1931". */
export function slopeName(lexicon: Lexicon, slope: Slope, term: RecordTerm): string {
  const place = placeText(lexicon, slope.at);
  if (!movesSeveral(term)) return place;
  const { rest } = nameAndRest(lexicon, slope.of);
  const from = ` rather than ${baselineMoved(lexicon, slope)}`;
  return `${rest.endsWith(from) ? rest.slice(0, -from.length) : rest} at ${place}`;
}

/** What moves in a slope: "one more tonne of cargo", "vessel Tern rather than Skerry". */
export function slopeSubject(lexicon: Lexicon, slope: Slope): string {
  const variable = variableNamed(lexicon, slope.of);
  if (variable !== null) return oneMore(labelOf(lexicon, variable.name), variable.unit);
  const { name, rest } = nameAndRest(lexicon, slope.of);
  if (name === null) return rest;
  const described = variableNamed(lexicon, name);
  if (described?.type !== 'flag') return `${labelOf(lexicon, name)} ${rest}`;
  const from = described.levels?.[0]?.level;
  return `${labelOf(lexicon, name)} (${rest}${from === undefined ? '' : ` rather than ${from}`})`;
}

/** Where a slope is told, for people: names become labels, numbers are rounded and carry their unit. */
export function placeText(lexicon: Lexicon, at: string): string {
  return placeParts(lexicon, at)
    .map(([name, rest]) => (name === null ? rest : `${name} ${rest}`))
    .join(', ');
}

/** The same inside a sentence: "vessel is Tern and headwind is 4 m/s". */
function placeClause(lexicon: Lexicon, at: string): string {
  return listed(placeParts(lexicon, at).map(([name, rest]) => (name === null ? rest : `${name} is ${rest}`)));
}

/** Label and value of each member of a place; a null label where the text names no variable. */
function placeParts(lexicon: Lexicon, at: string): (readonly [string | null, string])[] {
  return at.split(', ').map((part) => {
    const { name, rest } = nameAndRest(lexicon, part);
    if (name === null) return [null, rest];
    const number = rest.trim() === '' ? Number.NaN : Number(rest);
    const numeric = variableNamed(lexicon, name)?.levels === null && Number.isFinite(number);
    return [labelOf(lexicon, name), numeric ? withUnit(value(number, 3), unitOf(lexicon, name)) : rest];
  });
}

/** The variable that a text begins with, the longest such name, and what stands behind it. */
function nameAndRest(
  lexicon: Lexicon,
  text: string,
): { readonly name: string | null; readonly rest: string } {
  let name: string | null = null;
  for (const candidate of lexicon.variables.keys()) {
    if (text.startsWith(`${candidate} `) && candidate.length > (name?.length ?? 0)) name = candidate;
  }
  return name === null ? { name, rest: text } : { name, rest: text.slice(name.length + 1) };
}
