/** Base of everything this library refuses to estimate from. */
export class EstimationError extends Error {
  constructor(message: string) {
    super(message);
    this.name = new.target.name;
  }
}

/** A number that cannot be: not finite, negative where it must not be, or beyond what the trade ever saw. */
export class ImpossibleInputError extends EstimationError {}

/** Refuses `value` unless it is finite and within [low, high]. */
export function assertWithin(what: string, value: number, low: number, high: number): void {
  if (!Number.isFinite(value) || value < low || value > high) {
    throw new ImpossibleInputError(`${what} is ${value}; it must be from ${low} to ${high}.`);
  }
}
