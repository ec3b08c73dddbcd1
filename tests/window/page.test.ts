import { existsSync } from 'node:fs'
import { join } from 'node:path'
import { chromium, type Browser, type Page } from 'playwright-core'
import { afterAll, beforeAll, beforeEach, afterEach, describe, expect, it } from 'vitest'
import { NOTICE } from '../../src-main/contract/notice'
import { SOFTWARE } from '../../src-main/contract/software'
import { startBrowserHost, type BrowserHost } from '../../src-main/hosts/browser/startBrowserHost'
import { PIN_RIG } from '../unit/workers/pinRig'
import { BROWSER_FLAGS, findBrowser, HOW_TO_GET_A_BROWSER } from './findBrowser'

const executablePath = findBrowser()
const bundleFolder = join(import.meta.dirname, '../../out/renderer')
const why = executablePath ? 'after npm run build' : HOW_TO_GET_A_BROWSER

describe.skipIf(!executablePath || !existsSync(bundleFolder))(`the page in a browser (${why})`, () => {
  let browser: Browser
  let host: BrowserHost
  let page: Page
  let complaints: string[]
  let asked: string[]

  beforeAll(async () => {
    browser = await chromium.launch({ executablePath: executablePath ?? '', args: BROWSER_FLAGS })
    host = await startBrowserHost({ port: 0, bundleFolder })
  })
  afterAll(async () => {
    await browser?.close()
    await host?.close()
  })
  beforeEach(async () => {
    page = await browser.newPage({ viewport: { width: 1280, height: 800 } })
    // A test cannot reach the browser's own dialogs for files; without them the page asks for one as ever.
    await page.addInitScript(() => {
      Object.defineProperty(window, 'showOpenFilePicker', { value: undefined })
      Object.defineProperty(window, 'showSaveFilePicker', { value: undefined })
    })
    complaints = []
    asked = []
    page.on('console', (message) => {
      if (message.type() === 'error' || message.type() === 'warning') complaints.push(message.text())
    })
    page.on('pageerror', (error) => complaints.push(error.message))
    page.on('request', (request) => asked.push(request.url()))
  })
  afterEach(() => page.close())

  it('opens with its name, version and notice, and complains of nothing', async () => {
    await page.goto(host.address)
    await page.getByRole('heading', { name: 'Barwright' }).waitFor()
    await page.getByText(SOFTWARE.version, { exact: true }).waitFor()
    const notice = page.getByText(NOTICE)
    expect(await notice.isVisible()).toBe(true)
    const box = await notice.boundingBox()
    expect(box && box.y >= 0 && box.y + box.height <= 800).toBe(true)
    expect(complaints).toEqual([])
  })

  it('asks its own host alone, and hands the token to nobody in an address', async () => {
    await page.goto(host.address)
    await page.getByText(SOFTWARE.version, { exact: true }).waitFor()
    const { origin, hash } = new URL(host.address)
    expect(asked.length).toBeGreaterThan(2)
    for (const url of asked) {
      expect(new URL(url).origin).toBe(origin)
      if (url !== host.address) expect(url).not.toContain(hash.slice(1))
    }
  })

  it('uses the typeface that it brings', async () => {
    await page.goto(host.address)
    await page.getByText(SOFTWARE.version, { exact: true }).waitFor()
    const loaded = await page.evaluate(async () => {
      await document.fonts.ready
      return [...document.fonts].filter(({ status }) => status === 'loaded').map(({ family }) => family)
    })
    expect(loaded.join()).toContain('IBM Plex Sans Condensed')
  })

  it('still shows the notice, and says what is missing, without its token', async () => {
    await page.goto(new URL('/', host.address).href)
    await page.getByRole('alert').waitFor()
    expect(await page.getByRole('alert').textContent()).toContain('whole address')
    expect(await page.getByText(NOTICE).isVisible()).toBe(true)
  })

  it('says that the token is wrong when it is', async () => {
    await page.goto(new URL('/#wrong', host.address).href)
    await page.getByRole('alert').waitFor()
    expect(await page.getByRole('alert').textContent()).toContain('Wrong token')
  })

  it('opens a rig file and shows its governing margin and peaks', async () => {
    await page.goto(host.address)
    await openRig(page, JSON.stringify(PIN_RIG))
    await page.getByRole('heading', { name: PIN_RIG.title }).waitFor()
    expect(await page.getByText(/^[+−]\d+\.\d\d$/).count()).toBeGreaterThan(1)
    await page.getByRole('button', { name: 'Table of the peaks' }).click()
    expect(await page.getByRole('row', { name: /^pin 1 (tension|compression)/ }).count()).toBe(2)
    expect(await page.getByRole('row', { name: /^pin 2 (tension|compression)/ }).count()).toBe(2)
    expect(complaints).toEqual([])
  })

  it('says every reason why a rig is refused, each with its place', async () => {
    await page.goto(host.address)
    await openRig(page, JSON.stringify({ ...PIN_RIG, run: { duration: '1 MPa', cell: '0 mm' } }))
    const alert = page.getByRole('alert')
    await alert.waitFor()
    expect(await alert.getByRole('listitem').count()).toBe(2)
    expect(await alert.textContent()).toMatch(/run\.duration: .+run\.cell: /)
  })

  it('shows a hostile title as the text that it is', async () => {
    await page.goto(host.address)
    const title = '<img src=x onerror="window.titleRan = true"><script>window.titleRan = true</script>'
    await openRig(page, JSON.stringify({ ...PIN_RIG, title }))
    await page.getByRole('heading', { name: title }).waitFor()
    expect(await page.evaluate(() => 'titleRan' in window)).toBe(false)
    expect(complaints).toEqual([])
  })

  it('runs no script that it did not bring', async () => {
    await page.goto(host.address)
    await page.getByText(SOFTWARE.version, { exact: true }).waitFor()
    const tried = await page.evaluate(async () => {
      const marks = window as unknown as Record<string, unknown>
      const attempt = (action: () => unknown): string => {
        try {
          action()
          return 'done'
        } catch (error) {
          return (error as Error).name
        }
      }
      const add = (fill: (script: HTMLScriptElement) => void): Promise<string> =>
        new Promise((resolve) => {
          const script = document.createElement('script')
          script.onerror = () => resolve('refused')
          script.onload = () => resolve('loaded')
          const failed = attempt(() => fill(script))
          if (failed !== 'done') return resolve(failed)
          document.body.append(script)
          setTimeout(() => resolve('silent'), 300)
        })
      const outcome = {
        inline: await add((script) => script.append('window.inlineRan = true')),
        remote: await add((script) => script.setAttribute('src', 'https://example.com/a.js')),
        data: await add((script) => script.setAttribute('src', 'data:text/javascript,window.dataRan=true')),
        // eslint-disable-next-line no-eval -- the policy is tried with what must not run
        evaluated: attempt(() => (0, eval)('window.evalRan = true')),
        handler: attempt(() => document.body.setAttribute('onclick', 'window.handlerRan = true')),
        markup: attempt(() => (document.body.innerHTML += '<img src=x onerror="window.markupRan = true">')),
        fetched: await fetch('https://example.com/').then(
          () => 'done',
          (error: Error) => error.name,
        ),
      }
      document.body.click()
      await new Promise((resolve) => setTimeout(resolve, 100))
      const ran = Object.keys(marks).filter((name) => name.endsWith('Ran'))
      return { outcome, ran }
    })
    expect(tried.ran).toEqual([])
    expect(tried.outcome.remote).not.toBe('loaded')
    expect(tried.outcome.evaluated).toBe('EvalError')
    expect(tried.outcome.markup).toBe('TypeError')
    expect(tried.outcome.fetched).toBe('TypeError')
    expect(asked.filter((url) => url.includes('example.com'))).toEqual([])
    expect(complaints.join(' ')).toContain('Content Security Policy')
  })

  it('cannot be framed by another page', async () => {
    const outer = await browser.newPage()
    await outer.setContent(`<iframe src="${host.address}"></iframe>`)
    await expect.poll(() => outer.frames()[1]?.url()).toBe('chrome-error://chromewebdata/')
    await outer.close()
  })
})

async function openRig(page: Page, text: string): Promise<void> {
  // The sheet's first sample is there before it is left.
  await page.getByText('Governing margin').first().waitFor()
  const choosing = page.waitForEvent('filechooser')
  await page.getByRole('button', { name: 'Open', exact: true }).click()
  const chooser = await choosing
  await chooser.setFiles({ name: 'made.rig.json', mimeType: 'application/json', buffer: Buffer.from(text) })
}
