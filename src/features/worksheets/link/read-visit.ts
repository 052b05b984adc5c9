import { isSetupKey } from '#shared/schemas/setup-link-keys'
import type { Worksheet } from '#shared/engine/worksheets/types'
import { unitSystems, type UnitSystem } from '#shared/units/systems'
import { findField, isOfSetup, readSheet, type ReadSheet } from './read-sheet'

export interface SheetVisit {
  readonly read: ReadSheet
  /** Nothing was said: an example is shown. */
  readonly isEmpty: boolean
  /** Somebody asked for an empty form. */
  readonly isCleared: boolean
  /** The address names a setup that the inputs are to be filled in from. */
  readonly isToFill: boolean
  /** Set where the same inputs are written otherwise. */
  readonly redirect?: string
}

const spell = (entries: Iterable<readonly [string, string]>) =>
  Array.from(entries, ([key, text]) => `${key}=${text}`).join('&')

/** Reads an address of a worksheet. Never throws. */
export function readVisit(sheet: Worksheet, params: URLSearchParams, system: UnitSystem): SheetVisit {
  const typed = params.get('typed')
  const typedIn = unitSystems.find((known) => known === typed)
  const known = [...params].filter(([key]) => findField(sheet, key) !== undefined || isOfSetup(sheet, key))
  const read = readSheet(sheet, known, system, typedIn)
  const foreign = [...params.keys()].some(
    (key) => isSetupKey(key) && key !== 'units' && key !== 'name' && !known.some(([own]) => own === key),
  )
  const isToFill = params.has('from') || foreign || params.has('tank.gear')
  const isSent = typedIn !== undefined
  const isCanonical = !isSent && spell(known) === spell(new URLSearchParams(read.query))
  const isEmpty = read.query === ''
  return {
    read,
    isEmpty,
    isCleared: isEmpty && (params.has('clear') || isSent),
    isToFill,
    ...(!isCanonical && !isToFill && { redirect: isEmpty ? 'clear=yes' : read.query }),
  }
}
