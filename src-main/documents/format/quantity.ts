/** A unit that people read, and its size in SI. */
export interface Unit {
  name: string
  size: number
}

/** What a number measures, which decides the unit it is shown in. */
export type Quantity =
  | 'stress'
  | 'force'
  | 'length'
  | 'time'
  | 'velocity'
  | 'mass'
  | 'impedance'
  | 'momentum'
  | 'energy'
  | 'frequency'
  | 'voltage'
  | 'strain'
  | 'ratio'

/** The one table of units for people; of several, the largest that the number reaches is taken. */
export const UNITS: Readonly<Record<Quantity, readonly Unit[]>> = {
  stress: [{ name: 'MPa', size: 1e6 }],
  force: [{ name: 'kN', size: 1e3 }],
  length: [{ name: 'mm', size: 1e-3 }],
  time: [
    { name: 'µs', size: 1e-6 },
    { name: 'ms', size: 1e-3 },
    { name: 's', size: 1 },
  ],
  velocity: [{ name: 'm/s', size: 1 }],
  mass: [{ name: 'kg', size: 1 }],
  impedance: [{ name: 'kg/s', size: 1 }],
  momentum: [{ name: 'N s', size: 1 }],
  energy: [{ name: 'J', size: 1 }],
  frequency: [{ name: 'kHz', size: 1e3 }],
  voltage: [{ name: 'V', size: 1 }],
  strain: [{ name: 'µm/m', size: 1e-6 }],
  ratio: [{ name: '', size: 1 }],
}
