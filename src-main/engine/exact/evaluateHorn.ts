import { findRoots } from './findRoots'

/** First mode of a free exponential horn. */
export interface Horn {
  /** [1] */
  kL: number
  /** Place of the largest strain from the small end over L [1]. */
  strainPlace: number
  /** Velocity of the small end over c times the largest strain [1]. */
  merit: number
}

/**
 * The first mode of a free-free exponential horn, u = exp(-g x)[cos Kx + (g/K) sin Kx], K = pi, x from 0 to 1.
 *
 *     u' = -exp(-g x)(g^2 + K^2)/K sin Kx, largest where tan Kx = K/g
 *
 * Source: Elmore and Heald, Physics of Waves, ch. 4.
 *
 * @param ratio diameter ratio, over 1 [1]
 */
export function evaluateHorn(ratio: number): Horn {
  const g = Math.log(ratio)
  const K = Math.PI
  const kL = Math.hypot(K, g)
  const [strainPlace] = findRoots((x) => K * Math.cos(K * x) - g * Math.sin(K * x), 0, 0.01, 1)
  const strain = Math.exp(-g * strainPlace) * ((kL * kL) / K) * Math.sin(K * strainPlace)
  return { kL, strainPlace, merit: kL / strain }
}
