import { timingSafeEqual } from 'node:crypto'
import type { IncomingHttpHeaders } from 'node:http'

/** What the host compares a request with. */
export interface RequestGuard {
  port: number
  /** Secret of this start, known only to the address that was printed. */
  token: string
}

/** A request that is not answered, with its status and the reason in words. */
export interface Refusal {
  status: 401 | 403
  reason: string
}

/**
 * Checks that a request comes from the host's own page: by Host against other names that resolve to
 * this machine, by Origin against other pages, and by the token where something is asked of the program.
 *
 * @param headers - the request's headers
 * @param guard - port and token of this start
 * @param needsToken - true for calls of the bridge, false for the page's own files, which hold no secret
 * @returns null where the request may be answered
 */
export function checkRequest(
  headers: IncomingHttpHeaders,
  guard: RequestGuard,
  needsToken: boolean,
): Refusal | null {
  const hosts = [`127.0.0.1:${guard.port}`, `localhost:${guard.port}`]
  if (guard.port === 80) hosts.push('127.0.0.1', 'localhost')
  if (!hosts.includes(headers.host ?? '')) return { status: 403, reason: 'Unknown host.' }
  const origin = headers.origin
  if (origin !== undefined && origin !== `http://${headers.host}`) {
    return { status: 403, reason: 'Asked by a page of another origin.' }
  }
  if (!needsToken) return null
  if (origin === undefined) return { status: 403, reason: 'Asked by no page.' }
  return isToken(headers.authorization, guard.token) ? null : { status: 401, reason: 'Wrong token.' }
}

function isToken(authorization: string | undefined, token: string): boolean {
  const given = Buffer.from(authorization ?? '')
  const wanted = Buffer.from(`Bearer ${token}`)
  return given.length === wanted.length && timingSafeEqual(given, wanted)
}
