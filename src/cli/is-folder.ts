import { stat } from 'node:fs/promises';

/** Whether a path is that of a folder; not where there is nothing. */
async function isFolder(path: string): Promise<boolean> {
  try {
    return (await stat(path)).isDirectory();
  } catch {
    return false;
  }
}

/** Whether a path stands for the studies of a folder; one that is named like a study was meant to be a file. */
export async function isFolderOfStudies(path: string): Promise<boolean> {
  return !/\.ya?ml$/i.test(path) && (await isFolder(path));
}
