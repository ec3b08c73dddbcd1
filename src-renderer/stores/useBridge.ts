import type { Bridge } from '../../src-main/contract/bridge'
import { findStore } from './findStore'
import { STORE_KEYS } from './storeKeys'

/** Hands out the way to the window's host. */
export const useBridge = (): Bridge => findStore(STORE_KEYS.bridge, 'useBridge')
