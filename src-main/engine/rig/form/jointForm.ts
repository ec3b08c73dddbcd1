import { z } from 'zod'
import { pairs, plainNumber, quantity, strictForm } from './fields'

const gap = quantity('length', 'Distance at the start; none where left out').optional()

const rate = {
  rateSensitivity: plainNumber(
    'Exponent m: the loading stress is raised by (rate / referenceRate)^m, slower rates counting as the reference',
  ).optional(),
  referenceRate: quantity('frequency', 'Strain rate up to which the stress is as given').optional(),
}

const lawForm = z
  .discriminatedUnion('kind', [
    strictForm(
      { kind: z.literal('elastic'), modulus: quantity('stress', 'Modulus'), ...rate },
      'Linear elastic',
    ),
    strictForm(
      {
        kind: z.literal('bilinear'),
        modulus: quantity('stress', 'Modulus'),
        yield: quantity('stress', 'Yield stress'),
        hardening: quantity('stress', 'Tangent modulus after yield'),
        ...rate,
      },
      'Elastic, then hardening',
    ),
    strictForm(
      {
        kind: z.literal('power'),
        strength: quantity('stress', 'Stress at a strain of 1'),
        exponent: plainNumber('Exponent of the strain'),
        ...rate,
      },
      'stress = strength strain^exponent',
    ),
    strictForm(
      {
        kind: z.literal('curve'),
        curve: pairs(
          plainNumber('Strain'),
          quantity('stress', 'Stress'),
          'Rows of [strain, stress], strains rising, stresses not falling, compression positive',
        ),
        ...rate,
      },
      'A measured curve, linear between its rows',
    ),
  ])
  .meta({ description: 'How the stress of the specimen follows from its strain' })

/** What connects a bar to the next, by its kind. */
export const jointForm = z
  .discriminatedUnion('kind', [
    strictForm({ kind: z.literal('bonded') }, 'Carries tension and compression'),
    strictForm({ kind: z.literal('contact'), gap }, 'Carries compression only, opens and closes again'),
    strictForm(
      {
        kind: z.literal('cushion'),
        stiffness: quantity('stiffness', 'Stiffness; in place of a curve').optional(),
        curve: pairs(
          quantity('length', 'Closing'),
          quantity('force', 'Force, compression positive'),
          'Loading curve as rows of [closing, force] from ["0 mm", "0 N"], forces not falling; in place of a stiffness',
        ).optional(),
        unloading: quantity(
          'stiffness',
          'Stiffness while it opens, at least the steepest of loading; as in loading where left out',
        ).optional(),
        damping: quantity('damping', 'Damping').optional(),
        mass: quantity('mass', 'Mass of the cushion').optional(),
        gap,
        tension: z.boolean().optional().meta({ description: 'True if it also pulls' }),
      },
      'A spring between two bars',
    ),
    strictForm(
      {
        kind: z.literal('specimen'),
        length: quantity('length', 'Length'),
        diameter: quantity('length', 'Diameter; in place of an area').optional(),
        area: quantity('area', 'Area; in place of a diameter').optional(),
        law: lawForm,
      },
      'A short piece of another material between two bars',
    ),
  ])
  .meta({ id: 'joint', description: 'What connects a bar to the next' })
