import type { Random } from './random'

/** Made-up words; none is meant to be anybody's name. */
const starts = [
  'Brack',
  'Wrack',
  'Quill',
  'Silt',
  'Marl',
  'Tarn',
  'Shoal',
  'Kelp',
  'Eddy',
  'Skerry',
  'Ripple',
  'Lagoon',
]
const ends = ['garth', 'wick', 'holm', 'stead', 'lund', 'mere', 'thwaite', 'combe', 'fold', 'hythe']
const lines = [
  'Ember',
  'Reed',
  'Cairn',
  'Vane',
  'Lantern',
  'Thrum',
  'Gable',
  'Sluice',
  'Hollow',
  'Plover',
  'Fathom',
  'Tiller',
]
const letters = 'ABCDEFGHJKLMNPRSTUVWXYZ'.split('')

export const drawBrand = (random: Random): string => random.pick(starts) + random.pick(ends)

/** A line of models, such as "Cairn VR 214"; the number tells families apart. */
export const drawLine = (random: Random, family: number): string =>
  `${random.pick(lines)} ${random.pick(letters)}${random.pick(letters)} ${family}`
