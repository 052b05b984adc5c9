import { findWorksheet } from '../../../shared/engine/worksheets/registry'
import { noSetup, type Working } from '../../../shared/engine/worksheets/types'
import type { Setup, Specs } from '../../../shared/engine/types'
import { createPrinter } from '../../../shared/units/print'
import type { UnitSystem } from '../../../shared/units/systems'

export interface Body {
  readonly tank?: Readonly<Record<string, unknown>>
  readonly room?: Setup['room']
  readonly goals?: Setup['goals']
  readonly [key: string]: unknown
}

/** A worksheet at work on inputs as they would be sent, all of them measured. */
export function workAny(name: string, body: Body, system: UnitSystem = 'metric') {
  const sheet = findWorksheet(name)
  if (!sheet) throw new Error(`There is no worksheet ${name}`)
  const { tank = {}, room, goals, ...values } = body
  const { volumeL, ...own } = tank
  const specs: Specs = Object.fromEntries(
    Object.entries(own).map(([key, value]) => [key, { value, source: 'measured' as const }]),
  )
  const setup: Setup = {
    ...noSetup,
    tank: { specs, ...(typeof volumeL === 'number' && { volumeL }) },
    ...(room && { room }),
    ...(goals && { goals }),
  }
  return sheet.work(values, setup, createPrinter(system))
}

export function work(name: string, body: Body, system: UnitSystem = 'metric'): Working {
  const found = workAny(name, body, system)
  if (!found.ok) throw new Error(found.problems.map(({ path, detail }) => `${path}: ${detail}`).join(' '))
  return found
}

/** One number of the result. */
export const result = (name: string, body: Body, key: string): number => work(name, body).result[key] as number

/** The value of the step with that title. */
export function stepValue(name: string, body: Body, title: string): number {
  const step = work(name, body).steps.find((one) => one.title === title)
  if (!step) throw new Error(`${name} has no step “${title}”`)
  return step.value ?? Number.NaN
}

/** Paths of what was refused. */
export function refusals(name: string, body: Body): readonly string[] {
  const found = workAny(name, body)
  return found.ok ? [] : found.problems.map(({ path }) => path)
}
