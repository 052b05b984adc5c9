import type { FieldAttribute } from '#shared/kinds/types'
import { readLinkValue } from '#shared/schemas/setup-link-values'
import type { LinkProblem } from '#shared/schemas/setup-link'
import { findSetupField } from '#shared/kinds/setup-fields'
import { createPrinter } from '#shared/units/print'
import { readMeasure } from '#shared/units/read'
import type { UnitSystem } from '#shared/units/systems'

/** What is wrong with a typed text, in the person's own units; undefined where nothing is. An empty text says nothing. */
export function checkField(
  text: string,
  attribute: FieldAttribute,
  system: UnitSystem,
  typedIn: UnitSystem | undefined = system,
): string | undefined {
  if (text.trim() === '') return undefined
  const read = readLinkValue(text, attribute, system, typedIn)
  if (read.ok) return undefined
  if (attribute.type !== 'measure' || !readMeasure(text, attribute.unit, system).ok) return toSentence(read.detail)
  const [low, high] = attribute.plausible
  const range = createPrinter(system).pair([low, high], attribute.unit)
  return `“${text.trim()}” is outside of what this can be: ${range}.`
}

/** Details of the schema begin in the middle of a sentence: "must be yes or no". */
function toSentence(detail: string): string {
  const whole = /^(must|is|has) /.test(detail) ? `This ${detail}` : detail
  return whole.endsWith('.') ? whole : `${whole}.`
}

/** The echo under a field: how the text is read, in both unit systems. */
export function echoField(text: string, attribute: FieldAttribute, system: UnitSystem): string | undefined {
  if (attribute.type !== 'measure' || text.trim() === '') return undefined
  const reading = readMeasure(text, attribute.unit, system)
  return reading.ok ? reading.echo : undefined
}

/** A problem of a link, as the finder says it. */
export function explainProblem({ path, text, detail }: LinkProblem, system: UnitSystem): string {
  const attribute = findSetupField(path)?.attribute
  const label = attribute?.label ?? path
  const own = attribute && checkField(text, attribute, system, undefined)
  const said = own ?? toSentence(detail)
  if (label === '') return said
  const isQuoted = said.includes(`"${text}"`) || said.includes(`“${text}”`)
  const typed = isQuoted || text === '' ? '' : `“${text.slice(0, 60)}”. `
  return `${label[0]?.toUpperCase()}${label.slice(1)}: ${typed}${said}`
}
