/** No study is written deeper than this; the shape itself goes eight levels down. */
const DEEPEST = 60;
/** Columns of indentation, and indicators such as "- - -", before the content of a line. */
const WIDEST_INDENT = 200;

/**
 * Offset at which a YAML text is nested deeper than any study can be, or null. To be asked before the text
 * is parsed: the parser calls itself for each level, and a text of brackets alone can exhaust the stack. Brackets
 * in quotes and comments are counted too, which is harmless at this limit.
 */
export function nestedTooDeep(text: string): number | null {
  let brackets = 0;
  // Keys one after another with no comma between them ("a: a: a:") nest as brackets do.
  let keys = 0;
  let lineStart = 0;
  let inIndent = true;
  for (let at = 0; at < text.length; at++) {
    const character = text[at]!;
    if (character === '\n') {
      lineStart = at + 1;
      inIndent = true;
      if (brackets === 0) keys = 0;
      continue;
    }
    const indicator = (character === '-' || character === '?' || character === ':') && isBlank(text[at + 1]);
    if (inIndent && !isBlank(character)) {
      inIndent = indicator;
      if (at - lineStart > WIDEST_INDENT) return at;
    }
    if (character === '[' || character === '{') brackets++;
    else if (character === ']' || character === '}') brackets = Math.max(0, brackets - 1);
    if (character === ',' || character === ']' || character === '}') keys = 0;
    else if (indicator && character !== '-') keys++;
    if (brackets > DEEPEST || keys > DEEPEST) return at;
  }
  return null;
}

function isBlank(character: string | undefined): boolean {
  return (
    character === undefined ||
    character === ' ' ||
    character === '\t' ||
    character === '\r' ||
    character === '\n'
  );
}
