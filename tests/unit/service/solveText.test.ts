import { createHash } from 'node:crypto'
import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { BRIDGE_TEXT_LIMIT } from '../../../src-main/contract/bridge'
import type { Result } from '../../../src-main/contract/result'
import { SOFTWARE } from '../../../src-main/contract/software'
import { LIMITS } from '../../../src-main/engine/rig/limits'
import { readRig } from '../../../src-main/engine/rig/readRig'
import { makeSolve, type Solution } from '../../../src-main/engine/solveRig'
import { makeService } from '../../../src-main/service/makeService'
import { solveText, type SolveTextOptions } from '../../../src-main/service/solveText'
import { PIN_RIG } from './pinRig'

const text = JSON.stringify(PIN_RIG)

async function solved(given: string, options?: SolveTextOptions): Promise<Result> {
  const outcome = await solveText(given, options)
  if (outcome.status !== 'solved') throw new Error(JSON.stringify(outcome))
  return outcome.result
}

function pickNumbers(solution: Solution): Partial<Solution> {
  const { envelope, gauges, joints, ends, energy, momentum, field } = solution
  return { envelope, gauges, joints, ends, energy, momentum, field }
}

describe('solveText', () => {
  it('gives the result with the digest of the file, the version, and the time it took', async () => {
    const result = await solved(text)
    expect(result.rig).toEqual({
      title: PIN_RIG.title,
      sha256: createHash('sha256').update(text).digest('hex'),
    })
    expect(result.software).toEqual(SOFTWARE)
    expect(result.run.solveTime).toBeGreaterThan(0)
    expect(result.energy.closure).toBeLessThan(1e-12)
  })

  it('gives the same numbers in slices as in one go', async () => {
    const { rig } = readRig(text)
    if (rig === null) throw new Error('the rig was refused')
    const whole = makeSolve(rig)
    whole.advance(whole.steps)
    expect(await solved(text)).toMatchObject(pickNumbers(whole.finish()))
  })

  it('tells its progress up to the last step', async () => {
    const seen: number[] = []
    let last = 0
    await solved(text, {
      onProgress: (step, steps) => {
        seen.push(step)
        last = steps
      },
    })
    expect(seen.at(-1)).toBe(last)
    expect(seen).toEqual([...seen].sort((a, b) => a - b))
  })

  it('lets its process do other things meanwhile, and stops when it is told to', async () => {
    const long = JSON.stringify({ ...PIN_RIG, run: { duration: '1 s', cell: '2 mm' } })
    let stopped = false
    setTimeout(() => (stopped = true), 100)
    const start = performance.now()
    expect(await solveText(long, { isStopped: () => stopped })).toEqual({ status: 'stopped' })
    expect(performance.now() - start).toBeLessThan(3000)
  })

  it('hands on every fault of a rig that is refused', async () => {
    const outcome = await solveText(JSON.stringify({ ...PIN_RIG, run: { duration: '1 MPa', cell: '0 mm' } }))
    expect(outcome.status).toBe('refused')
    const paths = outcome.status === 'refused' ? outcome.faults.map(({ path }) => path) : []
    expect(paths).toEqual(['run.duration', 'run.cell'])
  })

  it("reads whatever the bridge lets through: the bridge's limit is not over the reader's", () => {
    expect(BRIDGE_TEXT_LIMIT).toBeLessThanOrEqual(LIMITS.textBytes)
  })
})

describe('makeService', () => {
  it('refuses a record beside the rig, which a page cannot reach', async () => {
    const pulse = { shape: 'file', file: 'blow.csv', columns: { time: 1, value: 2 } }
    const rig = { ...PIN_RIG, leftEnd: { kind: 'force', pulse } }
    const answer = await makeService().solve(JSON.stringify(rig))
    expect(answer).toMatchObject({ status: 'refused', faults: [{ code: 'record-refused' }] })
  })

  it("solves README's example", async () => {
    const readme = readFileSync(`${import.meta.dirname}/../../../README.md`, 'utf8')
    const example = /```json\n([^]*?)```/.exec(readme)?.[1] ?? ''
    expect(await makeService().solve(example)).toMatchObject({ status: 'solved' })
  })
})
