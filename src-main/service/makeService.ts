import type { Bridge, Profile } from '../contract/bridge'
import { NOTICE } from '../contract/notice'
import { SOFTWARE } from '../contract/software'
import { makeSlots } from './makeSlots'
import { findSampleFile, listSamples, readSample } from './samples'

export interface ServiceOptions {
  /** Absolute path of the samples that come with the program. */
  samplesFolder: string
  /** Finds the rig file of a place that the host gave out; null where it gave out no such place. */
  findFile?: (place: string) => string | null
}

/** What stands behind the bridge of every host; rig files on the disk are each host's own. */
export interface Service extends Omit<Bridge, 'files'> {
  /** Ends what is under way. */
  close(): Promise<void>
}

/**
 * Makes the service: rigs are read, solved and kept in worker threads.
 *
 * @param options - where the host keeps what belongs to it
 */
export function makeService({ samplesFolder, findFile = () => null }: ServiceOptions): Service {
  const slots = makeSlots()
  return {
    about: async () => ({ ...SOFTWARE, notice: NOTICE }),
    listSamples: () => listSamples(samplesFolder),
    readSample: (id) => readSample(samplesFolder, id),
    solve({ slot, text, coarse, method, place }) {
      const rigPath = place === undefined ? null : (findSampleFile(samplesFolder, place) ?? findFile(place))
      return slots.solve(slot, { text, coarse, method, rigPath })
    },
    progress: async (slot) => slots.progress(slot),
    stop: (slot) => slots.stop(slot),
    readField: ({ slot, ...window }) => slots.ask(slot, { kind: 'field', window }) as Promise<Float32Array>,
    readProfile: ({ slot, ...wanted }) => slots.ask(slot, { kind: 'profile', ...wanted }) as Promise<Profile>,
    report: (slot) => slots.ask(slot, { kind: 'report' }) as Promise<string>,
    close: () => slots.close(),
  }
}
