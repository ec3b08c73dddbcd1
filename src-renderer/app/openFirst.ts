import type { Stores } from '../stores/makeStores'

/** What is seen first: a stepped shaft with margins, solved. */
const FIRST_SAMPLE = 'drop-hammer-shaft'

/**
 * Opens what the window begins with: a sample, or a new rig where the host has none.
 *
 * @param stores - of the window; rejects where its host cannot be reached
 */
export async function openFirst({ bridge, rig }: Pick<Stores, 'bridge' | 'rig'>): Promise<void> {
  const samples = await bridge.listSamples()
  const first = samples.find(({ id }) => id === FIRST_SAMPLE) ?? samples[0]
  if (first) await rig.openSample(first.id)
  else rig.startNew()
}
