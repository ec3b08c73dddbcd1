/** Draws the icons of the packed program from the page's icon, in a Chromium: `node packaging/drawIcons.mjs`. */
import { readFileSync, writeFileSync } from 'node:fs'
import { fileURLToPath } from 'node:url'
import { chromium } from 'playwright-core'

const SIZES = [16, 32, 48, 64, 128, 256, 512]
const at = (path) => fileURLToPath(new URL(path, import.meta.url))
const drawing = readFileSync(at('../src-renderer/icon.svg'), 'utf8')

const browser = await chromium.launch({
  executablePath: process.env.CHROME_PATH ?? '/usr/bin/chromium',
  args: ['--no-sandbox', '--disable-gpu'],
})
const page = await browser.newPage()
for (const size of SIZES) {
  await page.setViewportSize({ width: size, height: size })
  await page.setContent(`<style>body{margin:0}svg{display:block;width:100vw;height:100vh}</style>${drawing}`)
  await page.screenshot({ path: at(`icons/${size}x${size}.png`), omitBackground: true })
}
await browser.close()
writeFileSync(at('icon.ico'), makeIco(readFileSync(at('icons/256x256.png'))))

/** Wraps one picture of 256 x 256 as a Windows icon: header, one entry (0 stands for 256), then the PNG. */
function makeIco(png) {
  const head = Buffer.alloc(22)
  head.writeUInt16LE(1, 2)
  head.writeUInt16LE(1, 4)
  head.writeUInt16LE(1, 10)
  head.writeUInt16LE(32, 12)
  head.writeUInt32LE(png.length, 14)
  head.writeUInt32LE(head.length, 18)
  return Buffer.concat([head, png])
}
