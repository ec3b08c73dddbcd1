import { onScopeDispose, ref, type Ref } from 'vue'

/**
 * Follows how many pixels of the screen there are in one of the page.
 *
 * @returns the ratio, at least 1
 */
export function useScreenRatio(): Ref<number> {
  const ratio = ref(Math.max(1, window.devicePixelRatio))
  let query: MediaQueryList | null = null
  function follow(): void {
    query?.removeEventListener('change', follow)
    ratio.value = Math.max(1, window.devicePixelRatio)
    query = window.matchMedia(`(resolution: ${window.devicePixelRatio}dppx)`)
    query.addEventListener('change', follow)
  }
  follow()
  onScopeDispose(() => query?.removeEventListener('change', follow))
  return ratio
}
