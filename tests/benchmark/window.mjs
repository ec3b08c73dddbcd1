/**
 * Measures the page in a browser while parts of the largest sample are dragged: the longest task that kept
 * the page from answering, as the browser itself tells it of tasks over 50 ms.
 */
import { spawn } from 'node:child_process'
import { existsSync } from 'node:fs'
import { fileURLToPath } from 'node:url'
import { chromium } from 'playwright-core'
import { runnerImport } from 'vite'

const top = fileURLToPath(new URL('../..', import.meta.url))
/** The sample of the most cells times steps: 3,500 cells over 1.6 ms. */
const LARGEST = /^Gas-gun striker/
/** Turns of the hand, and moves in each. */
const TURNS = 2
const MOVES = 16

/**
 * Drags a shoulder, a gauge and a diameter of the largest sample back and forth.
 *
 * @returns the longest task over 50 ms [s]; 0 where there was none. Rejects without a browser or a build.
 */
export async function measureDrag() {
  const { findBrowser, BROWSER_FLAGS, HOW_TO_GET_A_BROWSER } = (
    await runnerImport(`${top}tests/window/findBrowser.ts`)
  ).module
  const executablePath = findBrowser()
  if (!executablePath) throw new Error(HOW_TO_GET_A_BROWSER)
  if (!existsSync(`${top}out/main/browserHost.js`)) throw new Error('nothing is built: npm run build')
  const host = spawn(process.execPath, [`${top}out/main/browserHost.js`, '--port', '0'], {
    stdio: ['pipe', 'pipe', 'inherit'],
  })
  const browser = await chromium.launch({ executablePath, args: BROWSER_FLAGS })
  try {
    const address = await new Promise((resolve, reject) => {
      host.stdout.on('data', (line) => resolve(/http:\S+/.exec(String(line))?.[0]))
      host.once('exit', (code) => reject(new Error(`the browser host ended with ${code}`)))
    })
    const page = await browser.newPage({ viewport: { width: 1920, height: 1080 } })
    await page.goto(address)
    await openLargest(page)
    await page.evaluate(() => {
      window.longTasks = []
      new PerformanceObserver((list) => {
        for (const { duration } of list.getEntries()) window.longTasks.push(duration)
      }).observe({ type: 'longtask' })
    })
    const line = page.getByRole('region', { name: 'Line' })
    await drag(page, line.locator('.shoulder').first(), 'x')
    await drag(page, line.locator('.cloth').first(), 'x')
    await line.getByRole('button', { name: /section 3/ }).focus()
    await page.keyboard.press('Enter')
    await drag(page, line.locator('g.y .reach').first(), 'y')
    const tasks = await page.evaluate(() => window.longTasks)
    return Math.max(0, ...tasks) / 1000
  } finally {
    await browser.close()
    host.kill()
  }
}

async function openLargest(page) {
  await page.getByRole('button', { name: 'Samples' }).click()
  await page.getByRole('menuitem', { name: LARGEST }).click()
  await page.getByRole('region', { name: 'Title block' }).getByRole('heading', { name: LARGEST }).waitFor()
}

/** Moves what is caught here and there along an axis, a move for each picture of the page. */
async function drag(page, target, axis) {
  const { x, y, width, height } = await target.boundingBox()
  const place = { x: x + width / 2, y: y + height / 2 }
  await page.mouse.move(place.x, place.y)
  await page.mouse.down()
  const reach = axis === 'x' ? 40 : 8
  for (let move = 0; move <= TURNS * MOVES; move++) {
    const away = reach * Math.sin((Math.PI * move) / MOVES)
    await page.mouse.move(place.x + (axis === 'x' ? away : 0), place.y + (axis === 'y' ? away : 0))
    await page.evaluate(() => new Promise((done) => requestAnimationFrame(() => done())))
  }
  await page.mouse.up()
  await page.getByText('Solved coarsely').waitFor({ state: 'detached' })
}
