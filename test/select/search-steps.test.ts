import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { searchFamilies } from '../../src/select/search-families.ts';
import { fUpper } from '../../src/stats/distributions.ts';
import { drawn, familyOf, type PlainTerm } from './family-of.ts';
import { studyWith } from './study-with.ts';

const dot = (a: readonly number[], b: readonly number[]) =>
  a.reduce((sum, value, i) => sum + value * b[i]!, 0);

/** RSS and the number of independent columns, by Gram–Schmidt on the rows. */
function refit(columns: readonly (readonly number[])[], y: readonly number[]): { rss: number; p: number } {
  const basis: number[][] = [];
  const beside = (x: readonly number[]) => {
    let left = [...x];
    for (let pass = 0; pass < 2; pass++) {
      for (const unit of basis) {
        const part = dot(left, unit);
        left = left.map((value, i) => value - part * unit[i]!);
      }
    }
    return left;
  };
  for (const column of columns) {
    const left = beside(column);
    const length = Math.sqrt(dot(left, left));
    if (length > 1e-9 * Math.sqrt(dot(column, column))) basis.push(left.map((value) => value / length));
  }
  const left = beside(y);
  return { rss: dot(left, left), p: basis.length };
}

interface PlainStep {
  readonly action: 'enters' | 'leaves';
  readonly term: number;
  readonly f: number;
  readonly df1: number;
  readonly df2: number;
  readonly p: number;
}

/** Elimination and selection by refits of both models of every comparison. */
function plainPath(
  terms: readonly PlainTerm[],
  y: readonly number[],
  start: readonly number[],
  leaveAt: number | null,
  enterAt: number | null,
): { path: PlainStep[]; end: number[] } {
  const ones = y.map(() => 1);
  const solved = (own: readonly number[]) => refit([ones, ...own.flatMap((k) => terms[k]!.columns)], y);
  const compare = (smaller: readonly number[], larger: readonly number[]) => {
    const [s, l] = [solved(smaller), solved(larger)];
    const df1 = l.p - s.p;
    const df2 = y.length - l.p;
    const f = (s.rss - l.rss) / df1 / (l.rss / df2);
    return { f, df1, df2, p: fUpper(f, df1, df2) };
  };
  let own = [...start];
  const path: PlainStep[] = [];
  for (let count = 0; count < 40; count++) {
    const leavers = own
      .filter(
        (k) => terms[k]!.always !== true && !own.some((other) => (terms[other]!.needs ?? []).includes(k)),
      )
      .map((term) => ({
        term,
        action: 'leaves' as const,
        ...compare(
          own.filter((k) => k !== term),
          own,
        ),
      }))
      .sort((a, b) => b.p - a.p || a.f - b.f);
    if (leaveAt !== null && leavers[0] !== undefined && leavers[0].p > leaveAt) {
      path.push(leavers[0]);
      own = own.filter((k) => k !== leavers[0]!.term);
      continue;
    }
    const entrants = terms
      .map((_, k) => k)
      .filter((k) => !own.includes(k) && (terms[k]!.needs ?? []).every((need) => own.includes(need)))
      .map((term) => ({
        term,
        action: 'enters' as const,
        ...compare(
          own,
          [...own, term].sort((a, b) => a - b),
        ),
      }))
      .sort((a, b) => a.p - b.p || b.f - a.f);
    if (enterAt === null || entrants[0] === undefined || entrants[0].p > enterAt) break;
    path.push(entrants[0]);
    own = [...own, entrants[0].term].sort((a, b) => a - b);
  }
  return { path, end: own };
}

const problems = fc.record({
  seed: fc.integer({ min: 1, max: 1_000_000 }),
  widths: fc.array(fc.constantFrom(1, 1, 2), { minLength: 2, maxLength: 8 }),
  likeness: fc.constantFrom(0, 1),
  always: fc.nat({ max: 1 }),
});

function build({
  seed,
  widths,
  likeness,
  always,
}: {
  seed: number;
  widths: readonly number[];
  likeness: number;
  always: number;
}) {
  const next = drawn(seed);
  const shared = Array.from({ length: 40 }, next);
  const terms = widths.map((width, k): PlainTerm => {
    const columns = Array.from({ length: width }, () => shared.map((value) => likeness * value + next()));
    return { columns, always: k < always, needs: k > 2 && k % 3 === 0 ? [1] : [] };
  });
  const y = Array.from({ length: 40 }, (_, i) =>
    terms.slice(0, 4).reduce((sum, { columns }, k) => sum + ((k + 1) / 3) * columns[0]![i]!, 1.5 * next()),
  );
  return { terms, y };
}

describe.each([
  ['backward elimination', 'backward', 0.1, null],
  ['backward elimination with return', 'backward', 0.1, 0.05],
  ['forward selection', 'forward', null, 0.2],
  ['forward selection with leaving', 'forward', 0.25, 0.2],
] as const)('%s', (_, kind, leaveAt, enterAt) => {
  it('takes the steps that refits of every comparison take', () => {
    fc.assert(
      fc.property(problems, (problem) => {
        const { terms, y } = build(problem);
        const { design, factor, facts } = familyOf(terms, y, { kind, leaveAt, enterAt });
        const all = terms.map((_term, k) => k);
        const start = kind === 'backward' ? all : all.filter((k) => terms[k]!.always);
        const plain = plainPath(terms, y, start, leaveAt, enterAt);
        const found = searchFamilies(studyWith({}), design, { factor, facts }, { everySize: true });
        const [family] = found.families;
        expect(family!.path.map(({ action, term }) => [action, term])).toEqual(
          plain.path.map(({ action, term }) => [action, `t${term}`]),
        );
        family!.path.forEach(({ test }, k) => {
          const step = plain.path[k]!;
          expect([test!.df1, test!.df2]).toEqual([step.df1, step.df2]);
          expect(test!.statistic!).toBeCloseTo(step.f, 6);
          expect(Math.abs(test!.p_value! - step.p)).toBeLessThanOrEqual(1e-7);
        });
        expect(found.candidates[0]!.name).toBe('F');
        expect(found.candidates[0]!.terms.map(({ name }) => name)).toEqual(plain.end.map((k) => `t${k}`));
        expect(family!.because).not.toBe('');
      }),
      { numRuns: 80 },
    );
  });
});

describe('elimination', () => {
  it('lets a term go first that says nothing beside the others, without a test', () => {
    const { terms, y } = build({ seed: 8, widths: [1, 1], likeness: 0, always: 0 });
    const twin = { columns: [terms[0]!.columns[0]!.map((value) => 2 * value + 1)] };
    const { design, factor, facts } = familyOf([...terms, twin], y, {
      kind: 'backward',
      leaveAt: 0.9,
      enterAt: null,
    });
    const { families } = searchFamilies(studyWith({}), design, { factor, facts }, { everySize: true });
    expect(families[0]!.path[0]).toEqual({ term: 't2', action: 'leaves', test: null });
  });

  it('does not go round in a circle', () => {
    // Limits that a study file is not let have: what enters leaves at once.
    const { terms, y } = build({ seed: 9, widths: [1, 1, 1], likeness: 0, always: 0 });
    const { design, factor, facts } = familyOf(terms, y, { kind: 'forward', leaveAt: 1e-300, enterAt: 0.99 });
    const { families } = searchFamilies(studyWith({}), design, { factor, facts }, { everySize: true });
    expect(families[0]!.because).toBe('Terms would enter and leave without end from here.');
  });
});
