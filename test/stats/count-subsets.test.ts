import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type CountedMember, countBetween, countSubsets } from '../../src/stats/count-subsets.ts';

/** By trying every set: counts by members and weight. */
function tried(members: readonly CountedMember[]): Map<string, number> {
  const counts = new Map<string, number>();
  for (let bits = 0; bits < 2 ** members.length; bits++) {
    const own = members.flatMap((_, k) => ((bits >> k) & 1 ? [k] : []));
    if (!own.every((k) => members[k]!.needs.every((need) => own.includes(need)))) continue;
    const key = `${own.length} ${own.reduce((sum, k) => sum + members[k]!.weight, 0)}`;
    counts.set(key, (counts.get(key) ?? 0) + 1);
  }
  return counts;
}

describe('counting subsets', () => {
  it('is what trying every set gives, with weights and needs', () => {
    const members = fc.array(
      fc.record({ weight: fc.nat({ max: 4 }), needs: fc.array(fc.nat({ max: 9 }), { maxLength: 2 }) }),
      { maxLength: 10 },
    );
    fc.assert(
      fc.property(members, (written) => {
        const closed: CountedMember[] = [];
        written.forEach(({ weight, needs }, k) => {
          const own = needs.filter((need) => need < k);
          closed.push({ weight, needs: [...new Set(own.flatMap((need) => [need, ...closed[need]!.needs]))] });
        });
        const { counts, exact } = countSubsets(closed);
        const found = new Map<string, number>();
        counts.forEach((row, size) => {
          row.forEach((count, weight) => {
            if (count > 0) found.set(`${size} ${weight}`, count);
          });
        });
        expect(found).toEqual(tried(closed));
        expect(exact).toBe(true);
      }),
    );
  });

  it('counts between limits, and does not tire of many', () => {
    const free = (count: number) =>
      countSubsets(Array.from({ length: count }, () => ({ weight: 1, needs: [] })));
    expect(countBetween(free(4), 0, 4)).toBe(16);
    expect(countBetween(free(4), 2, 3)).toBe(10);
    expect(countBetween(free(50), 0, 50)).toBe(2 ** 50);
    expect(countBetween(free(200), 0, 2)).toBe(1 + 200 + 19_900);
    expect(countBetween(countSubsets([]), 0, 0)).toBe(1);
    expect(countBetween(free(3), 0, 3, 1)).toBe(4);
  });

  it('says where the needs are too tangled to count', () => {
    // Every product of two of thirty members: each product needs both.
    const members: CountedMember[] = Array.from({ length: 30 }, () => ({ weight: 1, needs: [] }));
    for (let a = 0; a < 30; a++) for (let b = 0; b < a; b++) members.push({ weight: 1, needs: [a, b] });
    const counted = countSubsets(members);
    expect(counted.exact).toBe(false);
    expect(countBetween(counted, 1, 1)).toBeGreaterThanOrEqual(30);
  }, 60_000);
});
