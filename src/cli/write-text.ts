import { randomUUID } from 'node:crypto';
import { mkdir, rename, rm, writeFile } from 'node:fs/promises';
import { dirname } from 'node:path';
import type { Report } from '../problem.ts';

/** Writes one file beside the results, whole or not at all; a failure is reported. Says whether it is written. */
export async function writeText(
  path: string,
  content: string | Iterable<string>,
  report: Report,
): Promise<boolean> {
  const beside = `${path}.${randomUUID()}`;
  try {
    await mkdir(dirname(path), { recursive: true });
    await writeFile(beside, content);
    await rename(beside, path);
    return true;
  } catch (fault) {
    await rm(beside, { force: true }).catch(() => {});
    const code = (fault as { readonly code?: unknown }).code;
    if (typeof code !== 'string') throw fault;
    report({
      code: 'output_unwritable',
      severity: 'error',
      place: { kind: 'file', file: path },
      message: `"${path}" cannot be written: the system says ${code}.`,
    });
    return false;
  }
}
