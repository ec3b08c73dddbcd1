/**
 * A rig as its file holds it: what the user typed, formulas and units as text. Nothing in it is checked
 * here, so that a file with faults can be opened and mended; only the host's reader decides what is right.
 */
export interface RigDocument {
  format?: string
  title?: string
  notes?: string
  variables?: Record<string, string | number>
  materials?: Record<string, MaterialDocument>
  leftEnd?: PartDocument
  bars?: BarDocument[]
  joints?: PartDocument[]
  rightEnd?: PartDocument
  loads?: LoadDocument[]
  gravity?: string
  gauges?: GaugeDocument[]
  margins?: { factorOfSafety?: string | number }
  run?: RunDocument
  studies?: unknown[]
}

export interface AllowableDocument {
  tension?: string
  compression?: string
}

export interface MaterialDocument {
  density?: string
  modulus?: string
  poisson?: string | number
  allowable?: AllowableDocument
  yield?: string
  hardening?: string
  hardeningRule?: string
  viscosity?: string
  spall?: string
  fatigue?: { strength?: string; exponent?: string | number }
  source?: string
}

/** A diameter or bore: a value or formula, or a profile between two. */
export type OutlineDocument = string | { from?: string; to?: string; profile?: string }

export interface SectionDocument {
  name?: string
  length?: string
  diameter?: OutlineDocument
  bore?: OutlineDocument
  area?: string
  stations?: [string, string][]
  fillet?: string
  material?: string
  allowable?: AllowableDocument
}

export interface BarDocument {
  name?: string
  material?: string
  sections?: SectionDocument[]
  velocity?: string
  displacement?: string
  preload?: string
  allowable?: AllowableDocument
}

/** A joint or an end: its kind decides which of the other keys it may have. */
export interface PartDocument {
  kind?: string
  [key: string]: unknown
}

export interface PulseDocument {
  shape?: string
  [key: string]: unknown
}

export interface LoadDocument {
  bar?: string
  at?: string
  pulse?: PulseDocument
}

export interface GaugeDocument {
  name?: string
  bar?: string
  at?: string
  bridge?: Record<string, string | number>
}

export interface RunDocument {
  duration?: string
  cell?: string
  timeStep?: string
  method?: string
  [flag: string]: string | boolean | undefined
}
