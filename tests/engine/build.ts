import { fitCheck } from '#shared/engine/fit'
import type { CandidateOptions } from '#shared/engine/candidates'
import { createScene, type Scene } from '#shared/engine/scene'
import { resolve } from '#shared/engine/setup/resolve'
import type { KindKey } from '#shared/kinds/index'
import type { Answer, Check, Item, Piece, Setup, Source, Specs } from '#shared/engine/types'

/** Bare values as specs of one source; `undefined` leaves an attribute unknown. */
export const toSpecs = (
  values: Readonly<Record<string, unknown>>,
  source: Source = 'maker',
  plusMinus?: number,
): Specs =>
  Object.fromEntries(
    Object.entries(values)
      .filter(([, value]) => value !== undefined)
      .map(([key, value]) => [key, { value, source, ...(plusMinus !== undefined && { plusMinus }) }]),
  )

export const piece = (kind: KindKey, values: Readonly<Record<string, unknown>>, slug?: string): Piece => ({
  kind,
  specs: toSpecs(values),
  ...(slug !== undefined && { gear: { slug, brand: 'Inventmark', model: slug } }),
})

/** A glass rod that is made for every setup below; each test changes what it is about. */
export const heater = (values: Readonly<Record<string, unknown>> = {}, slug?: string): Piece =>
  piece(
    'heater',
    {
      form: 'glass-rod',
      powerW: 100,
      lengthMm: 245,
      diameterMm: 23,
      ratedVolumeMinL: 60,
      ratedVolumeMaxL: 110,
      thermostat: 'built-in',
      orientation: 'any',
      madeFor: ['reef'],
      volts: [120],
      plugType: 'A/B',
      plugs: 1,
      ...values,
    },
    slug,
  )

/** An RO/DI unit with every stage, for a tap of ordinary pressure; each test changes what it is about. */
export const roUnit = (values: Readonly<Record<string, unknown>> = {}, slug?: string): Piece =>
  piece(
    'ro-unit',
    {
      stages: ['sediment', 'carbon', 'membrane', 'deionisation'],
      membraneLpd: 280,
      testPressureKPa: 350,
      testTempC: 25,
      testTdsPpm: 250,
      minFeedKPa: 280,
      wasteRatio: 3,
      boosterIncluded: false,
      rejectionFraction: 0.97,
      ...values,
    },
    slug,
  )

/** Inside 600 × 400, 350 mm of water: 84 L. One chamber of 120 × 100 × 330 mm, 390 mm high. */
export const tankValues = {
  outerLengthMm: 620,
  outerWidthMm: 420,
  outerHeightMm: 400,
  wallMm: 10,
  bottomMm: 10,
  material: 'glass',
  lid: 'none',
  rim: 'rimless',
  shape: 'rectangle',
  filtration: 'rear-chambers',
  waterLineMm: 350,
  displayLengthMm: 600,
  displayWidthMm: 290,
  chambers: [{ id: 'rear', name: 'rear chamber', lengthMm: 120, widthMm: 100, waterDepthMm: 330, heightMm: 390 }],
}

/** A setup in which nothing is left to assume. */
export const wholeSetup = (tank: Readonly<Record<string, unknown>> = {}, rest: Partial<Setup> = {}): Setup => ({
  units: 'metric',
  country: 'US',
  tank: { specs: toSpecs({ ...tankValues, ...tank }, 'measured') },
  room: { temperatureC: 21, coldestC: 18, warmestC: 28, relativeHumidity: 0.5, ceilingMm: 2400, tankTopMm: 1150 },
  mains: { volts: 120, circuitA: 15, plugType: 'A/B', outlets: 6, residualCurrentProtected: true },
  water: { feedKPa: 350, feedTempC: 15, feedTdsPpm: 250, litresPerWeek: 20 },
  goals: {
    temperatureC: 25,
    salinityPpt: 35,
    coral: ['soft'],
    sandDepthMm: 40,
    turnoverPerHour: [4, 12],
    appControl: false,
    switchedOutlets: 0,
  },
  items: [],
  ...rest,
})

export const item = (id: string, what: Piece, rest: Partial<Item> = {}): Item => ({
  id,
  piece: what,
  quantity: 1,
  state: 'have',
  ...rest,
})

export function checkOf(answer: Pick<Answer, 'checks'>, id: string): Check {
  const found = answer.checks.find((check) => check.id === id)
  if (!found) throw new Error(`there is no check ${id}`)
  return found
}

/** One check of one piece in a setup. */
export const judge = (setup: Setup, what: Piece, id: string, options: CandidateOptions = {}): Check =>
  checkOf(fitCheck(setup, what, options), id)

export const judgeOutcome = (setup: Setup, what: Piece, id: string, options: CandidateOptions = {}) =>
  judge(setup, what, id, options).outcome

/** A sentence with ordinary spaces where it was kept from breaking. */
export const toPlain = (text: string | undefined): string => (text ?? '').replaceAll('\u00a0', ' ')

/** What a piece of a kind is judged against, without judging the rest of the setup. */
export function sceneFor(setup: Setup, kind: KindKey): Scene {
  const others = setup.items.filter(({ state, piece: what }) => state !== 'gone' && what.kind !== kind)
  return createScene(resolve({ ...setup, items: others }), others)
}
