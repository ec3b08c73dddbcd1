import { z } from 'zod'
import { pairs, quantity, strictForm, words } from './fields'
import { allowableForm } from './materialForm'

/**
 * A diameter or a bore along a section: one value, a profile from one value to another, or a
 * formula in `s`.
 */
function outline(what: string) {
  return z
    .union([
      quantity(
        'length',
        `${what}: a value, or a formula in s (0..1 along the section) or x (from the bar's left face)`,
      ),
      strictForm(
        {
          from: quantity('length', `${what} at the left face of the section`),
          to: quantity('length', `${what} at the right face of the section`),
          profile: z.enum(['linear', 'exponential', 'area-linear']).optional().meta({
            description: 'linear (a cone) where left out; in area-linear the area of its circle is linear',
          }),
        },
        `${what} that changes along the section`,
      ),
    ])
    .meta({ description: `${what}: a value, a formula, or a profile from one value to another` })
    .optional()
}

/** A section; which of its keys go together is checked by `readSection`. */
export const sectionForm = strictForm(
  {
    name: words('For people only').optional(),
    length: quantity('length', 'Length; with stations it may be left out').optional(),
    diameter: outline('Outer diameter'),
    bore: outline('Inner diameter'),
    area: quantity(
      'area',
      'Area of a section that is not round: a value, or a formula in s or x; in place of a diameter',
    ).optional(),
    stations: pairs(
      quantity('length', 'Place from the left face of the section'),
      quantity('length', 'Outer diameter at this place'),
      'Diameters read off a drawing as [place, diameter], linear between them; in place of a diameter',
    ).optional(),
    fillet: quantity(
      'length',
      'Fillet radius where this section meets the next, in the corner of the smaller one',
    ).optional(),
    material: words("Name of the section's own material").optional(),
    allowable: allowableForm.optional(),
  },
  'A section: its length and exactly one of diameter, area, stations',
  'section',
)

/** A bar with its sections and its state at the start. */
export const barForm = strictForm(
  {
    name: words('Name of the bar, each its own'),
    material: words('Name of the material of all sections that do not name their own').optional(),
    sections: z.array(sectionForm).min(1).meta({ description: 'From left to right' }),
    velocity: quantity(
      'velocity',
      'Velocity at the start, positive to the right: a value, or a formula in x (from the left face) and s (0..1). Behind a division sign, as in m/s, s is the second.',
    ).optional(),
    displacement: quantity(
      'length',
      'Displacement at the start, a formula in x and s, giving a strain; not together with preload',
    ).optional(),
    preload: quantity('force', 'Axial force at the start, tension positive').optional(),
    allowable: allowableForm.optional(),
  },
  'A bar',
  'bar',
)
