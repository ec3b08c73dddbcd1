/** The result of one run, SI, tension and rightward motion positive: the content of `result.json`. */
export interface Result {
  format: 'barwright-result/1'
  rig: { title: string; sha256: string }
  software: { name: string; version: string }
  method: 'characteristics' | 'elements'
  run: RunSummary
  line: { length: number; bars: LineBarSummary[] }
  interfaces: InterfaceRatios[]
  tapers: TaperAnswer[]
  envelope: EnvelopeTable
  sections: SectionPeaks[]
  governing: Governing | null
  /** Factor n on every stress in the margins. */
  factorOfSafety: number
  /** A row for each bar with a fatigue line, from the left; empty where no material has one. */
  fatigue: FatigueAnswer[]
  striker: StrikerAnswer | null
  gauges: GaugeTable[]
  joints: JointTable[]
  ends: { left: EndTable; right: EndTable }
  bars: BarState[]
  energy: EnergyTable
  momentum: { closure: number }
  wavefronts: Wavefront[]
  field: FieldTable
  comparison: Comparison | null
  spalls: Spall[]
  fragments: FragmentState[]
  cautions: Caution[]
  notice: string
}

export interface RunSummary {
  /** [s] */
  timeStep: number
  steps: number
  cells: number
  /** [s] */
  duration: number
  /** Time spent in the solve itself [s]; the only number that differs between equal runs. */
  solveTime: number
  /** Share of each section's travel time that the whole number of cells leaves over: (cells dt - tau) / tau. */
  travelTimeRounding: { bar: string; section: number; error: number }[]
}

export interface LineBarSummary {
  name: string
  /** [m] along the line */
  from: number
  to: number
  /** [kg] */
  mass: number
  /** [s] */
  travelTime: number
}

/** What one wave becomes at a step, each as a share of what arrived. */
export interface StepRatios {
  reflectedForce: number
  transmittedForce: number
  reflectedStress: number
  transmittedStress: number
  reflectedEnergy: number
  transmittedEnergy: number
}

export interface InterfaceRatios {
  name: string
  /** [m] */
  x: number
  /** [kg/s] */
  leftImpedance: number
  rightImpedance: number
  fromLeft: StepRatios
  fromRight: StepRatios
}

/** A taper or a run of small steps, seen by short, long and harmonic pulses arriving from one side. */
export interface TaperAnswer {
  name: string
  /** [m] */
  from: number
  to: number
  /** [s] */
  travelTime: number
  /** Force ratios of a pulse much shorter than the taper. */
  shortPulse: { reflectedForce: number; transmittedForce: number }
  /** Force ratios of a pulse much longer than the taper. */
  longPulse: { reflectedForce: number; transmittedForce: number }
  /** [Hz] */
  frequency: number[]
  /** Magnitudes of the harmonic force ratios at each frequency, from the left. */
  reflectedForce: number[]
  transmittedForce: number[]
  /** Energy share that passes, the same from both sides. */
  transmittedEnergy: number[]
}

/** Largest stresses at each place; x repeats where both faces of a step are kept. */
export interface EnvelopeTable {
  /** [m] */
  x: number[]
  /** [Pa], zero or positive */
  tension: number[]
  /** [s] */
  tensionTime: number[]
  /** [Pa], zero or negative */
  compression: number[]
  /** [s] */
  compressionTime: number[]
}

export interface SensePeak {
  /** Largest nominal stress in the section [Pa], negative in compression. */
  peak: number
  /** [m] */
  at: number
  /** [s] */
  time: number
  /** Factor of the shoulder whose local stress is largest; null where there is none or the fit does not reach. */
  kt: number | null
  /** Largest of the nominal peak and kt times the nominal stress at the fillet [Pa]. */
  local: number
  /** Where [m] and when [s] the local stress is reached: at the fillet where that governs. */
  localAt: number
  localTime: number
  /** [Pa], positive, before the factor of safety; null where none was given. */
  allowable: number | null
  /** allowable / (factor of safety |local|) - 1; null without an allowable or without stress. */
  margin: number | null
}

export interface SectionPeaks {
  bar: string
  section: number
  /** [m] */
  from: number
  to: number
  tension: SensePeak
  compression: SensePeak
}

export interface Governing {
  bar: string
  section: number
  sense: 'tension' | 'compression'
  margin: number
}

/** Cycles of one range in the local stress history of one impact, repeated. */
export interface FatigueCycle {
  /** Distance between the two turning points [Pa] */
  range: number
  /** Middle of the two [Pa]; shown, not counted */
  mean: number
  /** How often it occurs in one impact. */
  count: number
  /** Share of the life that these cycles use up in one impact [1]. */
  damage: number
}

/** What one impact, repeated, uses up of the fatigue life of a bar, at its most damaged place looked at. */
export interface FatigueAnswer {
  bar: string
  section: number
  /** [m] along the line */
  at: number
  /** Factor of the shoulder at the place; null where there is none or the fit does not reach. */
  kt: number | null
  /** The material's fatigue line: amplitude = strength (2 N)^exponent, strength [Pa]. */
  strength: number
  exponent: number
  /** Half the largest local range [Pa]. */
  amplitude: number
  /** Cycles in one impact, of whatever range. */
  cycles: number
  /** The largest ranges first, at most ten rows. */
  largest: FatigueCycle[]
  /** Share of the life that one impact uses up, over all cycles [1]. */
  damage: number
  /** The same for the first half of the run alone. */
  damageFirstHalf: number
  /** Equal impacts to failure, 1 / damage; under 1 the first one breaks it; null where no cycle does damage. */
  impacts: number | null
}

export interface StrikerAnswer {
  name: string
  /** [m/s], positive to the right */
  speed: number
  /** Length of the pulse in the struck bar [m]; null for a rigid mass. */
  pulseLength: number | null
  /** Duration of the pulse, twice the striker's travel time [s]; null for a rigid mass. */
  pulseDuration: number | null
  /** Speed at which the governing margin is zero [m/s]; null when several things move or the run is not linear. */
  safeSpeed: number | null
}

export interface GaugePulse {
  direction: 'right' | 'left'
  /** [s] */
  from: number
  to: number
  /** [N] */
  peakForce: number
  /** True when no opposite wave passes within it. */
  clear: boolean
}

export interface GaugeTable {
  name: string
  /** [m] */
  x: number
  t: number[]
  /** Force over the undeformed area [Pa]. */
  stress: number[]
  /** Force over the deformed area, P (1 + strain)^(2 nu) [Pa]; empty but for runs with finite strain. */
  trueStress: number[]
  strain: number[]
  force: number[]
  velocity: number[]
  rightgoingForce: number[]
  leftgoingForce: number[]
  /** [V]; empty without a bridge */
  bridge: number[]
  pulses: GaugePulse[]
}

export interface JointTable {
  name: string
  kind: string
  /** Force of largest magnitude [N] */
  peakForce: number
  /** [N s] */
  impulse: number
  /** First time with force [s]; null when it never carries any. */
  closedFrom: number | null
  /** Time with force in all [s] */
  contactTime: number
  /** [J] */
  energyLost: number
}

export interface EndTable {
  /** Force of the bar at the end, tension positive, of largest magnitude [N] */
  peakForce: number
  /** Impulse of the surroundings on the bar, positive to the right [N s] */
  impulse: number
  /** Work of the surroundings on the bar [J] */
  work: number
  /** Time with force in all [s] */
  contactTime: number
  /** Velocity of the rigid mass at the end after the run, positive to the right [m/s]; null where none stands there. */
  bodyVelocity: number | null
}

export interface BarState {
  name: string
  /** [kg m/s] */
  momentum: number
  /** Mean velocity [m/s] */
  velocity: number
  /** [J] */
  kinetic: number
  strain: number
}

export interface EnergyTable {
  /** [s] */
  t: number[]
  /** [J] */
  kinetic: number[]
  strain: number[]
  dissipated: number[]
  work: number[]
  /** Largest of |stored + dissipated - work - stored at the start| over the largest energy at play. */
  closure: number
}

export interface Wavefront {
  /** [m] [s] */
  fromX: number
  fromT: number
  toX: number
  toT: number
  direction: 'right' | 'left'
  /** Force of the front relative to the first one of its start. */
  force: number
  /** True where a taper spreads it. */
  spread: boolean
}

/** How far the two methods are apart, each difference as a share of the largest stress it is measured by. */
export interface Comparison {
  /** Largest difference of the envelope over the largest stress in the line. */
  envelope: number
  /** Where [m] and in which sense. */
  envelopeAt: number
  envelopeSense: 'tension' | 'compression'
  /** By gauge: largest and root mean square difference of stress over the largest stress there. */
  gauges: { name: string; largest: number; rootMeanSquare: number }[]
  /** What it means and which method to trust, in one or two sentences. */
  verdict: string
}

/** A place where a bar came apart. */
export interface Spall {
  bar: string
  /** [m] */
  x: number
  /** [s] */
  time: number
  /** Tension that opened it [Pa]. */
  stress: number
}

/** A piece of a bar that came apart, at the end of the run. */
export interface FragmentState {
  bar: string
  /** [m] */
  from: number
  to: number
  /** [kg] */
  mass: number
  /** Mean velocity [m/s]. */
  velocity: number
}

export interface FieldTable {
  /** [m] */
  x: number[]
  /** [s] */
  t: number[]
  /** A row per time [Pa] */
  stress: number[][]
}

export type CautionCode =
  | 'short-rise'
  | 'steep-taper'
  | 'near-step'
  | 'buckling'
  | 'over-yield'
  | 'large-strain'
  | 'flat-faces'
  | 'no-fillet-factor'
  | 'static-fillet-factor'
  | 'no-allowable'
  | 'travel-time-rounding'
  | 'user-values'
  | 'negative-margin'
  | 'energy-closure'
  | 'short-run'
  | 'laws-left-out'
  | 'fatigue-basis'
  | 'fatigue-range'

export interface Caution {
  code: CautionCode
  message: string
  /** The place, such as `shaft, section 2`; empty for the whole run. */
  where: string
}
