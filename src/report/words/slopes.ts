import { value, withUnit } from '../numbers.ts';
import type { RecordModel, RecordTerm } from '../record-type.ts';
import { briefEffect, effectPhrase, shortEffect } from './effect.ts';
import { type Lexicon, labelOf, raised, unitOf } from './lexicon.ts';
import { partners, partnersHeld } from './term.ts';
import { oneMore } from './units.ts';

/** Declared places up to this many are told with their intervals, one by one. */
const PLACES_IN_WORDS = 4;

/**
 * How steep a curve is: at the places that the study declares, with intervals; else at its quartiles in brief. Nothing for
 * a straight term, and for a record without slopes.
 */
export function slopesAlongSentences(lexicon: Lexicon, term: RecordTerm, model: RecordModel): string[] {
  const along = term.slopes_along;
  if (along === null || along === undefined || along.places.length === 0) return [];
  const { variable, places, declared } = along;
  const at = (x: number): string => withUnit(value(x, 3), unitOf(lexicon, variable));
  const subject = oneMore(labelOf(lexicon, variable), unitOf(lexicon, variable));
  const others = partners(term, model);
  const held = others.length === 0 ? '' : `, ${partnersHeld(lexicon, others)}`;
  if (declared && places.length <= PLACES_IN_WORDS) {
    const [first, ...rest] = places;
    const more = rest.map((place) => `; near ${at(place.at)}, with ${briefEffect(lexicon, place)}`);
    return [
      `Near ${at(first!.at)}, ${subject} goes with ${effectPhrase(lexicon, first!)}${more.join('')}${held}.`,
    ];
  }
  const [low, high] = [places[0]!, places.at(-1)!];
  if (low === high) return [];
  // Below a bend the slope is nothing at all, not a small figure.
  const told = (place: typeof low): string =>
    place.estimate === 0 ? 'no difference' : shortEffect(lexicon, place);
  return [
    `${raised(subject)} goes with ${told(low)} near ${at(low.at)} and ${told(high)} near ${at(high.at)}${held}.`,
  ];
}
