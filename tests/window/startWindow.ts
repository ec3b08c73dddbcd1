import { existsSync } from 'node:fs'
import { join } from 'node:path'
import { chromium, type Browser, type BrowserContextOptions } from 'playwright-core'
import { startBrowserHost, type BrowserHost } from '../../src-main/hosts/browser/startBrowserHost'
import { BROWSER_FLAGS, findBrowser, HOW_TO_GET_A_BROWSER } from './findBrowser'
import { makeSheet, type Sheet } from './sheet'

const executablePath = findBrowser()
const bundleFolder = join(import.meta.dirname, '../../out/renderer')

export const hasWindow = executablePath !== null && existsSync(bundleFolder)
/** What the window tests need, for the names of their suites. */
export const windowNeeds = executablePath ? 'after npm run build' : HOW_TO_GET_A_BROWSER

/** The browser host and a browser, for the tests of a file. */
export interface TestWindow {
  browser: Browser
  host: BrowserHost
  /** Opens the page as a user of its own would, and waits until the first sample is solved. */
  openSheet(options?: BrowserContextOptions): Promise<Sheet>
  close(): Promise<void>
}

/** Starts the browser host, as `npm start` does, and a browser. */
export async function startWindow(): Promise<TestWindow> {
  const browser = await chromium.launch({ executablePath: executablePath ?? '', args: BROWSER_FLAGS })
  const host = await startBrowserHost({ port: 0, bundleFolder })
  return {
    browser,
    host,
    async openSheet(options = {}) {
      const context = await browser.newContext({ viewport: { width: 1280, height: 800 }, ...options })
      // Tests choose files as in browsers that have no file pickers of their own, where no dialog is in the way.
      await context.addInitScript(() => {
        const page = window as { showOpenFilePicker?: unknown; showSaveFilePicker?: unknown }
        page.showOpenFilePicker = undefined
        page.showSaveFilePicker = undefined
      })
      context.setDefaultTimeout(20_000)
      const page = await context.newPage()
      const sheet = makeSheet(page)
      await page.goto(host.address)
      await sheet.part('Title block').waitFor()
      return sheet
    },
    async close() {
      await browser.close()
      await host.close()
    },
  }
}
