import type { Expression, Span } from '../expression/expression.ts';
import type { Named } from './names.ts';
import { quote, showPath } from './path.ts';
import { entriesInOrder, fault, faultAt, keyFault, type Reading } from './reading.ts';
import { checkText, nameUses, parseText, untypedUses } from './resolve-expression.ts';
import { checkReserved } from './resolve-variables.ts';
import type { DerivationPlan } from './study.ts';

/**
 * The derived variables, in order. Each sees the declared variables and the derived ones above it; a use of one
 * below is reported as such, or as a cycle where that one needs this one.
 */
export function resolveDerivations(
  reading: Reading,
  declared: readonly Named[],
): {
  readonly derive: readonly DerivationPlan[];
  readonly names: ReadonlyMap<string, Named>;
  /** Names that each derived variable's expression reads. */
  readonly reads: ReadonlyMap<string, readonly string[]>;
} {
  const names = new Map(declared.map((named) => [named.name, named]));
  const entries = entriesInOrder(reading, reading.file.derive, ['derive']);
  const parsed = new Map<string, Expression>();
  for (const [name, written] of entries) {
    if (written?.expression === undefined) continue;
    const expression = parseText(reading, written.expression, ['derive', name, 'expression']);
    if (expression !== null) parsed.set(name, expression);
  }
  const reads = new Map(
    [...parsed].map(([name, expression]) => [name, nameUses(expression).map((use) => use.name)]),
  );

  const derive: DerivationPlan[] = [];
  const order = entries.map(([name]) => name);
  entries.forEach(([name, written], index) => {
    const path = ['derive', name];
    checkReserved(reading, name, path);
    const twice = names.has(name);
    if (twice) {
      const message = `${showPath(path)} has the name of a declared variable.`;
      keyFault(reading, 'name_twice', path, message, 'Give the derived variable a name of its own.');
    }
    const expression = parsed.get(name);
    let type: DerivationPlan['type'] | null = null;
    if (expression !== undefined && written?.expression !== undefined) {
      const below = new Set(order.slice(index).filter((each) => !names.has(each)));
      const told = reportBelow(reading, name, expression, below, reads);
      type = derivedType(reading, name, expression, names, told);
      const text = written.expression;
      if (type !== null) {
        derive.push({
          name,
          expression,
          text,
          unit: written.unit ?? null,
          label: written.label ?? null,
          type,
        });
      }
    }
    if (!twice) names.set(name, { name, derived: true, type, levels: null });
  });
  return { derive, names, reads };
}

/** Reports uses of derived variables that are not known yet; gives their stretches. */
function reportBelow(
  reading: Reading,
  name: string,
  expression: Expression,
  below: ReadonlySet<string>,
  reads: ReadonlyMap<string, readonly string[]>,
): readonly Span[] {
  const path = ['derive', name, 'expression'];
  const uses = nameUses(expression).filter((use) => below.has(use.name));
  const told = new Set<string>();
  for (const use of uses) {
    if (told.has(use.name)) continue;
    told.add(use.name);
    const place = reading.written.placeWithin(path, use.start, use.end);
    if (use.name === name) {
      faultAt(reading, 'derivation_cycle', place, `${showPath(['derive', name])} is derived from itself.`);
    } else if (needs(use.name, name, reads)) {
      const message = `${showPath(['derive', name])} is derived from ${use.name}, which is derived from ${name} in turn.`;
      faultAt(reading, 'derivation_cycle', place, message);
    } else {
      const message = `${showPath(path)} names ${quote(use.name)}, which is derived only further down.`;
      faultAt(reading, 'name_unknown', place, message, `Move ${use.name} above ${name}.`);
    }
  }
  return uses;
}

/** Whether `from` reads `wanted`, itself or through others. */
function needs(from: string, wanted: string, reads: ReadonlyMap<string, readonly string[]>): boolean {
  const seen = new Set<string>();
  const open = [from];
  for (let name = open.pop(); name !== undefined; name = open.pop()) {
    if (name === wanted) return true;
    if (seen.has(name)) continue;
    seen.add(name);
    open.push(...(reads.get(name) ?? []));
  }
  return false;
}

function derivedType(
  reading: Reading,
  name: string,
  expression: Expression,
  names: ReadonlyMap<string, Named>,
  told: readonly Span[],
): DerivationPlan['type'] | null {
  const path = ['derive', name, 'expression'];
  const { type } = checkText(reading, expression, path, names, [...told, ...untypedUses(expression, names)]);
  if (type !== 'text' && type !== 'category') return type;
  const message = `${showPath(path)} yields a ${type}; a derived variable is a number, a condition or a date.`;
  fault(reading, 'expression_type', path, message);
  return null;
}
