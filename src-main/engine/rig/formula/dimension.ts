/** Exponents of mass, length, time, current, temperature, luminous intensity, amount, angle and bits. */
export type Dimension = readonly number[]

interface Named {
  label: string
  dimension: Dimension
  /** A value of it, as an example in messages. */
  example: string
}

function named(
  label: string,
  example: string,
  mass = 0,
  length = 0,
  time = 0,
  current = 0,
  angle = 0,
): Named {
  return { label, example, dimension: [mass, length, time, current, 0, 0, 0, angle, 0] }
}

/** Dimensions that a rig asks for, by the words that its faults use. */
export const DIMENSIONS = {
  number: named('a plain number', '0.3'),
  length: named('a length', '25 mm', 0, 1),
  area: named('an area', '400 mm^2', 0, 2),
  stress: named('a stress', '200 MPa', 1, -1, -2),
  force: named('a force', '10 kN', 1, 1, -2),
  time: named('a time', '50 us', 0, 0, 1),
  velocity: named('a velocity', '5 m/s', 0, 1, -1),
  acceleration: named('an acceleration', '9.81 m/s^2', 0, 1, -2),
  mass: named('a mass', '2 kg', 1),
  density: named('a density', '7850 kg/m^3', 1, -3),
  stiffness: named('a stiffness', '5 kN/mm', 1, 0, -2),
  damping: named('a damping', '200 N s/m', 1, 0, -1),
  viscosity: named('a viscosity', '500 Pa s', 1, -1, -1),
  voltage: named('a voltage', '5 V', 1, 2, -3, -1),
  angle: named('an angle', '30 deg', 0, 0, 0, 0, 1),
  frequency: named('a frequency', '20 kHz', 0, 0, -1),
} satisfies Record<string, Named>

export type DimensionName = keyof typeof DIMENSIONS

/** Dimensions that nothing asks for but that a formula may end in. */
const OTHERS: Named[] = [
  named('a volume', '', 0, 3),
  named('an energy', '', 1, 2, -2),
  named('a power', '', 1, 2, -3),
  named('a momentum', '', 1, 1, -1),
  named('an electric current', '', 0, 0, 0, 1),
  { label: 'a temperature', example: '', dimension: [0, 0, 0, 0, 1, 0, 0, 0, 0] },
]

const BASE_UNITS = ['kg', 'm', 's', 'A', 'K', 'cd', 'mol', 'rad', 'bit']

export const PLAIN: Dimension = DIMENSIONS.number.dimension

/** Tells whether two dimensions are the same, roundings of fractional exponents aside. */
export function isSameDimension(a: Dimension, b: Dimension): boolean {
  return a.every((exponent, i) => Math.abs(exponent - b[i]) < 1e-9)
}

/**
 * Puts a dimension in words.
 * @returns such as `a stress`, or its units where it has no name, such as `a value in kg m^2`
 */
export function describeDimension(dimension: Dimension): string {
  const known = [...Object.values(DIMENSIONS), ...OTHERS].find((it) =>
    isSameDimension(it.dimension, dimension),
  )
  if (known) return known.label
  const parts = BASE_UNITS.map((unit, i) => ({ unit, exponent: Number(dimension[i].toFixed(3)) }))
    .filter(({ exponent }) => exponent !== 0)
    .map(({ unit, exponent }) => (exponent === 1 ? unit : `${unit}^${exponent}`))
  return `a value in ${parts.join(' ')}`
}
