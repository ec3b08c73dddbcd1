// @vitest-environment jsdom
import { createHash } from 'node:crypto'
import { describe, expect, test } from 'vitest'
import { NOTICE } from '../../../src-main/contract/notice'
import type { Result } from '../../../src-main/contract/result'
import { writeReport } from '../../../src-main/documents/report/writeReport'
import { makeTestResult } from './makeTestResult'

const read = (result: Result, rigText?: string): Document =>
  new DOMParser().parseFromString(writeReport(result, rigText), 'text/html')

const HOSTILE = `"><script>alert(1)</script><img src=x onerror=alert(2)>'&\u202e</title></style></pre>`

/** Puts one hostile text into every text of a result. */
function poison<T>(value: T): T {
  if (typeof value === 'string') return HOSTILE as T
  if (Array.isArray(value)) return value.map((member: unknown) => poison(member)) as T
  if (typeof value !== 'object' || value === null) return value
  return Object.fromEntries(Object.entries(value).map(([key, member]) => [key, poison(member)])) as T
}

describe('a report is one page that stands alone', () => {
  const text = writeReport(makeTestResult(), '{}')
  const page = new DOMParser().parseFromString(text, 'text/html')

  test('it runs nothing and loads nothing', () => {
    expect(page.querySelectorAll('script, link, img, iframe, object, embed, form, base')).toHaveLength(0)
    expect(text).not.toMatch(/https?:|url\(|@import|javascript:|\bon[a-z]+=/i)
    expect(page.querySelectorAll('[style]')).toHaveLength(0)
  })

  test('its policy allows its own style alone', () => {
    const policy = page.querySelector('meta[http-equiv="Content-Security-Policy"]')!.getAttribute('content')!
    const style = page.querySelector('style')!.textContent
    const hash = createHash('sha256').update(style, 'utf8').digest('base64')
    expect(policy).toBe(`default-src 'none'; style-src 'sha256-${hash}'; base-uri 'none'; form-action 'none'`)
  })

  test('the notice stands at its top and at its bottom', () => {
    const notices = [...page.querySelectorAll('.notice')].map((notice) => notice.textContent)
    expect(notices).toEqual([NOTICE, NOTICE])
  })

  test('every part has its heading', () => {
    expect([...page.querySelectorAll('h2')].map((heading) => heading.textContent)).toEqual([
      'Striker',
      'Cautions',
      'Peaks and margins of the sections',
      'Envelope',
      'Stress over place and time',
      'Fatigue',
      'Spall',
      'The two methods compared',
      'The line',
      'Steps and joints',
      'Tapers',
      'Gauges',
      'Joints',
      'Ends',
      'Bars at the end of the run',
      'Energy and momentum',
      'The run',
      'The rig file',
    ])
    expect(page.querySelectorAll('svg.picture')).toHaveLength(5)
    expect(text).not.toMatch(/NaN|undefined|Infinity|\[object/)
  })

  test('pictures have no coordinates that are not numbers, and stay within bounds', () => {
    for (const path of page.querySelectorAll('svg path')) {
      expect(path.getAttribute('d')).toMatch(/^([MLHVhvlz][-0-9. ]*)*$/)
    }
  })
})

test('the comparison of the methods says what it means, and which of them the page shows', () => {
  const text = read(makeTestResult()).querySelector('main')!.textContent
  expect(text).toContain('method: characteristics, compared with elements')
  expect(text).toContain(
    'The envelopes differ by up to 1.2 % of the largest stress. All other parts of this page show the characteristics.',
  )
  expect(text).toContain('1.230 % of the largest stress')
  expect(text).toContain('3.400 %0.5600 %')
})

test('spalls and pieces stand with their places', () => {
  const text = read(makeTestResult()).querySelector('main')!.textContent
  expect(text).toContain('came apart at [mm]time [µs]tension [MPa]')
  expect(text).toContain('shaft1100310.01500')
  expect(text).toContain('shaft11001200100.00.55007.400')
})

describe('the governing margin', () => {
  test('a negative one is inverted and said in words', () => {
    const result = makeTestResult()
    result.governing!.margin = -0.1231
    result.sections[1].compression.margin = -0.1231
    const page = read(result)
    const block = page.querySelector('.governing.negative')!
    expect(block.querySelector('.margin')!.textContent).toBe('−0.1231')
    expect(block.textContent).toContain('NEGATIVE MARGIN')
    expect(block.textContent).toContain('shaft, section 1, compression')
    expect(page.querySelectorAll('tr.alarm')).toHaveLength(1)
    expect(page.querySelector('tr.alarm')!.textContent).toContain('NEGATIVE: over the limit, governing')
  })

  test('a positive one is neither', () => {
    const page = read(makeTestResult())
    expect(page.querySelector('.negative, .alarm')).toBeNull()
    expect(page.querySelector('main')!.textContent).not.toContain('NEGATIVE')
  })

  test('its absence is said in words', () => {
    expect(read({ ...makeTestResult(), governing: null }).querySelector('.governing')!.textContent).toContain(
      'No margin: no section has both a stress and an allowable.',
    )
  })
})

test('a hostile text in every field is shown and never becomes markup', () => {
  const result = { ...poison(makeTestResult()), method: 'characteristics' as const }
  const page = read(result, HOSTILE)
  expect(page.querySelectorAll('script, img')).toHaveLength(0)
  for (const element of page.querySelectorAll('*')) {
    for (const { name } of element.attributes) expect(name).not.toMatch(/^on/)
  }
  expect(page.querySelector('h1')!.textContent).toBe(HOSTILE.replace('\u202e', '\uFFFD'))
  expect(page.querySelectorAll('style, title, pre')).toHaveLength(3)
})

test('a run without gauges, tapers, joints, field and striker still makes a whole report', () => {
  const result: Result = {
    ...makeTestResult(),
    gauges: [],
    tapers: [],
    joints: [],
    interfaces: [],
    wavefronts: [],
    field: { x: [], t: [], stress: [] },
    striker: null,
    cautions: [],
    spalls: [],
    fragments: [],
    comparison: null,
  }
  const page = read(result)
  expect(page.querySelector('main')!.textContent).toContain('The run recorded no field.')
  expect(page.querySelector('main')!.textContent).not.toMatch(/Spall|methods compared/)
  expect(page.querySelector('main')!.textContent).not.toMatch(/NaN|undefined/)
})
