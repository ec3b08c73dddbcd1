import type { PublishedTable } from './publishedTable'

/** Theoretical factors of shoulder fillets in tension, on the nominal stress of the small section. */
export const SHOULDER_FACTORS: PublishedTable = {
  source:
    "Pilkey, Peterson's Stress Concentration Factors, shoulder fillets in tension, flat and round " +
    '(chart numbers from memory); coefficients read in two public copies, values recomputed from them',
  label: 'Shoulder fillet in tension',
  columns: ['D/d', 'r/d', 'Kt round', 'Kt flat'],
  rows: [
    [1.1, 0.1, 1.557262, 1.658372],
    [1.2, 0.05, 2.018023, 2.247747],
    [1.2, 0.1, 1.689847, 1.879713],
    [1.2, 0.2, 1.461269, 1.619739],
    [1.5, 0.05, 2.261355, 2.769124],
    [1.5, 0.1, 1.860345, 2.227241],
    [1.5, 0.2, 1.554342, 1.83812],
    [2, 0.05, 2.420075, 3.189181],
    [2, 0.1, 1.964545, 2.516449],
    [2, 0.2, 1.628975, 1.992215],
    [2, 0.25, 1.537298, 1.846911],
    [3, 0.1, 2.024617, 2.730642],
  ],
}
