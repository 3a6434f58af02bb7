/** SVG as text. Everything that comes from a study passes through `escaped`; no path ever holds a NaN. */

/** A drawing with the sentence that it shows. */
export interface Figure {
  /** The drawing: one `<svg>` element with title and description, or an empty string where there is none. */
  readonly svg: string;
  /** The finding that it shows, as a sentence. */
  readonly caption: string;
}

export function escaped(text: string): string {
  return (
    text
      .replace(/&/g, '&amp;')
      .replace(/</g, '&lt;')
      .replace(/>/g, '&gt;')
      .replace(/"/g, '&quot;')
      .replace(/'/g, '&#39;')
      // Characters that XML does not allow would break a drawing that is saved by itself.
      // biome-ignore lint/suspicious/noControlCharactersInRegex: these are the characters to be taken out
      .replace(/[\u0000-\u0008\u000b\u000c\u000e-\u001f\ufffe\uffff]/g, '')
  );
}

/** A coordinate with one decimal; a number that is not finite throws, since it means a fault of ours. */
export function at(x: number): string {
  if (!Number.isFinite(x)) throw new Error('A drawing was given a coordinate that is not a number.');
  return tenths(Math.round(x * 10));
}

/** Texts of the tenths from 0 on: a report asks for the same few thousand tens of thousands of times. */
const TENTHS: string[] = [];
const MOST_TENTHS = 8192;

function tenths(k: number): string {
  // Adding 0 takes the sign off −0, and is several times quicker than toFixed.
  if (!(k >= 0 && k < MOST_TENTHS)) return String(k / 10 + 0);
  for (let next = TENTHS.length; next <= k; next++) TENTHS.push(String(next / 10));
  return TENTHS[k]!;
}

type Attributes = Readonly<Record<string, string | number | null>>;

/** An element; numbers are coordinates, null leaves the attribute out. `inner` is SVG, already escaped. */
export function element(name: string, attributes: Attributes, inner = ''): string {
  const written = Object.entries(attributes)
    .filter(([, value]) => value !== null)
    .map(([key, value]) => ` ${key}="${typeof value === 'number' ? at(value) : escaped(value as string)}"`)
    .join('');
  return inner === '' ? `<${name}${written}/>` : `<${name}${written}>${inner}</${name}>`;
}

/** A piece of text. */
export function label(x: number, y: number, text: string, className: string, anchor = 'start'): string {
  return element(
    'text',
    { x, y, class: className, 'text-anchor': anchor === 'start' ? null : anchor },
    escaped(text),
  );
}

/** Cuts a text that would run out of its place; the full text stands in the page's tables. */
export function clipped(text: string, longest: number): string {
  const letters = [...text];
  return letters.length <= longest
    ? text
    : `${letters
        .slice(0, longest - 1)
        .join('')
        .trimEnd()}…`;
}

/** The whole drawing. `name` is unique on the page: it makes the ids of title and description. */
export function drawing(
  name: string,
  size: { readonly width: number; readonly height: number },
  title: string,
  description: string,
  inner: string,
): string {
  return `<svg class="chart" viewBox="0 0 ${at(size.width)} ${at(size.height)}" role="img" aria-labelledby="${name}-t ${name}-d"><title id="${name}-t">${escaped(title)}</title><desc id="${name}-d">${escaped(description)}</desc>${inner}</svg>`;
}

/** A place across a strip, from −5 to 5: a fixed scatter keeps dots apart without a random number. */
export function scatter(i: number): number {
  return ((i * 7) % 11) - 5;
}

/** The path from point to point; empty for fewer than two. */
export function through(xs: ArrayLike<number>, ys: ArrayLike<number>): string {
  if (xs.length < 2) return '';
  let path = `M${at(xs[0]!)} ${at(ys[0]!)}`;
  for (let i = 1; i < xs.length; i++) path += `L${at(xs[i]!)} ${at(ys[i]!)}`;
  return path;
}

/** The path around what lies between two courses over the same places; empty for fewer than two. */
export function between(xs: ArrayLike<number>, upper: ArrayLike<number>, lower: ArrayLike<number>): string {
  let path = through(xs, upper);
  if (path === '') return '';
  for (let i = xs.length - 1; i >= 0; i--) path += `L${at(xs[i]!)} ${at(lower[i]!)}`;
  return `${path}Z`;
}

/**
 * Many dots as one path of zero-length strokes with round ends: a tenth of the size of as many circles.
 * Dots that fall on one another at a tenth of a unit are drawn once; what is not finite is left out.
 */
export function dots(xs: ArrayLike<number>, ys: ArrayLike<number>, className: string): string {
  const seen = new Set<number>();
  let path = '';
  for (let i = 0; i < xs.length; i++) {
    const [x, y] = [xs[i]!, ys[i]!];
    if (!Number.isFinite(x) || !Number.isFinite(y)) continue;
    const [kx, ky] = [Math.round(x * 10), Math.round(y * 10)];
    // One number for both, exact for whatever lies within a thousand drawings of this one.
    const place = kx * 2 ** 26 + ky;
    if (seen.has(place)) continue;
    seen.add(place);
    path += `M${tenths(kx)} ${tenths(ky)}h0`;
  }
  return path === '' ? '' : `<path class="${className}" d="${path}"/>`;
}
