import { z } from 'zod'
import { rigForm } from './rigForm'

/**
 * Makes the JSON Schema of rig files for editors and other programs, published as
 * `contract/rig.schema.json`. It holds the form; what values mean together is checked by `readRig` alone.
 */
export function makeRigSchema(): object {
  return { title: 'Barwright rig file', ...z.toJSONSchema(rigForm, { io: 'input' }) }
}
