/** Scheme of the program's own protocol, which serves the page and nothing else. */
export const PAGE_SCHEME = 'barwright'

/** Address of the page inside the desktop host. */
export const PAGE_ADDRESS = `${PAGE_SCHEME}://app/`

/**
 * Tells whether an address lies within the page's own bundle.
 *
 * @param address - any text
 * @returns true for the program's own protocol and its one host name
 */
export function isPageAddress(address: string): boolean {
  return address.startsWith(PAGE_ADDRESS)
}

/**
 * Tells whether an address is that of a file the page itself has made, such as a report or a chart.
 *
 * @param address - any text
 * @returns true for a blob of the program's own page
 */
export function isPageFile(address: string): boolean {
  return address.startsWith(`blob:${PAGE_ADDRESS}`)
}
