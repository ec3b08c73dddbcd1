/** Ways of hatching, taken in turn by the materials of a rig; told apart without colour. */
export const HATCHES = [
  { gap: 6, lines: [0.5], dashes: undefined },
  { gap: 9, lines: [0.5, 3], dashes: undefined },
  { gap: 4, lines: [0.5], dashes: undefined },
  { gap: 8, lines: [0.5], dashes: '5 3' },
  { gap: 12, lines: [0.5, 3, 5.5], dashes: undefined },
] as const

/**
 * Names the pattern of a section.
 *
 * @param materials - names of the rig's materials in the order of the line
 * @param material - of the section
 * @param bar - place of its bar, from 0
 * @returns the pattern's address in the drawing
 */
export function findHatch(materials: readonly string[], material: string, bar: number): string {
  return `url(#hatch-${Math.max(0, materials.indexOf(material)) % HATCHES.length}-${bar % 2})`
}
