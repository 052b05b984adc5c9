import { gal, gpd, lb, psi } from '../amounts'
import { createFamily, estimatedFrom, measuredBy, remeasure, restate } from '../family'
import { british, continental, northAmerica, wideRange } from '../mains'

const roColumns = [
  'stages',
  'membraneLpd',
  'testPressureKPa',
  'testTempC',
  'testTdsPpm',
  'minFeedKPa',
  'wasteRatio',
  'rejectionFraction',
  'tdsMeterIncluded',
] as const
const three = ['sediment', 'carbon', 'membrane']
const four = [...three, 'deionisation']

const roUnits = [
  ...createFamily({
    kind: 'ro-unit',
    brand: 'Thessarine',
    line: 'Spring',
    date: '2024-04-15',
    author: 'saltmarsh_jo',
    gtinFrom: 20000,
    common: { boosterIncluded: false },
    columns: roColumns,
    rows: {
      '50 RO': [three, gpd(50), psi(50), 25, 250, psi(40), 4, 0.96, false],
      '75 RO/DI': [four, gpd(75), psi(50), 25, 250, psi(40), 4, 0.97, false],
      '100 RO/DI': [four, gpd(100), psi(60), 25, 250, psi(45), 4, 0.96, true],
      '150 RO/DI': [four, gpd(150), psi(65), 25, 500, psi(50), 3, 0.97, true],
    },
    later: {
      '75 RO/DI': [
        remeasure('2024-11-16', 'driploop', 'ten minutes into a measuring jug, product and waste', {
          wasteRatio: [3.6, 0.2],
        }),
        remeasure('2025-05-09', 'ppt35', 'TDS meter before and after the membrane', {
          rejectionFraction: [0.975, 0.005],
        }),
      ],
    },
  }),
  ...createFamily({
    kind: 'ro-unit',
    brand: 'Thessarine',
    line: 'Spring B',
    date: '2024-04-15',
    author: 'saltmarsh_jo',
    gtinFrom: 20010,
    common: { boosterIncluded: true },
    columns: roColumns,
    rows: {
      '75 RO/DI': [four, gpd(75), psi(50), 25, 250, psi(15), 2.5, 0.97, true],
      '100 RO/DI': [four, gpd(100), psi(60), 25, 250, psi(15), 2.5, 0.97, true],
    },
  }),
  ...createFamily({
    kind: 'ro-unit',
    brand: 'Osmarrow',
    line: 'Clear',
    date: '2024-08-26',
    author: 'shelf_of_salt',
    common: { boosterIncluded: false },
    columns: roColumns,
    rows: {
      '190 RO': [three, 190, 350, 25, 250, 280, 4, 0.95, false],
      '190': [four, 190, 350, 25, 250, 280, 4, 0.95, false],
      '285': [four, 285, 350, 25, 250, 280, 3, 0.96, false],
      '380': [four, 380, 410, 25, 250, 300, 3, 0.96, true],
      '570': [four, 570, 410, 25, 500, 320, 2, 0.97, true],
    },
    discontinued: ['190'],
    later: { '285': [restate('2025-07-01', 'shelf_of_salt', 'A meter now comes with it', { tdsMeterIncluded: true })] },
  }),
  ...createFamily({
    kind: 'ro-unit',
    brand: 'Isobrine',
    line: 'Null',
    date: '2025-01-06',
    author: 'caliper_crab',
    gtinFrom: 20030,
    common: { boosterIncluded: false },
    columns: roColumns,
    rows: {
      '75': [four, gpd(75), psi(50), 25, 250, psi(40), 3, 0.98, true],
      '90': [four, gpd(90), psi(65), 25, 500, psi(45), 3, 0.98, true],
      '150 twin': [four, gpd(150), psi(50), 25, 250, psi(45), 2, 0.98, true],
      '75 travel': [['carbon', 'membrane', 'deionisation'], gpd(75), psi(50), 25, 250, psi(40), 4, 0.96, false],
    },
  }),
  ...createFamily({
    kind: 'ro-unit',
    brand: 'Reagentry',
    line: 'Tap',
    date: '2025-05-26',
    author: 'wet_sleeves',
    common: { boosterIncluded: false },
    columns: roColumns,
    rows: {
      polisher: [['deionisation'], null, null, null, null, null, null, null, false],
      prefilter: [['sediment', 'carbon'], null, null, null, null, psi(20), null, null, false],
      basic: [three, gpd(50), null, null, null, psi(40), 4, null, false],
      'basic DI': [four, gpd(50), null, null, null, null, 4, null, false],
    },
    notes: { basic: 'The membrane’s label gives no test pressure.' },
  }),
  ...createFamily({
    kind: 'ro-unit',
    brand: 'Pelagane',
    line: 'Rain',
    date: '2025-09-29',
    author: 'gallon_goat',
    common: {},
    columns: [...roColumns, 'boosterIncluded'],
    rows: {
      '100': [four, gpd(100), psi(60), 25, 250, psi(40), 3, 0.97, false, false],
      '100 B': [four, gpd(100), psi(60), 25, 250, psi(10), 2, 0.97, true, true],
      '200': [four, gpd(200), psi(60), 25, 250, psi(45), 2, 0.97, true, false],
      '300 B': [four, gpd(300), psi(80), 25, 500, psi(15), 1.5, 0.97, true, true],
    },
    backing: { wasteRatio: estimatedFrom('flow restrictor’s nominal size') },
  }),
]

const boosterColumns = ['inletMinKPa', 'outletKPa', 'maxLpd', 'powerW', 'cordMm'] as const

const boosters = [
  ...createFamily({
    kind: 'booster-pump',
    brand: 'Thessarine',
    line: 'Press',
    date: '2024-04-15',
    author: 'saltmarsh_jo',
    gtinFrom: 20100,
    common: { ...northAmerica },
    columns: boosterColumns,
    rows: {
      '100': [psi(10), psi(80), gpd(400), 28, 1500],
      '200': [psi(10), psi(85), gpd(800), 42, 1500],
      '400': [psi(15), psi(90), gpd(1600), 70, 1500],
    },
    later: {
      '100': [remeasure('2025-02-17', 'driploop', 'gauge after the pump, membrane running', { outletKPa: [535, 15] })],
    },
  }),
  ...createFamily({
    kind: 'booster-pump',
    brand: 'Osmarrow',
    line: 'Push',
    date: '2024-08-26',
    author: 'shelf_of_salt',
    common: { ...continental },
    columns: boosterColumns,
    rows: {
      '24': [50, 550, 1500, 26, 1800],
      '36': [50, 600, 3000, 40, 1800],
    },
  }),
  ...createFamily({
    kind: 'booster-pump',
    brand: 'Pelagane',
    line: 'Rain press',
    date: '2025-09-29',
    author: 'gallon_goat',
    gtinFrom: 20110,
    common: { ...wideRange },
    columns: boosterColumns,
    rows: {
      S: [0, psi(70), gpd(250), 20, 1500],
      M: [0, psi(80), gpd(500), 32, 1500],
      L: [psi(5), psi(90), gpd(1000), 54, 1500],
    },
  }),
  ...createFamily({
    kind: 'booster-pump',
    brand: 'Fathomwick',
    line: 'Boost',
    date: '2025-11-10',
    author: 'ppt35',
    common: { ...british },
    columns: boosterColumns,
    rows: { '75': [70, 500, 1200, 24, 1800], '150': [70, 550, 2400, 36, 1800] },
  }),
]

const meterColumns = [
  'scales',
  'minPpt',
  'maxPpt',
  'resolutionPpt',
  'temperatureCompensated',
  'calibrationPpt',
] as const
const sea = ['seawater-ppt', 'seawater-sg']

const salinityMeters = [
  ...createFamily({
    kind: 'salinity-meter',
    brand: 'Saltreckon',
    line: 'Lens',
    date: '2024-03-11',
    author: 'ppt35',
    gtinFrom: 20200,
    common: { method: 'refractometer' },
    columns: meterColumns,
    rows: {
      Sea: [sea, 0, 100, 1, true, 35],
      'Sea fine': [sea, 25, 45, 0.5, true, 35],
      Brine: [['nacl', 'other'], 0, 100, 1, true, 0],
      'Brine wide': [['nacl'], 0, 280, 2, true, 0],
      'Sugar 32': [['brix'], null, null, null, true, 0],
    },
    later: {
      Sea: [remeasure('2025-04-06', 'tess_reefs', 'read against a 35 ppt standard at 25 °C', { resolutionPpt: [1] })],
    },
    notes: { Brine: 'The letters say “salinity”, its sheet says sodium chloride: it reads high in seawater.' },
  }),
  ...createFamily({
    kind: 'salinity-meter',
    brand: 'Saltreckon',
    line: 'Probe',
    date: '2024-03-11',
    author: 'ppt35',
    gtinFrom: 20210,
    common: { method: 'conductivity' },
    columns: meterColumns,
    rows: {
      Pen: [['seawater-ppt'], 0, 50, 0.1, true, 35],
      Bench: [sea, 0, 70, 0.1, true, 35],
      'Pool pen': [['nacl'], 0, 10, 0.1, true, 5],
    },
  }),
  ...createFamily({
    kind: 'salinity-meter',
    brand: 'Titralune',
    line: 'Float',
    date: '2024-09-09',
    author: 'wet_sleeves',
    common: { method: 'hydrometer' },
    columns: meterColumns,
    rows: {
      'swing arm': [sea, 15, 42, 1, false, null],
      'glass 25 °C': [['seawater-sg'], 20, 42, 0.7, false, null],
      'glass long': [['seawater-sg'], 25, 45, 0.3, false, null],
    },
    backing: { resolutionPpt: estimatedFrom('marks of specific gravity turned into salinity') },
  }),
  ...createFamily({
    kind: 'salinity-meter',
    brand: 'Reagentry',
    line: 'Refract',
    date: '2025-05-26',
    author: 'wet_sleeves',
    common: { method: 'refractometer' },
    columns: meterColumns,
    rows: {
      R1: [sea, 0, 100, 1, true, 0],
      R2: [sea, 0, 100, 1, true, 35],
      'R3 digital': [['seawater-ppt'], 0, 60, 0.1, true, 35],
      R0: [['other'], null, null, null, false, null],
    },
    discontinued: ['R1'],
    later: { R2: [restate('2025-12-01', 'wet_sleeves', 'The new box holds no fluid', { calibrationPpt: null })] },
  }),
  ...createFamily({
    kind: 'salinity-meter',
    brand: 'Isobrine',
    line: 'Siemen',
    date: '2025-01-06',
    author: 'caliper_crab',
    common: { method: 'conductivity' },
    columns: meterColumns,
    rows: {
      Stick: [sea, 0, 45, 0.5, true, 35],
      Inline: [['seawater-ppt'], 10, 45, 0.1, true, 53],
      Card: [['seawater-ppt'], 0, 70, 1.5, true, null],
    },
  }),
  ...createFamily({
    kind: 'salinity-meter',
    brand: 'Tideledger',
    line: 'Salt eye',
    date: '2025-03-24',
    author: 'gallon_goat',
    common: { method: 'conductivity' },
    columns: meterColumns,
    rows: { '1': [['seawater-ppt'], 15, 45, 0.1, true, 35], '2': [sea, 15, 45, 0.1, true, 35] },
  }),
]

const saltColumns = ['packKg', 'makesL', 'alkalinityDkh', 'calciumPpm', 'magnesiumPpm'] as const
const marine = { madeFor: ['reef', 'marine-fish'] }
const titrated = {
  alkalinityDkh: measuredBy('titration of a fresh mix at 35 ppt'),
  calciumPpm: measuredBy('titration of a fresh mix at 35 ppt'),
  magnesiumPpm: measuredBy('titration of a fresh mix at 35 ppt'),
}

const saltMixes = [
  ...createFamily({
    kind: 'salt-mix',
    brand: 'Brinmere',
    line: 'Marine',
    date: '2024-02-26',
    author: 'ppt35',
    gtinFrom: 20300,
    common: { ...marine },
    columns: saltColumns,
    rows: {
      '2 kg': [2, 52, 8, 410, 1290],
      '7 kg': [7, 184, 8, 410, 1290],
      '20 kg': [20, 526, 8, 410, 1290],
    },
    backing: titrated,
    later: {
      '20 kg': [
        remeasure('2025-01-18', 'wet_sleeves', 'a fresh mix at 35 ppt, three tests each', {
          alkalinityDkh: [8.3, 0.2],
          calciumPpm: [418, 8],
          magnesiumPpm: [1310, 25],
        }),
      ],
    },
  }),
  ...createFamily({
    kind: 'salt-mix',
    brand: 'Brinmere',
    line: 'Reef rich',
    date: '2024-02-26',
    author: 'ppt35',
    gtinFrom: 20310,
    common: { madeFor: ['reef'] },
    columns: saltColumns,
    rows: {
      '4 kg': [4, 102, 11, 450, 1380],
      '10 kg': [10, 256, 11, 450, 1380],
      '22 kg': [22, 562, 11, 450, 1380],
    },
    backing: titrated,
  }),
  ...createFamily({
    kind: 'salt-mix',
    brand: 'Coquinara',
    line: 'Tide salt',
    date: '2024-07-15',
    author: 'two_left_fins',
    common: { ...marine },
    columns: saltColumns,
    rows: {
      '10 gal': [1.42, gal(10), 9, 425, 1300],
      '50 gal': [7.1, gal(50), 9, 425, 1300],
      '160 gal': [22.7, gal(160), 9, 425, 1300],
    },
    discontinued: ['10 gal'],
  }),
  ...createFamily({
    kind: 'salt-mix',
    brand: 'Kalkmoor',
    line: 'Pure',
    date: '2024-10-21',
    author: 'kelp_and_calipers',
    gtinFrom: 20330,
    common: { ...marine },
    columns: saltColumns,
    rows: {
      '5 kg': [5, 133, 7, 415, 1280],
      '10 kg': [10, 266, 7, 415, 1280],
      '25 kg': [25, 665, 7, 415, 1280],
    },
    later: {
      '10 kg': [restate('2025-08-20', 'kelp_and_calipers', 'A new recipe', { alkalinityDkh: 7.5, calciumPpm: 420 })],
    },
  }),
  ...createFamily({
    kind: 'salt-mix',
    brand: 'Osmarrow',
    line: 'Sel',
    date: '2025-03-17',
    author: 'brackish_bea',
    common: { ...marine },
    columns: saltColumns,
    rows: {
      '4 kg': [4, 105, 8.5, null, null],
      '15 kg': [15, 394, 8.5, null, null],
      '20 kg': [20, null, 8.5, 420, 1300],
    },
  }),
  ...createFamily({
    kind: 'salt-mix',
    brand: 'Driftanvil',
    line: 'Bucket',
    date: '2025-08-18',
    author: 'gallon_goat',
    common: { ...marine },
    columns: saltColumns,
    rows: {
      '25 lb': [lb(25), gal(80), 10, 440, 1350],
      '44 lb': [lb(44), gal(140), 10, 440, 1350],
      '55 lb': [lb(55), gal(175), 10, 440, 1350],
    },
  }),
  ...createFamily({
    kind: 'salt-mix',
    brand: 'Quayhollow',
    line: 'Brackish base',
    date: '2025-12-08',
    author: 'saltmarsh_jo',
    common: { madeFor: ['freshwater'] },
    columns: saltColumns,
    rows: { '3 kg': [3, 80, 4, 200, 700], '8 kg': [8, 213, 4, 200, 700] },
    notes: { '3 kg': 'For brackish tanks at a few ppt; its maker gives the litres at 35 ppt only for comparison.' },
  }),
]

export const water = [...roUnits, ...boosters, ...salinityMeters, ...saltMixes]
