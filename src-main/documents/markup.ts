/** Text that is markup already; anything else is escaped when it is put into a page. */
export class Markup {
  constructor(readonly text: string) {}
}

type Part = Markup | string | number | Part[]

/**
 * Builds markup from a template; every value that is not markup itself is escaped, so no text of a rig
 * can become an element, an attribute or a script.
 *
 * @param parts - the template's own text, trusted
 * @param values - markup, texts and numbers, and lists of them
 * @returns markup
 */
export function markup(parts: TemplateStringsArray, ...values: Part[]): Markup {
  return new Markup(parts.map((part, i) => part + (i < values.length ? writePart(values[i]) : '')).join(''))
}

function writePart(part: Part): string {
  if (part instanceof Markup) return part.text
  if (Array.isArray(part)) return part.map(writePart).join('')
  return escapeText(String(part))
}

const ENTITIES: Readonly<Record<string, string>> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
}

function escapeText(text: string): string {
  return (
    text
      .replace(/[&<>"']/g, (mark) => ENTITIES[mark])
      // Control characters have no place in a page, and marks of direction could reorder a number.
      .replace(/[\u0000-\u0008\u000b\u000c\u000e-\u001f\u007f-\u009f\u202a-\u202e\u2066-\u2069]/g, '\uFFFD')
  )
}
