import type { Run } from './makeRun'
import { findStore } from './findStore'
import { STORE_KEYS } from './storeKeys'

/** Hands out the window's one run store. */
export const useRun = (): Run => findStore(STORE_KEYS.run, 'useRun')
