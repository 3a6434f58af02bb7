import { type Document, isCollection, isScalar, LineCounter, parseDocument, visit } from 'yaml';
import type { Report, SourcePlace } from '../problem.ts';
import { nestedTooDeep } from './nesting.ts';
import type { Path } from './path.ts';
import { offsetsInSource } from './scalar-offsets.ts';
import { type PlaceAt, rangeOf, type Spot, spelt, walkDocument } from './walk-yaml.ts';
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

  const walked = walkDocument(document.contents, placeAt, report);
  return walked === null ? null : { value: walked.value, ...lookUps(walked.spot, text, placeAt) };
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
