import { realpath } from 'node:fs/promises'
import { extname, join, sep } from 'node:path'

const CONTENT_TYPES: Readonly<Record<string, string>> = {
  '.html': 'text/html; charset=utf-8',
  '.js': 'text/javascript; charset=utf-8',
  '.css': 'text/css; charset=utf-8',
  '.svg': 'image/svg+xml',
  '.png': 'image/png',
  '.woff': 'font/woff',
  '.woff2': 'font/woff2',
}

const PLAIN_NAME = /^[A-Za-z0-9_-][A-Za-z0-9._-]*$/

/**
 * Finds the file of the page's bundle that a path of an address names, and nothing outside the bundle.
 *
 * @param bundleFolder - absolute path of the built page
 * @param path - path of the address, starting with `/`, still percent-encoded
 * @returns the file's absolute path and its content type; null where the bundle has no such file
 */
export async function findBundleFile(
  bundleFolder: string,
  path: string,
): Promise<{ file: string; contentType: string } | null> {
  const segments = path === '/' ? ['index.html'] : path.slice(1).split('/')
  if (!segments.every((segment) => PLAIN_NAME.test(segment))) return null
  const contentType = CONTENT_TYPES[extname(segments[segments.length - 1])]
  if (contentType === undefined) return null
  try {
    const root = await realpath(bundleFolder)
    const file = await realpath(join(root, ...segments))
    return file.startsWith(root + sep) ? { file, contentType } : null
  } catch {
    return null
  }
}
