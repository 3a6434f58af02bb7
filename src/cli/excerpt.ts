/** Terminal columns that an excerpt takes at most. */
const WIDEST = 100;
/** Columns kept in view before the mark where a line is cut. */
const BEFORE = 30;

/** Letters of East Asian scripts and pictures take two columns of a terminal (Unicode Standard Annex 11, wide and full-width). */
const WIDE =
  /[\u1100-\u115f\u2e80-\u303e\u3041-\ua4cf\uac00-\ud7a3\uf900-\ufaff\ufe30-\ufe6f\uff01-\uff60\uffe0-\uffe6\u{1f300}-\u{1faff}\u{20000}-\u{3fffd}]/u;
const NO_WIDTH = /\p{M}|[\u200b-\u200d]/u;
/** Characters that a terminal would act on instead of showing them, and those that turn the direction of text. */
const UNSAFE = /[\p{Cc}\u200e\u200f\u202a-\u202e\u2066-\u2069\u2028\u2029]/gu;

interface Cell {
  /** Offset of the character in the line. */
  readonly at: number;
  readonly shown: string;
  readonly width: number;
}

/**
 * One line of a source text for a terminal with a mark beneath `length` characters from `column` (from 1, in UTF-16
 * units). Tabs become two blanks; a long line is cut around the mark.
 */
export function excerpt(
  line: string,
  column: number,
  length: number,
): { readonly text: string; readonly mark: string } {
  const start = column - 1;
  const cells = cellsOf(line);
  const first = cells.findIndex(({ at }) => at >= start);
  // A mark at the end of the line stands just behind it.
  const from = first < 0 ? cells.length : first;
  const last = cells.findIndex(({ at }) => at >= start + length);
  const to = Math.max(last < 0 ? cells.length : last, from);

  const window = widthOf(cells) <= WIDEST ? ([0, cells.length] as const) : cut(cells, from);
  const shown = cells.slice(window[0], window[1]);
  const head = window[0] > 0 ? '…' : '';
  const tail = window[1] < cells.length ? '…' : '';
  const indent = head.length + widthOf(cells.slice(window[0], from));
  const marked = Math.max(1, widthOf(cells.slice(from, Math.min(to, window[1]))));
  const text = `${head}${shown.map((cell) => cell.shown).join('')}${tail}`;
  return { text: text.trimEnd(), mark: `${' '.repeat(indent)}${'^'.repeat(marked)}` };
}

/** Text in which no character can steer the terminal: such a character is shown by its code. */
export function safeText(text: string): string {
  return text.replaceAll(
    UNSAFE,
    (character) => `<U+${character.codePointAt(0)!.toString(16).toUpperCase().padStart(4, '0')}>`,
  );
}

function cellsOf(line: string): readonly Cell[] {
  const cells: Cell[] = [];
  let at = 0;
  for (const character of line) {
    const shown = character === '\t' ? '  ' : safeText(character);
    cells.push({ at, shown, width: shown === character ? widthOfCharacter(character) : shown.length });
    at += character.length;
  }
  return cells;
}

function widthOfCharacter(character: string): number {
  if (NO_WIDTH.test(character)) return 0;
  return WIDE.test(character) ? 2 : 1;
}

function widthOf(cells: readonly Cell[]): number {
  return cells.reduce((sum, cell) => sum + cell.width, 0);
}

/** The stretch of cells, from one index to before another, that is shown with the mark at `from` in view. */
function cut(cells: readonly Cell[], from: number): readonly [number, number] {
  const room = WIDEST - 2;
  let begin = from;
  for (let width = 0; begin > 0 && width + cells[begin - 1]!.width <= BEFORE; begin--)
    width += cells[begin - 1]!.width;
  let end = begin;
  let width = 0;
  while (end < cells.length && width + cells[end]!.width <= room) width += cells[end++]!.width;
  while (begin > 0 && width + cells[begin - 1]!.width <= room) width += cells[--begin]!.width;
  return [begin, end];
}
