import { describe, expect, it } from 'vitest'
import { formatMargin, formatNumber, formatQuantity } from '../../../src-renderer/format/formatQuantity'

describe('formatQuantity', () => {
  it('writes SI in the unit of the sheet', () => {
    expect(formatQuantity(-215.04e6, 'stress')).toEqual({ number: '−215', unit: 'MPa' })
    expect(formatQuantity(0.30001, 'length')).toEqual({ number: '300', unit: 'mm' })
    expect(formatQuantity(0.000686, 'time')).toEqual({ number: '0.686', unit: 'ms' })
    expect(formatQuantity(12, 'speed')).toEqual({ number: '12', unit: 'm/s' })
  })
})

describe('formatNumber', () => {
  it('keeps four significant digits and a true minus, also in exponents', () => {
    expect(formatNumber(123456)).toBe('123500')
    expect(formatNumber(-0.00012346)).toBe('−0.0001235')
    expect(formatNumber(7.7e-15)).toBe('7.7e−15')
    expect(formatNumber(0)).toBe('0')
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
})
