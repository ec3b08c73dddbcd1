import { describe, expect, it } from 'vitest'
import { formatMargin } from '../../../src-renderer/format/formatMargin'
import { formatNumber } from '../../../src-renderer/format/formatNumber'
import { formatQuantity } from '../../../src-renderer/format/formatQuantity'

describe('formatQuantity', () => {
  it('writes SI in the units of the sheet', () => {
    expect(formatQuantity(-215.04e6, 'stress', 'si')).toEqual({ text: '−215.0', unit: 'MPa' })
    expect(formatQuantity(0.30001, 'length', 'si', { trim: true })).toEqual({ text: '300', unit: 'mm' })
    expect(formatQuantity(0.000686, 'time', 'si')).toEqual({ text: '0.6860', unit: 'ms' })
    expect(formatQuantity(12, 'velocity', 'si', { digits: 3 })).toEqual({ text: '12.0', unit: 'm/s' })
    expect(formatQuantity(null, 'stress', 'si')).toEqual({ text: 'none', unit: '' })
  })

  // One inch is 25.4 mm and one pound 0.45359237 kg by definition, standard gravity 9.80665 m/s^2.
  it('writes US customary units', () => {
    expect(formatQuantity(0.0254, 'length', 'us')).toEqual({ text: '1.000', unit: 'in' })
    expect(formatQuantity(6894.757293168e3, 'stress', 'us')).toEqual({ text: '1.000', unit: 'ksi' })
    expect(formatQuantity(4448.2216152605, 'force', 'us')).toEqual({ text: '1.000', unit: 'kip' })
    expect(formatQuantity(1.3558179483314, 'energy', 'us')).toEqual({ text: '1.000', unit: 'ft·lbf' })
    expect(formatQuantity(0.3048, 'velocity', 'us')).toEqual({ text: '1.000', unit: 'ft/s' })
    expect(formatQuantity(27679.904710191, 'density', 'us')).toEqual({ text: '1.000', unit: 'lb/in³' })
  })
})

describe('formatNumber', () => {
  it('keeps significant digits and a true minus, also in powers of ten', () => {
    expect(formatNumber(123456)).toBe('123500')
    expect(formatNumber(-0.00012346)).toBe('−0.0001235')
    expect(formatNumber(7.7e-15)).toBe('7.700 × 10⁻¹⁵')
    expect(formatNumber(7.7e-15, { trim: true })).toBe('7.7 × 10⁻¹⁵')
    expect(formatNumber(0)).toBe('0')
    expect(formatNumber(0.385, { digits: 3, signed: true })).toBe('+0.385')
    expect(formatNumber(1200, { trim: true })).toBe('1200')
    expect(formatNumber(Infinity)).toBe('∞')
    expect(formatNumber(NaN)).toBe('none')
  })
})

describe('formatMargin', () => {
  it.each([
    [0.43, '+0.43'],
    [0.4399, '+0.43'],
    [0, '+0.00'],
    [0.29, '+0.29'],
    [1.15, '+1.15'],
    [-0.001, '−0.01'],
    [-0.08, '−0.08'],
    [-0.081, '−0.09'],
    [12.3456, '+12.34'],
  ])('writes %f as %s, never larger than it is', (margin, text) => {
    expect(formatMargin(margin)).toBe(text)
  })

  it('says so where there is none', () => {
    expect(formatMargin(null)).toBe('none')
  })
})
