import { BRIDGE_TEXT_LIMIT, type BridgeMethod } from '../contract/bridgeCall'
import {
  checkFlag,
  checkNumber,
  checkObject,
  checkOneOf,
  checkText,
  checkWhole,
  type Check,
  optional,
  orNull,
} from './valueChecks'

/** No length or time of a request is larger, in SI. */
const MAGNITUDE = 1e9
/** Pixels at most along one side and in all of a field; columns of a profile. */
const SIDE = 8192
const PIXELS = 4 * 1024 * 1024

const slot = checkText(100, 1)
const id = checkText(100, 1)
const place = checkText(1000, 1)
const text = checkText(BRIDGE_TEXT_LIMIT)
const name = checkText(500)
const coordinate = checkNumber(-MAGNITUDE, MAGNITUDE)

const field: Check = (value, what) => {
  const checked = checkObject({
    slot,
    quantity: checkOneOf('stress', 'force', 'velocity', 'energy'),
    fromX: coordinate,
    toX: coordinate,
    fromT: coordinate,
    toT: coordinate,
    columns: checkWhole(1, SIDE),
    rows: checkWhole(1, SIDE),
  })(value, what)
  if ('refused' in checked) return checked
  const { fromX, toX, fromT, toT, columns, rows } = checked.value as Record<string, number>
  if (!(fromX < toX)) return { refused: `${what}.fromX must be less than ${what}.toX.` }
  if (!(fromT < toT)) return { refused: `${what}.fromT must be less than ${what}.toT.` }
  if (columns * rows > PIXELS)
    return { refused: `${what} asks for ${columns * rows} pixels; at most ${PIXELS}.` }
  return checked
}

const part: Check = (value, what) => {
  const checked = checkObject({ fromX: coordinate, toX: coordinate })(value, what)
  if ('refused' in checked) return checked
  const { fromX, toX } = checked.value as Record<string, number>
  return fromX < toX ? checked : { refused: `${what}.fromX must be less than ${what}.toX.` }
}

/** The arguments that each method takes: every host checks a message against this table. */
export const CALL_CHECKS: Readonly<Record<BridgeMethod, readonly Check[]>> = {
  about: [],
  listSamples: [],
  readSample: [id],
  solve: [
    checkObject({
      slot,
      text,
      name,
      coarse: checkFlag,
      method: optional(checkOneOf('characteristics', 'elements', 'both')),
      place: optional(place),
    }),
  ],
  progress: [slot],
  stop: [slot],
  readField: [field],
  readProfile: [checkObject({ slot, t: coordinate, columns: checkWhole(1, SIDE), part: optional(part) })],
  report: [slot],
  'files.open': [],
  'files.openRecent': [place],
  'files.recent': [],
  'files.save': [place, text],
  'files.saveAs': [name, text],
  'files.noteSheet': [checkObject({ name, text, place: orNull(place), unsaved: checkFlag })],
}
