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
  const nodes = [...nodesOf(program)];
  const known = new Set([...partials, ...nodes.flatMap(inlineName)]);
  return nodes.flatMap((node) => {
    const fault = faultOf(node, known);
    return fault === null ? [] : [fault];
  });
}

/** Every node of the tree, in the order of the text. */
function* nodesOf(value: unknown): Generator<Node> {
  if (Array.isArray(value)) for (const part of value) yield* nodesOf(part);
  if (!isNode(value)) return;
  yield value;
  for (const [key, part] of Object.entries(value)) if (key !== 'loc') yield* nodesOf(part);
}

/** The name that an inline partial is declared under. */
function inlineName(node: Node): string[] {
  if (node.type !== 'DecoratorBlock') return [];
  const [name] = node.params as Node[];
  return name?.type === 'StringLiteral' ? [String(name.value)] : [];
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

/** What Handlebars threw, with the line where it can be told. */
export function faultThrown(fault: unknown, program: unknown): TemplateFault {
  const text = fault instanceof Error ? fault.message : String(fault);
  if (fault instanceof RangeError)
    return { message: 'The template calls itself without end.', line: 1, column: 1 };
  const parse = /^Parse error on line (\d+):\n([\s\S]*)$/.exec(text);
  if (parse !== null) {
    // The parser's own words name its tokens, which say nothing to a writer of templates.
    const ends = /got 'EOF'$/.test(parse[2]!);
    return {
      message: ends
        ? 'The template cannot be read: it ends inside braces or a block that are not closed.'
        : 'The template cannot be read: these braces do not hold what braces may.',
      line: Number(parse[1]),
      column: 1,
    };
  }
  // A path that goes on below something that is not there is a plain TypeError without a place.
  const read = /^Cannot read properties of (?:undefined|null) \(reading '(.+)'\)$/.exec(text)?.[1];
  if (read !== undefined) return pathFault(read, program);
  const { lineNumber, column: col } = fault as { lineNumber?: unknown; column?: unknown };
  const line = typeof lineNumber === 'number' ? lineNumber : Number(/ - (\d+):(\d+)$/.exec(text)?.[1] ?? 1);
  const column = typeof col === 'number' ? col + 1 : 1;
  const missing = /^"([^"]+)" not defined in/.exec(text);
  if (missing !== null) return { message: absent(missing[1]!), line, column };
  return { message: `The template cannot be used: ${ended(text.replace(/ - \d+:\d+$/, ''))}`, line, column };
}

function absent(path: string): string {
  return `The template asks for "${path}", which the view does not hold there.`;
}

function ended(text: string): string {
  return text.replace(/\.?$/, '.');
}

/** The first path of the template that goes through this name below another. */
function pathFault(name: string, program: unknown): TemplateFault {
  for (const node of nodesOf(program)) {
    const parts = node.type === 'PathExpression' ? (node.parts as unknown[]) : [];
    if (!parts.slice(1).includes(name)) continue;
    const start = node.loc?.start ?? { line: 1, column: 0 };
    return { message: absent(String(node.original)), line: start.line, column: start.column + 1 };
  }
  return { message: absent(name), line: 1, column: 1 };
}
