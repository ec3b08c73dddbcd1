import type { View } from './makeView'
import { findStore } from './findStore'
import { STORE_KEYS } from './storeKeys'

/** Hands out the window's one view store. */
export const useView = (): View => findStore(STORE_KEYS.view, 'useView')
