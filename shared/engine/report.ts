import { createPrinter } from '../units/print'
import { assess } from './assess'
import { presentReport } from './present'
import type { Report, Setup } from './types'

/**
 * Every check of every piece that counts, what is missing, needs, budgets and the defaults used, in the setup's units.
 * RangeError where the tank has neither an outside size nor a volume; `findContradictions` tells that beforehand.
 */
export function report(setup: Setup): Report {
  return presentReport(assess(setup), createPrinter(setup.units))
}
