import { boolean, measure, texts } from './build'
import type { Kind } from './types'

export const stand: Kind = {
  key: 'stand',
  label: 'stand',
  plural: 'stands',
  electric: false,
  additive: false,
  attributes: [
    measure('topLengthMm', 'top length', 'mm', {
      plausible: [150, 6000],
      usual: [280, 2500],
      role: 'check',
      guide: 'The flat bearing surface along the front, without overhanging trim.',
    }),
    measure('topWidthMm', 'top width', 'mm', {
      plausible: [150, 3000],
      usual: [250, 900],
      role: 'check',
      guide: 'The flat bearing surface from front to back.',
    }),
    measure('loadRatingKg', 'load rating', 'kg', {
      plausible: [10, 10000],
      usual: [60, 1500],
      role: 'check',
      better: 'more',
      guide: 'The greatest evenly spread load its maker states.',
    }),
    texts('madeForTanks', 'tanks it is made for', 120, {
      role: 'check',
      guide: 'The tanks that its maker names, each as its entry here is called.',
    }),
    measure('madeForVolumeL', 'tank volume it is made for', 'L', {
      plausible: [5, 20000],
      usual: [20, 1200],
      role: 'check',
      guide: 'The largest tank volume its maker states.',
    }),
    measure('massKg', 'mass', 'kg', {
      plausible: [1, 1000],
      usual: [8, 150],
      role: 'check',
      guide: 'The empty stand on a scale, or its shipping mass less the packing.',
    }),
    measure('heightMm', 'height', 'mm', {
      plausible: [50, 2000],
      usual: [500, 1000],
      role: 'difference',
      guide: 'From the floor to the bearing surface, feet half way out.',
    }),
    boolean('backOpen', 'open back', {
      role: 'difference',
      guide: 'Whether hoses and cords pass without drilling.',
    }),
  ],
}
