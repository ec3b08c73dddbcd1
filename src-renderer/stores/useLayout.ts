import type { Layout } from './makeLayout'
import { findStore } from './findStore'
import { STORE_KEYS } from './storeKeys'

/** Hands out the measures of the sheet, in px, which follow the window. */
export const useLayout = (): Layout => findStore(STORE_KEYS.layout, 'useLayout')
