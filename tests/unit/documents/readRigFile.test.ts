import { createHash } from 'node:crypto'
import { execFileSync } from 'node:child_process'
import {
  mkdirSync,
  mkdtempSync,
  realpathSync,
  rmSync,
  symlinkSync,
  truncateSync,
  writeFileSync,
} from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterEach, beforeEach, describe, expect, test } from 'vitest'
import { makeRecordReader } from '../../../src-main/documents/makeRecordReader'
import { readRigFile } from '../../../src-main/documents/readRigFile'
import { LIMITS } from '../../../src-main/engine/rig/limits'

let folder: string
let rig: string

beforeEach(() => {
  folder = mkdtempSync(join(realpathSync(tmpdir()), 'rig-'))
  rig = join(folder, 'a.rig.json')
})
afterEach(() => {
  rmSync(folder, { recursive: true, force: true })
})

const readFault = (path: string): { code: string; path: string; message: string } => {
  const read = readRigFile(path)
  if (!('faults' in read)) throw new Error('it was read')
  expect(read.faults).toHaveLength(1)
  return read.faults[0]
}

describe('a rig file', () => {
  test('is read with the digest of its bytes', () => {
    const bytes = Buffer.from('\uFEFF{ "title": "Stößel Ø 20" }')
    writeFileSync(rig, bytes)
    const read = readRigFile(rig)
    expect('file' in read && read.file.text).toBe(bytes.toString('utf8'))
    expect('file' in read && read.file.sha256).toBe(createHash('sha256').update(bytes).digest('hex'))
  })

  test('that is missing, a folder or no text is refused as a whole', () => {
    expect(readFault(rig)).toEqual({
      code: 'not-readable',
      path: '',
      message: 'cannot be read: there is no such file or folder',
    })
    expect(readFault(folder).message).toBe('cannot be read: it is a folder, not a file')
    expect(readFault(join(rig, 'x')).message).toContain('no such file')
    expect(readFault('a\0b').message).toContain('no file name may hold')
    writeFileSync(rig, Buffer.from([0x7b, 0xff, 0x7d]))
    expect(readFault(rig).message).toContain('not UTF-8 text')
    writeFileSync(rig, Buffer.from('{}', 'utf16le').subarray(0, 3))
    writeFileSync(rig, Buffer.concat([Buffer.from([0xff, 0xfe]), Buffer.from('{}', 'utf16le')]))
    expect(readFault(rig).message).toContain('not UTF-8 text')
  })

  test('over the limit is refused by its size, before it is read', () => {
    writeFileSync(rig, '{}')
    truncateSync(rig, 64 * 1024 ** 3)
    const fault = readFault(rig)
    expect(fault.code).toBe('too-large')
    expect(fault.message).toContain('at most 20 MB')
    truncateSync(rig, LIMITS.textBytes + 1)
    expect(readFault(rig).code).toBe('too-large')
    truncateSync(rig, LIMITS.textBytes)
    expect('file' in readRigFile(rig)).toBe(true)
  })

  test.skipIf(process.platform === 'win32')('that is a pipe or a device is refused at once', () => {
    execFileSync('mkfifo', [rig])
    expect(readFault(rig).message).toContain('a device')
    expect(readFault('/dev/zero').message).toContain('a device')
  })
})

describe('a record beside a rig', () => {
  beforeEach(() => {
    mkdirSync(join(folder, 'rigs', 'records'), { recursive: true })
    writeFileSync(join(folder, 'rigs', 'records', 'hit.csv'), 't [s],F [N]\n0,1\n')
    writeFileSync(join(folder, 'secret.csv'), 'secret')
  })
  const read = (path: string): string | { refused: string } =>
    makeRecordReader(join(folder, 'rigs', 'a.rig.json'))(path)

  test('is read by its path within the folder', () => {
    expect(read('records/hit.csv')).toBe('t [s],F [N]\n0,1\n')
    expect(read('./records/../records/hit.csv')).toBe('t [s],F [N]\n0,1\n')
  })

  test('outside the folder is refused', () => {
    expect(read('../secret.csv')).toEqual({ refused: 'it lies outside the folder of the rig' })
    expect(read('records/../../secret.csv')).toEqual({ refused: 'it lies outside the folder of the rig' })
    expect(read(join(folder, 'secret.csv'))).toEqual({
      refused: 'it does not begin in the folder of the rig',
    })
    expect(read('..')).toEqual({ refused: 'it lies outside the folder of the rig' })
    expect(read('.')).toEqual({ refused: 'it lies outside the folder of the rig' })
  })

  test.skipIf(process.platform === 'win32')('reached outside through a link is refused', () => {
    symlinkSync(join(folder, 'secret.csv'), join(folder, 'rigs', 'link.csv'))
    symlinkSync(folder, join(folder, 'rigs', 'up'))
    expect(read('link.csv')).toEqual({ refused: 'it lies outside the folder of the rig' })
    expect(read('up/secret.csv')).toEqual({ refused: 'it lies outside the folder of the rig' })
    symlinkSync(join(folder, 'rigs', 'records', 'hit.csv'), join(folder, 'rigs', 'inside.csv'))
    expect(read('inside.csv')).toBe('t [s],F [N]\n0,1\n')
  })

  test('that is missing, a folder, too large or no text is refused', () => {
    expect(read('none.csv')).toEqual({ refused: 'there is no such file or folder' })
    expect(read('records')).toEqual({ refused: 'it is a folder, not a file' })
    writeFileSync(join(folder, 'rigs', 'latin.csv'), Buffer.from([0xb5, 0x73]))
    expect(read('latin.csv')).toEqual({ refused: 'it is not UTF-8 text; save it as UTF-8' })
    writeFileSync(join(folder, 'rigs', 'large.csv'), '')
    truncateSync(join(folder, 'rigs', 'large.csv'), LIMITS.recordBytes + 1)
    expect(read('large.csv')).toEqual({ refused: 'it has 100 MB; at most 100 MB are read' })
  })
})
