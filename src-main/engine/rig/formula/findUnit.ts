import type { Dimension } from './dimension'
import { getParser } from './parser'

/** One unit: `value [SI] = number * factor`. */
export interface UnitFactor {
  factor: number
  dimension: Dimension
}

/**
 * The units of the trade, without prefix. The table of mathjs holds many more words (drop, rod, cup,
 * link), which are better left free as names of variables.
 */
const TRADE = new Set(
  [
    'm meter meters m2 m3 inch inches in ft foot feet yd yard yards mil thou sqin',
    's sec secs second seconds Hz hertz rad deg degree degrees',
    'g gram grams tonne lbm lb lbs oz slug N newton newtons lbf kip kgf dyn',
    'Pa psi ksi Msi bar atm J W V volt volts mph',
  ].flatMap((line) => line.split(' ')),
)

/** Units whose name misleads, with what to write in their place. */
const REFUSED: Record<string, string> = {
  ton: 'it is 907 kg to some and 1000 kg to others; write "tonne" for 1000 kg, or pounds ("lbm")',
  tons: 'it is 907 kg to some and 1000 kg to others; write "tonne" for 1000 kg, or pounds ("lbm")',
}

const found = new Map<string, UnitFactor | string | null>()

/**
 * Looks up a unit by name, with its prefix.
 * @param name such as `mm`, `kN`, `psi`
 * @returns its factor and dimension; a reason where the unit is refused; null where there is none
 */
export function findUnit(name: string): UnitFactor | string | null {
  let unit = found.get(name)
  if (unit === undefined) {
    unit = lookUp(name)
    if (found.size < 1000) found.set(name, unit)
  }
  return unit
}

function lookUp(name: string): UnitFactor | string | null {
  if (Object.hasOwn(REFUSED, name)) return REFUSED[name]
  const { Unit } = getParser()
  if (!/^[A-Za-z]+[23]?$/.test(name) || !Unit.isValuelessUnit(name)) return null
  const unit = new Unit(1, name)
  if (unit.dimensions[4] !== 0) return 'temperatures have no place in a rig'
  return TRADE.has(unit.units[0].unit.name) ? { factor: unit.value, dimension: [...unit.dimensions] } : null
}
