import type { Pulse } from '../../../contract/rig'

/** Share of the duration of a half sine from 10 % to 90 %: (asin 0.9 - asin 0.1) / pi. */
const HALF_SINE_RISE = (Math.asin(0.9) - Math.asin(0.1)) / Math.PI
/** The same of a sine squared: (asin sqrt 0.9 - asin sqrt 0.1) / pi. */
const HAVERSINE_RISE = (Math.asin(Math.sqrt(0.9)) - Math.asin(Math.sqrt(0.1))) / Math.PI
/** Share of a straight rise from 10 % to 90 %. */
const STRAIGHT_RISE = 0.8

/** Makes a pulse of one level from its start to its end. */
export function makeRectangle(peak: number, start: number, duration: number): Pulse {
  const end = start + duration
  return {
    shape: 'rectangle',
    value: (t) => (t >= start && t < end ? peak : 0),
    rise: 0,
    breaks: [start, end],
  }
}

/** Makes `peak sin(pi t / duration)`. */
export function makeHalfSine(peak: number, start: number, duration: number): Pulse {
  const end = start + duration
  return {
    shape: 'half-sine',
    value: (t) => (t > start && t < end ? peak * Math.sin((Math.PI * (t - start)) / duration) : 0),
    rise: HALF_SINE_RISE * duration,
    breaks: [start, end],
  }
}

/** Makes `peak sin^2(pi t / duration)`, whose slope is zero at both ends. */
export function makeHaversine(peak: number, start: number, duration: number): Pulse {
  const end = start + duration
  return {
    shape: 'haversine',
    value: (t) => (t > start && t < end ? peak * Math.sin((Math.PI * (t - start)) / duration) ** 2 : 0),
    rise: HAVERSINE_RISE * duration,
    breaks: [],
  }
}

/** Makes a level that begins at the start and never ends. */
export function makeStep(peak: number, start: number): Pulse {
  return { shape: 'step', value: (t) => (t >= start ? peak : 0), rise: 0, breaks: [start] }
}

/** Makes a straight rise to a level that never ends. */
export function makeRamp(peak: number, start: number, rise: number): Pulse {
  const value = (t: number) => (t <= start ? 0 : t >= start + rise ? peak : (peak * (t - start)) / rise)
  return { shape: 'ramp', value, rise: STRAIGHT_RISE * rise, breaks: [start, start + rise] }
}

/**
 * Makes a straight rise, a level and a straight fall; a triangle where the level is nothing.
 * @param duration of all three [s], at least rise + fall
 */
export function makeTrapezoid(
  shape: 'triangle' | 'trapezoid',
  peak: number,
  start: number,
  duration: number,
  rise: number,
  fall: number,
): Pulse {
  const end = start + duration
  const value = (t: number): number => {
    if (t < start || t >= end) return 0
    if (t < start + rise) return (peak * (t - start)) / rise
    return t > end - fall ? (peak * (end - t)) / fall : peak
  }
  const level = shape === 'triangle' ? [start + rise] : [start + rise, end - fall]
  const breaks = [...new Set([start, ...level, end])].sort((a, b) => a - b)
  return { shape, value, rise: STRAIGHT_RISE * Math.min(rise, fall), breaks }
}

/**
 * Makes a pulse through rows of time and value, linear between them.
 * @param times [s], rising
 * @param values one per time
 * @param holds true where the last value stays after the last time; else it is zero there
 */
export function makeTable(shape: 'table' | 'file', times: number[], values: number[], holds: boolean): Pulse {
  const count = times.length
  const after = holds ? values[count - 1] : 0
  let last = 0
  const value = (t: number): number => {
    if (t < times[0]) return 0
    if (t >= times[count - 1]) return after
    if (times[last] > t || t >= times[last + 1]) last = rowBefore(times, t)
    return (
      values[last] + ((values[last + 1] - values[last]) * (t - times[last])) / (times[last + 1] - times[last])
    )
  }
  return { shape, value, rise: shortestRise(times, values, after), breaks: times }
}

function rowBefore(times: number[], t: number): number {
  let low = 0
  let high = times.length - 1
  while (high - low > 1) {
    const middle = (low + high) >> 1
    if (times[middle] <= t) low = middle
    else high = middle
  }
  return low
}

/**
 * Estimates the rise of a table: 0 where it begins or ends with a jump, else the time that the
 * steepest row would take for 80 % of the largest value.
 */
function shortestRise(times: number[], values: number[], after: number): number | null {
  let largest = 0
  for (const value of values) largest = Math.max(largest, Math.abs(value))
  if (largest === 0) return null
  const jump = Math.max(Math.abs(values[0]), Math.abs(values[values.length - 1] - after))
  if (jump > 0.1 * largest) return 0
  let steepest = 0
  for (let i = 1; i < times.length; i++) {
    steepest = Math.max(steepest, Math.abs(values[i] - values[i - 1]) / (times[i] - times[i - 1]))
  }
  return steepest === 0 ? 0 : (STRAIGHT_RISE * largest) / steepest
}
