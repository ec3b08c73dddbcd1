import { readFile } from 'node:fs/promises'
import { join } from 'node:path'
import type { RigText, Sample } from '../contract/bridge'
import { Refusal } from './refusal'

/** Rows of the table in the samples' README: the folder, linked, and the question that it answers. */
const TABLE_ROW = /^\| \[([a-z0-9-]+)\]\(\1\/README\.md\) *\| (.+?) *\|/gm
const SAMPLE_ID = /^[a-z0-9-]{1,100}$/
const PLACE = /^sample:([a-z0-9-]{1,100})$/

/**
 * Tells where the samples lie: beside the folder of the built parts, in the package as in the project.
 *
 * @param bundleFolder - absolute path of the built page
 */
export function findSamplesFolder(bundleFolder: string): string {
  return join(bundleFolder, '../../samples')
}

/**
 * Lists the rigs that come with the program, in the order of the table in their README.
 *
 * @param folder - absolute path of the samples
 */
export async function listSamples(folder: string): Promise<Sample[]> {
  const table = await readFile(join(folder, 'README.md'), 'utf8')
  const rows = [...table.matchAll(TABLE_ROW)]
  return Promise.all(
    rows.map(async ([, id, about]) => {
      const { text } = await readSample(folder, id)
      const { title } = JSON.parse(text) as { title?: string }
      return { id, title: title ?? id, about }
    }),
  )
}

/**
 * Reads a rig that comes with the program.
 *
 * @param folder - absolute path of the samples
 * @param id - the name of its folder there; rejects where there is none
 */
export async function readSample(folder: string, id: string): Promise<RigText> {
  const name = `${id}.rig.json`
  if (!SAMPLE_ID.test(id)) throw new Refusal('This is no name of a sample.')
  try {
    return { name, text: await readFile(join(folder, id, name), 'utf8'), place: `sample:${id}` }
  } catch {
    throw new Refusal(`There is no sample "${id}".`)
  }
}

/**
 * Finds the file of a sample by its place.
 *
 * @param folder - absolute path of the samples
 * @param place - as {@link readSample} gave it
 * @returns absolute path of the rig file; null where the place is of another kind
 */
export function findSampleFile(folder: string, place: string): string | null {
  const id = PLACE.exec(place)?.[1]
  return id === undefined ? null : join(folder, id, `${id}.rig.json`)
}
