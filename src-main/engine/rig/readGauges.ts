import type { z } from 'zod'
import type { Bridge, Gauge } from '../../contract/rig'
import { faultText } from './faultText'
import type { Loose } from './form/loose'
import type { gaugeForm } from './form/rigForm'
import type { BarReading } from './geometry/readBars'
import type { Place } from './place'
import { readBarPoint } from './readBarPoint'
import { readOptionalQuantity, readQuantity } from './readQuantity'
import type { Reading } from './reading'

type GaugeForm = Loose<z.infer<typeof gaugeForm>>

/**
 * Reads the gauges.
 * @param reading gets `unknown-bar`, `out-of-range` and the faults of quantities
 * @param forms undefined where there are none
 * @param bars of the rig
 * @returns those that are right
 */
export function readGauges(
  reading: Reading,
  forms: (GaugeForm | undefined)[] | undefined,
  bars: BarReading[],
): Gauge[] {
  return (forms ?? []).flatMap((form, i) => {
    if (!form) return []
    const place: Place = ['gauges', i]
    const point = readBarPoint(reading, place, form, bars)
    const bridge = form.bridge ? readBridge(reading, [...place, 'bridge'], form.bridge) : null
    return point === null || form.name === undefined ? [] : [{ name: form.name, ...point, bridge }]
  })
}

function readBridge(reading: Reading, place: Place, form: NonNullable<GaugeForm['bridge']>): Bridge | null {
  const factor = readQuantity(reading, [...place, 'factor'], form.factor, 'number')
  if (factor === 0) reading.faults.add([...place, 'factor'], faultText.outside('0', 'other than zero'))
  const excitation = readQuantity(reading, [...place, 'excitation'], form.excitation, 'voltage', 'positive')
  const gain = readOptionalQuantity(reading, [...place, 'gain'], form.gain, 'number', 'any', 1)
  if (gain === 0) reading.faults.add([...place, 'gain'], faultText.outside('0', 'other than zero'))
  const poisson = readOptionalQuantity(
    reading,
    [...place, 'poisson'],
    form.poisson,
    'number',
    'not-negative',
    null,
  )
  if (factor === null || excitation === null || gain === null) return null
  return { factor, arms: form.arms ?? 1, excitation, gain, poisson }
}
