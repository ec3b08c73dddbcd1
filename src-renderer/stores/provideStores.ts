import type { InjectionKey } from 'vue'
import type { Stores } from './makeStores'
import { STORE_KEYS } from './storeKeys'

/**
 * Provides the stores to everything below an app or a component.
 *
 * @param provide - Vue's `provide`, or that of an app
 * @param stores - of one window
 */
export function provideStores(provide: <T>(key: InjectionKey<T>, value: T) => unknown, stores: Stores): void {
  for (const name of Object.keys(STORE_KEYS) as (keyof Stores)[]) {
    provide(STORE_KEYS[name] as InjectionKey<unknown>, stores[name])
  }
}
