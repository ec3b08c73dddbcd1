import { randomBytes } from 'node:crypto'
import { readFile } from 'node:fs/promises'
import { createServer, type IncomingMessage, type ServerResponse } from 'node:http'
import type { AddressInfo } from 'node:net'
import { BRIDGE_TEXT_LIMIT } from '../../contract/bridgeCall'
import { packReply } from '../../contract/packReply'
import { answerCall } from '../../service/answerCall'
import { BUNDLE_HEADERS } from '../../service/bundlePolicy'
import { findBundleFile } from '../../service/findBundleFile'
import { makeService, type Service } from '../../service/makeService'
import { findSamplesFolder } from '../../service/samples'
import { checkRequest, type RequestGuard } from './checkRequest'
import { readBody } from './readBody'

/** Text grows when it is quoted as JSON: at most twice for anything but control characters. */
const BODY_LIMIT = 2 * BRIDGE_TEXT_LIMIT + 1024

export interface BrowserHostOptions {
  /** Port on the loopback address; 0 takes a free one. */
  port: number
  /** Absolute path of the built page. */
  bundleFolder: string
}

export interface BrowserHost {
  /** Address with its token, to be opened in this machine's browser. */
  address: string
  close(): Promise<void>
}

/**
 * Serves the page and its bridge to this machine's browser, on the loopback address alone.
 *
 * The token of this start stands behind `#` in the address, which a browser sends to nobody; the page
 * puts it into the header of each call.
 *
 * @param options - port and place of the built page
 * @returns the address, once it answers; rejects where the port is taken
 */
export async function startBrowserHost(options: BrowserHostOptions): Promise<BrowserHost> {
  const guard: RequestGuard = { port: options.port, token: randomBytes(32).toString('base64url') }
  const service = makeService({ samplesFolder: findSamplesFolder(options.bundleFolder) })
  const server = createServer((request, response) => {
    answerRequest(request, response, { guard, service, bundleFolder: options.bundleFolder }).catch(() => {
      response.destroy()
    })
  })
  await new Promise<void>((resolve, reject) => {
    server.once('error', reject)
    server.listen(options.port, '127.0.0.1', resolve)
  }).catch(async (error: Error) => {
    await service.close()
    throw error
  })
  guard.port = (server.address() as AddressInfo).port
  return {
    address: `http://127.0.0.1:${guard.port}/#${guard.token}`,
    async close() {
      const closed = new Promise<void>((resolve) => server.close(() => resolve()))
      server.closeAllConnections()
      await Promise.all([closed, service.close()])
    },
  }
}

interface Site {
  guard: RequestGuard
  service: Service
  bundleFolder: string
}

async function answerRequest(request: IncomingMessage, response: ServerResponse, site: Site): Promise<void> {
  const path = (request.url ?? '').split('?')[0]
  const asksBridge = path === '/bridge'
  const refusal = checkRequest(request.headers, site.guard, asksBridge)
  if (refusal) return send(response, refusal.status, refusal.reason)
  if (asksBridge) return answerBridge(request, response, site.service)
  if (request.method !== 'GET' && request.method !== 'HEAD') return send(response, 405, 'Only read here.')
  const found = await findBundleFile(site.bundleFolder, path)
  if (!found) return send(response, 404, 'Not a file of the page.')
  send(response, 200, await readFile(found.file), found.contentType)
}

async function answerBridge(
  request: IncomingMessage,
  response: ServerResponse,
  service: Service,
): Promise<void> {
  if (request.method !== 'POST') return send(response, 405, 'Only called here.')
  const body = await readBody(request, BODY_LIMIT)
  if (body === null) {
    response.setHeader('Connection', 'close')
    return send(response, 413, `At most ${BODY_LIMIT} bytes are read.`)
  }
  const { reply, status } = await answerCall({ service, files: null }, parseMessage(body))
  const code = { done: 200, refused: 400, fault: 500 }[status]
  send(response, code, packReply(reply), 'application/octet-stream')
}

function parseMessage(body: string): unknown {
  try {
    return JSON.parse(body)
  } catch {
    return null
  }
}

function send(
  response: ServerResponse,
  status: number,
  content: string | Uint8Array,
  contentType = 'text/plain; charset=utf-8',
): void {
  response.writeHead(status, {
    ...BUNDLE_HEADERS,
    'Content-Type': contentType,
    'Content-Length': Buffer.byteLength(content),
  })
  response.end(content)
}
