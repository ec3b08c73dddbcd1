import { mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { request, type IncomingHttpHeaders, type OutgoingHttpHeaders } from 'node:http'
import { connect } from 'node:net'
import { networkInterfaces, tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { BRIDGE_TEXT_LIMIT, type BridgeReply } from '../../../../src-main/contract/bridgeCall'
import { NOTICE } from '../../../../src-main/contract/notice'
import { unpackReply } from '../../../../src-main/contract/packReply'
import type { SolveAnswer } from '../../../../src-main/contract/bridge'
import { PIN_RIG } from '../../workers/pinRig'
import { startBrowserHost, type BrowserHost } from '../../../../src-main/hosts/browser/startBrowserHost'

interface Answer {
  status: number
  headers: IncomingHttpHeaders
  text: string
  bytes: Buffer
}

let bundleFolder: string
let host: BrowserHost
let port: number
let token: string

beforeAll(async () => {
  bundleFolder = mkdtempSync(join(tmpdir(), 'barwright-host-'))
  writeFileSync(join(bundleFolder, 'index.html'), '<!doctype html><title>page</title>')
  host = await startBrowserHost({ port: 0, bundleFolder })
  const address = new URL(host.address)
  port = Number(address.port)
  token = address.hash.slice(1)
})
afterAll(async () => {
  await host.close()
  rmSync(bundleFolder, { recursive: true })
})

function ask(
  method: string,
  path: string,
  headers: OutgoingHttpHeaders = {},
  body: string | null = null,
): Promise<Answer> {
  return new Promise((resolve, reject) => {
    const sent = request({ host: '127.0.0.1', port, method, path, headers }, (response) => {
      const parts: Buffer[] = []
      response.on('data', (part: Buffer) => parts.push(part))
      response.on('end', () => {
        const bytes = Buffer.concat(parts)
        resolve({
          status: response.statusCode ?? 0,
          headers: response.headers,
          text: bytes.toString(),
          bytes,
        })
      })
    })
    sent.on('error', reject)
    sent.end(body)
  })
}

const unpack = ({ bytes }: Answer): BridgeReply => unpackReply(Uint8Array.from(bytes).buffer)

const ownPage = (): OutgoingHttpHeaders => ({
  Origin: `http://127.0.0.1:${port}`,
  Authorization: `Bearer ${token}`,
})
const aboutCall = JSON.stringify({ method: 'about', args: [] })

describe('the browser host', () => {
  it('prints a loopback address with a token of its own for each start', async () => {
    expect(host.address).toMatch(/^http:\/\/127\.0\.0\.1:\d+\/#[\w-]{43}$/)
    const other = await startBrowserHost({ port: 0, bundleFolder })
    expect(new URL(other.address).hash).not.toBe(`#${token}`)
    await other.close()
  })

  it('serves the page with a policy that allows its own files only', async () => {
    const { status, headers, text } = await ask('GET', '/')
    expect(status).toBe(200)
    expect(text).toContain('<title>page</title>')
    expect(headers['content-type']).toBe('text/html; charset=utf-8')
    const policy = String(headers['content-security-policy'])
    expect(policy).toContain("default-src 'none'")
    expect(policy).not.toMatch(/unsafe|\*|https?:/)
    expect(headers['x-content-type-options']).toBe('nosniff')
    expect(headers).not.toHaveProperty('access-control-allow-origin')
  })

  it('answers the bridge to its own page', async () => {
    const answer = await ask('POST', '/bridge', ownPage(), aboutCall)
    expect(answer.status).toBe(200)
    expect(answer.headers['content-type']).toBe('application/octet-stream')
    expect(unpack(answer)).toMatchObject({ value: { name: 'Barwright', notice: NOTICE } })
  })

  it('solves in a worker, answers others meanwhile, and carries the arrays as bytes', async () => {
    const post = (method: string, ...args: unknown[]) =>
      ask('POST', '/bridge', ownPage(), JSON.stringify({ method, args }))
    const request = { slot: 's', text: JSON.stringify(PIN_RIG), name: 'pin.rig.json', coarse: false }
    const [solved, about] = await Promise.all([post('solve', request), post('about')])
    expect(about.status).toBe(200)
    const { value } = unpack(solved) as { value: Extract<SolveAnswer, { status: 'solved' }> }
    expect(value.result.envelope.tension).toBeInstanceOf(Float64Array)
    const window = { fromX: 0, toX: 0.4, fromT: 0, toT: 1e-4, columns: 3, rows: 2 }
    const tile = unpack(await post('readField', { slot: 's', quantity: 'velocity', ...window }))
    expect((tile as { value: Float32Array }).value).toHaveLength(12)
    const missing = await post('report', 'other')
    expect([missing.status, unpack(missing)]).toEqual([
      400,
      { error: expect.stringMatching(/^No run/) as string },
    ])
  })

  it('opens and saves no files: the page of a browser has ways of its own', async () => {
    const body = JSON.stringify({ method: 'files.save', args: ['file:1', '{}'] })
    expect((await ask('POST', '/bridge', ownPage(), body)).status).toBe(400)
  })

  it.each([
    ['another name for this machine', () => ({ ...ownPage(), Host: 'evil.example' }), 403],
    ['another port', () => ({ ...ownPage(), Host: '127.0.0.1:1' }), 403],
    ['a page of another origin', () => ({ ...ownPage(), Origin: 'http://evil.example' }), 403],
    ['a sandboxed page', () => ({ ...ownPage(), Origin: 'null' }), 403],
    ['no page', () => ({ Authorization: `Bearer ${token}` }), 403],
    ['no token', () => ({ Origin: `http://127.0.0.1:${port}` }), 401],
    ['a wrong token', () => ({ ...ownPage(), Authorization: `Bearer ${'x'.repeat(token.length)}` }), 401],
    ['a shorter token', () => ({ ...ownPage(), Authorization: `Bearer ${token.slice(1)}` }), 401],
  ])('does not answer the bridge to %s', async (_what, headers, status) => {
    const answer = await ask('POST', '/bridge', headers(), aboutCall)
    expect(answer.status).toBe(status)
    expect(answer.text).not.toContain('Barwright')
  })

  it('does not serve the page under another name or to another page', async () => {
    expect((await ask('GET', '/', { Host: `evil.example:${port}` })).status).toBe(403)
    expect((await ask('GET', '/', { Origin: 'http://evil.example' })).status).toBe(403)
  })

  it.each(['/../package.json', '/%2e%2e/package.json', '/nothing.js', '//etc/passwd', '/bridge/../x'])(
    'serves nothing at %s',
    async (path) => {
      expect((await ask('GET', path)).status).toBe(404)
    },
  )

  it.each([
    ['PUT', '/', 405],
    ['POST', '/', 405],
    ['OPTIONS', '/', 405],
    ['GET', '/bridge', 405],
  ])('does not take %s %s', async (method, path, status) => {
    expect((await ask(method, path, ownPage())).status).toBe(status)
  })

  it.each([
    ['no JSON', 'about'],
    ['an unknown method', JSON.stringify({ method: 'erase', args: [] })],
    ['no text for text', JSON.stringify({ method: 'solve', args: [7] })],
  ])('refuses a message with %s, in words', async (_what, body) => {
    const answer = await ask('POST', '/bridge', ownPage(), body)
    expect(answer.status).toBe(400)
    expect(unpack(answer)).toEqual({ error: expect.stringMatching(/\w+ \w+/) as string })
  })

  it('does not read a body over its limit, whether announced or not', async () => {
    const announced = await ask('POST', '/bridge', { ...ownPage(), 'Content-Length': 1e9 }).catch(() => null)
    expect(announced?.status ?? 413).toBe(413)
    const large = 'x'.repeat(2 * BRIDGE_TEXT_LIMIT + 2000)
    const streamed = await ask(
      'POST',
      '/bridge',
      { ...ownPage(), 'Transfer-Encoding': 'chunked' },
      large,
    ).catch(() => null)
    expect(streamed?.status ?? 413).toBe(413)
    expect((await ask('POST', '/bridge', ownPage(), aboutCall)).status).toBe(200)
  })

  it('listens on the loopback address alone', async () => {
    const others = Object.values(networkInterfaces())
      .flatMap((list) => list ?? [])
      .filter(({ internal, family }) => !internal && family === 'IPv4')
    for (const { address } of others) {
      const reached = await new Promise<boolean>((resolve) => {
        const socket = connect({ host: address, port, timeout: 1000 })
        socket.on('connect', () => (socket.destroy(), resolve(true)))
        socket.on('error', () => resolve(false))
        socket.on('timeout', () => (socket.destroy(), resolve(false)))
      })
      expect(reached, address).toBe(false)
    }
  })

  it('rejects where the port is taken', async () => {
    await expect(startBrowserHost({ port, bundleFolder })).rejects.toMatchObject({ code: 'EADDRINUSE' })
  })
})
