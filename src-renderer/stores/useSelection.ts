import type { Selection } from './makeSelection'
import { findStore } from './findStore'
import { STORE_KEYS } from './storeKeys'

/** Hands out the window's one selection store. */
export const useSelection = (): Selection => findStore(STORE_KEYS.selection, 'useSelection')
