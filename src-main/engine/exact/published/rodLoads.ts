import type { PublishedTable } from './publishedTable'

const SOURCE =
  'Timoshenko, Vibration Problems in Engineering; Graff, Wave Motion in Elastic Solids, ch. 2 (from memory)'

/** Largest fixed-end force over P for an end load that rises over tr and stays, exact and of one mode. */
export const RAMP_FACTORS: PublishedTable = {
  source: `${SOURCE}; exact by superposing reflections`,
  label: 'Ramp load on a fixed-free rod, fixed-end force over P',
  columns: ['tr c/L', 'rod', 'one mode'],
  rows: [
    [2.5, 8 / 5, 1.470528],
    [3, 4 / 3, 1.300105],
    [3.5, 8 / 7, 1.139214],
    [4, 1, 1],
    [5, 6 / 5, 1.180063],
    [6, 4 / 3, 1.212207],
    [7, 8 / 7, 1.128617],
    [8, 1, 1],
    [10, 6 / 5, 1.127324],
    [12, 1, 1],
  ],
}

const ROOTS =
  'Blevins, Formulas for Natural Frequency and Mode Shape (1979) ch. 8; Timoshenko (from memory); roots recomputed'

/** b tan b = m/M (fixed-mass) or kL/EA (free-spring). */
export const FIXED_MASS_ROOTS: PublishedTable = {
  source: ROOTS,
  label: 'Rod fixed at one end with a mass at the other, or free with a spring: roots of b tan b = r',
  columns: ['r', 'b1', 'b2', 'b3'],
  rows: [
    [0.01, 0.09983364, 3.14477252, 6.28477645],
    [0.1, 0.31105285, 3.17309718, 6.29905936],
    [0.2, 0.43284072, 3.203935, 6.31484612],
    [0.25, 0.48009444, 3.21909858, 6.32270476],
    [0.5, 0.65327119, 3.29231002, 6.36162039],
    [1, 0.86033359, 3.42561846, 6.43729818],
    [2, 1.07687399, 3.64359717, 6.57833373],
    [4, 1.26459157, 3.93516165, 6.81401034],
    [5, 1.31383772, 4.03356779, 6.9095958],
    [10, 1.42887001, 4.30580141, 7.22810977],
    [20, 1.49612895, 4.49148005, 7.49541209],
    [100, 1.55524513, 4.66576514, 7.77637408],
  ],
}

/** tan b = -(M/m) b (free-mass) and b cot b = -kL/EA (fixed-spring), r = m/M = kL/EA. */
export const FREE_MASS_ROOTS: PublishedTable = {
  source: ROOTS,
  label: 'Rod free at one end with a mass at the other, or fixed with a spring: roots of tan b = -b/r',
  columns: ['r', 'b1', 'b2', 'b3'],
  rows: [
    [0.25, 1.71550715, 4.76480891, 7.88567408],
    [0.5, 1.8365972, 4.81584232, 7.91705268],
    [1, 2.02875784, 4.91318044, 7.97866571],
    [2, 2.28892973, 5.08698509, 8.0961636],
    [4, 2.57043156, 5.35403184, 8.30292918],
    [10, 2.86277259, 5.76055793, 8.70831383],
  ],
}

/** Two equal lengths of one material, section 1 fixed and section 2 free: tan^2(kL/2) = A1/A2. */
export const STEPPED_ROD_ROOTS: PublishedTable = {
  source: `${ROOTS} (Z1 tan and tan Z2 of two sections)`,
  label: 'Stepped rod fixed at section 1, free at section 2: kL',
  columns: ['A2/A1', 'kL 1', 'kL 2', 'kL 3'],
  rows: [
    [1 / 4, 2.21429744, 4.06888787, 8.49748274],
    [1 / 2, 1.91063324, 4.37255207, 8.19381854],
    [2, 1.23095942, 5.05222589, 7.51414472],
    [4, 0.927295218, 5.35589009, 7.21048053],
  ],
}
