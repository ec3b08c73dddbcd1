import { ref, shallowRef, watch, type Ref, type ShallowRef } from 'vue'
import type { Bridge, PageResult, Progress, SolveAnswer } from '../../src-main/contract/bridge'
import type { Inspection } from '../../src-main/contract/inspection'
import type { LineDrawing } from '../../src-main/contract/lineDrawing'
import type { Rig } from './makeRig'

/** The last good answer to the rig that is open, and what is being done about the next. */
export interface Run {
  /** The last good result; null before the first. */
  result: ShallowRef<PageResult | null>
  line: ShallowRef<LineDrawing | null>
  /** What the values of the document are worth, as the host read it last; of a refused one as well. */
  inspection: ShallowRef<Inspection | null>
  /** True where the result does not belong to the document as it stands. */
  stale: Ref<boolean>
  /** What the stale result belongs to, such as `from before: Bore of shaft, section 3`. */
  staleReason: Ref<string>
  /** True where the result was computed on coarse cells, while a value follows the hand. */
  coarse: Ref<boolean>
  /** Steps done of the run under way and the seconds left, told after its first second. */
  progress: Ref<Progress | null>
  running: Ref<boolean>
  /** Why there is no new answer though nothing is refused; empty otherwise. */
  trouble: Ref<string>
  /** A run kept to be laid under later ones. */
  frozen: ShallowRef<PageResult | null>
  /** Keeps the result that is shown; once more lets it go. */
  freeze(): void
  /** Seconds that the last solve took. */
  solveTime: Ref<number>
  /** Name under which the host keeps this window's run. */
  slot: string
  stop(): void
  /** Solves the document again, as it stands. */
  again(method?: 'characteristics' | 'elements' | 'both'): void
}

const TYPING_PAUSE = 120
const STALE_AFTER = 300
const PROGRESS_AFTER = 1000
const PROGRESS_EVERY = 250

/**
 * Makes the store of the run: it solves the rig whenever its document changes, coarsely while a value is
 * dragged, one solve after another so that the answer follows the hand, and fully when it rests.
 *
 * @param bridge - the host that solves
 * @param rig - whose document is solved and whose faults are set
 * @returns the store
 */
export function makeRun(bridge: Pick<Bridge, 'solve' | 'progress' | 'stop'>, rig: Rig): Run {
  const result = shallowRef<PageResult | null>(null)
  const line = shallowRef<LineDrawing | null>(null)
  const inspection = shallowRef<Inspection | null>(null)
  const stale = ref(false)
  const staleReason = ref('')
  const coarse = ref(false)
  const progress = ref<Progress | null>(null)
  const running = ref(false)
  const trouble = ref('')
  const frozen = shallowRef<PageResult | null>(null)
  const solveTime = ref(0)
  const slot = `sheet-${Math.random().toString(36).slice(2, 12)}`

  let latest = 0
  let dragInFlight = false
  let dragWaits = false
  let pause: ReturnType<typeof setTimeout> | undefined
  let firstChange = ''

  function markStale(): void {
    if (!result.value) return
    stale.value = true
    staleReason.value = firstChange === '' ? '' : `from before: ${firstChange}`
  }

  async function solve(isCoarse: boolean, method?: 'characteristics' | 'elements' | 'both'): Promise<void> {
    const mine = ++latest
    running.value = true
    trouble.value = ''
    const watchers = watchRun(mine, isCoarse)
    let answer: SolveAnswer
    try {
      answer = await bridge.solve({
        slot,
        text: rig.text.value,
        name: rig.name.value,
        coarse: isCoarse,
        ...(method ? { method } : {}),
        ...(rig.place.value === null ? {} : { place: rig.place.value }),
      })
    } catch (error) {
      answer = { status: 'broken', message: error instanceof Error ? error.message : String(error) }
    } finally {
      watchers()
    }
    if (mine !== latest) return
    running.value = false
    progress.value = null
    take(answer, isCoarse)
  }

  function take(answer: SolveAnswer, isCoarse: boolean): void {
    if (answer.status === 'solved' || answer.status === 'refused') inspection.value = answer.inspection
    if (answer.status === 'solved') {
      line.value = answer.line
      result.value = answer.result
      solveTime.value = answer.result.run.solveTime
      coarse.value = isCoarse
      stale.value = false
      staleReason.value = ''
      firstChange = ''
      rig.faults.value = []
      return
    }
    if (answer.status === 'refused') rig.faults.value = answer.faults
    else {
      rig.faults.value = []
      trouble.value = answer.status === 'stopped' ? 'The run was stopped.' : answer.message
    }
    markStale()
  }

  /** Marks the old result while a run takes its time, and asks how far it is. */
  function watchRun(mine: number, isCoarse: boolean): () => void {
    const began = Date.now()
    const mark = setTimeout(() => mine === latest && !isCoarse && markStale(), STALE_AFTER)
    const ask = setInterval(async () => {
      if (Date.now() - began < PROGRESS_AFTER) return
      const told = await bridge.progress(slot).catch(() => null)
      if (mine !== latest || !running.value) return
      progress.value = told
    }, PROGRESS_EVERY)
    return () => {
      clearTimeout(mark)
      clearInterval(ask)
    }
  }

  /** While a value is dragged a run is let come to its end, and the newest document is taken next. */
  async function follow(): Promise<void> {
    if (dragInFlight) {
      dragWaits = true
      return
    }
    dragInFlight = true
    do {
      dragWaits = false
      await solve(true)
    } while (dragWaits && rig.dragging.value)
    dragInFlight = false
  }

  watch(rig.opened, () => {
    result.value = null
    line.value = null
    inspection.value = null
    frozen.value = null
    stale.value = false
    trouble.value = ''
    firstChange = ''
  })
  watch([rig.document, rig.dragging, rig.opened], ([document, dragging], [before, , openedBefore]) => {
    const isNew = openedBefore !== rig.opened.value
    if (!isNew && document !== before && firstChange === '') firstChange = rig.undoLabel.value
    clearTimeout(pause)
    if (dragging) {
      if (document !== before) void follow()
    } else pause = setTimeout(() => void solve(false), isNew ? 0 : TYPING_PAUSE)
  })

  return {
    result,
    line,
    inspection,
    stale,
    staleReason,
    coarse,
    progress,
    running,
    trouble,
    frozen,
    freeze: () => (frozen.value = frozen.value ? null : result.value),
    solveTime,
    slot,
    stop() {
      clearTimeout(pause)
      if (running.value) void bridge.stop(slot).catch(() => undefined)
    },
    again: (method) => void solve(false, method),
  }
}
