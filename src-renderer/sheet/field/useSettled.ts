import { onScopeDispose, shallowRef, watch, type Ref, type ShallowRef } from 'vue'

/**
 * Follows a value once it has rested, so that what only few look at costs nothing while it moves.
 *
 * @param source - the value
 * @param pause - rest that it needs [ms]
 * @returns the value as it was when it last came to rest
 */
export function useSettled<T>(source: Readonly<Ref<T>>, pause = 250): ShallowRef<T> {
  const settled = shallowRef(source.value) as ShallowRef<T>
  let clock: ReturnType<typeof setTimeout> | undefined
  watch(source, (next) => {
    clearTimeout(clock)
    clock = setTimeout(() => (settled.value = next), pause)
  })
  onScopeDispose(() => clearTimeout(clock))
  return settled
}
