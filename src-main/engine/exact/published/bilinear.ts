import type { PublishedTable } from './publishedTable'

const SOURCE =
  'von Karman and Duwez, J. Appl. Phys. 21 (1950) 987 (abstract read); Taylor 1942/1946; Rakhmatulin 1945 (from ' +
  'memory); bilinear closed form, values recomputed'

/** Constant end velocity on a rod of 8000 kg/m^3, E = 200 GPa, Et = 10 GPa, yield 400 MPa. */
export const BILINEAR_ROWS: PublishedTable = {
  source: SOURCE,
  label: 'Elastic-plastic rod struck at its end',
  columns: ['end velocity [m/s]', 'stress [Pa]', 'strain', 'plastic strain'],
  rows: [
    [5, 200e6, 0.001, 0],
    [10, 400e6, 0.002, 0],
    [20, 489.442719e6, 0.0109442719, 0.00849705831],
    [40, 668.328157e6, 0.0288328157, 0.0254911749],
    [60, 847.213595e6, 0.0467213595, 0.0424852916],
    [100, 1204.98447e6, 0.0824984472, 0.0764735248],
  ],
}

/** Where the release from the free far end meets the plastic front, 2 L c1/(c0 + c1), in a rod of 1 m. */
export const RELEASE_MEETS_PLASTIC: PublishedTable = {
  source: SOURCE,
  label: 'Release meets the plastic front',
  columns: ['x/L', 't [s]'],
  rows: [[0.365487995, 0.326902401e-3]],
}
