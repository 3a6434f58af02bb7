/** Keys and indexes from the top of the study file to a value. */
export type Path = readonly (string | number)[];

/** "candidates[1].terms[2]"; a key that is not a plain word stands in brackets and quotes. */
export function showPath(path: Path): string {
  let shown = '';
  for (const step of path) {
    if (typeof step === 'number') shown += `[${step}]`;
    else if (!/^[\p{L}_][\p{L}\p{M}\p{N}_]*$/u.test(step)) shown += `[${JSON.stringify(shorten(step))}]`;
    else shown += shown === '' ? step : `.${step}`;
  }
  return shown;
}

/** A text from the file as a message quotes it: in quotation marks, on one line and not without end. */
export function quote(text: string): string {
  return `"${shorten(text.replaceAll(/\s+/g, ' '))}"`;
}

function shorten(text: string): string {
  return text.length <= 60 ? text : `${text.slice(0, 57)}…`;
}

/** "a, b and c" */
export function listed(words: readonly string[], last: 'and' | 'or'): string {
  return words.length < 2 ? words.join('') : `${words.slice(0, -1).join(', ')} ${last} ${words.at(-1)}`;
}
