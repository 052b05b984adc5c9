import { z } from 'zod'

/**
 * Check digit of a GTIN given without it (GS1 General Specifications, section 7.9): from the right, weights
 * 3, 1, 3, 1 …; the digit fills the sum up to the next ten.
 */
export function computeGtinCheckDigit(digits: string): number {
  const sum = [...digits]
    .reverse()
    .reduce((total, digit, index) => total + Number(digit) * (index % 2 === 0 ? 3 : 1), 0)
  return (10 - (sum % 10)) % 10
}

/** Whether the text is 8, 12, 13 or 14 digits of which the last is the right check digit. */
export function isGtin(text: string): boolean {
  if (!/^(\d{8}|\d{12,14})$/.test(text)) return false
  return computeGtinCheckDigit(text.slice(0, -1)) === Number(text.at(-1))
}

/** GTINs of different lengths compare as 14 digits (same section). */
export function padGtin(gtin: string): string {
  return gtin.padStart(14, '0')
}

export const gtinSchema = z.string({ error: 'must be text of 8, 12, 13 or 14 digits' }).refine(isGtin, {
  error: 'must be 8, 12, 13 or 14 digits, the last of them the right check digit: look for a mistyped digit',
})
