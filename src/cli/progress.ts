import type { Terminal } from './terminal.ts';

/** A line about work that takes long, drawn over itself; nothing where it would not be seen. */
export interface Progress {
  readonly show: (stage: string, done: number, total: number | null) => void;
  /** Takes the line away. To be called before anything else is printed. */
  readonly clear: () => void;
}

/** Work shorter than this shows no line; the line is drawn again no oftener than ten times a second. */
const PATIENCE = 700;
const PAUSE = 100;

export function progressOn(terminal: Terminal, quiet: boolean, clock: () => number = Date.now): Progress {
  if (quiet || !terminal.errIsTerminal) return { show: () => {}, clear: () => {} };
  const started = clock();
  let last = Number.NEGATIVE_INFINITY;
  let drawn = false;
  return {
    show: (stage, done, total) => {
      const now = clock();
      if (now - started < PATIENCE || now - last < PAUSE) return;
      last = now;
      drawn = true;
      terminal.err(`\r\u001b[K${stage}${amount(done, total)}`);
    },
    clear: () => {
      if (drawn) terminal.err('\r\u001b[K');
      drawn = false;
    },
  };
}

function amount(done: number, total: number | null): string {
  if (total === null || total <= 0) return done > 0 ? ` … ${done.toLocaleString('en-GB')}` : ' …';
  return ` … ${Math.min(100, Math.floor((100 * done) / total))} %`;
}
