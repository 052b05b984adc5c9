import type { Dimension } from './words/dimension-words'

/** Water in a rear chamber stands about as high as in the tank, so the depth of one this shallow was typed elsewhere. */
const shallowMm = 150
const deepMm = 200

/** Places of length, width and height by what they were called; "36 W x 18 D x 16 H" starts with the length. */
export const placeByLabels = (
  labels: readonly (Dimension | undefined)[],
  hasHeight: boolean,
): readonly number[] | undefined => {
  const isCalled = (label: Dimension) => labels.includes(label)
  const places = labels.map((label) => {
    if (label === 'long') return 0
    if (label === 'wide') return isCalled('long') || !isCalled('deep') || !isCalled('tall') ? 1 : 0
    if (label === 'front-to-back') return 1
    if (label === 'deep') return isCalled('tall') ? 1 : 2
    return (label === 'tall' || label === 'water') && hasHeight ? 2 : -1
  })
  return new Set(places).size === places.length && !places.includes(-1) ? places : undefined
}

/** Whether the three sides of a chamber can only be meant with another one as its depth. */
export const isDepthElsewhere = (valuesMm: readonly number[]): boolean =>
  (valuesMm[2] ?? Infinity) < shallowMm && Math.max(...valuesMm) >= deepMm

/** The longest last, the others in the order typed. */
export const putLongestLast = <T>(things: readonly T[], valuesMm: readonly number[]): readonly T[] => {
  const longest = valuesMm.indexOf(Math.max(...valuesMm))
  return [...things.slice(0, longest), ...things.slice(longest + 1), ...things.slice(longest, longest + 1)]
}
