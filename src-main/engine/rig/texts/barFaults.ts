import { quote, showLength, showNumber, showValue } from '../showValue'
import type { FaultText } from './faultShape'
import { didYouMean, listKnown } from './nameHint'

/** Why materials, bars and places on them are refused. */
export const barFaults = {
  unknownMaterial: (name: string, nearest: string | null, known: readonly string[]): FaultText => ({
    code: 'unknown-material',
    message: `there is no material ${quote(name)}${nearest === null ? listKnown(known) : didYouMean(nearest)}`,
  }),
  noMaterial: (): FaultText => ({
    code: 'missing',
    message: 'is missing; name a material for the bar, or one for each of its sections',
  }),
  waveSpeed: (speed: number): FaultText => ({
    code: 'out-of-range',
    message: `modulus and density give a wave speed of ${showNumber(speed)} m/s; it must lie between 1 m/s and 100000 m/s: check their units`,
  }),
  hardeningOverModulus: (): FaultText => ({
    code: 'out-of-range',
    message: 'the tangent modulus after yield must be less than the modulus',
  }),
  fatigueExponent: (value: unknown, steepest: number, flattest: number): FaultText => ({
    code: 'out-of-range',
    message: `got ${showValue(value)}; it must lie between ${steepest} and ${flattest}, for most metals near -0.05 to -0.15: it is the negative b of amplitude = strength (2 N)^b, so for a line given as N = C / amplitude^m write "-1/m"`,
  }),

  severalForms: (given: readonly string[]): FaultText => ({
    code: 'conflict',
    message: `the section is given by ${given.join(' and ')} at once; keep exactly one of diameter, area, stations`,
  }),
  noForm: (): FaultText => ({
    code: 'missing',
    message: 'the form is missing; give exactly one of diameter, area, stations',
  }),
  boreWithArea: (): FaultText => ({
    code: 'conflict',
    message: 'a bore belongs to a diameter; an area is already what is left of the section',
  }),
  boreTooWide: (bore: number, diameter: number, where: string): FaultText => ({
    code: 'bore-too-wide',
    message: `Bore ${showLength(bore)} is ${bore === diameter ? 'as wide as' : 'wider than'} the bar, ${showLength(diameter)}${where}. Give less than ${showLength(diameter)}.`,
  }),
  notPositiveAlong: (what: string, value: string, where: string): FaultText => ({
    code: 'out-of-range',
    message: `the ${what} is ${value} ${where}; it must be more than zero over the whole section`,
  }),
  negativeAlong: (what: string, value: string, where: string): FaultText => ({
    code: 'out-of-range',
    message: `the ${what} is ${value} ${where}; it must be zero or more over the whole section`,
  }),
  stationsOrder: (place: number, before: number): FaultText => ({
    code: 'out-of-range',
    message: `the station at ${showLength(place)} does not come after the one at ${showLength(before)}; stations go from left to right, and a step is made by starting a new section`,
  }),
  stationsStart: (place: number): FaultText => ({
    code: 'out-of-range',
    message: `the first station stands at ${showLength(place)}; it must stand at 0 mm, the left face of the section`,
  }),
  stationsEnd: (place: number, length: number): FaultText => ({
    code: 'conflict',
    message: `the last station stands at ${showLength(place)} but the section is ${showLength(length)} long; make both the same, or leave the length out`,
  }),
  displacementAndPreload: (): FaultText => ({
    code: 'conflict',
    message: 'displacement and preload both give the initial strain; keep one of them',
  }),

  unknownBar: (name: string, nearest: string | null, known: readonly string[]): FaultText => ({
    code: 'unknown-bar',
    message: `there is no bar ${quote(name)}${nearest === null ? listKnown(known) : didYouMean(nearest)}`,
  }),
  notOnBar: (at: number, length: number): FaultText => ({
    code: 'out-of-range',
    message: `${showLength(at)} is not on the bar; it must lie between 0 mm and ${showLength(length)}, measured from the bar's left face`,
  }),
}
