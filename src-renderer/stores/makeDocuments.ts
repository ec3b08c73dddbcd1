import { ref, shallowRef, watch, type Ref, type ShallowRef } from 'vue'
import type { Bridge } from '../../src-main/contract/bridge'
import type { FileWays, OpenedFile, RecentFile } from './files/fileWays'
import type { Rig } from './makeRig'

/** What the user is asked before work is lost. */
export interface Question {
  text: string
  answer(choice: 'save' | 'lose' | 'stay'): void
}

/** What happens to files. */
export interface Documents {
  /** Asked now; null where nothing is asked. */
  question: ShallowRef<Question | null>
  /** Why the last one failed, in words; empty otherwise. */
  trouble: Ref<string>
  startNew(): Promise<void>
  open(): Promise<void>
  openSample(id: string): Promise<void>
  openDropped(file: File): Promise<void>
  recent(): Promise<RecentFile[]>
  openRecent(file: RecentFile): Promise<void>
  /** True where it was written. */
  save(): Promise<boolean>
  saveAs(): Promise<boolean>
}

const NOTE_PAUSE = 300

/**
 * Makes the store of documents: nothing unsaved is left without a question.
 *
 * @param bridge - for samples, and for a host that guards its window
 * @param rig - what is opened into and saved from
 * @param files - how files are opened and written
 * @param page - the page's window, which is guarded where no host does it
 * @returns the store
 */
export function makeDocuments(bridge: Bridge, rig: Rig, files: FileWays, page: Window): Documents {
  const question = shallowRef<Question | null>(null)
  const trouble = ref('')
  let target: unknown = null
  watch(rig.opened, () => (target = null), { flush: 'sync' })

  const titleOf = (): string => rig.document.value.title || rig.name.value || 'This rig'

  /** Runs what would lose work only after the user has said so. */
  async function guard(action: () => Promise<void> | void): Promise<void> {
    if (!rig.saved.value) {
      const choice = await new Promise<'save' | 'lose' | 'stay'>((answer) => {
        question.value = { text: `${titleOf()} has changes that are not saved.`, answer }
      })
      question.value = null
      if (choice === 'stay' || (choice === 'save' && !(await save()))) return
    }
    await attempt(action)
  }

  async function attempt<T>(action: () => Promise<T> | T): Promise<T | undefined> {
    trouble.value = ''
    try {
      return await action()
    } catch (error) {
      trouble.value = error instanceof Error ? error.message : String(error)
      return undefined
    }
  }

  function take(file: OpenedFile): void {
    try {
      rig.open(file.text, file.name, file.place)
    } catch (error) {
      throw new Error(`${file.name} could not be opened: ${error instanceof Error ? error.message : error}`, {
        cause: error,
      })
    }
    target = file.target
  }

  async function save(): Promise<boolean> {
    if (target === null) return saveAs()
    const { value: text } = rig.text
    const done = await attempt(async () => {
      await files.save(target, text)
      return true
    })
    if (done) rig.markSaved(rig.name.value, rig.place.value)
    return done ?? false
  }

  async function saveAs(): Promise<boolean> {
    const saved = await attempt(() => files.saveAs(rig.name.value || nameFile(titleOf()), rig.text.value))
    if (!saved) return false
    target = saved.target
    rig.markSaved(saved.name, saved.place)
    return true
  }

  guardPage(bridge, rig, page)
  return {
    question,
    trouble,
    startNew: () => guard(() => rig.startNew()),
    open: () =>
      guard(async () => {
        const file = await files.open()
        if (file) take(file)
      }),
    openSample: (id) => guard(() => rig.openSample(id)),
    openDropped: (file) => guard(async () => take(await files.readDropped(file))),
    recent: async () => (await attempt(() => files.recent())) ?? [],
    openRecent: (file) => guard(async () => take(await file.open())),
    save,
    saveAs,
  }
}

/** A host is told of each change and asks before its window closes; a browser asks in its own words. */
function guardPage(bridge: Bridge, rig: Rig, page: Window): void {
  const host = bridge.files?.()
  if (!host) {
    page.addEventListener('beforeunload', (event) => {
      if (!rig.saved.value) event.preventDefault()
    })
    return
  }
  let pause: ReturnType<typeof setTimeout> | undefined
  watch([rig.text, rig.saved, rig.name, rig.place], () => {
    clearTimeout(pause)
    pause = setTimeout(() => {
      const state = {
        name: rig.name.value || nameFile(rig.document.value.title ?? ''),
        text: rig.text.value,
        place: rig.place.value,
        unsaved: !rig.saved.value,
      }
      // A host that cannot be told shows it at the next solve.
      void host.noteSheet(state).catch(() => undefined)
    }, NOTE_PAUSE)
  })
}

/** A name for a rig's file, made of its title. */
function nameFile(title: string): string {
  const plain = title
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, '-')
    .replace(/^-+|-+$/g, '')
    .slice(0, 60)
  return `${plain || 'rig'}.rig.json`
}
