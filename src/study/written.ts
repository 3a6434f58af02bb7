import {
  type Alias,
  type Document,
  isAlias,
  isCollection,
  isMap,
  isScalar,
  isSeq,
  LineCounter,
  type Node,
  type Pair,
  parseDocument,
  type Scalar,
  visit,
} from 'yaml';
import type { Report, SourcePlace } from '../problem.ts';
import { nestedTooDeep } from './nesting.ts';
import { type Path, quote, showPath } from './path.ts';
import { offsetsInSource } from './scalar-offsets.ts';
import { yamlFault } from './yaml-fault.ts';

/** A YAML text as plain data in which every value still knows where it stands. */
export interface Written {
  /** Mappings are objects without a prototype, so that no key can mean anything but itself. */
  readonly value: unknown;
  /** The place of a scalar or a list item; of a mapping or list under a key, the key. The nearest parent if absent. */
  readonly placeOf: (path: Path) => SourcePlace;
  /** The place of the key that a path ends in; as `placeOf` where it ends in an index. */
  readonly keyPlaceOf: (path: Path) => SourcePlace;
  /** A stretch of a scalar's text, in offsets of the text; the scalar where the source spells it otherwise. */
  readonly placeWithin: (path: Path, start: number, end: number) => SourcePlace;
  /** Keys of a mapping in the order of the text, which an object does not keep for keys such as "2024". */
  readonly keysAt: (path: Path) => readonly string[];
  /** A scalar as it is spelt ("007" of 007), or null where there is none. */
  readonly textAt: (path: Path) => string | null;
}

interface Spot {
  readonly node: Node | null;
  readonly key: Node | null;
  readonly children: ReadonlyMap<string | number, Spot>;
}

/** Values that aliases may repeat, all together. */
const MOST_REPEATED = 10_000;
const DEEPEST = 100;

/**
 * Reads YAML 1.2 (core schema, one document). Gives null where the text cannot be taken as data at all;
 * everything that is wrong is reported with its place in `file`.
 */
export function readYaml(text: string, file: string, report: Report): Written | null {
  const lines = new LineCounter();
  const placeAt = placer(text, lines, file);
  const deep = nestedTooDeep(text);
  if (deep !== null) {
    lineStarts(text, lines);
    report({
      code: 'yaml_syntax',
      severity: 'error',
      place: placeAt(deep, deep + 1),
      message: 'The text is nested too deeply for a study.',
    });
    return null;
  }

  const document = parseDocument(text, {
    lineCounter: lines,
    prettyErrors: false,
    schema: 'core',
    merge: false,
    resolveKnownTags: false,
    uniqueKeys: false,
    logLevel: 'error',
  });
  const faults = [...document.errors, ...document.warnings].sort((a, b) => a.pos[0] - b.pos[0]);
  let line = 0;
  for (const fault of faults) {
    const opened = fault.code === 'MISSING_CHAR' ? openedAt(document, fault.pos[0]) : null;
    const place = opened === null ? placeAt(fault.pos[0], fault.pos[1]) : placeAt(opened, opened + 1);
    // One slip often makes the parser stumble several times on the same line.
    if (place.line === line) continue;
    line = place.line;
    report({ ...yamlFault(fault, text), severity: 'error', place });
  }
  if (faults.length > 0) return null;

  const walk: Walk = {
    text,
    placeAt,
    report,
    anchors: new Map(),
    open: new Set(),
    repeated: 0,
    aliasDepth: 0,
    failed: false,
  };
  const { value, spot } = walkNode(walk, document.contents, null, []);
  return walk.failed ? null : { value, ...lookUps(spot, text, placeAt) };
}

/** Offset of the quotation mark that opens the text which ends unclosed at `end`, or null. */
function openedAt(document: Document, end: number): number | null {
  let opened: number | null = null;
  visit(document, {
    Scalar: (_, scalar) => {
      const quoted = scalar.type === 'QUOTE_DOUBLE' || scalar.type === 'QUOTE_SINGLE';
      if (quoted && scalar.range?.[1] === end) opened = scalar.range[0];
    },
  });
  return opened;
}

type PlaceAt = (start: number, end: number) => SourcePlace;

function placer(text: string, lines: LineCounter, file: string): PlaceAt {
  return (start, end) => {
    const { line, col } = lines.linePos(start);
    const lineEnd = text.indexOf('\n', start);
    const stop = Math.min(end, lineEnd < 0 ? text.length : lineEnd);
    const length = text.slice(start, stop).trimEnd().length;
    return {
      kind: 'source',
      file,
      line: Math.max(1, line),
      column: Math.max(1, col),
      length: Math.max(1, length),
    };
  };
}

/** What the parser does for a text that it is given. */
function lineStarts(text: string, lines: LineCounter): void {
  lines.addNewLine(0);
  for (let at = text.indexOf('\n'); at >= 0; at = text.indexOf('\n', at + 1)) lines.addNewLine(at + 1);
}

interface Walk {
  readonly text: string;
  readonly placeAt: PlaceAt;
  readonly report: Report;
  readonly anchors: Map<string, Node>;
  /** Nodes being walked, to see an alias inside the value that it stands for. */
  readonly open: Set<Node>;
  repeated: number;
  aliasDepth: number;
  failed: boolean;
}

interface Walked {
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

function rangeOf(node: Node | null): [number, number] {
  const range = node?.range;
  return range === null || range === undefined ? [0, 1] : [range[0], range[1]];
}

function spelt(node: Scalar): string {
  return node.source ?? String(node.value);
}

function lookUps(top: Spot, text: string, placeAt: PlaceAt): Omit<Written, 'value'> {
  const find = (path: Path): { spot: Spot; whole: boolean } => {
    let spot = top;
    for (const step of path) {
      const next = spot.children.get(step);
      if (next === undefined) return { spot, whole: false };
      spot = next;
    }
    return { spot, whole: true };
  };
  const placeOfSpot = (spot: Spot): SourcePlace => {
    const empty =
      spot.node === null || (isScalar(spot.node) && spot.node.range?.[0] === spot.node.range?.[1]);
    return placeAt(
      ...rangeOf(spot.key !== null && (empty || isCollection(spot.node)) ? spot.key : spot.node),
    );
  };
  const keyPlaceOfSpot = (spot: Spot) =>
    spot.key === null ? placeOfSpot(spot) : placeAt(...rangeOf(spot.key));
  return {
    placeOf: (path) => placeOfSpot(find(path).spot),
    keyPlaceOf: (path) => {
      const { spot, whole } = find(path);
      return whole ? keyPlaceOfSpot(spot) : placeOfSpot(spot);
    },
    placeWithin: (path, start, end) => {
      const { spot } = find(path);
      if (!isScalar(spot.node)) return placeOfSpot(spot);
      const offsets = offsetsInSource(spot.node, text);
      const from = offsets?.[start];
      const to = offsets?.[end];
      return from === undefined || to === undefined
        ? placeOfSpot(spot)
        : placeAt(from, Math.max(to, from + 1));
    },
    keysAt: (path) => {
      const { spot, whole } = find(path);
      return whole ? [...spot.children.keys()].filter((key) => typeof key === 'string') : [];
    },
    textAt: (path) => {
      const { spot, whole } = find(path);
      return whole && isScalar(spot.node) ? spelt(spot.node) : null;
    },
  };
}
