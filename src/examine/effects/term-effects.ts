import type { ModelTerm } from '../../model/design.ts';
import { termVariables } from '../../prepare/needed-variables.ts';
import type { Spread } from '../../prepare/spread.ts';
import type { Chosen } from '../chosen.ts';
import { derivativeAt } from './derivative.ts';
import { percentOf, responseLogarithm } from './logarithms.ts';
import {
  type Effect,
  effects,
  effectsBetween,
  moved,
  type Reference,
  type ReferenceVariable,
  type Setting,
} from './settings.ts';

/** What moving a term's variable over its typical step goes with, the others held. */
export interface TypicalStep extends Effect {
  readonly from: string;
  readonly to: string;
  readonly from_value: number | null;
  readonly to_value: number | null;
}

/** The relationship with one variable over its range, relative to its mean. Equal lengths. */
export interface Curve {
  readonly variable: string;
  readonly x: number[];
  readonly y: number[];
  readonly lower: (number | null)[];
  readonly upper: (number | null)[];
}

/** For an interaction: what the first member goes with where the others stand. */
export interface Slope extends Effect {
  readonly at: string;
  readonly of: string;
  /** The step of a number ("1"), null for a difference between levels. */
  readonly per: string | null;
  /** The same in per cent of the response, where it is fitted as a logarithm; else null. */
  readonly percent: Effect | null;
}

const CURVE_POINTS = 61;
/** More than these are past reading, and past drawing on one chart. */
const MOST_SLOPES = 40;

/** Lower to upper quartile of a number; baseline to each other level of a category; 0 to 1 of a flag. */
export function typicalSteps(chosen: Chosen, term: ModelTerm, reference: Reference): TypicalStep[] {
  if (term.plan.kind === 'interaction') return [];
  const variable = term.plan.variable;
  const described = reference.variables.get(variable);
  if (described === undefined) return [];
  const steps = stepsOf(described);
  const found = effectsBetween(
    chosen,
    steps.map((step): [Setting, Setting] => [
      moved(reference.setting, { [variable]: step.from }),
      moved(reference.setting, { [variable]: step.to }),
    ]),
  );
  return steps.map((step, k) => ({
    from: step.fromText,
    to: step.toText,
    from_value: typeof step.from === 'number' ? step.from : null,
    to_value: typeof step.to === 'number' ? step.to : null,
    ...found[k]!,
  }));
}

interface Step {
  readonly from: number | string;
  readonly to: number | string;
  readonly fromText: string;
  readonly toText: string;
}

/** The steps that are typical of a variable. */
export function stepsOf(variable: ReferenceVariable): Step[] {
  switch (variable.kind) {
    case 'number': {
      // Where half the rows or more share one value, the quartiles tell nothing: use the whole range.
      const flat = variable.lowerQuartile === variable.upperQuartile;
      const from = flat ? variable.smallest : variable.lowerQuartile;
      const to = flat ? variable.largest : variable.upperQuartile;
      return [{ from, to, fromText: String(from), toText: String(to) }];
    }
    case 'flag':
      return [
        { from: 0, to: 1, fromText: variable.texts?.[0] ?? 'no', toText: variable.texts?.[1] ?? 'yes' },
      ];
    case 'category':
      return variable.levels
        .filter((level) => level !== variable.baseline)
        .map((level) => ({ from: variable.baseline, to: level, fromText: variable.baseline, toText: level }));
  }
}

/** The curve over the variable's range, for a term of one numeric variable; null for the rest. */
export function curveOf(chosen: Chosen, term: ModelTerm, reference: Reference): Curve | null {
  if (term.plan.kind === 'interaction') return null;
  const variable = term.plan.variable;
  const described = reference.variables.get(variable);
  if (described === undefined || described.kind !== 'number') return null;
  const { smallest, largest } = described;
  const x = Array.from(
    { length: CURVE_POINTS },
    (_, i) => smallest + ((largest - smallest) * i) / (CURVE_POINTS - 1),
  );
  const found = effectsBetween(
    chosen,
    x.map((value): [Setting, Setting] => [
      reference.setting,
      moved(reference.setting, { [variable]: value }),
    ]),
  );
  return {
    variable,
    x,
    y: found.map((effect) => effect.estimate),
    lower: found.map((effect) => effect.lower),
    upper: found.map((effect) => effect.upper),
  };
}

/**
 * The slope (number, at its median where it bends) or difference (flag, category) of an interaction's first variable at
 * each level of the others, or at the declared places or quartiles of a number; at most forty, and how many more there are.
 */
export function slopesOf(
  chosen: Chosen,
  term: ModelTerm,
  reference: Reference,
): { readonly slopes: Slope[]; readonly omitted: number } {
  if (term.plan.kind !== 'interaction') return { slopes: [], omitted: 0 };
  const [first, ...others] = termVariables(term.plan);
  const described = first === undefined ? undefined : reference.variables.get(first);
  if (first === undefined || described === undefined) return { slopes: [], omitted: 0 };
  const places = others
    .map((name) => placesOf(name, reference.variables.get(name)!, chosen.study.inference.slopesAt.get(name)))
    .reduce<{ at: string; changes: Record<string, number | string> }[]>(
      (soFar, more) =>
        soFar.flatMap((left) =>
          more.map((right) => ({
            at: left.at === '' ? right.at : `${left.at}, ${right.at}`,
            changes: { ...left.changes, ...right.changes },
          })),
        ),
      [{ at: '', changes: {} }],
    );
  const all = places.flatMap((place) => movesOf(first, described).map((move) => ({ place, move })));
  const wanted = all.slice(0, MOST_SLOPES);
  const settings = wanted.map(({ place, move }): [Setting, Setting] => {
    const there = moved(reference.setting, place.changes);
    return [moved(there, { [first]: move.from }), moved(there, { [first]: move.to })];
  });
  const effectOf = effects(chosen);
  const found =
    described.kind === 'number'
      ? settings.map(([there]) => effectOf(derivativeAt(chosen, there, first)))
      : effectsBetween(chosen, settings);
  const logarithm = responseLogarithm(chosen);
  return {
    slopes: wanted.map(({ place, move }, k) => ({
      at: place.at,
      of: move.of,
      per: move.per,
      ...found[k]!,
      percent: logarithm === null ? null : percentOf(found[k]!, logarithm.lnBase),
    })),
    omitted: all.length - wanted.length,
  };
}

function placesOf(
  name: string,
  variable: ReferenceVariable,
  declared: readonly number[] | undefined,
): { at: string; changes: Record<string, number | string> }[] {
  switch (variable.kind) {
    case 'category':
      return variable.levels.map((level) => ({ at: `${name} ${level}`, changes: { [name]: level } }));
    case 'flag':
      return [0, 1].map((value) => ({
        at: `${name} ${variable.texts?.[value as 0 | 1] ?? (value === 1 ? 'yes' : 'no')}`,
        changes: { [name]: value },
      }));
    case 'number':
      return slopePlaces(variable, declared).map((value) => ({
        at: `${name} ${value}`,
        changes: { [name]: value },
      }));
  }
}

/** Where slopes are given: at the declared values of a number, else at its quartiles. */
export function slopePlaces(variable: Spread, declared: readonly number[] | undefined): readonly number[] {
  return declared ?? [...new Set([variable.lowerQuartile, variable.median, variable.upperQuartile])];
}

function movesOf(
  name: string,
  variable: ReferenceVariable,
): { of: string; per: string | null; from: number | string; to: number | string }[] {
  switch (variable.kind) {
    case 'number':
      return [{ of: name, per: '1', from: variable.median, to: variable.median }];
    case 'flag':
      return [{ of: `${name} ${variable.texts?.[1] ?? 'yes'}`, per: null, from: 0, to: 1 }];
    case 'category':
      return variable.levels
        .filter((level) => level !== variable.baseline)
        .map((level) => ({
          of: `${name} ${level} rather than ${variable.baseline}`,
          per: null,
          from: variable.baseline,
          to: level,
        }));
  }
}
