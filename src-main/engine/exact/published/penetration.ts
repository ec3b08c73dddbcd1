import type { PublishedTable } from './publishedTable'

const SOURCE =
  'B. Lundberg, Int. J. Rock Mech. Min. Sci. 10 (1973) 381 and 401 (titles read); definition of the efficiency ' +
  'ibid. 24 (1987) 213 (abstract read); values recomputed'

/** Square pulse of duration T into F = k u from a long rod, B = k T/Z: efficiency 2 (1 - exp(-B))^2/B. */
export const SQUARE_PULSE_EFFICIENCY: PublishedTable = {
  source: SOURCE,
  label: 'Percussive efficiency of a square pulse',
  columns: ['B', 'efficiency'],
  rows: [
    [0.1, 0.18111834],
    [0.25, 0.391432749],
    [0.5, 0.619272487],
    [1, 0.799152802],
    [1.5, 0.804702331],
    [2, 0.747645072],
    [3, 0.60193641],
    [5, 0.394627802],
    [10, 0.19998184],
  ],
}

/** Its maximum, where exp(B) = 1 + 2 B. */
export const SQUARE_PULSE_BEST: PublishedTable = {
  source: SOURCE,
  label: 'Percussive efficiency of a square pulse, maximum',
  columns: ['B', 'efficiency', 'F_max/F_I'],
  rows: [[1.25643121, 0.814528755, 1.43066373]],
}

/** Pulse exp(t/t0) cut off at its peak, x = k t0/Z: 4 x/(1 + x)^2. */
export const RISING_PULSE_EFFICIENCY: PublishedTable = {
  source: SOURCE,
  label: 'Percussive efficiency of a rising exponential pulse',
  columns: ['x', 'efficiency'],
  rows: [
    [1 / 4, 0.64],
    [1 / 2, 8 / 9],
    [1, 1],
    [2, 8 / 9],
    [4, 0.64],
  ],
}
