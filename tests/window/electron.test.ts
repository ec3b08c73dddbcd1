import { join } from 'node:path'
import { _electron } from 'playwright-core'
import { describe, expect, it } from 'vitest'
import { hasElectronRuntime } from '../../packaging/electronRuntime.mjs'
import { NOTICE } from '../../src-main/contract/notice'

const top = join(import.meta.dirname, '../..')
const hasRuntime = hasElectronRuntime()
const hasScreen = process.platform !== 'linux' || Boolean(process.env.DISPLAY ?? process.env.WAYLAND_DISPLAY)
const why = !hasRuntime
  ? "Electron's runtime is not on this machine (npx install-electron fetches it)"
  : hasScreen
    ? 'after npm run build'
    : 'no screen to open a window on'

describe.skipIf(!hasRuntime || !hasScreen)(`the window in Electron (${why})`, () => {
  it('opens on the page, with the notice in view, without Node in it', async () => {
    const app = await _electron.launch({ args: [top] })
    try {
      const page = await app.firstWindow()
      expect(page.url()).toBe('barwright://app/')
      await page.getByText(NOTICE).waitFor()
      await page.getByText('Governing margin').first().waitFor()
      expect(await page.evaluate(() => [typeof require, typeof process, typeof module])).toEqual([
        'undefined',
        'undefined',
        'undefined',
      ])
      const fetched = await page.evaluate(() =>
        fetch('https://example.com/').then(
          () => 'done',
          () => 'refused',
        ),
      )
      expect(fetched).toBe('refused')
    } finally {
      await app.close()
    }
  })
})
