import { writeNumber } from './svgPath'
import { apply, type Transform } from './transform'

/** A gradient between two points, as a canvas makes it. */
export class SvgGradient {
  private readonly stops: string[] = []

  constructor(
    private readonly by: Transform,
    private readonly ends: readonly [x0: number, y0: number, x1: number, y1: number],
  ) {}

  addColorStop(offset: number, colour: string): void {
    this.stops.push(`<stop offset="${writeNumber(offset)}" stop-color="${escapeMarkup(colour)}"/>`)
  }

  write(id: string): string {
    const [x0, y0, x1, y1] = this.ends
    const [X0, Y0] = apply(this.by, x0, y0).map(writeNumber)
    const [X1, Y1] = apply(this.by, x1, y1).map(writeNumber)
    return (
      `<linearGradient id="${id}" gradientUnits="userSpaceOnUse" x1="${X0}" y1="${Y0}" x2="${X1}" y2="${Y1}">` +
      `${this.stops.join('')}</linearGradient>`
    )
  }
}

/**
 * Writes any text so that it stays text in SVG and in its attributes.
 *
 * @param text - of any origin
 * @returns the same without characters that markup would read, and without those XML forbids
 */
export function escapeMarkup(text: string): string {
  const names: Record<string, string> = {
    '&': '&amp;',
    '<': '&lt;',
    '>': '&gt;',
    '"': '&quot;',
    "'": '&#39;',
  }
  return text
    .replace(
      /[\u0000-\u0008\u000b\u000c\u000e-\u001f\ufffe\uffff]|[\ud800-\udbff](?![\udc00-\udfff])|(?<![\ud800-\udbff])[\udc00-\udfff]/g,
      '\ufffd',
    )
    .replace(/[&<>"']/g, (sign) => names[sign])
}
