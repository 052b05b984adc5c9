import type { Piece, Setup, Specs } from '#shared/engine/types'
import type { KindKey } from '#shared/kinds/index'

// Every number and name here is invented for looking at.

const toSpecs = (values: Readonly<Record<string, unknown>>): Specs =>
  Object.fromEntries(Object.entries(values).map(([key, value]) => [key, { value, source: 'maker' as const }]))

const piece = (kind: KindKey, values: Readonly<Record<string, unknown>>): Piece => ({ kind, specs: toSpecs(values) })

const setup = (values: Readonly<Record<string, unknown>>, volumeL?: number): Setup => ({
  units: 'us',
  tank: { specs: toSpecs(values), ...(volumeL !== undefined && { volumeL }) },
  items: [],
})

const cubeSides = { outerLengthMm: 589, outerWidthMm: 399, outerHeightMm: 399, wallMm: 8, waterLineMm: 367 }

export const setups = {
  byVolume: setup({}, 75.7),
  cube: setup({
    ...cubeSides,
    chambers: [{ id: 'rear', name: 'rear chamber', lengthMm: 120, widthMm: 100, waterDepthMm: 330 }],
  }),
  long: setup({ outerLengthMm: 1524, outerWidthMm: 457, outerHeightMm: 508 }),
  sump: setup({ outerLengthMm: 1219, outerWidthMm: 457, outerHeightMm: 508, filtration: 'sump' }),
} as const

export const cluster = piece('light', {
  layout: 'point',
  lengthMm: 130,
  widthMm: 130,
  beamAngleDeg: 80,
  ppfdUmol: 765,
  ppfdAtMm: 300,
  dimmable: true,
  bands: [
    { fromNm: 400, toNm: 500, share: 0.6 },
    { fromNm: 500, toNm: 600, share: 0.22 },
    { fromNm: 600, toNm: 700, share: 0.15 },
  ],
})

export const strip = piece('light', {
  layout: 'strip',
  lengthMm: 720,
  widthMm: 90,
  ppfdUmol: 210,
  ppfdAtMm: 300,
  dimmable: true,
})

/** Bright, and not known to dim. */
export const nameless = piece('light', { layout: 'panel', lengthMm: 300, widthMm: 200, ppfdUmol: 900, ppfdAtMm: 250 })

/** Channels that overlap, the outermost past what is seen. */
export const channels = piece('light', {
  bands: [
    { fromNm: 380, toNm: 420, share: 0.08 },
    { fromNm: 410, toNm: 440, share: 0.12 },
    { fromNm: 440, toNm: 460, share: 0.24 },
    { fromNm: 460, toNm: 490, share: 0.1 },
    { fromNm: 430, toNm: 720, share: 0.3 },
    { fromNm: 640, toNm: 670, share: 0.1 },
    { fromNm: 660, toNm: 660, share: 0.005 },
  ],
})

const body = { lengthMm: 70, widthMm: 50, heightMm: 60, boreMm: 16 }
const ends = (headM: number, flowLph: number) => [
  { headM, flowLph: 0 },
  { headM: 0, flowLph },
]

export const pumps = {
  controlled: piece('return-pump', { ...body, flowCurve: ends(1.5, 1150), dcControl: true }),
  weak: piece('return-pump', { ...body, flowCurve: ends(0.8, 340) }),
  measured: piece('return-pump', {
    ...body,
    flowCurve: [
      { headM: 0, flowLph: 3760 },
      { headM: 0.8, flowLph: 3050 },
      { headM: 1.6, flowLph: 2120 },
      { headM: 2.4, flowLph: 950 },
      { headM: 2.78, flowLph: 0 },
    ],
  }),
} as const

export const stands: readonly Piece[] = [
  piece('stand', { topLengthMm: 616, topWidthMm: 463, heightMm: 762 }),
  piece('stand', { topLengthMm: 560, topWidthMm: 430 }),
  piece('stand', { topLengthMm: 450, topWidthMm: 640, heightMm: 700 }),
]
