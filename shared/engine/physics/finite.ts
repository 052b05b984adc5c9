/**
 * Refuses NaN and infinities before they spread through a calculation as a plausible-looking answer. Throws RangeError.
 * A formula that is worked out thousands of times per answer asks first whether the sum of its inputs is finite, which
 * it is not if one of them is not: naming the inputs costs more than the formula.
 */
export function requireFinite(values: Readonly<Record<string, number>>): void {
  for (const name in values) {
    if (!Number.isFinite(values[name])) throw new RangeError(`${name} must be a finite number, got ${values[name]}`)
  }
}
