/**
 * Writes a number with a fixed count of decimal places and a true minus; what rounds to zero has no sign.
 *
 * @param value - in the unit it is shown in
 * @param places - decimal places, 0 to 100
 * @returns such as `−0.505` or `850`
 */
export function writeFixed(value: number, places: number): string {
  const text = Math.abs(value).toFixed(places)
  return value < 0 && Number(text) !== 0 ? `−${text}` : text
}
