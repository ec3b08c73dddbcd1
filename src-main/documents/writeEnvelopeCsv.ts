import type { EnvelopeTable } from '../contract/result'
import { writeCsv } from './writeCsv'

/**
 * Writes the envelope as CSV; where both faces of a step are kept, x repeats.
 *
 * @param envelope - largest stresses along the line, SI
 * @returns the text of `envelope.csv` in parts
 */
export function writeEnvelopeCsv(envelope: EnvelopeTable): Generator<string> {
  return writeCsv(
    ['x [m]', 'tension [Pa]', 'tension time [s]', 'compression [Pa]', 'compression time [s]'],
    envelope.x.length,
    (i) => [
      envelope.x[i],
      envelope.tension[i],
      envelope.tensionTime[i],
      envelope.compression[i],
      envelope.compressionTime[i],
    ],
  )
}
