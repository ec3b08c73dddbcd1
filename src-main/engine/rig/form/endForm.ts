import { z } from 'zod'
import { quantity, strictForm } from './fields'
import { displacementPulseForm, forcePulseForm, velocityPulseForm } from './pulseForm'

const joint = z.enum(['bonded', 'contact']).optional().meta({
  description:
    'contact carries compression only. Where left out, a mass is in contact, and a support is bonded unless it has a gap.',
})
const gap = quantity('length', 'Distance at the start; none where left out').optional()

/** An end of the line, by its kind. */
export const endForm = z
  .discriminatedUnion('kind', [
    strictForm({ kind: z.literal('free') }, 'No force'),
    strictForm({ kind: z.literal('fixed') }, 'No motion'),
    strictForm({ kind: z.literal('matched') }, 'The bar goes on for ever'),
    strictForm(
      { kind: z.literal('force'), pulse: forcePulseForm },
      'Force of the surroundings on the bar, positive to the right',
    ),
    strictForm(
      { kind: z.literal('velocity'), pulse: velocityPulseForm },
      'Velocity of the end, positive to the right',
    ),
    strictForm(
      { kind: z.literal('displacement'), pulse: displacementPulseForm },
      'Displacement of the end, positive to the right; it must not jump',
    ),
    strictForm(
      {
        kind: z.literal('mass'),
        mass: quantity('mass', 'Mass'),
        velocity: quantity(
          'velocity',
          'Velocity at the start, positive to the right; at rest where left out',
        ).optional(),
        joint,
        gap,
      },
      'A rigid hammer or anvil',
    ),
    strictForm(
      {
        kind: z.literal('support'),
        stiffness: quantity('stiffness', 'Stiffness to the ground').optional(),
        damping: quantity('damping', 'Damping to the ground').optional(),
        mass: quantity('mass', 'Mass that moves with the end').optional(),
        joint,
        gap,
      },
      'A spring, a dashpot and a mass to the ground; each is none where left out',
    ),
    strictForm({ kind: z.literal('wall'), gap }, 'A rigid stop that carries compression only'),
    strictForm(
      {
        kind: z.literal('penetration'),
        loading: quantity('stiffness', 'Stiffness while the end goes in'),
        unloading: quantity(
          'stiffness',
          'Stiffness while it comes back; at least that of loading, the same for an elastic ground',
        ),
      },
      'A ground that the end goes into, compression only',
    ),
  ])
  .meta({ id: 'end', description: 'An end prescribes a motion or a force, never both' })
