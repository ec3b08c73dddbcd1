/** Shades of the map, an odd number so that the middle one is zero. */
export const SHADES = 21

/** Compression, half, zero, half, tension. */
const STOPS = {
  light: ['#1E5099', '#78A2CF', '#FBFAF6', '#DCA377', '#B45600'],
  dark: ['#61B2F4', '#2F6789', '#15191E', '#86632A', '#F5AD53'],
}

type Triple = [number, number, number]

/**
 * Makes the shades of the map for signed stresses, from the largest compression through zero to the
 * largest tension, mixed in OKLab so that equal steps look equal.
 *
 * @param scheme - on light or on dark paper
 * @returns colours such as `#1e5099`, shape (SHADES)
 */
export function makeColourMap(scheme: 'light' | 'dark'): string[] {
  const stops = STOPS[scheme].map(readColour)
  return Array.from({ length: SHADES }, (_none, i) => {
    const along = (i * (stops.length - 1)) / (SHADES - 1)
    const stop = Math.min(Math.floor(along), stops.length - 2)
    const share = along - stop
    return writeColour(stops[stop].map((part, n) => part + (stops[stop + 1][n] - part) * share) as Triple)
  })
}

/** sRGB to OKLab; the matrices are those of B. Ottosson, "A perceptual color space for image processing" (2020). */
function readColour(colour: string): Triple {
  const [r, g, b] = [1, 3, 5].map((at) => linearise(parseInt(colour.slice(at, at + 2), 16) / 255))
  const l = Math.cbrt(0.4122214708 * r + 0.5363325363 * g + 0.0514459929 * b)
  const m = Math.cbrt(0.2119034982 * r + 0.6806995451 * g + 0.1073969566 * b)
  const s = Math.cbrt(0.0883024619 * r + 0.2817188376 * g + 0.6299787005 * b)
  return [
    0.2104542553 * l + 0.793617785 * m - 0.0040720468 * s,
    1.9779984951 * l - 2.428592205 * m + 0.4505937099 * s,
    0.0259040371 * l + 0.7827717662 * m - 0.808675766 * s,
  ]
}

function writeColour([lightness, a, b]: Triple): string {
  const l = (lightness + 0.3963377774 * a + 0.2158037573 * b) ** 3
  const m = (lightness - 0.1055613458 * a - 0.0638541728 * b) ** 3
  const s = (lightness - 0.0894841775 * a - 1.291485548 * b) ** 3
  const parts = [
    4.0767416621 * l - 3.3077115913 * m + 0.2309699292 * s,
    -1.2684380046 * l + 2.6097574011 * m - 0.3413193965 * s,
    -0.0041960863 * l - 0.7034186147 * m + 1.707614701 * s,
  ]
  return `#${parts.map((part) => writePart(part)).join('')}`
}

function writePart(part: number): string {
  const level = Math.round(255 * Math.min(1, Math.max(0, compress(part))))
  return level.toString(16).padStart(2, '0')
}

function linearise(part: number): number {
  return part <= 0.04045 ? part / 12.92 : ((part + 0.055) / 1.055) ** 2.4
}

function compress(part: number): number {
  return part <= 0.0031308 ? 12.92 * part : 1.055 * part ** (1 / 2.4) - 0.055
}
