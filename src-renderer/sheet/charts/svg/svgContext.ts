import { escapeMarkup, SvgGradient } from './svgPaint'
import { SvgPath, writeNumber } from './svgPath'
import { combine, evaluateGrowth, IDENTITY, type Transform } from './transform'

/** Width of a text in a font of a canvas [px]. */
export type MeasureText = (text: string, font: string) => number

/** What `save` keeps; the names are those of a canvas. */
class Settings {
  fillStyle: string | SvgGradient = '#000000'
  strokeStyle: string | SvgGradient = '#000000'
  lineWidth = 1
  lineCap = 'butt'
  lineJoin = 'miter'
  lineDashOffset = 0
  font = '10px sans-serif'
  textAlign = 'start'
  textBaseline = 'alphabetic'
  globalAlpha = 1
  protected dash: readonly number[] = []
  protected transform: Transform = IDENTITY
  protected clipName = ''

  /** Takes over the settings of another. */
  protected take(other: Settings): void {
    this.fillStyle = other.fillStyle
    this.strokeStyle = other.strokeStyle
    this.lineWidth = other.lineWidth
    this.lineCap = other.lineCap
    this.lineJoin = other.lineJoin
    this.lineDashOffset = other.lineDashOffset
    this.font = other.font
    this.textAlign = other.textAlign
    this.textBaseline = other.textBaseline
    this.globalAlpha = other.globalAlpha
    this.dash = other.dash
    this.transform = other.transform
    this.clipName = other.clipName
  }

  keep(): Settings {
    const copy = new Settings()
    copy.take(this)
    return copy
  }
}

/** Baseline below a text's own place, as a share of the type's size. */
const BASELINE: Record<string, number> = { top: 0.86, hanging: 0.78, middle: 0.34, bottom: -0.24 }
const ANCHOR: Record<string, string> = { center: 'middle', right: 'end', end: 'end' }

/**
 * Takes the calls that draw on a canvas and writes them down as SVG, so that a picture is saved exactly as
 * it is shown, with its text as text. It knows what this program's drawings use; patterns are no part of that.
 */
export class SvgContext extends Settings {
  /** What a chart takes for its canvas; set by who draws one. */
  canvas: { width: number; height: number } | null = null
  private readonly parts: string[] = []
  private readonly defs: string[] = []
  private readonly kept: Settings[] = []
  private origin: Transform = IDENTITY
  private path = new SvgPath()

  /**
   * @param width - of the whole picture [px]
   * @param height - [px]
   * @param measure - width of a text
   */
  constructor(
    private readonly width: number,
    private readonly height: number,
    private readonly measure: MeasureText,
  ) {
    super()
  }

  /** Where a drawing that sets its own transform from nothing begins. */
  setOrigin(x: number, y: number): void {
    this.take(new Settings())
    this.origin = [1, 0, 0, 1, x, y]
    this.transform = this.origin
  }

  /** The picture as one SVG document. */
  finish(title: string, ground: string): string {
    const size = `width="${writeNumber(this.width)}" height="${writeNumber(this.height)}"`
    return (
      `<svg xmlns="http://www.w3.org/2000/svg" ${size} viewBox="0 0 ${writeNumber(this.width)} ${writeNumber(this.height)}">` +
      `<title>${escapeMarkup(title)}</title><defs>${this.defs.join('')}</defs>` +
      `<rect width="100%" height="100%" fill="${escapeMarkup(ground)}"/>\n${this.parts.join('\n')}\n</svg>\n`
    )
  }

  save(): void {
    this.kept.push(this.keep())
  }
  restore(): void {
    const last = this.kept.pop()
    if (last) this.take(last)
  }
  setTransform(a: number, b: number, c: number, d: number, e: number, f: number): void {
    this.transform = combine(this.origin, [a, b, c, d, e, f])
  }
  resetTransform(): void {
    this.transform = this.origin
  }
  translate(x: number, y: number): void {
    this.turn([1, 0, 0, 1, x, y])
  }
  scale(x: number, y: number): void {
    this.turn([x, 0, 0, y, 0, 0])
  }
  rotate(angle: number): void {
    const [c, s] = [Math.cos(angle), Math.sin(angle)]
    this.turn([c, s, -s, c, 0, 0])
  }

  beginPath(): void {
    this.path = new SvgPath()
  }
  moveTo(x: number, y: number): void {
    this.path.moveTo(this.transform, x, y)
  }
  lineTo(x: number, y: number): void {
    this.path.lineTo(this.transform, x, y)
  }
  bezierCurveTo(...points: [number, number, number, number, number, number]): void {
    this.path.curveTo(this.transform, points)
  }
  quadraticCurveTo(...points: [number, number, number, number]): void {
    this.path.curveTo(this.transform, points)
  }
  rect(x: number, y: number, width: number, height: number): void {
    this.path.rect(this.transform, x, y, width, height)
  }
  arc(x: number, y: number, radius: number, from: number, to: number, back = false): void {
    this.path.arc(this.transform, x, y, radius, from, to, back)
  }
  closePath(): void {
    this.path.close()
  }

  fill(): void {
    if (this.path.data === '') return
    this.parts.push(`<path d="${this.path.data}" fill="${this.paint('fillStyle')}"${this.common()}/>`)
  }
  stroke(): void {
    if (this.path.data === '') return
    this.parts.push(`<path d="${this.path.data}" fill="none"${this.pen()}${this.common()}/>`)
  }
  clip(): void {
    const id = `clip${this.defs.length}`
    this.defs.push(`<clipPath id="${id}"><path d="${this.path.data}"${this.common(false)}/></clipPath>`)
    this.clipName = id
  }
  fillRect(x: number, y: number, width: number, height: number): void {
    this.alone(() => this.rect(x, y, width, height), 'fill')
  }
  strokeRect(x: number, y: number, width: number, height: number): void {
    this.alone(() => this.rect(x, y, width, height), 'stroke')
  }
  /** Nothing to clear: a picture is written once. */
  clearRect(): void {}

  fillText(text: string, x: number, y: number): void {
    this.write(text, x, y, ` fill="${this.paint('fillStyle')}"`)
  }
  strokeText(text: string, x: number, y: number): void {
    this.write(text, x, y, ` fill="none"${this.pen()}`)
  }
  /** Charts also measure labels that have no text. */
  measureText(text: string | null): { width: number } {
    return { width: text === null ? 0 : this.measure(text, this.font) }
  }
  /** A picture goes in whole, as PNG. */
  drawImage(image: { toDataURL(): string }, x: number, y: number, width: number, height: number): void {
    const matrix = this.transform.map(writeNumber).join(' ')
    this.parts.push(
      `<g${this.common()}><image transform="matrix(${matrix})" x="${writeNumber(x)}" y="${writeNumber(y)}"` +
        ` width="${writeNumber(width)}" height="${writeNumber(height)}" preserveAspectRatio="none"` +
        ` image-rendering="pixelated" href="${escapeMarkup(image.toDataURL())}"/></g>`,
    )
  }
  createLinearGradient(x0: number, y0: number, x1: number, y1: number): SvgGradient {
    return new SvgGradient(this.transform, [x0, y0, x1, y1])
  }
  setLineDash(dash: readonly number[]): void {
    this.dash = [...dash]
  }
  getLineDash(): number[] {
    return [...this.dash]
  }

  private turn(by: Transform): void {
    this.transform = combine(this.transform, by)
  }

  private alone(build: () => void, then: 'fill' | 'stroke'): void {
    const { path } = this
    this.path = new SvgPath()
    build()
    this[then]()
    this.path = path
  }

  private write(text: string, x: number, y: number, paint: string): void {
    const { font, textAlign, textBaseline, transform } = this
    const [, weight = '', size = '10', family = 'sans-serif'] =
      /^(?:normal |italic )?(?:(\w+) )?([\d.]+)px(?:\/\S+)? (.+)$/.exec(font) ?? []
    const drop = Number(size) * (BASELINE[textBaseline] ?? 0)
    const anchor = ANCHOR[textAlign] ?? 'start'
    // The clip stands on a group of its own: on the text it would be moved along with it.
    this.parts.push(
      `<g${this.common()}><text transform="matrix(${transform.map(writeNumber).join(' ')})" x="${writeNumber(x)}" y="${writeNumber(y + drop)}"` +
        `${this.stretch(text)} font-family="${escapeMarkup(family.replaceAll('"', "'"))}" font-size="${size}"` +
        `${weight === '' ? '' : ` font-weight="${weight}"`}${anchor === 'start' ? '' : ` text-anchor="${anchor}"`}` +
        `${paint}>${escapeMarkup(text)}</text></g>`,
    )
  }

  /** Holds a text to its width as it was drawn, where the reader of the file has not its type. */
  private stretch(text: string): string {
    const { width } = this.measureText(text)
    return width > 0 ? ` textLength="${writeNumber(width)}" lengthAdjust="spacingAndGlyphs"` : ''
  }

  private pen(): string {
    const { lineWidth, lineCap, lineJoin, dash, lineDashOffset, transform } = this
    const growth = evaluateGrowth(transform)
    let pen = ` stroke="${this.paint('strokeStyle')}" stroke-width="${writeNumber(lineWidth * growth)}"`
    if (lineCap !== 'butt') pen += ` stroke-linecap="${lineCap}"`
    if (lineJoin !== 'miter') pen += ` stroke-linejoin="${lineJoin}"`
    if (dash.length > 0) {
      pen += ` stroke-dasharray="${dash.map((part) => writeNumber(part * growth)).join(' ')}"`
      pen += ` stroke-dashoffset="${writeNumber(lineDashOffset * growth)}"`
    }
    return pen
  }

  private common(opacity = true): string {
    const { globalAlpha, clipName } = this
    return (
      (opacity && globalAlpha !== 1 ? ` opacity="${writeNumber(globalAlpha)}"` : '') +
      (clipName === '' ? '' : ` clip-path="url(#${clipName})"`)
    )
  }

  private paint(style: 'fillStyle' | 'strokeStyle'): string {
    const paint = this[style]
    if (typeof paint === 'string') return escapeMarkup(paint)
    const id = `paint${this.defs.length}`
    this.defs.push(paint.write(id))
    return `url(#${id})`
  }
}
