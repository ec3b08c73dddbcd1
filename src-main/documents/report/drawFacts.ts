import { markup, type Markup } from '../markup'

/**
 * Draws a short list of facts, each with its value.
 *
 * @param facts - name and value of each, as text for people
 * @returns a `dl` element
 */
export function drawFacts(facts: [string, string][]): Markup {
  return markup`<dl>${facts.map(([name, value]) => markup`<dt>${name}</dt><dd>${value}</dd>`)}</dl>`
}
