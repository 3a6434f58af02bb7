/** What a function of the file system throws. */
export interface SystemFault extends Error {
  readonly code: string;
  readonly errno: number;
}

export function systemFault(code: string): SystemFault {
  return Object.assign(new Error(code), { code, errno: 0 });
}

export function isSystemFault(fault: unknown): fault is SystemFault {
  return fault instanceof Error && typeof (fault as Partial<SystemFault>).errno === 'number';
}

/** For work that may be left undone. */
export function withoutFault(work: () => void): void {
  try {
    work();
  } catch (fault) {
    if (!isSystemFault(fault)) throw fault;
  }
}

const REASONS: { readonly [code: string]: string } = {
  EACCES: 'permission is denied',
  EPERM: 'permission is denied',
  EROFS: 'the file system is read-only',
  ENOSPC: 'there is no space left',
  EDQUOT: 'there is no space left in your quota',
  ENOTDIR: 'a part of this path is a file, not a folder',
  EEXIST: 'a part of this path is a file, not a folder',
  EISDIR: 'a folder stands where one of the files belongs',
  EBADMSG: 'its list of files is damaged',
  ENAMETOOLONG: 'the name is too long',
};

/** Why something could not be written, as the end of a sentence. */
export function reason({ code }: SystemFault): string {
  return REASONS[code] ?? `the system says ${code}`;
}
