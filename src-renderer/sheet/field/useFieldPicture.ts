import { computed, ref, shallowRef, watch, type ComputedRef, type Ref, type ShallowRef } from 'vue'
import type { FieldRequest, PageResult, Quantity } from '../../../src-main/contract/bridge'
import { roundUpLimit } from '../../plot/listTicks'
import { findExtremes, type FieldGrid } from '../../plot/paintField'
import { UNITS } from '../../format/units'
import { useBridge } from '../../stores/useBridge'
import { useLayout } from '../../stores/useLayout'
import { useRun } from '../../stores/useRun'
import { useView } from '../../stores/useView'
import { makeLatest } from './makeLatest'
import { QUANTITIES } from './quantities'
import { shareByRun } from './shareByRun'
import { useScreenRatio } from './useScreenRatio'

/** A part of the field as the host has it, and what it belongs to. */
export interface FieldPicture extends FieldGrid {
  request: FieldRequest
  result: PageResult
}

/** Most pixels asked for at once: more would keep the page from answering while it paints. */
const MOST_PIXELS = 2e6

/** The whole run in few cells: their extremes are those of the run. */
const OVERVIEW = { columns: 48, rows: 48 }

/** Largest magnitude of a quantity in a run. */
interface Largest {
  result: PageResult
  quantity: Quantity
  magnitude: number
}

interface Fetched {
  picture: FieldPicture
  most: Largest
}

/** What the field shows. */
export interface FieldPictures {
  /** The last picture that the host gave; null without a result. */
  picture: ShallowRef<FieldPicture | null>
  /** Value of the last colour [SI], the same for field and strip. */
  limit: ComputedRef<number>
  /** Why there is no newer picture; empty otherwise. */
  trouble: Ref<string>
}

/**
 * Hands out the picture of what is looked at: asked for anew when the view, its size, the quantity or the
 * run changes, at the screen's resolution; at half of it while a value follows the hand.
 */
export const useFieldPicture: () => FieldPictures = shareByRun(() => {
  const bridge = useBridge()
  const run = useRun()
  const view = useView()
  const layout = useLayout()
  const ratio = useScreenRatio()
  const picture = shallowRef<FieldPicture | null>(null)
  const trouble = ref('')
  /** Largest magnitude in the run of the quantity that the picture shows. */
  const largest = shallowRef<Largest | null>(null)

  async function fetch({ request, result }: { request: FieldRequest; result: PageResult }): Promise<Fetched> {
    const { quantity } = request
    const last = largest.value
    const known = last?.result === result && last.quantity === quantity ? last : null
    const [values, overview] = await Promise.all([
      bridge.readField(request),
      known || isWhole(request) ? null : readOverview(request),
    ])
    const grid = { columns: request.columns, rows: request.rows, values }
    const most = known ?? { result, quantity, magnitude: findMagnitude(overview ?? grid) }
    return { picture: { ...grid, request, result }, most }
  }

  async function readOverview(request: FieldRequest): Promise<FieldGrid> {
    const all = { fromX: 0, toX: view.lengthX.value, fromT: 0, toT: view.lengthT.value }
    return { ...OVERVIEW, values: await bridge.readField({ ...request, ...all, ...OVERVIEW }) }
  }

  const isWhole = ({ fromX, toX, fromT, toT }: FieldRequest): boolean =>
    fromX <= 0 && fromT <= 0 && toX >= view.lengthX.value && toT >= view.lengthT.value

  const latest = makeLatest(
    fetch,
    (answer) => {
      trouble.value = ''
      if (answer.picture.result !== run.result.value) return
      picture.value = answer.picture
      largest.value = answer.most
    },
    (reason) => (trouble.value = reason instanceof Error ? reason.message : String(reason)),
  )

  watch(
    [
      run.result,
      view.quantity,
      view.fromX,
      view.toX,
      view.fromT,
      view.toT,
      () => layout.fieldWidth,
      () => layout.field.height,
      ratio,
    ],
    () => {
      const result = run.result.value
      if (!result) {
        latest.drop()
        picture.value = null
        return
      }
      const density = ratio.value * (run.coarse.value ? 0.5 : 1)
      const pixels = layout.fieldWidth * layout.field.height * density ** 2
      const sharp = density * Math.min(1, Math.sqrt(MOST_PIXELS / pixels))
      latest.ask({
        result,
        request: {
          slot: run.slot,
          quantity: view.quantity.value,
          fromX: view.fromX.value,
          toX: view.toX.value,
          fromT: view.fromT.value,
          toT: view.toT.value,
          columns: Math.max(1, Math.round(layout.fieldWidth * sharp)),
          rows: Math.max(1, Math.round(layout.field.height * sharp)),
        },
      })
    },
    { immediate: true },
  )

  const limit = computed(() => {
    if (!largest.value) return 1
    const { size } = UNITS[QUANTITIES[largest.value.quantity].dimension][view.units.value]
    return roundUpLimit(largest.value.magnitude / size) * size
  })
  return { picture, limit, trouble }
})

function findMagnitude(grid: FieldGrid): number {
  const { low, high } = findExtremes(grid)
  return Math.max(-low, high)
}
