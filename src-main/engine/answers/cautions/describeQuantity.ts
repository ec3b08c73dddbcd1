const UNITS = {
  length: [1e3, 'mm'],
  time: [1e6, 'µs'],
  stress: [1e-6, 'MPa'],
  force: [1e-3, 'kN'],
  share: [100, '%'],
  angle: [180 / Math.PI, 'degrees'],
} as const

/**
 * A number for a caution, to three figures in the unit of the bench, the same on every machine.
 *
 * @param value in SI, an angle in radians
 * @param kind what it is
 * @returns such as `16 µs` or `412 MPa`
 */
export function describeQuantity(value: number, kind: keyof typeof UNITS): string {
  const [scale, unit] = UNITS[kind]
  return `${Number((value * scale).toPrecision(3))} ${unit}`
}
