/**
 * A colour by lightness (0..1), chroma (0 and up) and hue [rad], in OKLCH.
 * Matrices and definition: B. Ottosson, "A perceptual color space for image processing", 2020.
 */
export interface Oklch {
  lightness: number
  chroma: number
  hue: number
}

/** Red, green and blue, 0..255 each. */
export type Rgb = readonly [number, number, number]

/**
 * Reads a colour written as `#rrggbb`.
 *
 * @param hex - such as `#1E5099`
 * @returns red, green and blue, 0..255
 */
export function readHex(hex: string): Rgb {
  const value = Number.parseInt(hex.slice(1), 16)
  return [value >> 16, (value >> 8) & 255, value & 255]
}

/**
 * Light of a screen's colour: removes the transfer curve of sRGB.
 *
 * @param rgb - 0..255 each
 * @returns linear light, 0..1 each
 */
export function toLinear(rgb: Rgb): Rgb {
  return rgb.map((value) => {
    const share = value / 255
    return share <= 0.04045 ? share / 12.92 : ((share + 0.055) / 1.055) ** 2.4
  }) as unknown as Rgb
}

/**
 * Screen's colour of a light, cut to what a screen can show.
 *
 * @param linear - linear light, 0..1 each
 * @returns 0..255 each, whole
 */
export function fromLinear(linear: Rgb): Rgb {
  return linear.map((light) => {
    const share = light <= 0.0031308 ? 12.92 * light : 1.055 * light ** (1 / 2.4) - 0.055
    return Math.round(255 * Math.min(1, Math.max(0, share)))
  }) as unknown as Rgb
}

/**
 * Lightness and the two opponent axes a (green to red) and b (blue to yellow) of a light.
 *
 * @param linear - linear light, 0..1 each
 * @returns lightness 0..1, a and b
 */
export function toOklab([r, g, b]: Rgb): Rgb {
  const long = Math.cbrt(0.4122214708 * r + 0.5363325363 * g + 0.0514459929 * b)
  const medium = Math.cbrt(0.2119034982 * r + 0.6806995451 * g + 0.1073969566 * b)
  const short = Math.cbrt(0.0883024619 * r + 0.2817188376 * g + 0.6299787005 * b)
  return [
    0.2104542553 * long + 0.793617785 * medium - 0.0040720468 * short,
    1.9779984951 * long - 2.428592205 * medium + 0.4505937099 * short,
    0.0259040371 * long + 0.7827717662 * medium - 0.808675766 * short,
  ]
}

/**
 * A screen's colour in OKLCH.
 *
 * @param rgb - 0..255 each
 * @returns lightness, chroma and hue
 */
export function toOklch(rgb: Rgb): Oklch {
  const [lightness, a, b] = toOklab(toLinear(rgb))
  return { lightness, chroma: Math.hypot(a, b), hue: Math.atan2(b, a) }
}

/**
 * Screen's colour of OKLCH, cut to what a screen can show.
 *
 * @param colour - lightness, chroma and hue
 * @returns 0..255 each, whole
 */
export function fromOklch({ lightness, chroma, hue }: Oklch): Rgb {
  const a = chroma * Math.cos(hue)
  const b = chroma * Math.sin(hue)
  const long = (lightness + 0.3963377774 * a + 0.2158037573 * b) ** 3
  const medium = (lightness - 0.1055613458 * a - 0.0638541728 * b) ** 3
  const short = (lightness - 0.0894841775 * a - 1.291485548 * b) ** 3
  return fromLinear([
    4.0767416621 * long - 3.3077115913 * medium + 0.2309699292 * short,
    -1.2684380046 * long + 2.6097574011 * medium - 0.3413193965 * short,
    -0.0041960863 * long - 0.7034186147 * medium + 1.707614701 * short,
  ])
}
