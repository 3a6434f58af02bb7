/** What a spreadsheet may take for a formula (OWASP, "CSV injection"), behind any number of apostrophes. */
const FORMULA = /^'*[=+\-@\t\r]/;
const GUARDED = /^''*[=+\-@\t\r]/;

/** One text as a CSV cell (RFC 4180) that is no formula; `unguardedText` gives it back after the quotes are gone. */
export function quotedCell(text: string): string {
  const safe = FORMULA.test(text) ? `'${text}` : text;
  return /[",\n\r]|^\s|\s$|^\ufeff/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe;
}

/** The text that was written as a cell, without the apostrophe that kept it from being a formula. */
export function unguardedText(cell: string): string {
  return GUARDED.test(cell) ? cell.slice(1) : cell;
}
