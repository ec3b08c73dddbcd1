import type { IncomingMessage } from 'node:http'

/**
 * Reads the body of a request as text, and no more of it than the limit.
 *
 * @param request - a request whose body was not read yet
 * @param limit - largest body that is taken [bytes]
 * @returns the text, or null where the body is larger
 */
export async function readBody(request: IncomingMessage, limit: number): Promise<string | null> {
  if (Number(request.headers['content-length'] ?? 0) > limit) return null
  const parts: Buffer[] = []
  let size = 0
  for await (const part of request as AsyncIterable<Buffer>) {
    size += part.length
    if (size > limit) return null
    parts.push(part)
  }
  return Buffer.concat(parts).toString('utf8')
}
