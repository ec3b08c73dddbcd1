import { z } from 'zod'
import { barForm } from './barForm'
import { endForm } from './endForm'
import { plainNumber, quantity, strictForm, words } from './fields'
import { jointForm } from './jointForm'
import { materialForm } from './materialForm'
import { forcePulseForm } from './pulseForm'
import { studyForm } from './studyForm'

/** The word that a rig file of this version begins with. */
export const RIG_FORMAT = 'barwright-rig/1'

/** A strain gauge station. */
export const gaugeForm = strictForm(
  {
    name: words('Name of the gauge, each its own'),
    bar: words('Name of a bar'),
    at: quantity('length', "Distance from the bar's left face"),
    bridge: strictForm(
      {
        factor: plainNumber('Gauge factor'),
        arms: z
          .union([z.literal(1), z.literal(2), z.literal(4)])
          .optional()
          .meta({ description: 'Arms of the bridge that carry a gauge: 1, 2 or 4; 1 where left out' }),
        excitation: quantity('voltage', 'Excitation'),
        gain: plainNumber('Gain of the amplifier; 1 where left out').optional(),
        poisson: plainNumber(
          'Ratio read by the arms across the bar; all arms lie along it where left out',
        ).optional(),
      },
      'The bridge that turns strain into volts',
    ).optional(),
  },
  'A strain gauge station',
  'gauge',
)

const flag = (description: string) => z.boolean().optional().meta({ description })

const runForm = strictForm(
  {
    duration: quantity('time', 'Time that the run covers'),
    cell: quantity('length', 'Wanted length of a cell; in place of a time step').optional(),
    timeStep: quantity('time', 'Time step; in place of a cell').optional(),
    method: z
      .enum(['characteristics', 'elements', 'both'])
      .optional()
      .meta({ description: 'characteristics where left out' }),
    finiteStrain: flag('Large strains, with elements'),
    lateralInertia: flag('Inertia of the motion across the bar, with elements'),
    bulkViscosity: flag('Bulk viscosity, with elements'),
    spall: flag('Bars come apart where the tension reaches the spall stress'),
  },
  'How it is computed',
  'run',
)

/** The form of a rig file: which keys stand where. What its values mean is checked after it. */
export const rigForm = strictForm(
  {
    format: z.literal(RIG_FORMAT).meta({ description: 'The word that tells a rig file' }),
    title: words('Title').optional(),
    notes: words('Remarks').optional(),
    variables: z
      .record(z.string(), z.union([z.string(), z.number()]))
      .optional()
      .meta({ description: 'Values that formulas may use by name, each a text with a formula' }),
    materials: z.record(z.string(), materialForm).meta({ description: 'Materials by name' }),
    leftEnd: endForm.optional(),
    bars: z.array(barForm).min(1).meta({ description: 'From left to right' }),
    joints: z
      .array(jointForm)
      .optional()
      .meta({ description: 'One fewer than bars, in order; contact without gap where left out' }),
    rightEnd: endForm.optional(),
    loads: z
      .array(
        strictForm(
          {
            bar: words('Name of a bar'),
            at: quantity('length', "Distance from the bar's left face"),
            pulse: forcePulseForm,
          },
          'An axial force on the bar, positive to the right',
        ),
      )
      .optional()
      .meta({ description: 'Forces at points of the bars' }),
    gravity: quantity('acceleration', 'Acceleration along x, for a rig that does not lie level').optional(),
    gauges: z.array(gaugeForm).optional().meta({ description: 'Where the bars are watched' }),
    margins: strictForm(
      { factorOfSafety: plainNumber('Factor of safety; 1 where left out').optional() },
      'How margins are reckoned',
    ).optional(),
    run: runForm,
    studies: z.array(studyForm).optional().meta({ description: 'Studies that vary the rig' }),
  },
  'A line of bars, read from left to right',
)

/** A rig file of the right form. */
export type RigForm = z.infer<typeof rigForm>
