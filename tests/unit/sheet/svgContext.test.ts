// @vitest-environment jsdom
import { describe, expect, it } from 'vitest'
import { SvgContext } from '../../../src-renderer/sheet/charts/svg/svgContext'

function draw(use: (picture: SvgContext) => void, title = 'A picture'): Document {
  const picture = new SvgContext(100, 80, (text) => 5 * text.length)
  use(picture)
  const parsed = new DOMParser().parseFromString(picture.finish(title, '#ffffff'), 'image/svg+xml')
  expect(parsed.querySelector('parsererror')).toBeNull()
  return parsed
}
const paths = (parsed: Document): Element[] => [...parsed.querySelectorAll('svg > path')]

describe('SvgContext', () => {
  it('keeps any text as text, in elements, titles and attributes', () => {
    const hostile = '<script>alert(1)</script>" onload="x" & \u0000\u001b \ud800'
    const parsed = draw((picture) => {
      picture.font = `600 11px "Quoted" & 'odd'`
      picture.fillStyle = '"><script/>'
      picture.fillText(hostile, 4, 10)
    }, hostile)
    expect(parsed.querySelectorAll('script')).toHaveLength(0)
    expect(parsed.querySelector('text')?.textContent).toContain('<script>alert(1)</script>" onload="x" & ')
    expect(parsed.querySelector('text')?.getAttribute('onload')).toBeNull()
    expect(parsed.querySelector('title')?.textContent).toContain('<script>')
  })

  it('moves, turns and scales what is drawn, line widths and dashes with it', () => {
    const [path] = paths(
      draw((picture) => {
        picture.translate(10, 20)
        picture.rotate(Math.PI / 2)
        picture.scale(2, 2)
        picture.lineWidth = 1.5
        picture.setLineDash([4, 2])
        picture.beginPath()
        picture.moveTo(0, 0)
        picture.lineTo(5, 1)
        picture.stroke()
      }),
    )
    // (5, 1) doubled is (10, 2), a quarter turn makes it (-2, 10), moved (8, 30).
    expect(path.getAttribute('d')).toBe('M10 20L8 30')
    expect(path.getAttribute('stroke-width')).toBe('3')
    expect(path.getAttribute('stroke-dasharray')).toBe('8 4')
  })

  it('clips within clips, and forgets both on restore', () => {
    const parsed = draw((picture) => {
      picture.save()
      for (const size of [50, 20]) {
        picture.beginPath()
        picture.rect(0, 0, size, size)
        picture.clip()
      }
      picture.fillRect(1, 1, 2, 2)
      picture.restore()
      picture.fillRect(3, 3, 2, 2)
    })
    const [inside, after] = paths(parsed)
    const inner = inside.getAttribute('clip-path')?.slice(5, -1)
    expect(inner).toBeTruthy()
    const outer = parsed.querySelector(`[id="${inner}"] path`)?.getAttribute('clip-path')?.slice(5, -1)
    expect(parsed.querySelector(`[id="${outer}"] path`)?.getAttribute('d')).toBe('M0 0L50 0L50 50L0 50Z')
    expect(after.getAttribute('clip-path')).toBeNull()
  })

  it('draws a whole circle, and an arc the way it goes', () => {
    const [circle, arc] = paths(
      draw((picture) => {
        picture.beginPath()
        picture.arc(10, 10, 4, 0, 2 * Math.PI)
        picture.stroke()
        picture.beginPath()
        picture.arc(10, 10, 4, 0, Math.PI / 2, true)
        picture.stroke()
      }),
    )
    expect(circle.getAttribute('d')).toBe('M14 10A4 4 0 0 1 6 10A4 4 0 0 1 14 10')
    // Backwards from 0 to a quarter: three quarters of a turn, ending below.
    expect(arc.getAttribute('d')).toMatch(/^M14 10A4 4 0 0 0 .* 10 14$/)
  })

  it('holds text to its width where the reader lacks the type', () => {
    const parsed = draw((picture) => picture.fillText('abc', 0, 0))
    expect(parsed.querySelector('text')?.getAttribute('textLength')).toBe('15')
  })
})
