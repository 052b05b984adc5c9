import type { Specs, Value } from './types'

const lengthToleranceMm = 0.05

/** The number under `key` with its source, or undefined where nobody has recorded it. */
export function readMeasure(specs: Specs, key: string): Value<number> | undefined {
  const entry = specs[key]
  return typeof entry?.value === 'number' ? (entry as Value<number>) : undefined
}

/** The bare number under `key`, canonical unit; undefined where unknown. */
export const readNumber = (specs: Specs, key: string): number | undefined => readMeasure(specs, key)?.value

/** The choice or text under `key`; undefined where unknown. */
export function readText(specs: Specs, key: string): string | undefined {
  const value = specs[key]?.value
  return typeof value === 'string' ? value : undefined
}

/** The yes or no under `key`; undefined where unknown. */
export function readFlag(specs: Specs, key: string): boolean | undefined {
  const value = specs[key]?.value
  return typeof value === 'boolean' ? value : undefined
}

/** The set under `key`; undefined where unknown. */
export function readSet<T extends string | number>(specs: Specs, key: string): readonly T[] | undefined {
  const value = specs[key]?.value
  return Array.isArray(value) ? (value as readonly T[]) : undefined
}

/** The object under `key` (a pump that is included, a sump); undefined where unknown. */
export function readGroup<T extends object>(specs: Specs, key: string): T | undefined {
  const value = specs[key]?.value
  return typeof value === 'object' && value !== null && !Array.isArray(value) ? (value as T) : undefined
}

/** The list of objects under `key` (chambers, a curve); undefined where unknown. */
export function readGroups<T extends object>(specs: Specs, key: string): readonly T[] | undefined {
  const value = specs[key]?.value
  return Array.isArray(value) ? (value as readonly T[]) : undefined
}

/** `a` is at most `b`, with the 0.05 mm that comparisons of lengths allow. */
export const isWithinMm = (a: number, b: number): boolean => a <= b + lengthToleranceMm
