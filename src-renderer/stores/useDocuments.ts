import type { Documents } from './makeDocuments'
import { findStore } from './findStore'
import { STORE_KEYS } from './storeKeys'

/** Hands out the window's one store of documents. */
export const useDocuments = (): Documents => findStore(STORE_KEYS.documents, 'useDocuments')
