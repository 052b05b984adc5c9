import type { Attribute } from '../kinds/types'

const steps = 8

/**
 * Values that stand for all usual ones of an attribute: of a measure its ends and steps between, even ones and even
 * ratios, since what suits a small tank is a narrow stretch of a wide range; of a choice every option.
 */
export function listUsual(attribute: Attribute | undefined): readonly (number | string)[] {
  if (attribute?.type === 'measure') {
    const [low, high] = attribute.usual
    const shares = Array.from({ length: steps + 1 }, (_, index) => index / steps)
    const even = shares.map((share) => low + share * (high - low))
    return low > 0 ? [...even, ...shares.slice(1, -1).map((share) => low * (high / low) ** share)] : even
  }
  if (attribute?.type === 'choice')
    return attribute.options.map(({ value }) => (attribute.numeric ? Number(value) : value))
  return []
}
