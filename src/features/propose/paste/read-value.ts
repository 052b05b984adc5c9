import type { FieldAttribute, Option } from '#shared/kinds/types'
import { readLinkValue } from '#shared/schemas/setup-link-values'
import type { UnitSystem } from '#shared/units/systems'

/** "approx. 12 in (305 mm)": what stands around the one measure that is meant. */
const listSpellings = (text: string): readonly string[] => {
  const bare = text.replace(/^(?:approx(?:imately|\.)?|about|ca\.?|circa|up to|max\.?|min\.?|~|≈|±)\s*/i, '')
  const head = bare.replace(/\s*[([].*$/, '')
  const [first = ''] = head.split(/\s*(?:\/|,\s|\bor\b)\s*(?=\d)/)
  return [...new Set([text, bare, head, first].map((one) => one.trim()))].filter((one) => one !== '')
}

const simplify = (text: string): string =>
  text
    .toLowerCase()
    .replace(/[^\p{L}\p{N}]+/gu, ' ')
    .trim()

function matchOption(text: string, options: readonly Option[]): string | undefined {
  const typed = simplify(text)
  const exact = options.find(({ value, label }) => [simplify(value), simplify(label)].includes(typed))
  if (exact) return exact.value
  const inside = options.filter(({ label }) => ` ${typed} `.includes(` ${simplify(label)} `))
  return inside.length === 1 ? inside[0]?.value : undefined
}

/** Mains of 110 V are sold as 120 V; "100–240 V" takes every one between. */
const voltageTolerance = 0.1

function matchNumbers(text: string, options: readonly Option[]): readonly string[] {
  const numbers = [...text.matchAll(/\d+(?:\.\d+)?/g)].map(([digits]) => Number(digits))
  const isRange = /\d\s*(?:v\s*)?(?:-|–|to)\s*\d/i.test(text)
  const [low = 0, high = 0] = [Math.min(...numbers), Math.max(...numbers)]
  return options
    .map(({ value }) => value)
    .filter((value) => {
      const option = Number(value)
      if (isRange && option >= low && option <= high) return true
      return numbers.some((number) => Math.abs(number / option - 1) < voltageTolerance)
    })
}

function matchSet(text: string, attribute: FieldAttribute & { type: 'set' }): readonly string[] {
  if (attribute.numeric) return matchNumbers(text, attribute.options)
  const typed = ` ${simplify(text)} `
  return attribute.options
    .filter(({ value, label }) => [value, label].some((one) => typed.includes(` ${simplify(one)} `)))
    .map(({ value }) => value)
}

const yes = /^(?:yes|y|true|✓|✔|included|with)$/i
const no = /^(?:no|n|false|✗|✘|×|not included|none|without|-|–)$/i

/** What was pasted as the form takes it; undefined where it is no value for this field. A measure keeps its spelling. */
export function readPastedValue(text: string, attribute: FieldAttribute, system: UnitSystem): string | undefined {
  switch (attribute.type) {
    case 'measure':
      return listSpellings(text).find((one) => readLinkValue(one, attribute, system, system).ok)
    case 'choice':
      return matchOption(text, attribute.options)
    case 'set': {
      const chosen = matchSet(text, attribute)
      return chosen.length > 0 ? chosen.join(',') : undefined
    }
    case 'boolean':
      return yes.test(text.trim()) ? 'yes' : no.test(text.trim()) ? 'no' : undefined
    case 'text':
    case 'texts':
      return readLinkValue(text, attribute, system).ok ? text.trim() : undefined
  }
}
