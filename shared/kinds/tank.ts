import { boolean, choice, group, groups, measure, text } from './build'
import { madeFor } from './common'
import type { Kind } from './types'

export const chamberFields = [
  {
    ...text('id', 'chamber id', 40, {
      role: 'display',
      guide: 'A short word that items refer to, such as rear-1.',
    }),
    word: true as const,
  },
  text('name', 'chamber name', 60, {
    role: 'display',
    guide: 'What the chamber is called, such as heater chamber.',
  }),
  measure('lengthMm', 'chamber length', 'mm', {
    plausible: [15, 4000],
    usual: [60, 500],
    role: 'check',
    guide: 'Inside, along the length of the tank, between the partitions at their closest.',
  }),
  measure('widthMm', 'chamber width', 'mm', {
    plausible: [15, 2000],
    usual: [60, 250],
    role: 'check',
    guide: 'Inside, from the front partition to the back wall.',
  }),
  measure('waterDepthMm', 'chamber water depth', 'mm', {
    plausible: [20, 2000],
    usual: [120, 500],
    role: 'check',
    guide: 'From the chamber floor to the water at its lowest working level, pump running.',
  }),
  measure('heightMm', 'chamber height', 'mm', {
    plausible: [30, 2500],
    usual: [200, 600],
    role: 'check',
    guide: 'From the chamber floor to whatever is above it: a lid, a shelf or the rim.',
  }),
  measure('openingLengthMm', 'opening length', 'mm', {
    plausible: [15, 4000],
    usual: [50, 500],
    role: 'check',
    guide: 'The narrowest place a piece must pass going in, along the length of the tank.',
  }),
  measure('openingWidthMm', 'opening width', 'mm', {
    plausible: [15, 2000],
    usual: [50, 250],
    role: 'check',
    guide: 'The narrowest place a piece must pass going in, front to back.',
  }),
]

export const tank: Kind = {
  key: 'tank',
  label: 'tank',
  plural: 'tanks',
  electric: false,
  additive: false,
  attributes: [
    measure('outerLengthMm', 'outside length', 'mm', {
      plausible: [100, 6000],
      usual: [250, 2500],
      role: 'check',
      guide: 'Along the front, glass edge to glass edge, without a rim or background.',
    }),
    measure('outerWidthMm', 'outside width', 'mm', {
      plausible: [100, 3000],
      usual: [200, 900],
      role: 'check',
      guide: 'Front to back, glass edge to glass edge.',
    }),
    measure('outerHeightMm', 'outside height', 'mm', {
      plausible: [100, 2500],
      usual: [200, 800],
      role: 'check',
      guide: 'From the underside of the bottom pane to the top edge, without a lid or feet.',
    }),
    measure('wallMm', 'wall thickness', 'mm', {
      plausible: [2, 80],
      usual: [4, 25],
      role: 'check',
      guide: 'Calipers on the top edge of the front pane.',
    }),
    measure('bottomMm', 'bottom thickness', 'mm', {
      plausible: [2, 100],
      usual: [4, 25],
      role: 'check',
      guide: 'Calipers on the bottom pane at an outside edge, or its maker’s drawing.',
    }),
    choice('material', 'material', { glass: 'glass', acrylic: 'acrylic' }, { role: 'check' }),
    measure('nominalVolumeL', 'nominal volume', 'L', {
      plausible: [2, 20000],
      usual: [15, 1200],
      role: 'check',
      guide: 'The volume its maker sells it by.',
    }),
    measure('waterLineMm', 'water line', 'mm', {
      plausible: [50, 2400],
      usual: [180, 750],
      role: 'check',
      guide: 'From the inside floor of the display, without sand, up to the water surface.',
    }),
    measure('displayLengthMm', 'display length', 'mm', {
      plausible: [80, 6000],
      usual: [200, 2500],
      role: 'check',
      guide: 'Inside the display, along the front, without any chamber.',
    }),
    measure('displayWidthMm', 'display width', 'mm', {
      plausible: [80, 3000],
      usual: [150, 900],
      role: 'check',
      guide: 'Inside the display, from the front pane to the back wall or the chamber partition.',
    }),
    choice('rim', 'rim', { rimless: 'rimless', rimmed: 'rimmed', braced: 'braced' }, { role: 'check' }),
    choice('lid', 'lid', { none: 'none', mesh: 'mesh', solid: 'solid' }, { role: 'check' }),
    choice(
      'shape',
      'shape',
      {
        rectangle: 'rectangle',
        cube: 'cube',
        'bow-front': 'bow front',
        cylinder: 'cylinder',
        corner: 'corner',
      },
      { role: 'check', guide: 'Seen from above.' },
    ),
    choice(
      'filtration',
      'filtration',
      {
        'rear-chambers': 'rear chambers',
        sump: 'sump',
        'hang-on': 'hang-on',
        none: 'none',
      },
      { role: 'check', guide: 'How the tank is built to be filtered.' },
    ),
    groups('chambers', 'chambers', {
      role: 'check',
      guide: 'One for each chamber behind or beside the display, first from the left.',
      fields: chamberFields,
      required: ['id'],
    }),
    group('includedPump', 'included return pump', {
      role: 'check',
      fields: [
        measure('flowLph', 'flow of the included pump', 'L/h', {
          plausible: [20, 50000],
          usual: [200, 12000],
          role: 'check',
          guide: 'What its maker states at no head.',
        }),
        measure('maxHeadM', 'maximum head of the included pump', 'm', {
          plausible: [0.1, 30],
          usual: [0.5, 6],
          role: 'check',
          guide: 'The height at which it stops delivering.',
        }),
        measure('powerW', 'power of the included pump', 'W', {
          plausible: [1, 500],
          usual: [3, 120],
          role: 'check',
          guide: 'Read the rating plate.',
        }),
        measure('plugs', 'plugs of the included pump', 'count', {
          plausible: [0, 4],
          usual: [1, 1],
          role: 'check',
          guide: 'Count the mains plugs on its cords.',
        }),
        measure('boreMm', 'bore of the included pump', 'mm', {
          plausible: [4, 110],
          usual: [10, 40],
          role: 'check',
          guide: 'Calipers inside the outlet.',
        }),
      ],
      required: [],
    }),
    measure('returnBoreMm', 'return bore', 'mm', {
      plausible: [4, 110],
      usual: [10, 40],
      role: 'check',
      guide: 'Calipers inside the pipe or hose tail that the return pump feeds.',
    }),
    group('sump', 'included sump', {
      role: 'check',
      fields: [
        measure('lengthMm', 'sump length', 'mm', {
          plausible: [100, 4000],
          usual: [300, 1500],
          role: 'check',
          guide: 'Inside, along its longer side.',
        }),
        measure('widthMm', 'sump width', 'mm', {
          plausible: [100, 2000],
          usual: [200, 600],
          role: 'check',
          guide: 'Inside, across its shorter side.',
        }),
        measure('waterDepthMm', 'sump water depth', 'mm', {
          plausible: [50, 1000],
          usual: [150, 350],
          role: 'check',
          guide: 'From its floor to the working water level.',
        }),
      ],
      required: ['lengthMm', 'widthMm', 'waterDepthMm'],
    }),
    madeFor,
    boolean('standIncluded', 'stand included', { role: 'difference' }),
    measure('dryMassKg', 'dry mass', 'kg', {
      plausible: [0.5, 5000],
      usual: [3, 300],
      role: 'check',
      guide: 'The empty tank on a scale, without its stand.',
    }),
  ],
}
