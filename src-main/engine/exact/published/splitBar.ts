import type { PublishedTable } from './publishedTable'

const SOURCE =
  'Kolsky, Proc. Phys. Soc. B 62 (1949) 676; ASM Handbook vol. 8 (2000), split-Hopkinson article; Chen and Song, ' +
  'Split Hopkinson (Kolsky) Bar (2011) (from memory); values recomputed exactly'

/**
 * Worked example: bars of 20 mm, 200 GPa, 8000 kg/m^3, striker 0.30 m at 20 m/s, specimen of 10 mm and 5 mm
 * length at a constant nominal stress of 400 MPa. Compression positive.
 */
export const SPLIT_BAR_WAVES: PublishedTable = {
  source: SOURCE,
  label: 'Split bar with a specimen, waves',
  columns: ['force [N]', 'incident strain', 'reflected strain', 'transmitted strain', 'v1 [m/s]', 'v2 [m/s]'],
  rows: [[31415.9265, 0.002, -0.0015, 0.0005, 17.5, 2.5]],
}

/** The same by its reductions. */
export const SPLIT_BAR_REDUCED: PublishedTable = {
  source: SOURCE,
  label: 'Split bar with a specimen, rate, stress and strain of the specimen',
  columns: ['rate [1/s]', 'stress [Pa]', 'strain at the end of the pulse'],
  rows: [[3000, 400e6, 0.36]],
}

/** The same by its energies. */
export const SPLIT_BAR_ENERGIES: PublishedTable = {
  source: SOURCE,
  label: 'Split bar with a specimen, energies [J]',
  columns: ['incident', 'reflected', 'transmitted', 'plastic work'],
  rows: [[150.796447, 84.8230016, 9.42477796, 56.5486678]],
}

/** Striker speed 2 sigma_y/(rho c) at which bars of 1000 MPa are at their limit. */
export const SPLIT_BAR_LIMIT: PublishedTable = {
  source: SOURCE,
  label: 'Split bar, largest striker speed',
  columns: ['limit [Pa]', 'speed [m/s]'],
  rows: [[1000e6, 50]],
}

/** First transit k at which the forces of both faces of an elastic specimen differ by less than 5 %. */
export const RING_UP: PublishedTable = {
  source:
    'reverberation of a step in an elastic specimen, face forces F_I (1 - R^(k+1)), R = (1 - beta)/(1 + beta); treated ' +
    'by Yang and Shim (abstract read); values recomputed exactly',
  label: 'Ring-up of an elastic specimen',
  columns: ['beta', 'first transit under 5 %'],
  rows: [
    [0.5, 3],
    [0.25, 5],
    [0.2, 5],
    [0.1, 8],
    [0.05, 11],
    [0.02, 15],
  ],
}
