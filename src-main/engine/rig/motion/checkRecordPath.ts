/** Names that mean a device and no file on some systems. */
const DEVICES = /^(con|prn|aux|nul|com[0-9]|lpt[0-9])(\.|$)/i

/**
 * Checks that a record's path stays in the folder of its rig, on every system.
 * @param path as it stands in the rig file
 * @returns why it is refused, or null
 */
export function checkRecordPath(path: string): string | null {
  if (path.trim() === '') return 'it is empty'
  if (path.length > 500) return 'it is longer than 500 characters'
  if (Array.from(path).some((character) => character < ' ' || character === '\u007F'))
    return 'it holds a control character'
  if (path.includes('\\')) return 'folders are separated by /'
  if (path.includes(':')) return 'drives, streams and addresses with : are not allowed'
  if (path.startsWith('/') || path.startsWith('~')) return 'it does not begin in the folder of the rig'
  const parts = path.split('/')
  if (parts.includes('..')) return 'it leaves the folder through ..'
  if (parts.some((part) => part === '' || part === '.')) return 'it has an empty part'
  if (parts.some((part) => /[. ]$/.test(part) || DEVICES.test(part)))
    return 'a part of it names no plain file or folder'
  return null
}
