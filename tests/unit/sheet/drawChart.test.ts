import { describe, expect, it } from 'vitest'
import { drawChart } from '../../../src-renderer/sheet/charts/drawChart'
import type { FrameSpec, Plot } from '../../../src-renderer/sheet/charts/frameSpec'
import { SvgContext } from '../../../src-renderer/sheet/charts/svg/svgContext'
import { testInks as inks } from './testInks'

function makeSpec(changes: Partial<FrameSpec> = {}): FrameSpec {
  return {
    width: 126,
    height: 400,
    pads: { left: 0, top: 0, right: 0, bottom: 20 },
    upright: true,
    x: {
      from: -350e6,
      to: 350e6,
      marks: [-200e6, 0, 200e6].map((at) => ({ at, text: String(at / 1e6) })),
      grid: [0],
    },
    y: { from: 0, to: 1e-3, marks: [], grid: [0.5e-3] },
    curves: [
      {
        points: [
          [0, 0],
          [-175e6, 0.25e-3],
          [350e6, 1e-3],
        ],
        colour: '#abcdef',
        width: 1.5,
        fill: {
          to: 'zero',
          colour: {
            along: 'y',
            stops: [
              { share: 0, colour: '#ff0000' },
              { share: 1, colour: '#0000ff' },
            ],
          },
        },
      },
    ],
    annotations: [{ type: 'line', yMin: 0.75e-3, yMax: 0.75e-3, borderColor: '#00ff11', borderWidth: 1 }],
    below: () => {},
    above: () => {},
    inks,
    ...changes,
  }
}

function draw(spec: FrameSpec): string {
  const picture = new SvgContext(200, 460, (text) => 6 * text.length)
  drawChart(picture, spec, 30, 40)
  return picture.finish('A trace', '#ffffff')
}

describe('drawChart', () => {
  it('puts values and times on the plot to the pixel: the canvas less the margins asked for', () => {
    // 126 px for -350..350 and 380 px for 0..1 ms, moved by 30 and 40.
    const line = /<path d="([^"]+)" fill="none" stroke="#abcdef"/.exec(draw(makeSpec()))?.[1]
    expect(line).toBe('M93 420L93 420L61.5 325L156 40')
  })

  it('leaves the plot as it is whatever stands in the margins', () => {
    const plots: Plot[] = []
    const spec = makeSpec({
      pads: { left: 40, top: 6, right: 10, bottom: 30 },
      y: { from: -2, to: 2, marks: [{ at: 1, text: 'a long mark', strong: true }], grid: [] },
      x: { from: 0, to: 4, marks: [{ at: 4, text: '4,000,000' }], grid: [] },
      curves: [{ points: [[0, -2], [4, 2]], colour: '#abcdef', width: 1 }], // prettier-ignore
      upright: false,
      above: (plot) => plots.push(plot),
    })
    const line = /<path d="([^"]+)" fill="none" stroke="#abcdef"/.exec(draw(spec))?.[1]
    expect(line).toBe('M70 410L70 410L146 46')
    expect(plots[0].area).toEqual({ left: 40, top: 6, right: 116, bottom: 370 })
    expect(plots[0].x.at(4)).toBe(116)
    expect(plots[0].y.at(2)).toBe(6)
  })

  it('keeps fills, limits and the words of the marks', () => {
    const svg = draw(makeSpec())
    expect(svg).toMatch(
      /<linearGradient id="paint\d+" gradientUnits="userSpaceOnUse" x1="30" y1="40" x2="30" y2="420">/,
    )
    expect(svg).toContain('stroke="#00ff11"')
    expect(svg.match(/M30 135L156 135/g)).toHaveLength(1)
    expect(svg).toMatch(/>-200<\/text>/)
  })
})
