import type { Attribute } from '../kinds/types'

const samples = 9

/** Values that stand for all usual ones of an attribute: a measure's range in even steps, every option of a choice. */
export function listUsual(attribute: Attribute | undefined): readonly (number | string)[] {
  if (attribute?.type === 'measure') {
    const [low, high] = attribute.usual
    return Array.from({ length: samples }, (_, index) => low + ((high - low) * index) / (samples - 1))
  }
  if (attribute?.type === 'choice')
    return attribute.options.map(({ value }) => (attribute.numeric ? Number(value) : value))
  return []
}
