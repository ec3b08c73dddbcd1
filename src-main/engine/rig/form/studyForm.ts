import { z } from 'zod'
import { plainNumber, quantityOfVariable, strictForm, words } from './fields'

const name = words('Name of the study').optional()
const result = words('A number of the result, such as governing.margin')

const range = {
  variable: words('Name of a variable of this rig'),
  from: quantityOfVariable('First value'),
  to: quantityOfVariable('Last value'),
  count: z.int().min(2).max(1000).meta({ description: 'How many values' }),
}

/** A study of the rig, by its kind; `checkStudies` checks its variables. */
export const studyForm = z
  .discriminatedUnion('kind', [
    strictForm(
      {
        kind: z.literal('sweep'),
        name,
        ...range,
        second: strictForm(range, 'A second variable, run through for each value of the first').optional(),
      },
      'Runs through the values of one or two variables',
    ),
    strictForm(
      {
        kind: z.literal('tolerance'),
        name,
        variables: z
          .record(
            z.string(),
            z.discriminatedUnion('spread', [
              strictForm(
                { spread: z.literal('normal'), deviation: quantityOfVariable('Standard deviation') },
                'Normal about the value in the rig',
              ),
              strictForm(
                { spread: z.literal('uniform'), half: quantityOfVariable('Half of its width') },
                'Uniform about the value in the rig',
              ),
            ]),
          )
          .meta({ description: 'How each variable spreads, by its name' }),
        samples: z.int().min(2).max(100_000).meta({ description: 'How many runs' }),
        seed: z
          .int()
          .min(0)
          .optional()
          .meta({ description: 'The same seed gives the same runs; 1 where left out' }),
      },
      'Draws the variables by chance',
    ),
    strictForm(
      {
        kind: z.literal('seek'),
        name,
        variable: words('Name of a variable of this rig'),
        between: z
          .tuple([quantityOfVariable('Lower bound'), quantityOfVariable('Upper bound')])
          .meta({ description: 'Bounds of the search' }),
        until: strictForm(
          { result, value: plainNumber('The value to reach, in SI') },
          'A result reaches a value',
        ),
      },
      'Finds the value of a variable at which a result reaches a value',
    ),
    strictForm(
      {
        kind: z.literal('tune'),
        name,
        variables: z
          .record(
            z.string(),
            strictForm(
              { from: quantityOfVariable('Lower bound'), to: quantityOfVariable('Upper bound') },
              'Bounds',
            ),
          )
          .meta({ description: 'The bounds of each variable, by its name' }),
        minimise: result.optional(),
        maximise: result.optional(),
        subjectTo: z
          .array(
            strictForm(
              {
                result,
                atLeast: plainNumber('Lower limit in SI').optional(),
                atMost: plainNumber('Upper limit in SI').optional(),
              },
              'A limit that a result must keep',
            ),
          )
          .optional()
          .meta({ description: 'Limits that the answer must keep' }),
      },
      'Finds the values of variables at which a result is best',
    ),
  ])
  .meta({ id: 'study', description: 'A study of the rig' })
