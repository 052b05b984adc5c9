import type { TypedForm, TypedSpec } from './typed-form'

const isSameEntry = (a: Readonly<Record<string, string>>, b: Readonly<Record<string, string>> = {}): boolean =>
  [...new Set([...Object.keys(a), ...Object.keys(b)])].every((key) => (a[key] ?? '').trim() === (b[key] ?? '').trim())

/** The same number is meant, whatever backs it. */
export function isSameTyped(a: TypedSpec, b: TypedSpec): boolean {
  const count = Math.max(a.entries.length, b.entries.length)
  return (
    a.text.trim() === b.text.trim() &&
    Array.from({ length: count }, (_, at) => isSameEntry(a.entries[at] ?? {}, b.entries[at])).every(Boolean)
  )
}

/** It has a source, date or evidence of its own: the same number again, better backed. */
export const saysMore = ({ source, plusMinus, evidence, date }: TypedSpec): boolean =>
  [source, plusMinus, evidence, date].some((text) => text.trim() !== '')

/** Nothing was typed that the form did not begin with. */
export function isUntouched(typed: TypedForm, initial: TypedForm): boolean {
  return (
    JSON.stringify({ ...typed, specs: null }) === JSON.stringify({ ...initial, specs: null }) &&
    Object.entries(typed.specs).every(([key, spec]) => {
      const was = initial.specs[key]
      return was !== undefined && isSameTyped(spec, was) && !saysMore(spec)
    })
  )
}
