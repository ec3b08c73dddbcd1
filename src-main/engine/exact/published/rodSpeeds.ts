import type { PublishedTable } from './publishedTable'

/** Handbook properties with c = sqrt(E/rho) and the impact speed of like bars at yield, 2 yield/(rho c). */
export const ROD_SPEEDS: PublishedTable = {
  source:
    'density, modulus, yield: Callister, Fundamentals of Materials Science and Engineering, 3rd ed., tables B.2 and ' +
    'B.4; Aluminum Association typical values; published data sheet of Ti-6Al-4V; published density list; speeds recomputed',
  label: 'Rod speeds of handbook materials: 4340, 6061-T6, 7075-T6, Ti-6Al-4V, C11000',
  columns: ['density [kg/m^3]', 'modulus [Pa]', 'yield [Pa]', 'c [m/s]', '2 yield/(rho c) [m/s]'],
  rows: [
    [7850, 207e9, 1620e6, 5135.1, 80.38],
    [2700, 68.9e9, 276e6, 5051.6, 40.47],
    [2810, 71e9, 505e6, 5026.6, 71.51],
    [4430, 114e9, 830e6, 5072.8, 73.87],
    [8890, 115e9, 310e6, 3596.6, 19.39],
  ],
}
