/** Keeps a byte-order mark, so that the host sees the file as it is. */
const UTF8 = new TextDecoder('utf-8', { ignoreBOM: true, fatal: true })

/** What the host's reader takes at most [bytes]. */
const LARGEST = 20 * 1024 * 1024

/**
 * Reads a chosen file as text.
 *
 * @param file - chosen or dropped
 * @returns its text; rejects with the reason where it is too large or not UTF-8
 */
export async function readFileText(file: File): Promise<string> {
  if (file.size > LARGEST) {
    const size = Math.ceil(file.size / 1024 / 1024)
    throw new Error(`${file.name} has ${size} MB. A rig file has at most 20 MB.`)
  }
  try {
    return UTF8.decode(await file.arrayBuffer())
  } catch {
    throw new Error(`${file.name} is no text in UTF-8, so it is no rig file.`)
  }
}
