import { checkExpression } from '../expression/check-expression.ts';
import { comparedTexts } from '../expression/compared-texts.ts';
import type { Expression, Span, ValueType } from '../expression/expression.ts';
import { parseExpression } from '../expression/parse-expression.ts';
import { didYouMean, type Names, valueTypeOf } from './names.ts';
import { type Path, quote, showPath } from './path.ts';
import { faultAt, type Reading } from './reading.ts';

export interface CheckedText {
  readonly expression: Expression;
  /** null where it is not known because of a fault. */
  readonly type: ValueType | null;
  /** Variables that it reads. */
  readonly names: readonly string[];
}

/** The tree of an expression in the study file, or null where its form is wrong, which is reported. */
export function parseText(reading: Reading, text: string, path: Path): Expression | null {
  const parsed = parseExpression(text);
  if ('expression' in parsed) return parsed.expression;
  const { code, start, end, message, hint } = parsed.fault;
  faultAt(reading, code, reading.written.placeWithin(path, start, end), message, hint);
  return null;
}

/**
 * Checks names, types and compared levels of an expression against the variables that it can see. Stretches
 * in `told` hold names that are reported already, or that are known without a type: nothing is said of them.
 */
export function checkText(
  reading: Reading,
  expression: Expression,
  path: Path,
  names: Names,
  told: readonly Span[],
): CheckedText {
  const typeOf = (name: string): ValueType | null => {
    const type = names.get(name)?.type ?? null;
    return type === null ? null : valueTypeOf(type);
  };
  const known = [...names.keys()];
  const checked = checkExpression(expression, typeOf, known);
  for (const { code, start, end, message, hint } of checked.faults) {
    if (code === 'expression_name' && told.some((span) => span.start === start && span.end === end)) continue;
    faultAt(reading, code, reading.written.placeWithin(path, start, end), message, hint);
  }
  for (const { variable, text, start, end } of comparedTexts(expression)) {
    const levels = names.get(variable)?.levels ?? null;
    if (levels === null || levels.includes(text)) continue;
    const message = `${showPath(path)} compares ${variable} with ${quote(text)}, which is not among its levels.`;
    const hint = didYouMean(text, levels);
    faultAt(reading, 'level_undeclared', reading.written.placeWithin(path, start, end), message, hint);
  }
  return { expression, type: checked.type, names: checked.names };
}

/** Every use of a name in an expression, in the order of the text. */
export function nameUses(expression: Expression): readonly (Span & { readonly name: string })[] {
  switch (expression.kind) {
    case 'name':
      return [expression];
    case 'negate':
    case 'not':
      return nameUses(expression.of);
    case 'binary':
      return [...nameUses(expression.left), ...nameUses(expression.right)];
    case 'call':
      return expression.arguments.flatMap(nameUses);
    default:
      return [];
  }
}

/** Names that are known although their type is not: what is wrong with them is told elsewhere. */
export function untypedUses(expression: Expression, names: Names): readonly Span[] {
  return nameUses(expression).filter(({ name }) => names.has(name) && names.get(name)?.type === null);
}
