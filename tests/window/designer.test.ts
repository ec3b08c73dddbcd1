import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { formatMargin } from '../../src-renderer/format/formatMargin'
import { solveSample } from '../samples/solveSample'
import { hasWindow, startWindow, windowNeeds, type TestWindow } from './startWindow'

/** The sample with texts of its file replaced, solved without the window: what the window has to show. */
function marginWith(...edits: [from: string, to: string][]): string {
  const edit = (text: string): string =>
    edits.reduce((now, [from, to]) => {
      expect(now.split(from).length, from).toBe(2)
      return now.replace(from, to)
    }, text)
  const { governing } = solveSample('drop-hammer-shaft', { edit }).solution
  return formatMargin(governing?.margin ?? null)
}

const ALLOWABLE: [string, string] = ['"compression": "700 MPa"', '"compression": "580 MPa"']
const FILLET: [string, string] = ['"fillet": "3 mm"', '"fillet": "8 mm"']
const DIAMETER: [string, string] = ['"diameter": "36 mm"', '"diameter": "40 mm"']

describe.skipIf(!hasWindow)(
  `the designer's task in the window (${windowNeeds})`,
  { timeout: 120_000 },
  () => {
    let window: TestWindow
    beforeAll(async () => {
      window = await startWindow()
    })
    afterAll(() => window?.close())

    it('a shaft over its allowable is made safe by a fillet and a diameter; undo twice, redo', async () => {
      const sheet = await window.openSheet()
      const { page } = sheet
      await sheet.openSample('Drop hammer on a stepped drive shaft')
      await sheet.expectMargin(marginWith())

      await sheet.verb('Materials').click()
      await sheet.type('Compression allowable', '580 MPa')
      const negative = marginWith(ALLOWABLE)
      await sheet.expectMargin(negative)
      expect(negative).toMatch(/^−/)

      await sheet.edit(/^shaft, section 3, body/)
      await sheet.type('Fillet', '8 mm')
      const filleted = marginWith(ALLOWABLE, FILLET)
      await sheet.expectMargin(filleted)

      await sheet.edit(/^shaft, section 4, tail/)
      await sheet.type('Diameter', '40 mm')
      const safe = marginWith(ALLOWABLE, FILLET, DIAMETER)
      await sheet.expectMargin(safe)
      expect(safe).toMatch(/^\+/)
      expect(new Set([negative, filleted, safe]).size).toBe(3)
      // Every view says the same.
      await sheet.part('Title block').getByText(safe, { exact: true }).waitFor()
      await sheet
        .part('Peaks')
        .getByRole('img', { name: `governing margin ${safe}` })
        .waitFor()

      await sheet.verb('Undo').click()
      await sheet.expectMargin(filleted)
      await page.keyboard.press('Control+z')
      await sheet.expectMargin(negative)
      expect(await page.title()).toContain('•')
      await page.keyboard.press('Control+Shift+z')
      await sheet.expectMargin(filleted)
      await sheet.verb('Redo').click()
      await sheet.expectMargin(safe)
      expect(await sheet.verb('Redo').isDisabled()).toBe(true)
      expect(await sheet.field('Diameter').inputValue()).toBe('40 mm')
      expect(sheet.complaints).toEqual([])
      await sheet.close()
    })

    it('a diameter follows the hand with coarse answers and rests on a full one', async () => {
      const sheet = await window.openSheet()
      const { page } = sheet
      await sheet.edit(/^shaft, section 4, tail/)
      const before = await sheet.margin()
      const handle = page.locator('.line g.y rect.reach, .line g.y .reach').first()
      const box = (await handle.boundingBox())!
      await page.mouse.move(box.x + box.width / 2, box.y + box.height / 2)
      await page.mouse.down()
      await page.mouse.move(box.x + box.width / 2, box.y - 2, { steps: 5 })
      await sheet.part('Title block').getByText('Solved coarsely').waitFor()
      await page.mouse.up()
      await sheet.expectFresh()
      const diameter = await sheet.field('Diameter').inputValue()
      expect(parseFloat(diameter)).toBeGreaterThan(36)
      await sheet.expectMargin(marginWith(['"diameter": "36 mm"', `"diameter": "${diameter}"`]))
      expect(await sheet.margin()).not.toBe(before)
      // One movement of the hand is one step back.
      await page.keyboard.press('Control+z')
      await sheet.expectMargin(before)
      expect(await sheet.verb('Undo').isDisabled()).toBe(true)
      expect(sheet.complaints).toEqual([])
      await sheet.close()
    })
  },
)
