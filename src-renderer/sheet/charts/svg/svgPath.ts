import { apply, evaluateGrowth, type Transform } from './transform'

/**
 * Writes a length or a place for SVG: rounded to a thousandth of a pixel, finer than any screen or printer.
 *
 * @param value - [px]
 * @returns such as `12.5`
 */
export function writeNumber(value: number): string {
  return String(Math.round(value * 1000) / 1000 || 0)
}

/** A path as a canvas builds one up, kept as the data of an SVG path in the drawing's own pixels. */
export class SvgPath {
  data = ''

  moveTo(by: Transform, x: number, y: number): void {
    this.add('M', by, x, y)
  }

  lineTo(by: Transform, x: number, y: number): void {
    this.add(this.data === '' ? 'M' : 'L', by, x, y)
  }

  curveTo(by: Transform, points: readonly number[]): void {
    this.add(points.length === 6 ? 'C' : 'Q', by, ...points)
  }

  rect(by: Transform, x: number, y: number, width: number, height: number): void {
    this.moveTo(by, x, y)
    this.lineTo(by, x + width, y)
    this.lineTo(by, x + width, y + height)
    this.lineTo(by, x, y + height)
    this.close()
  }

  /** An arc of a circle; a whole turn or more becomes the whole circle. */
  arc(by: Transform, x: number, y: number, radius: number, from: number, to: number, back: boolean): void {
    const turn = 2 * Math.PI
    const whole = Math.abs(to - from) >= turn - 1e-9
    const sweep = whole ? turn : (((back ? from - to : to - from) % turn) + turn) % turn
    const direction = back ? -1 : 1
    this.lineTo(by, x + radius * Math.cos(from), y + radius * Math.sin(from))
    const size = writeNumber(radius * evaluateGrowth(by))
    // In two halves, since one arc of SVG cannot come back to where it starts.
    for (const share of [0.5, 1]) {
      const angle = from + direction * sweep * share
      const [X, Y] = apply(by, x + radius * Math.cos(angle), y + radius * Math.sin(angle))
      this.data += `A${size} ${size} 0 0 ${back ? 0 : 1} ${writeNumber(X)} ${writeNumber(Y)}`
    }
  }

  close(): void {
    if (this.data !== '') this.data += 'Z'
  }

  private add(letter: string, by: Transform, ...points: number[]): void {
    const moved: string[] = []
    for (let i = 0; i < points.length; i += 2)
      moved.push(...apply(by, points[i], points[i + 1]).map(writeNumber))
    this.data += letter + moved.join(' ')
  }
}
