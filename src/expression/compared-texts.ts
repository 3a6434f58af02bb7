import type { Expression, Span } from './expression.ts';

/** A text that an expression compares with a variable. */
export interface ComparedText extends Span {
  readonly variable: string;
  readonly text: string;
}

/** Every comparison of a variable with a written text, so that a text that is no level of a category can be named. */
export function comparedTexts(expression: Expression): readonly ComparedText[] {
  switch (expression.kind) {
    case 'negate':
    case 'not':
      return comparedTexts(expression.of);
    case 'call':
      return expression.arguments.flatMap(comparedTexts);
    case 'binary': {
      const { left, right } = expression;
      const deeper = [...comparedTexts(left), ...comparedTexts(right)];
      const [name, text] = left.kind === 'name' ? [left, right] : [right, left];
      if (name.kind !== 'name' || text.kind !== 'text') return deeper;
      return [...deeper, { variable: name.name, text: text.value, start: text.start, end: text.end }];
    }
    default:
      return [];
  }
}
