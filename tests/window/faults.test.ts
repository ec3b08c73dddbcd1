import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { PIN_RIG } from '../unit/workers/pinRig'
import { soon } from './sheet'
import { hasWindow, startWindow, windowNeeds, type TestWindow } from './startWindow'

describe.skipIf(!hasWindow)(
  `faults, long runs and negative margins in the window (${windowNeeds})`,
  { timeout: 120_000 },
  () => {
    let window: TestWindow
    beforeAll(async () => {
      window = await startWindow()
    })
    afterAll(() => window?.close())

    it('a fault stands under its field in words, the last good result stays with its tag, until it is mended', async () => {
      const sheet = await window.openSheet()
      const { page } = sheet
      const good = await sheet.margin()
      await sheet.edit(/^shaft, section 3, body/)
      await sheet.type('Bore', '50 mm')
      const bore = sheet.field('Bore')
      await soon(() => bore.getAttribute('aria-invalid')).toBe('true')
      const fault = page.locator(`#${await bore.getAttribute('aria-describedby')}`)
      expect(await fault.textContent()).toMatch(/^Fault.*50 mm.*45 mm/s)
      // Under its field, and in view.
      const [above, below] = [(await bore.boundingBox())!, (await fault.boundingBox())!]
      expect(below.y).toBeGreaterThanOrEqual(above.y + above.height - 1)
      expect(Math.abs(below.x - above.x)).toBeLessThan(40)
      await page.locator('[aria-label="Governing margin"]').getByText('Last good result').waitFor()
      expect(await page.locator('.tag').textContent()).toMatch(/Last good result.*[Bb]ore/s)
      expect(await sheet.margin()).toBe(good)
      expect(await sheet.verb('Report').isDisabled()).toBe(true)
      // The fault is also found with no part open.
      await sheet
        .part(/its values$/)
        .getByRole('button', { name: 'Done' })
        .click()
      await sheet
        .part('Faults of the rig')
        .getByRole('button', { name: /section 3/ })
        .click()
      await sheet.type('Bore', '5 mm')
      await sheet.expectFresh()
      await soon(() => bore.getAttribute('aria-invalid')).toBe('false')
      await soon(() => sheet.margin()).not.toBe(good)
      await sheet.type('Bore', '')
      await sheet.expectMargin(good)
      expect(sheet.complaints).toEqual([])
      await sheet.close()
    })

    it('a file with several faults says every one, each with its place', async () => {
      const sheet = await window.openSheet()
      await sheet.openText(JSON.stringify({ ...PIN_RIG, run: { duration: '1 MPa', cell: '0 mm' } }))
      const faults = sheet.part('Faults of the rig').getByRole('listitem')
      await soon(() => faults.count()).toBe(2)
      expect((await faults.allTextContents()).join('\n')).toMatch(/run\.duration: .+run\.cell: /s)
      await sheet.openText('{ "format": ')
      expect(
        await sheet.page.getByRole('alert').filter({ hasText: 'could not be opened' }).textContent(),
      ).toContain('made.rig.json')
      await sheet.close()
    })

    it('a negative margin is told by an inverted block, by words, and wherever the margin stands', async () => {
      const sheet = await window.openSheet()
      await sheet.verb('Materials').click()
      await sheet.type('Compression allowable', '300 MPa')
      await soon(() => sheet.margin()).toMatch(/^−/)
      await sheet.expectFresh()
      const figure = sheet.page.locator('[aria-label="Governing margin"] .figure')
      expect(await figure.getByRole('heading').textContent()).toContain('OVER')
      const look = (locator: typeof figure) =>
        locator.evaluate((element) => {
          const paper = getComputedStyle(document.documentElement).getPropertyValue('--paper')
          const probe = document.createElement('i')
          probe.style.color = paper
          document.body.append(probe)
          const { color, backgroundColor } = getComputedStyle(element)
          const inverted = color === getComputedStyle(probe).color && backgroundColor !== color
          probe.remove()
          return { inverted, opaque: !/, 0\)$|transparent/.test(backgroundColor) }
        })
      expect(await look(figure)).toEqual({ inverted: true, opaque: true })
      expect((await figure.boundingBox())!.height).toBeGreaterThan(80)
      const margin = await sheet.margin()
      expect(await look(sheet.part('Title block').getByText(margin, { exact: true }))).toEqual({
        inverted: true,
        opaque: true,
      })
      await sheet
        .part('Peaks')
        .getByRole('img', { name: `governing margin ${margin}` })
        .waitFor()
      // The same on a dark sheet.
      await sheet.choose('Colours', 'Dark')
      await soon(() => look(figure)).toEqual({ inverted: true, opaque: true })
      await sheet.close()
    })

    it('a long run shows how far it is, stops with Esc, and keeps the last result', async () => {
      const sheet = await window.openSheet()
      const { page } = sheet
      const good = await sheet.margin()
      await sheet.verb('Run').click()
      await sheet.type('Duration', '300 ms')
      const solving = page.getByRole('progressbar', { name: 'Solving' })
      await solving.waitFor()
      await soon(async () => Number(await solving.getAttribute('value'))).toBeGreaterThan(0)
      await page.keyboard.press('Escape')
      await solving.waitFor({ state: 'detached' })
      await page.keyboard.press('Escape')
      await page.getByText('The run was stopped.').waitFor()
      expect(await sheet.margin()).toBe(good)
      expect(await page.getByText('Last good result').count()).toBeGreaterThan(0)
      await page.keyboard.press('Control+z')
      await sheet.expectMargin(good)
      expect(sheet.complaints).toEqual([])
      await sheet.close()
    })
  },
)
