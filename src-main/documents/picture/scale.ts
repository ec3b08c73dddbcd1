/** Maps numbers of an axis to places in a picture. */
export interface Scale {
  from: number
  to: number
  place(value: number): number
}

/**
 * Makes a linear scale.
 *
 * @param domain - the numbers at both ends of the axis; equal ones are moved apart
 * @param range - their places in the picture
 * @returns the scale
 */
export function makeScale(domain: [number, number], range: [number, number]): Scale {
  const [from, to] = domain[0] === domain[1] ? [domain[0] - 1, domain[1] + 1] : domain
  const slope = (range[1] - range[0]) / (to - from)
  return { from, to, place: (value) => range[0] + (value - from) * slope }
}
