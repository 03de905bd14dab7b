/** Why the system refused, in words that a user knows. */
export type Cause =
  | 'missing'
  | 'not allowed'
  | 'read-only'
  | 'full'
  | 'is a folder'
  | 'a folder of that name is a file'
  | 'too many open files'
  | 'the name is too long'
  | 'links in a circle'
  | 'unknown';

const causes: Readonly<Record<string, Cause>> = {
  ENOENT: 'missing',
  EACCES: 'not allowed',
  EPERM: 'not allowed',
  EROFS: 'read-only',
  ENOSPC: 'full',
  EDQUOT: 'full',
  EFBIG: 'full',
  EISDIR: 'is a folder',
  ENOTDIR: 'a folder of that name is a file',
  EEXIST: 'a folder of that name is a file',
  EMFILE: 'too many open files',
  ENFILE: 'too many open files',
  ENAMETOOLONG: 'the name is too long',
  ELOOP: 'links in a circle',
};

/** The cause of an error of the file system; anything else is a defect of ours and is thrown again. */
export function causeOf(error: unknown): Cause {
  const code = error instanceof Error && 'code' in error ? String(error.code) : undefined;
  if (code === undefined || !/^E[A-Z]+$/u.test(code)) throw error;
  return causes[code] ?? 'unknown';
}
