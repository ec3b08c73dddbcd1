import type { ShapeKind } from '../../../contract/rig'

/** A diameter, a bore or an area along a section. */
export interface Outline {
  kind: Extract<ShapeKind, 'cylinder' | 'cone' | 'exponential' | 'area-linear' | 'formula' | 'stations'>
  /** True where it is the same over the whole section. */
  uniform: boolean
  /** SI value at s in 0..1. */
  at(s: number): number
  /** Places in 0..1 where its slope jumps, both ends left out. */
  corners: number[]
}

export type Profile = 'linear' | 'exponential' | 'area-linear'

/** Makes the outline of one value. */
export function makeConstantOutline(value: number): Outline {
  return { kind: 'cylinder', uniform: true, at: () => value, corners: [] }
}

/**
 * Makes the outline of a profile between two diameters:
 * linear `d0 + (d1 - d0) s`, exponential `d0 (d1/d0)^s`, area-linear `sqrt(d0^2 + (d1^2 - d0^2) s)`.
 * @param from diameter at s = 0 [m]
 * @param to diameter at s = 1 [m]
 * @param profile exponential needs both to be positive
 */
export function makeProfileOutline(from: number, to: number, profile: Profile): Outline {
  if (from === to) return makeConstantOutline(from)
  switch (profile) {
    case 'linear':
      return { kind: 'cone', uniform: false, at: (s) => from * (1 - s) + to * s, corners: [] }
    case 'exponential': {
      const growth = Math.log(to / from)
      return { kind: 'exponential', uniform: false, at: (s) => from * Math.exp(growth * s), corners: [] }
    }
    case 'area-linear': {
      const at = (s: number) => Math.sqrt(from * from * (1 - s) + to * to * s)
      return { kind: 'area-linear', uniform: false, at, corners: [] }
    }
  }
}

/**
 * Makes the outline through stations, linear between them.
 * @param places in 0..1, the first 0, the last 1, rising
 * @param values one per place
 */
export function makeStationsOutline(places: number[], values: number[]): Outline {
  const uniform = values.every((value) => value === values[0])
  const at = (s: number): number => {
    let low = 0
    let high = places.length - 1
    while (high - low > 1) {
      const middle = (low + high) >> 1
      if (places[middle] <= s) low = middle
      else high = middle
    }
    const share = (s - places[low]) / (places[high] - places[low])
    return values[low] * (1 - share) + values[high] * share
  }
  return uniform
    ? { ...makeConstantOutline(values[0]), kind: 'stations' }
    : { kind: 'stations', uniform, at, corners: places.slice(1, -1) }
}
