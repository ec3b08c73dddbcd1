import { describe, expect, it } from 'vitest'
import { readRig } from '../../../../src-main/engine/rig/readRig'
import { makeRig } from '../../../../src-renderer/stores/makeRig'

const bridge = {
  readSample: async (id: string) => ({
    name: `${id}.rig.json`,
    text: '{"title":"A"}',
    place: `samples/${id}`,
  }),
}

describe('the rig that is open', () => {
  it('begins with a rig that the reader takes', () => {
    expect(readRig(makeRig(bridge).text.value).faults).toEqual([])
  })

  it('gives the host the file as it came until it is edited, and again after undo', () => {
    const rig = makeRig(bridge)
    const text = '{ "title":"As typed",\n  "run": {"duration":"1 ms"} }'
    rig.open(text, 'mine.rig.json', 'here')
    expect([rig.text.value, rig.name.value, rig.place.value, rig.saved.value]).toEqual([
      text,
      'mine.rig.json',
      'here',
      true,
    ])
    rig.edit('run.duration', '2 ms', 'Duration')
    expect(JSON.parse(rig.text.value)).toEqual({ title: 'As typed', run: { duration: '2 ms' } })
    expect(rig.saved.value).toBe(false)
    rig.undo()
    expect([rig.text.value, rig.saved.value]).toEqual([text, true])
  })

  it('undoes and redoes with labels, and forgets what an edit overtakes', () => {
    const rig = makeRig(bridge)
    rig.open('{}', 'a')
    rig.edit('title', 'One', 'Title')
    rig.seal()
    rig.edit('title', 'Two', 'Title again')
    expect([rig.canUndo.value, rig.undoLabel.value, rig.canRedo.value]).toEqual([true, 'Title again', false])
    rig.undo()
    expect([rig.document.value.title, rig.undoLabel.value, rig.redoLabel.value]).toEqual([
      'One',
      'Title',
      'Title again',
    ])
    rig.redo()
    expect(rig.document.value.title).toBe('Two')
    rig.undo()
    rig.edit('notes', 'n', 'Notes')
    expect([rig.canRedo.value, rig.document.value]).toEqual([false, { title: 'One', notes: 'n' }])
  })

  it('takes a run of edits of one value for one step, until it is sealed or saved', () => {
    const rig = makeRig(bridge)
    rig.open('{"title":"A"}', 'a')
    for (const title of ['B', 'BC', 'BCD']) rig.edit('title', title, 'Title')
    rig.undo()
    expect(rig.document.value.title).toBe('A')
    rig.redo()
    rig.markSaved('a.rig.json', 'there')
    rig.edit('title', 'E', 'Title')
    expect(rig.saved.value).toBe(false)
    rig.undo()
    expect([rig.document.value.title, rig.saved.value]).toEqual(['BCD', true])
  })

  it('opens samples with their place and refuses what is no rig at all', async () => {
    const rig = makeRig(bridge)
    await rig.openSample('pins')
    expect([rig.name.value, rig.place.value]).toEqual(['pins.rig.json', 'samples/pins'])
    expect(() => rig.open('[1]', 'list.json')).toThrow('one object')
    expect(() => rig.open('{', 'cut.json')).toThrow(SyntaxError)
    expect(rig.name.value).toBe('pins.rig.json')
  })
})
