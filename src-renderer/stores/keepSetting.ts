import { ref, watch, type Ref } from 'vue'

/**
 * Makes a choice that is kept on this machine for this user; where nothing can be kept it lasts as long as
 * the page.
 *
 * @param name - the setting
 * @param choices - what it may be; the first where nothing was kept
 * @returns the choice
 */
export function keepSetting<T extends string>(name: string, choices: readonly T[]): Ref<T> {
  const key = `barwright.${name}`
  const choice = ref(choices[0]) as Ref<T>
  try {
    const kept = localStorage.getItem(key) as T | null
    if (kept !== null && choices.includes(kept)) choice.value = kept
  } catch {
    return choice
  }
  watch(choice, (value) => {
    try {
      localStorage.setItem(key, value)
    } catch {
      // A full or forbidden store loses the choice at the end of the page, and nothing else.
    }
  })
  return choice
}
