import { resolve } from 'node:path'
import { describe, expect, it } from 'vitest'
import { makeRigSchema } from '../../../../../src-main/engine/rig/form/makeRigSchema'

const PUBLISHED = resolve(import.meta.dirname, '../../../../../src-main/contract/rig.schema.json')

type Schema = Record<string, unknown>

/** Every schema of a key, with its path. */
function propertiesOf(schema: unknown, path = ''): [string, Schema][] {
  if (typeof schema !== 'object' || schema === null) return []
  return Object.entries(schema).flatMap(([key, value]: [string, unknown]) => {
    const own =
      key === 'properties'
        ? Object.entries(value as Record<string, Schema>).map(([name, it]): [string, Schema] => [
            `${path}.${name}`,
            it,
          ])
        : []
    return [...own, ...propertiesOf(value, key === 'properties' ? path : `${path}.${key}`)]
  })
}

describe('makeRigSchema', () => {
  // `npx vitest run tests/unit/engine/rig/form -u` writes the file anew
  it('is what the published file holds', async () => {
    await expect(`${JSON.stringify(makeRigSchema(), null, 2)}\n`).toMatchFileSnapshot(PUBLISHED)
  })

  it('describes every key but the words that choose a kind', () => {
    const silent = propertiesOf(makeRigSchema()).filter(([path, it]) => {
      const chooses = /\.(kind|shape|spread)$/.test(path)
      return !chooses && it.description === undefined && it.$ref === undefined
    })
    expect(silent.map(([path]) => path)).toEqual([])
  })

  it('refuses keys that it does not know, at every object', () => {
    const text = JSON.stringify(makeRigSchema())
    const objects = text.match(/"properties":/g)?.length ?? 0
    expect(objects).toBeGreaterThan(30)
    expect(text.match(/"additionalProperties":false/g)?.length).toBe(objects)
  })
})
