import type { DocumentFiles } from '../../../src-main/contract/bridge'
import type { FileWays, OpenedFile } from './fileWays'
import { readFileText } from './readFileText'

/**
 * Makes the ways of a host that opens and writes files itself.
 *
 * @param files - the host's
 * @returns the ways; a file's place is where Save writes to
 */
export function makeHostFiles(files: DocumentFiles): FileWays {
  const opened = (file: { name: string; text: string; place: string }): OpenedFile => ({
    ...file,
    target: file.place,
  })
  return {
    async open() {
      const file = await files.open()
      return file && opened(file)
    },
    async recent() {
      const rigs = await files.recent()
      return rigs.map(({ name, folder, place }) => ({
        name,
        folder,
        open: async () => opened(await files.openRecent(place)),
      }))
    },
    save: (target, text) => files.save(target as string, text),
    async saveAs(name, text) {
      const saved = await files.saveAs(name, text)
      return saved && { ...saved, target: saved.place }
    },
    readDropped: async (file) => ({
      name: file.name,
      text: await readFileText(file),
      place: null,
      target: null,
    }),
  }
}
