import type { CautionCode } from '../../../src-main/contract/result'

/** What each kind of caution is about, short enough to stand in one line beside its number. */
export const CAUTION_TITLES: Record<CautionCode, string> = {
  'short-rise': 'real fronts rise less steeply',
  'steep-taper': 'a taper steep for the theory',
  'near-step': 'stress uneven near a step',
  buckling: 'long compression may buckle a bar',
  'over-yield': 'stress over yield',
  'large-strain': 'strain large for the theory',
  'flat-faces': 'contact faces taken flat and square',
  'no-fillet-factor': 'no Kt; local peak left out',
  'static-fillet-factor': 'Kt is static and elastic',
  'no-allowable': 'an allowable is missing',
  'travel-time-rounding': 'travel times rounded to cells',
  'user-values': 'material values are the rig’s own',
  'negative-margin': 'a margin is negative',
  'energy-closure': 'energy does not close',
  'short-run': 'the run may be too short',
  'laws-left-out': 'some laws are left out by the method',
  'fatigue-basis': 'what the fatigue count rests on',
  'fatigue-range': 'fatigue outside its line’s range',
}
