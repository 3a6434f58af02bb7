import type { Factor } from '../engine/factor.ts';
import type { Fit } from '../engine/fit.ts';
import { fitCandidate, type RowFacts } from '../engine/fit-candidate.ts';
import { partFactor } from '../engine/part-factor.ts';
import type { FamilyModel } from '../model/design.ts';
import type { StepFamilyPlan } from '../study/study.ts';
import type { FTest } from './f-test.ts';
import { testable } from './f-test.ts';
import { familyCandidate } from './family-model.ts';
import { jointF, keptPositions } from './terms.ts';
import { limitText, probability } from './words.ts';

/** One step of elimination or selection. */
export interface PathStep {
  readonly term: string;
  readonly action: 'enters' | 'leaves';
  /** The partial F of the term in the model that has it. Null where it depends on the others and has no column. */
  readonly test: FTest | null;
}

export interface StepsFound {
  /** Terms of the model reached, by index, ascending. */
  readonly terms: readonly number[];
  readonly path: readonly PathStep[];
  /** Why it ended there, as a sentence. */
  readonly because: string;
  /** Models that were fitted on the way. */
  readonly covered: number;
}

interface Move {
  readonly index: number;
  readonly action: 'enters' | 'leaves';
  readonly test: FTest | null;
}

/**
 * Backward elimination and forward selection by partial F (Efroymson 1960 where terms may both enter and leave): a
 * term of several columns is tested with all of them; one that others need neither leaves before them nor enters
 * after them. Classical tests. Null where there is nothing to begin with: all terms together leave no degrees of freedom.
 */
export function searchSteps(
  family: FamilyModel & { readonly plan: StepFamilyPlan },
  factor: Factor,
  facts: RowFacts,
): StepsFound | null {
  const { plan } = family;
  const plain: Factor = { ...factor, triangle: { ...factor.triangle, lo: null } };
  let covered = 0;
  const all = plan.terms.map((_, index) => index);
  let own = plan.kind === 'backward' ? all : all.filter((index) => plan.terms[index]!.always);
  let fit = fitOf(own);
  if (plan.kind === 'backward' && !testable(fit)) return null;
  const path: PathStep[] = [];
  const seen = new Set<string>([own.join()]);
  for (;;) {
    const move = next();
    if ('because' in move) return { terms: own, path, because: move.because, covered };
    own =
      move.action === 'leaves'
        ? own.filter((index) => index !== move.index)
        : [...own, move.index].sort((a, b) => a - b);
    fit = fitOf(own);
    path.push({ term: family.terms[move.index]!.name, action: move.action, test: move.test });
    if (seen.has(own.join())) {
      return { terms: own, path, because: 'Terms would enter and leave without end from here.', covered };
    }
    seen.add(own.join());
  }

  function fitOf(terms: readonly number[]): Fit {
    covered++;
    const part = partFactor(plain, familyCandidate(family, terms, plan.name), facts);
    return fitCandidate(part.factor, part.candidate, part.facts, 'no condition number');
  }

  /** What ought to leave does so before anything enters. */
  function next(): Move | { readonly because: string } {
    const leaver = weakest();
    const entrant = plan.enterAt === null ? null : strongest();
    const leaves = leaver !== null && plan.leaveAt !== null && pOf(leaver) > plan.leaveAt ? leaver : null;
    const enters = entrant !== null && pOf(entrant) <= plan.enterAt! ? entrant : null;
    return leaves ?? enters ?? { because: whyNot(leaver, entrant) };
  }

  function whyNot(leaver: Move | null, entrant: Move | null): string {
    const sentences: string[] = [];
    if (plan.leaveAt !== null) {
      sentences.push(
        leaver === null
          ? 'No term is left that may leave.'
          : `No p-value of a term that may leave is above ${limitText(plan.leaveAt)}; the largest is ${probability(pOf(leaver))}, of ${nameOf(leaver)}.`,
      );
    }
    if (plan.enterAt !== null) {
      sentences.push(
        entrant === null
          ? 'No term is left that may enter.'
          : `No p-value of a term that may enter is at or below ${limitText(plan.enterAt)}; the smallest is ${probability(pOf(entrant))}, of ${nameOf(entrant)}.`,
      );
    }
    return sentences.join(' ');
  }

  /** The term with the largest p-value among those that no other needs. */
  function weakest(): Move | null {
    const free = own.filter(
      (index) => !plan.terms[index]!.always && !own.some((other) => plan.terms[other]!.needs.includes(index)),
    );
    const moves = free.map((index): Move => ({ index, action: 'leaves', test: testOf(fit, own, index) }));
    return moves.reduce<Move | null>(
      (worst, move) => (worst === null || isStronger(worst, move) ? move : worst),
      null,
    );
  }

  /** The term with the smallest p-value among those whose needs are in, in the model with it. */
  function strongest(): Move | null {
    const outside = all.filter((index) => {
      return !own.includes(index) && plan.terms[index]!.needs.every((need) => own.includes(need));
    });
    let best: Move | null = null;
    for (const index of outside) {
      const terms = [...own, index].sort((a, b) => a - b);
      const test = testOf(fitOf(terms), terms, index);
      if (test === null || test.p_value === null) continue;
      const move: Move = { index, action: 'enters', test };
      if (best === null || isStronger(move, best)) best = move;
    }
    return best;
  }

  function nameOf({ index }: Move): string {
    return family.terms[index]!.name;
  }

  /** Null where the term has no column of its own beside the others. */
  function testOf(from: Fit, terms: readonly number[], index: number): FTest | null {
    const term = from.candidate.terms[terms.indexOf(index)]!;
    return keptPositions(from, term).length === 0 ? null : jointF(from, term);
  }
}

/** One without a test says nothing: its p-value is 1. */
function pOf({ test }: Move): number {
  return test?.p_value ?? 1;
}

/** By p-value; where both are too small to be told apart, by the statistic. */
function isStronger(a: Move, b: Move): boolean {
  const [p, q] = [pOf(a), pOf(b)];
  return p === q ? (a.test?.statistic ?? 0) > (b.test?.statistic ?? 0) : p < q;
}
