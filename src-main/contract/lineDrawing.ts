/** What is needed to draw the line of a rig to scale, SI; each part with its path in the rig file. */
export interface LineDrawing {
  bars: DrawnBar[]
  /** From the left, one fewer than bars. */
  joints: DrawnJoint[]
  /** Left and right. */
  ends: DrawnEnd[]
  gauges: DrawnGauge[]
  loads: DrawnLoad[]
}

export interface DrawnBar {
  name: string
  /** Ends along the line [m]. */
  from: number
  to: number
  /** Initial velocity at its middle, positive to the right [m/s]. */
  velocity: number
  sections: DrawnSection[]
  path: string
}

export interface DrawnSection {
  /** Place in its bar, from 0. */
  index: number
  name: string
  /** [m] along the line */
  from: number
  to: number
  /** Points `[x, outer diameter, bore]` [m] from face to face, at least two. */
  outline: [number, number, number][]
  material: string
  /** Radius at its right face [m]. */
  fillet: number | null
  path: string
}

export interface DrawnJoint {
  kind: 'bonded' | 'contact' | 'cushion' | 'specimen'
  /** [m] along the line, where gaps take no length */
  x: number
  /** Open gap at the start [m]. */
  gap: number
  path: string
}

export interface DrawnEnd {
  kind:
    | 'free'
    | 'fixed'
    | 'matched'
    | 'force'
    | 'velocity'
    | 'displacement'
    | 'mass'
    | 'support'
    | 'wall'
    | 'penetration'
  x: number
  /** What stands there, in a word or two. */
  label: string
  path: string
}

export interface DrawnGauge {
  name: string
  x: number
  path: string
}

export interface DrawnLoad {
  x: number
  path: string
}
