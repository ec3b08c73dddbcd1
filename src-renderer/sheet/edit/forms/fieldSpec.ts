import type { RigDocument } from '../../../stores/document/rigDocument'
import { readAt } from '../../../stores/document/readAt'

/** One value of a part as it is edited. */
export interface FieldSpec {
  /** Where it stands in the rig. */
  path: string
  label: string
  /**
   * `value`: a text with a formula and units; `number`: a plain number or a formula without unit; `words`;
   * `choice` and `flag`; `pairs`: rows of two values.
   */
  kind: 'value' | 'number' | 'words' | 'choice' | 'flag' | 'pairs'
  /** Said while it is empty, and what that means; a field without it must be filled. */
  empty?: string
  choices?: readonly Choice[]
  /** Width [px] at the smaller type. */
  width?: number
  /** A change that touches more than the value itself, such as a new name. */
  set?(document: RigDocument, value: unknown): RigDocument
  /** What a choice shows, where it is not what stands at the path. */
  shown?: string
}

export interface Choice {
  value: string
  text: string
}

/** A word that changes the part. */
export interface PartAction {
  word: string
  /** For undo, such as `Split shaft, section 1`; empty for one that changes nothing. */
  label?: string
  change?(document: RigDocument): RigDocument
  /** Part that is edited after it; null for none. */
  select?: string | null
  /** Why it cannot be done now. */
  not?: string
}

/** The fields of a part, in rows, and what can be done with it. */
export interface PartForm {
  rows: FieldSpec[][]
  /** Fields that stand among the actions, with their word beside them. */
  beside?: FieldSpec[]
  actions: PartAction[]
  /** Where a pulse stands that is drawn beside its fields. */
  pulse?: string
}

const choose = (values: readonly string[]): Choice[] => values.map((value) => ({ value, text: value }))

/** Choices whose words are their values. */
export const plainChoices = choose

/** A value with a unit. */
export function value(path: string, label: string, empty?: string, width = 88): FieldSpec {
  return { path, label, kind: 'value', empty, width }
}

/** The names of a rig's materials, to choose from. */
export function listMaterialChoices(document: RigDocument, first?: string): Choice[] {
  const names = Object.keys(document.materials ?? {})
  return [...(first === undefined ? [] : [{ value: '', text: first }]), ...choose(names)]
}

/** The kind that a part has, such as a joint's or an end's. */
export function readKind(document: RigDocument, path: string, fallback: string): string {
  const kind = readAt(document, `${path}.kind`)
  return typeof kind === 'string' ? kind : fallback
}
