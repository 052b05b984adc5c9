import { findHeaterNeed, findStuckOn, findUnheatedC, lossAt } from '../heat-budget'
import { heatCapacityJK } from '../physics/seawater'
import { createScene, once, type Scene } from '../scene'
import type { Plan } from '../setup/plan'
import { thresholds } from '../thresholds'
import type { Item } from '../types'
import { measure } from '../../kinds/build'
import { fromKind, ownField } from './fields'
import { readHourly } from './hourly'
import { listLossSteps } from './heat-steps'
import { assume, isPlan, listUsed, planInputs } from './plan-inputs'
import { put } from './quantities'
import type { Worksheet } from './types'

export interface HeatValues {
  readonly heaterW?: number
  readonly inTankW?: number
}

/** All gear in the water as one pump at full power, in place of what the tank comes with. */
const gearInWater = (powerW: number): Item => ({
  id: 'gear-in-the-water',
  piece: { kind: 'return-pump', specs: { powerW: { value: powerW, source: 'measured' } } },
  quantity: 1,
  state: 'have',
})

export const createHeatScene = (plan: Plan, { inTankW }: HeatValues): Scene =>
  createScene(plan, inTankW === undefined ? [] : [gearInWater(inTankW)])

const usedPaths = [
  'tank.outerLengthMm',
  'tank.outerWidthMm',
  'tank.outerHeightMm',
  'tank.wallMm',
  'tank.bottomMm',
  'tank.material',
  'tank.lid',
  'tank.waterLineMm',
  'tank.filtration',
  'tank.sump',
  'room.coldestC',
  'room.warmestC',
  'room.relativeHumidity',
  'goals.temperatureC',
  'goals.salinityPpt',
]

export const heatBalance: Worksheet = {
  name: 'heat-balance',
  title: 'Heat balance of a tank',
  intro:
    'What a tank loses on the coldest night, what a heater must give, and how warm the water gets if that heater never switches off.',
  setup: {
    sections: ['tank', 'room', 'goals'],
    asks: [
      'tank.volumeL',
      'tank.outerLengthMm',
      'tank.outerWidthMm',
      'tank.outerHeightMm',
      'tank.wallMm',
      'tank.bottomMm',
      'tank.waterLineMm',
      'tank.material',
      'tank.lid',
      'tank.filtration',
      'room.coldestC',
      'room.warmestC',
      'room.relativeHumidity',
      'goals.temperatureC',
    ],
  },
  fields: [
    fromKind('heaterW', 'heater', 'powerW', { label: 'power of all heaters', plausible: [1, 20000] }),
    ownField(
      'inTankW',
      measure('inTankW', 'power of other gear in the water', 'W', {
        plausible: [0, 5000],
        usual: [0, 200],
        role: 'check',
        guide: 'Pumps and wavemakers under water, added up; half for those run at low speed.',
      }),
    ),
  ],
  results: [
    { key: 'needW', label: 'Heat needed on the coldest night', unit: 'W' },
    { key: 'needUpperW', label: 'With a reserve, by the upper figure', unit: 'W' },
    { key: 'duty', label: 'Heater runs, then', unit: 'fraction', none: 'give its power' },
    { key: 'stuckOnC', label: 'Stuck on in the warmest room, the water goes to', unit: 'C', none: 'give its power' },
    { key: 'hoursTo30C', label: 'Stuck on: hours to 30 °C', unit: 'h', none: 'not with the power given' },
    { key: 'hoursTo34C', label: 'Stuck on: hours to 34 °C', unit: 'h', none: 'not with the power given' },
    { key: 'lossW', label: 'Heat lost', unit: 'W' },
    { key: 'lossUpperW', label: 'Heat lost, upper figure', unit: 'W' },
    { key: 'gainW', label: 'Given by other gear', unit: 'W' },
    { key: 'evaporationLPerDay', label: 'Evaporation in the coldest room', unit: 'L/d' },
  ],
  basis: {
    type: 'physics',
    source:
      'ISO 6946 surface resistances, EN 572-1 and ISO 10456 conductivities; evaporation by ASHRAE (HVAC Applications, activity 0.5) and Shah 2014, ASHRAE Transactions 120(2)',
  },
  example: {
    tank: { outerLengthMm: 610, outerWidthMm: 406, outerHeightMm: 406 },
    room: { coldestC: 16, warmestC: 28 },
    goals: { temperatureC: 25.5 },
    heaterW: 150,
    inTankW: 15,
  },
  work(values: HeatValues, setup, words) {
    const plan = planInputs(setup, words)
    if (!isPlan(plan)) return plan
    const { heaterW, inTankW } = values
    const { goals, room, tank } = plan
    const scene = createHeatScene(plan, values)
    const { needW, needUpperW, gainW } = once(scene, findHeaterNeed)
    const loss = lossAt(plan, goals.temperatureC, room.coldestC)
    const stuck = heaterW === undefined ? null : findStuckOn(scene, heaterW)
    const duty = needW === 0 ? 0 : heaterW === undefined ? null : needW / heaterW
    const hotC = findUnheatedC(scene)
    const capacityMJK = heatCapacityJK(tank.waterL, goals.salinityPpt, goals.temperatureC) / 1e6
    const goal = words.temperature(goals.temperatureC)
    return {
      ok: true,
      result: {
        lossW: loss.totalW,
        lossUpperW: loss.totalUpperW,
        gainW,
        needW,
        needUpperW,
        duty,
        stuckOnC: stuck?.equilibriumC ?? null,
        hoursTo30C: stuck?.hoursTo30C ?? null,
        hoursTo34C: stuck?.hoursTo34C ?? null,
        evaporationLPerDay: loss.evaporationLPerDay,
        series: stuck === null ? [] : readHourly(stuck.series).map(({ hour, waterC }) => ({ hour, tempC: waterC })),
      },
      steps: [
        ...listLossSteps({ plan, loss }),
        {
          title: 'Heat needed',
          formula: 'heat lost − given by other gear, not below 0',
          text: `${put(loss.totalW)} W − ${put(gainW)} W`,
          value: needW,
          unit: 'W',
        },
        {
          title: 'Heat needed with a reserve',
          formula: 'the upper figure − given by other gear, not below 0: what a heater is asked for',
          text: `${put(loss.totalUpperW)} W − ${put(gainW)} W`,
          value: needUpperW,
          unit: 'W',
        },
        ...(heaterW === undefined
          ? []
          : [
              {
                title: 'Share of the time it runs',
                formula: 'heat needed ÷ power of the heater',
                text: `${put(needW)} W ÷ ${put(heaterW)} W`,
                value: duty,
                unit: 'fraction' as const,
              },
              {
                title: 'Heat to warm the water by 1 K',
                formula: 'C = ρ cp V',
                text: `${put(tank.waterL)} L at ${put(goals.salinityPpt)} ppt and ${put(goals.temperatureC)} °C`,
                value: capacityMJK,
                unit: 'MJ/K' as const,
                source: 'EOS-80 and specific heat, UNESCO 44',
              },
              {
                title: 'Stuck on',
                formula: 'C dT/dt = heater + other gear − loss(T), from the goal in the warmest room, until it settles',
                text: `${put(heaterW)} W + ${put(gainW)} W with the room at ${put(room.warmestC)} °C`,
                value: stuck?.equilibriumC ?? null,
                unit: 'C' as const,
              },
            ]),
      ],
      cautions: [
        ...(needW === 0 ? ['No heater is needed at these temperatures.'] : []),
        ...(duty !== null && duty > 1
          ? [`Too weak: it cannot hold ${goal} with the room at ${words.temperature(room.coldestC)}.`]
          : heaterW !== undefined && heaterW < needUpperW
            ? ['No reserve: by the upper figure of evaporation it just falls short.']
            : []),
        'Heaters fail. A second, independent cut-off is advised whatever the temperature above.',
        ...(hotC > thresholds.chillerFromC.value
          ? [
              `With the room at ${words.temperature(room.warmestC)} the water settles near ${words.temperature(hotC)} without any heater: it needs a fan or a chiller.`,
            ]
          : []),
        'An estimate for still air and a quiet surface: fans, weirs and draughts take more heat. Measure before trusting animals to it.',
      ],
      assumptions: [
        ...listUsed(plan, usedPaths, words),
        ...(inTankW === undefined
          ? [assume('inTankW', gainW, 'Power of other gear in the water', words.power(gainW))]
          : []),
      ],
    }
  },
}
