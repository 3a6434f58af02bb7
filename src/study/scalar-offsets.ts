import { Scalar } from 'yaml';

/**
 * For each character of a scalar's text, and for its end, the offset in the source where it stands; null where
 * the source spells the text in a way that cannot be followed (an escape such as \u00b3). Length of the text + 1.
 */
export function offsetsInSource(scalar: Scalar, source: string): readonly number[] | null {
  if (typeof scalar.value !== 'string' || scalar.range === null || scalar.range === undefined) return null;
  const text = scalar.value;
  let [at, end] = [scalar.range[0], scalar.range[1]];
  if (scalar.type === Scalar.QUOTE_DOUBLE || scalar.type === Scalar.QUOTE_SINGLE) {
    at++;
    end--;
  } else if (scalar.type === Scalar.BLOCK_FOLDED || scalar.type === Scalar.BLOCK_LITERAL) {
    at = source.indexOf('\n', at) + 1;
  }
  const offsets: number[] = [];
  for (let index = 0; index < text.length; index++) {
    const wanted = text[index]!;
    if (isBlank(wanted)) {
      // A blank of the text may be folded from a line break and an indentation.
      while (
        at < end &&
        isBlank(source[at]!) &&
        isBlank(source[at + 1] ?? '') &&
        !isBlank(text[index + 1] ?? '')
      )
        at++;
      if (!isBlank(source[at] ?? '')) return trailing(text, index) ? padded(offsets, at, text.length) : null;
    } else {
      while (at < end && isBlank(source[at]!)) at++;
      if (scalar.type === Scalar.QUOTE_DOUBLE && source[at] === '\\' && source[at + 1] === wanted) at++;
      if (source[at] !== wanted || at >= end) return null;
    }
    offsets.push(at);
    at++;
    if (wanted === "'" && scalar.type === Scalar.QUOTE_SINGLE) at++;
  }
  offsets.push(at);
  return offsets;
}

/** Whether nothing but blanks follows: the line break that ends a block need not stand in the source. */
function trailing(text: string, index: number): boolean {
  return text.slice(index).trim() === '';
}

function padded(offsets: readonly number[], at: number, length: number): readonly number[] {
  return [...offsets, ...Array.from({ length: length + 1 - offsets.length }, () => at)];
}

function isBlank(character: string): boolean {
  return character === ' ' || character === '\n' || character === '\t' || character === '\r';
}
