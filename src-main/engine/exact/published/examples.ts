import type { PublishedTable } from './publishedTable'

/** Worked example of a split-bar test, its incident part: 20 mm bars of 200 GPa, 8000 kg/m^3, striker 0.30 m at 20 m/s. */
export const INCIDENT_WAVE: PublishedTable = {
  source:
    'Kolsky, Proc. Phys. Soc. B 62 (1949) 676; ASM Handbook vol. 8 (2000); Chen and Song, Split Hopkinson ' +
    '(Kolsky) Bar (2011) (from memory); values recomputed exactly',
  label: 'Split bar, incident wave of the worked example',
  columns: ['strain', 'stress [Pa]', 'force [N]', 'duration [s]', 'length [m]', 'energy [J]'],
  rows: [[0.002, 400e6, 125663.706, 120e-6, 0.6, 150.796447]],
}

/** Free-free exponential horn in its first mode, diameter ratio 10. */
export const HORN: PublishedTable = {
  source: 'Elmore and Heald, Physics of Waves, ch. 4 problem (30 %, 1.99 read there); digits recomputed',
  label: 'Exponential horn, first mode',
  columns: [
    'diameter ratio',
    'kL',
    'place of the largest strain from the small end over L',
    'v_tip/(c largest strain)',
  ],
  rows: [[10, 3.8950613, 0.298672134, 1.98917107]],
}

/** Fixed end of a tension rod that is let go at its other end: stress over the first one, by intervals of ct/L. */
export const RELEASE: PublishedTable = {
  source:
    "release of prestress, exact by d'Alembert; Graff, Wave Motion in Elastic Solids, ch. 2 (from memory)",
  label: 'Tension rod let go, stress at the fixed end over the first',
  columns: ['from ct/L', 'to ct/L', 'stress'],
  rows: [
    [0, 1, 1],
    [1, 3, -1],
    [3, 5, 1],
  ],
}
