import { onScopeDispose, ref, watchEffect, type Ref } from 'vue'
import type { View } from '../stores/makeView'

/**
 * Keeps the page in the colours that were chosen, or in the system's where it is left to it.
 *
 * @param view - whose `theme` is the choice
 * @param page - the page's window
 * @returns whether the page is dark
 */
export function applyTheme(view: Pick<View, 'theme'>, page: Window): Ref<boolean> {
  const system = page.matchMedia('(prefers-color-scheme: dark)')
  const systemDark = ref(system.matches)
  const follow = (): void => {
    systemDark.value = system.matches
  }
  system.addEventListener('change', follow)
  onScopeDispose(() => system.removeEventListener('change', follow))
  const dark = ref(false)
  watchEffect(
    () => {
      dark.value = view.theme.value === 'dark' || (view.theme.value === 'system' && systemDark.value)
      page.document.documentElement.dataset.theme = dark.value ? 'dark' : 'light'
    },
    { flush: 'sync' },
  )
  return dark
}
