import type { PublishedTable } from './publishedTable'

const CONE =
  'S. Abrate, J. Sound Vib. 185 (1995) 703; B. M. Kumar and R. I. Sujith, J. Sound Vib. 207 (1997) 721; ' +
  'E. Eisner, J. Acoust. Soc. Am. 36 (1964) 309 (from memory); values recomputed'

/** Natural frequencies of cones, kL of the first two modes, R the ratio of the end radii. */
export const CONE_ROOTS: PublishedTable = {
  source: CONE,
  label: 'Cone, natural frequencies kL',
  columns: ['R', 'free 1', 'free 2', 'large fixed 1', 'large fixed 2', 'small fixed 1', 'small fixed 2'],
  rows: [
    [1.25, 3.15734839, 6.29112282, 1.71550715, 4.76480891, 1.43203224, 4.66958478],
    [1.5, 3.19290696, 6.30948437, 1.8365972, 4.81584232, 1.32419445, 4.64068363],
    [2, 3.2860066, 6.36067817, 2.02875784, 4.91318044, 1.16556119, 4.60421678],
    [3, 3.47433607, 6.48003072, 2.28892973, 5.08698509, 0.96740264, 4.56745217],
    [4, 3.62861938, 6.5967905, 2.45564386, 5.23293845, 0.84473084, 4.5489871],
    [5, 3.74912401, 6.70244885, 2.57043156, 5.35403184, 0.75930769, 4.53788858],
    [10, 4.07005815, 7.06190593, 2.83630039, 5.7172492, 0.54228089, 4.51566044],
  ],
}

/** Natural frequencies for the area law A ~ x^n, kL of the first two modes. */
export const AREA_LAW_ROOTS: PublishedTable = {
  source: CONE,
  label: 'Area law A ~ x^n, natural frequencies kL',
  columns: [
    'n',
    'x2/x1',
    'free 1',
    'free 2',
    'large fixed 1',
    'large fixed 2',
    'small fixed 1',
    'small fixed 2',
    'fixed 1',
    'fixed 2',
  ],
  rows: [
    [1, 2, 3.19657838, 6.31234951, 1.7940109, 4.80206076, 1.36077739, 4.6458999, 3.12303092, 6.27343571],
    [1, 4, 3.3356292, 6.40269113, 2.00091418, 4.93498695, 1.18036852, 4.57981972, 3.07326415, 6.24283023],
    [2, 2, 3.2860066, 6.36067817, 2.02875784, 4.91318044, 1.16556119, 4.60421678, 3.14159265, 6.28318531],
    [2, 4, 3.62861938, 6.5967905, 2.45564386, 5.23293845, 0.84473084, 4.5489871, 3.14159265, 6.28318531],
    [4, 2, 3.55578812, 6.51306818, 2.52641778, 5.19280313, 0.8249712, 4.60045423, 3.2860066, 6.36067817],
    [4, 4, 4.39328868, 7.17780237, 3.39333819, 5.99459397, 0.37248545, 4.80272458, 3.62861938, 6.5967905],
  ],
}

/** Natural frequencies of exponential rods, kL of the first two modes; fixed-fixed as free-free. */
export const EXPONENTIAL_ROOTS: PublishedTable = {
  source: CONE,
  label: 'Exponential rod, natural frequencies kL',
  columns: ['A2/A1', 'free 1', 'free 2', 'large fixed 1', 'large fixed 2', 'small fixed 1', 'small fixed 2'],
  rows: [
    [2, 3.16065146, 6.29273636, 1.79842849, 4.79723186, 1.3576446, 4.65073095],
    [4, 3.21715051, 6.32130292, 2.03906944, 4.90346123, 1.16038532, 4.61395193],
    [9, 3.32814563, 6.37850818, 2.33517947, 5.05246838, 0.95142615, 4.60445087],
    [16, 3.4338632, 6.43430102, 2.55367965, 5.17291399, 0.81820136, 4.62053356],
    [100, 3.8950613, 6.6918096, 3.28769268, 5.62670266, 0.47901248, 4.8003974],
  ],
}

/** Harmonic transmission through a cone between two uniform bars, radius ratios sqrt 2, 2 and 3; kL = pi is printed as 3.14159. */
export const CONE_TRANSMISSION: PublishedTable = {
  source: `${CONE}, harmonic transfer through the exact cone`,
  label: 'Cone between two bars, harmonic F_T/F_I and E_T',
  columns: ['kL', 'F, R = sqrt 2', 'E, R = sqrt 2', 'F, R = 2', 'E, R = 2', 'F, R = 3', 'E, R = 3'],
  rows: [
    [0.001, 1.3333334, 0.8888889, 1.6000001, 0.6400001, 1.8000002, 0.3600001],
    [0.5, 1.3392861, 0.8968436, 1.622849, 0.6584097, 1.8442004, 0.3778972],
    [1, 1.3552905, 0.9184061, 1.6879229, 0.7122709, 1.9785245, 0.434951],
    [2, 1.3958153, 0.9741502, 1.8830088, 0.8864305, 2.4898793, 0.6888332],
    [Math.PI, 1.41395, 0.9996273, 1.9936973, 0.9937073, 2.9346515, 0.9569088],
    [4, 1.4110253, 0.9954962, 1.9793461, 0.9794527, 2.90071, 0.9349021],
    [10, 1.413936, 0.9996075, 1.9979536, 0.9979546, 2.9880745, 0.9920655],
    [20, 1.4140286, 0.9997384, 1.9988085, 0.9988088, 2.9942412, 0.9961645],
  ],
}

/** Step response behind a growing cone between two bars, tau = ct/L after arrival, 2 meaning just before 2. */
export const CONE_STEP: PublishedTable = {
  source: `${CONE}; closed form of the first 2L/c confirmed by numerical Laplace inversion`,
  label: 'Cone between two bars, step response F_T/F_I',
  columns: ['tau', 'R = sqrt 2', 'R = 2', 'R = 3'],
  rows: [
    [0, 1.41421356, 2, 3],
    [0.1, 1.40587449, 1.95184931, 2.81130553],
    [0.25, 1.3942559, 1.88632551, 2.5674798],
    [0.5, 1.37722208, 1.79383335, 2.25071429],
    [1, 1.35162826, 1.66472449, 1.87443806],
    [1.5, 1.33690031, 1.59981635, 1.73858381],
    [2, 1.33260355, 1.58965344, 1.76530492],
  ],
}

/** Step response of the same cones after tau = 2, by Laplace inversion. */
export const CONE_STEP_LATE: PublishedTable = {
  source: `${CONE}; numerical Laplace inversion`,
  label: 'Cone between two bars, late step response F_T/F_I',
  columns: ['R', 'tau', 'F_T/F_I'],
  rows: [
    [2, 2.5, 1.59859],
    [2, 3, 1.60059],
    [2, 4, 1.6],
    [3, 2.5, 1.80859],
    [3, 3, 1.80694],
    [3, 4, 1.79858],
    [3, 10, 1.8],
  ],
}

/** Front that passes N equal-ratio steps. */
export const EQUAL_STEPS: PublishedTable = {
  source: 'product of exact step ratios (layers in the manner of Goupillaud); values recomputed exactly',
  label: 'N equal-ratio steps, front F_T/F_I',
  columns: ['A2/A1', 'N', 'F_T/F_I'],
  rows: [
    [2, 1, 1.33333333],
    [2, 2, 1.372583],
    [2, 4, 1.39316506],
    [2, 8, 1.40364],
    [2, 16, 1.40891562],
    [2, 64, 1.41288711],
    [4, 1, 1.6],
    [4, 2, 1.77777778],
    [4, 4, 1.8839841],
    [4, 8, 1.94090889],
    [4, 16, 1.97020524],
    [4, 64, 1.99250714],
    [9, 1, 1.8],
    [9, 2, 2.25],
    [9, 4, 2.58468371],
    [9, 8, 2.78267833],
    [9, 16, 2.88904135],
    [9, 64, 2.97184646],
  ],
}
