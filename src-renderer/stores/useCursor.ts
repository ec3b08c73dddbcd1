import type { Cursor } from './makeCursor'
import { findStore } from './findStore'
import { STORE_KEYS } from './storeKeys'

/** Hands out the window's one cursor store. */
export const useCursor = (): Cursor => findStore(STORE_KEYS.cursor, 'useCursor')
