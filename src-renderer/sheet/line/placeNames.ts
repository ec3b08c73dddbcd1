import { measureText } from '../../format/measureText'

/** A name under the line that may be shortened. */
export interface LineName {
  path: string
  /** Middle [px]. */
  x: number
  /** From the fullest to the shortest: a bold part and a lighter one. */
  forms: [bold: string, light: string][]
}

export interface PlacedName {
  path: string
  x: number
  bold: string
  light: string
}

const SPACE = 8

/**
 * Places names in one row: each takes the fullest form that leaves the others theirs; what finds no room
 * even in its shortest form is left out, and is told by the part itself.
 *
 * @param names - those before others come first
 * @param from - left end of the row [px]
 * @param to - right end [px]
 * @param size - of the type [px]
 * @returns the names with their forms
 */
export function placeNames(names: readonly LineName[], from: number, to: number, size: number): PlacedName[] {
  const taken: { left: number; right: number; at: number; form: number }[] = []
  // First everyone in the shortest form, then each grows as far as its neighbours let it.
  for (const [at, { x, forms }] of names.entries()) {
    const box = boxOf(x, forms[forms.length - 1], size)
    if (isFree(box, taken, from, to)) taken.push({ ...box, at, form: forms.length - 1 })
  }
  for (const one of taken) {
    const { x, forms } = names[one.at]
    const others = taken.filter((other) => other !== one)
    for (let form = 0; form < one.form; form++) {
      const box = boxOf(x, forms[form], size)
      if (!isFree(box, others, from, to)) continue
      Object.assign(one, box, { form })
      break
    }
  }
  return taken.map(({ at, form }) => {
    const { path, x, forms } = names[at]
    return { path, x, bold: forms[form][0], light: forms[form][1] }
  })
}

function boxOf(x: number, [bold, light]: [string, string], size: number): { left: number; right: number } {
  const space = bold !== '' && light !== '' ? 0.4 * size : 0
  const half = (measureText(bold, size, true) + space + measureText(light, size)) / 2
  return { left: x - half, right: x + half }
}

function isFree(
  box: { left: number; right: number },
  others: readonly { left: number; right: number }[],
  from: number,
  to: number,
): boolean {
  if (box.left < from || box.right > to) return false
  return others.every((other) => box.right + SPACE <= other.left || box.left >= other.right + SPACE)
}
