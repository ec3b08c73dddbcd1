import type { Rig } from './makeRig'
import { findStore } from './findStore'
import { STORE_KEYS } from './storeKeys'

/** Hands out the window's one rig store. */
export const useRig = (): Rig => findStore(STORE_KEYS.rig, 'useRig')
