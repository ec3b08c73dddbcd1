import type { InjectionKey } from 'vue'
import type { Stores } from './makeStores'

/** Under which each store is provided by the app. */
export const STORE_KEYS: { [Name in keyof Stores]: InjectionKey<Stores[Name]> } = {
  bridge: Symbol('bridge'),
  rig: Symbol('rig'),
  run: Symbol('run'),
  view: Symbol('view'),
  cursor: Symbol('cursor'),
  selection: Symbol('selection'),
  layout: Symbol('layout'),
  documents: Symbol('documents'),
}
