import type { PublishedTable } from './publishedTable'

const SOURCE =
  'Achenbach, Wave Propagation in Elastic Solids (1973) ch. 1; Wang L.-L., Foundations of Stress Waves (2007) (from ' +
  'memory); own closed forms, checked by quadrature'

/** Law linear in nominal stress: true over nominal stress, lambda^(2 nu). */
export const LINEAR_NOMINAL: PublishedTable = {
  source: SOURCE,
  label: 'Linear in nominal stress, true stress over nominal stress',
  columns: ['nu', 'nominal strain', 'true over nominal'],
  rows: [
    [0.3, -0.01, 0.993987944],
    [0.3, -0.05, 0.969692783],
    [0.3, 0.05, 1.0297068],
    [0.5, -0.01, 0.99],
    [0.5, -0.05, 0.95],
    [0.5, 0.05, 1.05],
  ],
}

/** Hencky, incompressible, P = E ln(lambda)/lambda: tension fan, v/c0 = (2/3)[1 - (1 - ln lambda)^1.5]. */
export const HENCKY_FAN: PublishedTable = {
  source: SOURCE,
  label: 'Hencky rod pulled, tension fan',
  columns: ['lambda', 'v/c0'],
  rows: [
    [1.01, 0.00992553738],
    [1.05, 0.048190114],
    [1.1, 0.0930017427],
    [1.25, 0.210188612],
    [1.5, 0.361051599],
    [2, 0.553347358],
  ],
}

/** The same pressed: compression shock, v/c0 = sqrt(ln(lambda) (lambda - 1)/lambda). */
export const HENCKY_SHOCK: PublishedTable = {
  source: SOURCE,
  label: 'Hencky rod pressed, compression shock',
  columns: ['lambda', 'v/c0'],
  rows: [
    [0.99, 0.0100756411],
    [0.95, 0.0519581281],
    [0.9, 0.108197615],
    [0.8, 0.236190364],
  ],
}

/** Two like Hencky bars that meet, each taking v/c0. */
export const HENCKY_MEETING: PublishedTable = {
  source: SOURCE,
  label: 'Like Hencky bars that meet',
  columns: ['v/c0', 'lambda'],
  rows: [
    [0.05, 0.951815576],
    [0.1, 0.907038043],
    [0.2, 0.826503077],
  ],
}
