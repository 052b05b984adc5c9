import { gph } from '../amounts'
import { createFamily, estimatedFrom, measuredBy, remeasure, restate } from '../family'
import { british, continental, northAmerica, wideRange } from '../mains'

const step = (flowLph: number) => Math.round(flowLph / 10) * 10

/** The curve printed on a box: H = H0 (1 − (Q/Qm)²), read at five heads. */
const curve = (flowLph: number, headM: number) =>
  [0, 0.25, 0.5, 0.75, 1].map((share) => ({
    headM: Number((share * headM).toFixed(2)),
    flowLph: step(flowLph * Math.sqrt(1 - share)),
  }))

/** Its two ends only. */
const ends = (flowLph: number, headM: number) => [
  { headM: 0, flowLph },
  { headM, flowLph: 0 },
]

const columns = ['flowCurve', 'powerW', 'lengthMm', 'widthMm', 'heightMm', 'boreMm', 'minDepthMm'] as const
const reef = { madeFor: ['reef', 'marine-fish', 'freshwater'], submersible: true }

const returnPumps = [
  ...createFamily({
    kind: 'return-pump',
    brand: 'Eddywright',
    line: 'Nano',
    date: '2024-03-25',
    author: 'nanobrine',
    gtinFrom: 17000,
    common: { ...reef, ...northAmerica, dcControl: false, cordMm: 1500 },
    columns,
    rows: {
      '90': [curve(gph(90), 0.8), 4, 48, 40, 44, 12, 40],
      '130': [curve(gph(130), 0.9), 5, 52, 42, 48, 13, 42],
      '210': [curve(gph(210), 1.2), 8, 62, 48, 55, 13, 46],
      '300': [curve(gph(300), 1.5), 12, 72, 54, 62, 16, 52],
      '420': [curve(gph(420), 1.8), 18, 84, 60, 70, 16, 60],
    },
    later: {
      '210': [
        remeasure('2024-10-12', 'driploop', 'bucket and stopwatch at four heights', {
          flowCurve: [
            [
              { headM: 0, flowLph: 760 },
              { headM: 0.3, flowLph: 650 },
              { headM: 0.6, flowLph: 520 },
              { headM: 0.9, flowLph: 350 },
              { headM: 1.18, flowLph: 0 },
            ],
          ],
        }),
      ],
      '130': [
        remeasure('2025-02-01', 'caliper_crab', 'calipers', {
          lengthMm: [53, 0.5],
          widthMm: [42.4, 0.5],
          heightMm: [48.6, 0.5],
        }),
      ],
    },
  }),
  ...createFamily({
    kind: 'return-pump',
    brand: 'Eddywright',
    line: 'Nano EU',
    date: '2024-03-25',
    author: 'nanobrine',
    common: { ...reef, ...continental, dcControl: false, cordMm: 1500 },
    columns,
    rows: {
      '350': [curve(350, 0.8), 4, 48, 40, 44, 12, 40],
      '500': [curve(500, 0.9), 5, 52, 42, 48, 13, 42],
      '800': [curve(800, 1.3), 9, 62, 48, 55, 13, 46],
      '1200': [curve(1200, 1.6), 14, 72, 54, 62, 16, 52],
    },
  }),
  ...createFamily({
    kind: 'return-pump',
    brand: 'Murrelo',
    line: 'Steady',
    date: '2024-08-05',
    author: 'quietpump',
    gtinFrom: 17020,
    common: { ...reef, ...northAmerica, dcControl: false, cordMm: 1800 },
    columns,
    rows: {
      '600': [curve(gph(600), 2.2), 30, 108, 72, 92, 20, 75],
      '800': [curve(gph(800), 2.6), 42, 122, 80, 102, 20, 82],
      '1100': [curve(gph(1100), 3), 62, 140, 90, 115, 25, 92],
      '1500': [curve(gph(1500), 3.6), 92, 158, 100, 128, 25, 104],
    },
    later: {
      '600': [remeasure('2025-09-07', 'wet_sleeves', 'plug-in meter at one metre of head', { powerW: [27, 1] })],
    },
  }),
  ...createFamily({
    kind: 'return-pump',
    brand: 'Gyrelund',
    line: 'Helix',
    date: '2024-05-13',
    author: 'kelp_and_calipers',
    gtinFrom: 17040,
    common: { ...reef, ...wideRange, dcControl: true, cordMm: 2000 },
    columns,
    rows: {
      '1': [curve(1200, 1.8), 12, 80, 56, 70, 16, 55],
      '2': [curve(2000, 2.4), 20, 95, 66, 82, 20, 62],
      '3': [curve(3000, 3), 32, 112, 76, 95, 20, 72],
      '5': [curve(5000, 3.6), 52, 132, 88, 110, 25, 85],
      '8': [curve(8000, 4.5), 85, 155, 100, 128, 25, 98],
      '12': [curve(12000, 5.5), 140, 182, 115, 148, 32, 115],
    },
    later: {
      '2': [
        restate('2025-02-20', 'kelp_and_calipers', 'New impeller: a little more head', { flowCurve: curve(2000, 2.6) }),
        remeasure('2025-07-19', 'ppt35', 'flow meter on 20 mm hose', {
          flowCurve: [
            [
              { headM: 0, flowLph: 1950 },
              { headM: 0.6, flowLph: 1690 },
              { headM: 1.2, flowLph: 1360 },
              { headM: 1.8, flowLph: 930 },
              { headM: 2.5, flowLph: 0 },
            ],
          ],
        }),
      ],
      '3': [remeasure('2025-07-19', 'ppt35', 'plug-in meter, full speed', { powerW: [30.5, 1] })],
    },
    notes: { '2': 'Its power brick must hang above the floor; the cord to the pump is short.' },
  }),
  ...createFamily({
    kind: 'return-pump',
    brand: 'Fathomwick',
    line: 'Runnel',
    date: '2024-11-04',
    author: 'shelf_of_salt',
    gtinFrom: 17060,
    common: { ...reef, ...british, dcControl: false, cordMm: 1800 },
    columns,
    rows: {
      '700': [curve(700, 1.2), 8, 60, 46, 54, 13, 45],
      '1000': [curve(1000, 1.5), 11, 68, 52, 60, 13, 50],
      '1800': [curve(1800, 2), 22, 88, 62, 76, 20, 60],
      '2500': [curve(2500, 2.4), 32, 100, 70, 86, 20, 68],
      '3500': [curve(3500, 2.8), 48, 118, 78, 98, 25, 78],
      '5500': [curve(5500, 3.4), 75, 140, 90, 116, 25, 92],
    },
    discontinued: ['1000'],
  }),
  ...createFamily({
    kind: 'return-pump',
    brand: 'Isobrine',
    line: 'Quill DC',
    date: '2025-04-28',
    author: 'caliper_crab',
    gtinFrom: 17080,
    common: { ...reef, ...wideRange, dcControl: true },
    columns,
    rows: {
      '800': [curve(800, 1.3), 7, 58, 44, 52, 13, 42],
      '1500': [curve(1500, 2), 14, 82, 56, 70, 16, 52],
      '2500': [curve(2500, 2.8), 26, 102, 70, 86, 20, 66],
      '4000': [curve(4000, 3.4), 44, 124, 82, 104, 25, 80],
      '6000': [curve(6000, 4), 68, 142, 92, 118, 25, 92],
    },
    backing: { minDepthMm: measuredBy('lowered the water until it drew air') },
  }),
  ...createFamily({
    kind: 'return-pump',
    brand: 'Halcyrene',
    line: 'Lift',
    date: '2024-01-09',
    author: 'brackish_bea',
    discontinued: 'all',
    common: { madeFor: ['marine-fish', 'freshwater'], ...northAmerica, submersible: true },
    columns,
    rows: {
      '200': [ends(gph(200), 1.1), 9, 65, 50, 58, 13, null],
      '350': [ends(gph(350), 1.6), 18, 80, 58, 70, 16, null],
      '500': [ends(gph(500), 2), null, 95, 64, 80, 16, null],
      '900': [null, 55, 125, 82, 105, null, null],
    },
    notes: { '900': 'Its curve was never published; the box says only “900”.' },
  }),
  ...createFamily({
    kind: 'return-pump',
    brand: 'Driftanvil',
    line: 'Ram',
    date: '2025-08-18',
    author: 'gallon_goat',
    common: { ...reef, ...northAmerica, dcControl: false },
    columns,
    rows: {
      '250': [ends(gph(250), 1.3), 10, 66, 50, 58, 13, 48],
      '400': [ends(gph(400), 1.9), 18, 82, 60, 70, 16, 58],
      '650': [ends(gph(650), 2.4), 34, 104, 72, 90, 20, 72],
      '1000': [ends(gph(1000), 3), 58, 134, 86, 110, 25, 88],
    },
  }),
  ...createFamily({
    kind: 'return-pump',
    brand: 'Vantrosse',
    line: 'Cascade',
    date: '2025-02-24',
    author: 'oolite_owl',
    common: { ...reef, ...continental, dcControl: true, cordMm: 2000 },
    columns,
    rows: {
      '20': [curve(2000, 2.5), 20, 96, 66, 84, 20, 62],
      '35': [curve(3500, 3.2), 38, 118, 78, 100, 25, 76],
      '60': [curve(6000, 4.2), 70, 146, 94, 120, 25, 94],
      '90': [curve(9000, 5), 105, 166, 106, 136, 32, 106],
    },
    later: { '35': [remeasure('2025-12-19', 'two_left_fins', 'calipers inside the outlet', { boreMm: [24.6, 0.2] })] },
  }),
]

const waveColumns = [
  'flowMinLph',
  'flowMaxLph',
  'wallMinMm',
  'wallMaxMm',
  'outletMm',
  'lengthMm',
  'diameterMm',
  'powerW',
] as const

const wavemakers = [
  ...createFamily({
    kind: 'wavemaker',
    brand: 'Gyrelund',
    line: 'Swell',
    date: '2024-05-13',
    author: 'kelp_and_calipers',
    gtinFrom: 17200,
    common: { madeFor: ['reef', 'marine-fish'], ...wideRange, cordMm: 2000 },
    columns: waveColumns,
    rows: {
      '1': [300, 1500, 0, 8, 32, 62, 48, 4],
      '2': [600, 3000, 4, 10, 42, 78, 60, 8],
      '4': [900, 5000, 5, 12, 55, 92, 72, 14],
      '8': [1500, 9000, 6, 15, 70, 110, 90, 26],
      '15': [2500, 16000, 8, 20, 90, 132, 112, 48],
    },
    later: {
      '2': [
        remeasure('2025-03-22', 'tess_reefs', 'calipers; held on 11 mm of glass plates', {
          wallMaxMm: [11, 0.5],
          diameterMm: [60.4, 0.3],
        }),
      ],
      '4': [remeasure('2025-10-18', 'driploop', 'plug-in meter, full speed', { powerW: [13.2, 0.5] })],
    },
  }),
  ...createFamily({
    kind: 'wavemaker',
    brand: 'Eddywright',
    line: 'Puff',
    date: '2024-03-25',
    author: 'nanobrine',
    gtinFrom: 17220,
    common: { madeFor: ['reef', 'marine-fish', 'freshwater'], ...northAmerica, cordMm: 1500 },
    columns: waveColumns,
    rows: {
      '240': [gph(240), gph(240), 0, 8, 28, 55, 42, 2.5],
      '425': [gph(425), gph(425), 0, 8, 34, 65, 50, 4],
      '600': [gph(600), gph(600), 4, 10, 40, 74, 58, 5.5],
      '850': [gph(850), gph(850), 4, 10, 46, 82, 64, 7],
      '1250': [gph(1250), gph(1250), 5, 12, 54, 92, 72, 11],
    },
    discontinued: ['850'],
  }),
  ...createFamily({
    kind: 'wavemaker',
    brand: 'Fathomwick',
    line: 'Gust',
    date: '2024-11-04',
    author: 'shelf_of_salt',
    common: { madeFor: ['reef', 'marine-fish'], ...british, cordMm: 1800 },
    columns: waveColumns,
    rows: {
      '900': [900, 900, 0, 8, 30, 58, 46, 3],
      '1600': [1600, 1600, 3, 10, 36, 68, 54, 4.5],
      '2800': [2800, 2800, 4, 12, 46, 82, 66, 8],
      '5000 DC': [1000, 5000, 5, 15, 58, 95, 76, 15],
      '10000 DC': [2000, 10000, 8, 19, 74, 116, 96, 30],
    },
  }),
  ...createFamily({
    kind: 'wavemaker',
    brand: 'Brinmere',
    line: 'Rill',
    date: '2025-04-14',
    author: 'quietpump',
    gtinFrom: 17240,
    common: { madeFor: ['reef', 'marine-fish'], ...wideRange },
    columns: waveColumns,
    rows: {
      R2: [400, 2000, 3, 10, 38, 70, 56, 6],
      R4: [800, 4000, 4, 12, 50, 86, 68, 11],
      R7: [1200, 7000, 6, 15, 64, 104, 84, 20],
      R12: [2000, 12000, 8, 20, 82, 124, 102, 36],
    },
    later: { R2: [remeasure('2026-01-25', 'nanobrine', 'calipers', { lengthMm: [71, 0.5], outletMm: [37.6, 0.3] })] },
  }),
  ...createFamily({
    kind: 'wavemaker',
    brand: 'Vantrosse',
    line: 'Roller',
    date: '2025-02-24',
    author: 'oolite_owl',
    common: { madeFor: ['reef'], ...continental },
    columns: waveColumns,
    rows: {
      '150': [800, 4500, 5, 12, 24, 150, 40, 14],
      '200': [1200, 8000, 6, 15, 28, 200, 46, 24],
      '280': [1800, 13000, 8, 19, 32, 280, 52, 40],
    },
    notes: { '150': 'A long roller rather than a propeller: it lies along the rim.' },
  }),
  ...createFamily({
    kind: 'wavemaker',
    brand: 'Driftanvil',
    line: 'Spin',
    date: '2025-08-18',
    author: 'gallon_goat',
    common: { ...northAmerica },
    columns: [...waveColumns, 'madeFor'],
    rows: {
      '500': [gph(500), gph(500), null, 10, 36, 70, 54, 5, ['reef', 'freshwater']],
      '800': [gph(800), gph(800), null, null, 44, 80, 62, 7, ['reef', 'freshwater']],
      '1300': [null, gph(1300), 5, 12, 54, 92, 74, 12, null],
      pond: [gph(2600), gph(2600), 6, 12, 80, 130, 105, 28, ['freshwater']],
    },
    backing: { lengthMm: estimatedFrom('scaled from a photo') },
  }),
  ...createFamily({
    kind: 'wavemaker',
    brand: 'Isobrine',
    line: 'Tick',
    date: '2025-04-28',
    author: 'caliper_crab',
    common: { madeFor: ['reef', 'marine-fish'], ...wideRange },
    columns: waveColumns,
    rows: {
      T1: [250, 1200, 0, 8, 30, 56, 44, 3],
      T3: [600, 3200, 4, 12, 44, 80, 62, 8],
      T6: [1100, 6000, 6, 15, 60, 100, 80, 17],
    },
  }),
]

export const pumps = [...returnPumps, ...wavemakers]
