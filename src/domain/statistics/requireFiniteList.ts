/**
 * Guard for lists of numbers at the door of a domain function.
 *
 * @param caller name of the function that requires the list, for the message
 * @param values the list
 * @param atLeast fewest values allowed, default 1
 * @throws {RangeError} if the list is too short or holds a value that is not finite
 */
export function requireFiniteList(caller: string, values: ArrayLike<number>, atLeast = 1): void {
  if (values.length < atLeast) {
    throw new RangeError(
      `${caller} requires at least ${atLeast} value${atLeast === 1 ? '' : 's'}, got ${values.length}`,
    );
  }
  for (let i = 0; i < values.length; i += 1) {
    if (!Number.isFinite(values[i])) {
      throw new RangeError(`${caller} requires finite values, got ${values[i]} at position ${i}`);
    }
  }
}
