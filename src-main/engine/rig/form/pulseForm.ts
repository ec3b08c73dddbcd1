import { z } from 'zod'
import type { DimensionName } from '../formula/dimension'
import { pairs, quantity, strictForm, words } from './fields'

const column = z
  .union([
    z.int().min(1),
    z.string(),
    strictForm(
      {
        name: words('Heading of the column').optional(),
        number: z
          .int()
          .min(1)
          .optional()
          .meta({ description: 'The column counted from 1; in place of its name' }),
        unit: words('What a 1 in this column means, such as "us", "kN" or "2.5 kN"').optional(),
      },
      'A column with its unit',
    ),
  ])
  .meta({
    description:
      'A heading with or without its unit, a column counted from 1, or an object with name or number and unit. A heading carries its unit in brackets, such as "t [us]" or "F (kN)".',
  })

/** A prescribed history of values of one dimension. */
function pulseForm(dimension: Exclude<DimensionName, 'number'>, id: string) {
  const peak = quantity(dimension, 'Largest value, with its sign')
  const start = quantity('time', 'When it begins; at once where left out').optional()
  const duration = quantity('time', 'From its beginning to its end')
  return z
    .discriminatedUnion('shape', [
      strictForm({ shape: z.literal('rectangle'), peak, duration, start }, 'The peak throughout'),
      strictForm({ shape: z.literal('half-sine'), peak, duration, start }, 'peak sin(pi t / duration)'),
      strictForm({ shape: z.literal('haversine'), peak, duration, start }, 'peak sin^2(pi t / duration)'),
      strictForm(
        {
          shape: z.literal('triangle'),
          peak,
          duration,
          rise: quantity('time', 'Time up to the peak; half of the duration where left out').optional(),
          start,
        },
        'Straight up to the peak and straight down',
      ),
      strictForm(
        {
          shape: z.literal('trapezoid'),
          peak,
          duration,
          rise: quantity('time', 'Time up to the peak'),
          fall: quantity('time', 'Time down from the peak; as long as the rise where left out').optional(),
          start,
        },
        'Straight up, level, straight down; the duration holds all three',
      ),
      strictForm({ shape: z.literal('step'), peak, start }, 'The peak from its start on, for ever'),
      strictForm(
        {
          shape: z.literal('ramp'),
          peak,
          rise: quantity('time', 'Time up to the peak').optional(),
          duration: quantity('time', 'The same as rise; give one of the two').optional(),
          start,
        },
        'Straight up to the peak, which then stays for ever',
      ),
      strictForm(
        {
          shape: z.literal('formula'),
          formula: quantity(dimension, 'Formula in t, the time since the start of the run'),
        },
        'A formula in t',
      ),
      strictForm(
        {
          shape: z.literal('table'),
          table: pairs(
            quantity('time', 'Time'),
            quantity(dimension, 'Value'),
            'Rows of [time, value], times rising',
          ),
          start,
        },
        'Rows of time and value, linear between them. Outside its times a force or a velocity is zero and a displacement stays as it is.',
      ),
      strictForm(
        {
          shape: z.literal('file'),
          file: words('Path of a CSV file inside the folder of the rig, written with /'),
          columns: strictForm(
            { time: column.optional(), value: column.optional() },
            'Which columns hold time and value; the first and the second where left out',
          ).optional(),
          start,
        },
        'A measured record beside the rig, read like a table',
      ),
    ])
    .meta({ id, description: 'A prescribed history' })
}

/** A history of a force. */
export const forcePulseForm = pulseForm('force', 'forcePulse')
/** A history of a velocity. */
export const velocityPulseForm = pulseForm('velocity', 'velocityPulse')
/** A history of a displacement, which must not jump. */
export const displacementPulseForm = pulseForm('length', 'displacementPulse')

/** A prescribed history, whatever its values are. */
export type AnyPulseForm = z.infer<
  typeof forcePulseForm | typeof velocityPulseForm | typeof displacementPulseForm
>
