/** Refuses NaN and infinities before they spread through a calculation as a plausible-looking answer. Throws RangeError. */
export function requireFinite(values: Readonly<Record<string, number>>): void {
  for (const name in values) {
    if (!Number.isFinite(values[name])) throw new RangeError(`${name} must be a finite number, got ${values[name]}`)
  }
}
