import type { EnvelopeTable } from '../../contract/result'
import { evaluatePlace, type Line } from '../line/line'
import type { ForceEnvelope } from '../records/record'

/** Makes the table of the stress envelope, `F/A` with the area of each face, both faces of every step kept. */
export function tabulateEnvelope(line: Line, envelope: ForceEnvelope): EnvelopeTable {
  const table: EnvelopeTable = { x: [], tension: [], tensionTime: [], compression: [], compressionTime: [] }
  line.spans.forEach((span, index) => {
    for (let p = 0; p <= span.cells; p++) {
      const i = envelope.start[index] + p
      table.x.push(evaluatePlace(span, p))
      table.tension.push(envelope.tension[i] / span.area[p])
      table.tensionTime.push(envelope.tensionStep[i] * line.dt)
      table.compression.push(envelope.compression[i] / span.area[p])
      table.compressionTime.push(envelope.compressionStep[i] * line.dt)
    }
  })
  return table
}
