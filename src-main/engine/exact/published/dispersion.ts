import type { PublishedTable } from './publishedTable'

/** First longitudinal mode of a round bar, nu = 0.29: phase velocity c/c0 of the exact theory and of Love's. */
export const LATERAL_INERTIA: PublishedTable = {
  source:
    "Bancroft, Phys. Rev. 59 (1941) 588; Davies, Phil. Trans. A 240 (1948) 375; Kolsky ch. III; Love's " +
    '[1 + nu^2 K^2 k^2]^(-1/2) (from memory); values recomputed from the Pochhammer-Chree equation',
  label: 'Phase velocity of a round bar, nu = 0.29',
  columns: ['a/Lambda', 'exact c/c0', 'Love c/c0'],
  rows: [
    [0.02, 0.9996671, 0.999668],
    [0.05, 0.9978905, 0.997931],
    [0.1, 0.9911285, 0.991802],
    [0.15, 0.9782607, 0.981832],
    [0.2, 0.9564463, 0.968366],
    [0.25, 0.9217531, 0.95184],
    [0.3, 0.8729921, 0.932746],
  ],
}
