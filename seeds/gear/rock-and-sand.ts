import { lb } from '../amounts'
import { createFamily, estimatedFrom, measuredTo, remeasure, restate } from '../family'

const rockColumns = ['form', 'packKg', 'bulkDensityKgL', 'solidDensityKgL'] as const
const weighed = {
  bulkDensityKgL: measuredTo(0.08, 'a full ten-litre bucket on a scale, three fillings'),
  solidDensityKgL: measuredTo(0.1, 'mass over displaced water after a week under water'),
}

const rock = [
  ...createFamily({
    kind: 'rock',
    brand: 'Maerlstone',
    line: 'Dry shelf',
    date: '2024-02-19',
    author: 'oolite_owl',
    gtinFrom: 19000,
    common: { state: 'dry', madeFor: ['reef', 'marine-fish'] },
    columns: rockColumns,
    rows: {
      'base 10 kg': ['base', 10, 1.05, 2.3],
      'base 20 kg': ['base', 20, 1.05, 2.3],
      'ledges 10 kg': ['ledge', 10, 1.1, 2.4],
      'arches 8 kg': ['arch', 8, 0.85, 2.3],
      'branches 5 kg': ['branch', 5, 0.7, 2.4],
      'rubble 4 kg': ['rubble', 4, 1.2, 2.5],
    },
    backing: weighed,
    later: {
      'base 10 kg': [
        remeasure('2025-06-07', 'gallon_goat', 'bathroom scale, the box emptied', { packKg: [10.3, 0.1] }),
      ],
    },
  }),
  ...createFamily({
    kind: 'rock',
    brand: 'Maerlstone',
    line: 'Living',
    date: '2024-02-19',
    author: 'oolite_owl',
    common: { state: 'live', madeFor: ['reef', 'marine-fish'] },
    columns: rockColumns,
    rows: {
      'base 10 kg': ['base', 10, 1.25, 2.2],
      'branches 5 kg': ['branch', 5, 0.9, 2.3],
      'rubble 2 kg': ['rubble', 2, 1.35, 2.4],
    },
    backing: weighed,
    notes: { 'base 10 kg': 'Farmed, travels wet; weighed drained.' },
  }),
  ...createFamily({
    kind: 'rock',
    brand: 'Rubblemore',
    line: 'Quarry',
    date: '2024-07-15',
    author: 'two_left_fins',
    gtinFrom: 19020,
    common: { state: 'dry', madeFor: ['reef', 'marine-fish'] },
    columns: rockColumns,
    rows: {
      'base 20 lb': ['base', lb(20), 1.3, 2.6],
      'base 40 lb': ['base', lb(40), 1.3, 2.6],
      'ledges 20 lb': ['ledge', lb(20), 1.35, 2.6],
      'rubble 10 lb': ['rubble', lb(10), 1.45, null],
    },
    backing: { bulkDensityKgL: estimatedFrom('a half-filled crate') },
    later: { 'base 40 lb': [restate('2025-03-19', 'two_left_fins', 'The box got smaller', { packKg: lb(38) })] },
  }),
  ...createFamily({
    kind: 'rock',
    brand: 'Kalkmoor',
    line: 'Cast',
    date: '2024-10-21',
    author: 'kelp_and_calipers',
    gtinFrom: 19040,
    common: { state: 'artificial', madeFor: ['reef', 'marine-fish'] },
    columns: rockColumns,
    rows: {
      'base 8 kg': ['base', 8, 0.95, 2.1],
      'arch S': ['arch', 2.5, 0.75, 2.1],
      'arch L': ['arch', 6, 0.75, 2.1],
      'ledge set': ['ledge', 7, 0.9, 2.1],
      'branch set': ['branch', 3, 0.65, 2.1],
    },
    notes: { 'arch S': 'Cement-bound: soak it until the water stays under pH 8.5.' },
  }),
  ...createFamily({
    kind: 'rock',
    brand: 'Corvelune',
    line: 'Ceramic',
    date: '2025-10-13',
    author: 'rimless_rae',
    common: { state: 'artificial', madeFor: ['reef', 'marine-fish', 'freshwater'] },
    columns: rockColumns,
    rows: {
      'isle S': ['base', 1.8, 0.6, null],
      'isle M': ['base', 3.5, 0.6, null],
      'isle L': ['base', 6.5, 0.6, null],
      shelf: ['ledge', 1.2, 0.65, null],
    },
  }),
  ...createFamily({
    kind: 'rock',
    brand: 'Osmarrow',
    line: 'Dragon scree',
    date: '2025-03-17',
    author: 'brackish_bea',
    common: { state: 'dry', madeFor: ['freshwater', 'plants'] },
    columns: rockColumns,
    rows: { '10 kg': ['base', 10, 1.15, 2.6], '20 kg': ['base', 20, 1.15, 2.6] },
  }),
  ...createFamily({
    kind: 'rock',
    brand: 'Thessarine',
    line: 'Shelf',
    date: '2025-06-23',
    author: 'gallon_goat',
    common: { state: 'dry', madeFor: ['reef'] },
    columns: rockColumns,
    rows: {
      'base 25 lb': ['base', lb(25), 1, 2.2],
      'mixed 25 lb': [null, lb(25), null, 2.2],
      'pillars 12 lb': ['branch', lb(12), 0.8, 2.2],
    },
  }),
]

const sandColumns = ['grainMinMm', 'grainMaxMm', 'packKg', 'bulkDensityKgL', 'solidDensityKgL'] as const
const marine = { madeFor: ['reef', 'marine-fish'] }
const litreCup = { bulkDensityKgL: measuredTo(0.03, 'one litre, tapped level, on a kitchen scale') }

const sand = [
  ...createFamily({
    kind: 'sand',
    brand: 'Oolandra',
    line: 'Reef dry',
    date: '2024-02-19',
    author: 'oolite_owl',
    gtinFrom: 19200,
    common: { ...marine, mineral: 'aragonite', state: 'dry', magneticGrains: false },
    columns: sandColumns,
    rows: {
      'dust 9 kg': [0.1, 0.5, 9, 1.5, 2.85],
      'fine 9 kg': [0.25, 1, 9, 1.5, 2.85],
      'middle 9 kg': [0.5, 1.7, 9, 1.48, 2.85],
      'middle 18 kg': [0.5, 1.7, 18, 1.48, 2.85],
      'coarse 9 kg': [2, 5, 9, 1.4, 2.85],
    },
    backing: litreCup,
    later: {
      'middle 9 kg': [
        remeasure('2025-05-17', 'tess_reefs', 'set of sieves, a hundred grams', {
          grainMinMm: [0.45, 0.05],
          grainMaxMm: [1.6, 0.1],
        }),
      ],
    },
  }),
  ...createFamily({
    kind: 'sand',
    brand: 'Oolandra',
    line: 'Reef live',
    date: '2024-02-19',
    author: 'oolite_owl',
    gtinFrom: 19210,
    common: { ...marine, mineral: 'aragonite', state: 'live', magneticGrains: false },
    columns: sandColumns,
    rows: {
      'fine 9 kg': [0.25, 1, 9, 1.65, 2.85],
      'middle 9 kg': [0.5, 1.7, 9, 1.62, 2.85],
      'middle 4.5 kg': [0.5, 1.7, 4.5, 1.62, 2.85],
    },
    backing: litreCup,
    notes: { 'middle 9 kg': 'Packed wet: the mass on the bag counts its water.' },
  }),
  ...createFamily({
    kind: 'sand',
    brand: 'Coquinara',
    line: 'Shell bed',
    date: '2024-07-15',
    author: 'two_left_fins',
    common: { ...marine, mineral: 'aragonite' },
    columns: ['state', ...sandColumns],
    rows: {
      'fine 20 lb dry': ['dry', 0.3, 1.2, lb(20), 1.42, 2.8],
      'medium 20 lb dry': ['dry', 1, 2, lb(20), 1.38, 2.8],
      'medium 20 lb live': ['live', 1, 2, lb(20), 1.55, 2.8],
      'coarse 40 lb dry': ['dry', 2, 6, lb(40), 1.32, 2.8],
    },
    later: {
      'medium 20 lb dry': [
        restate('2025-10-10', 'two_left_fins', 'A finer grade under the same name', {
          grainMinMm: 0.8,
          grainMaxMm: 1.8,
        }),
      ],
    },
  }),
  ...createFamily({
    kind: 'sand',
    brand: 'Kalkmoor',
    line: 'Calc',
    date: '2024-10-21',
    author: 'kelp_and_calipers',
    gtinFrom: 19230,
    common: { ...marine, mineral: 'calcite', state: 'dry', magneticGrains: false },
    columns: sandColumns,
    rows: {
      '0.5 10 kg': [0.3, 0.7, 10, 1.45, 2.7],
      '1.0 10 kg': [0.7, 1.4, 10, 1.43, 2.7],
      '1.0 25 kg': [0.7, 1.4, 25, 1.43, 2.7],
      '2.5 10 kg': [1.8, 3.2, 10, 1.4, 2.7],
    },
  }),
  ...createFamily({
    kind: 'sand',
    brand: 'Netherling',
    line: 'Quartz',
    date: '2025-01-20',
    author: 'brackish_bea',
    common: { mineral: 'silica', state: 'dry' },
    columns: [...sandColumns, 'madeFor', 'magneticGrains'],
    rows: {
      'white 10 kg': [0.4, 0.8, 10, 1.6, 2.65, ['freshwater', 'plants'], false],
      'white marine 10 kg': [0.4, 0.8, 10, 1.6, 2.65, ['marine-fish', 'freshwater'], false],
      'black coated 10 kg': [0.8, 1.4, 10, 1.58, 2.65, ['freshwater'], null],
    },
  }),
  ...createFamily({
    kind: 'sand',
    brand: 'Netherling',
    line: 'Basalt',
    date: '2025-01-20',
    author: 'brackish_bea',
    common: { mineral: 'volcanic', state: 'dry', madeFor: ['marine-fish', 'freshwater'] },
    columns: [...sandColumns, 'magneticGrains'],
    rows: {
      'black 5 kg': [0.3, 0.9, 5, 1.7, 2.9, true],
      'black 10 kg': [0.3, 0.9, 10, 1.7, 2.9, true],
      'grey 10 kg': [1, 2.2, 10, 1.6, 2.85, false],
    },
    later: {
      'black 5 kg': [
        remeasure('2025-12-02', 'caliper_crab', 'a magnet in a bag picked up a spoonful', { magneticGrains: [true] }),
      ],
    },
  }),
  ...createFamily({
    kind: 'sand',
    brand: 'Thessarine',
    line: 'Pearl',
    date: '2025-06-23',
    author: 'gallon_goat',
    common: { ...marine, mineral: 'aragonite', state: 'dry' },
    columns: sandColumns,
    rows: {
      '20 lb': [null, null, lb(20), 1.45, null],
      '15 lb': [0.5, 1, lb(15), 1.46, null],
    },
    notes: { '20 lb': 'The bag gives a picture of the grains and no size.' },
  }),
]

export const rockAndSand = [...rock, ...sand]
