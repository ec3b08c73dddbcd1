/** What the values of a rig are worth, as far as they could be read; of a refused rig as well. */
export interface Inspection {
  values: InspectedValue[]
  pulses: InspectedPulse[]
}

export interface InspectedValue {
  /** Where it stands in the rig file, as faults name places. */
  path: string
  /** [SI] */
  value: number
  /** What it is: `length`, `stress`, `number`, ...; empty for one without a name. */
  dimension: string
}

/** A prescribed history over the run. */
export interface InspectedPulse {
  path: string
  dimension: 'force' | 'velocity' | 'length'
  /** [s], rising; a jump stands twice at next to the same time */
  t: number[]
  /** [N], [m/s] or [m] */
  value: number[]
}
