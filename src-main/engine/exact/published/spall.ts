import type { PublishedTable } from './publishedTable'

const SOURCE =
  'J. S. Rinehart, J. Appl. Phys. 22 (1951) 555 and 23 (1952) 1229, Stress Transients in Solids (1975); Johnson ch. 1; ' +
  'Kolsky (from memory); values recomputed'

/** Triangle of 1000 MPa with a vertical front, 0.10 m long, strength 300 MPa, 7850 kg/m^3, c = 5000 m/s. */
export const TRIANGLE_SPALLS: PublishedTable = {
  source: SOURCE,
  label: 'Spalls of a triangular pulse',
  columns: ['spall', 'thickness [m]', 'velocity [m/s]'],
  rows: [
    [1, 0.015, 43.3121019],
    [2, 0.015, 28.0254777],
    [3, 0.015, 12.7388535],
  ],
}

/** Momentum of the same pulse per area, and what its spalls carry off; 100 Pa s stay in the bar. */
export const TRIANGLE_MOMENTUM: PublishedTable = {
  source: SOURCE,
  label: 'Momentum of a triangular pulse',
  columns: ['pulse, per area [Pa s]', 'spalls, per area [Pa s]'],
  rows: [[10000, 9900]],
}

/** Square pulse of 500 MPa, 0.10 m long, in the same bar: one spall takes all its momentum. */
export const SQUARE_SPALL: PublishedTable = {
  source: SOURCE,
  label: 'Spall of a square pulse',
  columns: ['thickness [m]', 'velocity [m/s]'],
  rows: [[0.05, 25.477707]],
}

/** Exponential pulse of 1000 MPa exp(-x/30 mm), strength 300 MPa: first spall. */
export const EXPONENTIAL_SPALL: PublishedTable = {
  source: SOURCE,
  label: 'First spall of an exponential pulse',
  columns: ['thickness [m]', 'velocity [m/s]'],
  rows: [[5.35012416e-3, 42.8586994]],
}
