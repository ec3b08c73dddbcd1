import { createHash } from 'node:crypto'
import { readdirSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import { afterAll, describe, expect, it } from 'vitest'
import type { SolveAnswer, SolveRequest } from '../../../src-main/contract/bridge'
import { BRIDGE_TEXT_LIMIT } from '../../../src-main/contract/bridgeCall'
import { NOTICE } from '../../../src-main/contract/notice'
import { SOFTWARE } from '../../../src-main/contract/software'
import { LIMITS } from '../../../src-main/engine/rig/limits'
import { makeService } from '../../../src-main/service/makeService'
import { PIN_RIG } from '../workers/pinRig'

const samplesFolder = join(import.meta.dirname, '../../../samples')
const service = makeService({ samplesFolder })
afterAll(() => service.close())

const ask = (rig: object | string, more: Partial<SolveRequest> = {}): SolveRequest => ({
  slot: 'sheet',
  text: typeof rig === 'string' ? rig : JSON.stringify(rig),
  name: 'made.rig.json',
  coarse: false,
  ...more,
})
/** A run of several seconds. */
const LONG_RIG = { ...PIN_RIG, run: { duration: '1 s', cell: '2 mm' } }

function solved(answer: SolveAnswer): Extract<SolveAnswer, { status: 'solved' }> {
  if (answer.status !== 'solved') throw new Error(JSON.stringify(answer))
  return answer
}

describe('makeService', () => {
  it('says what the program is, with the notice', async () => {
    expect(await service.about()).toEqual({ ...SOFTWARE, notice: NOTICE })
  })

  it('solves a rig in a worker: the digest of its text, long lists as arrays, the line to scale', async () => {
    const request = ask({ ...PIN_RIG, gauges: [{ name: 'G1', bar: 'pin', at: '100 mm' }] })
    const { result, line } = solved(await service.solve(request))
    expect(result.rig.sha256).toBe(createHash('sha256').update(request.text).digest('hex'))
    expect(result.gauges[0].stress).toBeInstanceOf(Float64Array)
    expect(result.gauges[0].stress).toHaveLength(result.run.steps + 1)
    expect(result.gauges[0].bridge).toHaveLength(0)
    expect(result.envelope.tension).toBeInstanceOf(Float64Array)
    expect(result.energy.t).toBeInstanceOf(Float64Array)
    expect(result.field).toEqual({ x: [], t: [], stress: [] })
    expect(line.bars[0].sections.map(({ from, to }) => [from, to])).toEqual([
      [0, 0.24],
      [0.24, 0.4],
    ])
    expect(line.gauges).toEqual([{ name: 'G1', x: 0.1, path: 'gauges[0]' }])
  })

  it("solves README's example", async () => {
    const readme = readFileSync(join(samplesFolder, '../README.md'), 'utf8')
    const example = /```json\n([^]*?)```/.exec(readme)?.[1] ?? ''
    expect(await service.solve(ask(example))).toMatchObject({ status: 'solved' })
  })

  it('hands on every fault of a rig that is refused', async () => {
    const answer = await service.solve(ask({ ...PIN_RIG, run: { duration: '1 MPa', cell: '0 mm' } }))
    expect(answer.status).toBe('refused')
    const paths = answer.status === 'refused' ? answer.faults.map(({ path }) => path) : []
    expect(paths).toEqual(['run.duration', 'run.cell'])
  })

  it('refuses a record beside a rig that lies nowhere', async () => {
    const pulse = { shape: 'file', file: 'blow.csv', columns: { time: 1, value: 2 } }
    const answer = await service.solve(ask({ ...PIN_RIG, leftEnd: { kind: 'force', pulse } }))
    expect(answer).toMatchObject({ status: 'refused', faults: [{ code: 'record-refused' }] })
  })

  it('takes another method than the one of the file', async () => {
    expect(solved(await service.solve(ask(PIN_RIG, { method: 'elements' }))).result.method).toBe('elements')
    const both = solved(await service.solve(ask(PIN_RIG, { method: 'both' })))
    expect(both.result.comparison).not.toBeNull()
  })

  it("reads whatever the bridge lets through: the bridge's limit is not over the reader's", () => {
    expect(BRIDGE_TEXT_LIMIT).toBeLessThanOrEqual(LIMITS.textBytes)
  })
})

describe('samples', () => {
  const folders = readdirSync(samplesFolder, { withFileTypes: true }).filter((entry) => entry.isDirectory())

  it('are all listed, each with its title and its question', async () => {
    const samples = await service.listSamples()
    expect(samples.map(({ id }) => id).sort()).toEqual(folders.map(({ name }) => name).sort())
    for (const { title, about } of samples) {
      expect(title).toMatch(/\w+ \w+/)
      expect(about).toMatch(/\?$|\?/)
    }
  })

  it('are read and solved, with the records beside them', async () => {
    for (const { id } of await service.listSamples()) {
      const { text, name, place } = await service.readSample(id)
      const answer = await service.solve(ask(text, { name, place, coarse: true }))
      expect(answer.status, id).toBe('solved')
    }
  })

  it.each(['../secret', 'nothing', '', '.', 'drop-hammer-shaft/x'])('has none called %j', async (id) => {
    await expect(service.readSample(id)).rejects.toThrow(/sample/)
  })
})

describe('a run that is kept', () => {
  it('is looked into: field, profile and report', async () => {
    const { result } = solved(await service.solve(ask(PIN_RIG, { slot: 'kept' })))
    const window = { fromX: 0, toX: result.line.length, fromT: 0, toT: result.run.duration }
    const field = await service.readField({
      slot: 'kept',
      quantity: 'stress',
      ...window,
      columns: 1,
      rows: 1,
    })
    // The whole run in one pixel shows the peaks of the table, in single precision.
    expect(field[0]).toBe(Math.fround(Math.min(...result.envelope.compression)))
    expect(field[1]).toBe(Math.fround(Math.max(...result.envelope.tension)))
    const profile = await service.readProfile({ slot: 'kept', t: 0.1e-3, columns: 50 })
    expect(profile.stress).toHaveLength(50)
    expect(await service.report('kept')).toContain(PIN_RIG.title)
  })

  it('stays while the next one is solved, and when that one is refused', async () => {
    const window = { fromX: 0, toX: 0.4, fromT: 0, toT: 1e-4, columns: 4, rows: 4 }
    const read = () => service.readField({ slot: 'kept', quantity: 'force', ...window })
    await service.solve(ask(PIN_RIG, { slot: 'kept' }))
    const before = await read()
    const next = service.solve(ask(LONG_RIG, { slot: 'kept' }))
    expect(await read()).toEqual(before)
    await service.stop('kept')
    expect(await next).toEqual({ status: 'stopped' })
    expect(await service.solve(ask('{}', { slot: 'kept' }))).toMatchObject({ status: 'refused' })
    expect(await read()).toEqual(before)
  })

  it('is told apart by its slot, and missed in words', async () => {
    await expect(service.report('never')).rejects.toThrow('No run is kept')
  })

  it('is let go when many others are solved after it', async () => {
    for (let i = 0; i < 8; i++) await service.solve(ask(PIN_RIG, { slot: `many ${i}`, coarse: true }))
    await expect(service.report('many 0')).rejects.toThrow('No run is kept')
    expect(await service.report('many 7')).toContain('<html')
  })
})

describe('a solve under way', () => {
  it('tells how far it is and how long it will take, and is stopped within 100 ms', async () => {
    const answer = service.solve(ask(LONG_RIG, { slot: 'long' }))
    await expect
      .poll(() => service.progress('long'), { timeout: 5000 })
      .toMatchObject({
        done: expect.any(Number) as number,
        left: expect.any(Number) as number,
      })
    const start = performance.now()
    await service.stop('long')
    expect(await answer).toEqual({ status: 'stopped' })
    // Twice the promise, since other tests share the machine's cores.
    expect(performance.now() - start).toBeLessThan(200)
    expect(await service.progress('long')).toBeNull()
  })

  it('is stopped by a later one in its slot, of which the last alone is carried out', async () => {
    const slot = 'overtaken'
    const answers = [
      service.solve(ask(LONG_RIG, { slot })),
      service.solve(ask(LONG_RIG, { slot })),
      service.solve(ask(PIN_RIG, { slot })),
    ]
    expect((await Promise.all(answers)).map(({ status }) => status)).toEqual(['stopped', 'stopped', 'solved'])
  })

  it('does not stop one in another slot', async () => {
    const long = service.solve(ask({ ...PIN_RIG, run: { duration: '50 ms', cell: '2 mm' } }, { slot: 'one' }))
    expect(await service.solve(ask(PIN_RIG, { slot: 'other' }))).toMatchObject({ status: 'solved' })
    expect(await long).toMatchObject({ status: 'solved' })
  })
})
