/**
 * Lists the spells in which a force is there.
 *
 * @param values - smallest and largest force in each row, the earliest first, shape (rows, 2) [N]
 * @param least - magnitude up to which a force is none [N]
 * @param fromT - start of the first row [s]
 * @param toT - end of the last row [s]
 * @returns start and end of each spell, whole rows [s]
 */
export function listSpells(
  values: ArrayLike<number>,
  least: number,
  fromT: number,
  toT: number,
): { from: number; to: number }[] {
  const rows = values.length / 2
  const at = (row: number): number => fromT + ((toT - fromT) * row) / rows
  const spells: { from: number; to: number }[] = []
  let start = -1
  for (let row = 0; row <= rows; row++) {
    const carries = row < rows && (values[2 * row] < -least || values[2 * row + 1] > least)
    if (carries && start < 0) start = row
    if (!carries && start >= 0) {
      spells.push({ from: at(start), to: at(row) })
      start = -1
    }
  }
  return spells
}
