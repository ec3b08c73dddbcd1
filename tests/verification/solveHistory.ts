/**
 * The history of a system of ordinary differential equations by the classical Runge-Kutta rule of fourth
 * order: a reference apart from the engine's laws.
 *
 * @param slope y' at a time and state
 * @param start y at 0
 * @param h step
 * @param steps number of steps
 * @returns y at 0, h .. steps h
 */
export function solveHistory(
  slope: (t: number, y: number[]) => number[],
  start: number[],
  h: number,
  steps: number,
): number[][] {
  const history = [start]
  let y = start
  const move = (k: number[], by: number) => y.map((value, i) => value + by * k[i])
  for (let n = 0; n < steps; n++) {
    const t = n * h
    const k1 = slope(t, y)
    const k2 = slope(t + h / 2, move(k1, h / 2))
    const k3 = slope(t + h / 2, move(k2, h / 2))
    const k4 = slope(t + h, move(k3, h))
    y = y.map((value, i) => value + (h / 6) * (k1[i] + 2 * k2[i] + 2 * k3[i] + k4[i]))
    history.push(y)
  }
  return history
}
