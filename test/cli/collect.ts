import type { Terminal } from '../../src/cli/terminal.ts';

/** A terminal that keeps what is printed. */
export function collecting(settings: Partial<Pick<Terminal, 'colour' | 'errIsTerminal' | 'width'>> = {}) {
  const printed = { out: '', err: '' };
  const terminal: Terminal = {
    out: (text) => {
      printed.out += text;
    },
    err: (text) => {
      printed.err += text;
    },
    colour: false,
    errIsTerminal: false,
    width: 100,
    ...settings,
  };
  return { terminal, printed };
}
