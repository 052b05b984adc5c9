import { boolean, choice, groups, measure, set, text } from './build'
import { bodyAttributes, electricAttributes, madeFor } from './common'
import type { Kind } from './types'

export const mountTypes = {
  arm: 'arm on the rim',
  'rim-legs': 'legs on the rim',
  hanging: 'hanging kit',
  ceiling: 'ceiling mount',
  canopy: 'canopy',
} as const

const bandFields = [
  measure('fromNm', 'band from', 'nm', {
    plausible: [280, 1100],
    usual: [380, 700],
    role: 'check',
    guide: 'The shorter wavelength of the band.',
  }),
  measure('toNm', 'band to', 'nm', {
    plausible: [280, 1100],
    usual: [400, 750],
    role: 'check',
    guide: 'The longer wavelength of the band.',
  }),
  measure('share', 'share of photons', 'fraction', {
    plausible: [0, 1],
    usual: [0, 0.9],
    role: 'check',
    guide: 'Photons in the band over all photons, every channel at full power.',
  }),
]

export const light: Kind = {
  key: 'light',
  label: 'light',
  plural: 'lights',
  electric: true,
  additive: false,
  attributes: [
    ...bodyAttributes([5, 3000], [15, 1600]),
    measure('massKg', 'mass', 'kg', {
      plausible: [0.02, 60],
      usual: [0.2, 10],
      role: 'check',
      better: 'less',
      guide: 'The lamp alone on a scale, without mount and power brick.',
    }),
    choice(
      'layout',
      'layout',
      { point: 'one cluster', strip: 'strip', panel: 'panel' },
      {
        role: 'check',
        guide: 'How its light sources are spread over its face.',
      },
    ),
    measure('beamAngleDeg', 'beam angle', 'deg', {
      plausible: [5, 175],
      usual: [60, 130],
      role: 'check',
      guide: 'The full angle between the directions where intensity is half of that straight down.',
    }),
    measure('ppfdUmol', 'PAR straight below', 'umol/m2/s', {
      plausible: [1, 6000],
      usual: [50, 1500],
      role: 'check',
      better: 'more',
      guide: 'A quantum meter in air, straight below the middle, every channel at full power.',
    }),
    measure('ppfdAtMm', 'distance of that reading', 'mm', {
      plausible: [20, 2000],
      usual: [150, 600],
      role: 'check',
      guide: 'From the lens of the lamp to the sensor.',
    }),
    measure('photonFluxUmolS', 'photon flux', 'umol/s', {
      plausible: [0.5, 5000],
      usual: [10, 800],
      role: 'check',
      better: 'more',
      guide: 'All photons from 400 to 700 nm that leave the lamp each second, from an integrating sphere.',
    }),
    groups('bands', 'spectrum', {
      role: 'check',
      guide: 'Shares of photons by wavelength band, from its maker’s plot or a spectrometer.',
      fields: bandFields,
      required: ['fromNm', 'toNm', 'share'],
      phrase: '{share} from {fromNm} to {toNm}',
    }),
    set('mountsIncluded', 'mounts included', mountTypes, { role: 'check' }),
    set('mountsPossible', 'mounts sold apart', mountTypes, { role: 'check' }),
    measure('armRimMinMm', 'thinnest rim for its arm', 'mm', {
      plausible: [0, 80],
      usual: [4, 10],
      role: 'check',
      guide: 'The smallest gap of the clamp.',
    }),
    measure('armRimMaxMm', 'thickest rim for its arm', 'mm', {
      plausible: [2, 120],
      usual: [10, 30],
      role: 'check',
      guide: 'The largest gap of the clamp.',
    }),
    measure('legSpanMinMm', 'shortest span of its legs', 'mm', {
      plausible: [50, 3000],
      usual: [200, 1500],
      role: 'check',
      guide: 'Between the feet, legs pushed in.',
    }),
    measure('legSpanMaxMm', 'longest span of its legs', 'mm', {
      plausible: [50, 3500],
      usual: [250, 1800],
      role: 'check',
      guide: 'Between the feet, legs pulled out.',
    }),
    choice(
      'control',
      'control',
      {
        'app-built-in': 'app, built in',
        'controller-needed': 'app, with a controller',
        'on-unit': 'buttons on the unit',
        'on-off': 'on and off only',
      },
      { role: 'check' },
    ),
    text('controlGroup', 'control group', 40, {
      role: 'check',
      guide: 'The name its maker gives the family of controllers that it listens to.',
    }),
    boolean('dimmable', 'dimmable', { role: 'check', better: 'more' }),
    madeFor,
    ...electricAttributes([1, 2000], [5, 400]),
  ],
}
