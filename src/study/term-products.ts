import { termPowers } from './resolve-terms.ts';
import type { TermPlan } from './study.ts';

/** A factor of a product: a variable or one form of it. */
interface Factor {
  readonly variable: string;
  /** 1 for the variable itself. */
  readonly power: number;
  /** What it is instead of a power. */
  readonly form: string | null;
}

/** A column of the design before categories are coded: a product of forms of different variables. */
export type TermProduct = readonly Factor[];

/** The products that a term stands for. */
export function termProducts(term: TermPlan): TermProduct[] {
  switch (term.kind) {
    case 'interaction':
      return term.of
        .map(termProducts)
        .reduce((products, more) => products.flatMap((left) => more.map((right) => [...left, ...right])));
    case 'bend':
      return [[{ variable: term.variable, power: 1, form: `${term.side} ${term.at}` }]];
    case 'spline':
      return [
        [{ variable: term.variable, power: 1, form: null }],
        ...term.knots.slice(2).map((_, index): TermProduct => {
          return [{ variable: term.variable, power: 1, form: `curve ${index + 1} ${term.knots.join(' ')}` }];
        }),
      ];
    default:
      return termPowers(term).map((power) => [{ variable: term.variable, power, form: null }]);
  }
}

/** Equal for the same product in another order. */
export function productKey(product: TermProduct): string {
  return JSON.stringify(product.map((factor) => JSON.stringify(factor)).sort());
}

/**
 * What a product contains: the products of fewer of its factors, and those with a lower power of one (the principle of
 * marginality, Nelder 1977).
 */
export function partsOf(product: TermProduct): TermProduct[] {
  const found = new Map<string, TermProduct>();
  const open: TermProduct[] = [product];
  for (const each of open) {
    for (let k = 0; k < each.length; k++) {
      const { variable, power, form } = each[k]!;
      const rest = [...each.slice(0, k), ...each.slice(k + 1)];
      const parts = power > 1 ? [rest, [...rest, { variable, power: power - 1, form }]] : [rest];
      for (const part of parts) {
        const key = productKey(part);
        if (part.length === 0 || found.has(key)) continue;
        found.set(key, part);
        open.push(part);
      }
    }
  }
  return [...found.values()];
}

/** "cargo × vessel", "speed to the power 2". */
export function productName(product: TermProduct): string {
  return product
    .map(({ variable, power, form }) =>
      form !== null ? `${variable} (${form})` : power === 1 ? variable : `${variable} to the power ${power}`,
    )
    .join(' × ');
}
