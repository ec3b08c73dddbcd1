import { inject, type InjectionKey } from 'vue'

/**
 * Finds a store that the app provides.
 *
 * @param key - of the store
 * @param asker - who asks, for the message
 * @returns the store; throws where no app provides it
 */
export function findStore<T>(key: InjectionKey<T>, asker: string): T {
  const store = inject(key)
  if (store === undefined) throw new Error(`${asker}: no app provides this store`)
  return store
}
