import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { soon } from './sheet'
import { hasWindow, startWindow, windowNeeds, type TestWindow } from './startWindow'

describe.skipIf(!hasWindow)(`the keyboard alone (${windowNeeds})`, { timeout: 120_000 }, () => {
  let window: TestWindow
  beforeAll(async () => {
    window = await startWindow()
  })
  afterAll(() => window?.close())

  it('opens a sample, edits a part, moves the cursor, zooms, reads a table and undoes, always with the focus in sight', async () => {
    const sheet = await window.openSheet()
    const { page } = sheet
    const { keyboard } = page
    /** Goes on with Tab until the focus is where it should be; each stop must be seen. */
    const tabTo = async (name: RegExp): Promise<void> => {
      for (let stop = 0; stop < 80; stop++) {
        await keyboard.press('Tab')
        const at = await page.evaluate(() => {
          const element = document.activeElement!
          const box = element.getBoundingClientRect()
          return {
            name: element.getAttribute('aria-label') ?? element.textContent?.trim() ?? '',
            seen: box.width > 0 && box.height > 0 && box.right > 0 && box.bottom > 0,
          }
        })
        if (name.test(at.name)) {
          expect(at.seen, at.name).toBe(true)
          return
        }
      }
      throw new Error(`Tab does not come to ${name}`)
    }

    await tabTo(/^Samples$/)
    await keyboard.press('Enter')
    await page.getByRole('menuitem', { name: /^Gas-gun striker/ }).waitFor()
    await keyboard.press('ArrowDown')
    await keyboard.press('Home')
    const title = (await page.evaluate(() => document.activeElement!.firstChild!.textContent))!.trim()
    await keyboard.press('Enter')
    await sheet.part('Title block').getByRole('heading', { name: title }).waitFor()
    await sheet.expectFresh()

    const readStress = async (): Promise<string | null> =>
      page.getByRole('radiogroup', { name: /^Quantity/ }).textContent()
    await soon(readStress).toMatch(/\d\s*MPa/)
    const unchanged = await readStress()
    await tabTo(/^left end/)
    await keyboard.press('ArrowRight')
    const part = (await page.evaluate(() => document.activeElement!.getAttribute('aria-label')))!
    expect(part).not.toMatch(/^left end/)
    await keyboard.press('Enter')
    await sheet
      .part(/its values$/)
      .getByRole('heading')
      .waitFor()
    const field = page.locator('input:focus')
    await field.waitFor()
    const before = await field.inputValue()
    await keyboard.press('ArrowUp')
    await soon(() => field.inputValue()).not.toBe(before)
    await keyboard.press('Escape')
    await soon(() => sheet.part(/its values$/).count()).toBe(0)
    // The focus goes back to the part that was edited.
    expect(await page.evaluate(() => document.activeElement!.getAttribute('aria-label'))).toMatch(
      new RegExp(`^${part.slice(0, 4)}`),
    )
    await sheet.expectFresh()

    await tabTo(/^x–t diagram of .*: place/)
    await sheet.part('Line').getByRole('button', { name: part }).waitFor({ state: 'detached' })
    await soon(readStress).not.toBe(unchanged)
    await sheet.expectFresh()
    const atRest = await readStress()
    await keyboard.press('Shift+ArrowLeft')
    await keyboard.press('Shift+ArrowDown')
    await soon(readStress).not.toBe(atRest)
    await keyboard.press('+')
    await page.getByRole('button', { name: 'Whole' }).waitFor()
    await keyboard.press('0')
    await soon(() => page.getByRole('button', { name: 'Whole' }).count()).toBe(0)
    await keyboard.press('Escape')
    await soon(readStress).toBe(atRest)

    await keyboard.press('Control+z')
    await soon(() => sheet.verb('Undo').isDisabled()).toBe(true)
    await keyboard.press('Control+y')
    await soon(() => sheet.verb('Redo').isDisabled()).toBe(true)
    expect(sheet.complaints).toEqual([])
    await sheet.close()
  })
})
