import { z } from 'zod'
import { plainNumber, quantity, strictForm, words } from './fields'

export const allowableForm = strictForm(
  {
    tension: quantity('stress', 'Largest tensile stress allowed, before the factor of safety').optional(),
    compression: quantity('stress', 'Largest compressive stress allowed, a positive value').optional(),
  },
  'Stresses that may not be passed. A value at a section goes before that of its bar, and that before the material.',
  'allowable',
)

export const materialForm = strictForm(
  {
    density: quantity('density', 'Mass per volume'),
    modulus: quantity('stress', "Young's modulus"),
    poisson: plainNumber("Poisson's ratio").optional(),
    allowable: allowableForm.optional(),
    yield: quantity('stress', 'Yield stress').optional(),
    hardening: quantity('stress', 'Tangent modulus after yield').optional(),
    hardeningRule: z
      .enum(['isotropic', 'kinematic'])
      .optional()
      .meta({ description: 'How the yield stress moves after yield; isotropic where left out' }),
    viscosity: quantity('viscosity', 'Kelvin-Voigt viscosity').optional(),
    spall: quantity('stress', 'Tensile stress at which the material comes apart').optional(),
    fatigue: strictForm(
      {
        strength: quantity('stress', 'Fatigue strength coefficient, the amplitude at 2 N = 1'),
        exponent: plainNumber('Fatigue strength exponent, negative, from -1 to -0.01, such as -0.09'),
      },
      'Fatigue line (Basquin) for fully reversed stress: stress amplitude = strength (2 N)^exponent breaks in N cycles',
    ).optional(),
    source: words('Where the numbers come from').optional(),
  },
  'A linear elastic material with what may be known beyond that',
  'material',
)
