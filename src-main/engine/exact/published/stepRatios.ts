import type { PublishedTable } from './publishedTable'

const SOURCE =
  'W. Johnson, Impact Strength of Materials (1972) ch. 1; Kolsky, Stress Waves in Solids (1953) ch. II-III; ' +
  'Graff, Wave Motion in Elastic Solids (1975) ch. 2 (sections from memory); values recomputed exactly'

/** Ratios at one bonded step; the last column where only the area changes, 0 at a free end (no bar). */
export const STEP_RATIOS: PublishedTable = {
  source: SOURCE,
  label: 'Area or material step, one interface',
  columns: ['Z2/Z1', 'F_R/F_I', 'F_T/F_I', 'v_T/v_I', 'E_R/E_I', 'E_T/E_I', 'stress_T/stress_I'],
  rows: [
    [0, -1, 0, 2, 1, 0, 0],
    [1 / 4, -0.6, 0.4, 1.6, 0.36, 0.64, 1.6],
    [1 / 2, -0.3333333333, 0.6666666667, 1.333333333, 0.1111111111, 0.8888888889, 1.333333333],
    [1, 0, 1, 1, 0, 1, 1],
    [2, 0.3333333333, 1.333333333, 0.6666666667, 0.1111111111, 0.8888888889, 0.6666666667],
    [4, 0.6, 1.6, 0.4, 0.36, 0.64, 0.4],
    [Infinity, 1, 2, 0, 1, 0, 0],
  ],
}

/** Steel (7850 kg/m^3, 207 GPa) into aluminium 6061, Ti-6Al-4V, PMMA and tungsten of the same area. */
export const STEEL_INTO: PublishedTable = {
  source: SOURCE,
  label: 'Steel into another material, equal areas',
  columns: ['density [kg/m^3]', 'modulus [Pa]', 'Z2/Z1', 'F_R/F_I', 'F_T/F_I', 'E_T/E_I'],
  rows: [
    [2700, 68.9e9, 0.338354138, -0.494372785, 0.505627215, 0.75559555],
    [4430, 114e9, 0.557486414, -0.284120351, 0.715879649, 0.919275626],
    [1190, 2.7e9, 0.0444667472, -0.914852728, 0.0851472722, 0.163044486],
    [19300, 411e9, 2.20942653, 0.376835711, 1.37683571, 0.857994847],
  ],
}
