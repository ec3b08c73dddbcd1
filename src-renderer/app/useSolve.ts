import { ref, shallowRef, type Ref, type ShallowRef } from 'vue'
import type { Bridge, SolveAnswer } from '../../src-main/contract/bridge'

/** Keeps a byte-order mark, so that the host sees the file as it is. */
const UTF8 = new TextDecoder('utf-8', { ignoreBOM: true })

export interface Solve {
  /** Name of the rig file that was opened last; empty before. */
  fileName: Ref<string>
  /** The last answer; null before, and while the host has none. */
  answer: ShallowRef<SolveAnswer | null>
  /** Why there is no answer, in words; empty where there is one. */
  trouble: Ref<string>
  busy: Ref<boolean>
  open(file: File): Promise<void>
}

/**
 * Keeps the rig file that is open and what its host answered to it; an answer that a later file has
 * overtaken is dropped.
 *
 * @param bridge - the page's host
 * @returns what the sheet shows, and the way to open a file
 */
export function useSolve(bridge: Bridge): Solve {
  const fileName = ref('')
  const answer = shallowRef<SolveAnswer | null>(null)
  const trouble = ref('')
  const busy = ref(false)
  let latest = 0

  async function open(file: File): Promise<void> {
    const mine = ++latest
    fileName.value = file.name
    answer.value = null
    trouble.value = ''
    busy.value = true
    try {
      const given = await bridge.solve(UTF8.decode(await file.arrayBuffer()))
      if (mine === latest) answer.value = given
    } catch (error) {
      if (mine === latest) trouble.value = error instanceof Error ? error.message : String(error)
    } finally {
      if (mine === latest) busy.value = false
    }
  }

  return { fileName, answer, trouble, busy, open }
}
