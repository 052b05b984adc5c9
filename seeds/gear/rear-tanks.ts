import { gph } from '../amounts'
import { estimatedFrom, remeasure, restate } from '../family'
import { createTanks, drawRearTanks, drawTank } from '../tank-shape'

const reef = { shape: 'rectangle', madeFor: ['reef', 'marine-fish', 'freshwater'] }
const rimless = { ...reef, rim: 'rimless', lid: 'none' }

/** Its heater chamber is a little over 5 × 4 in, the size that many small tanks share. */
const measuredChambers = [
  {
    id: 'intake',
    name: 'intake and sponge chamber',
    lengthMm: 215,
    widthMm: 100,
    waterDepthMm: 268,
    heightMm: 297,
    openingLengthMm: 205,
    openingWidthMm: 92,
  },
  { id: 'heater', name: 'heater chamber', lengthMm: 128, widthMm: 100, waterDepthMm: 262, heightMm: 297 },
  { id: 'pump', name: 'return pump chamber', lengthMm: 238, widthMm: 100, waterDepthMm: 236, heightMm: 297 },
]

const glaswend = createTanks(
  {
    brand: 'Glaswend',
    line: 'Alcove',
    date: '2024-01-22',
    author: 'tess_reefs',
    gtinFrom: 13000,
    common: { ...rimless, standIncluded: false },
    discontinued: ['25'],
    later: {
      '20': [
        remeasure('2024-08-18', 'caliper_crab', 'steel rule, three readings a side', {
          outerLengthMm: [609, 1],
          outerWidthMm: [458, 1],
          outerHeightMm: [305, 1],
        }),
        remeasure('2025-03-16', 'driploop', 'inside calipers and steel rule, pump running', {
          chambers: [measuredChambers],
        }),
      ],
      '32': [
        restate('2025-06-30', 'tess_reefs', 'A stronger pump since this year', {
          includedPump: { flowLph: gph(360), maxHeadM: 1.7, powerW: 15, plugs: 1, boreMm: 16 },
        }),
      ],
      '12': [remeasure('2025-10-04', 'nanobrine', 'tape', { waterLineMm: [286, 2] })],
    },
    notes: { '20': 'The heater chamber is a little over 5 × 4 in inside; a rod of 10 in stands upright in it.' },
  },
  drawRearTanks('us', {
    '12': [18, 13, 13, 6, 6, 12, 38, 82, 150, 265, 122, 260, 163, 230, 130, 0.9, 5, 13],
    '15': [20, 14, 13, 6, 6, 15, 38, 89, 168, 265, 125, 260, 192, 230, 160, 1.1, 6, 13],
    '20': [24, 18, 12, 6, 8, 20, 35, 102, 216, 266, 127, 262, 239, 236, 210, 1.2, 8, 13],
    '25': [24, 16, 16, 8, 8, 25, 40, 95, 210, 350, 130, 345, 240, 300, 260, 1.4, 11, 13],
    '32': [24, 18, 18, 8, 10, 32, 42, 108, 212, 398, 132, 390, 240, 345, 300, 1.5, 12, 16],
    '40': [30, 18, 18, 10, 10, 40, 42, 115, 260, 398, 160, 390, 310, 345, 420, 1.8, 18, 16],
    '60': [36, 20, 20, 10, 12, 58, 45, 127, 300, 440, 200, 430, 380, 380, 580, 2.2, 28, 20],
    '75': [42, 21, 21, 12, 12, 75, 45, 140, 360, 465, 240, 455, 425, 400, 740, 2.5, 38, 20],
  }),
)

const panehaven = createTanks(
  {
    brand: 'Panehaven',
    line: 'Nook',
    date: '2024-03-04',
    author: 'oolite_owl',
    gtinFrom: 13020,
    common: { ...rimless, standIncluded: false },
    backing: { dryMassKg: estimatedFrom('panes computed from the drawing') },
    later: {
      '75': [
        remeasure('2025-01-26', 'saltmarsh_jo', 'steel rule, water running', {
          outerLengthMm: [551, 1],
          waterLineMm: [316, 2],
        }),
      ],
      '170': [remeasure('2025-09-21', 'wet_sleeves', 'steel rule', { outerHeightMm: [481, 1], wallMm: [9.9, 0.1] })],
    },
  },
  {
    ...drawRearTanks('metric', {
      '45': [450, 300, 350, 5, 6, 44, 40, 85, 150, 285, 110, 280, 170, 245, 500, 0.9, 5, 13],
      '60': [500, 350, 360, 6, 6, 60, 40, 95, 170, 295, 120, 290, 188, 250, 650, 1.2, 7, 13],
      '75': [550, 400, 360, 6, 8, 75, 40, 110, 190, 292, 130, 288, 208, 250, 800, 1.3, 9, 13],
      '90': [600, 400, 400, 8, 8, 90, 42, 105, 210, 328, 140, 322, 224, 280, 900, 1.4, 10, 13],
      '120': [650, 450, 430, 8, 8, 118, 42, 110, 220, 358, 160, 350, 244, 305, 1200, 1.6, 14, 16],
      '170': [750, 500, 480, 10, 10, 170, 45, 120, 255, 402, 185, 395, 280, 345, 1800, 2, 22, 20],
      '220': [900, 500, 500, 10, 12, 215, 45, 130, 300, 420, 220, 412, 350, 360, 2400, 2.3, 30, 20],
    }),
    // Its maker does not say where the partitions stand.
    '300': { ...drawTank([1100, 550, 520, 12, 12], 295, 48), filtration: 'rear-chambers' },
  },
)

const thessarine = createTanks(
  {
    brand: 'Thessarine',
    line: 'Cove',
    date: '2024-07-08',
    author: 'gallon_goat',
    gtinFrom: 13040,
    common: { ...reef, rim: 'braced', lid: 'solid' },
    later: { '20': [remeasure('2025-05-05', 'caliper_crab', 'calipers on the edge', { wallMm: [5.8, 0.1] })] },
    notes: { '20': 'Acrylic scratches easily: no steel, and rinse the sand off every pad.' },
  },
  drawRearTanks(
    'us',
    {
      '14': [18, 14, 14, 6, 6, 14, 40, 85, 150, 280, 125, 275, 158, 240, 140, 1, 5, 13],
      '20': [22, 16, 14, 6, 6, 20, 40, 100, 200, 282, 130, 276, 200, 240, 200, 1.2, 8, 13],
      '28': [24, 17, 17, 8, 8, 28, 42, 104, 210, 360, 140, 352, 228, 310, 280, 1.5, 12, 13],
      '38': [28, 18, 19, 8, 10, 38, 45, 110, 250, 405, 160, 396, 272, 350, 380, 1.8, 17, 16],
      '55': [34, 20, 20, 10, 10, 54, 45, 120, 300, 430, 200, 420, 332, 370, 520, 2.1, 26, 20],
    },
    'acrylic',
  ),
)

const halcyrene = createTanks(
  {
    brand: 'Halcyrene',
    line: 'Shallows',
    date: '2024-01-09',
    author: 'brackish_bea',
    common: { ...rimless },
    discontinued: ['50'],
  },
  drawRearTanks('us', {
    '20': [24, 20, 10, 8, 8, 20, 32, 105, 190, 210, 175, 206, 215, 190, 200, 1.1, 8, 13],
    '30': [30, 20, 12, 8, 8, 30, 34, 110, 240, 255, 220, 250, 270, 230, 300, 1.4, 12, 16],
    '50': [36, 24, 14, 10, 10, 50, 36, 125, 300, 300, 260, 292, 320, 265, 450, 1.8, 20, 20],
  }),
)

const wrasselund = createTanks(
  {
    brand: 'Wrasselund',
    line: 'Ridge',
    date: '2025-05-12',
    author: 'quietpump',
    gtinFrom: 13130,
    common: { ...rimless, lid: 'mesh', standIncluded: false },
    later: { '80': [remeasure('2026-02-08', 'nanobrine', 'inside calipers', { waterLineMm: [330, 2] })] },
  },
  drawRearTanks('metric', {
    '40': [420, 320, 320, 5, 6, 40, 40, 78, 130, 260, 105, 255, 165, 225, 450, 0.9, 5, 13],
    '60': [520, 340, 360, 6, 6, 60, 40, 90, 180, 298, 120, 292, 196, 255, 650, 1.2, 7, 13],
    '80': [560, 400, 380, 6, 8, 80, 40, 100, 190, 318, 140, 312, 206, 270, 850, 1.3, 9, 13],
    '110': [620, 440, 420, 8, 8, 108, 42, 110, 210, 352, 150, 345, 232, 300, 1100, 1.6, 13, 16],
    '150': [700, 480, 460, 10, 10, 148, 44, 115, 240, 388, 170, 380, 258, 330, 1500, 1.9, 18, 16],
    '200': [850, 500, 490, 10, 10, 198, 45, 122, 280, 415, 210, 406, 328, 355, 2100, 2.2, 27, 20],
  }),
)

const skerrowen = createTanks(
  {
    brand: 'Skerrowen',
    line: 'Cubelet',
    date: '2024-11-11',
    author: 'nanobrine',
    gtinFrom: 13150,
    common: { ...rimless, shape: 'cube' },
    discontinued: ['25'],
    later: {
      '60': [
        remeasure('2025-08-24', 'caliper_crab', 'steel rule; filled from a measuring jug', {
          outerHeightMm: [401, 1],
          nominalVolumeL: [56.5, 1],
        }),
      ],
    },
  },
  drawRearTanks('metric', {
    '25': [300, 300, 320, 5, 5, 26, 35, 68, 130, 262, 0, 0, 155, 235, 350, 0.8, 4, 12],
    '40': [350, 350, 360, 5, 6, 40, 38, 78, 120, 298, 90, 292, 120, 260, 450, 0.9, 5, 13],
    '60': [400, 400, 400, 6, 8, 59, 40, 88, 140, 330, 100, 324, 138, 285, 650, 1.2, 7, 13],
    '85': [450, 450, 450, 8, 8, 84, 42, 95, 150, 376, 115, 368, 159, 320, 900, 1.4, 10, 13],
    '120': [500, 500, 500, 10, 10, 116, 45, 105, 165, 420, 130, 410, 175, 360, 1200, 1.6, 14, 16],
    '200': [600, 600, 600, 12, 12, 202, 48, 120, 205, 510, 160, 498, 201, 440, 2100, 2.2, 27, 20],
  }),
)

export const rearTanks = [...glaswend, ...panehaven, ...thessarine, ...halcyrene, ...wrasselund, ...skerrowen]
