/**
 * Hands a file to the user's own place for them.
 *
 * @param name - with its ending
 * @param content - of the file
 */
export function saveFile(name: string, content: Blob): void {
  const address = URL.createObjectURL(content)
  const link = document.createElement('a')
  link.href = address
  link.download = name
  link.click()
  setTimeout(() => URL.revokeObjectURL(address), 10_000)
}

/** Control characters, signs of paths, and marks that turn the direction of writing. */
const REFUSED = /[\u0000-\u001f\u007f<>:"/\\|?*\u200e\u200f\u202a-\u202e\u2066-\u2069]+/g

/**
 * Makes a file name of a title.
 *
 * @param parts - such as the rig's title and the chart's name
 * @returns such as `Stepped shaft - G1`, without what file systems refuse
 */
export function makeFileName(...parts: string[]): string {
  const name = parts
    .map((part) => part.replace(REFUSED, ' ').replace(/\s+/g, ' ').trim())
    .filter((part) => part !== '')
    .join(' - ')
  return name.replace(/^\.+|\.+$/g, '').slice(0, 120) || 'chart'
}
