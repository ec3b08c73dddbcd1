import { computed, ref, shallowRef, triggerRef, type ComputedRef, type Ref, type ShallowRef } from 'vue'
import type { Bridge } from '../../src-main/contract/bridge'
import type { Fault } from '../../src-main/contract/fault'
import type { RigDocument } from './document/rigDocument'
import { writeAt } from './document/writeAt'
import { makeStartRig } from './document/makeStartRig'

/** One state in the history of a rig: the document and what led to it. */
interface Step {
  document: RigDocument
  /** What was done, such as `Bore of shaft, section 3`; empty for the first. */
  label: string
  /** What later edits of the same thing may be merged into; null once it is sealed. */
  key: string | null
}

/** The rig that is open, as typed, with everything that was done to it. */
export interface Rig {
  document: ShallowRef<RigDocument>
  /** What the host is given and what is saved: the file as it came, until it is edited. */
  text: ComputedRef<string>
  /** Name of the file, with or without a place of its own yet. */
  name: Ref<string>
  /** The host's word for where it lies, so that records beside it are found; null where it lies nowhere. */
  place: Ref<string | null>
  saved: ComputedRef<boolean>
  /** Why the document is refused; empty where it is not. */
  faults: ShallowRef<Fault[]>
  /** True while a value follows the hand: runs are coarse. */
  dragging: Ref<boolean>
  /** Counts openings, so that views can start anew. */
  opened: Ref<number>
  canUndo: ComputedRef<boolean>
  canRedo: ComputedRef<boolean>
  /** What undo would take back, and redo bring again; empty where there is nothing. */
  undoLabel: ComputedRef<string>
  redoLabel: ComputedRef<string>
  /** Sets the value at a path; undefined takes it out. Edits of one path merge into one step until it is sealed. */
  edit(path: string, value: unknown, label: string): void
  /** Changes the document in one step that nothing merges into; with a key, steps of the same key merge. */
  change(label: string, make: (document: RigDocument) => RigDocument, key?: string): void
  /** Ends a run of edits: the next one is a step of its own. */
  seal(): void
  undo(): void
  redo(): void
  /** Opens a text that is JSON with an object at its top; throws with the reason where it is not. */
  open(text: string, name: string, place?: string | null): void
  openSample(id: string): Promise<void>
  startNew(): void
  /** Takes the document as it stands for saved, under this name and in this place. */
  markSaved(name: string, place: string | null): void
}

const STEPS_KEPT = 500

/**
 * Makes the store of the rig that is open.
 *
 * @param bridge - where samples come from
 * @returns the store, holding a new small rig
 */
export function makeRig(bridge: Pick<Bridge, 'readSample'>): Rig {
  const first = makeStartRig()
  const document = shallowRef<RigDocument>(first)
  const steps = shallowRef<Step[]>([{ document: first, label: '', key: null }])
  const at = ref(0)
  const name = ref('')
  const place = ref<string | null>(null)
  const savedDocument = shallowRef<RigDocument | null>(first)
  const source = shallowRef<{ document: RigDocument; text: string } | null>(null)
  const faults = shallowRef<Fault[]>([])
  const dragging = ref(false)
  const opened = ref(0)

  function begin(start: RigDocument, text: string | null, itsName: string, itsPlace: string | null): void {
    steps.value = [{ document: start, label: '', key: null }]
    at.value = 0
    source.value = text === null ? null : { document: start, text }
    savedDocument.value = start
    name.value = itsName
    place.value = itsPlace
    faults.value = []
    dragging.value = false
    document.value = start
    opened.value++
  }

  function push(next: RigDocument, label: string, key: string | null): void {
    if (next === document.value) return
    const last = steps.value[at.value]
    const merges = key !== null && last.key === key && last.document !== savedDocument.value
    const kept = steps.value.slice(0, merges ? at.value : at.value + 1).slice(-STEPS_KEPT)
    steps.value = [...kept, { document: next, label, key }]
    at.value = steps.value.length - 1
    document.value = next
  }

  function change(label: string, make: (document: RigDocument) => RigDocument, key?: string): void {
    push(make(document.value), label, key ?? null)
  }

  function seal(): void {
    const last = steps.value[at.value]
    if (last.key === null) return
    last.key = null
    triggerRef(steps)
  }

  function go(to: number): void {
    if (to < 0 || to >= steps.value.length) return
    seal()
    at.value = to
    document.value = steps.value[to].document
  }

  function open(text: string, itsName: string, itsPlace: string | null = null): void {
    begin(readObject(text), text, itsName, itsPlace)
  }

  return {
    document,
    text: computed(() =>
      source.value?.document === document.value
        ? source.value.text
        : `${JSON.stringify(document.value, null, 2)}\n`,
    ),
    name,
    place,
    saved: computed(() => document.value === savedDocument.value),
    faults,
    dragging,
    opened,
    canUndo: computed(() => at.value > 0),
    canRedo: computed(() => at.value < steps.value.length - 1),
    undoLabel: computed(() => steps.value[at.value].label),
    redoLabel: computed(() => steps.value[at.value + 1]?.label ?? ''),
    edit: (path, value, label) => change(label, (rig) => writeAt(rig, path, value), path),
    change,
    seal,
    undo: () => go(at.value - 1),
    redo: () => go(at.value + 1),
    open,
    async openSample(id) {
      const sample = await bridge.readSample(id)
      open(sample.text, sample.name, sample.place)
    },
    startNew: () => begin(makeStartRig(), null, '', null),
    markSaved(itsName, itsPlace) {
      name.value = itsName
      place.value = itsPlace
      savedDocument.value = document.value
      seal()
    },
  }
}

/** A file's text may begin with a byte-order mark, which the host's reader takes off as well. */
function readObject(text: string): RigDocument {
  const value: unknown = JSON.parse(text.replace(/^\uFEFF/, ''))
  if (typeof value !== 'object' || value === null || Array.isArray(value)) {
    throw new Error('A rig file holds one object { }.')
  }
  return value
}
