import { z } from 'zod'
import type { DimensionName } from '../formula/dimension'
import { DIMENSIONS } from '../formula/dimension'

/** What the check of a form learns from a quantity's refusal. */
export interface QuantityParameters {
  quantity: DimensionName
}

/**
 * A physical value: a text with a formula and units.
 * @param dimension what the value must be
 * @param description for the published schema
 */
export function quantity(dimension: Exclude<DimensionName, 'number'>, description: string) {
  const params: QuantityParameters = { quantity: dimension }
  const { label, example } = DIMENSIONS[dimension]
  return z
    .unknown()
    .refine((value) => typeof value === 'string', { params, abort: true })
    .meta({ type: 'string', description: `${description} (${label}, such as "${example}")` })
}

/**
 * A value without a unit: a number, or a text with a formula.
 * @param description for the published schema
 */
export function plainNumber(description: string) {
  const params: QuantityParameters = { quantity: 'number' }
  return z
    .unknown()
    .refine((value) => typeof value === 'string' || typeof value === 'number', { params, abort: true })
    .meta({ type: ['number', 'string'], description: `${description} (a plain number)` })
}

/**
 * A name or another text for people.
 * @param description for the published schema
 */
export function words(description: string) {
  return z.string().meta({ description })
}

/**
 * An object that holds the keys of its shape and no others. The keys travel in the message of an
 * unknown one, where the check of the form takes them up for its hint.
 * @param shape a form for each key
 * @param description for the published schema
 * @param id name by which the published schema refers to it; written out where left out
 */
export function strictForm<Shape extends z.ZodRawShape>(shape: Shape, description: string, id?: string) {
  const known = Object.keys(shape).join(' ')
  return z
    .strictObject(shape, { error: (issue) => (issue.code === 'unrecognized_keys' ? known : undefined) })
    .meta(id === undefined ? { description } : { description, id })
}

/** Rows of two values each. */
export function pairs(first: z.ZodType, second: z.ZodType, description: string) {
  return z
    .array(z.tuple([first, second]))
    .min(2)
    .meta({ description })
}

/**
 * A value of the same dimension as a variable of the rig: a text with a formula, or a number where
 * the variable has no unit.
 * @param description for the published schema
 */
export function quantityOfVariable(description: string) {
  return z
    .union([z.string(), z.number()])
    .meta({ description: `${description} (of the dimension of the variable)` })
}
