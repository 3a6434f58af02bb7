import type { Expression } from './expression.ts';

/** The variables that an expression reads, each once, in the order of the text. */
export function namesIn(expression: Expression): ReadonlySet<string> {
  const names = new Set<string>();
  collect(expression, names);
  return names;
}

function collect(node: Expression, names: Set<string>): void {
  switch (node.kind) {
    case 'name':
      names.add(node.name);
      return;
    case 'negate':
    case 'not':
      collect(node.of, names);
      return;
    case 'binary':
      collect(node.left, names);
      collect(node.right, names);
      return;
    case 'call':
      for (const argument of node.arguments) collect(argument, names);
  }
}
