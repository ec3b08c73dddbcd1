import { describe, expect, it } from 'vitest'
import { makeBlocks } from '../../../../src-main/engine/characteristics/block'
import { makeLine } from '../../../../src-main/engine/line/makeLine'
import { makeBar, makePulse, makeRig, makeSection } from '../testRig'

const CELL = 0.005
const straight = (cells: number, area = 1e-3) => makeSection(cells * CELL, area)
const taper = (cells: number) => makeSection(cells * CELL, (s) => 1e-3 * (1 + s))

const line = makeLine(
  makeRig(
    [
      makeBar('first', [straight(8), straight(7), taper(20), straight(3, 2e-3), straight(9)]),
      makeBar('second', [taper(5), straight(2)]),
      makeBar('third', [straight(7), straight(30)]),
    ],
    { duration: 1e-5, timeStep: 1e-6 },
    { loads: [{ bar: 2, at: 17 * CELL, pulse: makePulse(() => 0) }] },
  ),
)
const isPlain = (node: number) => line.nodes[node].kind === 'step' && line.nodes[node].loads.length === 0

describe('the blocks of a line', () => {
  it('are delay lines for straight sections of eight cells and more, and runs of the rest inside each bar', () => {
    const blocks = makeBlocks(line.spans, isPlain, () => false)
    expect(
      blocks.map(({ kind, bar, firstSpan, lastSpan, cells }) => [kind, bar, firstSpan, lastSpan, cells]),
    ).toEqual([
      ['delay', 0, 0, 0, 8],
      ['graded', 0, 1, 3, 30],
      ['delay', 0, 4, 4, 9],
      ['graded', 1, 5, 6, 7],
      ['graded', 2, 7, 7, 7],
      ['delay', 2, 8, 8, 10],
      ['delay', 2, 9, 9, 20],
    ])
    // They cover the line without a gap, each from a node of its own to the next.
    blocks.forEach(({ rightNode, firstSpan, lastSpan }, i) =>
      expect([firstSpan, rightNode]).toEqual([i === 0 ? 0 : blocks[i - 1].rightNode, lastSpan + 1]),
    )
    expect(blocks[1].spanStart).toEqual([0, 7, 27, 30])
    expect([...blocks[1].impedance]).toEqual([1, 2, 3].flatMap((span) => [...line.spans[span].impedance]))
    expect([...blocks[2].impedance]).toEqual([line.spans[4].impedance[0]])
  })

  it('hold no delay line where a bar may come apart', () => {
    const blocks = makeBlocks(line.spans, isPlain, ({ bar }) => bar === 0)
    expect(blocks.map(({ kind, firstSpan, lastSpan }) => [kind, firstSpan, lastSpan]).slice(0, 2)).toEqual([
      ['graded', 0, 4],
      ['graded', 5, 6],
    ])
  })
})
