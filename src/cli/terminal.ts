/** Where a command prints, and what the other end can show. Tests pass one that collects. */
export interface Terminal {
  /** Results. */
  readonly out: (text: string) => void;
  /** Problems, warnings and progress. */
  readonly err: (text: string) => void;
  /** Whether results go to a terminal that shows colours. */
  readonly colour: boolean;
  /** Whether standard error is a terminal, so that a progress line may be drawn over itself. */
  readonly errIsTerminal: boolean;
  /** Characters in a line of results, at most 100. */
  readonly width: number;
}

const WIDEST = 100;
const NARROWEST = 48;

/** The process's own. Colour only on a terminal, and not where NO_COLOR is set (no-color.org). */
export function processTerminal(): Terminal {
  const { stdout, stderr, env } = process;
  return {
    out: (text) => stdout.write(text),
    err: (text) => stderr.write(text),
    colour: stdout.isTTY === true && (env.NO_COLOR ?? '') === '' && env.TERM !== 'dumb',
    errIsTerminal: stderr.isTTY === true && env.TERM !== 'dumb',
    width: Math.max(NARROWEST, Math.min(stdout.isTTY === true ? stdout.columns : WIDEST, WIDEST)),
  };
}

/** Text in bold, or as it is. */
export function bold(text: string, terminal: Terminal): string {
  return terminal.colour ? `\u001b[1m${text}\u001b[22m` : text;
}

/** Text in a fainter colour, or as it is. */
export function faint(text: string, terminal: Terminal): string {
  return terminal.colour ? `\u001b[2m${text}\u001b[22m` : text;
}
