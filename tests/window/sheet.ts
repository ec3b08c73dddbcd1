import { readFileSync } from 'node:fs'
import type { Locator, Page } from 'playwright-core'
import { expect } from 'vitest'

/** The sheet in a page, in the words of its user. */
export interface Sheet {
  page: Page
  /** What the page complained of: errors, warnings and answers that were not 200. */
  complaints: string[]
  /** A region of the sheet by its name. */
  part(name: string | RegExp): Locator
  /** A verb of the bar on top. */
  verb(name: string): Locator
  choose(menu: string, item: string | RegExp): Promise<void>
  openSample(title: string | RegExp): Promise<void>
  openText(text: string, name?: string): Promise<void>
  /** Opens the fields of a part of the line. */
  edit(part: string | RegExp): Promise<void>
  /** Field of the part that is edited. */
  field(label: string): Locator
  type(label: string, value: string): Promise<void>
  /** The governing margin as it stands there, such as `+0.12`. */
  margin(): Promise<string>
  /** Waits until the sheet shows a result that belongs to the rig, with this margin. */
  expectMargin(margin: string): Promise<void>
  /** Waits until what is shown belongs to the rig as it stands, in full. */
  expectFresh(): Promise<void>
  /** Chooses to save and reads what the browser was handed. */
  download(action: () => Promise<unknown>): Promise<{ name: string; text: string }>
  close(): Promise<void>
}

/** What a solve and its pictures may take on a busy machine [ms]. */
const PATIENCE = { timeout: 20_000 }

/** Expects of what is read that it comes to be so. */
export function soon<T>(read: () => T): ReturnType<typeof expect.poll<T>> {
  return expect.poll(read, PATIENCE)
}

export function makeSheet(page: Page): Sheet {
  const complaints: string[] = []
  page.on('console', (message) => {
    if (message.type() === 'error' || message.type() === 'warning') complaints.push(message.text())
  })
  page.on('pageerror', (error) => complaints.push(error.message))
  page.on('response', (response) => {
    if (response.status() >= 400) complaints.push(`${response.status()} ${new URL(response.url()).pathname}`)
  })
  const part: Sheet['part'] = (name) => page.getByRole('region', { name })
  const verb: Sheet['verb'] = (name) => page.getByRole('banner').getByRole('button', { name, exact: true })
  const editor = part(/: its values$/)
  const field: Sheet['field'] = (label) => editor.getByLabel(label, { exact: true })
  const number = page.locator('[aria-label="Governing margin"] .number')

  return {
    page,
    complaints,
    part,
    verb,
    field,
    async choose(menu, item) {
      await verb(menu).click()
      await page.getByRole('menu', { name: menu }).getByText(item).click()
    },
    async openSample(title) {
      await this.choose('Samples', title)
      await this.expectFresh()
    },
    async openText(text, name = 'made.rig.json') {
      const chooser = page.waitForEvent('filechooser')
      await verb('Open').click()
      await (await chooser).setFiles({ name, mimeType: 'application/json', buffer: Buffer.from(text) })
    },
    async edit(name) {
      // Sections overlap joints and gauges in the drawing: chosen as the keyboard does.
      await part('Line').getByRole('button', { name }).focus()
      await page.keyboard.press('Enter')
      await editor.getByRole('heading').waitFor()
    },
    async type(label, value) {
      await field(label).fill(value)
    },
    margin: async () => (await number.textContent())?.trim() ?? '',
    async expectMargin(margin) {
      await soon(() => this.margin()).toBe(margin)
      await this.expectFresh()
    },
    async expectFresh() {
      await part('Title block').getByText('Solved', { exact: true }).waitFor(PATIENCE)
      await soon(() => page.getByText('Last good result').count()).toBe(0)
    },
    async download(action) {
      const coming = page.waitForEvent('download')
      await action()
      const download = await coming
      return { name: download.suggestedFilename(), text: readFileSync(await download.path(), 'utf8') }
    },
    close: () => page.context().close(),
  }
}
