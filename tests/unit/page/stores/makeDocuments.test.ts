// @vitest-environment jsdom
import { effectScope, nextTick } from 'vue'
import { describe, expect, it, vi } from 'vitest'
import type { Bridge } from '../../../../src-main/contract/bridge'
import type { FileWays } from '../../../../src-renderer/stores/files/fileWays'
import { makeBrowserFiles } from '../../../../src-renderer/stores/files/makeBrowserFiles'
import { makeDocuments } from '../../../../src-renderer/stores/makeDocuments'
import { makeRig } from '../../../../src-renderer/stores/makeRig'

function start(more: Partial<FileWays> = {}) {
  const bridge = {
    readSample: async (id: string) => ({ name: `${id}.rig.json`, text: '{"title":"Sample"}', place: id }),
    files: () => null,
  } as unknown as Bridge
  const files: FileWays = {
    open: vi.fn(async () => ({ name: 'a.rig.json', text: '{"title":"A"}', place: null, target: 'a' })),
    recent: vi.fn(async () => []),
    save: vi.fn(async () => undefined),
    saveAs: vi.fn(async (name: string) => ({ name, place: null, target: 'new' })),
    readDropped: vi.fn(),
    ...more,
  }
  const rig = makeRig(bridge)
  const documents = effectScope().run(() => makeDocuments(bridge, rig, files, window))!
  return { rig, documents, files }
}

describe('documents', () => {
  it('open a file without a question where nothing would be lost, and save to where it came from', async () => {
    const { rig, documents, files } = start()
    await documents.open()
    expect([rig.document.value.title, rig.name.value]).toEqual(['A', 'a.rig.json'])
    rig.edit('title', 'B', 'Title')
    expect(await documents.save()).toBe(true)
    expect(files.save).toHaveBeenCalledWith('a', rig.text.value)
    expect(rig.saved.value).toBe(true)
  })

  it.each([
    ['stay', 'B', false],
    ['lose', 'A', false],
    ['save', 'A', true],
  ] as const)('ask before work is lost: %s', async (choice, title, saves) => {
    const { rig, documents, files } = start()
    rig.edit('title', 'B', 'Title')
    const opening = documents.open()
    await nextTick()
    expect(documents.question.value?.text).toContain('B has changes')
    documents.question.value?.answer(choice)
    await opening
    expect(documents.question.value).toBeNull()
    expect(rig.document.value.title).toBe(title)
    expect(vi.mocked(files.saveAs).mock.calls.length).toBe(saves ? 1 : 0)
  })

  it('stay where the user chose no file to save to', async () => {
    const { rig, documents } = start({ saveAs: async () => null })
    rig.edit('title', 'B', 'Title')
    const opening = documents.open()
    await nextTick()
    documents.question.value?.answer('save')
    await opening
    expect([rig.document.value.title, rig.saved.value]).toEqual(['B', false])
  })

  it('never write over a sample, and name a new file after its title', async () => {
    const { rig, documents, files } = start()
    await documents.openSample('shaft')
    await documents.save()
    expect(files.save).not.toHaveBeenCalled()
    expect(files.saveAs).toHaveBeenCalledWith('shaft.rig.json', rig.text.value)
    await documents.startNew()
    rig.edit('title', 'Über shaft & co. / 3', 'Title')
    await documents.saveAs()
    expect(vi.mocked(files.saveAs).mock.lastCall?.[0]).toBe('uber-shaft-co-3.rig.json')
  })

  it('keep the rig that is open and say why where a file is no rig', async () => {
    const open = async () => ({ name: 'broken.json', text: '{', place: null, target: null })
    const { rig, documents } = start({ open })
    const before = rig.document.value
    await documents.open()
    expect(rig.document.value).toBe(before)
    expect(documents.trouble.value).toMatch(/^broken\.json could not be opened: /)
  })

  it('say why a file was not written, and that the rig is not saved', async () => {
    const save = async () => {
      throw new Error('the disk is full')
    }
    const { rig, documents } = start({ save })
    await documents.open()
    rig.edit('title', 'B', 'Title')
    expect(await documents.save()).toBe(false)
    expect([documents.trouble.value, rig.saved.value]).toEqual(['the disk is full', false])
  })

  it('let the browser ask before the page is left with unsaved work', () => {
    const { rig } = start()
    const leave = (): boolean => {
      const event = new Event('beforeunload', { cancelable: true })
      window.dispatchEvent(event)
      return event.defaultPrevented
    }
    rig.edit('title', 'B', 'Title')
    expect(leave()).toBe(true)
    rig.undo()
  })
})

describe('files of a browser', () => {
  it('are written where the user picked, and again without asking', async () => {
    const written: string[] = []
    const handle = {
      name: 'picked.rig.json',
      getFile: async () => new File(['{"title":"P"}'], 'picked.rig.json'),
      createWritable: async () => ({
        write: async (text: string) => void written.push(text),
        close: async () => {},
      }),
    }
    const page = Object.assign(Object.create(window), {
      showOpenFilePicker: async () => [handle],
      showSaveFilePicker: async () => {
        throw new DOMException('The user aborted a request.', 'AbortError')
      },
    }) as Window
    const files = makeBrowserFiles(page)
    const opened = await files.open()
    expect(opened).toMatchObject({ name: 'picked.rig.json', text: '{"title":"P"}', place: null })
    await files.save(opened?.target, 'new text')
    expect(written).toEqual(['new text'])
    expect(await files.saveAs('x', 'y')).toBeNull()
    expect((await files.recent()).map(({ name }) => name)).toEqual(['picked.rig.json'])
  })

  it('refuse what is no text', async () => {
    const files = makeBrowserFiles(window)
    await expect(files.readDropped(new File([new Uint8Array([0xff, 0xfe, 0x00])], 'a.json'))).rejects.toThrow(
      'UTF-8',
    )
  })
})
