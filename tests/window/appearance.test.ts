import { AxeBuilder } from '@axe-core/playwright'
import type { Page } from 'playwright-core'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { NOTICE } from '../../src-main/contract/notice'
import { soon } from './sheet'
import { hasWindow, startWindow, windowNeeds, type TestWindow } from './startWindow'

const WCAG = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa']

/** What axe finds, each with where it is. */
async function listViolations(page: Page): Promise<string[]> {
  const { violations } = await new AxeBuilder({ page }).withTags(WCAG).analyze()
  return violations.flatMap(({ id, nodes }) =>
    nodes.map(({ target, failureSummary }) => `${id} at ${target.join(' ')}: ${failureSummary}`),
  )
}

/** True where the whole notice can be read: in the window, on top, nothing of it cut off. */
function seesNotice(page: Page): Promise<boolean> {
  return page.getByText(NOTICE, { exact: true }).evaluate((element) => {
    const range = document.createRange()
    range.selectNodeContents(element)
    return [...range.getClientRects()].every(({ left, right, top, bottom }) => {
      const seen = left >= 0 && right <= innerWidth && top >= 0 && bottom <= innerHeight
      const inside = [left + 1, (left + right) / 2, right - 1].every((x) =>
        element.contains(document.elementFromPoint(x, (top + bottom) / 2)),
      )
      return seen && inside
    })
  })
}

describe.skipIf(!hasWindow)(`how the window looks and reads (${windowNeeds})`, { timeout: 120_000 }, () => {
  let window: TestWindow
  beforeAll(async () => {
    window = await startWindow()
  })
  afterAll(() => window?.close())

  it('meets WCAG 2.2 AA at the start, while a part is edited, with a fault, and dark; the notice stays in view', async () => {
    const sheet = await window.openSheet()
    const { page } = sheet
    await sheet.expectFresh()
    expect(await listViolations(page)).toEqual([])
    expect(await seesNotice(page)).toBe(true)

    await sheet.edit(/^shaft, section 3, body/)
    expect(await listViolations(page)).toEqual([])
    await sheet.type('Bore', '50 mm')
    await soon(() => sheet.field('Bore').getAttribute('aria-invalid')).toBe('true')
    expect(await listViolations(page)).toEqual([])
    expect(await seesNotice(page)).toBe(true)

    await sheet.choose('Colours', 'Dark')
    await soon(() => page.locator('html').getAttribute('data-theme')).toBe('dark')
    expect(await listViolations(page)).toEqual([])
    await sheet.type('Bore', '')
    await sheet.expectFresh()
    await page.keyboard.press('Escape')
    expect(await listViolations(page)).toEqual([])
    expect(await seesNotice(page)).toBe(true)
    expect(sheet.complaints).toEqual([])
    await sheet.close()
  })

  it('is dark where the system is, in ink that differs, and the field is painted dark as well', async () => {
    const sheet = await window.openSheet({ colorScheme: 'dark' })
    const { page } = sheet
    const readGround = (): Promise<number> =>
      page.evaluate(() => {
        const canvas = document.createElement('canvas').getContext('2d')!
        canvas.fillStyle = getComputedStyle(document.body).backgroundColor
        canvas.fillRect(0, 0, 1, 1)
        return [...canvas.getImageData(0, 0, 1, 1).data].slice(0, 3).reduce((a, b) => a + b, 0) / 3
      })
    const readField = (): Promise<number> =>
      page.getByRole('img', { name: 'x–t diagram of stress', exact: true }).evaluate((element) => {
        const canvas = element as HTMLCanvasElement
        const { data } = canvas.getContext('2d')!.getImageData(0, 0, canvas.width, canvas.height)
        let sum = 0
        for (let i = 0; i < data.length; i += 4)
          sum += ((data[i] + data[i + 1] + data[i + 2]) * data[i + 3]) / 765
        return sum / (data.length / 4)
      })
    expect(await readGround()).toBeLessThan(60)
    await soon(readField).toBeLessThan(110)
    await sheet.choose('Colours', 'Light')
    await soon(readGround).toBeGreaterThan(200)
    await soon(readField).toBeGreaterThan(150)
    await page.reload()
    await sheet.part('Title block').waitFor()
    expect(await readGround()).toBeGreaterThan(200)
    await sheet.close()
  })

  it('every canvas and drawing has a name, and each canvas a table behind it', async () => {
    const sheet = await window.openSheet()
    const { page } = sheet
    await sheet.expectFresh()
    const nameless = await page.locator('canvas, svg').evaluateAll((elements) =>
      elements
        .filter((element) => !element.closest('[aria-hidden=true]'))
        .filter((element) => !element.getAttribute('aria-label'))
        .map((element) => element.outerHTML.slice(0, 120)),
    )
    expect(nameless).toEqual([])
    const canvases = page.locator('canvas:not([aria-hidden=true])')
    expect(await canvases.count()).toBeGreaterThan(5)
    const bare: string[] = []
    for (const section of await page.locator('section').all()) {
      const undescribed = section.locator('canvas:not([aria-hidden=true], [aria-details])')
      for (const described of await section.locator('canvas[aria-details]').all()) {
        const table = page.locator(`[id="${await described.getAttribute('aria-details')}"]`)
        await soon(() =>
          table.evaluate((it) => it.matches('table') || it.querySelector('table') !== null),
        ).toBe(true)
      }
      if ((await undescribed.count()) === 0) continue
      // The others have their table behind a button.
      const names = await undescribed.evaluateAll((list) => list.map((it) => it.getAttribute('aria-label')))
      const button = section.getByRole('button', { name: /^Table/ })
      if ((await button.count()) !== 1) {
        bare.push(...names.map(String))
        continue
      }
      await button.click()
      await soon(() => section.getByRole('cell').count()).toBeGreaterThan(3)
      await button.click()
      await soon(() => undescribed.count()).toBe(names.length)
    }
    expect(bare).toEqual([])
    await sheet.close()
  })

  it('zoomed to 200 % nothing is lost: the sheet scrolls, the notice stays whole, a part can be edited', async () => {
    // A window of 1280 x 800 at 200 % has 640 x 400 of the page's pixels.
    const sheet = await window.openSheet({ viewport: { width: 640, height: 400 }, deviceScaleFactor: 2 })
    const { page } = sheet
    expect(await seesNotice(page)).toBe(true)
    for (const part of ['Title block', 'Governing margin']) {
      const target = page.locator(`[aria-label="${part}"]`).locator('h2').first()
      await target.scrollIntoViewIfNeeded()
      expect(
        await target.evaluate((it) => {
          const { left, top, height } = it.getBoundingClientRect()
          const part = it.closest('[aria-label]')!
          return part.contains(document.elementFromPoint(left + 4, top + height / 2))
        }),
        part,
      ).toBe(true)
      expect(await seesNotice(page)).toBe(true)
    }
    await sheet.edit(/^shaft, section 4, tail/)
    await sheet.field('Diameter').click()
    await sheet.type('Diameter', '40 mm')
    await sheet.expectFresh()
    expect(sheet.complaints).toEqual([])
    await sheet.close()
  })
})
