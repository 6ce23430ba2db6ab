/**
 * An expected refusal: the request is well formed, yet describes something that cannot be
 * (a negative clearance, a tuning out of reach). Carries what the command line and the API print.
 */
export class InputError extends Error {
  constructor(
    /** Stable, lower case, underscores. */
    readonly code: string,
    /** Where, as in `design.vents[0].clearance_m`. */
    readonly path: string,
    message: string,
    /** What would be accepted, in words and numbers with their unit. */
    readonly allowed: string | null = null,
  ) {
    super(message);
    this.name = "InputError";
  }
}
