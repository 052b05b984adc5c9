/** How a length is called, before it is known of what. */
export type Dimension = 'long' | 'wide' | 'deep' | 'tall' | 'thick' | 'across' | 'front-to-back' | 'water'

const words: Readonly<Record<Dimension, string>> = {
  long: 'long length',
  wide: 'wide width',
  deep: 'deep depth',
  tall: 'tall high height',
  thick: 'thick thickness',
  across: 'diameter dia',
  'front-to-back': 'front-to-back',
  water: 'water-depth',
}

export const dimensionOf: ReadonlyMap<string, Dimension> = new Map(
  Object.entries(words).flatMap(([dimension, names]) => names.split(' ').map((name) => [name, dimension as Dimension])),
)

export const dimensionLetters: ReadonlyMap<string, Dimension> = new Map([
  ['l', 'long'],
  ['w', 'wide'],
  ['d', 'deep'],
  ['h', 'tall'],
])
