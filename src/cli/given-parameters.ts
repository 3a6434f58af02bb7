import type { Report } from '../problem.ts';

/** The values of `--with NAME=VALUE`, by name. What cannot be read as such is reported. */
export function givenParameters(texts: readonly string[], report: Report): Map<string, string> {
  const given = new Map<string, string>();
  const wrong = (message: string) =>
    report({ code: 'command_unusable', severity: 'error', place: { kind: 'command' }, message });
  for (const text of texts) {
    const at = text.indexOf('=');
    const name = text.slice(0, at).trim();
    if (at < 0 || name === '') wrong(`--with ${JSON.stringify(text)} is not of the form NAME=VALUE.`);
    else if (given.has(name)) wrong(`--with gives ${name} twice.`);
    else given.set(name, text.slice(at + 1));
  }
  return given;
}
