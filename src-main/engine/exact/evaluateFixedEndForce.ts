/**
 * Force at the fixed end of a fixed-free rod under an end load P(t), by superposing reflections:
 * 2 [P(t - L/c) - P(t - 3L/c) + P(t - 5L/c) - ...]. Exact. Source: Timoshenko, Vibration Problems in
 * Engineering (from memory).
 *
 * @param load end load, 0 before 0, as a function of ct/L [N]
 * @param tau ct/L
 * @returns force at the fixed end [N]
 */
export function evaluateFixedEndForce(load: (tau: number) => number, tau: number): number {
  let force = 0
  for (let n = 0; 2 * n + 1 <= tau; n++) force += (n % 2 === 0 ? 2 : -2) * load(tau - 2 * n - 1)
  return force
}
