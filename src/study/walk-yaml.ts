import {
  type Alias,
  isAlias,
  isCollection,
  isMap,
  isScalar,
  isSeq,
  type Node,
  type Pair,
  type Scalar,
} from 'yaml';
import type { Report, SourcePlace } from '../problem.ts';
import { type Path, quote, showPath } from './path.ts';

/** Where a value stands: its node, the node of its key, and what is below it. */
export interface Spot {
  readonly node: Node | null;
  readonly key: Node | null;
  readonly children: ReadonlyMap<string | number, Spot>;
}

/** The place of a stretch of the text, by offsets. */
export type PlaceAt = (start: number, end: number) => SourcePlace;

/** Values that aliases may repeat, all together. */
const MOST_REPEATED = 10_000;
const DEEPEST = 100;

/** Plain data of a YAML document and where each of its values stands; null where it cannot be taken, which is reported. */
export function walkDocument(contents: Node | null, placeAt: PlaceAt, report: Report): Walked | null {
  const walk: Walk = {
    placeAt,
    report,
    anchors: new Map(),
    open: new Set(),
    repeated: 0,
    aliasDepth: 0,
    failed: false,
  };
  const walked = walkNode(walk, contents, null, []);
  return walk.failed ? null : walked;
}

interface Walk {
  readonly placeAt: PlaceAt;
  readonly report: Report;
  readonly anchors: Map<string, Node>;
  /** Nodes being walked, to see an alias inside the value that it stands for. */
  readonly open: Set<Node>;
  repeated: number;
  aliasDepth: number;
  failed: boolean;
}

export interface Walked {
  readonly value: unknown;
  readonly spot: Spot;
}

function walkNode(walk: Walk, node: Node | null, key: Node | null, path: Path): Walked {
  if (walk.failed || node === null) return { value: null, spot: { node, key, children: new Map() } };
  if (isAlias(node)) return walkAlias(walk, node, key, path);
  if (walk.aliasDepth > 0 && ++walk.repeated > MOST_REPEATED) {
    fail(walk, node, 'yaml_alias_limit', 'Aliases repeat more values than any study needs.');
  }
  if (path.length > DEEPEST) fail(walk, node, 'yaml_alias_limit', 'Aliases nest too deeply for a study.');
  if (isScalar(node)) {
    if (node.anchor !== undefined) walk.anchors.set(node.anchor, node);
    return { value: node.value, spot: { node, key, children: new Map() } };
  }
  if (!isCollection(node)) return { value: null, spot: { node, key, children: new Map() } };
  if (node.anchor !== undefined) walk.anchors.set(node.anchor, node);
  walk.open.add(node);
  const walked = isMap(node)
    ? walkMap(walk, node, node.items, key, path)
    : isSeq(node)
      ? walkSeq(walk, node, node.items as Node[], key, path)
      : { value: null, spot: { node, key, children: new Map() } };
  walk.open.delete(node);
  return walked;
}

function walkSeq(walk: Walk, node: Node, items: readonly Node[], key: Node | null, path: Path): Walked {
  const children = new Map<number, Spot>();
  const value = items.map((item, index) => {
    const walked = walkNode(walk, item, null, [...path, index]);
    children.set(index, walked.spot);
    return walked.value;
  });
  return { value, spot: { node, key, children } };
}

function walkMap(walk: Walk, node: Node, pairs: readonly Pair[], key: Node | null, path: Path): Walked {
  const children = new Map<string, Spot>();
  const value: Record<string, unknown> = Object.create(null);
  for (const pair of pairs) {
    const keyNode = pair.key as Node | null;
    const name = keyText(walk, keyNode);
    if (name === null) continue;
    const first = children.get(name);
    if (first !== undefined) {
      reportTwice(walk, name, keyNode, first, path);
      continue;
    }
    const walked = walkNode(walk, pair.value as Node | null, keyNode, [...path, name]);
    children.set(name, walked.spot);
    value[name] = walked.value;
  }
  return { value, spot: { node, key, children } };
}

function walkAlias(walk: Walk, alias: Alias, key: Node | null, path: Path): Walked {
  const target = walk.anchors.get(alias.source);
  if (target === undefined)
    fail(walk, alias, 'yaml_syntax', `*${alias.source} stands for no earlier anchor &${alias.source}.`);
  else if (walk.open.has(target))
    fail(walk, alias, 'yaml_alias_limit', `*${alias.source} stands inside the value that it repeats.`);
  if (target === undefined || walk.failed)
    return { value: null, spot: { node: alias, key, children: new Map() } };
  walk.aliasDepth++;
  const walked = walkNode(walk, target, key, path);
  walk.aliasDepth--;
  return walked;
}

/** The text of a key, or null (reported) where it is none. */
function keyText(walk: Walk, key: Node | null): string | null {
  if (isAlias(key)) {
    fail(walk, key, 'yaml_syntax', 'A key cannot be an alias.', 'Write the key itself.');
    return null;
  }
  const node = key;
  if (isScalar(node)) {
    if (node.anchor !== undefined) walk.anchors.set(node.anchor, node);
    return spelt(node);
  }
  if (node === null) return '';
  fail(
    walk,
    key ?? node,
    'yaml_syntax',
    'A key here is a text, not a list or a mapping.',
    'Put a text with brackets in quotes.',
  );
  return null;
}

function reportTwice(walk: Walk, name: string, key: Node | null, first: Spot, path: Path): void {
  const firstLine = walk.placeAt(...rangeOf(first.key)).line;
  const under = path.length === 0 ? 'at the top' : `under ${showPath(path)}`;
  walk.report({
    code: 'yaml_duplicate_key',
    severity: 'error',
    place: walk.placeAt(...rangeOf(key)),
    message: `The key ${quote(name)} stands twice ${under}; first on line ${firstLine}.`,
    hint: 'Keep one of them.',
  });
}

function fail(
  walk: Walk,
  node: Node,
  code: 'yaml_syntax' | 'yaml_alias_limit',
  message: string,
  hint?: string,
): void {
  if (walk.failed) return;
  walk.failed = true;
  const place = walk.placeAt(...rangeOf(node));
  walk.report({ code, severity: 'error', place, message, ...(hint === undefined ? {} : { hint }) });
}

export function rangeOf(node: Node | null): [number, number] {
  const range = node?.range;
  return range === null || range === undefined ? [0, 1] : [range[0], range[1]];
}

export function spelt(node: Scalar): string {
  return node.source ?? String(node.value);
}
