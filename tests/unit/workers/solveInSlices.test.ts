import { describe, expect, it } from 'vitest'
import type { Result } from '../../../src-main/contract/result'
import type { Rig } from '../../../src-main/contract/rig'
import { SOFTWARE } from '../../../src-main/contract/software'
import { readRig } from '../../../src-main/engine/rig/readRig'
import { makeSolve, type Solution } from '../../../src-main/engine/solveRig'
import { solveInSlices, type SliceOptions } from '../../../src-main/workers/solveInSlices'
import { PIN_RIG } from './pinRig'

function makeRig(changes: object = {}): Rig {
  const { rig, faults } = readRig(JSON.stringify({ ...PIN_RIG, ...changes }))
  if (rig === null) throw new Error(JSON.stringify(faults))
  return rig
}

async function solve(rig: Rig, options?: SliceOptions): Promise<Result> {
  const outcome = await solveInSlices(rig, 'abc', options)
  if (!('result' in outcome)) throw new Error(JSON.stringify(outcome))
  return outcome.result
}

function pickNumbers(solution: Solution): Partial<Solution> {
  const { envelope, gauges, joints, ends, energy, momentum, field } = solution
  return { envelope, gauges, joints, ends, energy, momentum, field }
}

describe('solveInSlices', () => {
  it('adds the digest, the version and the time it took', async () => {
    const result = await solve(makeRig())
    expect(result.rig).toEqual({ title: PIN_RIG.title, sha256: 'abc' })
    expect(result.software).toEqual(SOFTWARE)
    expect(result.run.solveTime).toBeGreaterThan(0)
    expect(result.run.solveTime).toBeLessThan(30)
  })

  it('gives the same numbers in slices as in one go', async () => {
    const whole = makeSolve(makeRig())
    whole.advance(whole.steps)
    expect(await solve(makeRig())).toMatchObject(pickNumbers(whole.finish()))
  })

  it('tells its progress up to the last step', async () => {
    const seen: number[] = []
    let last = 0
    await solve(makeRig(), {
      onProgress: (step, steps) => {
        seen.push(step)
        last = steps
      },
    })
    expect(seen.at(-1)).toBe(last)
    expect(seen).toEqual([...seen].sort((a, b) => a - b))
  })

  it('lets its process do other things meanwhile, and ends when it is told to', async () => {
    const rig = makeRig({ run: { duration: '1 s', cell: '2 mm' } })
    const stop = new AbortController()
    setTimeout(() => stop.abort(new Error('told to')), 100)
    const start = performance.now()
    await expect(solveInSlices(rig, '', { signal: stop.signal })).rejects.toThrow('told to')
    expect(performance.now() - start).toBeLessThan(3000)
  })
})
