import type HandlebarsNamespace from 'handlebars';
import { HELPER_NAMES } from './helpers.ts';

/** Something a template calls that is not there. Lines and columns count from 1. */
export interface TemplateFault {
  readonly message: string;
  readonly line: number;
  readonly column: number;
}

interface Node {
  readonly type: string;
  readonly loc?: { readonly start: { readonly line: number; readonly column: number } };
  readonly [key: string]: unknown;
}

/** Unknown helpers and partials, in the order of the text, so that all of them are told at once. */
export function templateFaults(
  program: ReturnType<typeof HandlebarsNamespace.parse>,
  partials: ReadonlySet<string>,
): TemplateFault[] {
  const inline = new Set(partials);
  const faults: TemplateFault[] = [];
  const visit = (value: unknown): void => {
    if (Array.isArray(value)) {
      for (const part of value) visit(part);
      return;
    }
    if (!isNode(value)) return;
    if (value.type === 'DecoratorBlock') {
      const [name] = value.params as Node[];
      if (name?.type === 'StringLiteral') inline.add(name.value as string);
    }
    const fault = faultOf(value, inline);
    if (fault !== null) faults.push(fault);
    for (const [key, part] of Object.entries(value)) if (key !== 'loc') visit(part);
  };
  visit(program);
  return faults;
}

function isNode(value: unknown): value is Node {
  return typeof value === 'object' && value !== null && 'type' in value;
}

function faultOf(node: Node, partials: ReadonlySet<string>): TemplateFault | null {
  const start = node.loc?.start ?? { line: 1, column: 0 };
  const place = { line: start.line, column: start.column + 1 };
  if (node.type === 'PartialStatement' || node.type === 'PartialBlockStatement') {
    const name = (node.name as Node | undefined)?.original;
    if (
      typeof name !== 'string' ||
      name === '@partial-block' ||
      partials.has(name) ||
      node.type === 'PartialBlockStatement'
    )
      return null;
    return { message: `There is no partial named "${name}".`, ...place };
  }
  const called =
    node.type === 'BlockStatement' ||
    node.type === 'SubExpression' ||
    (node.type === 'MustacheStatement' && ((node.params as unknown[]).length > 0 || node.hash !== undefined));
  if (!called) return null;
  const path = node.path as Node;
  const name = path.original;
  if (typeof name !== 'string') return null;
  const plainBlock = node.type === 'BlockStatement' && (node.params as unknown[]).length === 0;
  // {{#section}} without parameters walks a part of the view and needs no helper.
  if (plainBlock || HELPER_NAMES.has(name)) return null;
  return { message: `There is no helper named "${name}".`, ...place };
}
