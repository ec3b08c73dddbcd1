import { computed, type ComputedRef, type Ref } from 'vue'
import type { Palette } from '../../plot/usePalette'
import { useLayout } from '../../stores/useLayout'
import { useRun } from '../../stores/useRun'
import { useView } from '../../stores/useView'
import { describeGoverning } from './describeGoverning'
import type { FieldModel } from './draw/fieldModel'
import { listSignMarks } from './draw/listSignMarks'
import { listKey } from './listKey'
import { QUANTITIES } from './quantities'
import { useContacts } from './useContacts'
import { useFieldPicture } from './useFieldPicture'
import { useRulers } from './useRulers'

/** Distance of the signs of tension and compression in the field, in sizes of type. */
const SIGN_DISTANCE = 2.5

/**
 * Gathers all that the field shows over its picture.
 *
 * @param palette - colours of the moment
 */
export function useFieldModel(palette: Ref<Palette>): ComputedRef<FieldModel> {
  const [layout, run, view] = [useLayout(), useRun(), useView()]
  const { picture, limit } = useFieldPicture()
  const { x, t } = useRulers()
  const contacts = useContacts()

  /** Signs belong to the picture: while it is stretched they are left out. */
  const signs = computed(() => {
    const shown = picture.value
    if (!shown || !QUANTITIES[shown.request.quantity].signs) return []
    const { fromX, toX, fromT, toT } = shown.request
    const isInPlace =
      fromX === view.fromX.value &&
      toX === view.toX.value &&
      fromT === view.fromT.value &&
      toT === view.toT.value
    if (!isInPlace) return []
    return listSignMarks(
      shown,
      limit.value,
      Math.round(layout.fieldWidth / (SIGN_DISTANCE * layout.type.axis)),
      Math.round(layout.field.height / (SIGN_DISTANCE * layout.type.axis)),
    )
  })

  return computed(() => {
    const result = run.result.value
    return {
      palette: palette.value,
      stale: run.stale.value,
      axisSize: layout.type.axis,
      bodySize: layout.type.body,
      xTicks: x.value.ticks,
      tTicks: t.value.ticks,
      xUnit: x.value.size,
      tUnit: t.value.size,
      line: run.line.value,
      fronts: result?.wavefronts ?? [],
      contacts: contacts.value,
      spalls: result?.spalls ?? [],
      signs: signs.value,
      governing: result && describeGoverning(result, view.units.value),
      key: result ? listKey(result, view.quantity.value, contacts.value) : [],
    }
  })
}
