import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { readRig } from '../../../../../src-main/engine/rig/readRig'
import { makeSolve } from '../../../../../src-main/engine/solveRig'

const samples = new URL('../../../../../samples/', import.meta.url)

function solve(name: string) {
  const { rig } = readRig(readFileSync(new URL(`${name}/${name}.rig.json`, samples), 'utf8'))
  const march = makeSolve(rig!, { field: true })
  march.advance(march.steps)
  return { solution: march.finish(), field: march.field! }
}

describe('a part of a profile', () => {
  it.each(['drop-hammer-shaft', 'gas-gun-striker'])(
    'reads, one place at a time, every peak of %s as the record has it',
    (name) => {
      const { solution, field } = solve(name)
      const inside = 1e-7 * solution.line.length
      let read = 0
      for (const { from, to, tension, compression } of solution.sections) {
        // Inside a taper the field keeps a sample of every second step: there a peak is read within 1 %.
        const isTaper = solution.tapers.some((taper) => from < taper.to && to > taper.from)
        for (const { peak, at, time } of [tension, compression]) {
          if (peak === 0) continue
          const x = Math.min(Math.max(at, from + inside), to - inside)
          const { stress } = field.readProfile(time, 1, { fromX: x - 1e-9, toX: x + 1e-9 })
          expect(Math.abs(stress[0] - peak)).toBeLessThan((isTaper ? 1e-2 : 1e-9) * Math.abs(peak))
          read++
        }
      }
      expect(read).toBeGreaterThan(5)
    },
  )

  it('is as the whole where they meet, and nothing beside the line', () => {
    const { field, solution } = solve('drop-hammer-shaft')
    const whole = field.readProfile(4e-4, 700)
    const part = field.readProfile(4e-4, 100, { fromX: 0.2, toX: 0.4 })
    expect(part.x[50]).toBeCloseTo(whole.x[150], 12)
    expect(Array.from(part.force.subarray(0, 99))).toEqual(Array.from(whole.force.subarray(100, 199)))
    const { length } = solution.line
    const beside = field.readProfile(4e-4, 4, { fromX: -length, toX: 3 * length })
    expect(Array.from(beside.stress, Number.isFinite)).toEqual([false, true, false, false])
  })
})
