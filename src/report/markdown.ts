import type { ReportView } from './view.ts';

/**
 * Escapes a text for Markdown, inside a table cell too: what a name contains stands there as text. Line
 * breaks become spaces.
 */
export function escapeMarkdown(text: string): string {
  return text
    .replace(/\s*[\r\n]+\s*/g, ' ')
    .replace(/[\\`*_[\]|~$]/g, '\\$&')
    .replace(/&/g, '&amp;')
    .replace(/</g, '&lt;')
    .replace(/>/g, '&gt;')
    .replace(/^([-+#=]|\d+(?=[.)]\s))/, (start) => (/\d/.test(start) ? start : `\\${start}`))
    .replace(/^(\d+)([.)])(?=\s)/, '$1\\$2');
}

/** Text for a fenced code block: nothing in it may end the block. */
function fenced(text: string): string {
  return text.replace(/[\r\n]+/g, ' ').replace(/`/g, "'");
}

/** The view with every text escaped for Markdown; drawings are left out, commands stand as code. */
export function markdownView(view: ReportView): ReportView {
  return {
    ...(mapped(view) as ReportView),
    again: { ...(mapped(view.again) as ReportView['again']), commands: view.again.commands.map(fenced) },
  };
}

/** Every text in a value escaped for Markdown; drawings are left out. */
export function mapped(value: unknown): unknown {
  if (typeof value === 'string') return escapeMarkdown(value);
  if (Array.isArray(value)) return value.map(mapped);
  if (typeof value !== 'object' || value === null) return value;
  return Object.fromEntries(
    Object.entries(value).map(([key, part]) => [key, key === 'svg' ? '' : mapped(part)]),
  );
}
