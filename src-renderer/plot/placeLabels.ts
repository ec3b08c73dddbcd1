/** A word that wants a place in a drawing. */
export interface Label {
  text: string
  /** Middle of the place it wants most, and of others in the order of liking [px]. */
  places: readonly { x: number; y: number }[]
  /** [px] */
  width: number
  height: number
}

/** A word with its place. */
export interface PlacedLabel {
  text: string
  /** Middle [px]. */
  x: number
  y: number
}

/** An area of the drawing that is taken [px]. */
export interface Box {
  left: number
  top: number
  right: number
  bottom: number
}

/**
 * Gives each label the first of its places where it covers no other and stays inside; a label that finds
 * none is left out. Earlier labels come first.
 *
 * @param labels - in the order of their weight
 * @param room - the drawing
 * @param taken - areas that must stay free
 * @returns labels that found a place
 */
export function placeLabels(labels: readonly Label[], room: Box, taken: readonly Box[] = []): PlacedLabel[] {
  const boxes = [...taken]
  const placed: PlacedLabel[] = []
  for (const { text, places, width, height } of labels) {
    for (const { x, y } of places) {
      const box = { left: x - width / 2, right: x + width / 2, top: y - height / 2, bottom: y + height / 2 }
      if (!isInside(box, room) || boxes.some((other) => isOver(box, other))) continue
      boxes.push(box)
      placed.push({ text, x, y })
      break
    }
  }
  return placed
}

function isInside(box: Box, room: Box): boolean {
  return box.left >= room.left && box.right <= room.right && box.top >= room.top && box.bottom <= room.bottom
}

/**
 * Tells whether two areas share a pixel.
 *
 * @param one - an area
 * @param other - another
 */
export function isOver(one: Box, other: Box): boolean {
  return one.left < other.right && other.left < one.right && one.top < other.bottom && other.top < one.bottom
}
