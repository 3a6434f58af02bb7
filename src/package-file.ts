import { readFileSync } from 'node:fs';

/**
 * The text of a file of the package itself, named from its root. This module lies one folder below the root
 * both in the sources and in the built files, where all modules are bundled into few.
 */
export function packageFile(name: string): string {
  return readFileSync(packageUrl(name), 'utf8');
}

/** Where a file of the package itself lies. */
export function packageUrl(name: string): URL {
  return new URL(`../${name}`, import.meta.url);
}

/** The version in package.json. */
export function packageVersion(): string {
  version ??= (JSON.parse(packageFile('package.json')) as { version: string }).version;
  return version;
}

let version: string | undefined;
