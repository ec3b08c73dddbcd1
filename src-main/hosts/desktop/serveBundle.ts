import { readFile } from 'node:fs/promises'
import { BUNDLE_HEADERS } from '../../service/bundlePolicy'
import { findBundleFile } from '../../service/findBundleFile'
import { isPageAddress } from './pageAddress'

/**
 * Answers a request of the program's own protocol from the page's bundle.
 *
 * @param bundleFolder - absolute path of the built page
 * @param request - method and address of the request
 * @returns the file with the strict content policy; 404 where the bundle has none, 405 for anything but reading
 */
export async function serveBundle(
  bundleFolder: string,
  request: { method: string; url: string },
): Promise<Response> {
  if (request.method !== 'GET') return new Response('Only read here.', { status: 405 })
  const found = isPageAddress(request.url)
    ? await findBundleFile(bundleFolder, new URL(request.url).pathname)
    : null
  if (!found) return new Response('Not a file of the page.', { status: 404 })
  const content = await readFile(found.file)
  return new Response(new Uint8Array(content), {
    headers: { ...BUNDLE_HEADERS, 'Content-Type': found.contentType },
  })
}
