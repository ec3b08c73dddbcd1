import type { Fault } from './fault'
import type { Inspection } from './inspection'
import type { EnergyTable, EnvelopeTable, FieldTable, GaugeTable, Result } from './result'
import type { LineDrawing } from './lineDrawing'

/** What the window says of itself. */
export interface About {
  name: string
  version: string
  notice: string
}

/** A rig that comes with the program. */
export interface Sample {
  /** Name of its folder. */
  id: string
  title: string
  /** What it shows, in a sentence. */
  about: string
}

/** The text of a rig and where it came from. */
export interface RigText {
  /** File name. */
  name: string
  text: string
  /**
   * The host's own word for where it lies; handed back with a solve it lets the rig's records be read
   * from beside it, and with a save it says where to. It opens nothing that the user did not choose.
   */
  place: string
}

type Packed<T> = { [K in keyof T]: T[K] extends number[] ? Float64Array : T[K] }

/** A result as the page has it: long lists as arrays that cross at no cost, the field left to `readField`. */
export type PageResult = Omit<Result, 'gauges' | 'envelope' | 'energy' | 'field'> & {
  gauges: PageGauge[]
  envelope: Packed<EnvelopeTable>
  energy: Packed<EnergyTable>
  /** Empty. */
  field: FieldTable
}

export type PageGauge = Packed<GaugeTable>

export interface SolveRequest {
  /** What the run is kept under: one for each sheet, at most 100 characters. */
  slot: string
  text: string
  /** File name of the rig. */
  name: string
  /** A quick answer from at most about 150 cells by characteristics, to follow the hand. */
  coarse: boolean
  /** In place of the method that the rig asks for. */
  method?: 'characteristics' | 'elements' | 'both'
  /** See {@link RigText}; none where the text came from the page alone. */
  place?: string
}

/**
 * What became of a solve: solved; refused with every reason; stopped, by `stop` or by a later solve;
 * or broken by a fault of the program.
 */
export type SolveAnswer =
  | { status: 'solved'; result: PageResult; line: LineDrawing; inspection: Inspection }
  | { status: 'refused'; faults: Fault[]; inspection: Inspection }
  | { status: 'stopped' }
  | { status: 'broken'; message: string }

/** Nominal stress [Pa], force [N], velocity [m/s], energy per volume of bar [J/m^3]. */
export type Quantity = 'stress' | 'force' | 'velocity' | 'energy'

/** A window of the field, cut into pixels. */
export interface FieldRequest {
  slot: string
  quantity: Quantity
  /** [m] along the line */
  fromX: number
  toX: number
  /** [s] */
  fromT: number
  toT: number
  columns: number
  rows: number
}

export interface ProfileRequest {
  slot: string
  /** [s] */
  t: number
  columns: number
  /** The part of the line that is read [m]; the whole where it is left out. */
  part?: { fromX: number; toX: number }
}

/** Quantities along the line at one time, shape (columns) each; NaN off the bars. */
export interface Profile {
  /** Middles of the columns [m]. */
  x: Float64Array
  /** [Pa] */
  stress: Float64Array
  /** [N] */
  force: Float64Array
  /** [m/s] */
  velocity: Float64Array
  /** Kinetic and elastic energy per volume of bar [J/m^3]. */
  energy: Float64Array
  /** Elastic strain, stress over E [1]. */
  strain: Float64Array
  /** Parts of the force that travel right and left [N]. */
  rightgoing: Float64Array
  leftgoing: Float64Array
}

export interface Progress {
  /** Steps done and in all. */
  done: number
  of: number
  /** Estimate of the time left [s]; null in the first moments. */
  left: number | null
}

/** A rig file that was opened or saved lately. */
export interface RecentRig {
  name: string
  /** Folder it lies in, to tell files of one name apart. */
  folder: string
  place: string
}

/** What the host must know of the sheet to guard it when its window closes. */
export interface SheetState {
  name: string
  text: string
  /** Null for a rig that lies nowhere yet. */
  place: string | null
  unsaved: boolean
}

/** Rig files on this machine's disk; each writes only where the user has said. */
export interface DocumentFiles {
  /** Asks the user for a rig file; null where none was chosen. */
  open(): Promise<RigText | null>
  openRecent(place: string): Promise<RigText>
  recent(): Promise<RecentRig[]>
  /** Writes to where the rig was opened from or last saved. */
  save(place: string, text: string): Promise<void>
  /** Asks the user where to; null where nothing was chosen. */
  saveAs(name: string, text: string): Promise<{ name: string; place: string } | null>
  /** To be told after each edit, open and save: closing the window asks before unsaved work is lost. */
  noteSheet(state: SheetState): Promise<void>
}

/** Everything that the page may ask of its host; the page knows nothing else of it. */
export interface Bridge {
  about(): Promise<About>
  listSamples(): Promise<Sample[]>
  readSample(id: string): Promise<RigText>
  /** Solves in a worker; a later solve in the same slot stops the earlier one. */
  solve(request: SolveRequest): Promise<SolveAnswer>
  /** How far the slot's solve has come; null where none is under way. */
  progress(slot: string): Promise<Progress | null>
  /** Stops the slot's solve, if any; what was solved before stays. */
  stop(slot: string): Promise<void>
  /**
   * Looks into the run last solved in the slot: signed extremes in each pixel, shape (rows, columns, 2)
   * for the smallest and the largest value, row 0 the earliest; NaN off the bars and outside the run.
   */
  readField(request: FieldRequest): Promise<Float32Array>
  readProfile(request: ProfileRequest): Promise<Profile>
  /** The report of the result last solved in the slot, as a page of HTML. */
  report(slot: string): Promise<string>
  /** Rig files through the host; null in a browser, which has ways of its own. */
  files?(): DocumentFiles | null
}
