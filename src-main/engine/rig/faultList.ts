import type { Fault } from '../../contract/fault'
import type { FaultText } from './faultText'
import { faultText } from './faultText'
import { LIMITS } from './limits'
import type { Place } from './place'
import { formatPlace } from './place'

/** Collects the faults of one file while its parts are read in any order. */
export interface FaultList {
  /**
   * Adds one fault.
   * @param place where it is
   * @param text from the table of texts; a function where finding the words takes time
   */
  add(place: Place, text: FaultText | (() => FaultText)): void
  /** True where nothing has been added. */
  readonly empty: boolean
  /**
   * Lists the faults in the order in which their places stand in the file.
   * @param document the file as it was read
   */
  inOrder(document: unknown): Fault[]
}

/** Makes an empty list of faults. */
export function makeFaultList(): FaultList {
  const items: { place: Place; text: FaultText }[] = []
  let surplus = 0
  return {
    add(place, text) {
      if (items.length < LIMITS.faults)
        items.push({ place, text: typeof text === 'function' ? text() : text })
      else surplus++
    },
    get empty() {
      return items.length === 0
    },
    inOrder(document) {
      const positions = new Map<object, Map<string, number>>()
      const ranked = items.map((item) => ({ ...item, rank: rankOf(item.place, document, positions) }))
      ranked.sort((a, b) => compareRanks(a.rank, b.rank))
      const faults: Fault[] = ranked.map(({ place, text }) => ({ ...textOf(text), path: formatPlace(place) }))
      if (surplus > 0) faults.push({ ...textOf(faultText.moreFaults(surplus)), path: '' })
      return faults
    },
  }
}

function textOf({ code, message }: FaultText): FaultText {
  return { code, message }
}

/** Positions of the parts of a place among their neighbours; a missing key stands after those that are there. */
function rankOf(place: Place, document: unknown, positions: Map<object, Map<string, number>>): number[] {
  const rank: number[] = []
  let value: unknown = document
  for (const part of place) {
    const owner = typeof value === 'object' && value !== null ? value : {}
    if (typeof part === 'number') {
      rank.push(part)
    } else {
      let keys = positions.get(owner)
      if (!keys) positions.set(owner, (keys = new Map(Object.keys(owner).map((key, i) => [key, i]))))
      rank.push(keys.get(part) ?? keys.size)
    }
    value = Object.hasOwn(owner, part) ? (owner as Record<string | number, unknown>)[part] : undefined
  }
  return rank
}

function compareRanks(a: number[], b: number[]): number {
  for (let i = 0; i < Math.min(a.length, b.length); i++) {
    if (a[i] !== b[i]) return a[i] - b[i]
  }
  return a.length - b.length
}
