import type { Expression } from '../../src/expression/expression.ts';

/** Writes a tree back as text with every parenthesis in place, so that precedence plays no part. */
export function writeExpression(node: Expression): string {
  switch (node.kind) {
    case 'number':
      return String(node.value);
    case 'text':
      return `"${node.value.replaceAll('"', '""')}"`;
    case 'truth':
      return String(node.value);
    case 'name':
      return `\`${node.name.replaceAll('`', '``')}\``;
    case 'negate':
      return `(-${writeExpression(node.of)})`;
    case 'not':
      return `(not ${writeExpression(node.of)})`;
    case 'binary':
      return `(${writeExpression(node.left)} ${node.operator} ${writeExpression(node.right)})`;
    case 'call':
      return `${node.function}(${node.arguments.map(writeExpression).join(', ')})`;
  }
}

const LEVELS = [['or'], ['and'], [], ['==', '!=', '<', '<=', '>', '>='], ['+', '-'], ['*', '/'], [], ['^']];

/** Writes a tree with as few parentheses as the rules of precedence allow. */
export function writeSparingly(node: Expression): string {
  return write(node, 0);
}

function write(node: Expression, least: number): string {
  const wrap = (text: string, level: number) => (level < least ? `(${text})` : text);
  switch (node.kind) {
    case 'negate':
      return wrap(`-${write(node.of, 6)}`, 6);
    case 'not':
      return wrap(`not ${write(node.of, 2)}`, 2);
    case 'binary': {
      const level = LEVELS.findIndex((operators) => operators.includes(node.operator));
      const [left, right] = level === 7 ? [8, 6] : level === 3 ? [4, 4] : [level, level + 1];
      return wrap(`${write(node.left, left)} ${node.operator} ${write(node.right, right)}`, level);
    }
    case 'call':
      return `${node.function}(${node.arguments.map((argument) => write(argument, 0)).join(', ')})`;
    default:
      return writeExpression(node);
  }
}

/** The tree without its places. */
export function bare(node: Expression): unknown {
  switch (node.kind) {
    case 'negate':
    case 'not':
      return { kind: node.kind, of: bare(node.of) };
    case 'binary':
      return { kind: 'binary', operator: node.operator, left: bare(node.left), right: bare(node.right) };
    case 'call':
      return { kind: 'call', function: node.function, arguments: node.arguments.map(bare) };
    case 'name':
      return { kind: 'name', name: node.name };
    default:
      return { kind: node.kind, value: node.value };
  }
}
