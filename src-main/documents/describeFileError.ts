const REASONS: Readonly<Record<string, string>> = {
  ENOENT: 'there is no such file or folder',
  ENOTDIR: 'a part of the path is a file, not a folder',
  EISDIR: 'it is a folder, not a file',
  EACCES: 'access is denied',
  EPERM: 'access is denied',
  EROFS: 'the disk is read-only',
  ENOSPC: 'the disk is full',
  EDQUOT: 'the disk quota is used up',
  EBUSY: 'another program is using it',
  EMFILE: 'too many files are open',
  ELOOP: 'links lead round in a circle',
  ENAMETOOLONG: 'the name is too long',
  ERR_INVALID_ARG_VALUE: 'the name holds a character that no file name may hold',
}

/**
 * Says in words why a file or folder could not be read or written.
 *
 * @param error - what the system reported
 * @returns a reason, with the system's own code where it is a rare one
 */
export function describeFileError(error: unknown): string {
  const { code, message } = error as NodeJS.ErrnoException
  return REASONS[code ?? ''] ?? `the system reports ${code ?? message}`
}
