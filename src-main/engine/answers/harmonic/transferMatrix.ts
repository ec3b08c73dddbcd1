/**
 * What a lossless stretch does to the harmonic amplitudes of force and velocity, left face to right face:
 *
 *     F_right = a F_left + i b v_left        v_right = i c F_left + d v_left
 *
 * with all four real, time as exp(i w t), and a d + b c = 1. b in [kg/s], c in [s/kg].
 */
export interface TransferMatrix {
  a: number
  b: number
  c: number
  d: number
}
