import { countPacks, packSalinityPpt, saltPacks } from '../physics/salt'
import { fromKind, fromSetupField, required } from './fields'
import { put } from './quantities'
import type { Worksheet } from './types'

interface Values {
  readonly volumeL: number
  readonly salinityPpt: number
  readonly makesL: number
  readonly packKg: number
}

export const saltMixSheet: Worksheet = {
  name: 'salt-mix',
  title: 'Salt for new water',
  intro: 'How much salt mix a volume of pure water takes, and how many packs that is.',
  fields: [
    required(
      fromSetupField('volumeL', 'tank.volumeL', {
        label: 'water to mix',
        plausible: [0.1, 20000],
        guide: 'The first fill, or one water change.',
      }),
    ),
    required(fromSetupField('salinityPpt', 'goals.salinityPpt')),
    required(fromKind('makesL', 'salt-mix', 'makesL', { label: 'a pack makes' })),
    required(fromKind('packKg', 'salt-mix', 'packKg')),
  ],
  results: [
    { key: 'massKg', label: 'Salt mix', unit: 'kg' },
    { key: 'packs', label: 'Packs to buy', unit: 'count' },
  ],
  basis: { type: 'physics', source: 'In proportion to what a pack makes at 35 ppt' },
  example: { volumeL: 75, salinityPpt: 35, makesL: 190, packKg: 6.8 },
  work({ volumeL, salinityPpt, makesL, packKg }: Values) {
    const share = saltPacks(volumeL, salinityPpt, makesL)
    const massKg = share * packKg
    const packs = countPacks(share)
    return {
      ok: true,
      result: { massKg, packs },
      steps: [
        {
          title: 'Share of a pack',
          formula: 'water ÷ what a pack makes × salinity ÷ 35 ppt',
          text: `${put(volumeL)} L ÷ ${put(makesL)} L × ${put(salinityPpt)} ppt ÷ ${packSalinityPpt} ppt`,
          value: share,
          unit: 'number',
        },
        {
          title: 'Salt mix',
          formula: 'share × mass of a pack',
          text: `${put(share)} × ${put(packKg)} kg`,
          value: massKg,
          unit: 'kg',
        },
        { title: 'Packs', formula: 'share of a pack, rounded up', text: put(share), value: packs, unit: 'count' },
      ],
      cautions: [
        'Mix in pure water outside the tank and measure the salinity before animals meet it: packs differ, and damp salt weighs more.',
      ],
      assumptions: [],
    }
  },
}
