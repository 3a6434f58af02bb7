import type { Scale, Study, TermPlan } from './study.ts';

/** Every term that a candidate has or may have, in order of declaration. */
export function declaredTerms({ candidates, families }: Pick<Study, 'candidates' | 'families'>): TermPlan[] {
  return [
    ...candidates.flatMap(({ terms }) => terms),
    ...families.flatMap(({ terms }) => terms.map(({ term }) => term)),
  ];
}

/** Every scale of the response that a candidate has or may have. */
export function declaredScales({ candidates, families }: Pick<Study, 'candidates' | 'families'>): Scale[] {
  return [...candidates, ...families].map(({ scale }) => scale);
}
