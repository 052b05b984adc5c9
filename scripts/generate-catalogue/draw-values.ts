import type { Attribute, GroupAttribute, MeasureAttribute, Option } from '#shared/kinds/types'
import type { Random } from './random'

/** What the pieces of one family have in common: how far up its usual range each measure starts, and every choice. */
export interface Character {
  readonly base: ReadonlyMap<string, number>
  readonly fixed: ReadonlyMap<string, unknown>
}

/** Three digits, as a data sheet prints them; counts and whole millimetres stay whole. */
function roundLikePrint(value: number, { unit, plausible: [low, high] }: MeasureAttribute): number {
  const isWhole = unit === 'count' || (unit === 'mm' && high >= 50)
  const rounded = isWhole ? Math.round(value) : Number(value.toPrecision(3))
  return Math.min(high, Math.max(low, rounded))
}

/** `at`: 0 for the low end of the usual range, 1 for the high end; by ratio where the range spans more than tenfold. */
function placeInRange(attribute: MeasureAttribute, at: number): number {
  const [low, high] = attribute.usual
  const share = Math.min(1, Math.max(0, at))
  const value = low > 0 && high / low > 10 ? low * (high / low) ** share : low + (high - low) * share
  return roundLikePrint(value, attribute)
}

const listValues = (options: readonly Option[], isNumeric = false): readonly (string | number)[] =>
  options.map(({ value }) => (isNumeric ? Number(value) : value))

function drawGroup(group: GroupAttribute, random: Random, size: number): unknown {
  const draw = () =>
    Object.fromEntries(group.fields.map((field) => [field.key, drawFresh(field, random, size)] as const))
  if (!group.many) return draw()
  return Array.from({ length: 1 + Math.floor(random.between(0, 3)) }, draw)
}

function drawFresh(attribute: Attribute, random: Random, size: number): unknown {
  switch (attribute.type) {
    case 'measure':
      return placeInRange(attribute, size + random.between(-0.2, 0.2))
    case 'choice':
      return random.pick(listValues(attribute.options, attribute.numeric))
    case 'set': {
      const values = listValues(attribute.options, attribute.numeric)
      const kept = values.filter(() => random.chance(0.5))
      return kept.length > 0 ? kept : [random.pick(values)]
    }
    case 'boolean':
      return random.chance(0.5)
    case 'text':
      return `series-${Math.floor(random.between(1, 40))}`
    case 'texts':
      return [`series-${Math.floor(random.between(1, 40))}`]
    case 'group':
      return drawGroup(attribute, random, size)
  }
}

export function drawCharacter(attributes: readonly Attribute[], random: Random): Character {
  const measures = attributes.filter(({ type }) => type === 'measure')
  const others = attributes.filter(({ type }) => type !== 'measure' && type !== 'group')
  return {
    base: new Map(measures.map(({ key }) => [key, random.between(-0.1, 0.3)])),
    fixed: new Map(others.map((attribute) => [attribute.key, drawFresh(attribute, random, 0.5)])),
  }
}

/** One piece of the family; `size` runs from 0 for its smallest to 1 for its largest. Some values nobody has recorded. */
export function drawValues(
  attributes: readonly Attribute[],
  { base, fixed }: Character,
  size: number,
  random: Random,
): Record<string, unknown> {
  const known = attributes.filter(() => random.chance(0.93))
  return Object.fromEntries(
    known.map((attribute) => {
      const { key, type } = attribute
      if (type === 'measure') return [key, placeInRange(attribute, (base.get(key) ?? 0) + 0.7 * size)]
      return [key, type === 'group' ? drawGroup(attribute, random, size) : fixed.get(key)]
    }),
  )
}
