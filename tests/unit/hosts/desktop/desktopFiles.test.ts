import { mkdirSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import type { BrowserWindow } from 'electron'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import type { SheetState } from '../../../../src-main/contract/bridge'
import { guardClose } from '../../../../src-main/hosts/desktop/files/guardClose'
import {
  type DesktopFiles,
  makeDesktopFiles,
} from '../../../../src-main/hosts/desktop/files/makeDesktopFiles'
import { makePlaces } from '../../../../src-main/hosts/desktop/files/makePlaces'
import { makeRecentFiles } from '../../../../src-main/hosts/desktop/files/makeRecentFiles'
import type { ElectronRecorder, RecordedWindow } from './electronRecorder'

vi.mock('electron', async () => (await import('./electronRecorder')).makeElectronRecorder())

const { dialog, BrowserWindow: Window } = (await import('electron')) as unknown as ElectronRecorder
const makeWindow = () => new (Window as new (options: object) => RecordedWindow)({})

let folder: string
let files: DesktopFiles
let window: RecordedWindow
const places = makePlaces()

beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'barwright-files-'))
  window = makeWindow()
  files = makeDesktopFiles(
    window as unknown as BrowserWindow,
    places,
    makeRecentFiles(join(folder, 'recent.json')),
  )
  guardClose(window as unknown as BrowserWindow, files)
})
afterEach(() => {
  vi.clearAllMocks()
  rmSync(folder, { recursive: true })
})

const choose = (path: string) =>
  dialog.showOpenDialog.mockResolvedValueOnce({ canceled: false, filePaths: [path] })
const chooseNew = (path: string) =>
  dialog.showSaveDialog.mockResolvedValueOnce({ canceled: false, filePath: path })

describe('the files of a desktop window', () => {
  it('are opened where the user chose one, byte-order mark and all', async () => {
    expect(await files.open()).toBeNull()
    const path = join(folder, 'a.rig.json')
    writeFileSync(path, '\ufeff{"title":"ä"}')
    choose(path)
    const opened = await files.open()
    expect(opened).toMatchObject({ name: 'a.rig.json', text: '\ufeff{"title":"ä"}' })
    expect(opened?.place).not.toContain(folder)
    expect(places.find(opened!.place)).toBe(path)
  })

  it('are refused in words where they cannot be read', async () => {
    choose(join(folder, 'gone.rig.json'))
    await expect(files.open()).rejects.toThrow('gone.rig.json cannot be read: there is no such file')
    const path = join(folder, 'bytes.json')
    writeFileSync(path, Uint8Array.of(0xff, 0xfe, 0x80))
    choose(path)
    await expect(files.open()).rejects.toThrow('not UTF-8')
  })

  it('are saved to where they were opened from, and nowhere that was not chosen', async () => {
    const path = join(folder, 'a.rig.json')
    writeFileSync(path, 'old')
    choose(path)
    const { place } = (await files.open())!
    await files.save(place, 'new')
    expect(readFileSync(path, 'utf8')).toBe('new')
    await expect(files.save(path, 'x')).rejects.toThrow('not chosen')
    await expect(files.save('file:made-up', 'x')).rejects.toThrow('not chosen')
    await expect(files.openRecent(join(folder, 'recent.json'))).rejects.toThrow('not chosen')
  })

  it('are saved as what the user chose, with the name alone offered', async () => {
    expect(await files.saveAs('a.rig.json', '{}')).toBeNull()
    const path = join(folder, 'b.rig.json')
    chooseNew(path)
    const saved = await files.saveAs('../../etc/a.rig.json', '{}')
    expect(dialog.showSaveDialog.mock.lastCall?.[1]).toMatchObject({ defaultPath: 'a.rig.json' })
    expect(saved).toEqual({ name: 'b.rig.json', place: expect.any(String) as string })
    expect(readFileSync(path, 'utf8')).toBe('{}')
  })

  it('say why they cannot be written', async () => {
    mkdirSync(join(folder, 'taken'))
    chooseNew(join(folder, 'taken'))
    await expect(files.saveAs('a', '{}')).rejects.toThrow(/taken cannot be written: (it is a folder|access)/)
    chooseNew(join(folder, 'no/such/a.json'))
    await expect(files.saveAs('a', '{}')).rejects.toThrow('there is no such file or folder')
  })

  it('are remembered over starts, the latest first and each once', async () => {
    for (const name of ['a', 'b', 'a']) {
      chooseNew(join(folder, name))
      await files.saveAs(name, `text of ${name}`)
    }
    const again = makeDesktopFiles(
      window as unknown as BrowserWindow,
      makePlaces(),
      makeRecentFiles(join(folder, 'recent.json')),
    )
    const recent = await again.recent()
    expect(recent.map(({ name, folder }) => [name, folder])).toEqual([
      ['a', folder],
      ['b', folder],
    ])
    expect(await again.openRecent(recent[1].place)).toMatchObject({ text: 'text of b' })
  })

  it('do without a list that is damaged', async () => {
    writeFileSync(join(folder, 'recent.json'), '{"not": a list')
    expect(await files.recent()).toEqual([])
    writeFileSync(join(folder, 'recent.json'), '[7, null, "/x/y.json"]')
    expect((await files.recent()).map(({ name }) => name)).toEqual(['y.json'])
  })
})

describe('closing a window', () => {
  const state: SheetState = { name: 'a.rig.json', text: 'work', place: null, unsaved: true }
  const close = async () => {
    const event = { preventDefault: vi.fn() }
    window.emit('close', event)
    await new Promise((resolve) => setTimeout(resolve, 50))
    return event.preventDefault.mock.calls.length > 0
  }
  const answer = (response: number) => dialog.showMessageBox.mockResolvedValueOnce({ response })

  it('asks nothing where nothing is unsaved', async () => {
    expect(await close()).toBe(false)
    await files.noteSheet({ ...state, unsaved: false })
    expect(await close()).toBe(false)
    expect(dialog.showMessageBox).not.toHaveBeenCalled()
  })

  it('asks over unsaved work, and stays where the user wants to', async () => {
    await files.noteSheet(state)
    answer(2)
    expect(await close()).toBe(true)
    expect(dialog.showMessageBox.mock.lastCall?.[1]).toMatchObject({
      message: 'Save the changes to a.rig.json?',
      cancelId: 2,
    })
    expect(window.destroy).not.toHaveBeenCalled()
  })

  it('asks once, however often it is told to close', async () => {
    await files.noteSheet(state)
    dialog.showMessageBox.mockReturnValueOnce(new Promise(() => {}))
    await close()
    await close()
    expect(dialog.showMessageBox).toHaveBeenCalledOnce()
  })

  it('gives the work up where the user does', async () => {
    await files.noteSheet(state)
    answer(1)
    await close()
    expect(window.destroy).toHaveBeenCalledOnce()
  })

  it('saves where the rig lies, or asks where to, before it closes', async () => {
    const path = join(folder, 'a.rig.json')
    chooseNew(path)
    const { place } = (await files.saveAs('a.rig.json', 'old'))!
    await files.noteSheet({ ...state, place })
    answer(0)
    await close()
    expect(readFileSync(path, 'utf8')).toBe('work')
    expect(window.destroy).toHaveBeenCalledOnce()

    await files.noteSheet({ ...state, place: 'sample:drop-hammer-shaft', text: 'of a sample' })
    chooseNew(join(folder, 'b.rig.json'))
    answer(0)
    await close()
    expect(readFileSync(join(folder, 'b.rig.json'), 'utf8')).toBe('of a sample')
  })

  it('stays, and says why, where the rig cannot be saved or no place is chosen', async () => {
    await files.noteSheet(state)
    answer(0)
    await close()
    chooseNew(join(folder, 'no/such/a.json'))
    answer(0)
    await close()
    expect(window.destroy).not.toHaveBeenCalled()
    expect(dialog.showErrorBox).toHaveBeenCalledOnce()
  })
})
