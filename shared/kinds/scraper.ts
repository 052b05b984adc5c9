import { boolean, choice, measure, set } from './build'
import type { Kind } from './types'

export const scraper: Kind = {
  key: 'scraper',
  label: 'scraper',
  plural: 'scrapers',
  electric: false,
  additive: false,
  attributes: [
    choice('form', 'form', { magnet: 'magnet', handheld: 'handheld' }, { role: 'check' }),
    measure('wallMinMm', 'thinnest wall', 'mm', {
      plausible: [0, 60],
      usual: [3, 12],
      role: 'check',
      guide: 'The thinnest wall its maker states for the magnet.',
    }),
    measure('wallMaxMm', 'thickest wall', 'mm', {
      plausible: [2, 100],
      usual: [6, 30],
      role: 'check',
      guide: 'The thickest wall its maker states for the magnet.',
    }),
    set(
      'blades',
      'blades',
      { pad: 'pad', plastic: 'plastic', steel: 'steel' },
      { role: 'check', guide: 'What touches the pane.' },
    ),
    boolean('acrylicSafe', 'safe on acrylic', {
      role: 'check',
      better: 'more',
    }),
    measure('lengthMm', 'length', 'mm', {
      plausible: [20, 2500],
      usual: [50, 900],
      role: 'check',
      guide: 'From the end of the handle to the blade; the inner half of a magnet along its longer side.',
    }),
  ],
}
