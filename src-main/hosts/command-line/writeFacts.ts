import { cleanLine } from '../../documents/format/cleanLine'
import type { Fact } from '../../documents/listFacts'

/**
 * Writes facts for a terminal, their values aligned.
 *
 * @param facts - name and value of each
 * @returns a line for each
 */
export function writeFacts(facts: Fact[]): string {
  const width = Math.max(...facts.map(([name]) => name.length))
  return facts.map(([name, value]) => `  ${name.padEnd(width)}  ${cleanLine(value)}\n`).join('')
}
