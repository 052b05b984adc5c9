/** Refuses NaN and infinities before they spread through a calculation as a plausible-looking answer. Throws RangeError. */
export function requireFinite(values: Readonly<Record<string, number>>): void {
  for (const [name, value] of Object.entries(values)) {
    if (!Number.isFinite(value)) throw new RangeError(`${name} must be a finite number, got ${value}`)
  }
}
