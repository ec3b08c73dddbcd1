/**
 * A form in which any part may be missing: what is left of a file once every value of the wrong form
 * has been reported and taken out. A reader passes over what is missing without another word.
 */
export type Loose<T> = T extends readonly (infer Item)[]
  ? (Loose<Item> | undefined)[]
  : T extends object
    ? { [Key in keyof T]?: Loose<T[Key]> }
    : T | undefined
