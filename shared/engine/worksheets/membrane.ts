import {
  concentrationFactor,
  defaultTestTdsPpm,
  findRatedDriveKPa,
  membraneFlowLpd,
  osmoticPressureKPa,
  recoveryShare,
  temperatureFactor,
} from '../physics/membrane'
import { fromKind, fromSetupField, required } from './fields'
import { assume } from './plan-inputs'
import { put } from './quantities'
import type { Worksheet } from './types'

interface Values {
  readonly membraneLpd: number
  readonly testPressureKPa: number
  readonly testTempC: number
  readonly testTdsPpm?: number
  readonly feedKPa: number
  readonly feedTempC: number
  readonly feedTdsPpm: number
  readonly rejectionFraction: number
  readonly wasteRatio: number
}

const manual = 'Membrane maker’s technical manual, form 45-D01504-en'

export const membrane: Worksheet = {
  name: 'membrane',
  title: 'What a membrane makes at your tap',
  intro: 'A membrane is rated at one pressure, temperature and salt content. This is what it makes at yours.',
  fields: [
    required(fromKind('membraneLpd', 'ro-unit', 'membraneLpd')),
    required(fromKind('testPressureKPa', 'ro-unit', 'testPressureKPa')),
    required(fromKind('testTempC', 'ro-unit', 'testTempC')),
    fromKind('testTdsPpm', 'ro-unit', 'testTdsPpm'),
    required(fromSetupField('feedKPa', 'water.feedKPa')),
    required(fromSetupField('feedTempC', 'water.feedTempC')),
    required(fromSetupField('feedTdsPpm', 'water.feedTdsPpm')),
    required(fromKind('rejectionFraction', 'ro-unit', 'rejectionFraction')),
    required(fromKind('wasteRatio', 'ro-unit', 'wasteRatio')),
  ],
  results: [
    { key: 'litresPerDay', label: 'Pure water', unit: 'L/d' },
    { key: 'wasteLitresPerDay', label: 'Waste', unit: 'L/d' },
    { key: 'productTdsPpm', label: 'Dissolved solids after the membrane', unit: 'ppm' },
  ],
  basis: {
    type: 'physics',
    source: 'Net driving pressure and temperature factor as membrane makers’ technical manuals give them',
  },
  example: {
    membraneLpd: 284,
    testPressureKPa: 345,
    testTempC: 25,
    feedKPa: 350,
    feedTempC: 15,
    feedTdsPpm: 250,
    rejectionFraction: 0.96,
    wasteRatio: 3,
  },
  work(values: Values, _setup, words) {
    const { membraneLpd, testPressureKPa, testTempC, testTdsPpm = defaultTestTdsPpm, ...feed } = values
    const { feedKPa, feedTempC, feedTdsPpm, rejectionFraction, wasteRatio } = feed
    const rating = { ratedLpd: membraneLpd, testPressureKPa, testTempC, testTdsPpm }
    const ratedKPa = findRatedDriveKPa(rating, wasteRatio)
    if (ratedKPa <= 0) {
      const osmosisKPa = words.measure(testPressureKPa - ratedKPa, 'kPa')
      return {
        ok: false,
        problems: [
          {
            path: 'testPressureKPa',
            detail: `${words.measure(testPressureKPa, 'kPa')} cannot be right: osmosis alone takes ${osmosisKPa} at that salt content, so that nothing would have come through in the test.`,
          },
        ],
      }
    }
    const litresPerDay = membraneFlowLpd(rating, feed)
    const recovery = recoveryShare(wasteRatio)
    const stronger = concentrationFactor(recovery)
    const driveKPa = feedKPa - osmoticPressureKPa(feedTdsPpm * stronger, feedTempC)
    const warmth = temperatureFactor(feedTempC) / temperatureFactor(testTempC)
    const productTdsPpm = feedTdsPpm * (1 - rejectionFraction)
    const wasteLitresPerDay = litresPerDay * wasteRatio
    const osmosis = (tdsPpm: number, tempC: number) =>
      `${put(tdsPpm)} ppm × ${put(stronger)} × (${put(tempC)} + 320) ÷ 4910`
    return {
      ok: true,
      result: { litresPerDay, productTdsPpm, wasteLitresPerDay },
      steps: [
        {
          title: 'How much stronger the water gets along the membrane',
          formula: 'ln(1 ÷ (1 − Y)) ÷ Y, with Y = 1 ÷ (1 + waste per product)',
          text: `Y = 1 ÷ (1 + ${put(wasteRatio)}) = ${put(recovery)}`,
          value: stronger,
          unit: 'number',
          source: manual,
        },
        {
          title: 'Pressure that drives it, in the test',
          formula: 'test pressure − osmotic pressure, C (T + 320) ÷ 491 000 bar',
          text: `${put(testPressureKPa)} kPa − ${osmosis(testTdsPpm, testTempC)}`,
          value: ratedKPa,
          unit: 'kPa',
          source: manual,
        },
        {
          title: 'Pressure that drives it, at your tap',
          formula: 'tap pressure − osmotic pressure',
          text: `${put(feedKPa)} kPa − ${osmosis(feedTdsPpm, feedTempC)}`,
          value: driveKPa,
          unit: 'kPa',
          source: manual,
        },
        {
          title: 'Temperature factor',
          formula: 'exp[U (1/298 − 1/(273 + T))], U = 2640 from 25 °C up, else 3020; over the same at the test',
          text: `${put(temperatureFactor(feedTempC))} ÷ ${put(temperatureFactor(testTempC))}`,
          value: warmth,
          unit: 'number',
          source: manual,
        },
        {
          title: 'Pure water',
          formula: 'rated × pressure at your tap ÷ pressure in the test × temperature factor',
          text: `${put(membraneLpd)} L/day × ${put(driveKPa)} ÷ ${put(ratedKPa)} × ${put(warmth)}`,
          value: litresPerDay,
          unit: 'L/d',
        },
        {
          title: 'Waste',
          formula: 'pure water × waste per product',
          text: `${put(litresPerDay)} L/day × ${put(wasteRatio)}`,
          value: wasteLitresPerDay,
          unit: 'L/d',
        },
        {
          title: 'Dissolved solids after the membrane',
          formula: 'solids before it × (1 − rejection)',
          text: `${put(feedTdsPpm)} ppm × (1 − ${put(rejectionFraction)})`,
          value: productTdsPpm,
          unit: 'ppm',
        },
      ],
      cautions: [
        ...(driveKPa <= 0 ? ['The pressure at your tap does not overcome osmosis: nothing comes through.'] : []),
        ...(feedTempC < 5 || feedTempC > 35 || testTempC < 5 || testTempC > 35
          ? [`The temperature factor is made for ${words.pair([5, 35], 'C')}.`]
          : []),
        'Membranes of one model differ, and all slow down with age. Catch the product for ten minutes to be sure.',
      ],
      assumptions:
        values.testTdsPpm === undefined
          ? [assume('testTdsPpm', defaultTestTdsPpm, 'Test dissolved solids', words.measure(defaultTestTdsPpm, 'ppm'))]
          : [],
    }
  },
}
