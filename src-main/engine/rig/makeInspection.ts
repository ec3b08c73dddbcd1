import type { Inspection, InspectedPulse } from '../../contract/inspection'
import type { Pulse } from '../../contract/rig'
import type { Dimension, DimensionName } from './formula/dimension'
import { DIMENSIONS, isSameDimension } from './formula/dimension'
import type { Place } from './place'
import { formatPlace } from './place'

/** What is noted of a rig while it is read. */
export interface RigNotes {
  /** A value that was read [SI]. */
  value(place: Place, value: number, dimension: DimensionName | Dimension): void
  /** A history that was read; over the run of this duration [s], null where that is not known. */
  pulse(place: Place, pulse: Pulse, dimension: DimensionName, duration: number | null): void
}

/** Values kept: a table of thousands of rows is not shown value by value. */
const MOST_VALUES = 2000
const PULSE_POINTS = 200
const MOST_BREAKS = 100
/** Duration over which a history is shown where that of the run is not known [s]. */
const SHOWN_DURATION = 1e-3

/**
 * Makes the notes of one reading.
 *
 * @returns the notes, to be handed to the reader, and what they have come to
 */
export function makeInspection(): { notes: RigNotes; inspection: Inspection } {
  const inspection: Inspection = { values: [], pulses: [] }
  const notes: RigNotes = {
    value(place, value, dimension) {
      if (inspection.values.length >= MOST_VALUES) return
      const name = typeof dimension === 'string' ? dimension : nameOf(dimension)
      inspection.values.push({ path: formatPlace(place), value, dimension: name })
    },
    pulse(place, pulse, dimension, duration) {
      if (dimension !== 'force' && dimension !== 'velocity' && dimension !== 'length') return
      inspection.pulses.push(samplePulse(formatPlace(place), pulse, dimension, duration ?? SHOWN_DURATION))
    },
  }
  return { notes, inspection }
}

function nameOf(dimension: Dimension): string {
  const found = Object.entries(DIMENSIONS).find(([, named]) => isSameDimension(named.dimension, dimension))
  return found ? found[0] : ''
}

/** Even points over the duration and, so that jumps and corners stand, both sides of its breaks. */
function samplePulse(
  path: string,
  pulse: Pulse,
  dimension: InspectedPulse['dimension'],
  duration: number,
): InspectedPulse {
  const even = Array.from({ length: PULSE_POINTS + 1 }, (_, i) => (duration * i) / PULSE_POINTS)
  const breaks = pulse.breaks
    .slice(0, MOST_BREAKS)
    .filter((t) => t >= 0 && t <= duration)
    .flatMap((t) => [Math.max(0, t - 1e-9 * duration), t])
  const t = [...even, ...breaks].sort((a, b) => a - b)
  return { path, dimension, t, value: t.map((at) => pulse.value(at)) }
}
