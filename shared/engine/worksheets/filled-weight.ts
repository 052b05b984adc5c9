import type { Printer } from '../../units/print'
import { shellDensityKgM3, solidDensityKgL } from '../physics/weight'
import { seawaterDensityKgM3 } from '../physics/seawater'
import { defaults } from '../setup/defaults'
import type { Plan } from '../setup/plan'
import type { Assumption, Setup } from '../types'
import { findFloorPressureKPa, weighFilled, type FilledWeight } from '../weight-budget'
import { fromKind, fromSetupField } from './fields'
import { assume, isPlan, listUsed, planInputs } from './plan-inputs'
import { put } from './quantities'
import type { Step, Worksheet, WorksheetField } from './types'

interface Values {
  readonly salinityPpt?: number
  readonly temperatureC?: number
  readonly rockKg?: number
  readonly sandDepthMm?: number
  readonly standKg?: number
  readonly standLengthMm?: number
  readonly standWidthMm?: number
}

function withGoals(setup: Setup, { salinityPpt, temperatureC, rockKg, sandDepthMm }: Values): Setup {
  const said = {
    ...(salinityPpt !== undefined && { salinityPpt }),
    ...(temperatureC !== undefined && { temperatureC }),
    ...(rockKg !== undefined && { rockKg }),
    ...(sandDepthMm !== undefined && { sandDepthMm }),
  }
  return { ...setup, goals: { ...setup.goals, ...said } }
}

function listWeightSteps({ tank, goals }: Plan, weight: FilledWeight): readonly Step[] {
  const { shellKg, waterKg, rockKg, sandKg, totalKg } = weight
  const outer = [tank.outerLengthMm, tank.outerWidthMm, tank.outerHeightMm]
  const inner = [tank.insideLengthMm, tank.insideWidthMm, tank.insideHeightMm]
  const metres = (sides: readonly number[]) => sides.map((side) => `${put(side / 1000)} m`).join(' × ')
  const water = [tank.insideLengthMm, tank.insideWidthMm, tank.waterLineMm]
  const density = seawaterDensityKgM3(goals.salinityPpt, goals.temperatureC) / 1000
  return [
    tank.dryMassKg === undefined
      ? {
          title: 'Shell',
          formula: '(outside − inside volume) × density',
          text: `(${metres(outer)} − ${metres(inner)}) × ${shellDensityKgM3[tank.material]} kg/m³`,
          value: shellKg,
          unit: 'kg',
          source: tank.material === 'glass' ? 'EN 572-1, soda-lime glass' : 'ISO 10456, PMMA',
        }
      : { title: 'Shell', formula: 'as weighed', text: `${put(shellKg)} kg`, value: shellKg, unit: 'kg' },
    {
      title: 'Sand',
      formula: 'display × depth × bulk density',
      text: `${metres([tank.displayLengthMm, tank.displayWidthMm, goals.sandDepthMm])} × ${put(defaults.sandBulkDensityKgL * 1000)} kg/m³`,
      value: sandKg,
      unit: 'kg',
    },
    {
      title: 'Water',
      formula: '(inside × water line − rock ÷ 2.7 kg/L − sand ÷ 2.8 kg/L) × density',
      text: `(${metres(water)} × 1000 L/m³ − ${put(rockKg)} kg ÷ ${solidDensityKgL.rock} − ${put(sandKg)} kg ÷ ${solidDensityKgL.sand}) × ${put(density, 5)} kg/L`,
      value: waterKg,
      unit: 'kg',
      source: 'Density: EOS-80, UNESCO 44',
    },
    {
      title: 'Filled weight',
      formula: 'shell + water + rock + sand',
      text: [shellKg, waterKg, rockKg, sandKg].map((kg) => `${put(kg)} kg`).join(' + '),
      value: totalKg,
      unit: 'kg',
    },
  ]
}

const fields: readonly WorksheetField[] = [
  fromSetupField('salinityPpt', 'goals.salinityPpt'),
  fromSetupField('temperatureC', 'goals.temperatureC'),
  fromSetupField('rockKg', 'goals.rockKg'),
  fromSetupField('sandDepthMm', 'goals.sandDepthMm'),
  fromKind('standKg', 'stand', 'massKg', { label: 'mass of the stand' }),
  fromSetupField('standLengthMm', 'support.lengthMm', { label: 'length of what presses on the floor' }),
  fromSetupField('standWidthMm', 'support.widthMm', { label: 'width of what presses on the floor' }),
]

const weightUses: readonly string[] = [
  ...['outerLengthMm', 'outerWidthMm', 'outerHeightMm', 'wallMm', 'bottomMm', 'material', 'waterLineMm'].map(
    (key) => `tank.${key}`,
  ),
  'tank.displayLengthMm',
  'tank.displayWidthMm',
  'goals.salinityPpt',
  'goals.temperatureC',
  'goals.rockKg',
  'goals.sandDepthMm',
]

/** What was taken for what nobody said of the stand. */
function listStandAssumed(values: Values, { tank }: Plan, words: Printer): readonly Assumption[] {
  const assumed = (key: 'standKg' | 'standLengthMm' | 'standWidthMm', value: number, label: string, printed: string) =>
    values[key] === undefined ? [assume(key, value, label, printed)] : []
  const { outerLengthMm, outerWidthMm } = tank
  return [
    ...assumed('standKg', 0, 'Mass of the stand', words.mass(0)),
    ...assumed('standLengthMm', outerLengthMm, 'Length of what presses on the floor', words.length(outerLengthMm)),
    ...assumed('standWidthMm', outerWidthMm, 'Width of what presses on the floor', words.length(outerWidthMm)),
  ]
}

/** Which of the tank's own sides stand in for what presses on the floor. */
function warnOfFootprint({ standLengthMm, standWidthMm }: Values): readonly string[] {
  if (standLengthMm !== undefined && standWidthMm !== undefined) return []
  const own = standLengthMm !== undefined ? 'width' : standWidthMm !== undefined ? 'length' : 'footprint'
  return [`The tank’s own ${own} was taken; feet press harder than a full base.`]
}

export const filledWeight: Worksheet = {
  name: 'filled-weight',
  title: 'What a filled tank weighs',
  intro: 'Shell, water, rock and sand together, and how hard they press on the floor.',
  setup: {
    sections: ['tank'],
    asks: [
      'tank.outerLengthMm',
      'tank.outerWidthMm',
      'tank.outerHeightMm',
      'tank.wallMm',
      'tank.bottomMm',
      'tank.material',
      'tank.waterLineMm',
      'tank.dryMassKg',
      'tank.volumeL',
    ],
  },
  fields,
  results: [
    { key: 'totalKg', label: 'Filled weight', unit: 'kg' },
    { key: 'floorKPa', label: 'Pressure on the floor, stand included', unit: 'kPa' },
    { key: 'waterKg', label: 'Water', unit: 'kg' },
    { key: 'shellKg', label: 'Empty tank', unit: 'kg' },
    { key: 'rockKg', label: 'Rock', unit: 'kg' },
    { key: 'sandKg', label: 'Sand', unit: 'kg' },
  ],
  basis: { type: 'physics', source: 'Open box by density (EN 572-1, ISO 10456); sea water by EOS-80' },
  example: {
    tank: { outerLengthMm: 610, outerWidthMm: 406, outerHeightMm: 406 },
    rockKg: 9,
    sandDepthMm: 40,
    standKg: 25,
  },
  work(values: Values, setup, words) {
    const plan = planInputs(withGoals(setup, values), words, fields)
    if (!isPlan(plan)) return plan
    const weight = weighFilled(plan)
    const { outerLengthMm, outerWidthMm } = plan.tank
    const { standKg = 0, standLengthMm = outerLengthMm, standWidthMm = outerWidthMm } = values
    const floorKPa = findFloorPressureKPa(plan, standKg, { lengthMm: standLengthMm, widthMm: standWidthMm })
    const { totalKg, ...parts } = weight
    return {
      ok: true,
      result: { ...parts, totalKg, floorKPa },
      steps: [
        ...listWeightSteps(plan, weight),
        {
          title: 'Pressure on the floor',
          formula: '(filled weight + stand) × g ÷ footprint',
          text: `(${put(totalKg)} kg + ${put(standKg)} kg) × 9.807 m/s² ÷ (${put(standLengthMm / 1000)} m × ${put(standWidthMm / 1000)} m)`,
          value: floorKPa,
          unit: 'kPa',
        },
      ],
      cautions: [
        'Weight and pressure are information, not a verdict. Floors are designed for an evenly spread load: a structural engineer and local building rules decide for anything large or upstairs.',
        ...warnOfFootprint(values),
        ...(plan.tank.boxes.length > 1 ? ['A sump stands on its own and is left out.'] : []),
      ],
      assumptions: [...listUsed(plan, weightUses, words, fields), ...listStandAssumed(values, plan, words)],
    }
  },
}
