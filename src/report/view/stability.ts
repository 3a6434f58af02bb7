import { sharesChart } from '../chart/shares.ts';
import { count } from '../numbers.ts';
import type { StudyRecord } from '../record-type.ts';
import type { StabilityView } from '../view.ts';
import { stabilitySentences } from '../words/stability.ts';

const CANDIDATES = 6;
const TERMS = 14;

/** How often what was chosen would be chosen again; null where the study does not ask. */
export function stabilityView({ selection, model }: StudyRecord): StabilityView | null {
  const { stability, chosen } = selection;
  if (stability === undefined) return null;
  const [finding, method] = stabilitySentences(stability, chosen) as [string, string];
  const own = new Set(model?.terms.map(({ name }) => name) ?? []);
  const cut = (all: number, shown: number, what: string): string =>
    all > shown ? ` ${count(all - shown)} further ${what} are in the record.` : '';
  // A single candidate that always wins needs no drawing.
  const settled = stability.candidates.length < 2;
  return {
    finding,
    method,
    candidates: settled
      ? null
      : sharesChart(
          stability.candidates
            .slice(0, CANDIDATES)
            .map(({ candidate, share }) => ({ name: candidate, share, chosen: candidate === chosen })),
          'stable-candidates',
          'How often each candidate is chosen',
          'share of the choices made anew',
          `How often each candidate is chosen.${cut(stability.candidates.length, CANDIDATES, 'candidates')}`,
        ),
    terms: settled
      ? null
      : sharesChart(
          stability.terms
            .slice(0, TERMS)
            .map(({ term, share }) => ({ name: term, share, chosen: own.has(term) })),
          'stable-terms',
          'How often each term is in what is chosen',
          'share of the choices made anew',
          `How often each term is in what is chosen; bold: in the model reported here.${cut(stability.terms.length, TERMS, 'terms')}`,
        ),
  };
}
