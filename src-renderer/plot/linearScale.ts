/** Maps a range of values to a range of pixels, both in either order. */
export interface LinearScale {
  /** Value at each end. */
  from: number
  to: number
  /** Pixel at each end. */
  start: number
  end: number
  /** Pixel of a value; outside the range it goes on straight. */
  at(value: number): number
  /** Value at a pixel. */
  valueAt(pixel: number): number
}

/**
 * Makes a straight scale, `pixel = start + (value - from) (end - start) / (to - from)`.
 *
 * @param from - value at `start`, another than `to`
 * @param to - value at `end`
 * @param start - pixel of `from`
 * @param end - pixel of `to`
 * @returns the scale and its inverse
 */
export function makeLinearScale(from: number, to: number, start: number, end: number): LinearScale {
  const slope = (end - start) / (to - from)
  return {
    from,
    to,
    start,
    end,
    at: (value) => start + (value - from) * slope,
    valueAt: (pixel) => from + (pixel - start) / slope,
  }
}
