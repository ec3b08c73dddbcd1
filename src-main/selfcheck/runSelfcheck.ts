import { type Bench, makeBench } from './bench'
import type { Check } from './check'
import { CHECKS } from './checks'

/** One value beside its computed one. */
export interface CheckedValue {
  what: string
  published: number
  computed: number
  /** |computed - published| over the value's scale [1]; NaN where nothing was computed. */
  error: number
}

/** What a check has found; `published`, `computed` and `error` are those of its worst value. */
export interface CheckOutcome extends CheckedValue {
  id: string
  title: string
  section: number
  source: string
  tolerance: number
  reason: string
  passed: boolean
  values: CheckedValue[]
}

/**
 * Runs published checks through the engine of this program, one by one, so that a host can stop between two.
 *
 * @param checks the whole list where left out
 * @param bench what runs their rigs; the engine as it is where left out
 * @returns yields what each check has found, in the order of the list
 */
export function* runSelfcheck(
  checks: readonly Check[] = CHECKS,
  bench: Bench = makeBench(),
): Generator<CheckOutcome, void, void> {
  for (const check of checks) yield evaluateCheck(check, bench)
}

function evaluateCheck({ compute, values, ...about }: Check, bench: Bench): CheckOutcome {
  const computed = compute(bench)
  if (computed.length !== values.length) {
    throw new Error(`check ${about.id} computes ${computed.length} numbers for ${values.length} values`)
  }
  const checked = values.map(({ what, published, scale = Math.abs(published) }, i) => ({
    what,
    published,
    computed: computed[i],
    error: Math.abs(computed[i] - published) / scale,
  }))
  // A number that is none is the worst there is.
  const badness = ({ error }: CheckedValue) => (Number.isNaN(error) ? Infinity : error)
  const worst = checked.reduce((one, other) => (badness(other) > badness(one) ? other : one))
  const { id, title, section, source, tolerance, reason } = about
  return {
    id,
    title,
    section,
    source,
    tolerance,
    reason,
    ...worst,
    passed: worst.error <= tolerance,
    values: checked,
  }
}
