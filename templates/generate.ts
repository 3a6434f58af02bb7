/**
 * Compiles the templates of this folder ahead of time, so that a run spends no time on it (compiling them took
 * about 200 ms of processor time, loading the compiled ones takes about 10):
 *
 *     npx tsx templates/generate.ts            writes src/report/templates.generated.ts, its like for the overview, and view.md
 *     npx tsx templates/generate.ts --check    exits 1 if it is not fresh
 */
import { readdirSync, readFileSync, writeFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import Handlebars from 'handlebars';
import { viewReference } from './view-reference.ts';

const TARGET = new URL('../src/report/templates.generated.ts', import.meta.url);
/** The reference for people who write templates of their own. */
const REFERENCE = new URL('view.md', import.meta.url);
const OVERVIEW_TARGET = new URL('../src/report/overview-templates.generated.ts', import.meta.url);

const NOTE =
  '// Generated from templates/ by templates/generate.ts. Change a template, then: npx tsx templates/generate.ts';

/** The text of the generated module of the overview, which few runs need; it uses the partials of the other. */
export function compiledOverview(): string {
  return [
    NOTE,
    '// @ts-nocheck',
    `export const OVERVIEW_HTML: unknown = ${compiled('overview.html.hbs', false)};`,
    `export const OVERVIEW_MARKDOWN: unknown = ${compiled('overview.md.hbs', true)};`,
    '',
  ].join('\n');
}

/** Markdown is escaped when its view is made, not by Handlebars, which would escape for HTML. */
function compiled(file: string, markdown: boolean): string {
  const text = readFileSync(new URL(file, import.meta.url), 'utf8');
  return String(Handlebars.precompile(text, { strict: true, noEscape: markdown }));
}

/** The text of the generated module. */
export function compiledTemplates(): string {
  const partials = readdirSync(new URL('partials/', import.meta.url))
    .filter((file) => file.endsWith('.hbs'))
    .sort();
  const entries = partials.map(
    (file) => `  '${file.slice(0, -4)}': ${compiled(`partials/${file}`, file.startsWith('markdown-'))},`,
  );
  return [
    NOTE,
    '// @ts-nocheck',
    `export const HTML: unknown = ${compiled('report.html.hbs', false)};`,
    `export const MARKDOWN: unknown = ${compiled('report.md.hbs', true)};`,
    `export const COMPARISON_HTML: unknown = ${compiled('comparison.html.hbs', false)};`,
    `export const COMPARISON_MARKDOWN: unknown = ${compiled('comparison.md.hbs', true)};`,
    'export const PARTIALS: Readonly<Record<string, unknown>> = {',
    ...entries,
    '};',
    '',
  ].join('\n');
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  for (const [target, text] of [
    [TARGET, compiledTemplates()],
    [OVERVIEW_TARGET, compiledOverview()],
    [REFERENCE, viewReference()],
  ] as const) {
    if (!process.argv.includes('--check')) writeFileSync(target, text);
    else if (readFileSync(target, 'utf8') !== text) {
      process.stderr.write(`${fileURLToPath(target)} is not fresh: npx tsx templates/generate.ts\n`);
      process.exitCode = 1;
    }
  }
}
