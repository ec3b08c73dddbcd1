import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { solveSample } from '../samples/solveSample'
import { hasWindow, startWindow, windowNeeds, type TestWindow } from './startWindow'
import { soon, type Sheet } from './sheet'

/** Adds a gauge to the bar, and drags its flag along the line by some pixels. */
async function addGauge(sheet: Sheet, name: string, pixels: number): Promise<string> {
  const { page } = sheet
  await sheet.edit(/^bar, section 1, head/)
  await sheet
    .part(/its values$/)
    .getByRole('button', { name: 'Bar', exact: true })
    .click()
  await sheet
    .part(/its values$/)
    .getByRole('button', { name: 'Add gauge' })
    .click()
  const flag = sheet.part('Line').getByRole('button', { name: `Gauge ${name} ` })
  const before = await sheet.field("From the bar's left face").inputValue()
  const box = (await flag.locator('.cloth').boundingBox())!
  const y = box.y + box.height / 2
  await page.mouse.move(box.x + box.width / 2, y)
  await page.mouse.down()
  await page.mouse.move(box.x + box.width / 2 + pixels, y, { steps: 4 })
  await page.mouse.up()
  await soon(() => sheet.field("From the bar's left face").inputValue()).not.toBe(before)
  await sheet.expectFresh()
  return sheet.field("From the bar's left face").inputValue()
}

describe.skipIf(!hasWindow)(
  `the test engineer's task in the window (${windowNeeds})`,
  { timeout: 120_000 },
  () => {
    let window: TestWindow
    beforeAll(async () => {
      window = await startWindow()
    })
    afterAll(() => window?.close())

    it('another striker, two gauges placed by hand, arrival times, a trace exported', async () => {
      const sheet = await window.openSheet()
      const { page } = sheet
      await sheet.openSample(/^Gas-gun striker/)
      await sheet.edit(/^striker:/)
      await sheet.type('Length', '250 mm')
      await sheet.verb('Variables').click()
      await sheet
        .part(/its values$/)
        .getByLabel('Value or formula')
        .fill('25 m/s')
      await sheet.expectFresh()

      const third = await addGauge(sheet, 'G3', 120)
      const fourth = await addGauge(sheet, 'G4', 300)
      expect(parseFloat(third)).toBeGreaterThan(130)
      expect(parseFloat(fourth)).toBeGreaterThan(parseFloat(third))

      // The same rig, solved without the window.
      const { solution } = solveSample('gas-gun-striker', {
        edit: (text) => {
          const rig = JSON.parse(text)
          rig.bars[0].sections[0].length = '250 mm'
          rig.variables.speed = '25 m/s'
          rig.gauges.push({ name: 'G3', bar: 'bar', at: third }, { name: 'G4', bar: 'bar', at: fourth })
          return JSON.stringify(rig)
        },
      })
      await sheet.part('Traces').getByRole('button', { name: 'Table of the traces' }).click()
      for (const gauge of solution.gauges.slice(2)) {
        const button = sheet.part('Traces').getByRole('button', { name: new RegExp(`^${gauge.name} `) })
        await button.click()
        const rows = sheet.part(`Table: ${gauge.name}`).getByRole('row')
        await soon(() => rows.count()).toBeGreaterThan(10)
        // The arrival: the first row that is not at rest, in whichever page of the table it stands.
        const arrival = Math.min(...gauge.pulses.map(({ from }) => from))
        const seen = await findArrival(sheet, gauge.name)
        const step = gauge.t[1] - gauge.t[0]
        expect(Math.abs(seen - arrival)).toBeLessThanOrEqual(2 * step + 5e-7)
      }
      await sheet.part('Traces').getByRole('button', { name: 'Table of the traces' }).click()

      const saved = await sheet.download(async () => {
        await sheet.part('Traces').getByRole('button', { name: 'Save traces' }).click()
        await page.getByRole('button', { name: /^G1 .* as CSV$/ }).click()
      })
      expect(saved.name).toMatch(/\.csv$/)
      const [heading, ...rows] = saved.text.trim().split(/\r?\n/)
      expect(heading.toLowerCase()).toContain('time')
      // The last step may end after the run's duration; the sheet ends with it.
      expect(rows.length).toBe(solution.gauges[0].t.filter((t) => t <= 1.6e-3 * (1 + 1e-12)).length)
      const column = heading.split(',').findIndex((word) => /stress/i.test(word))
      const largest = Math.max(...rows.map((row) => Math.abs(Number(row.split(',')[column]))))
      const expected = Math.max(...solution.gauges[0].stress.map(Math.abs)) / 1e6
      expect(Math.abs(largest / expected - 1)).toBeLessThan(1e-3)
      expect(sheet.complaints).toEqual([])
      await sheet.close()
    })
  },
)

/** Turns the pages of a trace's table until its stress is no longer nothing, and reads the time there [s]. */
async function findArrival(sheet: Sheet, gauge: string): Promise<number> {
  const table = sheet.part(`Table: ${gauge}`)
  const pages = sheet.part('Traces').locator('.pages')
  for (;;) {
    const range = await pages.getByText(/^rows/).textContent()
    const cells = await table
      .locator('tbody tr')
      .evaluateAll((rows) =>
        rows.map((row) => [...row.querySelectorAll('td')].map((cell) => (cell.textContent ?? '').trim())),
      )
    const row = cells.find(([, stress]) => /[1-9]/.test(stress))
    if (row) {
      const [head] = await table.locator('thead th').allTextContents()
      return Number(row[0].replace('−', '-')) * (/ms/.test(head) ? 1e-3 : /µs/.test(head) ? 1e-6 : 1)
    }
    await pages.getByRole('button', { name: 'Next' }).click()
    await soon(() => pages.getByText(/^rows/).textContent()).not.toBe(range)
  }
}
