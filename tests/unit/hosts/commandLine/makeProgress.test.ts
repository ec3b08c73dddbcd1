import { expect, test } from 'vitest'
import { makeProgress } from '../../../../src-main/hosts/command-line/makeProgress'
import { makeTestTerminal } from './makeTestTerminal'

const CLEAR = '\r\u001b[2K'

function makeTimed(showsProgress: boolean) {
  const time = { now: 5000 }
  return { time, terminal: makeTestTerminal({ showsProgress, clock: () => time.now }) }
}

test('progress comes after a second, ten times a second at most, and leaves nothing behind', () => {
  const { time, terminal } = makeTimed(true)
  const progress = makeProgress(terminal, false)
  for (let i = 1; i < 100; i++) {
    time.now += 10
    progress.show(i / 400)
  }
  expect(terminal.printed.err).toBe('')
  let shown = 0
  for (let i = 100; i < 400; i++) {
    time.now += 10
    const before = terminal.printed.err
    progress.show(i / 400)
    if (terminal.printed.err !== before) shown++
  }
  expect(shown).toBe(30)
  progress.erase()
  expect(terminal.printed.err.startsWith(`${CLEAR}25 %, about 3 s left`)).toBe(true)
  expect(terminal.printed.err.endsWith(CLEAR)).toBe(true)
  expect(terminal.printed.out).toBe('')
})

test.each([
  [100, 0.5, '2 min'],
  [36_000, 0.1, '90.0 h'],
])('a run of %s s at %s has about %s left', (seconds, share, left) => {
  const { time, terminal } = makeTimed(true)
  const progress = makeProgress(terminal, false)
  time.now += seconds * 1000
  progress.show(share)
  expect(terminal.printed.err).toContain(`about ${left} left`)
})

test.each([
  ['where standard error is no terminal', false, false],
  ['when it is to be quiet', true, true],
])('progress stays silent %s', (_when, showsProgress, quiet) => {
  const { time, terminal } = makeTimed(showsProgress)
  const progress = makeProgress(terminal, quiet)
  time.now += 60_000
  progress.show(0.5)
  progress.erase()
  expect(terminal.printed.err).toBe('')
})
