import { makeInks, type Inks } from '../../../src-renderer/sheet/charts/inks'

const grey = '#102030'

/** Inks of a light sheet for drawings whose colours do not matter. */
export const testInks: Inks = makeInks(
  {
    theme: 'light',
    paper: '#ffffff',
    drawer: grey,
    ink: grey,
    unit: '#405060',
    stale: '#808080',
    rule: '#c0c0c0',
    grid: '#e0e0e0',
    accent: grey,
    wash: grey,
  },
  false,
  11,
)
