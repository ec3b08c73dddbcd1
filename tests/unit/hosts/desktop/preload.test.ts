import { expect, it, vi } from 'vitest'

const exposed = vi.hoisted(() => ({
  names: [] as string[],
  values: [] as unknown[],
  sent: [] as unknown[][],
}))

vi.mock('electron', () => ({
  contextBridge: {
    exposeInMainWorld: (name: string, value: unknown) => {
      exposed.names.push(name)
      exposed.values.push(value)
    },
  },
  ipcRenderer: { invoke: async (...sent: unknown[]) => void exposed.sent.push(sent) },
}))

it('the preload script hands the page one function that uses one channel', async () => {
  await import('../../../../src-main/hosts/desktop/preload/preload')
  expect(exposed.names).toEqual(['barwright'])
  const way = exposed.values[0] as { call: (...given: unknown[]) => Promise<unknown> }
  expect(Object.keys(way)).toEqual(['call'])
  await way.call('about', [], 'more')
  expect(exposed.sent).toEqual([['bridge', { method: 'about', args: [] }]])
})
