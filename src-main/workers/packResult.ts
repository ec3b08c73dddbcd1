import type { PageResult } from '../contract/bridge'
import type { Result } from '../contract/result'

/**
 * Makes the result that the page is given: its long lists as arrays, its field left out.
 *
 * @param result - as the engine and the host have completed it
 * @returns a result of its own, whose arrays may be handed over; and their buffers
 */
export function packResult(result: Result): { result: PageResult; buffers: ArrayBuffer[] } {
  const buffers: ArrayBuffer[] = []
  const pack = <T extends object>(table: T): PackedLists<T> =>
    Object.fromEntries(
      Object.entries(table).map(([key, value]) => [key, isNumbers(value) ? packList(value) : value]),
    ) as PackedLists<T>
  const packList = (list: number[]): Float64Array => {
    const packed = Float64Array.from(list)
    buffers.push(packed.buffer as ArrayBuffer)
    return packed
  }
  return {
    result: {
      ...result,
      gauges: result.gauges.map((gauge) => ({ ...pack(gauge), pulses: gauge.pulses })),
      envelope: pack(result.envelope),
      energy: pack(result.energy),
      field: { x: [], t: [], stress: [] },
    },
    buffers,
  }
}

type PackedLists<T> = { [K in keyof T]: T[K] extends number[] ? Float64Array : T[K] }

/** An empty list may be of numbers too: a gauge without a bridge has none of volts. */
function isNumbers(value: unknown): value is number[] {
  return Array.isArray(value) && (value.length === 0 || typeof value[0] === 'number')
}
