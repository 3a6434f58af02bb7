import { escaped, type Figure } from './chart/svg.ts';

/** What a helper hands back when its text is HTML already. */
interface SafeText {
  toHTML(): string;
}
type MakeSafe = (html: string) => SafeText;

/** A helper that a template may call. */
export type Helper = (...given: readonly unknown[]) => unknown;

/**
 * The helpers beside those built into Handlebars (`if unless each with lookup`):
 *
 * - `{{drawing figure}}`: the figure's SVG, unescaped; the only HTML that is not written by a template.
 * - `{{rich text}}`: the text escaped, with `names` between backticks set as code.
 * - `{{join list separator}}`: the items of a list in a row.
 */
export function helpers(safe: MakeSafe): Readonly<Record<string, Helper>> {
  return {
    drawing: (figure) => safe(isFigure(figure) ? figure.svg : ''),
    rich: (text) => safe(escaped(String(text ?? '')).replace(/`([^`]+)`/g, '<code>$1</code>')),
    join: (list, separator) =>
      Array.isArray(list) ? list.join(typeof separator === 'string' ? separator : ', ') : '',
  };
}

/** The names of all helpers that a template may call. */
export const HELPER_NAMES: ReadonlySet<string> = new Set([
  'if',
  'unless',
  'each',
  'with',
  'lookup',
  'drawing',
  'rich',
  'join',
]);

function isFigure(value: unknown): value is Figure {
  return typeof value === 'object' && value !== null && 'svg' in value && typeof value.svg === 'string';
}
