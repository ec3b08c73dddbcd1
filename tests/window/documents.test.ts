import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { PIN_RIG } from '../unit/workers/pinRig'
import { soon } from './sheet'
import { hasWindow, startWindow, windowNeeds, type TestWindow } from './startWindow'

describe.skipIf(!hasWindow)(`documents in the window (${windowNeeds})`, { timeout: 120_000 }, () => {
  let window: TestWindow
  beforeAll(async () => {
    window = await startWindow()
  })
  afterAll(() => window?.close())

  it('a rig is built from nothing, saved, and opened again as it was', async () => {
    const sheet = await window.openSheet()
    const { page } = sheet
    await sheet.verb('New').click()
    await sheet
      .part('Line')
      .getByRole('button', { name: /^striker/ })
      .waitFor()
    await sheet.expectFresh()
    await sheet.verb('Rig').click()
    await sheet.type('Title', 'Two rods and a wall')
    await sheet.edit(/^bar: /)
    const editor = sheet.part(/its values$/)
    await editor.getByRole('button', { name: 'Add section after' }).click()
    await sheet.type('Length', '300 mm')
    await sheet.type('Diameter', '30 mm')
    await editor.getByRole('button', { name: 'Bar', exact: true }).click()
    await editor.getByRole('button', { name: 'Add bar after' }).click()
    await editor.getByRole('heading', { name: 'Bar 2' }).waitFor()
    await sheet.edit(/^right end/)
    await editor.getByLabel(/^Kind|^End/).selectOption({ label: 'fixed' })
    await page.keyboard.press('Escape')
    await sheet.part('Line').getByRole('button', { name: 'right end: fixed' }).waitFor()
    await sheet
      .part('Line')
      .getByRole('button', { name: /^joint 2/ })
      .waitFor()
    await sheet.expectFresh()
    const margin = await sheet.margin()
    expect(margin).toMatch(/^[+−]\d/)
    expect(await page.title()).toContain('•')

    const saved = await sheet.download(() => page.keyboard.press('Control+s'))
    expect(saved.name).toBe('two-rods-and-a-wall.rig.json')
    await soon(() => page.title()).not.toContain('•')

    const other = await window.openSheet()
    await other.openText(saved.text, saved.name)
    await other.part('Title block').getByRole('heading', { name: 'Two rods and a wall' }).waitFor()
    await other.expectMargin(margin)
    const again = await other.download(() => other.verb('Save as').click())
    expect(again.text).toBe(saved.text)
    expect([...sheet.complaints, ...other.complaints]).toEqual([])
    await sheet.close()
    await other.close()
  })

  it('changes are not lost without a question; a file that is dropped in is opened', async () => {
    const sheet = await window.openSheet()
    const { page } = sheet
    const drop = async (): Promise<void> => {
      const files = await page.evaluateHandle((text) => {
        const transfer = new DataTransfer()
        transfer.items.add(new File([text], 'pin.rig.json', { type: 'application/json' }))
        return transfer
      }, JSON.stringify(PIN_RIG))
      for (const event of ['dragover', 'drop'])
        await page.locator('main').dispatchEvent(event, { dataTransfer: files })
    }
    await sheet.verb('Rig').click()
    await sheet.type('Title', 'Mine')
    await drop()
    const question = page.getByRole('dialog', { name: /Mine has changes that are not saved/ })
    await question.getByRole('button', { name: 'Stay here' }).click()
    expect(await sheet.field('Title').inputValue()).toBe('Mine')
    await drop()
    await question.getByRole('button', { name: 'Go on without saving' }).click()
    await sheet.part('Title block').getByRole('heading', { name: PIN_RIG.title }).waitFor()
    await sheet.expectFresh()
    expect(sheet.complaints).toEqual([])
    await sheet.close()
  })

  it('two windows show two rigs, and neither disturbs the other', async () => {
    const [one, other] = await Promise.all([window.openSheet(), window.openSheet()])
    const first = await one.margin()
    await other.openSample(/^Gas-gun striker/)
    const second = await other.margin()
    expect(second).not.toBe(first)
    await one.verb('Rig').click()
    await other.verb('Rig').click()
    await Promise.all([one.type('Factor of safety', '1.6'), other.type('Factor of safety', '1.7')])
    await soon(() => one.margin()).not.toBe(first)
    await soon(() => other.margin()).not.toBe(second)
    await Promise.all([one.expectFresh(), other.expectFresh()])
    await one.page.keyboard.press('Control+z')
    await one.expectMargin(first)
    expect(await other.margin()).not.toBe(second)
    // Each field still shows its own run: a look back into it is answered.
    for (const sheet of [one, other]) {
      await sheet.page.getByRole('radio', { name: /^Velocity/ }).check({ force: true })
      await sheet.page.getByRole('img', { name: 'x–t diagram of velocity', exact: true }).waitFor()
      expect(await sheet.page.getByText('The field is not up to date').count()).toBe(0)
      expect(sheet.complaints).toEqual([])
      await sheet.close()
    }
  })

  it('shows a hostile title, and hostile names, as the texts that they are', async () => {
    const sheet = await window.openSheet()
    const { page } = sheet
    const hostile = '<img src=x onerror="window.textRan = true"><script>window.textRan = true</script>'
    const rig = {
      ...PIN_RIG,
      title: hostile,
      notes: hostile,
      bars: [{ ...PIN_RIG.bars[0], name: hostile }],
      gauges: [{ name: hostile, bar: hostile, at: '100 mm' }],
    }
    await sheet.openText(JSON.stringify(rig), `${hostile}.json`)
    await sheet.part('Title block').getByRole('heading', { name: hostile }).waitFor()
    await sheet.expectFresh()
    await sheet.part('Traces').getByRole('heading', { name: hostile }).first().waitFor()
    await sheet.verb('Rig').click()
    const report = await sheet.download(() => sheet.verb('Report').click())
    expect(report.text).not.toContain('<img src=x')
    const reportPage = await page.context().newPage()
    await reportPage.setContent(report.text)
    for (const one of [page, reportPage]) {
      expect(await one.evaluate(() => 'textRan' in globalThis)).toBe(false)
      expect(await one.locator('img[src=x]').count()).toBe(0)
    }
    expect(sheet.complaints).toEqual([])
    await sheet.close()
  })
})
