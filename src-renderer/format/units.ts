/** Whose units a reader sees; the rig keeps those it was typed in. */
export type UnitSystem = 'si' | 'us'

/** A unit that people read, and its size in SI. */
export interface Unit {
  name: string
  size: number
}

const INCH = 0.0254
const POUND = 0.45359237
const POUND_FORCE = POUND * 9.80665
const PSI = POUND_FORCE / INCH ** 2

const unit = (name: string, size: number): Unit => ({ name, size })
const both = (name: string, size: number): Record<UnitSystem, Unit> => {
  const one = unit(name, size)
  return { si: one, us: one }
}

/** The one table of the window's units: what each dimension is read in, by either system. */
export const UNITS = {
  length: { si: unit('mm', 1e-3), us: unit('in', INCH) },
  time: both('ms', 1e-3),
  shortTime: both('µs', 1e-6),
  stress: { si: unit('MPa', 1e6), us: unit('ksi', 1e3 * PSI) },
  force: { si: unit('kN', 1e3), us: unit('kip', 1e3 * POUND_FORCE) },
  velocity: { si: unit('m/s', 1), us: unit('ft/s', 12 * INCH) },
  energy: { si: unit('J', 1), us: unit('ft·lbf', 12 * INCH * POUND_FORCE) },
  energyPerLength: { si: unit('J/m', 1), us: unit('ft·lbf/in', 12 * POUND_FORCE) },
  energyDensity: { si: unit('kJ/m³', 1e3), us: unit('in·lbf/in³', PSI) },
  strain: { si: unit('µm/m', 1e-6), us: unit('µin/in', 1e-6) },
  mass: { si: unit('kg', 1), us: unit('lb', POUND) },
  density: { si: unit('kg/m³', 1), us: unit('lb/in³', POUND / INCH ** 3) },
  modulus: { si: unit('GPa', 1e9), us: unit('Msi', 1e6 * PSI) },
  area: { si: unit('mm²', 1e-6), us: unit('in²', INCH ** 2) },
  impedance: { si: unit('kg/s', 1), us: unit('lb/s', POUND) },
  momentum: { si: unit('N s', 1), us: unit('lbf s', POUND_FORCE) },
  frequency: both('kHz', 1e3),
  stiffness: { si: unit('kN/mm', 1e6), us: unit('kip/in', (1e3 * POUND_FORCE) / INCH) },
  damping: { si: unit('kN s/m', 1e3), us: unit('lbf s/in', POUND_FORCE / INCH) },
  viscosity: both('Pa s', 1),
  acceleration: { si: unit('m/s²', 1), us: unit('ft/s²', 12 * INCH) },
  voltage: both('V', 1),
  share: both('%', 1e-2),
  ratio: both('', 1),
  number: both('', 1),
} satisfies Record<string, Record<UnitSystem, Unit>>

export type UnitDimension = keyof typeof UNITS

/** True where the window has units for what the rig's reader calls a dimension. */
export function isUnitDimension(name: string): name is UnitDimension {
  return Object.hasOwn(UNITS, name)
}

/** True where a unit as typed is of the US customary system; a second is of both and counts as SI. */
export function isUsUnit(typed: string): boolean {
  return /(^|[^A-Za-z])(in|inch|inches|ft|foot|feet|mil|lb|lbs|lbm|lbf|kip|kips|psi|ksi|Msi|slug|oz|ozf)(?![A-Za-z])/.test(
    typed,
  )
}
