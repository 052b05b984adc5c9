import type { Mains } from '../types'

const circuit = (volts: Mains['volts'], circuitA: number, plugType: string) => ({ volts, circuitA, plugType })

const northAmerica = circuit(120, 15, 'A/B')
const britain = circuit(230, 13, 'G')
const continent = circuit(230, 16, 'F')
const australia = circuit(230, 10, 'I')
const japan = circuit(100, 15, 'A/B')

/** Europe on 230 V (EN 50160, HD 472) whose sockets take the round two-pin plug; from memory, the outlet decides. */
const onTheContinent = 'AT BE BG CZ DE DK EE ES FI FR GR HR HU IS IT LT LU LV NL NO PL PT RO RS SE SI SK UA'.split(' ')

const byCountry: Readonly<Record<string, ReturnType<typeof circuit>>> = {
  ...Object.fromEntries(onTheContinent.map((country) => [country, continent])),
  US: northAmerica,
  CA: northAmerica,
  MX: northAmerica,
  GB: britain,
  IE: britain,
  MT: britain,
  CY: britain,
  SG: britain,
  HK: britain,
  MY: britain,
  AU: australia,
  NZ: australia,
  JP: japan,
}

const everywhere = [northAmerica, britain, continent, australia, japan]

const findCountry = (country: string | undefined) =>
  country === undefined ? undefined : byCountry[country.toUpperCase()]

/** Whether a country alone tells the voltage and the plug. */
export const hasKnownMains = (country: string | undefined): boolean => findCountry(country) !== undefined

/**
 * Household mains of a country (ISO 3166-1 alpha-2), or the first usual ones that have the voltage and plug that were
 * given; told nothing, 120 V, 15 A, plug A/B. Common practice: the outlet decides.
 */
export function chooseMains(country: string | undefined, { volts, plugType }: Partial<Mains> = {}) {
  const usual = findCountry(country) ?? (country === undefined ? northAmerica : continent)
  const agreeing = [usual, ...everywhere].find(
    (one) => one.volts === (volts ?? one.volts) && one.plugType === (plugType ?? one.plugType),
  )
  return agreeing ?? usual
}

/** What a setup is taken to be where nobody said otherwise; see the method page. */
export const defaults = {
  room: { temperatureC: 21, coldestC: 18, warmestC: 28, relativeHumidity: 0.5, ceilingMm: 2400 },
  /** Floor to the bottom of the tank. */
  supportHeightMm: 750,
  freeWallOutlets: 2,
  water: { feedKPa: 350, feedTempC: 15, feedTdsPpm: 250 },
  /** Share of the water that is changed each week. */
  weeklyChangeShare: 0.15,
  goals: { temperatureC: 25.5, salinityPpt: 35, coral: ['soft', 'lps'] as const, sandDepthMm: 40, rockKgPerL: 0.12 },
  turnoverPerHour: { 'rear-chambers': [4, 12], sump: [3, 10], 'hang-on': [4, 12], none: [4, 12] } as const,
  turnoverChangePerHour: { 'rear-chambers': [3, 16], sump: [2, 15], 'hang-on': [3, 16], none: [3, 16] } as const,
  /** What wavemakers together are set to. */
  circulationPerHour: { usual: [10, 40], sps: [20, 60] } as const,
  /** Bore of the return where nobody said, by water volume up to 100 L and above. */
  boreSmallMm: 13,
  boreLargeMm: 20,
  /** Of a lamp's lens above the water. */
  mountHeightMm: 200,
  /** The same for a light on legs of its own. */
  legsHeightMm: 60,
  /** Lower than this a lens gets wet. */
  lowestLensMm: 30,
  /** Of grains of unknown rock and sand, kg per litre. */
  rockSolidDensityKgL: 2.7,
  sandSolidDensityKgL: 2.8,
  /** Of a settled carbonate bed: 2.8 × (1 − 0.45 pores). */
  sandBulkDensityKgL: 1.54,
} as const
