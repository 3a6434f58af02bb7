/**
 * The tree of an expression. Offsets count characters (UTF-16 units) from the start of the
 * expression's text, so that a fault has a place inside it.
 */
export interface Span {
  readonly start: number;
  readonly end: number;
}

export type BinaryOperator =
  | '+'
  | '-'
  | '*'
  | '/'
  | '^'
  | '=='
  | '!='
  | '<'
  | '<='
  | '>'
  | '>='
  | 'and'
  | 'or';

export type Expression = Span &
  (
    | { readonly kind: 'number'; readonly value: number }
    | { readonly kind: 'text'; readonly value: string }
    | { readonly kind: 'truth'; readonly value: boolean }
    | { readonly kind: 'name'; readonly name: string }
    | { readonly kind: 'negate'; readonly of: Expression }
    | { readonly kind: 'not'; readonly of: Expression }
    | {
        readonly kind: 'binary';
        readonly operator: BinaryOperator;
        readonly left: Expression;
        readonly right: Expression;
      }
    | {
        readonly kind: 'call';
        readonly function: string;
        readonly functionSpan: Span;
        readonly arguments: readonly Expression[];
      }
  );

/** What an expression or a variable is to the type check. An integer is a number; an identifier is a text. */
export type ValueType = 'number' | 'flag' | 'category' | 'text' | 'date';

export interface ExpressionFault extends Span {
  readonly code: 'expression_syntax' | 'expression_name' | 'expression_type';
  readonly message: string;
  readonly hint?: string;
}
