import { gal, inch } from '../amounts'
import { measuredTo, remeasure } from '../family'
import { createTanks, drawTank, inches } from '../tank-shape'

const reef = { shape: 'rectangle', madeFor: ['reef', 'marine-fish', 'freshwater'] }
const rimless = { ...reef, rim: 'rimless', lid: 'none' }

const weir = (lengthMm: number, widthMm: number, waterDepthMm: number) => ({
  filtration: 'sump',
  sump: { lengthMm, widthMm, waterDepthMm },
  standIncluded: true,
})

const panehavenSump = createTanks(
  {
    brand: 'Panehaven',
    line: 'Weir',
    date: '2024-03-04',
    author: 'oolite_owl',
    gtinFrom: 13060,
    common: { ...rimless, returnBoreMm: 25 },
    discontinued: ['180'],
    later: {
      '300': [
        remeasure('2025-07-12', 'shelf_of_salt', 'tape, pump off', {
          sump: [{ lengthMm: 702, widthMm: 379, waterDepthMm: 236 }],
        }),
      ],
    },
  },
  {
    '180': { ...drawTank([750, 500, 500, 10, 10], 178, 50), ...weir(520, 340, 210) },
    '240': { ...drawTank([900, 500, 550, 10, 12], 240, 50), ...weir(620, 360, 220) },
    '300': { ...drawTank([1000, 550, 550, 12, 12], 300, 50), ...weir(700, 380, 230) },
    '360': { ...drawTank([1200, 550, 560, 12, 15], 360, 55), ...weir(800, 390, 240) },
    '400': { ...drawTank([1200, 600, 570, 12, 15], 400, 55), ...weir(820, 420, 240) },
  },
)

const quayhollow = createTanks(
  {
    brand: 'Quayhollow',
    line: 'Ledge',
    date: '2024-05-20',
    author: 'brackish_bea',
    common: { ...reef, lid: 'none', returnBoreMm: inch(1) },
    backing: { wallMm: measuredTo(0.2, 'calipers on the top edge') },
    later: {
      '75': [remeasure('2025-02-09', 'two_left_fins', 'tape', { outerLengthMm: [1220, 2], outerWidthMm: [460, 2] })],
    },
  },
  {
    '40': { ...drawTank(inches(36, 18, 16, 8, 10), gal(40), 45), ...weir(500, 300, 210), rim: 'rimless' },
    '50': { ...drawTank(inches(36, 18, 18, 10, 10), gal(50), 45), ...weir(560, 300, 215), rim: 'rimless' },
    '65': { ...drawTank(inches(36, 18, 24, 10, 12), gal(65), 50), ...weir(600, 320, 225), rim: 'rimmed' },
    '75': { ...drawTank(inches(48, 18, 20, 10, 12), gal(75), 50), ...weir(700, 320, 225), rim: 'rimmed' },
    '90': { ...drawTank(inches(48, 18, 24, 10, 12), gal(90), 50), ...weir(720, 330, 230), rim: 'braced' },
    '100': {
      ...drawTank(inches(48, 24, 20, 12, 12), gal(98), 50),
      filtration: 'sump',
      standIncluded: false,
      rim: 'braced',
    },
  },
)

const brackenfinPlain = createTanks(
  {
    brand: 'Brackenfin',
    line: 'Plain',
    date: '2024-09-16',
    author: 'two_left_fins',
    gtinFrom: 13080,
    common: { ...rimless, filtration: 'none', standIncluded: false },
  },
  {
    '40': drawTank([450, 300, 300, 5, 5], 39, 25),
    '60': drawTank([600, 300, 360, 6, 6], 62, 30),
    '64': { ...drawTank([400, 400, 400, 6, 6], 62, 30), shape: 'cube' },
    '90': { ...drawTank([450, 450, 450, 8, 8], 88, 30), shape: 'cube' },
    '120': drawTank([600, 450, 450, 8, 8], 118, 30),
    '180': drawTank([900, 450, 450, 10, 10], 176, 35),
    '240': drawTank([1200, 450, 450, 10, 12], 238, 35),
  },
)

/** Sizes that any maker sells; the walls differ. */
const brackenfinTrade = createTanks(
  {
    brand: 'Brackenfin',
    line: 'Bench',
    date: '2024-09-16',
    author: 'two_left_fins',
    common: { ...reef, rim: 'rimmed', filtration: 'none', standIncluded: false },
    later: { '20 long': [remeasure('2025-11-23', 'gallon_goat', 'calipers inside the rim', { wallMm: [5.1, 0.2] })] },
  },
  {
    '10': { ...drawTank(inches(20, 10, 12, 4, 4), gal(10), 30), lid: 'solid' },
    '15': { ...drawTank(inches(24, 12, 12, 4, 5), gal(15), 30), lid: 'solid' },
    '20 high': { ...drawTank(inches(24, 12, 16, 5, 5), gal(20), 30), lid: 'mesh' },
    '20 long': { ...drawTank(inches(30, 12, 12, 5, 5), gal(20), 30), lid: 'mesh' },
    '29': { ...drawTank(inches(30, 12, 18, 5, 6), gal(29), 35), lid: 'none' },
    '40 breeder': { ...drawTank(inches(36, 18, 16, 6, 8), gal(40), 35), lid: 'none' },
    '55': { ...drawTank(inches(48, 13, 21, 8, 8), gal(55), 40), lid: 'none' },
    '75': { ...drawTank(inches(48, 18, 21, 10, 10), gal(75), 40), lid: 'none' },
  },
)

const cleavepane = createTanks(
  {
    brand: 'Cleavepane',
    line: 'Outlook',
    date: '2025-02-17',
    author: 'rimless_rae',
    gtinFrom: 13110,
    common: { ...rimless, filtration: 'hang-on' },
    later: {
      '75': [
        remeasure('2025-12-13', 'tess_reefs', 'tape and calipers', { outerWidthMm: [361, 1], wallMm: [7.9, 0.1] }),
      ],
    },
  },
  {
    '45': drawTank([500, 300, 320, 5, 6], 45, 30),
    '75': drawTank([600, 360, 360, 8, 8], 73, 32),
    '110': drawTank([750, 400, 380, 8, 8], 110, 32),
    '150': drawTank([900, 420, 420, 10, 10], 152, 35),
    '200': drawTank([1000, 450, 460, 10, 12], 198, 35),
  },
)

const kalkmoor = createTanks(
  {
    brand: 'Kalkmoor',
    line: 'Basin',
    date: '2024-10-21',
    author: 'kelp_and_calipers',
    common: { madeFor: ['reef', 'marine-fish'], lid: 'none' },
    discontinued: ['bow 46'],
  },
  {
    '60': {
      ...drawTank(inches(48, 18, 16, 10, 10), gal(58), 45, 'acrylic'),
      ...weir(600, 300, 220),
      rim: 'braced',
      shape: 'rectangle',
    },
    '90': {
      ...drawTank(inches(48, 20, 22, 12, 12), gal(88), 45, 'acrylic'),
      ...weir(700, 330, 230),
      rim: 'braced',
      shape: 'rectangle',
    },
    'bow 46': {
      outerLengthMm: inch(36),
      outerWidthMm: inch(16),
      outerHeightMm: inch(20),
      material: 'glass',
      nominalVolumeL: gal(46),
      rim: 'rimmed',
      shape: 'bow-front',
      filtration: 'none',
    },
    'column 30': {
      outerLengthMm: inch(18),
      outerWidthMm: inch(18),
      outerHeightMm: inch(30),
      material: 'acrylic',
      nominalVolumeL: gal(30),
      rim: 'braced',
      shape: 'cylinder',
      filtration: 'none',
    },
    'corner 54': {
      outerLengthMm: inch(27),
      outerWidthMm: inch(27),
      outerHeightMm: inch(22),
      wallMm: 8,
      material: 'glass',
      nominalVolumeL: gal(54),
      rim: 'rimmed',
      shape: 'corner',
      filtration: 'none',
    },
  },
)

export const openTanks = [
  ...panehavenSump,
  ...quayhollow,
  ...brackenfinPlain,
  ...brackenfinTrade,
  ...cleavepane,
  ...kalkmoor,
]
