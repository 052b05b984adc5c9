import { choice, measure } from './build'
import { electricAttributes, madeFor, rodAttributes } from './common'
import type { Kind } from './types'

export const heater: Kind = {
  key: 'heater',
  label: 'heater',
  plural: 'heaters',
  electric: true,
  additive: false,
  attributes: [
    choice(
      'form',
      'form',
      {
        'titanium-rod': 'titanium rod',
        'glass-rod': 'glass rod',
        'polymer-rod': 'polymer rod',
        inline: 'inline',
      },
      { role: 'check' },
    ),
    ...rodAttributes({ plausible: [10, 600], usual: [100, 450] }, { plausible: [5, 120], usual: [12, 45] }),
    measure('ratedVolumeMinL', 'smallest rated volume', 'L', {
      plausible: [0, 10000],
      usual: [5, 1000],
      role: 'check',
      guide: 'The lower end of the tank volumes its maker states.',
    }),
    measure('ratedVolumeMaxL', 'largest rated volume', 'L', {
      plausible: [1, 10000],
      usual: [10, 1200],
      role: 'check',
      guide: 'The upper end of the tank volumes its maker states, or the only one.',
    }),
    choice(
      'thermostat',
      'thermostat',
      {
        'built-in': 'built in',
        'external-included': 'external, included',
        'external-needed': 'external, bought apart',
      },
      {
        role: 'check',
        guide: 'What switches it off when the water is warm enough.',
      },
    ),
    measure('minImmersionMm', 'least immersion', 'mm', {
      plausible: [5, 600],
      usual: [60, 400],
      role: 'check',
      better: 'less',
      guide: 'From its lower end to the mark that must stay under water.',
    }),
    choice(
      'orientation',
      'orientation',
      { vertical: 'upright only', horizontal: 'lying only', any: 'any' },
      { role: 'check', guide: 'How its maker allows it to be placed.' },
    ),
    madeFor,
    ...electricAttributes([2, 5000], [10, 1000]),
  ],
}
