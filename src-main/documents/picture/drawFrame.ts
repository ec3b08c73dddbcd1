import { chooseUnit } from '../format/chooseUnit'
import { formatTick } from '../format/formatTick'
import type { Quantity, Unit } from '../format/quantity'
import { markup, type Markup } from '../markup'
import { round } from './drawPath'
import { listTicks } from './listTicks'
import { makeScale, type Scale } from './scale'

/** Size of a picture and of the room that its axes take. */
export const WIDTH = 900
const LEFT = 64
const RIGHT = 12
const TOP = 18
const BOTTOM = 36

export interface Axis {
  heading: string
  quantity: Quantity
  domain: [number, number]
}

export interface Frame {
  x: Scale
  y: Scale
  /** The plot's own corner and size. */
  left: number
  top: number
  width: number
  height: number
}

/**
 * Draws a picture with its axes.
 *
 * @param title - what it shows, read out in place of the picture
 * @param height - of the whole picture
 * @param axes - across and upwards; `down` turns the second one round
 * @param content - draws inside the frame
 * @returns the picture as one `svg` element
 */
export function drawFrame(
  title: string,
  height: number,
  axes: { x: Axis; y: Axis; down?: boolean },
  content: (frame: Frame) => Markup[],
): Markup {
  const bottom = height - BOTTOM
  const upwards: [number, number] = axes.down ? [TOP, bottom] : [bottom, TOP]
  const frame: Frame = {
    x: makeScale(axes.x.domain, [LEFT, WIDTH - RIGHT]),
    y: makeScale(axes.y.domain, upwards),
    left: LEFT,
    top: TOP,
    width: WIDTH - RIGHT - LEFT,
    height: bottom - TOP,
  }
  return markup`<svg class="picture" viewBox="0 0 ${WIDTH} ${height}" role="img" aria-label="${title}">
${drawAcross(frame, axes.x)}${drawUp(frame, axes.y)}${content(frame)}<rect class="frame" x="${LEFT}" y="${TOP}" width="${frame.width}" height="${frame.height}"/>
</svg>`
}

function drawAcross({ x, top, height }: Frame, axis: Axis): Markup {
  const bottom = top + height
  const unit = chooseUnit(axis.quantity, axis.domain)
  const ticks = listTicks(x.from / unit.size, x.to / unit.size, 10).map((tick) => {
    const at = round(x.place(tick * unit.size))
    return markup`<path class="grid" d="M${at} ${top}V${bottom}"/>
<text class="tick middle" x="${at}" y="${bottom + 14}">${formatTick(tick)}</text>`
  })
  const middle = round((x.place(x.from) + x.place(x.to)) / 2)
  return markup`${ticks}<text class="tick middle" x="${middle}" y="${bottom + 30}">${labelAxis(axis, unit)}</text>`
}

function drawUp({ y, left, width }: Frame, axis: Axis): Markup {
  const unit = chooseUnit(axis.quantity, axis.domain)
  const ticks = listTicks(y.from / unit.size, y.to / unit.size, 5).map((tick) => {
    const at = round(y.place(tick * unit.size))
    return markup`<path class="grid" d="M${left} ${at}H${left + width}"/>
<text class="tick end" x="${left - 5}" y="${at + 4}">${formatTick(tick)}</text>`
  })
  return markup`${ticks}<text class="tick" x="${left}" y="12">${labelAxis(axis, unit)}</text>`
}

function labelAxis({ heading }: Axis, unit: Unit): string {
  return unit.name === '' ? heading : `${heading} [${unit.name}]`
}
