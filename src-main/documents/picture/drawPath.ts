import type { Scale } from './scale'

/**
 * Writes points as the data of an SVG path.
 *
 * @param points - x and y, in the units of the scales
 * @param x - scale across
 * @param y - scale upwards or downwards
 * @returns such as `M10 20L30 40`; empty without points
 */
export function drawPath(points: Iterable<readonly [number, number]>, x: Scale, y: Scale): string {
  let path = ''
  for (const [across, up] of points) {
    path += `${path === '' ? 'M' : 'L'}${round(x.place(across))} ${round(y.place(up))}`
  }
  return path
}

/**
 * Rounds a place in a picture to a hundredth, which is finer than any screen or printer shows.
 *
 * @param place - in the picture's own units
 * @returns the rounded place
 */
export function round(place: number): number {
  return Math.round(place * 100) / 100
}
