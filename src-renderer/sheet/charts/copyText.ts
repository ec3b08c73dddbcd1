/**
 * Puts a text where it can be pasted from.
 *
 * @param text - of any length
 * @returns whether the system took it
 */
export async function copyText(text: string): Promise<boolean> {
  try {
    await navigator.clipboard.writeText(text)
    return true
  } catch {
    // Hosts that deny every permission still take a copy of what is selected.
    return copySelected(text)
  }
}

function copySelected(text: string): boolean {
  const field = document.createElement('textarea')
  field.value = text
  field.className = 'unseen'
  const focused = document.activeElement
  document.body.append(field)
  field.select()
  const done = document.execCommand('copy')
  field.remove()
  if (focused instanceof HTMLElement) focused.focus()
  return done
}
