import { safeText } from './excerpt.ts';
import { bold, faint, type Terminal } from './terminal.ts';

/** One question that a reader asks, with its answer as lines or paragraphs. */
export interface Section {
  /** One word, at most nine letters. */
  readonly label: string;
  readonly paragraphs: readonly Paragraph[];
}

/** A text to be wrapped; one with a mark before its first line ("12", "·"); a line to be kept; or a table. */
export type Paragraph =
  | string
  | { readonly mark: string; readonly text: string }
  | { readonly line: string }
  | { readonly columns: readonly TableColumn[]; readonly rows: readonly (readonly string[])[] };

const LABEL = 9;

/**
 * The look of what is printed: a line hung down the page, the reader's questions on its left, the answers
 * on its right, the bob at the last of them.
 *
 *        asked │ How much fuel will the spring timetable burn?
 *              │
 *         data │ All 240 rows read were used.
 *       report ▼ results/ferry-fuel/report.html
 */
export function plumbLine(sections: readonly Section[], terminal: Terminal): string {
  const width = terminal.width - LABEL - 3;
  const lines: string[] = [];
  sections.forEach((section, index) => {
    if (index > 0) lines.push(`${' '.repeat(LABEL)} ${faint('│', terminal)}`);
    const answer = section.paragraphs.flatMap((paragraph) => laidOut(paragraph, width));
    answer.forEach((line, at) => {
      const label = at === 0 ? section.label : '';
      const bob = index === sections.length - 1 && at === answer.length - 1;
      const hung = bob ? bold('▼', terminal) : faint('│', terminal);
      lines.push(`${' '.repeat(LABEL - label.length)}${bold(label, terminal)} ${hung} ${line}`.trimEnd());
    });
  });
  return `${lines.join('\n')}\n`;
}

function laidOut(paragraph: Paragraph, width: number): string[] {
  if (typeof paragraph === 'string') return wrapped(printable(paragraph), width);
  if ('line' in paragraph) return [printable(paragraph.line)];
  if ('rows' in paragraph) return tableLines(paragraph.columns, paragraph.rows, width);
  const indent = paragraph.mark.length + 1;
  return wrapped(printable(paragraph.text), width - indent).map(
    (line, index) => (index === 0 ? `${paragraph.mark} ` : ' '.repeat(indent)) + line,
  );
}

/** Breaks at ordinary spaces only: a number keeps its unit. A word longer than the line has one of its own. */
export function wrapped(text: string, width: number): string[] {
  const lines: string[] = [];
  let line = '';
  for (const word of text.split(/[ \n\t]+/)) {
    if (line !== '' && shownLength(line) + 1 + shownLength(word) > width) {
      lines.push(line);
      line = word;
    } else {
      line = line === '' ? word : `${line} ${word}`;
    }
  }
  return [...lines, line];
}

/** A text on one line without characters that steer a terminal: names come from files of others. */
export function printable(text: string): string {
  return safeText(text.replace(/[\n\r\t]+/g, ' '));
}

export interface TableColumn {
  readonly heading: string;
  readonly align: 'left' | 'right';
  /** Whether its cells are shortened, with an ellipsis, where the table would be too wide. */
  readonly shrinks?: boolean;
}

/** Columns that shrink keep at least so many characters. */
const FEWEST = 12;

/** Headings, then rows, columns two spaces apart, as wide as they need or as `width` allows. */
function tableLines(
  columns: readonly TableColumn[],
  rows: readonly (readonly string[])[],
  width: number,
): string[] {
  const cells = [columns.map((column) => column.heading), ...rows].map((row) =>
    columns.map((_, j) => printable(row[j] ?? '')),
  );
  const widths = columns.map((_, j) => Math.max(...cells.map((row) => shownLength(row[j] ?? ''))));
  let excess = widths.reduce((sum, each) => sum + each, 2 * (columns.length - 1)) - width;
  columns.forEach((column, j) => {
    if (!column.shrinks || excess <= 0) return;
    const wide = widths[j] ?? 0;
    const narrower = Math.max(Math.min(FEWEST, wide), wide - excess);
    excess -= wide - narrower;
    widths[j] = narrower;
  });
  return cells.map((row) =>
    row
      .map((cell, j) => {
        const shown = columns[j]?.shrinks ? shortened(cell, widths[j] ?? 0) : cell;
        const gap = ' '.repeat(Math.max(0, (widths[j] ?? 0) - shownLength(shown)));
        return columns[j]?.align === 'right' ? gap + shown : shown + gap;
      })
      .join('  ')
      .trimEnd(),
  );
}

function shortened(text: string, widest: number): string {
  const letters = [...text];
  return letters.length <= widest ? text : `${letters.slice(0, widest - 1).join('')}…`;
}

/** Characters that take a place on the line: marks above letters and joiners take none. */
function shownLength(text: string): number {
  return [...text.replace(/\p{Mn}|\p{Cf}/gu, '')].length;
}
