import { gal } from '../amounts'
import { createFamily, remeasure, restate } from '../family'
import { british, continental, northAmerica, wideRange } from '../mains'

const skimmerColumns = [
  'lengthMm',
  'widthMm',
  'heightMm',
  'waterDepthMinMm',
  'waterDepthMaxMm',
  'ratedVolumeL',
  'powerW',
] as const

const skimmers = [
  ...createFamily({
    kind: 'skimmer',
    brand: 'Pellucine',
    line: 'Foam nano',
    date: '2024-09-23',
    author: 'oolite_owl',
    gtinFrom: 18000,
    common: { madeFor: ['reef', 'marine-fish'], ...british, cordMm: 1500 },
    columns: skimmerColumns,
    rows: {
      '50': [72, 60, 270, 150, 260, 75, 3],
      '80': [88, 74, 300, 180, 280, 120, 4],
      '120': [110, 86, 340, 200, 310, 180, 6],
    },
    later: {
      '80': [
        remeasure('2025-04-27', 'caliper_crab', 'calipers and steel rule', {
          lengthMm: [90, 1],
          widthMm: [75, 1],
          heightMm: [303, 2],
        }),
      ],
    },
  }),
  ...createFamily({
    kind: 'skimmer',
    brand: 'Pellucine',
    line: 'Foam nano US',
    date: '2024-09-23',
    author: 'oolite_owl',
    common: { madeFor: ['reef', 'marine-fish'], ...northAmerica, cordMm: 1500 },
    columns: skimmerColumns,
    rows: {
      '20': [72, 60, 270, 150, 260, gal(20), 3],
      '30': [88, 74, 300, 180, 280, gal(32), 4],
      '45': [110, 86, 340, 200, 310, gal(48), 6],
    },
  }),
  ...createFamily({
    kind: 'skimmer',
    brand: 'Skerrowen',
    line: 'Lather',
    date: '2024-11-11',
    author: 'nanobrine',
    gtinFrom: 18010,
    common: { madeFor: ['reef', 'marine-fish'], ...continental, cordMm: 1500 },
    columns: skimmerColumns,
    rows: {
      '60': [80, 64, 255, 140, 230, 90, 3],
      '100': [95, 78, 300, 160, 270, 150, 5],
      '160': [140, 120, 410, 160, 220, 250, 8],
      '250': [190, 150, 470, 170, 230, 400, 12],
    },
  }),
  ...createFamily({
    kind: 'skimmer',
    brand: 'Fathomwick',
    line: 'Crest',
    date: '2024-11-04',
    author: 'shelf_of_salt',
    gtinFrom: 18020,
    common: { madeFor: ['reef', 'marine-fish'], ...wideRange, cordMm: 2000 },
    columns: skimmerColumns,
    rows: {
      '110': [160, 125, 430, 150, 200, 300, 7],
      '130': [195, 150, 480, 180, 230, 500, 11],
      '150': [230, 180, 520, 200, 240, 800, 16],
      '180': [270, 210, 560, 200, 250, 1200, 24],
      '200': [310, 240, 590, 210, 260, 1600, 32],
    },
    later: {
      '130': [
        restate('2025-05-15', 'shelf_of_salt', 'A narrower window on the new sheet', {
          waterDepthMinMm: 190,
          waterDepthMaxMm: 220,
        }),
        remeasure('2025-09-01', 'driploop', 'tape, cup on', { heightMm: [486, 2] }),
      ],
    },
  }),
  ...createFamily({
    kind: 'skimmer',
    brand: 'Halcyrene',
    line: 'Froth',
    date: '2024-01-09',
    author: 'brackish_bea',
    discontinued: 'all',
    common: { madeFor: ['marine-fish'], ...northAmerica },
    columns: skimmerColumns,
    rows: {
      '40': [110, 90, 360, null, null, gal(40), 8],
      '75': [170, 140, 450, 150, 230, gal(75), 14],
      '125': [210, null, 520, 150, 250, gal(125), 22],
    },
  }),
  ...createFamily({
    kind: 'skimmer',
    brand: 'Driftanvil',
    line: 'Bellows',
    date: '2025-08-18',
    author: 'gallon_goat',
    common: { madeFor: ['reef', 'marine-fish'], ...northAmerica },
    columns: skimmerColumns,
    rows: {
      B1: [84, 70, 280, 160, 270, gal(25), 4],
      B2: [150, 120, 420, 160, 220, gal(70), 8],
      B3: [200, 155, 490, 180, 240, gal(130), 14],
      B4: [250, 200, 550, 200, 260, gal(220), 24],
    },
  }),
  ...createFamily({
    kind: 'skimmer',
    brand: 'Corvelune',
    line: 'Meringue',
    date: '2025-10-13',
    author: 'rimless_rae',
    common: { madeFor: ['reef', 'marine-fish'], ...wideRange },
    columns: skimmerColumns,
    rows: {
      XS: [64, 56, 240, 130, 230, 60, 3],
      S: [86, 70, 290, 160, 270, 120, 5],
      M: [150, 118, 420, 160, 220, 300, 9],
      L: [205, 160, 490, 180, 230, 600, 15],
    },
  }),
]

const topOffColumns = ['lengthMm', 'widthMm', 'pumpHeadM', 'reservoirL', 'powerW'] as const

const topOffs = [
  ...createFamily({
    kind: 'auto-top-off',
    brand: 'Tideledger',
    line: 'Level',
    date: '2025-03-24',
    author: 'gallon_goat',
    gtinFrom: 18100,
    common: { ...wideRange, cordMm: 1800 },
    columns: topOffColumns,
    rows: {
      Eye: [32, 28, 1.5, null, 4],
      'Eye 10': [32, 28, 1.5, 10, 4],
      'Eye Pro': [42, 30, 2.2, null, 6],
    },
    later: {
      Eye: [
        remeasure('2025-08-31', 'caliper_crab', 'calipers, magnet included', {
          lengthMm: [33.5, 0.5],
          widthMm: [29, 0.5],
        }),
      ],
    },
    notes: { Eye: 'Sold without a reservoir.' },
  }),
  ...createFamily({
    kind: 'auto-top-off',
    brand: 'Saltquill',
    line: 'Drip',
    date: '2024-08-21',
    author: 'quietpump',
    gtinFrom: 18110,
    common: { ...northAmerica, cordMm: 1500 },
    columns: topOffColumns,
    rows: {
      float: [48, 40, 1.2, null, 5],
      'float 2.5': [48, 40, 1.2, gal(2.5), 5],
      'float 5': [48, 40, 1.2, gal(5), 5],
      'twin float': [70, 44, 1.8, gal(5), 6],
    },
    discontinued: ['float 2.5'],
  }),
  ...createFamily({
    kind: 'auto-top-off',
    brand: 'Fathomwick',
    line: 'Refill',
    date: '2024-11-04',
    author: 'shelf_of_salt',
    common: { ...british, cordMm: 1800 },
    columns: topOffColumns,
    rows: {
      S: [38, 30, 1.2, 6, 4],
      M: [38, 30, 1.6, 12, 5],
      L: [38, 30, 2, 25, 6],
      XL: [38, 30, 2.5, 45, 8],
    },
  }),
  ...createFamily({
    kind: 'auto-top-off',
    brand: 'Isobrine',
    line: 'Meniscus',
    date: '2025-04-28',
    author: 'caliper_crab',
    common: { ...wideRange },
    columns: topOffColumns,
    rows: {
      Mini: [26, 22, 0.9, 3, 2.5],
      Duo: [36, 26, 1.5, 8, 4],
      Max: [36, 26, 3, null, 9],
    },
  }),
  ...createFamily({
    kind: 'auto-top-off',
    brand: 'Panehaven',
    line: 'Brim',
    date: '2025-11-24',
    author: 'oolite_owl',
    common: { ...continental },
    columns: topOffColumns,
    rows: {
      '7': [34, 28, 1.4, 7, 4],
      '15': [34, 28, 1.4, 15, 4],
      '30': [null, null, 2, 30, 6],
    },
  }),
]

export const filtration = [...skimmers, ...topOffs]
