/** What cannot be done for a reason that the user can understand and mend; no fault of the program. */
export class Refusal extends Error {}
