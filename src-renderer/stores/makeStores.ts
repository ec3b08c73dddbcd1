import type { Bridge } from '../../src-main/contract/bridge'
import { makeCursor, type Cursor } from './makeCursor'
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
}

/**
 * Makes the stores of one window.
 *
 * @param bridge - the window's host
 * @param page - the page's window, whose size the layout follows
 * @returns the stores, to be provided once
 */
export function makeStores(bridge: Bridge, page: Window): Stores {
  const layout = makeLayout(page)
  const rig = makeRig(bridge)
  const run = makeRun(bridge, rig)
  const view = makeView(run)
  const cursor = makeCursor(run, view, () => ({ width: layout.fieldWidth, height: layout.field.height }))
  return { bridge, rig, run, view, cursor, selection: makeSelection(rig), layout }
}
