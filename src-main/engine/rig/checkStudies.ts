import type { FaultText } from './faultText'
import { faultText } from './faultText'
import type { Loose } from './form/loose'
import type { RigForm } from './form/rigForm'
import { describeDimension, isSameDimension } from './formula/dimension'
import { nearestName } from './nearestName'
import type { Place } from './place'
import type { Reading } from './reading'
import { didYouMean, listKnown } from './texts/nameHint'

/**
 * Checks that the studies of a rig speak of its variables, in their dimensions.
 * @param reading gets `formula-unknown-name`, `wrong-dimension`, `conflict`, `missing` and the faults of formulas
 * @param studies undefined where there are none
 */
export function checkStudies(reading: Reading, studies: Loose<RigForm>['studies']): void {
  studies?.forEach((study, i) => {
    const place: Place = ['studies', i]
    switch (study?.kind) {
      case 'sweep':
        checkRange(reading, place, study.variable, study)
        if (study.second) checkRange(reading, [...place, 'second'], study.second.variable, study.second)
        break
      case 'seek':
        checkVariable(reading, [...place, 'variable'], study.variable)
        study.between?.forEach((value, k) =>
          checkValue(reading, [...place, 'between', k], study.variable, value),
        )
        break
      case 'tolerance':
      case 'tune':
        for (const [name, spread] of Object.entries(study.variables ?? {})) {
          const at: Place = [...place, 'variables', name]
          checkVariable(reading, at, name)
          for (const key of ['from', 'to', 'deviation', 'half']) {
            checkValue(reading, [...at, key], name, (spread as Record<string, unknown> | undefined)?.[key])
          }
        }
        if (study.kind === 'tune') checkGoal(reading, place, study)
        break
      case undefined:
    }
  })
}

function checkRange(
  reading: Reading,
  place: Place,
  name: string | undefined,
  form: { from?: unknown; to?: unknown },
): void {
  checkVariable(reading, [...place, 'variable'], name)
  checkValue(reading, [...place, 'from'], name, form.from)
  checkValue(reading, [...place, 'to'], name, form.to)
}

function checkVariable(reading: Reading, place: Place, name: string | undefined): void {
  if (name === undefined || reading.variables.has(name)) return
  const known = [...reading.variables.keys()]
  const nearest = nearestName(name, known)
  const hint = nearest ? didYouMean(nearest) : listKnown(known)
  reading.faults.add(place, faultText.formulaUnknownName(name, hint))
}

function checkValue(reading: Reading, place: Place, name: string | undefined, value: unknown): void {
  const variable = name === undefined ? null : reading.variables.get(name)
  if (!variable || (typeof value !== 'string' && typeof value !== 'number')) return
  const fault = faultOf(reading, String(value), variable.dimension)
  if (fault) reading.faults.add(place, fault)
}

function faultOf(reading: Reading, text: string, dimension: readonly number[]): FaultText | null {
  const read = reading.formula(text, 'none')
  if (read.formula === null) return read.text
  const got = read.formula.dimension
  if (isSameDimension(got, dimension)) return null
  return faultText.mixedDimensions(`expected ${describeDimension(dimension)}, got ${describeDimension(got)}`)
}

function checkGoal(reading: Reading, place: Place, study: { minimise?: string; maximise?: string }): void {
  const given = ['minimise', 'maximise'].filter((key) => Object.hasOwn(study, key))
  if (given.length === 1) return
  const at = given.length === 0 ? [...place, 'minimise'] : place
  reading.faults.add(at, faultText.oneOf(['minimise', 'maximise'], given.length))
}
