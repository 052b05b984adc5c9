import { useMemo } from 'react'
import { createPrinter, type Printer } from '#shared/units/print'
import { usePreferences } from './app-context'

/** Writes measures in the visitor's own units. */
export function usePrinter(): Printer {
  const { system } = usePreferences()
  return useMemo(() => createPrinter(system), [system])
}
