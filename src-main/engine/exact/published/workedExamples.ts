import type { PublishedTable } from './publishedTable'

const STEP =
  'W. Johnson, Impact Strength of Materials (1972) ch. 1 (from memory) for the ratios; a textbook problem that ' +
  'quotes 2812 and 2010 m/s and 0.761; values recomputed'

/** Silver (10500 kg/m^3, 83 GPa) to gold (19300 kg/m^3, 78 GPa) at equal areas. */
export const SILVER_TO_GOLD: PublishedTable = {
  source: STEP,
  label: 'Silver to gold, equal areas',
  columns: ['c silver [m/s]', 'c gold [m/s]', 'Z1/Z2', 'v_T/v_I', 'v_R/v_I', 'stress_T/stress_I'],
  rows: [[2811.54084, 2010.33599, 0.760865233, 0.864194736, -0.135805264, 1.13580526]],
}

/** Area of aluminium 6061 (2700, 68.9e9) over that of steel (7850, 207e9) at which nothing is reflected. */
export const MATCHING_AREA: PublishedTable = {
  source: 'equal impedances, rho1 c1 A1 = rho2 c2 A2; value recomputed',
  label: 'Steel to aluminium without reflection',
  columns: ['A2/A1', 'F_R/F_I', 'E_T/E_I'],
  rows: [[2.95548329, 0, 1]],
}

/** Like bars of 200 GPa and 8000 kg/m^3, 0.3 m at 10 m/s on 0.9 m. */
export const LIKE_BARS: PublishedTable = {
  source:
    'Timoshenko and Goodier, Theory of Elasticity, 3rd ed., ch. 14 (from memory); contact time 2L/c read as an ' +
    'exercise; values recomputed',
  label: 'Like bars, 0.3 m on 0.9 m',
  columns: ['stress [Pa]', 'contact [s]', 'faces part [s]', 'V1 [m/s]', 'V2 [m/s]', 'restitution'],
  rows: [[200e6, 120e-6, 360e-6, 0, 10 / 3, 1 / 3]],
}

/** A mass m = M at 5 m/s on a held bar of 1 m, c = 5000 m/s, rho c = 4e7. */
export const MASS_ON_METRE: PublishedTable = {
  source:
    'de Saint-Venant and Flamant, Comptes Rendus 97 (1883); Love, Treatise, art. 281 (from memory); values recomputed',
  label: 'Mass of the weight of a bar on a bar of 1 m',
  columns: ['fixed-end peak [Pa]', 'at [s]', 'contact ends [s]', 'mass leaves [m/s]'],
  rows: [[454.134113e6, 600e-6, 613.533529e-6, -3.4380947]],
}

/** A sudden constant end load P: force over P at the fixed end and at mid-length, end displacement over PL/EA. */
export const SUDDEN_LOAD: PublishedTable = {
  source:
    'Timoshenko, Vibration Problems in Engineering; Graff, Wave Motion in Elastic Solids, ch. 2 (from memory); exact',
  label: 'Sudden end load on a fixed-free rod',
  columns: ['ct/L', 'fixed-end force', 'mid-length force', 'end displacement'],
  rows: [
    [0.25, 0, 0, 0.25],
    [0.75, 0, 1, 0.75],
    [1.25, 2, 1, 1.25],
    [2, 2, 2, 2],
    [2.75, 2, 1, 1.25],
    [3.25, 0, 1, 0.75],
    [4, 0, 0, 0],
  ],
}

/** What a preloaded length, held at its far end, sends into a bar when it is let go, for 2 Lp/c. */
export const RELEASED_WAVE: PublishedTable = {
  source: 'Staab and Gilat, Exp. Mech. 31 (1991) 232 (from memory); F0 Z2/(Z1 + Z2) for 2 Lp/c; exact',
  label: 'Preloaded length let go into a bar',
  columns: ['Z2/Z1', 'F/F0'],
  rows: [
    [1 / 4, 1 / 5],
    [1, 1 / 2],
    [3, 3 / 4],
  ],
}
