import type { ProfileRequest, SolveRequest } from '../contract/bridge'
import type { FieldWindow } from '../engine/solveRig'

/** One rig to be solved in a worker. */
export interface SolveJob extends Pick<SolveRequest, 'text' | 'coarse' | 'method'> {
  /** Absolute path of the rig file, beside which records are read; null where it lies nowhere. */
  rigPath: string | null
}

/** What a worker is asked for; all but the first look into the run it solved last. */
export type Question =
  | { kind: 'solve'; job: SolveJob }
  | { kind: 'field'; window: FieldWindow }
  | ({ kind: 'profile' } & Omit<ProfileRequest, 'slot'>)
  | { kind: 'report' }

/** A message to a worker: a question to be answered, the wish to stop the solve, or to let the run go. */
export type WorkerMessage = { id: number; question: Question } | { wish: 'stop' | 'drop' }

/** A message from a worker: how far the solve of that id has come, its answer, or a fault of ours. */
export type WorkerReply =
  { id: number; done: number; of: number } | { id: number; value: unknown } | { id: number; error: string }
