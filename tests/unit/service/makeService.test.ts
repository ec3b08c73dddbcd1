import { createHash } from 'node:crypto'
import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { BRIDGE_TEXT_LIMIT } from '../../../src-main/contract/bridge'
import { NOTICE } from '../../../src-main/contract/notice'
import { SOFTWARE } from '../../../src-main/contract/software'
import { LIMITS } from '../../../src-main/engine/rig/limits'
import { makeService } from '../../../src-main/service/makeService'
import { PIN_RIG } from './pinRig'

const service = makeService()

describe('makeService', () => {
  it('says what the program is, with the notice', async () => {
    expect(await service.about()).toEqual({ ...SOFTWARE, notice: NOTICE })
  })

  it('solves a rig, with the digest of its text', async () => {
    const text = JSON.stringify(PIN_RIG)
    const answer = await service.solve(text)
    expect(answer).toMatchObject({
      status: 'solved',
      result: { rig: { sha256: createHash('sha256').update(text).digest('hex') } },
    })
  })

  it("solves README's example", async () => {
    const readme = readFileSync(`${import.meta.dirname}/../../../README.md`, 'utf8')
    const example = /```json\n([^]*?)```/.exec(readme)?.[1] ?? ''
    expect(await service.solve(example)).toMatchObject({ status: 'solved' })
  })

  it('hands on every fault of a rig that is refused', async () => {
    const answer = await service.solve(
      JSON.stringify({ ...PIN_RIG, run: { duration: '1 MPa', cell: '0 mm' } }),
    )
    expect(answer.status).toBe('refused')
    const paths = answer.status === 'refused' ? answer.faults.map(({ path }) => path) : []
    expect(paths).toEqual(['run.duration', 'run.cell'])
  })

  it('refuses a record beside the rig, which a page cannot reach', async () => {
    const pulse = { shape: 'file', file: 'blow.csv', columns: { time: 1, value: 2 } }
    const answer = await service.solve(JSON.stringify({ ...PIN_RIG, leftEnd: { kind: 'force', pulse } }))
    expect(answer).toMatchObject({ status: 'refused', faults: [{ code: 'record-refused' }] })
  })

  it("reads whatever the bridge lets through: the bridge's limit is not over the reader's", () => {
    expect(BRIDGE_TEXT_LIMIT).toBeLessThanOrEqual(LIMITS.textBytes)
  })
})
