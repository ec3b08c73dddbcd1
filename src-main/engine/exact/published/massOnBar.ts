import type { PublishedTable } from './publishedTable'

const SOURCE =
  'de Saint-Venant and Flamant, Comptes Rendus 97 (1883); Boussinesq, Applications des potentiels (1885); ' +
  'Love, Treatise, art. 281; Timoshenko and Goodier, Theory of Elasticity, ch. 14 (from memory); values ' +
  'recomputed twice, by exact piecewise polynomials and by a march of the delay equation'

/** A rigid mass on a bar whose far end is fixed; stresses over rho c v0, times ct/L. */
export const MASS_ON_FIXED_BAR: PublishedTable = {
  source: SOURCE,
  label: 'Rigid mass on a bar with a fixed far end',
  columns: ['m/M', 'contact ends', 'v/v0 at parting', 'struck end peak', 'at', 'fixed end peak', 'at'],
  rows: [
    [1 / 10, 9.5410579, -0.94913406, 4.07367875, 6, 4.323117, 5],
    [1 / 6, 7.40759189, -0.92968085, 3.4687922, 4, 3.50452178, 5],
    [1 / 5, 7.01006664, -0.95783701, 3.25371302, 4, 3.34064009, 3],
    [1 / 4, 5.89959044, -0.81691155, 2.9744101, 4, 3.21306132, 3],
    [1 / 3, 5.26415686, -0.8800712, 2.60587522, 4, 3.02683424, 3],
    [1 / 2, 4.70856724, -0.925247, 2.36787944, 2, 2.73575888, 3],
    [1, 3.06766764, -0.68761894, 2.13533528, 2, 2.27067057, 3],
    [2, 2.50457891, -0.72905169, 2.01831564, 2, 2.03663128, 3],
    [4, 2.25004193, -0.73563548, 2.00033546, 2, 2.00067093, 3],
  ],
}

/** The same bar between its fronts: stress at the struck end over rho c v0 and speed of the mass over v0. */
export const MASS_ON_FIXED_BAR_HISTORY: PublishedTable = {
  source: SOURCE,
  label: 'Rigid mass on a bar with a fixed far end, history of the struck end',
  columns: ['m/M', 'ct/L', 'stress', 'speed'],
  rows: [
    [1, 2.5, 0.688615658, -0.524445661],
    [1, 3, 0.0497870684, -0.685971814],
    [1 / 2, 3, 0.82966082, -0.3834005],
    [1 / 2, 4, 2.13533528, -0.600423599],
    [1 / 2, 4.5, 0.448897316, -0.902913061],
    [1 / 4, 3, 1.64056773, 0.0829661612],
    [1 / 4, 4, 2.9744101, -0.238651219],
    [1 / 4, 5, 1.00943856, -0.714095326],
    [1 / 4, 5.5, 0.378532891, -0.798835788],
  ],
}

/** Mass ratios M/m at which the governing front or the interval of parting changes. */
export const MASS_ON_FIXED_BAR_LIMITS: PublishedTable = {
  source: SOURCE,
  label: 'Rigid mass on a bar with a fixed far end, limits of the intervals',
  columns: ['contact ends before ct/L', 'for M/m under'],
  rows: [
    [4, 1.72833219],
    [6, 4.15116351],
    [8, 7.37137208],
    [10, 11.405103],
  ],
}

/** Mass ratios up to which the fixed-end peak comes at each front. */
export const FIXED_END_PEAK_LIMITS: PublishedTable = {
  source: SOURCE,
  label: 'Rigid mass on a bar with a fixed far end, front of the fixed-end peak',
  columns: ['peak at ct/L', 'for M/m under'],
  rows: [
    [3, 5.68611974],
    [5, 13.8157927],
    [7, 25.1713121],
  ],
}

/** A rigid mass on a bar whose far end is free. */
export const MASS_ON_FREE_BAR: PublishedTable = {
  source: SOURCE,
  label: 'Rigid mass on a bar with a free far end',
  columns: ['m/M', 'contact ends', 'v/v0 after', 'mean bar speed', 'restitution', 'energy share in the bar'],
  rows: [
    [1 / 6, 2, 0.71653131, 1.70081214, 0.98428083, 0.48658288],
    [1 / 4, 2, 0.60653066, 1.57387736, 0.9673467, 0.63212056],
    [1 / 2, 2, 0.36787944, 1.26424112, 0.89636168, 0.86466472],
    [1, 2, 0.13533528, 0.86466472, 0.72932943, 0.98168436],
    [2, 2, 0.01831564, 0.49084218, 0.47252654, 0.99966454],
    [4, 2, 0.00033546, 0.24991613, 0.24958067, 0.99999989],
  ],
}
