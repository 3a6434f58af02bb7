/**
 * The reference of the view object for people who write templates of their own: every key of `ReportView` and `ComparisonView`
 * with its value and meaning, read from the interfaces and docstrings of src/report/view.ts and comparison-view.ts, so that it cannot differ from what templates get.
 */
import { readFileSync } from 'node:fs';

const SOURCES = ['view.ts', 'comparison-view.ts', 'chart/svg.ts', 'words/caution.ts'] as const;

/** The views themselves, each with what its keys hold after it. */
const ROOTS = ['ReportView', 'ComparisonView'] as const;

/** One key of a part of the view. */
export interface ViewKey {
  readonly name: string;
  /** As the interface writes it, without `readonly`; "list" or "keys" where its own keys follow. */
  readonly type: string;
  readonly meaning: string;
  /** Keys of what is written in place. */
  readonly keys: readonly ViewKey[];
}

export interface ViewPart {
  readonly name: string;
  readonly meaning: string;
  readonly keys: readonly ViewKey[];
}

/** The text of templates/view.md. */
export function viewReference(): string {
  const parts = new Map(
    SOURCES.flatMap((file) =>
      partsOf(readFileSync(new URL(`../src/report/${file}`, import.meta.url), 'utf8')),
    ).map((part) => [part.name, part]),
  );
  const used = new Set(ROOTS.flatMap((root) => reachable(root, parts)));
  return `${[INTRODUCTION, ...[...used].map((name) => section(parts.get(name)!, parts))].join('\n\n')}\n`;
}

const INTRODUCTION = `<!-- Generated from src/report/view.ts and comparison-view.ts by templates/generate.ts. -->

# What a template is given

A template of your own stands in a study under \`report.templates\`: \`html\` and \`markdown\` for the report, which get a [ReportView](#reportview), and \`comparison.html\` and \`comparison.markdown\` for what is different from an earlier record, which get a [ComparisonView](#comparisonview). It is a Handlebars template, and it gets one object, the view, with the keys below: everything is already said in words and formatted numbers, so that a template only arranges. Every key is always there; what does not apply is null, an empty list or false. A key that is not in the view is told as an error with its line.

Text is plain text. In HTML \`{{name}}\` escapes it; in Markdown the view carries it escaped.

| helper | what it gives |
|---|---|
| \`{{drawing figure}}\` | The drawing of a figure: one \`<svg>\` element. |
| \`{{rich text}}\` | The text escaped, with names between backticks set as code. |
| \`{{join list ", "}}\` | The items of a list in a row. |

\`if\`, \`unless\`, \`each\`, \`with\` and \`lookup\` are there too; no other helper is, and nothing outside the view can be reached.

The shipped templates stand in this folder, and their parts may be used by name: \`{{> first-screen}}\`, \`{{> data}}\`, \`{{> tried}}\`, \`{{> says}}\`, \`{{> trust}}\`, \`{{> predicts}}\`, \`{{> careful}}\`, \`{{> again}}\`, \`{{> style}}\` and \`{{> mark}}\`, where the whole view of a report is at hand (the last two anywhere); \`{{> figure chart}}\` for one figure; and for Markdown \`{{> markdown-first-screen}}\`, \`{{> markdown-candidates}}\`, \`{{> markdown-coefficients}}\` and \`{{> markdown-trust}}\`.

A small page of one's own:

\`\`\`handlebars
<h1>{{title}}</h1>
{{#each head.answer}}<p>{{this}}</p>{{/each}}
{{#if predicts}}{{#if predicts.chart}}{{drawing predicts.chart}}{{/if}}{{/if}}
<ul>{{#each head.beware}}<li>{{rich this}}</li>{{/each}}</ul>
\`\`\``;

/** Every interface of a source file, with its keys. */
export function partsOf(source: string): ViewPart[] {
  const lines = source.split('\n');
  const parts: ViewPart[] = [];
  for (let i = 0; i < lines.length; i++) {
    const name = /^export interface (\w+) \{$/.exec(lines[i]!)?.[1];
    if (name === undefined) continue;
    const { keys, end } = keysFrom(lines, i + 1);
    parts.push({ name, meaning: meaningBefore(lines, i), keys });
    i = end;
  }
  return parts;
}

/** Keys from a line on, up to the brace that closes what holds them. */
function keysFrom(lines: readonly string[], start: number): { keys: ViewKey[]; end: number } {
  const keys: ViewKey[] = [];
  for (let i = start; i < lines.length; i++) {
    const line = lines[i]!.trim();
    if (line.startsWith('}')) return { keys, end: i };
    const found = /^readonly (\w+): (.*)$/.exec(line);
    if (found === null) continue;
    const [, name, rest] = found as unknown as [string, string, string];
    const meaning = meaningBefore(lines, i);
    if (!rest.endsWith('{')) {
      const inline = /^readonly \{ (.*) \}\[\];$/.exec(rest)?.[1];
      keys.push(
        inline === undefined
          ? { name, type: rest.replace(/;$/, ''), meaning, keys: [] }
          : { name, type: 'list', meaning, keys: inlineKeys(inline) },
      );
      continue;
    }
    const inner = keysFrom(lines, i + 1);
    const closing = lines[inner.end]!.trim();
    const type = `${closing.startsWith('}[]') ? 'list' : 'keys'}${closing.includes('| null') ? ' | null' : ''}`;
    keys.push({ name, type, meaning, keys: inner.keys });
    i = inner.end;
  }
  return { keys, end: lines.length };
}

function inlineKeys(text: string): ViewKey[] {
  return text.split(';').flatMap((part) => {
    const [, name, type] = /^\s*readonly (\w+): (.*)$/.exec(part) ?? [];
    return name === undefined || type === undefined ? [] : [{ name, type, meaning: '', keys: [] }];
  });
}

/** The docstring that ends just above a line, on one line; empty where there is none. */
function meaningBefore(lines: readonly string[], at: number): string {
  let start = at - 1;
  if (!lines[start]?.trim().endsWith('*/')) return '';
  while (start > 0 && !lines[start]!.trim().startsWith('/**')) start--;
  return lines
    .slice(start, at)
    .map((line) => line.trim().replace(/^\/\*\*\s?|^\*\/|^\*\s?|\s*\*\/$/g, ''))
    .join(' ')
    .trim();
}

/** Names of the parts in the order in which a reader meets them. */
function reachable(root: string, parts: ReadonlyMap<string, ViewPart>): string[] {
  const names = [root];
  for (const name of names) {
    for (const other of mentioned(parts.get(name)!.keys))
      if (parts.has(other) && !names.includes(other)) names.push(other);
  }
  return names;
}

function mentioned(keys: readonly ViewKey[]): string[] {
  return keys.flatMap((key) => [...(key.type.match(/[A-Z]\w+/g) ?? []), ...mentioned(key.keys)]);
}

function section({ name, meaning, keys }: ViewPart, parts: ReadonlyMap<string, ViewPart>): string {
  const rows = keys.flatMap((key) => rowsOf(key, '', parts));
  return [
    `## ${name}`,
    ...(name === ROOTS[0] || meaning === '' ? [] : [meaning]),
    ['| key | value | meaning |', '|---|---|---|', ...rows].join('\n'),
  ].join('\n\n');
}

function rowsOf(key: ViewKey, before: string, parts: ReadonlyMap<string, ViewPart>): string[] {
  const path = before + key.name;
  const inner = key.type.startsWith('list') ? `${path}[ ].` : `${path}.`;
  const cell = (text: string): string => text.replaceAll('|', '\\|');
  return [
    `| \`${path}\` | ${valueText(key.type, parts)} | ${cell(key.meaning)} |`,
    ...key.keys.flatMap((one) => rowsOf(one, inner, parts)),
  ];
}

/** A type as people say it. */
function valueText(type: string, parts: ReadonlyMap<string, ViewPart>): string {
  const [plain, orNull] = type.endsWith(' | null') ? [type.slice(0, -7), ' or null'] : [type, ''];
  const item = /^readonly (\w+)\[\]$/.exec(plain)?.[1];
  const one = (name: string): string =>
    parts.has(name)
      ? `[${name}](#${name.toLowerCase()})`
      : ({ string: 'text', boolean: 'true or false', number: 'number' }[name] ?? name);
  return `${item === undefined ? one(plain) : `list of ${one(item)}`}${orNull}`;
}
