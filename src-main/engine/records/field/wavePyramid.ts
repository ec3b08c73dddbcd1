/** Largest and smallest value of each run of neighbours of one parity. */
export interface PyramidLevel {
  high: Float64Array
  low: Float64Array
}

/** Signed extremes of a wave over runs of its even and of its odd values, made as they are asked for. */
export interface WavePyramid {
  wave: Float64Array
  /** Entry i gathers the values at `parity + i 2^level .. parity + (i + 1) 2^level - 1` of the same parity. */
  readLevel(level: number, parity: number): PyramidLevel
}

/**
 * Makes the pyramid of a wave.
 *
 * @param wave its values; they must not change any more
 */
export function makeWavePyramid(wave: Float64Array): WavePyramid {
  const levels: PyramidLevel[][] = []
  return {
    wave,
    readLevel(level, parity) {
      if (levels.length === 0) levels.push([pickParity(wave, 0), pickParity(wave, 1)])
      while (levels.length < level) levels.push(levels[levels.length - 1].map(halve))
      return levels[level - 1][parity]
    },
  }
}

function pickParity(wave: Float64Array, parity: number): PyramidLevel {
  const picked = Float64Array.from(
    { length: (wave.length + 1 - parity) >> 1 },
    (_, i) => wave[2 * i + parity],
  )
  return { high: picked, low: picked }
}

function halve({ high, low }: PyramidLevel): PyramidLevel {
  const count = Math.ceil(high.length / 2)
  const halved = { high: new Float64Array(count), low: new Float64Array(count) }
  for (let i = 0; i < count; i++) {
    const next = Math.min(2 * i + 1, high.length - 1)
    halved.high[i] = Math.max(high[2 * i], high[next])
    halved.low[i] = Math.min(low[2 * i], low[next])
  }
  return halved
}
