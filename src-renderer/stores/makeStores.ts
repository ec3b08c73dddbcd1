import type { Bridge } from '../../src-main/contract/bridge'
import { makeCursor, type Cursor } from './makeCursor'
import { makeBrowserFiles } from './files/makeBrowserFiles'
import { makeHostFiles } from './files/makeHostFiles'
import { makeDocuments, type Documents } from './makeDocuments'
import { makeLayout, type Layout } from './makeLayout'
import { makeRig, type Rig } from './makeRig'
import { makeRun, type Run } from './makeRun'
import { makeSelection, type Selection } from './makeSelection'
import { makeView, type View } from './makeView'

/** Everything that the views share. */
export interface Stores {
  bridge: Bridge
  rig: Rig
  run: Run
  view: View
  cursor: Cursor
  selection: Selection
  layout: Layout
  documents: Documents
}

/**
 * Makes the stores of one window.
 *
 * @param bridge - the window's host
 * @param page - the page's window, whose size the layout follows
 * @returns the stores, to be provided once
 */
export function makeStores(bridge: Bridge, page: Window): Stores {
  const rig = makeRig(bridge)
  const selection = makeSelection(rig)
  const layout = makeLayout(page, selection.editorHeight)
  const run = makeRun(bridge, rig)
  const view = makeView(run)
  const cursor = makeCursor(run, view, () => ({ width: layout.fieldWidth, height: layout.field.height }))
  const host = bridge.files?.()
  const files = host ? makeHostFiles(host) : makeBrowserFiles(page)
  const documents = makeDocuments(bridge, rig, files, page)
  return { bridge, rig, run, view, cursor, selection, layout, documents }
}
