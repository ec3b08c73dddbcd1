import { describe, expect, it } from 'vitest'
import {
  findEntry,
  makeSignedTable,
  makeUnsignedTable,
  readEntry,
  writeColour,
  type Theme,
} from '../../../src-renderer/plot/colour/colourMap'
import { fromLinear, toLinear, toOklab, toOklch, type Rgb } from '../../../src-renderer/plot/colour/oklch'

/**
 * Light as each kind of eye sees it, for the full strength of the fault: G. M. Machado, M. M. Oliveira,
 * L. A. F. Fernandes, "A physiologically-based model for simulation of color vision deficiency", 2009
 * (from memory; that a grey stays grey is checked below).
 */
const EYES = {
  common: [
    [1, 0, 0],
    [0, 1, 0],
    [0, 0, 1],
  ],
  'without long-wave cones': [
    [0.152286, 1.052583, -0.204868],
    [0.114503, 0.786281, 0.099216],
    [-0.003882, -0.048116, 1.051998],
  ],
  'without medium-wave cones': [
    [0.367322, 0.860646, -0.227968],
    [0.280085, 0.672501, 0.047413],
    [-0.01182, 0.04294, 0.968881],
  ],
  'without short-wave cones': [
    [1.255528, -0.076749, -0.178779],
    [-0.078411, 0.930809, 0.147602],
    [0.004733, 0.691367, 0.3039],
  ],
} as const

type Eye = keyof typeof EYES

function see(eye: Eye, rgb: Rgb): Rgb {
  const light = toLinear(rgb)
  const rows: readonly (readonly number[])[] = EYES[eye]
  const seen = rows.map((row) => row.reduce((sum, weight, i) => sum + weight * light[i], 0))
  return toOklab(toLinear(fromLinear(seen as unknown as Rgb)))
}

function evaluateDistance(one: Rgb, other: Rgb): number {
  return Math.hypot(one[0] - other[0], one[1] - other[1], one[2] - other[2])
}

const themes: Theme[] = ['light', 'dark']
const eyes = Object.keys(EYES) as Eye[]

describe('signed table', () => {
  it.each(themes)('has the five colours of the sheet (%s)', (theme) => {
    const table = makeSignedTable(theme)
    const colours = [1, 64.5, 128, 191.5, 255].map((entry) => readEntry(table, Math.round(entry)))
    const wanted: Record<Theme, number[]> = {
      light: [0x1e5099, 0x78a2cf, 0xfbfaf6, 0xdca377, 0xb45600],
      dark: [0x61b2f4, 0x2f6789, 0x15191e, 0x86632a, 0xf5ad53],
    }
    wanted[theme].forEach((hex, i) => {
      const whole = [hex >> 16, (hex >> 8) & 255, hex & 255]
      // The half-way colours lie between two entries, less than 3 of 255 from either.
      colours[i].forEach((value, c) => expect(Math.abs(value - whole[c])).toBeLessThanOrEqual(i % 2 ? 3 : 0))
    })
  })

  it.each(themes)('grows away from paper on both sides without a turn back (%s)', (theme) => {
    const table = makeSignedTable(theme)
    const lightness = Array.from({ length: 256 }, (_, i) => toOklch(readEntry(table, i)).lightness)
    const sign = theme === 'light' ? 1 : -1
    // Whole bytes round lightness by up to 0.002.
    for (let i = 129; i < 256; i++) {
      expect(sign * (lightness[i - 1] - lightness[i])).toBeGreaterThan(-0.002)
      expect(sign * (lightness[256 - i + 1] - lightness[256 - i])).toBeGreaterThan(-0.002)
    }
  })

  it.each(themes)('keeps to two hues (%s)', (theme) => {
    const table = makeSignedTable(theme)
    for (let i = 1; i < 256; i++) {
      const { chroma, hue } = toOklch(readEntry(table, i))
      if (chroma < 0.02) continue
      const degrees = ((hue * 180) / Math.PI + 360) % 360
      if (i < 128) expect(degrees).toSatisfy((one: number) => one > 215 && one < 275)
      else expect(degrees).toSatisfy((one: number) => one > 35 && one < 95)
    }
  })

  it.each(eyes)('tells tension from compression to an eye %s', (eye) => {
    // A grey stays grey.
    EYES[eye].forEach((row) => expect(row[0] + row[1] + row[2]).toBeCloseTo(1, 5))
    for (const theme of themes) {
      const table = makeSignedTable(theme)
      // 0.02 in OKLab is just seen side by side; at a fifth of the limit the two are twice as far apart.
      for (let step = 25; step <= 127; step++) {
        const apart = evaluateDistance(
          see(eye, readEntry(table, 128 - step)),
          see(eye, readEntry(table, 128 + step)),
        )
        expect(apart).toBeGreaterThan(0.04)
      }
      for (const end of [1, 255]) {
        expect(
          evaluateDistance(see(eye, readEntry(table, end)), see(eye, readEntry(table, 128))),
        ).toBeGreaterThan(0.3)
      }
    }
  })

  it('greys a stale picture and keeps its sign', () => {
    for (const theme of themes) {
      const fresh = makeSignedTable(theme)
      const stale = makeSignedTable(theme, true)
      for (const end of [1, 255]) {
        expect(toOklch(readEntry(stale, end)).chroma).toBeLessThan(
          0.5 * toOklch(readEntry(fresh, end)).chroma,
        )
      }
      expect(stale[128]).toBe(fresh[128])
      expect(stale[1]).not.toBe(stale[255])
    }
  })
})

describe('entries', () => {
  it('are symmetric about zero and stop at the limit', () => {
    expect(findEntry(0, 5)).toBe(128)
    expect(findEntry(5, 5)).toBe(255)
    expect(findEntry(-5, 5)).toBe(1)
    expect(findEntry(50, 5)).toBe(255)
    expect(findEntry(-Infinity, 5)).toBe(0)
    expect(findEntry(Number.NaN, 5)).toBe(0)
    for (const value of [0.1, 1, 2.7, 4.9]) expect(findEntry(value, 5) + findEntry(-value, 5)).toBe(256)
  })

  it('are written for a canvas', () => {
    expect(writeColour(makeSignedTable('light'), 255)).toBe('rgb(180, 86, 0)')
  })
})

describe('unsigned table', () => {
  it.each(themes)('is grey and shows nothing below zero (%s)', (theme) => {
    const table = makeUnsignedTable(theme)
    expect(table[1]).toBe(table[128])
    for (let i = 0; i < 256; i++) expect(toOklch(readEntry(table, i)).chroma).toBeLessThan(0.03)
  })
})
