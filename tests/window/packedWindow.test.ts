import { spawn, type ChildProcess } from 'node:child_process'
import { cpSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { deserialize } from 'node:v8'
import { chromium, type Browser } from 'playwright-core'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { NOTICE } from '../../src-main/contract/notice'
import { SOFTWARE } from '../../src-main/contract/software'
import { canPack, howPacked, packProgram, type PackedProgram } from '../checks/packProgram'
import { listSamples } from '../../src-main/service/samples'
import { BROWSER_FLAGS, findBrowser, HOW_TO_GET_A_BROWSER } from './findBrowser'

const executablePath = findBrowser()
const why = executablePath ? howPacked : HOW_TO_GET_A_BROWSER

describe.skipIf(!canPack || !executablePath)(`the packed window, its main process in Node (${why})`, () => {
  let packed: PackedProgram
  let main: ChildProcess
  let browser: Browser
  let opened: { port: number; preload: string }

  beforeAll(async () => {
    packed = packProgram()
    const standIn = join(packed.app, 'node_modules/electron')
    mkdirSync(standIn, { recursive: true })
    writeFileSync(
      join(standIn, 'package.json'),
      '{"name":"electron","type":"module","exports":"./index.mjs"}',
    )
    cpSync(join(import.meta.dirname, 'electronStandIn.mjs'), join(standIn, 'index.mjs'))
    main = spawn(process.execPath, [join(packed.app, 'out/main/desktop.js')], {
      stdio: ['ignore', 'pipe', 'inherit'],
    })
    opened = await new Promise((resolve, reject) => {
      main.stdout?.once('data', (line: Buffer) => resolve(JSON.parse(line.toString())))
      main.once('exit', (code) => reject(new Error(`the main process ended with ${code}`)))
    })
    browser = await chromium.launch({ executablePath: executablePath ?? '', args: BROWSER_FLAGS })
  }, 180_000)
  afterAll(async () => {
    await browser?.close()
    main?.kill()
    packed?.remove()
  })

  it('opens its page through its protocol, preload script and channel', async () => {
    const site = `http://127.0.0.1:${opened.port}/`
    const page = await browser.newPage()
    const complaints: string[] = []
    page.on('console', (message) => {
      if (message.type() === 'error') complaints.push(message.text())
    })
    page.on('pageerror', (error) => complaints.push(error.message))
    await page.exposeFunction('sendToMain', async (channel: string, message: unknown) => {
      const answer = await fetch(site, { method: 'POST', body: JSON.stringify({ channel, message }) })
      return deserialize(new Uint8Array(await answer.arrayBuffer())) as unknown
    })
    await page.addInitScript(`((require) => {${readFileSync(opened.preload, 'utf8')}})(() => ({
      contextBridge: { exposeInMainWorld: (name, value) => { window[name] = value } },
      ipcRenderer: { invoke: (channel, message) => window.sendToMain(channel, message) },
    }))`)

    const response = await page.goto(site)
    expect(response?.headers()['content-security-policy']).toContain("default-src 'none'")
    await page.getByText(SOFTWARE.version, { exact: true }).waitFor()
    expect(await page.getByText(NOTICE).isVisible()).toBe(true)
    // The first sample comes out of the package, is solved in its worker thread and drawn.
    const [sample] = await listSamples(join(packed.app, 'samples'))
    await page.getByText(sample.title).first().waitFor()
    await page.getByText('Governing margin').first().waitFor()
    expect(complaints).toEqual([])
  })
})
